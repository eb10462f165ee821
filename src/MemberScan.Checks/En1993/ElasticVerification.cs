using MemberScan.Mechanics.Stress;

namespace MemberScan.Checks.En1993;

/// <summary>EN 1993-1-1:2005, 6.2.1(5): elastic verification of the yield criterion at a critical point of the cross-section.</summary>
/// <remarks>From memory, not yet verified with the standard's text. The transverse stress σz,Ed of the clause is zero in a bar.</remarks>
public static class ElasticVerification
{
    /// <summary>Where the check comes from.</summary>
    public static Clause Clause { get; } = new("EN 1993-1-1:2005", "6.2.1(5)", "(6.1)", FromMemory: true);

    /// <summary>Left side of the criterion for σz,Ed = 0.</summary>
    /// <param name="sigma_x_Ed">Design longitudinal stress [Pa], tension positive.</param>
    /// <param name="tau_Ed">Design shear stress, the resultant at the point [Pa].</param>
    /// <param name="f_y">Yield strength [Pa], &gt; 0.</param>
    /// <param name="gamma_M0">Partial factor γM0 [-], ≥ 1.</param>
    /// <returns>The left side [-], to be held against 1; it grows with the square of the load.</returns>
    public static double LeftSide(double sigma_x_Ed, double tau_Ed, double f_y, double gamma_M0)
    {
        var normal = sigma_x_Ed / (f_y / gamma_M0);
        var shear = tau_Ed / (f_y / gamma_M0);
        return normal * normal + 3 * shear * shear;                               // (6.1)
    }

    /// <summary>The criterion at a point: its root as utilization, its left side in the calculation.</summary>
    /// <param name="state">Design stresses at the point; finite.</param>
    /// <param name="f_y">Yield strength [Pa], &gt; 0.</param>
    /// <param name="gamma_M0">Partial factor γM0 [-], ≥ 1.</param>
    /// <returns>Utilization, the root of the left side [-], linear in the load, with its calculation.</returns>
    /// <exception cref="ArgumentException">A stress is not finite.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The strength or the factor is out of its range.</exception>
    public static CheckResult.Evaluated Check(in StressState state, double f_y, double gamma_M0)
    {
        StateLines.ThrowUnlessUsable(state, f_y, gamma_M0);

        var limit = f_y / gamma_M0;
        var leftSide = LeftSide(state.Sigma, state.Tau, f_y, gamma_M0);
        var utilization = state.VonMises / limit;                                 // root of (6.1)
        var source = Clause.ToString();
        return new(Clause, utilization,
        [
            .. StateLines.Of(state),
            new("f_y", "", f_y, "Pa", "material of the member"),
            new("γM0", "", gamma_M0, "-", "settings, basis.design"),
            new("f_y/γM0", $"{Shown.MPa(f_y)} MPa / {Shown.Number(gamma_M0)} = {Shown.MPa(limit)} MPa", limit, "Pa", source),
            new("left side",
                $"(σ·γM0/f_y)² + 3(τ·γM0/f_y)² = ({Shown.MPa(state.Sigma)}/{Shown.MPa(limit)})² + 3·({Shown.MPa(state.Tau)}/{Shown.MPa(limit)})² = {Shown.Number(leftSide)}",
                leftSide, "-", source),
            new("utilization", $"√(left side) = √{Shown.Number(leftSide)} = {Shown.Number(utilization)}", utilization, "-", source),
        ]);
    }
}
