using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Analysis;
using MemberScan.Ifc.Analysis.Loads;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Frames;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames.Stiffness;

/// <summary>Section and material of analytical members: their own, else those of the physical element that they stand for.</summary>
internal sealed class StiffnessReader(Instances instances, Relations relations, AnalyticalSource analytical, ElasticFactsReader elastic, ImmutableArray<Member> candidates)
{
    /// <summary>Largest sine of the angle between an analytical member and the body whose section it takes.</summary>
    private const double Parallel = 0.02;

    /// <summary>Share of the second moments below which a product of inertia or an offset of the shear centre is nothing.</summary>
    private const double Nothing = 1e-9;

    private readonly ILookup<ulong, Member> _candidates = candidates.ToLookup(m => m.Element.StepId);
    private readonly Dictionary<CrossSection, SectionProperties> _properties = [];

    private sealed record Source(Finding<SectionFinding> Section, Material Material, Finding<MemberAxes> Axes, ulong Element, bool IsBody);

    /// <summary>Reads a member; the reason names it.</summary>
    /// <param name="member">The record of the analytical member.</param>
    /// <param name="line">The analytical member.</param>
    /// <param name="axis">Its Axis attribute in project axes, for a curved member, whose axes are known nowhere else; null if none.</param>
    /// <param name="name">Its name, for messages.</param>
    public Finding<MemberStiffness> Read(Part21Record member, AnalyticalMember line, Vector3? axis, string name)
    {
        var source = Find(member, line);
        if (!source.Section.TryGet(out var section, out var noSection)) return Missing(noSection.Code, $"{name} has no section that can be used: {noSection.Message}");
        if (!source.Material.Modulus.TryGet(out var modulus, out var noModulus)) return Missing(ReasonCode.NoForces, $"{name} has no modulus of elasticity: {noModulus.Message}");
        if (!Direction(source, line, axis, section.Value.Shape, out var z, out var reversed, out var noAxes)) return Missing(noAxes!.Code, $"{name}: {noAxes.Message}");
        if (Constants(section.Value.Shape, reversed) is not { } constants) return Missing(ReasonCode.SectionNotCovered, $"{name}: the section {section.Value.Shape.Designation} has no torsion constant");

        var notes = ImmutableArray.CreateBuilder<string>();
        if (section.Value.Shapes.Length > 1) notes.Add($"{name}: stiffness of the first of {section.Value.Shapes.Length} readings of the section, {section.Value.Shape.Designation}");
        var facts = MaterialsOf(source.Element).Select(elastic.Of).FirstOrDefault(f => f != ElasticFacts.None) ?? ElasticFacts.None;
        var poisson = (Finding<double>.Found)source.Material.Poisson;
        if (facts.ShearModulus is null && poisson.Source == "default") notes.Add(string.Create(CultureInfo.InvariantCulture, $"{name}: G by the default Poisson's ratio {poisson.Value:0.0##}"));
        var density = facts.Density;
        if (density is null && source.Material.IsSteel)
        {
            density = MemberWeight.SteelDensity;
            notes.Add(string.Create(CultureInfo.InvariantCulture, $"{name}: density {MemberWeight.SteelDensity} kg/m³ (EN 1991-1-1, Table A.4, from memory); the model gives none"));
        }

        var shear = facts.ShearModulus ?? modulus.Value / (2 * (1 + poisson.Value));
        var material = new FrameMaterial(source.Material.Name, modulus.Value, shear, (density ?? 0) * MemberWeight.Gravity, facts.Expansion ?? 0, (source.Material.Yield as Finding<double>.Found)?.Value);
        return new Finding<MemberStiffness>.Found(
            new MemberStiffness(constants, material, z, reversed, density, facts.Expansion, section.Value.Shape.ExtentY, section.Value.Shape.ExtentZ, notes.ToImmutable()),
            $"{section.Source}; E by {modulus.Source}");
    }

    /// <summary>What gives section and material: the analytical member itself where it has a section, else the body that it runs along.</summary>
    private Source Find(Part21Record member, AnalyticalMember line)
    {
        var (section, material) = analytical.Read(member);
        if (section is Finding<SectionFinding>.Found) return new Source(section, material, line.Axes, member.Id, IsBody: false);

        var bodies = relations.PhysicalOf(member.Id).SelectMany(id => _candidates[id]).ToList();
        var body = bodies.Count == 1 ? bodies[0] : bodies.Find(b => RunsAlong(b, line));
        return body is null ? new Source(section, material, line.Axes, member.Id, IsBody: false) : new Source(body.Section, body.Material, body.Axes, body.Element.StepId, IsBody: true);
    }

