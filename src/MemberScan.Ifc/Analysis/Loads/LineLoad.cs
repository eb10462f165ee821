using MemberScan.Model.Loads;

namespace MemberScan.Ifc.Analysis.Loads;

/// <summary>A load as it acts in a situation: factored, in the analytical member's own axes, per length of the member.</summary>
/// <param name="Shape">How it lies along the member.</param>
/// <param name="From">Where it begins [m].</param>
/// <param name="To">Where it ends [m].</param>
/// <param name="Start">The load at its beginning; of half sine and parabola in the middle.</param>
/// <param name="End">The load at its end.</param>
internal readonly record struct LineLoad(LoadShape Shape, double From, double To, LoadVector Start, LoadVector End)
{
    /// <summary>Whether it is the same along its whole stretch, so that the moments under it are parabolas.</summary>
    public bool IsUniform => Shape == LoadShape.Linear && Start == End;

    /// <summary>
    /// What of it lies between two places a ≤ x: its sum, and its first moment about x, <c>∫(x − s)·q(s) ds</c>. A point load at a place counts from
    /// right behind it.
    /// </summary>
    public (LoadVector Sum, LoadVector Moment) Between(double a, double x)
    {
        if (Shape == LoadShape.Temperature || To < a || From > x) return default;
        if (Shape == LoadShape.Point) return (Start, (x - From) * Start);

        var (s0, s1) = (Math.Max(a, From) - From, Math.Min(x, To) - From);
        if (s1 <= s0) return default;

        // With P and PP the first and second antiderivatives: ∫(x − s)q ds = [(x − s)P] + ∫P ds.
        var (p0, p1) = (First(s0), First(s1));
        var moment = (x - From - s1) * p1 + -(x - From - s0) * p0 + Second(s1) + -1 * Second(s0);
        return (p1 + -1 * p0, moment);
    }

    private LoadVector First(double t)
    {
        var length = To - From;
        return Shape switch
        {
            LoadShape.HalfSine => -length / Math.PI * Math.Cos(Math.PI * t / length) * Start,
            LoadShape.Parabola => 4 * length * (t / length * (t / length) / 2 - Math.Pow(t / length, 3) / 3) * Start,
            _ => (t - t * t / (2 * length)) * Start + t * t / (2 * length) * End,
        };
    }

    private LoadVector Second(double t)
    {
        var length = To - From;
        return Shape switch
        {
            LoadShape.HalfSine => -length / Math.PI * (length / Math.PI) * Math.Sin(Math.PI * t / length) * Start,
            LoadShape.Parabola => 4 * length * length * (Math.Pow(t / length, 3) / 6 - Math.Pow(t / length, 4) / 12) * Start,
            _ => (t * t / 2 - t * t * t / (6 * length)) * Start + t * t * t / (6 * length) * End,
        };
    }
}
