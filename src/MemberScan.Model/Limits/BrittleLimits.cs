using MemberScan.Model.Forces;

namespace MemberScan.Model.Limits;

/// <summary>Largest normal stresses of a brittle material, as the reviewer gives them.</summary>
/// <param name="Tension">Allowable tensile stress [Pa], &gt; 0.</param>
/// <param name="Compression">Allowable compressive stress [Pa], &gt; 0.</param>
/// <param name="Kind">Service or design: the situations that they are given for.</param>
public sealed record BrittleLimits(double Tension, double Compression, SituationKind Kind);
