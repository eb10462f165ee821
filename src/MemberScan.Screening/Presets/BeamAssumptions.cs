using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Forces;
using MemberScan.Screening.Contacts;

namespace MemberScan.Screening.Presets;

/// <summary>Concentrated and spread loads on a member that lies on supports, at their worst places and in their worst directions.</summary>
internal sealed class BeamAssumptions(PresetMembers members, Assumption assumption, BarLine line, IReadOnlyList<double> supports)
{
    /// <summary>Places that are tried in each span and overhang.</summary>
    public const int PlacesTried = 101;

    /// <summary>Distance right beside a support, as a share of the length.</summary>
    private const double Beside = 1e-6;

    /// <summary>A concentrated load at the places of the largest moment and of the largest shear.</summary>
    /// <param name="load">Size [N].</param>
    /// <param name="directions">Unit vectors in the member's axes; null for any direction.</param>
    /// <param name="betweenSupports">Whether it can only stand between the outer supports.</param>
    public IEnumerable<MemberForces> Concentrated(double load, ImmutableArray<Vector3>? directions, bool betweenSupports = false)
    {
        var worst = Places(betweenSupports).MaxBy(place => SpanForces.Lever(line.Length, supports, place));
        var shear = supports[0] + Beside * line.Length;
        foreach (var place in (double[])[worst, shear])
            foreach (var direction in directions ?? Directions(SpanForces.Lever(line.Length, supports, place)))
                yield return assumption.Forces(
                    $"{Assumption.Kn(load)} concentrated at {Assumption.At(place)}{(place == shear ? " (beside the support)" : "")}, {Assumption.Towards(Global(direction))}",
                    SpanForces.Of(line.Length, supports, new AssumedLoad(load * direction, place, place)));
    }

    /// <summary>A load per length on the longest span, and on each overhang.</summary>
    /// <param name="load">Size [N/m].</param>
    public IEnumerable<MemberForces> Spread(double load)
    {
        var span = Enumerable.Range(1, supports.Count - 1).MaxBy(i => supports[i] - supports[i - 1]);
        var stretches = new List<(double From, double To, double Lever)> { (supports[span - 1], supports[span], (supports[span] - supports[span - 1]) / 8) };
        if (supports[0] > line.Reach) stretches.Add((0, supports[0], supports[0] / 2));
        if (line.Length - supports[^1] > line.Reach) stretches.Add((supports[^1], line.Length, (line.Length - supports[^1]) / 2));
        foreach (var (from, to, lever) in stretches)
            foreach (var direction in Directions(lever))
                yield return assumption.Forces(
                    $"{Assumption.Kn(load)}/m from {Assumption.At(from)} to {Assumption.At(to)}, {Assumption.Towards(Global(direction))}",
                    SpanForces.Of(line.Length, supports, new AssumedLoad(load * direction, from, to)));
    }

    private Vector3 Global(Vector3 local) => local.X * line.Axes.X + local.Y * line.Axes.Y + local.Z * line.Axes.Z;

    private ImmutableArray<Vector3> Directions(double lever) => LoadDirections.Of(line.Shape, members.Properties(line.Shape), lever);

    private IEnumerable<double> Places(bool betweenSupports)
    {
        double[] ends = betweenSupports ? [.. supports] : [0, .. supports, line.Length];
        for (var i = 1; i < ends.Length; i++)
            for (var k = 0; k < PlacesTried; k++)
                yield return ends[i - 1] + (ends[i] - ends[i - 1]) * k / (PlacesTried - 1);
    }
}
