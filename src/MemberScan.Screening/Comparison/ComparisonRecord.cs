using System.Collections.Immutable;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Comparison;

/// <summary>Two runs side by side.</summary>
/// <param name="Earlier">The earlier run.</param>
/// <param name="Later">The later run.</param>
/// <param name="Members">Each candidate of either run once: in the order of the movements, then of the later model, then of the earlier one.</param>
/// <param name="RunChanges">What differs between the runs as wholes: program version, basis, settings, forces files; one line each.</param>
public sealed record ComparisonRecord(ScreeningRecord Earlier, ScreeningRecord Later, ImmutableArray<MemberMovement> Members, ImmutableArray<string> RunChanges)
{
    /// <summary>Whether anything became worse.</summary>
    public bool HasWorse => Members.Any(m => m.IsWorse);

    /// <summary>Candidates found again under another GlobalId.</summary>
    public int Reidentified => Members.Count(m => m.IsReidentified);

    /// <summary>How many candidates moved in one way.</summary>
    public int Count(Movement movement) => Members.Count(m => m.Movement == movement);
}
