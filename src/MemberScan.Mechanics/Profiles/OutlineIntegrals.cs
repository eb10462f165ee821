using System.Collections.Immutable;
using MemberScan.Mechanics.Edges;
using MemberScan.Mechanics.Series;

namespace MemberScan.Mechanics.Profiles;

/// <summary>Integrals over the material of an outline, as integrals along its edges: exact for lines, to rounding for arcs.</summary>
/// <param name="Area">∫dA [m²].</param>
/// <param name="MomentY">∫y dA [m³].</param>
/// <param name="MomentZ">∫z dA [m³].</param>
/// <param name="Iy">∫z² dA [m⁴].</param>
/// <param name="Iz">∫y² dA [m⁴].</param>
/// <param name="Iyz">∫yz dA [m⁴].</param>
/// <remarks>Green's theorem: <c>∫∂F/∂y dA = ∮F dz</c>. Lines z = const add nothing, so a part above a level needs no closing line.</remarks>
internal readonly record struct OutlineIntegrals(double Area, double MomentY, double MomentZ, double Iy, double Iz, double Iyz)
{
    /// <summary>The centroid [m].</summary>
    public (double Y, double Z) Centroid => (MomentY / Area, MomentZ / Area);

    /// <summary>Over the whole outline.</summary>
    public static OutlineIntegrals Of(ImmutableArray<EdgeCurve> edges) => Sum(edges);

    /// <summary>Over the part with z above a level [m].</summary>
    public static OutlineIntegrals Above(ImmutableArray<EdgeCurve> edges, double level) => Sum(edges.SelectMany(edge => edge.Above(level)));

    /// <summary>
    /// Plastic modulus for bending about y: first moments about the axis that halves the area, both counted positive [m³]; and where that axis is [m].
    /// </summary>
    public static (double Modulus, double Axis) Plastic(ImmutableArray<EdgeCurve> edges)
    {
        var whole = Of(edges);
        var (low, high) = (double.MaxValue, double.MinValue);
        foreach (var (_, z) in edges.SelectMany(edge => edge.Extremes())) (low, high) = (Math.Min(low, z), Math.Max(high, z));
        for (var step = 0; step < 100; step++)
        {
            var middle = 0.5 * (low + high);
            if (2 * Above(edges, middle).Area > whole.Area) low = middle;
            else high = middle;
        }

        var axis = 0.5 * (low + high);
        var above = Above(edges, axis);
        return (2 * above.MomentZ - whole.MomentZ - axis * (2 * above.Area - whole.Area), axis);
    }

    private static OutlineIntegrals Sum(IEnumerable<EdgeCurve> edges)
    {
        var (a, my, mz, iy, iz, iyz) = (0.0, 0.0, 0.0, 0.0, 0.0, 0.0);
        foreach (var edge in edges)
        {
            foreach (var piece in edge.ShortPieces())
            {
                foreach (var (at, weight) in GaussLegendre.UnitInterval)
                {
                    var ((y, z), (_, dz)) = piece.WithSlope(at);
                    var d = weight * dz;
                    a += d * y;
                    my += d * y * y / 2;
                    mz += d * y * z;
                    iy += d * y * z * z;
                    iz += d * y * y * y / 3;
                    iyz += d * y * y * z / 2;
                }
            }
        }

        return new OutlineIntegrals(a, my, mz, iy, iz, iyz);
    }
}
