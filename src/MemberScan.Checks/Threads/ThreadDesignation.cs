using MemberScan.Foundation.Units;

namespace MemberScan.Checks.Threads;

/// <summary>A thread as designated, and the areas and diameters that follow from it.</summary>
/// <param name="Series">Form of the thread.</param>
/// <param name="Nominal">Nominal diameter d [m], &gt; 0.</param>
/// <param name="Pitch">Pitch P [m], &gt; 0.</param>
/// <param name="PitchSource">Where the pitch comes from, in words: given, or the coarse series.</param>
/// <remarks>
/// Metric: ISO 724 and ISO 898-1, from memory: <c>d2 = d − 0.64952P</c>, <c>d3 = d − 1.22687P</c>, <c>As = π/4·((d2 + d3)/2)²</c>.
/// Unified: ASME B1.1, from memory: <c>As = π/4·(d − 0.9743P)²</c>, root diameter <c>d − 1.2990P</c>.
/// </remarks>
public sealed record ThreadDesignation(ThreadSeries Series, double Nominal, double Pitch, string PitchSource)
{
    /// <summary>Pitch diameter of a metric thread <c>d2 = d − 0.64952P</c> [m].</summary>
    public double PitchDiameter => Nominal - 0.64952 * Pitch;

    /// <summary>Root diameter [m]: d3 of a metric thread, the minor diameter of a unified one.</summary>
    public double RootDiameter => Series == ThreadSeries.Metric ? Nominal - 1.22687 * Pitch : Nominal - 1.2990 * Pitch;

    /// <summary>Diameter of the circle whose area is the stress area [m].</summary>
    public double StressDiameter => Series == ThreadSeries.Metric ? (PitchDiameter + RootDiameter) / 2 : Nominal - 0.9743 * Pitch;

    /// <summary>Nominal area <c>π/4·d²</c> [m²].</summary>
    public double NominalArea => Circle(Nominal);

    /// <summary>Tensile stress area As [m²].</summary>
    public double StressArea => Circle(StressDiameter);

    /// <summary>Area at the root [m²].</summary>
    public double RootArea => Circle(RootDiameter);

    /// <summary>The designation as printed, such as <c>M12x1.75</c> or <c>3/8-16</c>.</summary>
    public override string ToString() => Series == ThreadSeries.Metric
        ? $"M{Shown.Number(Nominal * 1e3)}x{Shown.Number(Pitch * 1e3)}"
        : $"{Inches(Nominal / Si.Inch)}-{Shown.Number(Si.Inch / Pitch)}";

    private static double Circle(double diameter) => Math.PI / 4 * diameter * diameter;

    private static string Inches(double inches)
    {
        var sixteenths = (int)Math.Round(16 * inches);
        if (Math.Abs(16 * inches - sixteenths) > 1e-9) return Shown.Number(inches);

        var (whole, part, of) = (sixteenths / 16, sixteenths % 16, 16);
        while (part > 0 && part % 2 == 0) (part, of) = (part / 2, of / 2);
        var fraction = part == 0 ? "" : $"{part}/{of}";
        return whole == 0 ? fraction : part == 0 ? $"{whole}" : $"{whole} {fraction}";
    }
}
