namespace MemberScan.Checks.Aisc360.Sections;

/// <summary>AISC 360-22, B4.1, Tables B4.1a and B4.1b: limits of the walls of hollow sections.</summary>
/// <remarks>From memory. Flat widths b and h are side − 3t (B4.1b(d)).</remarks>
public static class WallLimits
{
    /// <summary>Where the limits come from.</summary>
    public static Clause Clause { get; } = StrengthFactor.Clause("B4.1", "");

    /// <summary>Compression, walls of rectangular sections: λr [-].</summary>
    public static double FlatInCompression(double E, double F_y) => 1.40 * Math.Sqrt(E / F_y);

    /// <summary>Compression, round sections: λr of D/t [-].</summary>
    public static double RoundInCompression(double E, double F_y) => 0.11 * E / F_y;

    /// <summary>Flexure, flanges of rectangular sections: λp and λr [-].</summary>
    public static (double Compact, double Slender) FlangeInFlexure(double E, double F_y) => (1.12 * Math.Sqrt(E / F_y), 1.40 * Math.Sqrt(E / F_y));

    /// <summary>Flexure, webs of rectangular sections: λp and λr [-].</summary>
    public static (double Compact, double Slender) WebInFlexure(double E, double F_y) => (2.42 * Math.Sqrt(E / F_y), 5.70 * Math.Sqrt(E / F_y));

    /// <summary>Flexure, round sections: λp and λr of D/t [-].</summary>
    public static (double Compact, double Slender) RoundInFlexure(double E, double F_y) => (0.07 * E / F_y, 0.31 * E / F_y);
}
