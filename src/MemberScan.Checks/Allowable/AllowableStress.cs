using MemberScan.Mechanics.Stress;

namespace MemberScan.Checks.Allowable;

/// <summary>Allowable stress: an equivalent stress of a service situation against the yield strength over a factor.</summary>
/// <remarks>Plain mechanics; the factor Ω is the reviewer's and belongs to no clause here.</remarks>
public static class AllowableStress
{
    private const string ByVonMises = "equivalent stress of von Mises";
    private const string ByTresca = "equivalent stress of Tresca, twice the largest shear stress";

    /// <summary>Equivalent stress of von Mises against <c>fy/Ω</c>.</summary>
    /// <param name="state">Stresses at a point; finite.</param>
    /// <param name="fy">Yield strength [Pa], &gt; 0.</param>
    /// <param name="omega">Factor Ω [-], ≥ 1.</param>
    /// <returns>Utilization <c>σvM·Ω/fy</c> [-] with its calculation.</returns>
    /// <exception cref="ArgumentException">A stress is not finite.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The strength or the factor is out of its range.</exception>
    public static CheckResult.Evaluated VonMises(in StressState state, double fy, double omega) =>
        Compare(state, "σvM", 3, state.VonMises, ByVonMises, fy, omega);

    /// <summary>Equivalent stress of Tresca against <c>fy/Ω</c>.</summary>
    /// <param name="state">Stresses at a point; finite.</param>
    /// <param name="fy">Yield strength [Pa], &gt; 0.</param>
    /// <param name="omega">Factor Ω [-], ≥ 1.</param>
    /// <returns>Utilization <c>σT·Ω/fy</c> [-] with its calculation.</returns>
    /// <exception cref="ArgumentException">A stress is not finite.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The strength or the factor is out of its range.</exception>
    public static CheckResult.Evaluated Tresca(in StressState state, double fy, double omega) =>
        Compare(state, "σT", 4, state.Tresca, ByTresca, fy, omega);

    private static CheckResult.Evaluated Compare(
        in StressState state, string symbol, int shearWeight, double equivalent, string criterion, double fy, double omega)
    {
        StateLines.ThrowUnlessUsable(state, fy, omega);

        var limit = fy / omega;
        var utilization = equivalent / limit;
        return new(new Clause("", $"allowable stress, {symbol} ≤ fy/Ω", "", FromMemory: false), utilization,
        [
            .. StateLines.Of(state),
            new(symbol, $"√(σ² + {shearWeight}τ²) = √({Shown.MPa(state.Sigma)}² + {shearWeight}·{Shown.MPa(state.Tau)}²) MPa = {Shown.MPa(equivalent)} MPa",
                equivalent, "Pa", criterion),
            new("fy", "", fy, "Pa", "material of the member"),
            new("Ω", "", omega, "-", "settings, basis.service"),
            new("fy/Ω", $"{Shown.MPa(fy)} MPa / {Shown.Number(omega)} = {Shown.MPa(limit)} MPa", limit, "Pa", "allowable stress"),
            new("utilization", $"{symbol}/(fy/Ω) = {Shown.MPa(equivalent)} / {Shown.MPa(limit)} = {Shown.Number(utilization)}",
                utilization, "-", "allowable stress"),
        ]);
    }
}
