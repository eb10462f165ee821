using MemberScan.Mechanics.Edges;

namespace MemberScan.Mechanics.Meshes;

/// <summary>A piece of a section with four sides, straight or arcs, seen as the image of the square [−1, 1]².</summary>
/// <remarks>
/// The sides are blended (Coons): <c>P(s, u) = (1−u)·bottom(s) + u·top(s) + (1−s)·left(u) + s·right(u)</c> less the bilinear surface of
/// the four corners, so that neighbours with a common side meet exactly. A patch may be a sub-rectangle of such a surface. A
/// side may shrink to a point.
/// </remarks>
internal sealed class Patch
{
    private readonly EdgeCurve _bottom;
    private readonly EdgeCurve _top;
    private readonly EdgeCurve _left;
    private readonly EdgeCurve _right;
    private readonly bool _isRuled;
    private readonly (double From, double To) _s;
    private readonly (double From, double To) _u;
    private readonly (double Y, double Z) _p00;
    private readonly (double Y, double Z) _p10;
    private readonly (double Y, double Z) _p01;
    private readonly (double Y, double Z) _p11;

    private Patch(EdgeCurve bottom, EdgeCurve top, EdgeCurve left, EdgeCurve right, bool isRuled, (double, double) s, (double, double) u)
    {
        (_bottom, _top, _left, _right, _isRuled, _s, _u) = (bottom, top, left, right, isRuled, s, u);
        (_p00, _p10, _p01, _p11) = (bottom.At(0), bottom.At(1), top.At(0), top.At(1));
        SetBounds();
    }

    /// <summary>Least y of the patch and some of its surroundings.</summary>
    public double LeastY { get; private set; }

    /// <summary>Largest y.</summary>
    public double LargestY { get; private set; }

    /// <summary>Least z.</summary>
    public double LeastZ { get; private set; }

    /// <summary>Largest z.</summary>
    public double LargestZ { get; private set; }

    /// <summary>Straight lines between two curves.</summary>
    public static Patch Ruled(EdgeCurve bottom, EdgeCurve top, (double From, double To) s, (double From, double To) u) =>
        new(bottom, top, EdgeCurve.Line(bottom.At(0), top.At(0)), EdgeCurve.Line(bottom.At(1), top.At(1)), true, s, u);

    /// <summary>Four sides: bottom and top walked in s, left and right walked in u.</summary>
    public static Patch Blended(EdgeCurve bottom, EdgeCurve top, EdgeCurve left, EdgeCurve right) =>
        new(bottom, top, left, right, !left.IsArc && !right.IsArc, (0, 1), (0, 1));

    /// <summary>The four quarters of the patch.</summary>
    public IEnumerable<Patch> Quarters()
    {
        var (ms, mu) = (0.5 * (_s.From + _s.To), 0.5 * (_u.From + _u.To));
        foreach (var s in new[] { (_s.From, ms), (ms, _s.To) })
        {
            foreach (var u in new[] { (_u.From, mu), (mu, _u.To) }) yield return new Patch(_bottom, _top, _left, _right, _isRuled, s, u);
        }
    }

    /// <summary>The image of a point of the square.</summary>
    public (double Y, double Z) At(double xi, double eta)
    {
        var (s, u) = (Share(_s, xi), Share(_u, eta));
        var (b, t) = (_bottom.At(s), _top.At(s));
        var (y, z) = ((1 - u) * b.Y + u * t.Y, (1 - u) * b.Z + u * t.Z);
        if (_isRuled) return (y, z);

        var (l, r) = (_left.At(u), _right.At(u));
        var (cy, cz) = Bilinear(s, u);
        return (y + (1 - s) * l.Y + s * r.Y - cy, z + (1 - s) * l.Z + s * r.Z - cz);
    }

