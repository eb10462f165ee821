using MemberScan.Checks;
using MemberScan.Checks.Aisc360;
using MemberScan.Checks.Aisc360.Stresses;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Limits;

namespace MemberScan.Screening.Checking.Rules;

/// <summary>AISC 360-22 H3.3 of sections other than hollow ones: (a) normal stress and (b) shear stress apart, each at its own point.</summary>
internal sealed class SplitStressRule(StressLimit limit, double yield, DesignMethod method) : StressRule(limit)
{
    private const double ShearShare = 0.6;

    private readonly double _normal = StrengthFactor.Member.Available(yield, method);
    private readonly double _shear = StrengthFactor.Member.Available(ShearShare * yield, method);

    /// <inheritdoc/>
    public override string Words => $"normal and shear stress apart, AISC 360-22 H3.3 {StrengthFactor.Name(method)}";

    /// <inheritdoc/>
    public override string Clause => $"{NonHollowStress.NormalClause}; {NonHollowStress.ShearClause}";

    /// <inheritdoc/>
    public override (double Utilization, GoverningPoint Point) Govern(StressField field, in SectionForces forces)
    {
        var normal = field.Govern(forces, StressMeasure.AbsoluteSigma);
        if (forces is { Vy: 0, Vz: 0, T: 0 }) return (Math.Abs(normal.Value) / _normal, normal);

        var shear = field.Govern(forces, StressMeasure.Tau);
        return shear.Value / _shear > Math.Abs(normal.Value) / _normal ? (shear.Value / _shear, shear) : (Math.Abs(normal.Value) / _normal, normal);
    }

    /// <inheritdoc/>
    public override double Allowed(in GoverningPoint point) => point.Measure == StressMeasure.Tau ? _shear : _normal;

    /// <inheritdoc/>
    public override double? RequiredYield(in GoverningPoint point) => Math.Abs(point.Value) * yield / Allowed(point);

    /// <inheritdoc/>
    public override CheckResult.Evaluated Check(in GoverningPoint point) => point.Measure == StressMeasure.Tau
        ? NonHollowStress.Shear(point.State, yield, method)
        : NonHollowStress.Normal(point.State, yield, method);
}
