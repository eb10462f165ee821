using System.Collections.Frozen;
using System.Collections.Immutable;
using MemberScan.Foundation.Units;
using MemberScan.Model.Forces;
using MemberScan.Model.Limits;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.SettingsFiles;

/// <summary>The keys of a settings file and the words and ranges of their values; the published schema says the same.</summary>
internal static class SettingKeys
{
    public static readonly ImmutableArray<string> Root = ["$schema", "basis", "candidates", "sections", "roles", "forces", "loads", "units", "materials", "checks", "stability", "threads", "deflection", "rules", "display"];
    public static readonly ImmutableArray<string> Basis = ["service", "design", "wall", "brittle", "gammaM1", "gammaM2"];
    public static readonly ImmutableArray<string> Service = ["criterion", "omega"];
    public static readonly ImmutableArray<string> Design = ["criterion", "gammaM0"];
    public static readonly ImmutableArray<string> Candidates = ["always", "withBarBodyOrForces"];
    public static readonly ImmutableArray<string> Sections = ["recogniseMeshes"];
    public static readonly ImmutableArray<string> RoleEntry =
        ["role", "classes", "predefinedTypes", "namePattern", "minSlopeDegrees", "maxSlopeDegrees", "minSlenderness"];
    public static readonly ImmutableArray<string> Forces =
    ["from",
        "convention", "components", "turnDegrees", "turnDegreesByMember", "missingComponents", "unknownMembers", "kinds",
        "torsion", "missingCoefficients", "caseCoefficients", "combinations", "combinationSets", "caseTags", "propertySets",
    ];
    public static readonly ImmutableArray<string> KindEntry = ["pattern", "kind"];
    public static readonly ImmutableArray<string> Materials = ["grades", "poisson", "welds"];
    public static readonly ImmutableArray<string> Stability = ["lengthFactor", "factorByRole", "ends", "hollowForming"];

    public static readonly (double Least, double Most) Factor = (1, 100);
    public static readonly (double Least, double Most) Turn = (-360, 360);
    public static readonly (double Least, double Most) Slope = (0, 90);
    public static readonly (double Least, double Most) Slenderness = (0, 10_000);
    public static readonly (double Least, double Most) LengthFactor = (0.5, 100);

    public static readonly WordTable<Criterion> ServiceCriteria =
        new(("allowable-von-mises", Criterion.AllowableVonMises), ("allowable-tresca", Criterion.AllowableTresca),
            ("aisc-360-asd", Criterion.Aisc360Asd), ("largest-normal-stress", Criterion.LargestNormalStress));
    public static readonly WordTable<Criterion> DesignCriteria =
        new(("en-1993-1-1-elastic", Criterion.En1993Elastic), ("aisc-360-lrfd", Criterion.Aisc360Lrfd), ("largest-normal-stress", Criterion.LargestNormalStress));
    public static readonly WordTable<ForceConvention> Conventions =
        new(("positive-face", ForceConvention.PositiveFace), ("end-forces", ForceConvention.EndForces), ("detect", ForceConvention.Detect));
    public static readonly WordTable<ForceConvention> StatedConventions =
        new(("positive-face", ForceConvention.PositiveFace), ("end-forces", ForceConvention.EndForces));
    public static readonly WordTable<ForceComponents> Components =
        new(("as-flagged", ForceComponents.AsFlagged), ("member-axes", ForceComponents.MemberAxes), ("global-axes", ForceComponents.GlobalAxes));
    public static readonly WordTable<ForceSource> Sources = new(
        ("table", ForceSource.Table), ("results", ForceSource.Results), ("property-sets", ForceSource.PropertySets), ("statics", ForceSource.Statics), ("presets", ForceSource.Presets));
    public static readonly WordTable<bool> MissingComponents = new(("refuse", false), ("zero", true));
    public static readonly WordTable<bool> UnknownMembers = new(("refuse", false), ("list", true));
    public static readonly WordTable<SituationKind> Kinds = new(("service", SituationKind.Service), ("design", SituationKind.Design));
    public static readonly WordTable<DisplayUnits> Displays = new(("si", DisplayUnits.Si), ("us", DisplayUnits.Us));

    /// <summary>Unit types that may be named for models that lack them, in a fixed order.</summary>
    public static readonly ImmutableArray<string> UnitTypes = ["LENGTHUNIT", "FORCEUNIT", "PRESSUREUNIT", "TORQUEUNIT", "MODULUSOFELASTICITYUNIT"];

    public static readonly FrozenDictionary<string, Quantity> UnitQuantities = new Dictionary<string, Quantity>
    {
        ["LENGTHUNIT"] = Quantity.Length,
        ["FORCEUNIT"] = Quantity.Force,
        ["PRESSUREUNIT"] = Quantity.Stress,
        ["TORQUEUNIT"] = Quantity.Moment,
        ["MODULUSOFELASTICITYUNIT"] = Quantity.Stress,
    }.ToFrozenDictionary(StringComparer.Ordinal);
}