    /// <summary>The image with its derivatives by both coordinates of the square.</summary>
    public PatchPoint Map(double xi, double eta)
    {
        var (s, u) = (Share(_s, xi), Share(_u, eta));
        var (ds, du) = (0.5 * (_s.To - _s.From), 0.5 * (_u.To - _u.From));
        var (b, bs) = _bottom.WithSlope(s);
        var (t, ts) = _top.WithSlope(s);
        var (y, z) = ((1 - u) * b.Y + u * t.Y, (1 - u) * b.Z + u * t.Z);
        var (ys, zs) = ((1 - u) * bs.Y + u * ts.Y, (1 - u) * bs.Z + u * ts.Z);
        var (yu, zu) = (t.Y - b.Y, t.Z - b.Z);
        if (!_isRuled)
        {
            var (l, lu) = _left.WithSlope(u);
            var (r, ru) = _right.WithSlope(u);
            var (cy, cz) = Bilinear(s, u);
            (y, z) = (y + (1 - s) * l.Y + s * r.Y - cy, z + (1 - s) * l.Z + s * r.Z - cz);
            ys += r.Y - l.Y - ((1 - u) * (_p10.Y - _p00.Y) + u * (_p11.Y - _p01.Y));
            zs += r.Z - l.Z - ((1 - u) * (_p10.Z - _p00.Z) + u * (_p11.Z - _p01.Z));
            yu += (1 - s) * lu.Y + s * ru.Y - ((1 - s) * (_p01.Y - _p00.Y) + s * (_p11.Y - _p10.Y));
            zu += (1 - s) * lu.Z + s * ru.Z - ((1 - s) * (_p01.Z - _p00.Z) + s * (_p11.Z - _p10.Z));
        }

        return new PatchPoint(y, z, ds * ys, ds * zs, du * yu, du * zu);
    }

    /// <summary>Finds the point of the square whose image is nearest to (y, z); how far away that is [m], rounding inside.</summary>
    public double Locate(double y, double z, out double xi, out double eta)
    {
        const int MaxSteps = 30;

        (xi, eta) = (0, 0);
        for (var step = 0; step < MaxSteps; step++)
        {
            var at = Map(xi, eta);
            var (ry, rz) = (y - at.Y, z - at.Z);
            var determinant = at.Determinant;
            if (determinant == 0) break;

            var (dXi, dEta) = ((ry * at.ZEta - rz * at.YEta) / determinant, (rz * at.YXi - ry * at.ZXi) / determinant);
            // Not past a side that is a point, where the map folds over.
            xi = Math.Clamp(xi + Math.Clamp(dXi, -1, 1), -1.5, 1.5);
            eta = Math.Clamp(eta + Math.Clamp(dEta, -1, 1), -1.5, 1.5);
            if (Math.Abs(dXi) + Math.Abs(dEta) < 1e-13) break;
        }

        (xi, eta) = (Math.Clamp(xi, -1, 1), Math.Clamp(eta, -1, 1));
        var reached = At(xi, eta);
        return double.Hypot(reached.Y - y, reached.Z - z);
    }

    private static double Share((double From, double To) range, double at) => 0.5 * (range.From * (1 - at) + range.To * (1 + at));

    private (double Y, double Z) Bilinear(double s, double u) => (
        (1 - u) * ((1 - s) * _p00.Y + s * _p10.Y) + u * ((1 - s) * _p01.Y + s * _p11.Y),
        (1 - u) * ((1 - s) * _p00.Z + s * _p10.Z) + u * ((1 - s) * _p01.Z + s * _p11.Z));

    private void SetBounds()
    {
        const int Steps = 8;

        (LeastY, LargestY, LeastZ, LargestZ) = (double.MaxValue, double.MinValue, double.MaxValue, double.MinValue);
        for (var i = 0; i <= Steps; i++)
        {
            var at = 2.0 * i / Steps - 1;
            foreach (var (y, z) in new[] { At(at, -1), At(at, 1), At(-1, at), At(1, at) })
            {
                (LeastY, LargestY) = (Math.Min(LeastY, y), Math.Max(LargestY, y));
                (LeastZ, LargestZ) = (Math.Min(LeastZ, z), Math.Max(LargestZ, z));
            }
        }

        // An arc bulges between the places tried, by less than this share of the size.
        var margin = 0.02 * (LargestY - LeastY + LargestZ - LeastZ);
        (LeastY, LargestY, LeastZ, LargestZ) = (LeastY - margin, LargestY + margin, LeastZ - margin, LargestZ + margin);
    }
}
