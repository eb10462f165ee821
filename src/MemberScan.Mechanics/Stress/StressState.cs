namespace MemberScan.Mechanics.Stress;

/// <summary>The stresses at one point of the cut face x = const; all others are zero.</summary>
/// <param name="Sigma">Normal stress σ along x [Pa], tension positive.</param>
/// <param name="TauXY">Shear stress τxy along y on the face whose normal is +x [Pa].</param>
/// <param name="TauXZ">Shear stress τxz along z on the same face [Pa].</param>
public readonly record struct StressState(double Sigma, double TauXY, double TauXZ)
{
    /// <summary>Resultant shear stress [Pa], ≥ 0.</summary>
    public double Tau => Math.Sqrt(TauXY * TauXY + TauXZ * TauXZ);

    /// <summary>Equivalent stress of von Mises <c>√(σ² + 3τ²)</c> [Pa], ≥ 0.</summary>
    public double VonMises => Math.Sqrt(Sigma * Sigma + 3 * (TauXY * TauXY + TauXZ * TauXZ));

    /// <summary>Equivalent stress of Tresca <c>√(σ² + 4τ²)</c>, twice the largest shear stress [Pa], ≥ 0.</summary>
    public double Tresca => Math.Sqrt(Sigma * Sigma + 4 * (TauXY * TauXY + TauXZ * TauXZ));

    /// <summary>Largest principal stress <c>σ/2 + √((σ/2)² + τ²)</c> [Pa], ≥ 0.</summary>
    public double Sigma1 => 0.5 * (Sigma + Tresca);

    /// <summary>Smallest principal stress <c>σ/2 − √((σ/2)² + τ²)</c> [Pa], ≤ 0; the middle one is always 0.</summary>
    public double Sigma3 => 0.5 * (Sigma - Tresca);
}
