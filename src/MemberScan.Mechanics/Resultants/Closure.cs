namespace MemberScan.Mechanics.Resultants;

/// <summary>The six section forces got back by integrating a field over the section, each for a unit of it [-]; 1 is exact.</summary>
/// <param name="N">∫σ dA for unit N.</param>
/// <param name="Vy">∫τxy dA for unit Vy.</param>
/// <param name="Vz">∫τxz dA for unit Vz.</param>
/// <param name="T">∫(τxz·y − τxy·z) dA for unit T; 1 where the field carries no torsion.</param>
/// <param name="My">∫σ·z dA for unit My.</param>
/// <param name="Mz">−∫σ·y dA for unit Mz.</param>
/// <param name="LargestCross">Largest magnitude among the other five for any unit force, made dimensionless by the section's extent.</param>
public readonly record struct Closure(double N, double Vy, double Vz, double T, double My, double Mz, double LargestCross)
{
    /// <summary>Largest deviation from 1 or, for the cross terms, from 0.</summary>
    public double LargestError => Math.Max(LargestCross, Math.Max(
        Math.Max(Math.Abs(N - 1), Math.Max(Math.Abs(Vy - 1), Math.Abs(Vz - 1))),
        Math.Max(Math.Abs(T - 1), Math.Max(Math.Abs(My - 1), Math.Abs(Mz - 1)))));
}
