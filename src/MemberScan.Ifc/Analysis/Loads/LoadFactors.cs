using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Loads;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Analysis.Loads;

/// <summary>What acts in a load case or combination.</summary>
/// <param name="Groups">Load groups with their factors; empty when they are not known.</param>
/// <param name="SelfWeight">Self-weight as a multiple of each member's weight, along the global axes of the analysis model [-]; (0, 0, −1) is the weight itself.</param>
/// <param name="Why">Why the factors are not known; null when they are.</param>
internal sealed record LoadFactors(ImmutableArray<LoadFactor> Groups, Vector3 SelfWeight, Reason? Why)
{
    /// <summary>The factor with which a load acts: the sum over all groups that hold it.</summary>
    public double Of(MemberLoad load) => Groups.Where(g => load.Groups.Contains(g.Group)).Sum(g => g.Factor);
}
