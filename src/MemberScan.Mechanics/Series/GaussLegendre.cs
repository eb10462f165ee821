using System.Collections.Immutable;

namespace MemberScan.Mechanics.Series;

/// <summary>The Gauss–Legendre rule of 20 points: exact for polynomials up to degree 39.</summary>
internal static class GaussLegendre
{
    private const int Count = 20;

    /// <summary>Places in (0, 1) and their weights, which add up to 1.</summary>
    public static ImmutableArray<(double At, double Weight)> UnitInterval { get; } = Build();

    private static ImmutableArray<(double At, double Weight)> Build()
    {
        var rule = ImmutableArray.CreateBuilder<(double, double)>(Count);
        for (var i = 1; i <= Count; i++)
        {
            var x = Math.Cos(Math.PI * (i - 0.25) / (Count + 0.5));                // near the i-th root; Newton does the rest
            var slope = 0.0;
            for (var pass = 0; pass < 8; pass++)
            {
                var (value, previous) = Legendre(x);
                slope = Count * (x * value - previous) / (x * x - 1);
                x -= value / slope;
            }

            rule.Add((0.5 * (1 - x), 1 / ((1 - x * x) * slope * slope)));
        }

        return rule.MoveToImmutable();
    }

    private static (double Value, double Previous) Legendre(double x)
    {
        var (value, previous) = (x, 1.0);
        for (var n = 2; n <= Count; n++)
            (value, previous) = (((2 * n - 1) * x * value - (n - 1) * previous) / n, value);
        return (value, previous);
    }
}
