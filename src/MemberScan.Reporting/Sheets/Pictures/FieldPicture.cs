using System.Collections.Immutable;
using System.Globalization;
using System.Text;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Stress;
using MemberScan.Reporting.Display;
using MemberScan.Reporting.Drawing;
using MemberScan.Screening.Record;
using MemberScan.Screening.Sheets;

namespace MemberScan.Reporting.Sheets.Pictures;

/// <summary>The section to scale with contours of a stress, the neutral axis, arrows of the shear stress and the governing point; seen from the +x end, y to the right, z up.</summary>
internal sealed class FieldPicture
{
    /// <summary>Width of the large picture.</summary>
    public const double LargeWidth = 340;

    private const int Bands = 8, BandsEachSide = 5;
    private const double LeastArrow = 0.06;

    private readonly SectionSamples _samples;
    private readonly string _id;
    private readonly double _scale, _x, _y, _side, _middle;

    /// <summary>Prepares a picture.</summary>
    /// <param name="samples">The section.</param>
    /// <param name="id">Names the outline in the page; unique in it.</param>
    /// <param name="size">Width and height of the part that shows the section.</param>
    public FieldPicture(SectionSamples samples, string id, double size)
    {
        (_samples, _id) = (samples, id);
        var outer = samples.Rings[0];
        var (leastY, mostY, leastZ, mostZ) = (outer.Min(p => p.Y), outer.Max(p => p.Y), outer.Min(p => p.Z), outer.Max(p => p.Z));
        (_side, _middle) = (size * 0.74, size / 2);
        _scale = _side / Math.Max(mostY - leastY, mostZ - leastZ);
        (_x, _y) = (_middle - (leastY + mostY) / 2 * _scale, _middle + (leastZ + mostZ) / 2 * _scale);
    }

    /// <summary>The large picture with its three choices of stress, each in a layer of its own.</summary>
    public static string Large(SheetData data, Governing governing, string id)
    {
        var picture = new FieldPicture(data.Samples, id, LargeWidth);
        var states = data.Samples.Over(data.Whole.Forces);
        var content = new StringBuilder(picture.Outline());
        foreach (var (measure, layer) in new[] { (StressMeasure.VonMises, "vm"), (StressMeasure.AbsoluteSigma, "sg"), (StressMeasure.Tau, "ta") })
            content.Append(CultureInfo.InvariantCulture, $"<g class=\"layer {layer}\">").Append(picture.Contours(states, measure)).Append(picture.Legend(states, measure)).Append("</g>");
        content.Append(picture.Frame()).Append(Ink.Path("flow", picture.Arrows(states)));
        content.Append(picture.NeutralAxis(data.Plane)).Append(picture.Point(governing.Point.Y, governing.Point.Z));
        return Ink.Picture(LargeWidth, LargeWidth + 52, SheetWords.FieldWords(governing), content.ToString());
    }

    /// <summary>The picture of one force alone: σ of N, My, Mz; τ with its arrows of Vy, Vz, T.</summary>
    public static string Small(SheetData data, FieldPart part, Governing governing, string id)
    {
        var picture = new FieldPicture(data.Samples, id, 120);
        var states = data.Samples.Over(part.Forces);
        var isShear = IsShear(part.Component!.Value);
        var content = picture.Outline() + picture.Contours(states, isShear ? StressMeasure.Tau : StressMeasure.AbsoluteSigma)
            + Ink.Path("edge", picture.EdgePath()) + (isShear ? Ink.Path("flow", picture.Arrows(states)) : picture.NeutralAxis(data.Samples.Plane(part.Forces)))
            + picture.Point(governing.Point.Y, governing.Point.Z);
        return Ink.Picture(120, 120, SheetWords.AloneWords(part), content);
    }

    /// <summary>Whether a force causes shear stresses and no normal ones.</summary>
    public static bool IsShear(ForceComponent component) => component is ForceComponent.Vy or ForceComponent.Vz or ForceComponent.T;

