using System.Globalization;
using System.Text;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.States;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Cli.Sections;

/// <summary>A section to scale as a drawing: von Mises stress in ten bands, the outline, the governing point and the stress state there. y to the right, z up.</summary>
internal static class SectionSvg
{
    private const int Width = 640;
    private const int Margin = 40;
    private const int Cells = 120;
    private const int Bands = 10;

    /// <summary>The drawing of a field under given forces.</summary>
    public static string Draw(StressField field, SectionForces forces, GoverningPoint governing)
    {
        var rings = OutlineRings.Of(field.Section);
        var (leastY, largestY) = (rings[0].Min(p => p.Y), rings[0].Max(p => p.Y));
        var (leastZ, largestZ) = (rings[0].Min(p => p.Z), rings[0].Max(p => p.Z));
        var extent = Math.Max(largestY - leastY, largestZ - leastZ);
        var scale = (Width - 2 * Margin) / extent;
        double X(double y) => Margin + (y - leastY) * scale;
        double Y(double z) => Margin + (largestZ - z) * scale;
        var drawn = 2 * Margin + (largestZ - leastZ) * scale + 40;
        var height = drawn + StateSvg.Height + 10;

        var svg = new StringBuilder();
        void Add(FormattableString text) => svg.Append(text.ToString(CultureInfo.InvariantCulture)).Append('\n');

        Add($"<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 {Width} {height:0.#}\" font-family=\"sans-serif\" font-size=\"13\">");
        Add($"<title>{Escaped(field.Section.Designation)}: von Mises stress</title>");
        var cell = extent / Cells;
        for (var z = leastZ + cell / 2; z < largestZ; z += cell)
        {
            for (var y = leastY + cell / 2; y < largestY; y += cell)
            {
                if (!field.Contains(y, z)) continue;
                var share = governing.Value > 0 ? field.At(forces, y, z).VonMises / governing.Value : 0;
                Add($"<rect x=\"{X(y - cell / 2):0.##}\" y=\"{Y(z + cell / 2):0.##}\" width=\"{cell * scale + 0.4:0.##}\" height=\"{cell * scale + 0.4:0.##}\" fill=\"{Colour(share)}\"/>");
            }
        }

        foreach (var ring in rings)
        {
            var points = string.Join(' ', ring.Select(p => string.Create(CultureInfo.InvariantCulture, $"{X(p.Y):0.##},{Y(p.Z):0.##}")));
            Add($"<polygon points=\"{points}\" fill=\"none\" stroke=\"#222\" stroke-width=\"1.5\"/>");
        }

        Add($"<circle cx=\"{X(governing.Y):0.##}\" cy=\"{Y(governing.Z):0.##}\" r=\"6\" fill=\"none\" stroke=\"#000\" stroke-width=\"2\"/>");
        Add($"<text x=\"{Margin}\" y=\"{drawn - 30:0.#}\">{Escaped(field.Section.Designation)}, {(field.Model == ShearModel.Elementary ? "elementary" : "elasticity")}; bands of a tenth of the largest</text>");
        Add($"<text x=\"{Margin}\" y=\"{drawn - 12:0.#}\">largest von Mises {governing.Value / 1e6:0.##} MPa at y {governing.Y * 1e3:0.###} mm, z {governing.Z * 1e3:0.###} mm ({Escaped(governing.Place)}); y to the right, z up</text>");
        new StateSvg(Add, Margin, drawn).Draw(PointState.Of(governing.State));
        Add($"</svg>");
        return svg.ToString();
    }

    // From pale to dark in bands; what exceeds the governing value is a local peak and stands out.
    private static string Colour(double share)
    {
        if (share > 1 + 1e-6) return "#7a2fb5";

        var band = Math.Min(Bands - 1, (int)(share * Bands)) / (Bands - 1.0);
        return string.Create(CultureInfo.InvariantCulture, $"#{(int)(245 - 60 * band):x2}{(int)(240 - 190 * band):x2}{(int)(225 - 185 * band):x2}");
    }

    private static string Escaped(string text) => text.Replace("&", "&amp;", StringComparison.Ordinal).Replace("<", "&lt;", StringComparison.Ordinal).Replace(">", "&gt;", StringComparison.Ordinal);
}
