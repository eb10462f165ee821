using System.Globalization;
using MemberScan.Ifc.Units;
using MemberScan.Part21;

namespace MemberScan.Ifc.Materials;

/// <summary>Values of materials from the property entities of the three schemas.</summary>
internal sealed class MaterialFactsReader
{
    private readonly Instances _instances;
    private readonly ModelUnits _units;
    private readonly UnitReader _unitReader;
    private readonly Dictionary<ulong, List<Part21Record>> _propertiesOf = [];
    private readonly Dictionary<ulong, List<string>> _classificationsOf = [];
    private readonly Dictionary<ulong, MaterialFacts> _known = [];

    /// <summary>Difference of two values of one property from which they contradict each other [-].</summary>
    private const double Different = 1e-6;

    public MaterialFactsReader(Instances instances, ModelUnits units, UnitReader unitReader)
    {
        (_instances, _units, _unitReader) = (instances, units, unitReader);
        foreach (var relation in instances.File.RecordsOf("IFCEXTERNALREFERENCERELATIONSHIP")) AddClassifications(relation[2], Instances.IdsOf(relation[3]));
        foreach (var relation in instances.File.RecordsOf("IFCMATERIALCLASSIFICATIONRELATIONSHIP"))
            if (relation[1].TryReference(out var classified))
                AddClassifications(relation[0], [classified]);
        Index("IFCMATERIALPROPERTIES", materialIndex: 3);
        Index("IFCEXTENDEDMATERIALPROPERTIES", materialIndex: 0);
        Index("IFCGENERALMATERIALPROPERTIES", materialIndex: 0);
        Index("IFCMECHANICALMATERIALPROPERTIES", materialIndex: 0);
        Index("IFCMECHANICALSTEELMATERIALPROPERTIES", materialIndex: 0);
        Index("IFCMECHANICALCONCRETEMATERIALPROPERTIES", materialIndex: 0);
    }

    /// <summary>What the records of a material say.</summary>
    public MaterialFacts Read(Part21Record material)
    {
        if (_known.TryGetValue(material.Id, out var known)) return known;

        var facts = new MaterialFacts(Instances.Text(material[0]).Trim(), Instances.Text(material[2]).Trim(), null, null, null, false, false)
        {
            Classifications = [.. _classificationsOf.GetValueOrDefault(material.Id) ?? []],
        };
        foreach (var record in _propertiesOf.GetValueOrDefault(material.Id) ?? [])
            facts = With(facts, record);
        return _known[material.Id] = facts;
    }

    /// <summary>What the records of a material say, and those of the sets, profiles, layers and constituents that name it.</summary>
    /// <param name="material">The material.</param>
    /// <param name="owners">What names it, the innermost first; a category of theirs stands in for one that the material lacks.</param>
    public MaterialFacts Read(Part21Record material, IEnumerable<Part21Record> owners)
    {
        var facts = Read(material);
        foreach (var owner in owners)
        {
            if (facts.Category.Length == 0) facts = facts with { Category = CategoryOf(owner) };
            foreach (var record in _propertiesOf.GetValueOrDefault(owner.Id) ?? []) facts = With(facts, record);
        }

        return facts;
    }

    private static string CategoryOf(Part21Record owner) => owner.Keyword switch
    {
        "IFCMATERIALPROFILE" or "IFCMATERIALPROFILEWITHOFFSETS" or "IFCMATERIALLAYER" or "IFCMATERIALLAYERWITHOFFSETS" => Instances.Text(owner[5]).Trim(),
        "IFCMATERIALCONSTITUENT" => Instances.Text(owner[4]).Trim(),
        _ => "",
    };

    // IfcClassificationReference: location, identification, name; in IFC2X3 the second is called ItemReference. IfcClassificationNotation is not read.
    private void AddClassifications(Part21Value references, IEnumerable<ulong> materials)
    {
        var texts = _instances.FollowAll(references).Where(r => r.Keyword == "IFCCLASSIFICATIONREFERENCE")
            .SelectMany(r => new[] { Instances.Text(r[1]).Trim(), Instances.Text(r[2]).Trim() }).Where(t => t.Length > 0).ToList();
        foreach (var material in materials)
        {
            if (!_classificationsOf.TryGetValue(material, out var list)) _classificationsOf[material] = list = [];
            list.AddRange(texts);
        }
    }

    private MaterialFacts With(MaterialFacts facts, Part21Record record) => record.Keyword switch
    {
        "IFCMECHANICALSTEELMATERIALPROPERTIES" => WithFixed(facts, record) with
        {
            Yield = Cautious(facts.Yield, Fixed(record, 6, "YieldStress", "PRESSUREUNIT")),
            IsSteelByProperties = true,
        },
        "IFCMECHANICALMATERIALPROPERTIES" => WithFixed(facts, record),
        "IFCGENERALMATERIALPROPERTIES" => facts with { Density = Cautious(facts.Density, Fixed(record, 3, "MassDensity", "MASSDENSITYUNIT")) },
        "IFCMECHANICALCONCRETEMATERIALPROPERTIES" => WithFixed(facts, record) with { IsConcreteByProperties = true },
        "IFCEXTENDEDMATERIALPROPERTIES" => WithSet(facts, record, record[1], Instances.Text(record[3])),
        _ => WithSet(facts, record, record[2], Instances.Text(record[0])),
    };