    private static double Value(in StressState state, StressMeasure measure) => measure switch
    {
        StressMeasure.VonMises => state.VonMises,
        StressMeasure.Tau => state.Tau,
        _ => state.Sigma,
    };

    /// <summary>Value of one band [Pa]: a round number of MPa; 0 where nothing acts.</summary>
    private double Step(ImmutableArray<StressState> states, StressMeasure measure)
    {
        var largest = 0.0;
        for (var i = 0; i < states.Length; i++)
            if (_samples.Points[i].IsInside) largest = Math.Max(largest, Math.Abs(Value(states[i], measure)));
        return largest > 1 ? Ink.Round(largest / 1e6 / (measure == StressMeasure.AbsoluteSigma ? BandsEachSide : Bands)) * 1e6 : 0;
    }

    private string Contours(ImmutableArray<StressState> states, StressMeasure measure)
    {
        var step = Step(states, measure);
        if (step == 0) return Use("b0");

        var values = states.Select(s => Value(s, measure)).ToArray();
        var isSigned = measure == StressMeasure.AbsoluteSigma;
        var text = new StringBuilder(Use(isSigned ? "c5" : "b0")).Append(CultureInfo.InvariantCulture, $"<g clip-path=\"url(#{_id})\">");
        for (var band = isSigned ? 1 - BandsEachSide : 1; band < (isSigned ? BandsEachSide : Bands); band++)
            text.Append(Ink.Path(Style(band, isSigned), ContourLines.Path(_samples.Grid, values, band * step, _x, _y, _scale)));
        // Compression is hatched too, so that it stays apart from tension in greys.
        if (isSigned) text.Append(Hatched(ContourLines.Path(_samples.Grid, [.. values.Select(v => -v)], 1e-9 * step, _x, _y, _scale)));
        return text.Append("</g>").ToString();
    }

    private static string Style(int band, bool isSigned) => !isSigned ? $"b{band}" : band >= 0 ? $"t{band + 1}" : $"c{-band}";

    private string Use(string style) => $"<use class=\"{style}\" href=\"#{_id}-o\"/>";

    private string Outline() => $"<defs><path id=\"{_id}-o\" clip-rule=\"evenodd\" fill-rule=\"evenodd\" d=\"{EdgePath()}\"/><clipPath id=\"{_id}\"><use href=\"#{_id}-o\" clip-rule=\"evenodd\"/></clipPath>"
        + $"<pattern id=\"{_id}-p\" width=\"5\" height=\"5\" patternUnits=\"userSpaceOnUse\" patternTransform=\"rotate(45)\"><path class=\"pressed\" d=\"M0 0V5\"/></pattern></defs>";

    private string Hatched(string data) => data.Length == 0 ? "" : $"<path fill=\"url(#{_id}-p)\" d=\"{data}\"/>";

    private string EdgePath() => string.Concat(_samples.Rings.Select(ring => $"M{string.Join('L', ring.Select(p => $"{Ink.C(X(p.Y))} {Ink.C(Y(p.Z))}"))}Z"));

    private double X(double y) => _x + y * _scale;

    private double Y(double z) => _y - z * _scale;

    private string Frame()
    {
        var outer = _samples.Rings[0];
        var (left, right, top, bottom) = (X(outer.Min(p => p.Y)), X(outer.Max(p => p.Y)), Y(outer.Max(p => p.Z)), Y(outer.Min(p => p.Z)));
        var (far, foot) = (2 * _middle - 4, 2 * _middle - 14);
        return Ink.Path("edge", EdgePath())
            + Ink.Path("ax", Ink.Arrow(4, _y, far, _y, 7) + Ink.Arrow(_x, foot, _x, 4, 7))
            + Ink.Text("name", far, _y - 6, "end", "y") + Ink.Text("name", _x + 7, 14, "start", "z")
            + Ink.Path("dimension", $"M{Ink.C(left)} {Ink.C(foot)}H{Ink.C(right)}M{Ink.C(left)} {Ink.C(foot - 5)}v10M{Ink.C(right)} {Ink.C(foot - 5)}v10M12 {Ink.C(top)}V{Ink.C(bottom)}M7 {Ink.C(top)}h10M7 {Ink.C(bottom)}h10")
            + Ink.Text("note", _middle + 8, foot - 4, "start", ShownUnit.Dimension.WithUnit((right - left) / _scale))
            + Ink.Text("note", 4, top - 7, "start", ShownUnit.Dimension.WithUnit((bottom - top) / _scale));
    }

