using System.Collections.Immutable;
using MemberScan.Mechanics.Forces;

namespace MemberScan.Statics.Results;

/// <summary>True extremes of section forces: between breaks each is a polynomial of third degree at most, whose slope has its zeros in closed form.</summary>
internal static class MemberExtremes
{
    private const int Components = 6;

    /// <summary>Least and largest value of each section force.</summary>
    /// <param name="member">The member.</param>
    /// <param name="breaks">Places at which section forces are not smooth, both ends included, rising.</param>
    public static ImmutableArray<MemberExtreme> Of(MemberResult member, double[] breaks)
    {
        var found = new MemberExtreme[Components];
        var isFirst = true;
        foreach (var x in Candidates(member, breaks))
        {
            foreach (var afterJump in (bool[])[false, true])
            {
                var forces = member.ForcesAt(x, afterJump);
                for (var c = 0; c < Components; c++)
                {
                    var value = Component(forces, c);
                    if (isFirst) found[c] = new MemberExtreme((ForceComponent)c, value, x, value, x);
                    if (value < found[c].Least) found[c] = found[c] with { Least = value, LeastAt = x };
                    if (value > found[c].Largest) found[c] = found[c] with { Largest = value, LargestAt = x };
                }

                isFirst = false;
            }
        }

        return [.. found];
    }

    /// <summary>Breaks, and places between where a section force has an extreme.</summary>
    public static ImmutableArray<double> Places(MemberResult member, double[] breaks) => [.. Candidates(member, breaks).Distinct().Order()];

    private static IEnumerable<double> Candidates(MemberResult member, double[] breaks)
    {
        foreach (var x in breaks) yield return x;
        for (var k = 0; k + 1 < breaks.Length; k++)
        {
            var (from, step) = (breaks[k], breaks[k + 1] - breaks[k]);
            SectionForces[] at = [member.ForcesAt(from, true), member.ForcesAt(from + step / 3, true), member.ForcesAt(from + 2 * step / 3, true), member.ForcesAt(breaks[k + 1], false)];
            for (var c = 0; c < Components; c++)
                foreach (var t in FlatPlaces(Component(at[0], c), Component(at[1], c), Component(at[2], c), Component(at[3], c))) yield return from + t * step;
        }
    }

    // Zeros in (0, 1) of the slope of the cubic through values at 0, 1/3, 2/3 and 1.
    private static IEnumerable<double> FlatPlaces(double f0, double f1, double f2, double f3)
    {
        var size = Math.Max(Math.Max(Math.Abs(f0), Math.Abs(f1)), Math.Max(Math.Abs(f2), Math.Abs(f3)));
        var c1 = -5.5 * f0 + 9 * f1 - 4.5 * f2 + f3;
        var c2 = 9 * f0 - 22.5 * f1 + 18 * f2 - 4.5 * f3;
        var c3 = -4.5 * f0 + 13.5 * f1 - 13.5 * f2 + 4.5 * f3;
        var (a, b, c) = (3 * c3, 2 * c2, c1);
        if (Math.Abs(a) + Math.Abs(b) <= 1e-11 * size) return [];

        var root = b * b - 4 * a * c;
        if (root < 0) return [];

        var q = -0.5 * (b + (b >= 0 ? 1 : -1) * Math.Sqrt(root));                // no cancellation
        return new[] { q / a, c / q }.Where(t => t > 0 && t < 1);
    }

    private static double Component(in SectionForces f, int number) => number switch
    {
        0 => f.N,
        1 => f.Vy,
        2 => f.Vz,
        3 => f.T,
        4 => f.My,
        _ => f.Mz,
    };
}
