using System.Collections.Immutable;

namespace MemberScan.Ifc.Analysis.Loads;

/// <summary>The loads on one analytical member in one situation, as far as they are known.</summary>
/// <param name="Loads">The loads with their factors, in the member's own axes; empty where none is known to act.</param>
/// <param name="Source">Which they are, in words; empty for none.</param>
/// <param name="WhyNot">Why not all that acts is known; empty when it is, or where nothing names the loads.</param>
internal sealed record LineLoads(ImmutableArray<LineLoad> Loads, string Source, string WhyNot)
{
    /// <summary>Nothing known.</summary>
    public static LineLoads Unknown(string why) => new([], "", why);
}
