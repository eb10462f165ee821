using MemberScan.Checks;
using MemberScan.Checks.Allowable;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Limits;

namespace MemberScan.Screening.Checking.Rules;

/// <summary>The principal stresses against given limits in tension and compression.</summary>
internal sealed class NormalStressRule(StressLimit limit, BrittleLimits limits) : StressRule(limit)
{
    /// <inheritdoc/>
    public override string Words => string.Create(
        System.Globalization.CultureInfo.InvariantCulture, $"σ1 ≤ {limits.Tension / 1e6:0.####} MPa and −σ3 ≤ {limits.Compression / 1e6:0.####} MPa");

    /// <inheritdoc/>
    public override string Clause => LargestNormalStress.Clause.ToString();

    /// <inheritdoc/>
    public override (double Utilization, GoverningPoint Point) Govern(StressField field, in SectionForces forces)
    {
        var (tension, compression) = (field.Govern(forces, StressMeasure.Sigma1), field.Govern(forces, StressMeasure.Sigma3));
        var (inTension, inCompression) = (tension.Value / limits.Tension, -compression.Value / limits.Compression);
        return inCompression > inTension ? (inCompression, compression) : (Math.Max(0, inTension), tension);
    }

    /// <inheritdoc/>
    public override double Allowed(in GoverningPoint point) => point.Measure == StressMeasure.Sigma3 ? limits.Compression : limits.Tension;

    /// <inheritdoc/>
    public override double? RequiredYield(in GoverningPoint point) => null;

    /// <inheritdoc/>
    public override CheckResult.Evaluated Check(in GoverningPoint point) =>
        (CheckResult.Evaluated)LargestNormalStress.Check(point.State, limits.Tension, limits.Compression, limits.Kind, limits.Kind, "settings, basis.brittle");
}
