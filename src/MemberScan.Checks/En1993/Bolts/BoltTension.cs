using MemberScan.Checks.Threads;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.En1993.Bolts;

/// <summary>EN 1993-1-8:2005, Table 3.4: tension resistance on the stress area, <c>F_t,Rd = k2·f_ub·A_s/γM2</c>, k2 = 0.9.</summary>
/// <remarks>
/// From memory. 3.6.1(3): × 0.85 for cut threads that do not follow the standard for bolts (outside EN 1090). Bending, torsion and
/// compression of a rod are not covered by the table.
/// </remarks>
public static class BoltTension
{
    /// <summary>Where the check comes from.</summary>
    public static Clause Clause { get; } = new("EN 1993-1-8:2005", "Table 3.4", "", FromMemory: true);

    /// <summary>Design tension resistance [N].</summary>
    /// <param name="f_ub">Tensile strength [Pa], &gt; 0.</param>
    /// <param name="A_s">Stress area [m²], &gt; 0.</param>
    /// <param name="gamma_M2">Partial factor γM2 [-], ≥ 1.</param>
    public static double F_t_Rd(double f_ub, double A_s, double gamma_M2) => 0.9 * f_ub * A_s / gamma_M2;

    /// <summary>Factor for cut threads: 3.6.1(3).</summary>
    /// <param name="isCutThread">Whether the thread is cut and outside EN 1090.</param>
    public static double CutThreadFactor(bool isCutThread) => isCutThread ? 0.85 : 1;

    /// <summary>Holds the tension of a rod against its design resistance.</summary>
    /// <param name="rod">The rod.</param>
    /// <param name="f_ub">Tensile strength [Pa], &gt; 0.</param>
    /// <param name="gamma_M2">Partial factor γM2 [-], ≥ 1.</param>
    /// <param name="isCutThread">Whether the thread is cut and outside EN 1090.</param>
    /// <param name="strengthSource">Where the strength comes from, in words.</param>
    /// <returns>Tension; not evaluated, with a note, when anything else acts as well; a refusal for the wrong kind.</returns>
    /// <exception cref="ArgumentException">A value of the rod is out of its range.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The strength or the factor is out of its range.</exception>
    public static CheckSet Check(RodCase rod, double f_ub, double gamma_M2, bool isCutThread, string strengthSource)
    {
        ArgumentNullException.ThrowIfNull(rod);
        rod.ThrowUnlessUsable();
        if (!double.IsFinite(f_ub) || f_ub <= 0) throw new ArgumentOutOfRangeException(nameof(f_ub), f_ub, "the strength must be a finite number above zero");
        if (!double.IsFinite(gamma_M2) || gamma_M2 < 1) throw new ArgumentOutOfRangeException(nameof(gamma_M2), gamma_M2, "the factor must be a finite number of at least 1");
        const string Key = "en-1-8-3.4", Name = "tension in the thread";
        if (KindRule.Refusal(Clause, SituationKind.Design, rod.Kind) is { } refusal) return CheckSet.Refused(Key, Name, refusal);

        var tension = new NamedCheck(Key, Name, CheckStanding.Decides, Tension(rod, f_ub, gamma_M2, isCutThread, strengthSource));
        if (RodStress.OtherThanTension(rod) is not { } other) return new CheckSet([tension], []);

        var beside = new CheckResult.NotEvaluated(Clause, new Reason(ReasonCode.CheckNotEvaluated, $"The rule covers tension alone: {other}."));
        return new CheckSet([tension, new NamedCheck("en-1-8-3.4-other", "other forces in the thread", CheckStanding.Decides, beside)], [other]);
    }

    private static CheckResult.Evaluated Tension(RodCase rod, double f_ub, double gamma_M2, bool isCutThread, string source)
    {
        var F_t_Ed = Math.Max(0, rod.Forces.N);
        var factor = CutThreadFactor(isCutThread);
        var resistance = factor * rod.TemperatureFactor * F_t_Rd(f_ub, rod.Thread.StressArea, gamma_M2);
        return new Calculation(Clause)
            .With(RodStress.AreaLines(rod, ThreadArea.Stress))
            .Given("N", rod.Forces.N, "N", "section force, tension positive")
            .Given("f_ub", f_ub, "Pa", source)
            .Given("γM2", gamma_M2, "-", "settings")
            .Given("k_cut", factor, "-", isCutThread ? "3.6.1(3), cut thread (from memory)" : "thread by the bolt standard, as set")
            .Given("k_T", rod.TemperatureFactor, "-", rod.TemperatureSource)
            .Found("F_t,Rd", $"k_cut·k_T·0.9·f_ub·A_s/γM2 = {Shown.Number(factor)}·{Shown.Number(rod.TemperatureFactor)}·0.9·{Shown.MPa(f_ub)} MPa·{Shown.Mm2(rod.Thread.StressArea)} mm²/{Shown.Number(gamma_M2)}", resistance, "N")
            .Utilization($"F_t,Ed/F_t,Rd = {Shown.KN(F_t_Ed)}/{Shown.KN(resistance)}", F_t_Ed / resistance);
    }
}
