using MemberScan.Screening.Record;

namespace MemberScan.Reporting.RunFile;

/// <summary>The content of a run record file.</summary>
/// <param name="Format">Name and number of the format; first in the file.</param>
/// <param name="Screening">The finished screening.</param>
internal sealed record RunDocument(string Format, ScreeningRecord Screening);
