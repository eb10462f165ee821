namespace MemberScan.Mechanics.Meshes;

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
}
