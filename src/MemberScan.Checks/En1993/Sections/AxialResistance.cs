namespace MemberScan.Checks.En1993.Sections;

/// <summary>EN 1993-1-1:2005, 6.2.3 tension and 6.2.4 compression, on the gross section.</summary>
/// <remarks>From memory. Holes, and so the net section of (6.7), are not covered.</remarks>
public static class AxialResistance
{
    /// <summary>Tension.</summary>
    public static Clause TensionClause { get; } = Clauses.Of("6.2.3", "(6.5), (6.6)");

    /// <summary>Compression.</summary>
    public static Clause CompressionClause { get; } = Clauses.Of("6.2.4", "(6.9), (6.10)");

    /// <summary>Plastic resistance of the gross section, in tension and for classes 1 to 3 in compression [N].</summary>
    /// <param name="A">Area [m²].</param>
    /// <param name="f_y">Yield strength [Pa].</param>
    /// <param name="gamma_M0">γM0 [-].</param>
    public static double N_pl_Rd(double A, double f_y, double gamma_M0) => A * f_y / gamma_M0;   // (6.6), (6.10)

    /// <summary>The check of the axial force; null without one.</summary>
    /// <param name="c">The section and its forces.</param>
    public static CheckResult.Evaluated? Check(SectionCase c)
    {
        ArgumentNullException.ThrowIfNull(c);
        if (c.Forces.N == 0) return null;

        var A = c.Properties.Area;
        var resistance = N_pl_Rd(A, c.Yield, c.GammaM0);
        var symbol = c.Forces.N > 0 ? "N_pl,Rd" : "N_c,Rd";
        return new Calculation(c.Forces.N > 0 ? TensionClause : CompressionClause)
            .Given("N_Ed", c.Forces.N, "N", "section force, tension positive")
            .Given("A", A, "m²", "section, gross")
            .With(c.StrengthLines())
            .Found(symbol, $"A·f_y/γM0 = {Shown.Mm2(A)} mm²·{Shown.MPa(c.Yield)} MPa/{Shown.Number(c.GammaM0)}", resistance, "N")
            .Utilization($"|N_Ed|/{symbol} = {Shown.KN(Math.Abs(c.Forces.N))}/{Shown.KN(resistance)}", Math.Abs(c.Forces.N) / resistance);
    }
}
