using System.Globalization;
using MemberScan.Ifc.Units;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames.Stiffness;

/// <summary>Section constants in the profile properties of the three schemas: fixed attributes in IFC2X3, <c>Pset_ProfileMechanical</c> later.</summary>
internal sealed class StatedConstantsReader
{
    private readonly Instances _instances;
    private readonly Relations _relations;
    private readonly ModelUnits _units;
    private readonly UnitReader _unitReader;
    private readonly Dictionary<ulong, List<Part21Record>> _ofProfile = [];

    public StatedConstantsReader(Instances instances, Relations relations, ModelUnits units, UnitReader unitReader)
    {
        (_instances, _relations, _units, _unitReader) = (instances, relations, units, unitReader);
        foreach (var properties in instances.File.RecordsOf("IFCPROFILEPROPERTIES"))
        {
            if (!properties[3].TryReference(out var profile)) continue;

            if (!_ofProfile.TryGetValue(profile, out var list)) _ofProfile[profile] = list = [];
            list.Add(properties);
        }
    }

    /// <summary>What is stated of the section of a member; null where nothing is, or where several sections are named.</summary>
    public StatedConstants? Of(ulong member)
    {
        var fixedOnes = _relations.ProfilePropertiesOf(member);
        if (fixedOnes.Count > 0)
            return fixedOnes.Count == 1 && _instances.File.TryFind(fixedOnes[0].Properties, out var record) && record.Keyword is "IFCSTRUCTURALPROFILEPROPERTIES" or "IFCSTRUCTURALSTEELPROFILEPROPERTIES" ? Fixed(record) : null;

        var profiles = Profiles(member).Distinct().ToList();
        return profiles.Count == 1 && _ofProfile.TryGetValue(profiles[0], out var sets) ? OfSets(sets) : null;
    }

    private StatedConstants Fixed(Part21Record r) => new(
        Value(r[6], null, 2), Value(r[9], null, 4), Value(r[10], null, 4), Number(r[8], null, 4), Value(r[7], null, 4), Value(r[15], null, 2), Value(r[14], null, 2),
        string.Create(CultureInfo.InvariantCulture, $"profile properties #{r.Id}"));

    private StatedConstants OfSets(List<Part21Record> sets)
    {
        var properties = sets.SelectMany(s => _instances.FollowAll(s[2])).Where(p => p.Keyword == "IFCPROPERTYSINGLEVALUE").ToList();
        double? Of(string name, int power, bool signed = false) =>
            properties.Find(p => string.Equals(Instances.Text(p[0]).Trim(), name, StringComparison.OrdinalIgnoreCase)) is { Id: not 0 } property
                ? signed ? Number(property[2], property[3], power) : Value(property[2], property[3], power)
                : null;
        return new StatedConstants(
            Of("CrossSectionArea", 2), Of("MomentOfInertiaY", 4), Of("MomentOfInertiaZ", 4), Of("MomentOfInertiaYZ", 4, signed: true), Of("TorsionalConstantX", 4),
            Of("ShearDeformationAreaY", 2), Of("ShearDeformationAreaZ", 2),
            string.Create(CultureInfo.InvariantCulture, $"profile properties {string.Join(", ", sets.Select(s => $"#{s.Id}"))}"));
    }

    private double? Value(Part21Value value, Part21Value? own, int power) => Number(value, own, power) is > 0 and var number ? number : null;

    /// <summary>A value in its own unit, that of the model for its kind, or else the power of the model's unit of length.</summary>
    private double? Number(Part21Value value, Part21Value? own, int power)
    {
        if (Instances.Real(value) is not { } number) return null;

        double? factor = null;
        if (own is { IsEmpty: false } unit) factor = _instances.TryFollow(unit, out var record) ? _unitReader.Factor(record) : null;
        else factor = _units.FactorOf(power == 2 ? "AREAUNIT" : "MOMENTOFINERTIAUNIT") ?? (_units.Length is { } metre ? Math.Pow(metre, power) : null);
        return number * factor is { } si && double.IsFinite(si) ? si : null;
    }

    private IEnumerable<ulong> Profiles(ulong member)
    {
        foreach (var id in _relations.MaterialsOf(member))
        {
            if (!_instances.File.TryFind(id, out var record)) continue;
            if (record.Keyword == "IFCMATERIALPROFILESETUSAGE" && !_instances.TryFollow(record[0], out record)) continue;

            List<Part21Record> parts = record.Keyword == "IFCMATERIALPROFILESET" ? [.. _instances.FollowAll(record[2])] : [record];
            foreach (var part in parts)
                if (part.Keyword is "IFCMATERIALPROFILE" or "IFCMATERIALPROFILEWITHOFFSETS" && part[3].TryReference(out var profile))
                    yield return profile;
        }
    }
}
