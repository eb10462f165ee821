using MemberScan.Checks;
using MemberScan.Checks.Allowable;
using MemberScan.Checks.En1993;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Limits;

namespace MemberScan.Screening.Checking;

/// <summary>A stress limit of the basis, ready to be held against stresses.</summary>
internal static class LimitInForce
{
    /// <summary>The stress that the criterion looks at.</summary>
    public static StressMeasure Measure(StressLimit limit) =>
        limit.Criterion == Criterion.AllowableTresca ? StressMeasure.Tresca : StressMeasure.VonMises;

    /// <summary>Largest stress that it allows [Pa].</summary>
    public static double Stress(StressLimit limit, double yield) => yield / limit.Factor;

    /// <summary>The check with its calculation.</summary>
    public static CheckResult.Evaluated Check(StressLimit limit, in StressState state, double yield) => limit.Criterion switch
    {
        Criterion.AllowableVonMises => AllowableStress.VonMises(state, yield, limit.Factor),
        Criterion.AllowableTresca => AllowableStress.Tresca(state, yield, limit.Factor),
        _ => ElasticVerification.Check(state, yield, gamma_M0: limit.Factor),
    };

    /// <summary>The criterion in words with its factor.</summary>
    public static string Words(StressLimit? limit) => limit switch
    {
        null => "no limit",
        { Criterion: Criterion.AllowableVonMises } => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"von Mises ≤ fy/Ω, Ω = {limit.Factor:0.00##}"),
        { Criterion: Criterion.AllowableTresca } => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"Tresca ≤ fy/Ω, Ω = {limit.Factor:0.00##}"),
        _ => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"EN 1993-1-1 6.2.1(5), γM0 = {limit.Factor:0.00##}"),
    };

    /// <summary>Standard, edition and clause of a criterion.</summary>
    public static string Clause(StressLimit? limit) => limit switch
    {
        null => "",
        { Criterion: Criterion.En1993Elastic } => ElasticVerification.Clause.ToString(),
        _ => "allowable stress; the factor is the reviewer's",
    };
}
