using System.Globalization;
using System.Text.RegularExpressions;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Reporting.Drawing;

/// <summary>Reads a section's designation for drawing; text of any other form has no drawing.</summary>
public static partial class SectionText
{
    /// <summary>Longest designation that is tried [UTF-16 units].</summary>
    public const int LongestText = 200;

    /// <summary>The section of a text such as <c>tube 48.3x3.2 mm</c>; further words may follow behind a blank, comma or bracket.</summary>
    /// <returns>Null when the text is of no known form or its dimensions make no section.</returns>
    public static CrossSection? Read(string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        if (text.Length > LongestText) return null;
        if (RoundForm().Match(text) is { Success: true } round) return MakeRound(Metres(round, 1));
        if (TubeForm().Match(text) is { Success: true } tube) return MakeTube(Metres(tube, 1), Metres(tube, 2));
        if (RectangleForm().Match(text) is { Success: true } rectangle) return MakeRectangle(rectangle);
        return BoxForm().Match(text) is { Success: true } box ? MakeBox(box) : null;
    }

    private static Round? MakeRound(double diameter) => Round.Fault(diameter / 2) is null ? new Round(diameter / 2) : null;

    private static Tube? MakeTube(double diameter, double wall) =>
        Tube.Fault(diameter / 2, wall) is null ? new Tube(diameter / 2, wall) : null;

    private static CrossSection? MakeRectangle(Match match)
    {
        var (width, depth) = (Metres(match, 1), Metres(match, 2));
        if (!match.Groups[3].Success)
            return Rectangle.Fault(width, depth) is null ? new Rectangle(width, depth) : null;

        var radius = Metres(match, 3);
        return RoundedRectangle.Fault(width, depth, radius) is null ? new RoundedRectangle(width, depth, radius) : null;
    }

    private static Box? MakeBox(Match match)
    {
        var (width, depth, wall) = (Metres(match, 1), Metres(match, 2), Metres(match, 3));
        var (outer, inner) = match.Groups[4].Success ? (Metres(match, 4), Metres(match, 5)) : (0, 0);
        return Box.Fault(width, depth, wall, outer, inner) is null ? new Box(width, depth, wall, outer, inner) : null;
    }

    private static double Metres(Match match, int group) =>
        double.Parse(match.Groups[group].ValueSpan, NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture) * 1e-3;

    private const string Number = @"([0-9]{1,6}(?:\.[0-9]{1,6})?)";
    private const string End = @"(?=$|[ ,;(\[])";

    [GeneratedRegex("^round " + Number + " mm" + End, RegexOptions.CultureInvariant)]
    private static partial Regex RoundForm();

    [GeneratedRegex("^tube " + Number + "x" + Number + " mm" + End, RegexOptions.CultureInvariant)]
    private static partial Regex TubeForm();

    [GeneratedRegex("^rectangle " + Number + "x" + Number + " mm(?: r " + Number + ")?" + End, RegexOptions.CultureInvariant)]
    private static partial Regex RectangleForm();

    [GeneratedRegex("^box " + Number + "x" + Number + "x" + Number + " mm(?: ro " + Number + " ri " + Number + ")?" + End, RegexOptions.CultureInvariant)]
    private static partial Regex BoxForm();
}
