namespace MemberScan.Model.Limits;

/// <summary>The limits of a run, one per kind of situation; a kind without one leaves its situations unchecked.</summary>
/// <param name="Service">Limit for service situations; null for none.</param>
/// <param name="Design">Limit for design situations; null for none.</param>
public sealed record Basis(StressLimit? Service, StressLimit? Design)
{
    /// <summary>Service σvM ≤ fy/1.67; design EN 1993-1-1 6.2.1(5) with γM0 = 1.00.</summary>
    public static Basis Default { get; } = new(
        new StressLimit(Criterion.AllowableVonMises, 1.67), new StressLimit(Criterion.En1993Elastic, 1.00));
}
