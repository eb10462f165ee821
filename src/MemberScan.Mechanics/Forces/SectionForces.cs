namespace MemberScan.Mechanics.Forces;

/// <summary>The six section forces that act together on the cut face whose outward normal is +x.</summary>
/// <remarks>
/// Each is positive along its axis, moments as right-handed vectors, tension positive: <c>N = ∫σ dA</c>, <c>Vy = ∫τxy dA</c>,
/// <c>Vz = ∫τxz dA</c>, <c>My = ∫σ·z dA</c>, <c>Mz = −∫σ·y dA</c>. N, My and Mz are about the centroid, T about the shear centre.
/// So <c>σ = N/A + My·z/Iy − Mz·y/Iz</c> on principal axes.
/// </remarks>
/// <param name="N">Axial force [N], tension positive.</param>
/// <param name="Vy">Shear force along y [N].</param>
/// <param name="Vz">Shear force along z [N].</param>
/// <param name="T">Torsional moment about x [N·m].</param>
/// <param name="My">Bending moment about y [N·m]; positive stretches the +z side.</param>
/// <param name="Mz">Bending moment about z [N·m]; positive stretches the −y side.</param>
public readonly record struct SectionForces(double N, double Vy, double Vz, double T, double My, double Mz)
{
    /// <summary>Whether all six are finite numbers.</summary>
    public bool IsFinite => double.IsFinite(N) && double.IsFinite(Vy) && double.IsFinite(Vz)
        && double.IsFinite(T) && double.IsFinite(My) && double.IsFinite(Mz);

    /// <summary>Sum, component by component: both must belong to situations that may be superposed.</summary>
    public static SectionForces operator +(in SectionForces a, in SectionForces b) =>
        new(a.N + b.N, a.Vy + b.Vy, a.Vz + b.Vz, a.T + b.T, a.My + b.My, a.Mz + b.Mz);

    /// <summary>Difference, component by component.</summary>
    public static SectionForces operator -(in SectionForces a, in SectionForces b) =>
        new(a.N - b.N, a.Vy - b.Vy, a.Vz - b.Vz, a.T - b.T, a.My - b.My, a.Mz - b.Mz);

    /// <summary>Multiple.</summary>
    public static SectionForces operator *(double factor, in SectionForces a) =>
        new(factor * a.N, factor * a.Vy, factor * a.Vz, factor * a.T, factor * a.My, factor * a.Mz);

    /// <summary>The same forces in axes turned by <paramref name="angle"/> [rad] about x (new y = cos·y + sin·z).</summary>
    public SectionForces Turned(double angle)
    {
        var (sin, cos) = Math.SinCos(angle);
        return new(N, cos * Vy + sin * Vz, cos * Vz - sin * Vy, T, cos * My + sin * Mz, cos * Mz - sin * My);
    }
}
