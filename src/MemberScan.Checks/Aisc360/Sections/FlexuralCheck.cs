using MemberScan.Checks.Stability;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Aisc360.Sections;

/// <summary>Moment of a section about one axis held against its available strength by F7, F8 or F11.</summary>
internal static class FlexuralCheck
{
    private const double Tolerance = 1e-9;

    /// <summary>Clause for a kind of section.</summary>
    public static Clause ClauseOf(CrossSection section) => section switch
    {
        Tube => FlexuralStrength.TubeClause,
        Box => FlexuralStrength.BoxClause,
        _ => FlexuralStrength.BarClause,
    };

    /// <summary>Nominal moment about one axis with the lines that lead to it, or why there is none.</summary>
    public static (double? M_n, TraceLine[] Lines, Reason? Why) Nominal(AiscCase c, bool isAboutY, double unbraced)
    {
        var p = c.Properties;
        var (Z, S) = isAboutY ? (p.WplY, p.WelY) : (p.WplZ, p.WelZ);
        return c.Section switch
        {
            Tube tube => OfTube(c, tube, Z, S),
            Box box => OfBox(c, isAboutY, unbraced, Z, S, isAboutY ? (box.Width, box.Depth) : (box.Depth, box.Width), box.Wall),
            _ => OfBar(c, isAboutY, unbraced, Z, S),
        };
    }

    /// <summary>The check; the moment is not zero.</summary>
    public static CheckResult Check(AiscCase c, bool isAboutY, double moment, BucklingLength y, BucklingLength z)
    {
        var clause = ClauseOf(c.Section);
        var unbraced = Math.Max(y.Value, z.Value);
        var (nominal, lines, why) = Nominal(c, isAboutY, unbraced);
        if (nominal is not { } M_n) return new CheckResult.NotEvaluated(clause, why!);

        var available = StrengthFactor.Member.Available(M_n, c.Method);
        return new Calculation(clause)
            .Given("M_r", moment, "N·m", c.IsRound ? "√(My² + Mz²) of the section forces" : "section force, magnitude")
            .With(c.StrengthLines())
            .With(lines)
            .Found("M_c", $"M_n{StrengthFactor.Member.Words(c.Method)}", available, "N·m", $"{clause}, {StrengthFactor.Name(c.Method)}")
            .Utilization($"M_r/M_c = {Shown.Number(moment / 1e3)}/{Shown.Number(available / 1e3)}", moment / available);
    }

    private static (double?, TraceLine[], Reason?) OfTube(AiscCase c, Tube tube, double Z, double S)
    {
        var slenderness = 2 * tube.OuterRadius / tube.Wall;
        if (FlexuralStrength.M_n_Tube(c.Yield, c.Modulus, slenderness, Z, S) is not { } nominal)
            return Slender($"The tube has D/t = {Shown.Number(slenderness)}, not below 0.45E/F_y = {Shown.Number(0.45 * c.Modulus / c.Yield)}; F8 does not hold.");

        var (compact, slender) = WallLimits.RoundInFlexure(c.Modulus, c.Yield);
        var (words, equation) = slenderness <= compact ? ("F_y·Z", "(F8-1)") : slenderness <= slender ? ("(0.021E/(D/t) + F_y)·S", "(F8-2)") : ("0.33E/(D/t)·S", "(F8-3)");
        return (nominal,
        [
            .. ModulusLines(Z, S),
            new("D/t", $"{Shown.Mm(2 * tube.OuterRadius)}/{Shown.Mm(tube.Wall)} = {Shown.Number(slenderness)}", slenderness, "-", $"compact to {Shown.Number(compact)}, slender beyond {Shown.Number(slender)}, {WallLimits.Clause}"),
            new("M_n", $"{words} = {Shown.Number(nominal / 1e3)} kN·m", nominal, "N·m", StrengthFactor.Clause("F8", equation).ToString()),
        ], null);
    }

