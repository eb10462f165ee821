namespace MemberScan.Checks.En1993.Sections;

/// <summary>EN 1993-1-1:2005, 6.2.5: bending moment about one axis.</summary>
/// <remarks>From memory. Of round sections the resultant moment counts.</remarks>
public static class BendingResistance
{
    /// <summary>Where the check comes from.</summary>
    public static Clause Clause { get; } = Clauses.Of("6.2.5", "(6.12)");

    /// <summary>Design resistance of classes 1 and 2: <c>W_pl·f_y/γM0</c> [N·m].</summary>
    /// <param name="W_pl">Plastic modulus [m³].</param>
    /// <param name="f_y">Yield strength [Pa].</param>
    /// <param name="gamma_M0">γM0 [-].</param>
    public static double M_pl_Rd(double W_pl, double f_y, double gamma_M0) => W_pl * f_y / gamma_M0;      // (6.13)

    /// <summary>Design resistance of class 3: <c>W_el,min·f_y/γM0</c> [N·m].</summary>
    /// <param name="W_el_min">Smaller elastic modulus [m³].</param>
    /// <param name="f_y">Yield strength [Pa].</param>
    /// <param name="gamma_M0">γM0 [-].</param>
    public static double M_el_Rd(double W_el_min, double f_y, double gamma_M0) => W_el_min * f_y / gamma_M0;   // (6.14)

    /// <summary>Design resistances about y and z by class [N·m].</summary>
    /// <param name="c">The section.</param>
    /// <param name="number">Its class, 1 to 3.</param>
    public static (double Y, double Z) M_c_Rd(SectionCase c, int number)
    {
        ArgumentNullException.ThrowIfNull(c);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(number, 3);
        var p = c.Properties;
        return number <= 2
            ? (M_pl_Rd(p.WplY, c.Yield, c.GammaM0), M_pl_Rd(p.WplZ, c.Yield, c.GammaM0))
            : (M_el_Rd(p.WelY, c.Yield, c.GammaM0), M_el_Rd(p.WelZ, c.Yield, c.GammaM0));
    }

    /// <summary>The check about one axis; null without a moment about it.</summary>
    /// <param name="c">The section and its forces.</param>
    /// <param name="section">Its class.</param>
    /// <param name="isAboutY">About y, of round sections the resultant; else about z.</param>
    public static CheckResult.Evaluated? Check(SectionCase c, SectionClass section, bool isAboutY)
    {
        ArgumentNullException.ThrowIfNull(c);
        ArgumentNullException.ThrowIfNull(section);
        var moments = SectionCase.Moments(c.IsRound, c.Forces);
        var moment = isAboutY ? moments.My : moments.Mz;
        if (moment == 0) return null;

        var axis = c.IsRound ? "" : isAboutY ? ",y" : ",z";
        var plastic = section.Number <= 2;
        var (y, z) = M_c_Rd(c, section.Number);
        var resistance = isAboutY ? y : z;
        var p = c.Properties;
        var modulus = plastic ? (isAboutY ? p.WplY : p.WplZ) : (isAboutY ? p.WelY : p.WelZ);
        var symbol = plastic ? "W_pl" : "W_el,min";
        return new Calculation(Clause)
            .Given($"M{axis},Ed", moment, "N·m", c.IsRound ? "√(My² + Mz²) of the section forces" : "section force, magnitude")
            .With(c.StrengthLines())
            .With(section.Lines)
            .Given(symbol, modulus, "m³", $"section, class {section.Number} ({section.Part})")
            .Found($"M{axis},Rd", $"{symbol}·f_y/γM0 = {Shown.Mm3(modulus)} mm³·{Shown.MPa(c.Yield)} MPa/{Shown.Number(c.GammaM0)}", resistance, "N·m", Clauses.Of("6.2.5", plastic ? "(6.13)" : "(6.14)").ToString())
            .Utilization($"M_Ed/M_Rd = {Shown.Number(moment / 1e3)}/{Shown.Number(resistance / 1e3)}", moment / resistance);
    }
}
