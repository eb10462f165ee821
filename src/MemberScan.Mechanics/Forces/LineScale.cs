using System.Collections.Immutable;

namespace MemberScan.Mechanics.Forces;

/// <summary>How far end values of an interval may miss equilibrium, taken from the whole line.</summary>
/// <param name="Shear">Allowed difference of shear forces [N].</param>
/// <param name="Moment">Allowed difference of moments [N·m].</param>
internal readonly record struct LineScale(double Shear, double Moment)
{
    // Share of the largest of all forces below which a value is rounding noise.
    private const double Noise = 1e-9;

    /// <summary>The scale of a line of stations on a member of the given length [m].</summary>
    public static LineScale Of(ImmutableArray<ForceStation> stations, double length)
    {
        var (shear, moment, other) = (0.0, 0.0, 0.0);
        foreach (var (_, f) in stations)
        {
            shear = Math.Max(shear, Math.Max(Math.Abs(f.Vy), Math.Abs(f.Vz)));
            moment = Math.Max(moment, Math.Max(Math.Abs(f.My), Math.Abs(f.Mz)));
            other = Math.Max(other, Math.Max(Math.Abs(f.N), Math.Abs(f.T) / length));
        }

        var noise = Noise * Math.Max(other, Math.Max(shear, moment / length));
        return new LineScale(
            Math.Max(ForceLine.Tolerance * shear, noise), Math.Max(ForceLine.Tolerance * moment, noise * length));
    }

    /// <summary>What is known between two stations.</summary>
    public IntervalKind Test(in ForceStation start, in ForceStation end)
    {
        var dx = end.X - start.X;
        var (a, b) = (start.Forces, end.Forces);
        // dMy/dx = Vz, dMz/dx = −Vy; the mean shear serves both tests, since in the first it is the constant one.
        var missY = Math.Abs(b.My - a.My - 0.5 * (a.Vz + b.Vz) * dx);
        var missZ = Math.Abs(b.Mz - a.Mz + 0.5 * (a.Vy + b.Vy) * dx);
        if (Math.Max(missY, missZ) > Moment) return IntervalKind.Unknown;

        return Math.Max(Math.Abs(b.Vy - a.Vy), Math.Abs(b.Vz - a.Vz)) <= Shear
            ? IntervalKind.Linear
            : IntervalKind.UniformLoadInferred;
    }
}
