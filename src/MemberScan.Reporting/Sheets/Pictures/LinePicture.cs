using System.Text;
using MemberScan.Mechanics.Forces;
using MemberScan.Reporting.Display;
using MemberScan.Reporting.Drawing;
using MemberScan.Screening.Sheets;

namespace MemberScan.Reporting.Sheets.Pictures;

/// <summary>The six section forces of a situation along the member and the utilization below them; positive values upward.</summary>
internal static class LinePicture
{
    private const double Width = 640, Left = 46, Right = 420, Row = 58, Flat = 22, Amplitude = 19;

    /// <summary>Draws a situation.</summary>
    /// <param name="line">The forces.</param>
    /// <param name="length">Length of the member [m].</param>
    /// <param name="governing">Place of the governing station [m]; null in other situations.</param>
    public static string Of(SituationLine line, double length, double? governing)
    {
        var (from, to) = (Math.Min(0, line.Lines.Min(l => l[0].X)), Math.Max(length, line.Lines.Max(l => l[^1].X)));
        double X(double x) => Left + (x - from) / (to - from) * (Right - Left);
        var content = new StringBuilder();
        var top = 6.0;
        foreach (var component in Enum.GetValues<ForceComponent>()) top = Force(content, line, component, X, top);
        if (!line.IsEnvelope && line.Lines[0].Any(p => p.Utilization is not null)) top = Utilization(content, line, X, top);
        if (governing is { } x)
            content.Append(Ink.Path("limit", Ink.Line(X(x), 4, X(x), top))).Append(Ink.Text("note", X(x), top + 12, "middle", GoverningLabel(x)));
        else content.Append(Ink.Text("note", Left, top + 12, "start", "0 m")).Append(Ink.Text("note", Right, top + 12, "end", $"{Figures.Fixed(to, 3)} m"));
        return Ink.Picture(Width, top + 18, Words(line), content.ToString());
    }

    /// <summary>The picture in words.</summary>
    public static string Words(SituationLine line) => $"Section forces along the member in {ForeignText.Name(line.Situation)}.";

    /// <summary>The two labels of each of the six forces.</summary>
    public static IEnumerable<string> Labels(SituationLine line) => Enum.GetValues<ForceComponent>().SelectMany(c => new[] { LabelsOf(line, c).First, LabelsOf(line, c).Second });

    /// <summary>The label of the governing station.</summary>
    public static string GoverningLabel(double station) => $"▲ {Figures.Fixed(station, 3)} m";

    private static (string First, string Second) LabelsOf(SituationLine line, ForceComponent component)
    {
        var (least, largest) = line.Extremes(component);
        var (low, high) = (SituationLine.Value(least.Forces, component), SituationLine.Value(largest.Forces, component));
        var unit = ShownUnit.Of(SheetWords.Unit(component));
        if (high == low) return (high == 0 ? "zero" : $"all along {unit.WithUnit(high)}", "");

        return ($"largest {unit.WithUnit(high)} at {Figures.Fixed(largest.X, 3)} m", $"least {unit.WithUnit(low)} at {Figures.Fixed(least.X, 3)} m");
    }

    private static double Force(StringBuilder content, SituationLine line, ForceComponent component, Func<double, double> x, double top)
    {
        var (least, largest) = line.Extremes(component);
        var (low, high) = (SituationLine.Value(least.Forces, component), SituationLine.Value(largest.Forces, component));
        var most = Math.Max(Math.Abs(low), Math.Abs(high));
        if (most == 0)
        {
            content.Append(Ink.Text("name", 4, top + 14, "start", component.ToString())).Append(Ink.Path("base", Ink.Line(Left, top + 10, Right, top + 10))).Append(Ink.Text("note", Right + 10, top + 14, "start", "zero"));
            return top + Flat;
        }

        var middle = top + Row / 2;
        double Y(in LinePoint p) => middle - SituationLine.Value(p.Forces, component) / most * Amplitude;
        foreach (var points in line.Lines)
        {
            var way = string.Join('L', points.Select(p => $"{Ink.C(x(p.X))} {Ink.C(Y(p))}"));
            content.Append(Ink.Path("area", $"M{Ink.C(x(points[0].X))} {Ink.C(middle)}L{way}L{Ink.C(x(points[^1].X))} {Ink.C(middle)}Z")).Append(Ink.Path("curve", "M" + way));
            content.Append(Ink.Path("station", string.Concat(points.Where(p => p.IsStation).Select(p => Ink.Line(x(p.X), middle - 2, x(p.X), middle + 2)))));
        }

        content.Append(Ink.Path("base", Ink.Line(Left, middle, Right, middle)));
        content.Append(Ink.Text("name", 4, middle + 4, "start", component.ToString()));
        var (first, second) = LabelsOf(line, component);
        content.Append(Ink.Text("note", Right + 10, middle - 6, "start", first));
        if (second.Length > 0) content.Append(Ink.Text("note", Right + 10, middle + 12, "start", second));
        return top + Row;
    }

    private static double Utilization(StringBuilder content, SituationLine line, Func<double, double> x, double top)
    {
        var points = line.Lines[0].Where(p => p.Utilization is not null).ToList();
        var largest = points.MaxBy(p => p.Utilization!.Value);
        var most = Math.Max(1.05, largest.Utilization!.Value);
        var foot = top + Row;
        double Y(double u) => foot - u / most * (Row - 12);
        var way = string.Join('L', points.Select(p => $"{Ink.C(x(p.X))} {Ink.C(Y(p.Utilization!.Value))}"));
        content.Append(Ink.Path("area use", $"M{Ink.C(x(points[0].X))} {Ink.C(foot)}L{way}L{Ink.C(x(points[^1].X))} {Ink.C(foot)}Z")).Append(Ink.Path("curve", "M" + way));
        content.Append(Ink.Path("base", Ink.Line(Left, foot, Right, foot))).Append(Ink.Path("limit", Ink.Line(Left, Y(1), Right, Y(1))));
        content.Append(Ink.Text("name", 4, foot - 18, "start", "Util.")).Append(Ink.Text("tick", Left - 4, Y(1) + 4, "end", "1"));
        content.Append(Ink.Text("note", Right + 10, foot - 18, "start", $"largest {Figures.Utilization(largest.Utilization!.Value)} at {Figures.Fixed(largest.X, 3)} m"));
        return foot + 6;
    }
}
