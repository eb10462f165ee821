namespace MemberScan.Part21.Reading;

/// <summary>One entry of the header such as <c>FILE_SCHEMA(('IFC4'))</c>.</summary>
/// <param name="Keyword">In upper case.</param>
/// <param name="Start">Offset of what stands between its brackets [byte].</param>
/// <param name="Length">Its length [byte].</param>
internal sealed record HeaderEntry(string Keyword, long Start, int Length);