    private string Arrows(ImmutableArray<StressState> states)
    {
        var largest = _samples.ArrowSites.Select(i => states[i].Tau).DefaultIfEmpty(0).Max();
        if (largest <= 1) return "";

        var text = new StringBuilder();
        foreach (var site in _samples.ArrowSites)
        {
            var (state, at) = (states[site], _samples.Points[site]);
            if (state.Tau < LeastArrow * largest) continue;

            var half = 0.05 * _side / largest;
            var (dx, dy) = (state.TauXY * half, -state.TauXZ * half);
            text.Append(Ink.Arrow(X(at.Y) - dx, Y(at.Z) - dy, X(at.Y) + dx, Y(at.Z) + dy, 0.02 * _side));
        }

        return text.ToString();
    }

    private string NeutralAxis((double N, double PerY, double PerZ) plane)
    {
        var slope = double.Hypot(plane.PerY, plane.PerZ);
        if (slope == 0) return "";

        // The foot of the axis from the centroid, and its direction.
        var (footY, footZ) = (-plane.N * plane.PerY / (slope * slope), -plane.N * plane.PerZ / (slope * slope));
        var reach = 0.56 * _side / _scale;
        var off = double.Hypot(footY, footZ);
        if (off >= reach) return "";

        var half = Math.Sqrt(reach * reach - off * off);
        var (dy, dz) = (-plane.PerZ / slope * half, plane.PerY / slope * half);
        return Ink.Path("neutral", Ink.Line(X(footY - dy), Y(footZ - dz), X(footY + dy), Y(footZ + dz)));
    }

    private string Point(double y, double z) => Ink.Circle("pointHalo", X(y), Y(z), 0.03 * _side) + Ink.Path("point", $"M{Ink.C(X(y))} {Ink.C(Y(z) - 0.022 * _side)}l{Ink.C(0.02 * _side)} {Ink.C(0.036 * _side)}h{Ink.C(-0.04 * _side)}z");

    private string Legend(ImmutableArray<StressState> states, StressMeasure measure)
    {
        var step = Step(states, measure);
        var top = 2 * _middle + 14;
        var name = SheetWords.MeasureSymbol(measure);
        if (step == 0) return Ink.Text("note", 4, top + 12, "start", $"{name} is zero all over");

        var isSigned = measure == StressMeasure.AbsoluteSigma;
        var (first, count) = isSigned ? (-BandsEachSide, 2 * BandsEachSide) : (0, Bands);
        var width = (2 * _middle - 52) / count;
        var text = new StringBuilder(Ink.Text("note", 2, top + 11, "start", name));
        for (var i = 0; i < count; i++)
        {
            text.Append(Ink.Box(Style(first + i, isSigned), 37 + i * width, top, width, 13));
            if (isSigned && first + i < 0) text.Append(Hatched($"M{Ink.C(37 + i * width)} {Ink.C(top)}h{Ink.C(width)}v13h{Ink.C(-width)}z"));
        }

        for (var i = 0; i <= count; i++)
        {
            var value = (first + i) * step;
            text.Append(Ink.Text("tick", 37 + i * width, top + 24, "middle", SheetWords.Short(value / 1e6)));
            if (i % 2 == 0) text.Append(Ink.Text("tick us", 37 + i * width, top + 35, "middle", SheetWords.Short(value / UsUnit.Stress.Size)));
        }

        return text.Append(Ink.Text("tick", 0, top + 24, "start", "MPa")).Append(Ink.Text("tick us", 0, top + 35, "start", "ksi")).ToString();
    }
}
