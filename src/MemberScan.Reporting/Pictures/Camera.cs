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

    /// <summary>A camera that sees a box from its right, front and above, and stands within the room around it.</summary>
    /// <remarks>
    /// The whole box is seen where the room lets the camera stand far enough back. Where it does not, the camera stands as far back as the room goes, with
    /// the whole box before it, and sees what its angle takes in: a viewpoint outside of a model is often behind its walls or its site.
    /// </remarks>
    /// <param name="seen">What is looked at.</param>
    /// <param name="room">What the camera must not leave; contains the other box.</param>
    public static Camera On(Box seen, Box room)
    {
        ArgumentNullException.ThrowIfNull(seen);
        ArgumentNullException.ThrowIfNull(room);
        _ = new Vector3(-1, 2, -0.8).TryNormalize(out var direction);

        // The ball around the box touches the cone of sight at this distance.
        var distance = Margin * Math.Max(seen.Radius, LeastRadius) / Math.Sin(FieldOfViewDegrees * Math.PI / 360);
        var free = seen.Centre - distance * direction;
        if (room.Contains(free)) return Towards(free, direction);

        // Beyond the box on all three sides, so that all of it is before the camera, then back into the room.
        var position = room.Nearest(new Vector3(Math.Max(free.X, seen.Most.X), Math.Min(free.Y, seen.Least.Y), Math.Max(free.Z, seen.Most.Z)));
        return (seen.Centre - position).TryNormalize(out var bounded) ? Towards(position, bounded) : Towards(free, direction);
    }

    private static Camera Towards(Vector3 position, Vector3 direction)
    {
        // Straight down there is no up by the vertical; north serves.
        if (!direction.Cross(Vector3.UnitZ).TryNormalize(out var right)) _ = direction.Cross(Vector3.UnitY).TryNormalize(out right);
        return new Camera(position, direction, right.Cross(direction));
    }
}
