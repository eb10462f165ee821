using System.Text.RegularExpressions;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Materials;

/// <summary>The family of a material by its name, and which limits may be held against it.</summary>
/// <remarks>A family never gives a strength: it only says which limits hold.</remarks>
public static partial class MaterialFamilies
{
    /// <summary>Longest name that is looked at.</summary>
    public const int LongestName = 1024;

    /// <summary>The family that a name tells; the more particular word counts, so "stainless steel" is stainless and "Glasgow steel" is steel.</summary>
    /// <param name="name">Name of the material; may be empty.</param>
    public static MaterialFamily Of(string name)
    {
        ArgumentNullException.ThrowIfNull(name);
        if (name.Length > LongestName) return MaterialFamily.Unknown;
        if (Stainless().IsMatch(name)) return MaterialFamily.Stainless;
        if (Aluminium().IsMatch(name)) return MaterialFamily.Aluminium;
        if (Timber().IsMatch(name)) return MaterialFamily.Timber;
        if (Glass().IsMatch(name)) return MaterialFamily.Glass;
        if (Mineral().IsMatch(name)) return MaterialFamily.Mineral;
        return CarbonSteel().IsMatch(name) ? MaterialFamily.CarbonSteel : MaterialFamily.Unknown;
    }

    /// <summary>Why no limit of ours may be held against a family; null when one may.</summary>
    /// <param name="family">The family.</param>
    /// <param name="hasGivenLimit">Whether the settings give limits for the largest normal stress of this material.</param>
    public static Reason? Refusal(MaterialFamily family, bool hasGivenLimit) => family switch
    {
        MaterialFamily.Timber or MaterialFamily.Glass or MaterialFamily.Mineral when !hasGivenLimit => new Reason(ReasonCode.MaterialNotCovered,
            $"The limits of metals do not hold for {Word(family)}; give limits of its largest normal stress in the settings to have it checked."),
        _ => null,
    };

    /// <summary>Whether the largest normal stress against given limits is the criterion, instead of yielding.</summary>
    /// <param name="family">The family.</param>
    public static bool IsBrittle(MaterialFamily family) => family is MaterialFamily.Timber or MaterialFamily.Glass or MaterialFamily.Mineral;

    private static string Word(MaterialFamily family) => family == MaterialFamily.Mineral ? "concrete and masonry" : family.ToString().ToLowerInvariant();

    [GeneratedRegex(@"\bstainless|edelstahl|\binox|acero inoxidable|\b1\.4\d{3}\b|\b(?:AISI|type)[ _-]?3(?:04|16)L?\b", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Stainless();

    [GeneratedRegex(@"\balu(?:min(?:i?um|io|iu)?)?\b|\bEN[ _-]?AW\b|\bAW[ _-]?\d{4}|\b(?:AA[ _-]?)?6(?:06[0-3]|082|005A?)[ _-]?T\d", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Aluminium();

    [GeneratedRegex(@"\b(?:timber|wood|holz|glulam|plywood|bois|madera|legno|hout)\b|holz\b|\bGL[ _-]?\d{2}[ch]?\b", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Timber();

    [GeneratedRegex(@"\b(?:glass|glas|verre|vidrio|vetro)\b|glas\b", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Glass();

    [GeneratedRegex(@"\b(?:concrete|beton|béton|hormigón|calcestruzzo|masonry|mauerwerk|brick)\b|beton\b", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Mineral();

    [GeneratedRegex(@"\bsteel\b|stahl\b|\bacier\b|\bacero\b|\bacciaio\b|\bstaal\b|\bS[ _-]?(?:235|275|355|420|450|460)|\bA(?:STM)?[ _-]?(?:A[ _-]?)?(?:36|53|500|572|992|1085)\b", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex CarbonSteel();
}
