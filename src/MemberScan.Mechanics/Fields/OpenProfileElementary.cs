using System.Collections.Immutable;
using MemberScan.Mechanics.Edges;
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

    /// <summary>
    /// Lines a hair on either side of where the stress jumps from wall to wall: along all four sides of each wall, between walls whose ends
    /// meet, and inside fillets. What falls outside the material is to be left away.
    /// </summary>
    public IEnumerable<EdgeCurve> Creases()
    {
        foreach (var wall in _walls)
        {
            foreach (var off in new[] { -Hair, Hair })
            {
                var (half, start, end) = (0.5 * wall.Thickness * (1 + off), -off * wall.Thickness, wall.Length + off * wall.Thickness);
                yield return EdgeCurve.Line(wall.At(start, -half), wall.At(start, half));
                yield return EdgeCurve.Line(wall.At(end, -half), wall.At(end, half));
                yield return EdgeCurve.Line(wall.At(start, -half), wall.At(end, -half));
                yield return EdgeCurve.Line(wall.At(start, half), wall.At(end, half));
            }
        }

        foreach (var line in BetweenEnds()) yield return line;

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

    // Where two walls end in one point, neither covers the quarter beyond both ends: there the nearer one counts, by halves.
    private IEnumerable<EdgeCurve> BetweenEnds()
    {
        (ProfileWall Wall, double S, double OutY, double OutZ)[] ends =
        [
            .. _walls.Select(wall => (wall, 0.0, -wall.DirectionY, -wall.DirectionZ)),
            .. _walls.Select(wall => (wall, wall.Length, wall.DirectionY, wall.DirectionZ)),
        ];
        for (var i = 0; i < ends.Length; i++)
        {
            for (var j = 0; j < i; j++)
            {
                var (from, other) = (ends[i].Wall.At(ends[i].S, 0), ends[j].Wall.At(ends[j].S, 0));
                var reach = ends[i].Wall.Thickness + ends[j].Wall.Thickness;
                if (double.Hypot(from.Y - other.Y, from.Z - other.Z) > Hair * reach) continue;

                var (y, z) = (ends[i].OutY + ends[j].OutY, ends[i].OutZ + ends[j].OutZ);
                if (double.Hypot(y, z) < 1) continue;                              // end to end in one line
                foreach (var side in new[] { -Hair, Hair })
                {
                    var (startY, startZ) = (from.Y - side * reach * z, from.Z + side * reach * y);
                    yield return EdgeCurve.Line((startY, startZ), (startY + reach * y, startZ + reach * z));
                }
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
