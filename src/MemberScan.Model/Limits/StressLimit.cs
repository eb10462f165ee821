namespace MemberScan.Model.Limits;

/// <summary>A criterion with its factor.</summary>
/// <param name="Criterion">What is compared.</param>
/// <param name="Factor">Ω or γM0 [-], ≥ 1.</param>
public sealed record StressLimit(Criterion Criterion, double Factor);
