using System.Globalization;
using MemberScan.Checks.Aisc360.Stresses;
using MemberScan.Checks.Allowable;
using MemberScan.Checks.En1993;
using MemberScan.Model.Limits;

namespace MemberScan.Screening.Checking.Rules;

/// <summary>The limits of the basis in words.</summary>
internal static class LimitWords
{
    /// <summary>The criterion in words with its factor.</summary>
    public static string Of(StressLimit? limit) => limit?.Criterion switch
    {
        null => "no limit",
        Criterion.AllowableVonMises => Text($"von Mises ≤ fy/Ω, Ω = {limit.Factor:0.00##}"),
        Criterion.AllowableTresca => Text($"Tresca ≤ fy/Ω, Ω = {limit.Factor:0.00##}"),
        Criterion.Aisc360Asd => "AISC 360-22 ASD, first yield of hollow sections, H3.3 of the others, Ω = 1.67",
        Criterion.Aisc360Lrfd => "AISC 360-22 LRFD, first yield of hollow sections, H3.3 of the others, φ = 0.90",
        Criterion.LargestNormalStress => "largest normal stress against given limits",
        _ => Text($"EN 1993-1-1 6.2.1(5), γM0 = {limit.Factor:0.00##}"),
    };

    /// <summary>Standard, edition and clause of a criterion.</summary>
    public static string Clause(StressLimit? limit) => limit?.Criterion switch
    {
        null => "",
        Criterion.En1993Elastic => ElasticVerification.Clause.ToString(),
        Criterion.Aisc360Asd or Criterion.Aisc360Lrfd => $"{ElasticLimit.Clause}; {NonHollowStress.NormalClause}; {NonHollowStress.ShearClause}",
        Criterion.LargestNormalStress => LargestNormalStress.Clause.ToString(),
        _ => "allowable stress; the factor is the reviewer's",
    };

    private static string Text(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
