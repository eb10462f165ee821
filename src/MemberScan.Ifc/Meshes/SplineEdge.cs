using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Curves;
using MemberScan.Ifc.Geometry;
using MemberScan.Part21;

namespace MemberScan.Ifc.Meshes;

/// <summary>Edges on B-splines that are straight lines or circular arcs.</summary>
internal sealed class SplineEdge(Instances instances, PlacementReader placements)
{
    /// <summary>Parts into which a spline is cut to be compared with a line or an arc.</summary>
    private const int Parts = 64;

    /// <summary>Largest distance of a spline from line or arc, over its size [-].</summary>
    private const double Tolerance = 1e-4;

    private readonly SplineReader _splines = new(instances, placements);

    /// <summary>The ends of a straight spline, the corners of equal chords of an arc; null where it is neither, or runs beyond the edge's ends.</summary>
    public List<Vector3>? Points(Part21Record curve, Vector3 start, Vector3 end, bool isForward)
    {
        if (_splines.Read(curve) is not { } spline) return null;

        List<Vector3> along = [.. Enumerable.Range(0, Parts + 1).Select(i => spline.At((isForward ? i : Parts - i) / (double)Parts))];
        var size = along.Max(p => (p - along[0]).Length);
        if ((along[0] - start).Length > Tolerance * size || (along[^1] - end).Length > Tolerance * size) return null;

        var chord = end - start;
        if (chord.TryNormalize(out var unit) && along.TrueForAll(p => (p - start).Cross(unit).Length <= Tolerance * size)) return [start, end];

        return Arc(along, start, end);
    }

    private static List<Vector3>? Arc(List<Vector3> along, Vector3 start, Vector3 end)
    {
        var (a, b, c) = (along[0], along[Parts / 3], along[2 * Parts / 3]);
        var (ab, ac) = (b - a, c - a);
        var normal = ab.Cross(ac);
        if (!normal.TryNormalize(out var z)) return null;

        var toCentre = 0.5 / normal.Dot(normal) * (ac.Dot(ac) * normal.Cross(ab) + ab.Dot(ab) * ac.Cross(normal));
        var (centre, radius) = (a + toCentre, toCentre.Length);
        if (along.Exists(p => Math.Abs((p - centre).Length - radius) > Tolerance * radius || Math.Abs((p - centre).Dot(z)) > Tolerance * radius)) return null;

        var x = -1 / radius * toCentre;
        var y = z.Cross(x);
        var sweep = 0.0;
        for (var i = 0; i < Parts; i++) sweep += Turn(along[i] - centre, along[i + 1] - centre, z);
        if (!(sweep > 0) || sweep > 2 * Math.PI + 1e-6) return null;

        var chords = Math.Max(1, (int)Math.Round(AdvancedFaceReader.ChordsPerTurn * sweep / (2 * Math.PI)));
        Vector3 At(double angle) => centre + radius * (Math.Cos(angle) * x + Math.Sin(angle) * y);
        return [start, .. Enumerable.Range(1, chords - 1).Select(i => At(sweep * i / chords)), end];
    }

    private static double Turn(Vector3 from, Vector3 to, Vector3 about) => Math.Atan2(from.Cross(to).Dot(about), from.Dot(to));
}
