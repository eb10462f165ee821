namespace MemberScan.Mechanics.Edges;

/// <summary>A straight line or a circular arc from one point to another, walked by a share from 0 to 1.</summary>
internal readonly record struct EdgeCurve
{
    private readonly double _y;
    private readonly double _z;
    private readonly double _dy;
    private readonly double _dz;
    private readonly double _radius;
    private readonly double _from;
    private readonly double _sweep;

    private EdgeCurve(double y, double z, double dy, double dz, double radius, double from, double sweep) =>
        (_y, _z, _dy, _dz, _radius, _from, _sweep) = (y, z, dy, dz, radius, from, sweep);

    /// <summary>Whether the curve bends.</summary>
    public bool IsArc => _radius > 0;

    /// <summary>A straight line; a point where both ends are the same.</summary>
    public static EdgeCurve Line((double Y, double Z) from, (double Y, double Z) to) =>
        new(from.Y, from.Z, to.Y - from.Y, to.Z - from.Z, 0, 0, 0);

    /// <summary>An arc about a centre; angles from +y towards +z [rad]. A point where the radius is 0.</summary>
    public static EdgeCurve Arc((double Y, double Z) centre, double radius, double from, double to) =>
        new(centre.Y, centre.Z, 0, 0, radius, from, to - from);

    /// <summary>The point at a share.</summary>
    public (double Y, double Z) At(double share)
    {
        if (_radius == 0) return (_y + share * _dy, _z + share * _dz);

        var (sin, cos) = Math.SinCos(_from + share * _sweep);
        return (_y + _radius * cos, _z + _radius * sin);
    }

    /// <summary>The point and its derivative by the share.</summary>
    public ((double Y, double Z) Point, (double Y, double Z) Slope) WithSlope(double share)
    {
        if (_radius == 0) return ((_y + share * _dy, _z + share * _dz), (_dy, _dz));

        var (sin, cos) = Math.SinCos(_from + share * _sweep);
        return ((_y + _radius * cos, _z + _radius * sin), (-_radius * _sweep * sin, _radius * _sweep * cos));
    }

    /// <summary>The piece between two shares.</summary>
    public EdgeCurve Piece(double from, double to) => _radius == 0
        ? new EdgeCurve(_y + from * _dy, _z + from * _dz, (to - from) * _dy, (to - from) * _dz, 0, 0, 0)
        : new EdgeCurve(_y, _z, 0, 0, _radius, _from + from * _sweep, (to - from) * _sweep);

    /// <summary>The mirror image in the line y = z.</summary>
    public EdgeCurve Exchanged() => new(_z, _y, _dz, _dy, _radius, Math.PI / 2 - _from, -_sweep);

    /// <summary>The same curve walked the other way.</summary>
    public EdgeCurve Reversed() => Piece(1, 0);

    /// <summary>Radius of an arc [m]; 0 of a line.</summary>
    public double Radius => _radius;

    /// <summary>Angle that an arc turns by, positive to the left [rad]; 0 of a line.</summary>
    public double Sweep => _sweep;

    /// <summary>Centre of an arc.</summary>
    public (double Y, double Z) Centre => (_y, _z);

    /// <summary>Length [m].</summary>
    public double Length => _radius == 0 ? double.Hypot(_dy, _dz) : _radius * Math.Abs(_sweep);

    /// <summary>Pieces that turn by at most a right angle.</summary>
    public IEnumerable<EdgeCurve> ShortPieces()
    {
        var count = Math.Max(1, (int)Math.Ceiling(Math.Abs(_sweep) / (Math.PI / 2) - 1e-9));
        for (var k = 0; k < count; k++) yield return Piece((double)k / count, (double)(k + 1) / count);
    }

    /// <summary>Both ends, and of an arc the places between them that lie farthest along an axis.</summary>
    public IEnumerable<(double Y, double Z)> Extremes()
    {
        yield return At(0);
        foreach (var share in Turns()) yield return At(share);
        yield return At(1);
    }

    /// <summary>The pieces that lie above a level of z.</summary>
    public IEnumerable<EdgeCurve> Above(double level)
    {
        double[] cuts = [0, .. Turns(), 1];
        for (var k = 1; k < cuts.Length; k++)
        {
            // Between turns z only rises or only falls: one crossing at most.
            var (from, to) = (cuts[k - 1], cuts[k]);
            var (z0, z1) = (At(from).Z, At(to).Z);
            if (z0 <= level && z1 <= level) continue;
            if (z0 >= level && z1 >= level)
            {
                yield return Piece(from, to);
                continue;
            }

            var crossing = Crossing(from, to, level, z0 < z1);
            yield return z0 > level ? Piece(from, crossing) : Piece(crossing, to);
        }
    }

    /// <summary>The ends and between them the places where an arc runs along an axis, as shares in order.</summary>
    public List<double> Shares() => [0, .. Turns(), 1];

    /// <summary>Distances along a ray, of unit direction, at which it meets the curve; negative ones too.</summary>
    public IEnumerable<double> Hits((double Y, double Z) from, double dirY, double dirZ)
    {
        const double Beyond = 1e-9;

        var (ry, rz) = (_y - from.Y, _z - from.Z);
        if (_radius == 0)
        {
            var cross = dirY * _dz - dirZ * _dy;
            if (Math.Abs(cross) <= 1e-12 * double.Hypot(_dy, _dz)) yield break;

            var share = (dirZ * ry - dirY * rz) / cross;
            if (share is >= -Beyond and <= 1 + Beyond) yield return (ry * _dz - rz * _dy) / cross;
            yield break;
        }

        var along = ry * dirY + rz * dirZ;
        var square = along * along - (ry * ry + rz * rz) + _radius * _radius;
        if (square < 0) yield break;

        foreach (var hit in new[] { along - Math.Sqrt(square), along + Math.Sqrt(square) })
        {
            var (y, z) = (from.Y + hit * dirY, from.Z + hit * dirZ);
            var at = At(Nearest(y, z));
            if (double.Hypot(at.Y - y, at.Z - z) <= Beyond * _radius) yield return hit;
        }
    }

    /// <summary>The place on the curve nearest to a point, as a share.</summary>
    public double Nearest(double y, double z)
    {
        if (_radius == 0)
        {
            var square = _dy * _dy + _dz * _dz;
            return square == 0 ? 0 : Math.Clamp(((y - _y) * _dy + (z - _z) * _dz) / square, 0, 1);
        }

        // Angle from the start in the direction of the sweep, between 0 and a full turn.
        var turn = (Math.Atan2(z - _z, y - _y) - _from) * Math.Sign(_sweep) % (2 * Math.PI);
        if (turn < 0) turn += 2 * Math.PI;
        var extent = Math.Abs(_sweep);
        if (turn <= extent) return turn / extent;
        return turn - extent <= 2 * Math.PI - turn ? 1 : 0;
    }

    private double Crossing(double from, double to, double level, bool rises)
    {
        if (_radius == 0) return (level - _z) / _dz;

        for (var step = 0; step < 60; step++)
        {
            var middle = 0.5 * (from + to);
            if (At(middle).Z > level == rises) to = middle;
            else from = middle;
        }

        return 0.5 * (from + to);
    }

    // Shares at which an arc runs along an axis, in order.
    private List<double> Turns()
    {
        var shares = new List<double>();
        if (_radius == 0) return shares;

        for (var quarter = Math.Ceiling(Math.Min(_from, _from + _sweep) / (Math.PI / 2)); quarter * Math.PI / 2 <= Math.Max(_from, _from + _sweep); quarter++)
        {
            var share = (quarter * Math.PI / 2 - _from) / _sweep;
            if (share is > 1e-12 and < 1 - 1e-12) shares.Add(share);
        }

        shares.Sort();
        return shares;
    }
}