    private static bool RunsAlong(Member body, AnalyticalMember line)
    {
        if (!line.Line.TryGet(out var ends, out _) || !body.Axes.TryGet(out var axes, out _) || !body.Length.TryGet(out var length, out _)) return false;
        if (!(ends.Value.End - ends.Value.Start).TryNormalize(out var x) || x.Cross(axes.Value.X).Length > Parallel) return false;

        var middle = 0.5 * (ends.Value.Start + ends.Value.End) - axes.Value.Origin;
        var along = middle.Dot(axes.Value.X);
        return along > 0 && along < length.Value && (middle - along * axes.Value.X).Length <= Math.Max(Parallel * length.Value, body.Section is Finding<SectionFinding>.Found s ? Math.Max(s.Value.Shape.ExtentY, s.Value.Shape.ExtentZ) : 0);
    }

    /// <summary>Direction of the section's z; false with the reason when the section has preferred axes and they are not known.</summary>
    private static bool Direction(Source source, AnalyticalMember line, Vector3? axis, CrossSection shape, out Vector3? z, out bool reversed, out Reason? why)
    {
        (z, reversed, why) = (null, false, null);
        if (!source.IsBody && line.Line is Finding<(Vector3 Start, Vector3 End)>.Missing && axis is { } given)
        {
            z = given;
            return true;
        }

        if (!source.Axes.TryGet(out var axes, out why)) return shape is Round or Tube;

        z = axes.Value.Z;
        if (!source.IsBody || !line.Line.TryGet(out var ends, out _) || !(ends.Value.End - ends.Value.Start).TryNormalize(out var x)) return true;
        if (x.Cross(axes.Value.X).Length > Parallel)
        {
            why = new Reason(ReasonCode.AxesUnknown, "it does not run along the body whose section it would take");
            return false;
        }

        reversed = x.Dot(axes.Value.X) < 0;
        return true;
    }

    private FrameSection? Constants(CrossSection shape, bool reversed)
    {
        if (!_properties.TryGetValue(shape, out var p)) _properties[shape] = p = SectionProperties.Of(shape);
        if (p.J is not { } torsion || !(torsion > 0)) return null;

        var side = reversed ? -1 : 1;
        var extent = Math.Max(shape.ExtentY, shape.ExtentZ);
        return new FrameSection
        {
            Name = shape.Designation,
            Shape = shape,
            Area = p.Area,
            Iy = p.Iy,
            Iz = p.Iz,
            Iyz = Math.Abs(p.Iyz) <= Nothing * (p.Iy + p.Iz) ? 0 : side * p.Iyz,
            J = torsion,
            ShearCentreY = Math.Abs(p.ShearCentreY) <= Nothing * extent ? 0 : side * p.ShearCentreY,
            ShearCentreZ = Math.Abs(p.ShearCentreZ) <= Nothing * extent ? 0 : p.ShearCentreZ,
        };
    }

    /// <summary>Materials behind the associations of an element or its type, through sets and usages.</summary>
    private IEnumerable<ulong> MaterialsOf(ulong element)
    {
        var open = new Stack<(ulong Id, int Depth)>(relations.MaterialsOf(element).Concat(relations.MaterialsOf(relations.TypeOf(element))).Reverse().Select(id => (id, 0)));
        while (open.TryPop(out var next))
        {
            if (next.Depth > 6 || !instances.File.TryFind(next.Id, out var record)) continue;
            if (record.Keyword == "IFCMATERIAL")
            {
                yield return record.Id;
                continue;
            }

            for (var i = 0; i < 4; i++)
            {
                if (record[i].TryReference(out var one)) open.Push((one, next.Depth + 1));
                foreach (var id in record[i].Kind == Part21ValueKind.List ? Instances.IdsOf(record[i]) : []) open.Push((id, next.Depth + 1));
            }
        }
    }

    private static Finding<MemberStiffness> Missing(ReasonCode code, string message) => new Finding<MemberStiffness>.Missing(new Reason(code, message));
}
