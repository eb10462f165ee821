using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Geometry;
using MemberScan.Part21;

namespace MemberScan.Ifc.Curves;

/// <summary>Points of B-splines with knots, plain and rational (de Boor's algorithm).</summary>
internal sealed class SplineReader(Instances instances, PlacementReader placements)
{
    /// <summary>Largest degree and most control points that are followed.</summary>
    public const int MostDegree = 16, MostPoints = 2_000;

    private sealed record Spline(int Degree, Vector3[] Points, double[] Weights, double[] Knots)
    {
        public double First => Knots[Degree];

        public double Last => Knots[Points.Length];

        public Vector3 At(double t)
        {
            t = Math.Clamp(t, First, Last);
            var span = Array.FindLastIndex(Knots, Points.Length - 1, k => k <= t);
            span = Math.Clamp(span, Degree, Points.Length - 1);
            var p = new (Vector3 Point, double Weight)[Degree + 1];
            for (var j = 0; j <= Degree; j++)
            {
                var weight = Weights[span - Degree + j];
                p[j] = (weight * Points[span - Degree + j], weight);
            }

            for (var r = 1; r <= Degree; r++)
                for (var j = Degree; j >= r; j--)
                {
                    var (low, high) = (Knots[span - Degree + j], Knots[span + 1 + j - r]);
                    var share = high > low ? (t - low) / (high - low) : 0;
                    p[j] = ((1 - share) * p[j - 1].Point + share * p[j].Point, (1 - share) * p[j - 1].Weight + share * p[j].Weight);
                }

            return 1 / p[Degree].Weight * p[Degree].Point;
        }
    }

    /// <summary>The points of a spline by share of its parameter, and the shares of its knots; null when it is damaged or beyond the limits.</summary>
    public (Func<double, Vector3> At, IReadOnlyList<double> Breaks)? Read(Part21Record curve)
    {
        if (!curve[0].TryInteger(out var degree) || degree is < 1 or > MostDegree || curve[1].ItemCount > MostPoints) return null;
        if (instances.FollowEach(curve[1]) is not { } records || records.ConvertAll(placements.Point) is not { } points || points.Exists(p => p is null)) return null;
        if (Instances.Reals(curve[6]) is not { } values || curve[5].Items.Count != values.Length) return null;

        var knots = new List<double>();
        for (var i = 0; i < values.Length; i++)
        {
            if (!curve[5].Items[i].TryInteger(out var times) || times is < 1 or > MostDegree + 1) return null;

            knots.AddRange(Enumerable.Repeat(values[i], (int)times));
        }

        var isRational = curve.Keyword == "IFCRATIONALBSPLINECURVEWITHKNOTS";
        var weights = isRational ? Instances.Reals(curve[8]) : [.. Enumerable.Repeat(1.0, points.Count)];
        if (weights is null || weights.Length != points.Count || !Array.TrueForAll(weights, w => w > 0)) return null;
        if (points.Count <= degree || knots.Count != points.Count + degree + 1 || knots.Zip(knots.Skip(1)).Any(k => !(k.First <= k.Second))) return null;

        var spline = new Spline((int)degree, [.. points.Select(p => p!.Value)], weights, [.. knots]);
        var (first, span) = (spline.First, spline.Last - spline.First);
        return span > 0
            ? (share => spline.At(first + share * span), [.. values.Where(k => k >= first && k <= spline.Last).Distinct().Select(k => (k - first) / span)])
            : null;
    }
}
