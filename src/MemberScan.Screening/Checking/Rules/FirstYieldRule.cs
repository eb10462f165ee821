using MemberScan.Checks;
using MemberScan.Checks.Aisc360;
using MemberScan.Checks.Aisc360.Stresses;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Limits;

namespace MemberScan.Screening.Checking.Rules;

/// <summary>First yield of hollow sections with the factors of AISC 360-22, on the wall of the basis.</summary>
internal sealed class FirstYieldRule(StressLimit limit, double yield, DesignMethod method, string wallWords) : StressRule(limit)
{
    private readonly double _allowed = StrengthFactor.Member.Available(yield, method);

    /// <inheritdoc/>
    public override string Words => $"first yield of von Mises with the factor of AISC 360-22 {StrengthFactor.Name(method)}";

    /// <inheritdoc/>
    public override string Clause => ElasticLimit.Clause.ToString();

    /// <inheritdoc/>
    public override (double Utilization, GoverningPoint Point) Govern(StressField field, in SectionForces forces)
    {
        var point = field.Govern(forces, StressMeasure.VonMises);
        return (point.Value / _allowed, point);
    }

    /// <inheritdoc/>
    public override double Allowed(in GoverningPoint point) => _allowed;

    /// <inheritdoc/>
    public override double? RequiredYield(in GoverningPoint point) => point.Value * yield / _allowed;

    /// <inheritdoc/>
    public override CheckResult.Evaluated Check(in GoverningPoint point) =>
        (CheckResult.Evaluated)ElasticLimit.Check(point.State, yield, method, StrengthFactor.KindOf(method), wallWords);
}
