namespace MemberScan.Mechanics.States;

/// <summary>A small square of material with two faces across x and two across y or z, and the stresses on them as the plane shows them.</summary>
/// <remarks>
/// Signs: on the face whose outward normal is +x, σ is positive outwards and τ along the other axis; on the face of the other axis the
/// shear stress is the same, positive along +x, and the normal stress is 0; on opposite faces both turn around.
/// </remarks>
/// <param name="Plane">The plane.</param>
/// <param name="Sigma">Normal stress on the faces across x [Pa], tension positive.</param>
/// <param name="Tau">Shear stress on all four faces [Pa]: τxy = τyx or τxz = τzx.</param>
public readonly record struct StressElement(ElementPlane Plane, double Sigma, double Tau)
{
    /// <summary>Largest normal stress in this plane [Pa], ≥ 0; the principal stress where the other shear stress is zero.</summary>
    public double Largest => 0.5 * (Sigma + Diameter);

    /// <summary>Smallest normal stress in this plane [Pa], ≤ 0.</summary>
    public double Smallest => 0.5 * (Sigma - Diameter);

    /// <summary>Angle from x towards the other axis of the direction of <see cref="Largest"/> [rad], in [−π/2, π/2].</summary>
    public double Angle => 0.5 * Math.Atan2(2 * Tau, Sigma);

    private double Diameter => double.Hypot(Sigma, 2 * Tau);
}
