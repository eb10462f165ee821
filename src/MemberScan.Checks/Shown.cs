using System.Globalization;

namespace MemberScan.Checks;

/// <summary>Numbers as they stand in the formula text of a trace line.</summary>
internal static class Shown
{
    /// <summary>Five significant digits, without trailing zeros.</summary>
    public static string Number(double value)
    {
        if (value == 0) return "0";

        var magnitude = Math.Abs(value);
        if (magnitude is < 1e-4 or >= 1e7) return value.ToString("0.####E+0", CultureInfo.InvariantCulture);

        var decimals = Math.Clamp(4 - (int)Math.Floor(Math.Log10(magnitude)), 0, 8);
        return Math.Round(value, decimals).ToString("0.########", CultureInfo.InvariantCulture);
    }

    /// <summary>A number that a power or sign may follow or precede: negative ones stand in brackets.</summary>
    public static string Factor(double value) => value < 0 ? $"({Number(value)})" : Number(value);

    /// <summary>A stress [Pa] in MPa, the unit left to the formula.</summary>
    public static string MPa(double pascals) => Factor(pascals / 1e6);

    /// <summary>A force [N] in kN, the unit left to the formula.</summary>
    public static string KN(double newtons) => Factor(newtons / 1e3);

    /// <summary>A length [m] in mm, the unit left to the formula.</summary>
    public static string Mm(double metres) => Factor(metres * 1e3);

    /// <summary>An area [m²] in mm², the unit left to the formula.</summary>
    public static string Mm2(double area) => Factor(area * 1e6);

    /// <summary>A section modulus [m³] in mm³, the unit left to the formula.</summary>
    public static string Mm3(double modulus) => Factor(modulus * 1e9);
}
