namespace MemberScan.Model.Limits;

/// <summary>A criterion with its factor.</summary>
/// <param name="Criterion">What is compared.</param>
/// <param name="Factor">Ω, γM0, or 1/φ of AISC LRFD [-], ≥ 1; of no meaning for the largest normal stress.</param>
public sealed record StressLimit(Criterion Criterion, double Factor);
