using System.Globalization;

namespace MemberScan.Ifc.Materials;

/// <summary>Guesses the unit that a value of a material was meant in, where the one it stands in gives no sense.</summary>
internal static class UnitSlip
{
    private static readonly (string Name, double Factor)[] s_units =
        [("MPa", 1e6), ("GPa", 1e9), ("ksi", 6.894757293168361e6), ("psi", 6.894757293168361e3), ("million psi", 6.894757293168361e9), ("kN/cm²", 1e7), ("kPa", 1e3), ("Pa", 1)];

    /// <summary>Ranges that structural metals lie in [Pa].</summary>
    private const double LeastYield = 100e6, LargestYield = 1200e6, LeastModulus = 60e9, LargestModulus = 230e9;

    /// <summary>A sentence part with the units in which a number makes a strength; empty when none does.</summary>
    public static string OfYield(double written) => Words(written, LeastYield, LargestYield);

    /// <summary>A sentence part with the units in which a number makes a modulus; empty when none does.</summary>
    public static string OfModulus(double written) => Words(written, LeastModulus, LargestModulus);

    private static string Words(double written, double least, double largest)
    {
        var fitting = s_units.Where(u => written * u.Factor >= least && written * u.Factor <= largest)
            .Select(u => string.Create(CultureInfo.InvariantCulture, $"in {u.Name} it would be {written * u.Factor / 1e6:0.###} MPa")).ToList();
        return fitting.Count == 0 ? "" : string.Create(CultureInfo.InvariantCulture, $"; the number written is {written:0.######}, {string.Join(", ", fitting)}");
    }
}
