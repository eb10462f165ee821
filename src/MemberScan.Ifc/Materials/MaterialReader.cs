using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Ifc.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Model.Rules;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Materials;

/// <summary>Material and section that an object's material association gives, and the material's values with their sources.</summary>
/// <remarks>Order: the occurrence's own association, then its type's; values from property entities, then from a grade by name. Nothing is defaulted but ν, marked so.</remarks>
internal sealed class MaterialReader(
    Instances instances, Relations relations, MaterialFactsReader facts, ProfileReader profiles, ReadingRules rules)
{
    /// <summary>Yield strengths outside this range [Pa] cannot be meant.</summary>
    private const double LeastYield = 20e6, LargestYield = 2500e6;

    /// <summary>Moduli outside this range [Pa] cannot be meant.</summary>
    private const double LeastModulus = 0.5e9, LargestModulus = 1000e9;

    /// <summary>Densities outside this range [kg/m³] cannot be meant.</summary>
    private const double LeastDensity = 100, LargestDensity = 25_000;

    private static readonly string[] s_notCovered =
        ["concrete", "beton", "hormig", "wood", "timber", "holz", "madera", "bois", "glass", "glas", "masonry", "mauerwerk", "brick", "gypsum", "plaster"];

    private const string Tapering = "IFCMATERIALPROFILESETUSAGETAPERING";

    private static readonly char[] s_partMarks = ['/', ',', ';', ':', '|'];

    private readonly Dictionary<string, Grade?> _gradeOf = new(StringComparer.Ordinal);

    /// <summary>Profiles that the association of an object (or its type) names; empty if none.</summary>
    public ImmutableArray<Finding<ProfileShape>> ProfilesOf(ulong id)
    {
        foreach (var level in Levels(id))
        {
            var found = level.SelectMany(d => Profiles(d, [])).Distinct().ToImmutableArray();
            if (!found.IsEmpty) return found;
        }

        return [];
    }

    /// <summary>Whether the association names a profile set that tapers to another.</summary>
    public bool IsTapering(ulong id) => !TaperingUsages(id).IsEmpty;

    /// <summary>Profiles that the association names for the member's end; empty where it does not taper.</summary>
    public ImmutableArray<Finding<ProfileShape>> EndProfilesOf(ulong id) =>
        [.. TaperingUsages(id).SelectMany(usage => instances.TryFollow(usage[3], out var set) ? Profiles(set, []) : []).Distinct()];

    /// <summary>Whether a tapering association lays both ends on the member's line by the same cardinal point.</summary>
    public bool KeepsItsLine(ulong id) => TaperingUsages(id).All(usage => CardinalPoint(usage[1]) == CardinalPoint(usage[4]));

    /// <summary>The one profile at the start and the one at the end of a tapering profile set; null where it does not name one each.</summary>
    public (Finding<ProfileShape> Start, Finding<ProfileShape> End)? TaperOf(ulong id)
    {
        foreach (var level in Levels(id))
            foreach (var usage in level)
                if (usage.Keyword == "IFCMATERIALPROFILESETUSAGETAPERING" && instances.TryFollow(usage[0], out var first) && instances.TryFollow(usage[3], out var last)
                    && Profiles(first, []).ToList() is [var start] && Profiles(last, []).ToList() is [var end])
                    return (start, end);
        return null;
    }

    /// <summary>Whether the association says that the member's line is that of its section's centroid (cardinal point 10).</summary>
    public bool RunsAlongCentroid(ulong id) => Levels(id).Any(level => level.Any(d =>
        d.Keyword is "IFCMATERIALPROFILESETUSAGE" or Tapering && CardinalPoint(d[1]) == 10));

    private ImmutableArray<Part21Record> TaperingUsages(ulong id) => [.. Levels(id).SelectMany(level => level.Where(d => d.Keyword == Tapering)).Take(1)];

    private static long? CardinalPoint(Part21Value value) => value.TryInteger(out var point) ? point : null;

    /// <summary>The material of an object and its values.</summary>
    /// <param name="id">STEP id of the object.</param>
    /// <param name="section">Its section, for the thickness ranges of grades; null if none.</param>
    public Material Read(ulong id, SectionFinding? section)
    {
        var levels = Levels(id).Select(Distinct).Where(list => list.Count > 0).ToList();
        var read = levels.Count > 0 ? levels[0] : [];
        var names = read.Select(m => m.Name);
        if (read.Count == 0) return Unknown("", "no material is associated with the member or its type");
        if (read.Count > 1) return Unknown(string.Join(" + ", names.Distinct(StringComparer.Ordinal)), $"several materials are associated: {string.Join(", ", names)}");

        var own = With(read[0], section);
        return levels.Count > 1 && levels[1] is [var ofType] && !string.Equals(ofType.Name, read[0].Name, StringComparison.OrdinalIgnoreCase)
            ? MoreCautious(own, With(ofType, section))
            : own;
    }

    private List<MaterialFacts> Distinct(IEnumerable<Part21Record> definitions) =>
        [.. definitions.SelectMany(d => Materials(d, [], [])).Select(m => facts.Read(m.Material, m.Owners)).DistinctBy(m => (m.Name, m.Category, m.Yield?.Value, m.Modulus?.Value, m.IsConcreteByProperties))];

    /// <summary>The occurrence's material, with the smaller strength where the type names another one; both are told.</summary>
    private static Material MoreCautious(Material own, Material ofType) => (own.Yield, ofType.Yield) switch
    {
        (Finding<double>.Found a, Finding<double>.Found b) when b.Value < a.Value * (1 - 1e-6) => own with
        {
            Yield = b with { Source = string.Create(CultureInfo.InvariantCulture, $"{b.Source}, of the type's material '{ofType.Name}'; the smaller of two, the occurrence's '{own.Name}' says {a.Value / 1e6:0.####} MPa by {a.Source}") },
        },
        (Finding<double>.Found a, Finding<double>.Found b) => own with
        {
            Yield = a with { Source = string.Create(CultureInfo.InvariantCulture, $"{a.Source}; the type's material '{ofType.Name}' says {b.Value / 1e6:0.####} MPa") },
        },
        (Finding<double>.Found a, _) => own with { Yield = a with { Source = $"{a.Source}; the type names another material, '{ofType.Name}', without a strength" } },
        _ => own,
    };

    private Material With(MaterialFacts material, SectionFinding? section)
    {
        var grade = GradeOf(material.Name) ?? GradeOf(material.Category) ?? material.Classifications.Select(GradeOf).FirstOrDefault(g => g is not null);
        var isSteel = grade?.IsSteel ?? (material.IsSteelByProperties
            || material.Category.Contains("steel", StringComparison.OrdinalIgnoreCase) || material.Modulus is { Value: > 170e9 and < 230e9 });
        return new Material(material.Name, Yield(material, grade, section), Modulus(material, grade), Poisson(material, grade), isSteel) { Density = Density(material) };
    }

    private static Finding<double> Yield(MaterialFacts material, Grade? grade, SectionFinding? section)
    {
        if (IsNotCovered(material)) return Missing(ReasonCode.MaterialNotCovered, $"material '{material.Name}' is outside the scope of the limits");

        Finding<double>? byProperty = material.Yield switch
        {
            null => null,
            { Value: null } p => Missing(ReasonCode.UnitMissing, $"{p.Source} {p.Fault}"),
            { Value: < LeastYield or > LargestYield } p => Missing(ReasonCode.StrengthImplausible, string.Create(CultureInfo.InvariantCulture, $"{p.Source} is {p.Value.Value / 1e6:0.####} MPa; outside {LeastYield / 1e6:0} to {LargestYield / 1e6:0} MPa it is taken for a slip of the unit{UnitSlip.OfYield(p.Written)}")),
            var p => new Finding<double>.Found(p.Value.Value, p.Source),
        };
        if (byProperty is Finding<double>.Missing) return byProperty;

        Finding<double>? byGrade = grade is null ? null : YieldOf(grade, section);
        return (byProperty, byGrade) switch
        {
            (Finding<double>.Found p, Finding<double>.Found g) when g.Value < p.Value * (1 - 1e-6) => g with
            {
                Source = string.Create(CultureInfo.InvariantCulture, $"{g.Source}; the smaller of two, {p.Source} says {p.Value / 1e6:0.####} MPa"),
            },
            (Finding<double>.Found p, _) => p,
            (_, not null) => byGrade,
            _ => Missing(ReasonCode.NoStrength, $"material '{material.Name}' has no yield strength in its properties and is no known grade"),
        };
    }

    private static Finding<double> YieldOf(Grade grade, SectionFinding? section)
    {
        var thickness = section is null ? 0 : section.Shapes.Max(WallThickness.Of);
        foreach (var range in grade.Yields)
            if (thickness <= range.UpTo * (1 + 1e-9))
                return new Finding<double>.Found(range.Yield, string.Create(CultureInfo.InvariantCulture, $"by name: grade {grade.Name} of {grade.Standard}, thickness {thickness * 1e3:0.###} mm{(grade.FromMemory ? " (from memory)" : "")}"));
        return Missing(ReasonCode.NoStrength, string.Create(CultureInfo.InvariantCulture, $"grade {grade.Name} of {grade.Standard} gives no strength for a thickness of {thickness * 1e3:0.###} mm"));
    }

    private static Finding<double> Modulus(MaterialFacts material, Grade? grade)
    {
        if (material.Modulus is { Value: >= LeastModulus and <= LargestModulus } found) return new Finding<double>.Found(found.Value.Value, found.Source);

        var why = material.Modulus switch
        {
            null => $"material '{material.Name}' has no modulus of elasticity in its properties",
            { Value: { } value } p => string.Create(CultureInfo.InvariantCulture, $"{p.Source} is {value / 1e6:0.####} MPa, which is taken for a slip of the unit{UnitSlip.OfModulus(p.Written)}"),
            var p => $"{p.Source} {p.Fault}",
        };
        return grade is not null
            ? new Finding<double>.Found(grade.Modulus, $"by name: grade {grade.Name} of {grade.Standard}{(grade.FromMemory ? " (from memory)" : "")}{(material.Modulus is null ? "" : "; " + why)}")
            : Missing(ReasonCode.StabilityNotChecked, why + " and is no known grade");
    }

    private static Finding<double>? Density(MaterialFacts material) => material.Density switch
    {
        null => null,
        { Value: >= LeastDensity and <= LargestDensity } p => new Finding<double>.Found(p.Value.Value, p.Source),
        { Value: { } value } p => Missing(ReasonCode.UnitMissing, string.Create(CultureInfo.InvariantCulture, $"{p.Source} is {value:0.####} kg/m³, which is taken for a slip of the unit")),
        var p => Missing(ReasonCode.UnitMissing, $"{p.Source} {p.Fault}"),
    };

    private Finding<double> Poisson(MaterialFacts material, Grade? grade)
    {
        if (material.Poisson is { Value: >= 0 and < 0.5 } found) return new Finding<double>.Found(found.Value.Value, found.Source);
        if (grade is not null) return new Finding<double>.Found(grade.Poisson, $"by name: grade {grade.Name}");

        return DefaultPoisson();
    }

    private Material Unknown(string name, string why) => new(
        name, Missing(ReasonCode.NoStrength, why), Missing(ReasonCode.StabilityNotChecked, why), DefaultPoisson(), IsSteel: false);

    private Finding<double>.Found DefaultPoisson() => new(rules.DefaultPoisson, "default");

    private static bool IsNotCovered(MaterialFacts material) => material.IsConcreteByProperties
        || Array.Exists(s_notCovered, word => material.Name.Contains(word, StringComparison.OrdinalIgnoreCase) || material.Category.Contains(word, StringComparison.OrdinalIgnoreCase));

    /// <summary>The grade that a name stands for: the whole name, else the one grade among its parts (<c>STEEL/S235JR</c>).</summary>
    private Grade? GradeOf(string name)
    {
        if (name.Length is 0 or > GradePattern.LongestName) return null;
        if (_gradeOf.TryGetValue(name, out var known)) return known;

        var grade = Matching(name);
        if (grade is null)
        {
            var parts = name.Split(s_partMarks, StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries).Select(Matching).OfType<Grade>().Distinct().ToList();
            if (parts.Count == 1) grade = parts[0];
        }

        return _gradeOf[name] = grade;
    }

    private Grade? Matching(string name) => rules.Grades.FirstOrDefault(grade => grade.Fits(name));

    /// <summary>Material definitions of the occurrence, then those of its type.</summary>
    private IEnumerable<IEnumerable<Part21Record>> Levels(ulong id)
    {
        yield return Associated(id);

        if (relations.TypeOf(id) is var type and not 0) yield return Associated(type);
    }

    private IEnumerable<Part21Record> Associated(ulong id)
    {
        foreach (var material in relations.MaterialsOf(id))
            if (instances.File.TryFind(material, out var record))
                yield return record;
    }

    private IEnumerable<Finding<ProfileShape>> Profiles(Part21Record definition, HashSet<ulong> visited)
    {
        if (!visited.Add(definition.Id)) return [];

        switch (definition.Keyword)
        {
            case "IFCMATERIALPROFILESETUSAGE" or Tapering:
                return instances.TryFollow(definition[0], out var set) ? Profiles(set, visited) : [];
            case "IFCMATERIALPROFILESET":
                return instances.FollowAll(definition[2]).SelectMany(part => Profiles(part, visited));
            case "IFCMATERIALPROFILE" or "IFCMATERIALPROFILEWITHOFFSETS":
                return instances.TryFollow(definition[3], out var profile) ? [profiles.Read(profile)] : [];
            default:
                return [];
        }
    }

    /// <summary>The materials of a definition, each with the sets, profiles, layers and constituents it is named by, the innermost first.</summary>
    private IEnumerable<(Part21Record Material, ImmutableArray<Part21Record> Owners)> Materials(Part21Record definition, HashSet<ulong> visited, ImmutableArray<Part21Record> owners)
    {
        IEnumerable<(Part21Record, ImmutableArray<Part21Record>)> From(Part21Value list) =>
            instances.FollowAll(list).SelectMany(part => Materials(part, visited, owners.Insert(0, definition)));
        if (definition.Keyword == "IFCMATERIAL") return [(definition, owners)];
        if (!visited.Add(definition.Id)) return [];

        return definition.Keyword switch
        {
            "IFCMATERIALLIST" => From(definition[0]),
            "IFCMATERIALPROFILESETUSAGE" or Tapering => From(definition[0]),
            "IFCMATERIALPROFILESET" or "IFCMATERIALCONSTITUENTSET" => From(definition[2]),
            "IFCMATERIALPROFILE" or "IFCMATERIALPROFILEWITHOFFSETS" or "IFCMATERIALCONSTITUENT" => From(definition[2]),
            "IFCMATERIALLAYERSETUSAGE" or "IFCMATERIALLAYERSET" or "IFCMATERIALLAYER" => From(definition[0]),
            _ => [],
        };
    }

    private static Finding<double> Missing(ReasonCode code, string message) => new Finding<double>.Missing(new Reason(code, message));
}
