using MemberScan.Mechanics.Forces;

namespace MemberScan.SampleModels.HandCalculation;

/// <summary>Rectangular tube.</summary>
/// <remarks>
/// Shear flow V·Q/(I·t) along the middle line, zero on the axis of symmetry along V; torsion T/Wt with Wt of EN 10219-2, annex (from memory).
/// Normal stress at the outer face, where it is largest.
/// </remarks>
internal sealed class HandBox : HandSection
{
    private const int StepsPerPiece = 120;

    private readonly double _wall;
    private readonly double _wt;
    private readonly (double OuterY, double OuterZ, double MiddleY, double MiddleZ, double Length)[] _line;

    private HandBox(double wall, double wt, (double, double, double, double, double)[] line) => (_wall, _wt, _line) = (wall, wt, line);

    public static HandBox From(double b, double h, double t, double ro, double ri)
    {
        var rc = (ro + ri) / 2;
        var perimeter = 2 * (b - t + h - t) - 2 * rc * (4 - Math.PI);
        var enclosed = (b - t) * (h - t) - rc * rc * (4 - Math.PI);
        var k = 2 * enclosed * t / perimeter;
        var torsionConstant = t * t * t * perimeter / 3 + 2 * k * enclosed;
        var (innerB, innerH) = (b - 2 * t, h - 2 * t);
        return new HandBox(t, torsionConstant / (t + k / t), MiddleLine(b, h, t, ro, rc))
        {
            Area = b * h - innerB * innerH - (4 - Math.PI) * (ro * ro - ri * ri),
            Iy = HandSolid.Inertia(b, h, ro) - HandSolid.Inertia(innerB, innerH, ri),
            Iz = HandSolid.Inertia(h, b, ro) - HandSolid.Inertia(innerH, innerB, ri),
        };
    }

    public override HandPoint Worst(in SectionForces f)
    {
        HandPoint worst = default;

        // Quarter (+y, +z) from the middle of the top flange to the middle of the web; the other three by reflection.
        double total = _line.Sum(p => p.MiddleY * p.Length) * _wall, beyondZ = 0, beyondY = total;
        foreach (var p in _line)
        {
            beyondZ += p.MiddleZ * p.Length * _wall / 2;
            beyondY -= p.MiddleY * p.Length * _wall / 2;
            foreach (var (signY, signZ) in new[] { (1, 1), (-1, 1), (-1, -1), (1, -1) })
            {
                // Positive runs counter-clockwise (from y to z): a force along +z flows so on the +y half, one along +y on the −z half.
                var flow = signY * f.Vz * beyondZ / (Iy * _wall) - signZ * f.Vy * beyondY / (Iz * _wall) + f.T / _wt;
                var (y, z) = (signY * p.OuterY, signZ * p.OuterZ);
                worst = HandPoint.Worse(worst, new HandPoint(y, z, Normal(f, y, z), Math.Abs(flow)));
            }

            beyondZ += p.MiddleZ * p.Length * _wall / 2;
            beyondY -= p.MiddleY * p.Length * _wall / 2;
        }

        return worst;
    }

    private static (double, double, double, double, double)[] MiddleLine(double b, double h, double t, double ro, double rc)
    {
        var line = new List<(double, double, double, double, double)>();
        var (midY, midZ) = ((b - t) / 2, (h - t) / 2);
        var step = (midY - rc) / StepsPerPiece;
        for (var i = 0; i < StepsPerPiece; i++) line.Add(((i + 0.5) * step, h / 2, (i + 0.5) * step, midZ, step));

        // The outer face of a corner lies on its own arc (centre and radius differ from the middle line's); a sharp one is a point.
        for (var i = 0; i < StepsPerPiece; i++)
        {
            var (sin, cos) = Math.SinCos(Math.PI / 2 * (1 - (i + 0.5) / StepsPerPiece));
            line.Add((b / 2 - ro + ro * cos, h / 2 - ro + ro * sin, midY - rc + rc * cos, midZ - rc + rc * sin, rc * Math.PI / 2 / StepsPerPiece));
        }

        step = (midZ - rc) / StepsPerPiece;
        for (var i = 0; i < StepsPerPiece; i++) line.Add((b / 2, midZ - rc - (i + 0.5) * step, midY, midZ - rc - (i + 0.5) * step, step));
        return [.. line];
    }
}
