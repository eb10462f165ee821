using System.Collections.Immutable;
using MemberScan.Mechanics.Profiles;

namespace MemberScan.Ifc.Sections.General;

/// <summary>A polygon whose corners may be rounded, as a ring of straight lines and arcs.</summary>
internal sealed class RoundedPolygon
{
    private readonly List<(double Y, double Z, double Radius)> _corners = [];

    /// <summary>Adds a corner [m]; corners follow each other to the left.</summary>
    /// <param name="y">Place along y.</param>
    /// <param name="z">Place along z.</param>
    /// <param name="radius">Radius of its rounding; 0 for a sharp corner.</param>
    public RoundedPolygon Corner(double y, double z, double radius = 0)
    {
        _corners.Add((y, z, radius));
        return this;
    }

    /// <summary>The ring; null when a rounding does not fit between its neighbours or a corner is no finite number.</summary>
    public ImmutableArray<OutlineVertex>? Ring()
    {
        if (!_corners.TrueForAll(c => double.IsFinite(c.Y) && double.IsFinite(c.Z) && c.Radius >= 0)) return null;

        var trims = Enumerable.Range(0, _corners.Count).Select(Trim).ToArray();
        var ring = ImmutableArray.CreateBuilder<OutlineVertex>();
        for (var i = 0; i < _corners.Count; i++)
        {
            var next = (i + 1) % _corners.Count;
            var edge = Edge(i);
            if (!(trims[i] + trims[next] <= edge.Length * (1 + 1e-9))) return null;

            // The straight part that leaves a rounding; where roundings meet there is none.
            var isUsedUp = trims[i] + trims[next] >= edge.Length * (1 - 1e-9);
            if (trims[i] == 0 || !isUsedUp) ring.Add(new OutlineVertex(_corners[i].Y + trims[i] * edge.Y, _corners[i].Z + trims[i] * edge.Z));
            if (trims[next] == 0) continue;

            var length = edge.Length - trims[next];
            ring.Add(new OutlineVertex(_corners[i].Y + length * edge.Y, _corners[i].Z + length * edge.Z, Math.Tan(Turn(next) / 4)));
        }

        return ring.ToImmutable();
    }

    private (double Y, double Z, double Length) Edge(int from)
    {
        var (a, b) = (_corners[from], _corners[(from + 1) % _corners.Count]);
        var length = double.Hypot(b.Y - a.Y, b.Z - a.Z);
        return ((b.Y - a.Y) / length, (b.Z - a.Z) / length, length);
    }

    /// <summary>Turn at a corner [rad], positive to the left.</summary>
    private double Turn(int corner)
    {
        var (before, after) = (Edge((corner + _corners.Count - 1) % _corners.Count), Edge(corner));
        return Math.Atan2(before.Y * after.Z - before.Z * after.Y, before.Y * after.Y + before.Z * after.Z);
    }

    private double Trim(int corner) => _corners[corner].Radius == 0 ? 0 : _corners[corner].Radius * Math.Tan(Math.Abs(Turn(corner)) / 2);
}
