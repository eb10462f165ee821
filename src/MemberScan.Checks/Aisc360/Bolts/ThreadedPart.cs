using MemberScan.Checks.Threads;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Aisc360.Bolts;

/// <summary>AISC 360-22, J3.7 (J3.6 in earlier editions) and Table J3.2: tension in threaded parts on the nominal area, <c>F_nt = 0.75F_u</c>.</summary>
/// <remarks>From memory; φ = 0.75, Ω = 2.00. Bending, shear, torsion and compression of a rod are not covered by it.</remarks>
public static class ThreadedPart
{
    /// <summary>Where the check comes from.</summary>
    public static Clause Clause { get; } = StrengthFactor.Clause("J3.7, Table J3.2", "(J3-1)");

    /// <summary>Nominal tensile strength <c>R_n = 0.75F_u·A_b</c> [N].</summary>
    /// <param name="F_u">Tensile strength [Pa], &gt; 0.</param>
    /// <param name="A_b">Nominal unthreaded area [m²], &gt; 0.</param>
    public static double R_n(double F_u, double A_b) => 0.75 * F_u * A_b;          // (J3-1), F_nt of Table J3.2

    /// <summary>Holds the tension of a rod against its available strength.</summary>
    /// <param name="rod">The rod.</param>
    /// <param name="F_u">Tensile strength [Pa], &gt; 0.</param>
    /// <param name="method">ASD or LRFD.</param>
    /// <param name="strengthSource">Where the strength comes from, in words.</param>
    /// <returns>Tension; not evaluated, with a note, when anything else acts as well; a refusal for the wrong kind.</returns>
    /// <exception cref="ArgumentException">A value of the rod is out of its range.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The strength is not above zero.</exception>
    public static CheckSet Check(RodCase rod, double F_u, DesignMethod method, string strengthSource)
    {
        ArgumentNullException.ThrowIfNull(rod);
        rod.ThrowUnlessUsable();
        if (!double.IsFinite(F_u) || F_u <= 0) throw new ArgumentOutOfRangeException(nameof(F_u), F_u, "the strength must be a finite number above zero");
        const string Key = "aisc-j3.7", Name = "tension in the thread";
        if (KindRule.Refusal(Clause, StrengthFactor.KindOf(method), rod.Kind) is { } refusal) return CheckSet.Refused(Key, Name, refusal);

        var tension = new NamedCheck(Key, Name, CheckStanding.Decides, Tension(rod, F_u, method, strengthSource));
        if (RodStress.OtherThanTension(rod) is not { } other) return new CheckSet([tension], []);

        var beside = new CheckResult.NotEvaluated(Clause, new Reason(ReasonCode.CheckNotEvaluated, $"J3.7 covers tension alone: {other}."));
        return new CheckSet([tension, new NamedCheck("aisc-j3.7-other", "other forces in the thread", CheckStanding.Decides, beside)], [other]);
    }

    private static CheckResult.Evaluated Tension(RodCase rod, double F_u, DesignMethod method, string source)
    {
        var T = Math.Max(0, rod.Forces.N);
        var strength = rod.TemperatureFactor * R_n(F_u, rod.Thread.NominalArea);
        var available = StrengthFactor.Rupture.Available(strength, method);
        return new Calculation(Clause)
            .With(RodStress.AreaLines(rod, ThreadArea.Nominal))
            .Given("N", rod.Forces.N, "N", "section force, tension positive")
            .Given("F_u", F_u, "Pa", source)
            .Given("k_T", rod.TemperatureFactor, "-", rod.TemperatureSource)
            .Found("R_n", $"k_T·0.75F_u·A_nom = {Shown.Number(rod.TemperatureFactor)}·0.75·{Shown.MPa(F_u)} MPa·{Shown.Mm2(rod.Thread.NominalArea)} mm²", strength, "N")
            .Found("available", $"R_n{StrengthFactor.Rupture.Words(method)}", available, "N", $"{Clause}, {StrengthFactor.Name(method)}")
            .Utilization($"T/available = {Shown.KN(T)}/{Shown.KN(available)}", T / available);
    }
}
