namespace MemberScan.Mechanics.Stress;

/// <summary>What a search makes largest for a measure: a rising function of it, smooth where the stresses are.</summary>
internal static class Target
{
    /// <summary>The target for σ [Pa] and τ² [Pa²], ≥ 0; squared measures save the root and stay smooth at zero.</summary>
    public static double Of(StressMeasure measure, double sigma, double tauSquared) => measure switch
    {
        StressMeasure.VonMises => sigma * sigma + 3 * tauSquared,
        StressMeasure.Tresca => sigma * sigma + 4 * tauSquared,
        StressMeasure.AbsoluteSigma => sigma * sigma,
        StressMeasure.Tau => tauSquared,
        StressMeasure.Sigma1 => 0.5 * (Math.Sqrt(sigma * sigma + 4 * tauSquared) + sigma),
        StressMeasure.Sigma3 => 0.5 * (Math.Sqrt(sigma * sigma + 4 * tauSquared) - sigma),
        _ => throw new ArgumentOutOfRangeException(nameof(measure), measure, "unknown measure"),
    };

    /// <summary>The target of a state.</summary>
    public static double Of(StressMeasure measure, in StressState state) =>
        Of(measure, state.Sigma, state.TauXY * state.TauXY + state.TauXZ * state.TauXZ);

    /// <summary>The measure itself [Pa], with its sign.</summary>
    public static double Value(StressMeasure measure, in StressState state) => measure switch
    {
        StressMeasure.VonMises => state.VonMises,
        StressMeasure.Tresca => state.Tresca,
        StressMeasure.AbsoluteSigma => state.Sigma,
        StressMeasure.Tau => state.Tau,
        StressMeasure.Sigma1 => state.Sigma1,
        StressMeasure.Sigma3 => state.Sigma3,
        _ => throw new ArgumentOutOfRangeException(nameof(measure), measure, "unknown measure"),
    };
}
