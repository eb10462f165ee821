using MemberScan.Foundation.Diagnostics;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21.Findings;

/// <summary>Tells findings with their places and remembers what they mean for the whole.</summary>
internal sealed class FindingLog(SourceText source, DiagnosticList diagnostics)
{
    private readonly HashSet<FindingKind> _told = [];

    public bool HasDamage { get; private set; }

    public bool EndsReading { get; private set; }

    /// <param name="kind">What was found.</param>
    /// <param name="offset">Where [byte]; −1 for the file as a whole.</param>
    /// <param name="id">Number of the instance concerned; 0 if none.</param>
    public void Tell(FindingKind kind, long offset, ulong id = 0)
    {
        HasDamage |= kind.IsDamage;
        EndsReading |= kind.EndsReading;

        // Equal findings are counted and only the first place is kept: no line needs to be counted for the others.
        var isFirst = _told.Add(kind);
        diagnostics.Add(kind.Code, kind.Severity, kind.Message, isFirst ? source.SpanAt(offset, id) : null);
    }
}
