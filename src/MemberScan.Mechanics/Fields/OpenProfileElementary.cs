using System.Collections.Immutable;
using MemberScan.Mechanics.Meshes;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Shear;

namespace MemberScan.Mechanics.Fields;

/// <summary>Open profiles by hand calculation: <c>V·Q/(I·t)</c> along the middle line of each wall, torsion <c>2nT/J</c>, <c>J = Σbt³/3</c>.</summary>
/// <remarks>
/// <c>dσ/dx = a·y + b·z</c>, so the flow from a free end is <c>−∫(a·y + b·z)·t ds</c>, uniform over the thickness; n is the distance from the
/// middle line. A point belongs to the nearest wall, a flange before the web; fillets belong to the wall they touch, with n at its face.
/// </remarks>
internal sealed class OpenProfileElementary : ShearSolution
{
    private const double Hair = 1e-7;
    private readonly ImmutableArray<ProfileWall> _walls;
    private readonly ImmutableArray<(double Y, double Z)> _fed;
    private readonly ImmutableArray<EdgeCurve> _arcs;
    private readonly double _perT;
    private readonly (double Vy, double Vz) _a;
    private readonly (double Vy, double Vz) _b;

    /// <summary>The solution for a profile with its properties.</summary>
    public OpenProfileElementary(OpenProfile section, SectionProperties properties)
    {
        _walls = ProfileWalls.Of(section);
        _arcs = [.. section.Edges.Where(edge => edge.IsArc)];
        _fed = [.. _walls.Select(wall => wall.FedBy.Select(k => _walls[k].Moments(_walls[k].Length)).Aggregate((Y: 0.0, Z: 0.0), (sum, m) => (sum.Y + m.Y, sum.Z + m.Z)))];
        _perT = 1 / _walls.Sum(wall => wall.Length * Math.Pow(wall.Thickness, 3) / 3);
        var determinant = properties.Iy * properties.Iz - properties.Iyz * properties.Iyz;
        _a = (properties.Iy / determinant, -properties.Iyz / determinant);
        _b = (-properties.Iyz / determinant, properties.Iz / determinant);
    }

    /// <summary>True: across each wall all stresses are linear.</summary>
    public override bool EdgesGovern => true;

    /// <summary>Lines across the walls a hair off their ends, and inside fillets, where the flow changes from wall to wall.</summary>
    public IEnumerable<EdgeCurve> Creases()
    {
        foreach (var wall in _walls)
        {
            foreach (var s in new[] { Hair * wall.Length, (1 - Hair) * wall.Length })
                yield return EdgeCurve.Line(wall.At(s, -0.5 * wall.Thickness), wall.At(s, 0.5 * wall.Thickness));
        }

        // Inside a fillet the nearest wall changes on the bisector, from the corner of the walls to the middle of the arc; n stops growing
        // on the faces of the walls, from that corner to the ends of the arc.
        foreach (var arc in _arcs)
        {
            var middle = arc.At(0.5);
            var (dy, dz) = (middle.Y - arc.Centre.Y, middle.Z - arc.Centre.Z);
            var corner = (arc.Centre.Y + Math.Sqrt(2) * dy, arc.Centre.Z + Math.Sqrt(2) * dz);
            yield return EdgeCurve.Line(corner, arc.At(0));
            yield return EdgeCurve.Line(corner, arc.At(1));
            foreach (var side in new[] { -Hair, Hair })
            {
                var (offY, offZ) = (-side * dz, side * dy);
                yield return EdgeCurve.Line(
                    (corner.Item1 + offY, corner.Item2 + offZ), (middle.Y + offY, middle.Z + offZ));
            }
        }
    }

    /// <summary>A place in words: the wall and how far along it.</summary>
    public string NameOf(double y, double z)
    {
        var (k, s, _) = Nearest(y, z);
        var wall = _walls[k];
        var isFed = wall.FedBy.Length > 0;
        return wall.Name + (s / wall.Length) switch
        {
            < 0.02 => isFed ? ", at the top flange" : ", free end",
            > 0.98 => isFed ? ", at the bottom flange" : ", at the junction",
            _ => ", between its ends",
        };
    }

    /// <inheritdoc/>
    public override ShearStress At(double vy, double vz, double t, double y, double z)
    {
        var (k, s, n) = Nearest(y, z);
        var wall = _walls[k];
        var (a, b) = (_a.Vy * vy + _a.Vz * vz, _b.Vy * vy + _b.Vz * vz);
        var (my, mz) = wall.Moments(s);
        var along = -(a * (my + _fed[k].Y) + b * (mz + _fed[k].Z)) / wall.Thickness - 2 * n * t * _perT;
        return new ShearStress(along * wall.DirectionY, along * wall.DirectionZ);
    }

    private (int Wall, double S, double N) Nearest(double y, double z)
    {
        var (best, least, bestS, bestN) = (0, double.PositiveInfinity, 0.0, 0.0);
        for (var k = 0; k < _walls.Length; k++)
        {
            var (s, n) = _walls[k].Locate(y, z);
            var half = 0.5 * _walls[k].Thickness;
            var (inS, inN) = (Math.Clamp(s, 0, _walls[k].Length), Math.Clamp(n, -half, half));
            var distance = double.Hypot(s - inS, n - inN);
            if (distance < least - 1e-12) (best, least, bestS, bestN) = (k, distance, inS, inN);
        }

        return (best, bestS, bestN);
    }
}