    private static (double?, TraceLine[], Reason?) OfBox(AiscCase c, bool isAboutY, double unbraced, double Z, double S, (double Flange, double Web) sides, double wall)
    {
        var flange = Math.Max(0, sides.Flange - 3 * wall) / wall;
        var web = Math.Max(0, sides.Web - 3 * wall) / wall;
        var (flangeLimits, webLimits) = (WallLimits.FlangeInFlexure(c.Modulus, c.Yield), WallLimits.WebInFlexure(c.Modulus, c.Yield));
        if (flange > flangeLimits.Slender * (1 + Tolerance) || web > webLimits.Slender * (1 + Tolerance))
            return Slender($"The walls have b/t = {Shown.Number(flange)} and h/t = {Shown.Number(web)}, beyond λr = {Shown.Number(flangeLimits.Slender)} or {Shown.Number(webLimits.Slender)}; the effective section of F7 is not evaluated.");

        var plastic = FlexuralStrength.M_p(c.Yield, Z);
        var byFlange = flange <= flangeLimits.Compact ? plastic : FlexuralStrength.M_n_Flange(plastic, c.Yield, S, flange, c.Modulus);
        var byWeb = web <= webLimits.Compact ? plastic : FlexuralStrength.M_n_Web(plastic, c.Yield, S, web, c.Modulus);
        var byLateral = Lateral(c, isAboutY, unbraced, plastic, S);
        var nominal = Math.Min(byFlange, Math.Min(byWeb, byLateral));
        return (nominal,
        [
            .. ModulusLines(Z, S),
            new("M_p", $"F_y·Z = {Shown.Number(plastic / 1e3)} kN·m", plastic, "N·m", StrengthFactor.Clause("F7.1", "(F7-1)").ToString()),
            new("b/t", "", flange, "-", $"flange, side − 3t; compact to {Shown.Number(flangeLimits.Compact)}, {WallLimits.Clause}"),
            new("M_n flange", "", byFlange, "N·m", StrengthFactor.Clause("F7.2", "(F7-2)").ToString()),
            new("h/t", "", web, "-", $"web, side − 3t; compact to {Shown.Number(webLimits.Compact)}, {WallLimits.Clause}"),
            new("M_n web", "", byWeb, "N·m", StrengthFactor.Clause("F7.3", "(F7-6)").ToString()),
            new("L_b", "", unbraced, "m", "the larger effective length of the two axes"),
            new("M_n lateral", "", byLateral, "N·m", StrengthFactor.Clause("F7.4", "(F7-10), (F7-11), C_b = 1").ToString()),
            new("M_n", $"the smallest = {Shown.Number(nominal / 1e3)} kN·m", nominal, "N·m", FlexuralStrength.BoxClause.ToString()),
        ], null);
    }

    // Square sections and bending about the weaker axis do not buckle sideways.
    private static double Lateral(AiscCase c, bool isAboutY, double unbraced, double plastic, double S)
    {
        var p = c.Properties;
        var (strong, weak) = isAboutY ? (p.Iy, p.Iz) : (p.Iz, p.Iy);
        if (strong <= weak * (1 + Tolerance)) return plastic;

        var (L_p, L_r) = FlexuralStrength.BoxLengths(c.Modulus, Math.Sqrt(weak / p.Area), p.JThinWall!.Value, p.Area, plastic, c.Yield, S);
        return FlexuralStrength.M_n_BoxLateral(plastic, unbraced, L_p, L_r, c.Yield, S);
    }

    private static (double?, TraceLine[], Reason?) OfBar(AiscCase c, bool isAboutY, double unbraced, double Z, double S)
    {
        var yielding = FlexuralStrength.M_n_Bar(c.Yield, Z, S);
        var (d, t) = isAboutY ? (c.Section.ExtentZ, c.Section.ExtentY) : (c.Section.ExtentY, c.Section.ExtentZ);
        var isLateral = !c.IsRound && d > t * (1 + Tolerance);
        var ratio = isLateral ? unbraced * d / (t * t) : 0;
        var nominal = isLateral ? FlexuralStrength.M_n_BarLateral(yielding, c.Yield, c.Modulus, S, ratio) : yielding;
        return (nominal,
        [
            .. ModulusLines(Z, S),
            new("M_p", $"min(F_y·Z, 1.5F_y·S) = {Shown.Number(yielding / 1e3)} kN·m", yielding, "N·m", StrengthFactor.Clause("F11.1", "(F11-1)").ToString()),
            new("L_b·d/t²", isLateral ? $"{Shown.Number(unbraced)} m·{Shown.Mm(d)}/{Shown.Mm(t)}² mm = {Shown.Number(ratio)}" : "", ratio, "-",
                isLateral ? $"no lateral buckling to 0.08E/F_y = {Shown.Number(0.08 * c.Modulus / c.Yield)}, inelastic to 1.9E/F_y = {Shown.Number(1.9 * c.Modulus / c.Yield)}" : "rounds, squares and the weaker axis do not buckle sideways"),
            new("M_n", $"{Shown.Number(nominal / 1e3)} kN·m", nominal, "N·m", StrengthFactor.Clause("F11.2", "(F11-2), (F11-3), C_b = 1").ToString()),
        ], null);
    }

    private static TraceLine[] ModulusLines(double Z, double S) => [new("Z", "", Z, "m³", "section, plastic modulus"), new("S", "", S, "m³", "section, elastic modulus")];

    private static (double?, TraceLine[], Reason?) Slender(string sentence) => (null, [], new Reason(ReasonCode.SlenderWall, sentence));
}
