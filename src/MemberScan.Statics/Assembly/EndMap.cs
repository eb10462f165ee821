using MemberScan.Foundation.Geometry;
using MemberScan.Statics.Members;

namespace MemberScan.Statics.Assembly;

/// <summary>From the six unknowns of a node to the displacement of a member's flexible end in the member's axes, across a rigid offset.</summary>
internal static class EndMap
{
    /// <summary>The 6 × 6 map, row-major: rows the member's axes, columns the node's.</summary>
    /// <param name="body">The member.</param>
    /// <param name="arm">From the node to the flexible end [m], global axes.</param>
    /// <param name="nodeAxes">Axes of the node; null for global ones.</param>
    /// <param name="map">Receives the map.</param>
    public static void Fill(MemberBody body, Vector3 arm, MemberAxes? nodeAxes, Span<double> map)
    {
        map.Clear();
        ReadOnlySpan<Vector3> local = [body.Axes.X, body.Axes.Y, body.Axes.Z];
        for (var k = 0; k < 3; k++)
        {
            var shift = Components(local[k], nodeAxes);
            var turn = Components(arm.Cross(local[k]), nodeAxes);                // e·(θ × arm) = θ·(arm × e)
            (map[6 * k], map[6 * k + 1], map[6 * k + 2]) = (shift.X, shift.Y, shift.Z);
            (map[6 * k + 3], map[6 * k + 4], map[6 * k + 5]) = (turn.X, turn.Y, turn.Z);
            (map[18 + 6 * k + 3], map[18 + 6 * k + 4], map[18 + 6 * k + 5]) = (shift.X, shift.Y, shift.Z);
        }
    }

    private static Vector3 Components(Vector3 v, MemberAxes? axes) => axes is null ? v : axes.Components(v);
}
