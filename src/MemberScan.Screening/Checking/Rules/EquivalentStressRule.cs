using MemberScan.Checks;
using MemberScan.Checks.Allowable;
using MemberScan.Checks.En1993;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Limits;

namespace MemberScan.Screening.Checking.Rules;

/// <summary>An equivalent stress against the yield strength over a factor.</summary>
internal sealed class EquivalentStressRule(StressLimit limit, double yield) : StressRule(limit)
{
    private readonly StressMeasure _measure = limit.Criterion == Criterion.AllowableTresca ? StressMeasure.Tresca : StressMeasure.VonMises;
    private readonly double _allowed = yield / limit.Factor;

    /// <inheritdoc/>
    public override (double Utilization, GoverningPoint Point) Govern(StressField field, in SectionForces forces)
    {
        var point = field.Govern(forces, _measure);
        return (point.Value / _allowed, point);
    }

    /// <inheritdoc/>
    public override double Allowed(in GoverningPoint point) => _allowed;

    /// <inheritdoc/>
    public override double? RequiredYield(in GoverningPoint point) => point.Value * Limit.Factor;

    /// <inheritdoc/>
    public override CheckResult.Evaluated Check(in GoverningPoint point) => Limit.Criterion switch
    {
        Criterion.AllowableVonMises => AllowableStress.VonMises(point.State, yield, Limit.Factor),
        Criterion.AllowableTresca => AllowableStress.Tresca(point.State, yield, Limit.Factor),
        _ => ElasticVerification.Check(point.State, yield, gamma_M0: Limit.Factor),
    };
}
