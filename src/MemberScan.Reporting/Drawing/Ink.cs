using System.Globalization;
using System.Text.Encodings.Web;
using System.Text.Unicode;

namespace MemberScan.Reporting.Drawing;

/// <summary>The few strokes that all pictures of a sheet are made of, as SVG text. <c>sheet.js</c> has the same ones under the same names.</summary>
internal static class Ink
{
    private static readonly HtmlEncoder s_encoder = HtmlEncoder.Create(UnicodeRanges.All);

    /// <summary>A place of a picture to a tenth.</summary>
    public static string C(double value) => (Math.Round(value * 10) / 10 + 0.0).ToString("0.#", CultureInfo.InvariantCulture);

    /// <summary>A path.</summary>
    public static string Path(string style, string data) => data.Length == 0 ? "" : $"<path class=\"{style}\" d=\"{data}\"/>";

    /// <summary>A line of text; <paramref name="anchor"/> is start, middle or end.</summary>
    public static string Text(string style, double x, double y, string anchor, string text) =>
        $"<text class=\"{style}\" x=\"{C(x)}\" y=\"{C(y)}\" text-anchor=\"{anchor}\">{s_encoder.Encode(text)}</text>";

    /// <summary>Path data of an arrow with an open head.</summary>
    public static string Arrow(double x1, double y1, double x2, double y2, double head)
    {
        var length = double.Hypot(x2 - x1, y2 - y1);
        if (length == 0) return "";

        var (ux, uy) = (head * (x2 - x1) / length, head * (y2 - y1) / length);
        return $"M{C(x1)} {C(y1)}L{C(x2)} {C(y2)}M{C(x2 - ux + 0.45 * uy)} {C(y2 - uy - 0.45 * ux)}L{C(x2)} {C(y2)}L{C(x2 - ux - 0.45 * uy)} {C(y2 - uy + 0.45 * ux)}";
    }

    /// <summary>Path data of a straight line.</summary>
    public static string Line(double x1, double y1, double x2, double y2) => $"M{C(x1)} {C(y1)}L{C(x2)} {C(y2)}";

    /// <summary>A circle.</summary>
    public static string Circle(string style, double x, double y, double radius) => $"<circle class=\"{style}\" cx=\"{C(x)}\" cy=\"{C(y)}\" r=\"{C(radius)}\"/>";

    /// <summary>A rectangle.</summary>
    public static string Box(string style, double x, double y, double width, double height) =>
        $"<rect class=\"{style}\" x=\"{C(x)}\" y=\"{C(y)}\" width=\"{C(width)}\" height=\"{C(height)}\"/>";

    /// <summary>A picture of a size with what it shows in words.</summary>
    public static string Picture(double width, double height, string words, string content) =>
        $"<svg viewBox=\"0 0 {C(width)} {C(height)}\" role=\"img\" aria-label=\"{s_encoder.Encode(words)}\">{content}</svg>";

    /// <summary>The smallest of 1, 2, 2.5 and 5 times a power of ten that is not below a value above zero.</summary>
    public static double Round(double value)
    {
        var power = Math.Pow(10, Math.Floor(Math.Log10(value)));
        foreach (var step in new[] { 1, 2, 2.5, 5 })
            if (step * power >= value * (1 - 1e-9)) return step * power;
        return 10 * power;
    }
}
