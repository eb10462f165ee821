using MemberScan.Model;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Ranking;

/// <summary>The smallest yield strength at which every deciding check is made and within its limit.</summary>
/// <remarks>
/// It is no verdict: a member whose strength is missing stays unchecked. A higher strength may raise the class of a wall or leave buckling as it
/// is, so the strengths are scanned upwards and only then closed in upon.
/// </remarks>
public static class RequiredYield
{
    /// <summary>Strengths that are tried [Pa].</summary>
    public const double Least = 1e6, Largest = 2500e6;

    private const int Steps = 80;
    private const int Halvings = 40;
    private const double OverLimit = 1 + 1e-9;

    /// <summary>The required strength of a stress criterion: it is the stress times the factor.</summary>
    /// <param name="equivalentStress">Stress that is held against <c>fy/factor</c> [Pa], ≥ 0.</param>
    /// <param name="factor">Ω or γM0 [-], ≥ 1.</param>
    /// <returns>The strength [Pa].</returns>
    public static double OfStress(double equivalentStress, double factor)
    {
        if (!double.IsFinite(equivalentStress) || equivalentStress < 0) throw new ArgumentOutOfRangeException(nameof(equivalentStress));
        if (!double.IsFinite(factor) || factor < 1) throw new ArgumentOutOfRangeException(nameof(factor));
        return equivalentStress * factor;
    }

    /// <summary>The required strength of a set of checks.</summary>
    /// <param name="checksAt">The checks at a yield strength [Pa].</param>
    /// <returns>The strength [Pa], or why none up to 2500 MPa is enough.</returns>
    public static Finding<double> Find(Func<double, CheckSet> checksAt)
    {
        ArgumentNullException.ThrowIfNull(checksAt);
        var ratio = Math.Pow(Largest / Least, 1.0 / Steps);
        var below = 0.0;
        for (var i = 0; i <= Steps; i++)
        {
            var strength = i == Steps ? Largest : Least * Math.Pow(ratio, i);
            if (Passes(checksAt(strength))) return new Finding<double>.Found(ClosedIn(checksAt, below, strength), "smallest yield strength at which every check passes");
            below = strength;
        }

        var barred = checksAt(Largest).Barred;
        return new Finding<double>.Missing(new Reason(
            barred?.Why.Code ?? ReasonCode.CheckNotEvaluated,
            $"No yield strength up to {Shown.MPa(Largest)} MPa is enough{(barred is null ? "" : $": {barred.Why.Message}")}"));
    }

    /// <summary>The strength in words, rounded up to a whole MPa.</summary>
    /// <param name="strength">Required yield strength [Pa].</param>
    public static string Words(double strength) => $"needs fy ≥ {Shown.Number(Math.Ceiling(strength / 1e6 - 1e-9))} MPa";

    private static double ClosedIn(Func<double, CheckSet> checksAt, double below, double passing)
    {
        if (below == 0) return passing;
        for (var i = 0; i < Halvings; i++)
        {
            var middle = 0.5 * (below + passing);
            if (Passes(checksAt(middle))) passing = middle;
            else below = middle;
        }

        return passing;
    }

    private static bool Passes(CheckSet set) => set.Barred is null && (set.Worst?.Utilization ?? 0) <= OverLimit;
}
