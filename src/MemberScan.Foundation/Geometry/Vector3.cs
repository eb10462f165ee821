namespace MemberScan.Foundation.Geometry;

/// <summary>A point or direction in space [m] or [-].</summary>
public readonly record struct Vector3(double X, double Y, double Z)
{
    /// <summary>The origin.</summary>
    public static Vector3 Zero => default;

    /// <summary>Unit vector along x.</summary>
    public static Vector3 UnitX => new(1, 0, 0);

    /// <summary>Unit vector along y.</summary>
    public static Vector3 UnitY => new(0, 1, 0);

    /// <summary>Unit vector along z.</summary>
    public static Vector3 UnitZ => new(0, 0, 1);

    /// <summary>Euclidean length.</summary>
    public double Length => Math.Sqrt(Dot(this));

    /// <summary>Whether all three components are finite.</summary>
    public bool IsFinite => double.IsFinite(X) && double.IsFinite(Y) && double.IsFinite(Z);

    /// <summary>Sum.</summary>
    public static Vector3 operator +(Vector3 a, Vector3 b) => new(a.X + b.X, a.Y + b.Y, a.Z + b.Z);

    /// <summary>Difference.</summary>
    public static Vector3 operator -(Vector3 a, Vector3 b) => new(a.X - b.X, a.Y - b.Y, a.Z - b.Z);

    /// <summary>Reverse.</summary>
    public static Vector3 operator -(Vector3 a) => new(-a.X, -a.Y, -a.Z);

    /// <summary>Multiple.</summary>
    public static Vector3 operator *(double factor, Vector3 a) => new(factor * a.X, factor * a.Y, factor * a.Z);

    /// <summary>Scalar product.</summary>
    public double Dot(Vector3 other) => X * other.X + Y * other.Y + Z * other.Z;

    /// <summary>Vector product, right-handed.</summary>
    public Vector3 Cross(Vector3 other) =>
        new(Y * other.Z - Z * other.Y, Z * other.X - X * other.Z, X * other.Y - Y * other.X);

    /// <summary>The vector of length 1 along this one; false when this one is too short to have a direction.</summary>
    public bool TryNormalize(out Vector3 unit)
    {
        var length = Length;
        var sound = double.IsFinite(length) && length > 1e-300;
        unit = sound ? 1 / length * this : default;
        return sound;
    }
}
