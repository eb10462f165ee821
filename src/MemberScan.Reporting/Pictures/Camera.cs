using MemberScan.Foundation.Geometry;

namespace MemberScan.Reporting.Pictures;

/// <summary>A perspective camera in project coordinates [m].</summary>
/// <param name="Position">Where it stands.</param>
/// <param name="Direction">Unit vector of sight.</param>
/// <param name="Up">Unit vector that is up in the picture, square to the direction.</param>
public sealed record Camera(Vector3 Position, Vector3 Direction, Vector3 Up)
{
    /// <summary>Vertical angle of view [degrees]: within the 45 to 60 of BCF 2.1.</summary>
    public const double FieldOfViewDegrees = 60;

    /// <summary>Width over height of the picture [-].</summary>
    public const double AspectRatio = 4.0 / 3.0;

    /// <summary>Radius that is shown at least [m], so that one short member does not fill the picture.</summary>
    public const double LeastRadius = 0.5;

    private const double Margin = 1.1;

    /// <summary>Unit vector to the right of the picture.</summary>
    public Vector3 Right => Direction.Cross(Up);

    /// <summary>Tangent of half of the vertical angle of view.</summary>
    internal static double HalfHeight => Math.Tan(FieldOfViewDegrees * Math.PI / 360);

    /// <summary>A camera that sees a box whole, from its front, right and above.</summary>
    public static Camera On(Box box)
    {
        ArgumentNullException.ThrowIfNull(box);
        _ = new Vector3(-1, 2, -0.8).TryNormalize(out var direction);
        _ = direction.Cross(Vector3.UnitZ).TryNormalize(out var right);

        // The ball around the box touches the cone of sight at this distance.
        var distance = Margin * Math.Max(box.Radius, LeastRadius) / Math.Sin(FieldOfViewDegrees * Math.PI / 360);
        return new Camera(box.Centre - distance * direction, direction, right.Cross(direction));
    }
}
