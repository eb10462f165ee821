using MemberScan.Foundation.Geometry;
using MemberScan.Reporting.Drawing;

namespace MemberScan.Reporting.Sheets.Pictures;

/// <summary>The local axes of a member, seen from the south-east and above (isometric), beside the project's X, Y and Z.</summary>
internal static class AxesPicture
{
    private const double Width = 230, Height = 150, Reach = 52;

    /// <summary>What it shows.</summary>
    public const string Words = "Local axes x, y and z of the member beside the axes X, Y and Z of the project.";

    /// <summary>Draws the axes: x as a bar with its direction, y and z at its start.</summary>
    public static string Of(MemberAxes axes)
    {
        var (ox, oy) = (132.0, 84.0);
        string Arm(Vector3 axis, string name, string style, double length, double px, double py)
        {
            var (dx, dy) = Seen(axis);
            return Ink.Path(style, Ink.Arrow(px, py, px + dx * length, py + dy * length, 6)) + Ink.Text("name", px + dx * (length + 9), py + dy * (length + 9) + 4, "middle", name);
        }

        var project = Arm(Vector3.UnitX, "X", "ax", 22, 34, 112) + Arm(Vector3.UnitY, "Y", "ax", 22, 34, 112) + Arm(Vector3.UnitZ, "Z", "ax", 22, 34, 112);
        var (bx, by) = Seen(axes.X);
        var bar = Ink.Path("bar", Ink.Line(ox, oy, ox + bx * Reach, oy + by * Reach));
        return Ink.Picture(Width, Height, Words,
            project + bar + Arm(axes.X, "x", "own", Reach + 8, ox, oy) + Arm(axes.Y, "y", "own", Reach - 12, ox, oy) + Arm(axes.Z, "z", "own", Reach - 12, ox, oy));
    }

    // X to the lower right, Y to the upper right, Z up.
    private static (double X, double Y) Seen(Vector3 v) => (0.866 * (v.X + v.Y), 0.5 * (v.X - v.Y) - v.Z);
}
