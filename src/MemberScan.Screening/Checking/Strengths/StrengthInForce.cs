using System.Globalization;
using MemberScan.Checks.Materials;
using MemberScan.Model;
using MemberScan.Model.Limits;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;

namespace MemberScan.Screening.Checking.Strengths;

/// <summary>The strength that a member is checked with: as read, beside welds of aluminium that of the welded zone.</summary>
internal static class StrengthInForce
{
    private const string ByName = "by name";

    /// <summary>Whether the largest normal stress against given limits is the criterion of a member.</summary>
    public static bool IsBrittle(Material material, LimitSet limits) => limits.Brittle is not null
        && (MaterialFamilies.IsBrittle(MaterialFamilies.Of(material.Name))
            || limits.Basis.Service?.Criterion == Criterion.LargestNormalStress || limits.Basis.Design?.Criterion == Criterion.LargestNormalStress);

    /// <summary>The yield strength in force, or why there is none.</summary>
    public static Finding<double> Of(Member member, LimitSet limits)
    {
        var material = member.Material;
        if (IsBrittle(material, limits)) return new Finding<double>.Found(limits.Brittle!.Tension, "settings, basis.brittle: limits of the largest normal stress");
        if (material.Yield is not Finding<double>.Found yield || MaterialFamilies.Of(material.Name) != MaterialFamily.Aluminium) return material.Yield;

        return limits.Welds.FirstOrDefault(rule => MemberSelector.Names(rule.Members, member)) switch
        {
            // The shipped grades give the welded zone, unless the name itself says that there are no welds.
            null when yield.Source.StartsWith(ByName, StringComparison.Ordinal) => yield,
            null => new Finding<double>.Missing(new Reason(ReasonCode.NoStrength, string.Create(CultureInfo.InvariantCulture,
                $"'{material.Name}' is aluminium, whose strength falls beside welds: {yield.Value / 1e6:0.####} MPa ({yield.Source}) holds for the parent metal alone; say in materials.welds that there are no welds, or give the strength beside them"))),
            { WeldedYield: null } => yield with { Source = $"{yield.Source}; no welds, as stated in the settings" },
            { WeldedYield: { } welded } when welded < yield.Value => new Finding<double>.Found(welded, string.Create(CultureInfo.InvariantCulture,
                $"settings, materials.welds: welded zone, every place counts as welded; the parent metal has {yield.Value / 1e6:0.####} MPa ({yield.Source})")),
            _ => yield,
        };
    }
}