    private MaterialFacts WithFixed(MaterialFacts facts, Part21Record record) => facts with
    {
        Modulus = Cautious(facts.Modulus, Fixed(record, 2, "YoungModulus", "MODULUSOFELASTICITYUNIT")),
        Poisson = Cautious(facts.Poisson, Fixed(record, 4, "PoissonRatio", "")),
    };

    private MaterialFacts WithSet(MaterialFacts facts, Part21Record record, Part21Value list, string setName)
    {
        foreach (var property in _instances.FollowAll(list))
        {
            if (property.Keyword != "IFCPROPERTYSINGLEVALUE") continue;

            var name = Instances.Text(property[0]).Trim();
            bool Is(string wanted) => string.Equals(name, wanted, StringComparison.OrdinalIgnoreCase);
            if (Is("YieldStress")) facts = facts with { Yield = Cautious(facts.Yield, Single(property, record, setName, "PRESSUREUNIT")), IsSteelByProperties = facts.IsSteelByProperties || IsSteelSet(setName) };
            else if (Is("YoungModulus")) facts = facts with { Modulus = Cautious(facts.Modulus, Single(property, record, setName, "MODULUSOFELASTICITYUNIT")) };
            else if (Is("PoissonRatio")) facts = facts with { Poisson = Cautious(facts.Poisson, Single(property, record, setName, "")) };
            else if (Is("MassDensity")) facts = facts with { Density = Cautious(facts.Density, Single(property, record, setName, "MASSDENSITYUNIT")) };
            else if (Is("StructuralGrade") && facts.Category.Length == 0) facts = facts with { Category = Instances.Text(property[2]).Trim() };
            else if (Is("CompressiveStrength")) facts = facts with { IsConcreteByProperties = facts.IsConcreteByProperties || setName.Contains("Concrete", StringComparison.OrdinalIgnoreCase) };
        }

        return facts;
    }

    /// <summary>The smaller of two values of one property where they differ, with the other one told; a value before one that cannot be used.</summary>
    private static PropertyValue? Cautious(PropertyValue? first, PropertyValue? second)
    {
        if (first is not { Value: { } a }) return first is null ? second : first;
        if (second is not { Value: { } b } || Math.Abs(a - b) <= Different * Math.Abs(a)) return first;

        var (used, other) = a <= b ? (first, second) : (second, first);
        return used with { Source = string.Create(CultureInfo.InvariantCulture, $"{used.Source}; the smaller of two, {other.Source} says {other.Written:0.######} where this one says {used.Written:0.######}") };
    }

    private static bool IsSteelSet(string setName) => setName.Contains("Steel", StringComparison.OrdinalIgnoreCase);

    private PropertyValue? Fixed(Part21Record record, int index, string name, string unitType)
    {
        if (Instances.Real(record[index]) is not { } value) return null;

        var source = string.Create(CultureInfo.InvariantCulture, $"{name} of {record.Keyword} #{record.Id}");
        return InUnit(value, unitType.Length == 0 ? 1 : _units.FactorOf(unitType), unitType, source);
    }

    private PropertyValue? Single(Part21Record property, Part21Record owner, string setName, string unitType)
    {
        if (property[2].IsEmpty) return null;                     // present, value unknown

        var source = string.Create(CultureInfo.InvariantCulture, $"{Instances.Text(property[0])} of '{setName}' #{owner.Id}");
        if (Instances.Real(property[2]) is not { } value) return new PropertyValue(null, source, "is no number");
        if (unitType.Length == 0) return new PropertyValue(value, source, "", value);
        if (_instances.TryFollow(property[3], out var own)) return InUnit(value, _unitReader.Factor(own), unitType, source);
        if (!property[3].IsEmpty) return new PropertyValue(null, source, "has a unit of its own that the file does not hold");

        // Without a unit of its own the value is in the project's unit of the measure that it is written as.
        var measured = property[2].TypeName switch
        {
            "IFCPRESSUREMEASURE" => "PRESSUREUNIT",
            "IFCMODULUSOFELASTICITYMEASURE" => "MODULUSOFELASTICITYUNIT",
            "IFCMASSDENSITYMEASURE" => "MASSDENSITYUNIT",
            "" => unitType,
            _ => null,
        };
        return measured is null
            ? new PropertyValue(null, source, $"is written as {property[2].TypeName}, which has no unit")
            : InUnit(value, _units.FactorOf(measured), measured, source);
    }

    private static PropertyValue InUnit(double value, double? factor, string unitType, string source) =>
        factor is { } f && double.IsFinite(value * f)
            ? new PropertyValue(value * f, source, "", value)
            : new PropertyValue(null, source, $"needs the unit {unitType}, which the model does not name");

    private void Index(string keyword, int materialIndex)
    {
        foreach (var record in _instances.File.RecordsOf(keyword))
        {
            if (!record[materialIndex].TryReference(out var material)) continue;
            if (!_propertiesOf.TryGetValue(material, out var list)) _propertiesOf[material] = list = [];
            list.Add(record);
        }
    }
}
