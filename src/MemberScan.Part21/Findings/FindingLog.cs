using MemberScan.Foundation.Diagnostics;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21.Findings;

/// <summary>Tells findings with their places, or gathers them, and remembers what they mean for the whole.</summary>
internal sealed class FindingLog
{
    private readonly HashSet<FindingKind> _told = [];
    private readonly SourceText? _source;
    private readonly DiagnosticList? _diagnostics;

    /// <summary>A log that tells each finding at once.</summary>
    public FindingLog(SourceText source, DiagnosticList diagnostics) => (_source, _diagnostics) = (source, diagnostics);

    /// <summary>A log that gathers.</summary>
    public FindingLog()
    {
    }

    public bool HasDamage { get; private set; }

    public bool EndsReading { get; private set; }

    /// <summary>Offset in the file of the text that offsets count from; used while gathering.</summary>
    public long Origin { get; set; }

    /// <summary>What was gathered.</summary>
    public List<Finding> Gathered { get; } = [];

    /// <param name="kind">What was found.</param>
    /// <param name="offset">Where [byte]; −1 for the file as a whole.</param>
    /// <param name="id">Number of the instance concerned; 0 if none.</param>
    public void Tell(FindingKind kind, long offset, ulong id = 0)
    {
        HasDamage |= kind.IsDamage;
        EndsReading |= kind.EndsReading;
        if (_source is null)
        {
            Gathered.Add(new Finding(kind, offset < 0 ? offset : Origin + offset, id));
            return;
        }

        // Equal findings are counted and only the first place is kept: no line needs to be counted for the others.
        var isFirst = _told.Add(kind);
        _diagnostics!.Add(kind.Code, kind.Severity, kind.Message, isFirst ? _source.SpanAt(offset, id) : null);
    }

    /// <summary>Takes over what another log gathered, its offsets counted from <paramref name="origin"/>.</summary>
    public void Take(IEnumerable<Finding> findings, long origin)
    {
        foreach (var finding in findings)
        {
            HasDamage |= finding.Kind.IsDamage;
            EndsReading |= finding.Kind.EndsReading;
            Gathered.Add(finding with { Offset = finding.Offset < 0 ? finding.Offset : origin + finding.Offset });
        }
    }

    /// <summary>What was gathered, equal findings counted at the place of the first.</summary>
    public List<Finding> Counted()
    {
        var counted = new List<Finding>();
        foreach (var finding in Gathered)
        {
            var at = counted.FindIndex(f => f.Kind == finding.Kind);
            if (at < 0) counted.Add(finding);
            else counted[at] = counted[at] with { Count = counted[at].Count + finding.Count };
        }

        return counted;
    }

    /// <summary>Takes back what was gathered behind the first <paramref name="count"/> findings.</summary>
    public void TakeBack(int count) => Gathered.RemoveRange(count, Gathered.Count - count);
}
