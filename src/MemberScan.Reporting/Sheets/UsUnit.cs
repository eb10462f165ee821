using MemberScan.Reporting.Display;

namespace MemberScan.Reporting.Sheets;

/// <summary>US customary units beside the SI ones of a sheet.</summary>
/// <remarks>1 in = 25.4 mm and 1 lbf = 4.4482216152605 N are exact (NIST SP 811, appendix B); the others follow.</remarks>
internal static class UsUnit
{
    private const double Inch = 0.0254, Kip = 4448.2216152605;

    /// <summary>Stress: ksi.</summary>
    public static ShownUnit Stress { get; } = new("ksi", Kip / (Inch * Inch));

    /// <summary>Force: kip.</summary>
    public static ShownUnit Force { get; } = new("kip", Kip);

    /// <summary>Moment: kip·in.</summary>
    public static ShownUnit Moment { get; } = new("kip·in", Kip * Inch);

    /// <summary>Length: in.</summary>
    public static ShownUnit Length { get; } = new("in", Inch);

    /// <summary>The unit beside an SI unit; null for ratios and units that have none.</summary>
    public static ShownUnit? Beside(string siUnit) => siUnit switch
    {
        "m" => Length,
        "m²" => new ShownUnit("in²", Inch * Inch),
        "m³" => new ShownUnit("in³", Inch * Inch * Inch),
        "m⁴" => new ShownUnit("in⁴", Inch * Inch * Inch * Inch),
        "N" => Force,
        "N·m" => Moment,
        "Pa" => Stress,
        _ => null,
    };

    /// <summary>A value in US units; an empty text where the unit has none.</summary>
    public static string Of(string siUnit, double si) => Beside(siUnit)?.WithUnit(si) ?? "";
}
