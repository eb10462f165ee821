using System.Text;
using MemberScan.Mechanics.States;
using MemberScan.Reporting.Display;
using MemberScan.Reporting.Drawing;

namespace MemberScan.Reporting.Sheets.Pictures;

/// <summary>The state at the governing point: Mohr's circles, and the stress elements in the planes of x and y and of x and z.</summary>
internal static class StatePicture
{
    private const double Width = 230, Height = 200, Middle = 92, Half = 30;

    /// <summary>Mohr's three circles: σ to the right, τ up; the point is the face across x, and its mirror the face square to it.</summary>
    public static string Circles(PointState state)
    {
        var span = state.Sigma1 - state.Sigma3;
        var content = new StringBuilder();
        if (span <= 0) return Ink.Picture(Width, Height, CircleWords(state), Ink.Text("note", Width / 2, Middle, "middle", "unstressed"));

        var labels = CircleLabels(state);
        const double Diameter = 150;
        var scale = Diameter / span;
        var left = (Width - Diameter) / 2;
        double X(double sigma) => left + (sigma - state.Sigma3) * scale;
        foreach (var (circle, style) in state.Circles.Zip(["mohr", "mohr in", "mohr in"])) content.Append(Ink.Circle(style, X(circle.Centre), Middle, circle.Radius * scale));
        content.Append(Ink.Path("ax", Ink.Arrow(6, Middle, Width - 6, Middle, 6) + Ink.Arrow(X(0), 174, X(0), 8, 6)));
        content.Append(Ink.Text("name", Width - 6, Middle - 6, "end", "σ")).Append(Ink.Text("name", X(0) + 6, 16, "start", "τ"));
        var (sigma, tau) = (X(state.Stress.Sigma), state.Stress.Tau * scale);
        content.Append(Ink.Path("limit", Ink.Line(sigma, Middle - tau, X(0), Middle + tau)));
        content.Append(Ink.Path("point", $"M{Ink.C(sigma)} {Ink.C(Middle - tau - 5)}l5 9h-10z"));
        content.Append(Ink.Path("tickmark", Ink.Line(X(state.Sigma1), Middle - 4, X(state.Sigma1), Middle + 4) + Ink.Line(X(state.Sigma3), Middle - 4, X(state.Sigma3), Middle + 4)));
        content.Append(Ink.Text("name", X(state.Sigma1) + 3, Middle + 16, "start", "σ1")).Append(Ink.Text("name", X(state.Sigma3) - 3, Middle + 16, "end", "σ3"));
        content.Append(Ink.Text("note", Width / 2, Height - 16, "middle", labels[0]))
            .Append(Ink.Text("note", Width / 2, Height - 3, "middle", labels[1]));
        return Ink.Picture(Width, Height, CircleWords(state), content.ToString());
    }

    /// <summary>A stress element: x to the right, the other axis up.</summary>
    public static string Element(StressElement element)
    {
        var (cx, labels) = (Width / 2, ElementLabels(element));
        var content = new StringBuilder(Ink.Box("element", cx - Half, Middle - Half, 2 * Half, 2 * Half));
        if (element.Sigma != 0)
        {
            var (near, far) = element.Sigma > 0 ? (Half + 10, Half + 40) : (Half + 40, Half + 10);
            content.Append(Ink.Path("pull", Ink.Arrow(cx + near, Middle, cx + far, Middle, 7) + Ink.Arrow(cx - near, Middle, cx - far, Middle, 7)));
            content.Append(Ink.Text("note", Width - 2, Middle + 18, "end", labels[0]));
        }

        if (element.Tau != 0)
        {
            var s = Math.Sign(element.Tau) * (Half - 3);
            const double Off = Half + 6;
            content.Append(Ink.Path("flow", Ink.Arrow(cx + Off, Middle + s, cx + Off, Middle - s, 7) + Ink.Arrow(cx - Off, Middle - s, cx - Off, Middle + s, 7)
                + Ink.Arrow(cx - s, Middle - Off, cx + s, Middle - Off, 7) + Ink.Arrow(cx + s, Middle + Off, cx - s, Middle + Off, 7)));
            content.Append(Ink.Text("note", cx, Middle - Half - 14, "middle", labels[1]));
        }

        content.Append(Ink.Path("ax", Ink.Arrow(12, 172, 40, 172, 5) + Ink.Arrow(12, 172, 12, 144, 5)));
        content.Append(Ink.Text("name", 44, 176, "start", "x")).Append(Ink.Text("name", 12, 139, "middle", labels[3]));
        content.Append(Ink.Text("note", cx, Height - 3, "middle", labels[2]));
        return Ink.Picture(Width, Height, ElementWords(element), content.ToString());
    }

    /// <summary>What stands under the circles, two lines.</summary>
    public static string[] CircleLabels(PointState state) => [$"σ1 {Mpa(state.Sigma1)}, σ3 {Mpa(state.Sigma3)}", $"τmax {Mpa(state.LargestShear.Shear)}"];

    /// <summary>The circles in words.</summary>
    public static string CircleWords(PointState state) =>
        $"Mohr's circles: σ1 {Mpa(state.Sigma1)}, σ2 0, σ3 {Mpa(state.Sigma3)}, largest shear {Mpa(state.LargestShear.Shear)}.";

    /// <summary>Beside the arrows of σ, beside those of τ, under the element, and its upright axis.</summary>
    public static string[] ElementLabels(StressElement element) =>
        [Mpa(element.Sigma), Mpa(element.Tau), $"σx {Mpa(element.Sigma)}, τ{Plane(element)} {Mpa(element.Tau)}", Plane(element)[1..]];

    /// <summary>The element in words.</summary>
    public static string ElementWords(StressElement element) => $"Stress element in the plane {Plane(element)}: {ElementLabels(element)[2]}.";

    private static string Plane(StressElement element) => element.Plane == ElementPlane.XY ? "xy" : "xz";

    private static string Mpa(double stress) => ShownUnit.Stress.WithUnit(stress);
}
