using MemberScan.Mechanics.States;

namespace MemberScan.Cli.Sections;

/// <summary>The stress state of one point as three small figures side by side: Mohr's circles, the stress elements in the planes xy and xz.</summary>
internal sealed class StateSvg(Action<FormattableString> add, double left, double top)
{
    /// <summary>Height of the figures.</summary>
    public const int Height = 200;

    private const int Figure = 190;
    private const int Side = 64;
    private const double Middle = 96;
    private const string Ink = "#222";
    private const string Normal = "#1d5f8a";
    private const string Shear = "#9a4a12";

    /// <summary>Draws the state.</summary>
    public void Draw(PointState state)
    {
        Circles(state, left);
        foreach (var element in state.Elements) Element(element, left + Figure * (element.Plane == ElementPlane.XY ? 1 : 2));
    }

    private void Circles(PointState state, double x0)
    {
        add($"<text x=\"{x0:0.#}\" y=\"{top + 14:0.#}\">Mohr's circles [MPa]</text>");
        var span = state.Sigma1 - state.Sigma3;
        if (span <= 0)
        {
            add($"<text x=\"{x0:0.#}\" y=\"{top + Middle:0.#}\">unstressed</text>");
            return;
        }

        var scale = (Figure - 40) / span;
        double X(double sigma) => x0 + 10 + (sigma - state.Sigma3) * scale;
        var y0 = top + Middle;
        add($"<line x1=\"{x0:0.#}\" y1=\"{y0:0.#}\" x2=\"{x0 + Figure - 20:0.#}\" y2=\"{y0:0.#}\" stroke=\"{Ink}\"/>");
        add($"<line x1=\"{X(0):0.##}\" y1=\"{top + 20:0.#}\" x2=\"{X(0):0.##}\" y2=\"{top + 2 * Middle - 20:0.#}\" stroke=\"{Ink}\"/>");
        foreach (var circle in state.Circles)
            add($"<circle class=\"mohr\" cx=\"{X(circle.Centre):0.##}\" cy=\"{y0:0.#}\" r=\"{circle.Radius * scale:0.##}\" fill=\"none\" stroke=\"{Normal}\"/>");
        // The face across x of the section, and the face square to it.
        add($"<circle cx=\"{X(state.Stress.Sigma):0.##}\" cy=\"{y0 - state.Stress.Tau * scale:0.##}\" r=\"3\" fill=\"{Shear}\"/>");
        add($"<text x=\"{x0:0.#}\" y=\"{top + Height - 4:0.#}\" font-size=\"11\">σ1 {state.Sigma1 / 1e6:0.#}, σ3 {state.Sigma3 / 1e6:0.#}, τmax {state.LargestShear.Shear / 1e6:0.#}</text>");
    }

    private void Element(StressElement element, double x0)
    {
        var plane = element.Plane == ElementPlane.XY ? "xy" : "xz";
        var (cx, cy, half) = (x0 + Figure / 2.0 - 10, top + Middle, Side / 2.0);
        add($"<text x=\"{x0:0.#}\" y=\"{top + 14:0.#}\">element {plane} [MPa]</text>");
        add($"<rect class=\"element\" x=\"{cx - half:0.#}\" y=\"{cy - half:0.#}\" width=\"{Side}\" height=\"{Side}\" fill=\"#f4efe4\" stroke=\"{Ink}\"/>");
        if (element.Sigma != 0)
        {
            // Outwards where it pulls.
            foreach (var face in new[] { -1, 1 })
            {
                var (near, far) = (cx + face * (half + 8), cx + face * (half + 34));
                if (element.Sigma > 0) Arrow(near, cy, far, cy, Normal);
                else Arrow(far, cy, near, cy, Normal);
            }
        }

        if (element.Tau != 0)
        {
            var (sense, reach) = (Math.Sign(element.Tau), half - 4);
            foreach (var face in new[] { -1, 1 })
            {
                var (across, along) = (face * (half + 5), sense * face * reach);
                Arrow(cx + across, cy + along, cx + across, cy - along, Shear);                          // up on the face +x
                Arrow(cx - along, cy - across, cx + along, cy - across, Shear);                          // along +x on the upper face
            }
        }

        add($"<text x=\"{x0:0.#}\" y=\"{top + Height - 4:0.#}\" font-size=\"11\">σx {element.Sigma / 1e6:0.#}, τ{plane} {element.Tau / 1e6:0.#}; x to the right, {plane[1..]} up</text>");
    }

    private void Arrow(double x1, double y1, double x2, double y2, string colour)
    {
        var length = double.Hypot(x2 - x1, y2 - y1);
        var (ux, uy) = ((x2 - x1) / length, (y2 - y1) / length);
        add($"<path d=\"M{x1:0.#} {y1:0.#}L{x2:0.#} {y2:0.#}M{x2 - 7 * ux + 3 * uy:0.#} {y2 - 7 * uy - 3 * ux:0.#}L{x2:0.#} {y2:0.#}L{x2 - 7 * ux - 3 * uy:0.#} {y2 - 7 * uy + 3 * ux:0.#}\" fill=\"none\" stroke=\"{colour}\" stroke-width=\"1.5\"/>");
    }
}
