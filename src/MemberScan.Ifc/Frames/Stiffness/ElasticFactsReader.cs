using MemberScan.Ifc.Units;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames.Stiffness;

/// <summary>Shear modulus, density and thermal expansion from the property entities of the three schemas.</summary>
internal sealed class ElasticFactsReader
{
    /// <summary>Values outside these ranges are taken for slips of the unit: G [Pa], density [kg/m³], expansion [1/K].</summary>
    private static readonly (double Least, double Most) s_shear = (0.2e9, 400e9), s_density = (100, 25_000), s_expansion = (1e-7, 1e-3);

    private readonly Instances _instances;
    private readonly ModelUnits _units;
    private readonly UnitReader _unitReader;
    private readonly Dictionary<ulong, ElasticFacts> _facts = [];

    public ElasticFactsReader(Instances instances, ModelUnits units, UnitReader unitReader)
    {
        (_instances, _units, _unitReader) = (instances, units, unitReader);
        foreach (var r in instances.File.RecordsOf("IFCMATERIALPROPERTIES")) WithSet(r[3], r[2]);
        foreach (var r in instances.File.RecordsOf("IFCEXTENDEDMATERIALPROPERTIES")) WithSet(r[0], r[1]);
        foreach (var r in instances.File.RecordsOf("IFCGENERALMATERIALPROPERTIES")) Add(r[0], new ElasticFacts(null, In(r[3], "MASSDENSITYUNIT", s_density), null));
        foreach (var keyword in (string[])["IFCMECHANICALMATERIALPROPERTIES", "IFCMECHANICALSTEELMATERIALPROPERTIES", "IFCMECHANICALCONCRETEMATERIALPROPERTIES"])
            foreach (var r in instances.File.RecordsOf(keyword))
                Add(r[0], new ElasticFacts(In(r[3], "SHEARMODULUSUNIT", s_shear) ?? In(r[3], "MODULUSOFELASTICITYUNIT", s_shear), null, In(r[5], "THERMALEXPANSIONCOEFFICIENTUNIT", s_expansion, otherwise: 1)));
    }

    /// <summary>What is known of a material by its STEP id.</summary>
    public ElasticFacts Of(ulong material) => _facts.GetValueOrDefault(material) ?? ElasticFacts.None;

    private void WithSet(Part21Value material, Part21Value properties)
    {
        foreach (var property in _instances.FollowAll(properties))
        {
            if (property.Keyword != "IFCPROPERTYSINGLEVALUE") continue;

            switch (Instances.Text(property[0]).Trim().ToUpperInvariant())
            {
                case "SHEARMODULUS": Add(material, new ElasticFacts(Single(property, ["SHEARMODULUSUNIT", "MODULUSOFELASTICITYUNIT"], s_shear, null), null, null)); break;
                case "MASSDENSITY": Add(material, new ElasticFacts(null, Single(property, ["MASSDENSITYUNIT"], s_density, null), null)); break;
                case "THERMALEXPANSIONCOEFFICIENT": Add(material, new ElasticFacts(null, null, Single(property, ["THERMALEXPANSIONCOEFFICIENTUNIT"], s_expansion, 1))); break;
            }
        }
    }

    private double? Single(Part21Record property, string[] unitTypes, (double Least, double Most) range, double? otherwise)
    {
        if (Instances.Real(property[2]) is not { } value) return null;

        var factor = _instances.TryFollow(property[3], out var own) ? _unitReader.Factor(own)
            : property[3].IsEmpty ? unitTypes.Select(_units.FactorOf).FirstOrDefault(f => f is not null) ?? otherwise
            : null;
        return Within(value * factor, range);
    }

    private double? In(Part21Value value, string unitType, (double Least, double Most) range, double? otherwise = null) =>
        Instances.Real(value) is { } number ? Within(number * (_units.FactorOf(unitType) ?? otherwise), range) : null;

    private static double? Within(double? value, (double Least, double Most) range) => value >= range.Least && value <= range.Most ? value : null;

    private void Add(Part21Value material, ElasticFacts more)
    {
        if (!material.TryReference(out var id)) return;

        var known = Of(id);
        _facts[id] = new ElasticFacts(known.ShearModulus ?? more.ShearModulus, known.Density ?? more.Density, known.Expansion ?? more.Expansion);
    }
}
