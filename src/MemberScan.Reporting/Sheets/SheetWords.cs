using System.Globalization;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Stress;
using MemberScan.Reporting.Display;
using MemberScan.Reporting.Sheets.Pictures;
using MemberScan.Screening.Record;
using MemberScan.Screening.Sheets;

namespace MemberScan.Reporting.Sheets;

/// <summary>The words of a sheet: the same on the page, in its script's drawings and on the terminal.</summary>
internal static class SheetWords
{
    /// <summary>The six forces with what they are.</summary>
    public static string Name(ForceComponent component) => component switch
    {
        ForceComponent.N => "N, axial, tension positive",
        ForceComponent.Vy => "Vy, shear along y",
        ForceComponent.Vz => "Vz, shear along z",
        ForceComponent.T => "T, torsion about x",
        ForceComponent.My => "My, bending about y",
        _ => "Mz, bending about z",
    };

    /// <summary>The SI unit of a force.</summary>
    public static string Unit(ForceComponent component) => component is ForceComponent.T or ForceComponent.My or ForceComponent.Mz ? "N·m" : "N";

    /// <summary>The stresses of a state with their symbols and names.</summary>
    public static IEnumerable<(string Name, double Value)> Stresses(StressState state) =>
    [
        ("σ, along x", state.Sigma), ("τxy", state.TauXY), ("τxz", state.TauXZ), ("τ = √(τxy² + τxz²)", state.Tau),
        ("σvM = √(σ² + 3τ²)", state.VonMises), ("σ1, largest principal", state.Sigma1), ("σ3, smallest principal", state.Sigma3),
    ];

    /// <summary>Symbol of the stress that contours show.</summary>
    public static string MeasureSymbol(StressMeasure measure) => measure switch
    {
        StressMeasure.VonMises => "σvM",
        StressMeasure.Tau => "τ",
        _ => "σ",
    };

    /// <summary>The large picture in words.</summary>
    public static string FieldWords(Governing governing) =>
        $"Cross-section {ForeignText.Name(governing.Section)} with contours of stress; governing point at y = {ShownUnit.Dimension.WithUnit(governing.Point.Y)}, z = {ShownUnit.Dimension.WithUnit(governing.Point.Z)} from the centroid.";

    /// <summary>The picture of a force alone in words.</summary>
    public static string AloneWords(FieldPart part) =>
        $"{part.Component} alone: {(FieldPicture.IsShear(part.Component!.Value) ? "τ" : "σ")} over the section.";

    /// <summary>What a force alone gives at the governing point.</summary>
    public static string AtPoint(FieldPart part) => FieldPicture.IsShear(part.Component!.Value)
        ? $"τ {ShownUnit.Stress.WithUnit(part.AtPoint.Tau)}"
        : $"σ {ShownUnit.Stress.WithUnit(part.AtPoint.Sigma)}";

    /// <summary>What is to be said of the neutral axis.</summary>
    public static string NeutralAxis(SheetData data)
    {
        var (n, perY, perZ) = data.Plane;
        var slope = double.Hypot(perY, perZ);
        if (slope == 0) return n == 0 ? "No normal stress." : "No neutral axis: σ is the same all over.";

        var outside = data.Samples.Rings[0].All(p => n + perY * p.Y + perZ * p.Z > 0) || data.Samples.Rings[0].All(p => n + perY * p.Y + perZ * p.Z < 0);
        return outside ? "The neutral axis lies outside the section: σ has one sign all over." : "Dash-dotted: the neutral axis.";
    }

    /// <summary>A remark where the stresses of single forces do not add up to the whole; empty where they do.</summary>
    public static string DoesNotAddUp(SheetData data) => data.Samples.AddsUp || data.Whole.Forces is { Vy: 0 } or { Vz: 0 }
        ? ""
        : "The elementary shear of a round bar follows the resultant of Vy and Vz: drawn alone, the two do not add up to the whole.";

    /// <summary>A number of a scale: four significant figures without trailing zeros, a true minus sign.</summary>
    public static string Short(double value)
    {
        var text = value.ToString("G4", CultureInfo.InvariantCulture);
        return value == 0 ? "0" : text.Replace('-', Figures.Minus);
    }
}
