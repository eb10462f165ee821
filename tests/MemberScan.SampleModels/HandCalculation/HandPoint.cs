namespace MemberScan.SampleModels.HandCalculation;

/// <summary>Stresses at one point of a section.</summary>
/// <param name="Y">Distance from the centroid along y [m].</param>
/// <param name="Z">Distance from the centroid along z [m].</param>
/// <param name="Sigma">Normal stress [Pa], tension positive.</param>
/// <param name="Tau">Resultant shear stress [Pa].</param>
public readonly record struct HandPoint(double Y, double Z, double Sigma, double Tau)
{
    /// <summary>Equivalent stress after von Mises, √(σ² + 3τ²) [Pa].</summary>
    public double VonMises => Math.Sqrt(Sigma * Sigma + 3 * Tau * Tau);

    /// <summary>The one of two with the larger equivalent stress.</summary>
    public static HandPoint Worse(in HandPoint a, in HandPoint b) => b.VonMises > a.VonMises ? b : a;
}
