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
    private readonly Dictionary<ulong, MaterialFacts> _known = [];

    public MaterialFactsReader(Instances instances, ModelUnits units, UnitReader unitReader)
    {
        (_instances, _units, _unitReader) = (instances, units, unitReader);
        Index("IFCMATERIALPROPERTIES", materialIndex: 3);
        Index("IFCEXTENDEDMATERIALPROPERTIES", materialIndex: 0);
        Index("IFCMECHANICALMATERIALPROPERTIES", materialIndex: 0);
        Index("IFCMECHANICALSTEELMATERIALPROPERTIES", materialIndex: 0);
        Index("IFCMECHANICALCONCRETEMATERIALPROPERTIES", materialIndex: 0);
    }

    /// <summary>What the records of a material say.</summary>
    public MaterialFacts Read(Part21Record material)
    {
        if (_known.TryGetValue(material.Id, out var known)) return known;

        var facts = new MaterialFacts(Instances.Text(material[0]).Trim(), Instances.Text(material[2]).Trim(), null, null, null, false, false);
        foreach (var record in _propertiesOf.GetValueOrDefault(material.Id) ?? [])
            facts = With(facts, record);
        return _known[material.Id] = facts;
    }

    private MaterialFacts With(MaterialFacts facts, Part21Record record) => record.Keyword switch
    {
        "IFCMECHANICALSTEELMATERIALPROPERTIES" => WithFixed(facts, record) with
        {
            Yield = facts.Yield ?? Fixed(record, 6, "YieldStress", "PRESSUREUNIT"),
            IsSteelByProperties = true,
        },
        "IFCMECHANICALMATERIALPROPERTIES" => WithFixed(facts, record),
        "IFCMECHANICALCONCRETEMATERIALPROPERTIES" => WithFixed(facts, record) with { IsConcreteByProperties = true },
        "IFCEXTENDEDMATERIALPROPERTIES" => WithSet(facts, record, record[1], Instances.Text(record[3])),
        _ => WithSet(facts, record, record[2], Instances.Text(record[0])),
    };

    private MaterialFacts WithFixed(MaterialFacts facts, Part21Record record) => facts with
    {
        Modulus = facts.Modulus ?? Fixed(record, 2, "YoungModulus", "MODULUSOFELASTICITYUNIT"),
        Poisson = facts.Poisson ?? Fixed(record, 4, "PoissonRatio", ""),
    };

    private MaterialFacts WithSet(MaterialFacts facts, Part21Record record, Part21Value list, string setName)
    {
        foreach (var property in _instances.FollowAll(list))
        {
            if (property.Keyword != "IFCPROPERTYSINGLEVALUE") continue;

            var name = Instances.Text(property[0]).Trim();
            bool Is(string wanted) => string.Equals(name, wanted, StringComparison.OrdinalIgnoreCase);
            if (Is("YieldStress")) facts = facts with { Yield = facts.Yield ?? Single(property, record, setName, "PRESSUREUNIT"), IsSteelByProperties = facts.IsSteelByProperties || IsSteelSet(setName) };
            else if (Is("YoungModulus")) facts = facts with { Modulus = facts.Modulus ?? Single(property, record, setName, "MODULUSOFELASTICITYUNIT") };
            else if (Is("PoissonRatio")) facts = facts with { Poisson = facts.Poisson ?? Single(property, record, setName, "") };
            else if (Is("StructuralGrade") && facts.Category.Length == 0) facts = facts with { Category = Instances.Text(property[2]).Trim() };
            else if (Is("CompressiveStrength")) facts = facts with { IsConcreteByProperties = facts.IsConcreteByProperties || setName.Contains("Concrete", StringComparison.OrdinalIgnoreCase) };
        }

        return facts;
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
        if (unitType.Length == 0) return new PropertyValue(value, source, "");
        if (_instances.TryFollow(property[3], out var own)) return InUnit(value, _unitReader.Factor(own), unitType, source);
        if (!property[3].IsEmpty) return new PropertyValue(null, source, "has a unit of its own that the file does not hold");

        // Without a unit of its own the value is in the project's unit of the measure that it is written as.
        var measured = property[2].TypeName switch
        {
            "IFCPRESSUREMEASURE" => "PRESSUREUNIT",
            "IFCMODULUSOFELASTICITYMEASURE" => "MODULUSOFELASTICITYUNIT",
            "" => unitType,
            _ => null,
        };
        return measured is null
            ? new PropertyValue(null, source, $"is written as {property[2].TypeName}, which has no unit")
            : InUnit(value, _units.FactorOf(measured), measured, source);
    }

    private static PropertyValue InUnit(double value, double? factor, string unitType, string source) =>
        factor is { } f && double.IsFinite(value * f)
            ? new PropertyValue(value * f, source, "")
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
