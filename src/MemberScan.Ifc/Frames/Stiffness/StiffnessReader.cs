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
internal sealed class StiffnessReader(Instances instances, Relations relations, AnalyticalSource analytical, StatedConstantsReader stated, ElasticFactsReader elastic,
    ImmutableArray<Member> candidates)
{
    /// <summary>Largest sine of the angle between an analytical member and the body whose section it takes.</summary>
    private const double Parallel = 0.02;

    /// <summary>Share of the second moments below which a product of inertia or an offset of the shear centre is nothing.</summary>
    private const double Nothing = 1e-9;

    private readonly ILookup<ulong, Member> _candidates = candidates.ToLookup(m => m.Element.StepId);
    private readonly Dictionary<CrossSection, SectionProperties> _properties = [];

    private sealed record Source(Finding<SectionFinding> Section, Material Material, Finding<MemberAxes> Axes, ulong Element, bool IsBody)
    {
        /// <summary>How the section changes, and the shares of that at the start and at the end of the analytical member; null for one section.</summary>
        public (Taper Taper, double From, double To)? Taper { get; init; }

        /// <summary>Why a change of the section cannot be followed; null when it can.</summary>
        public Reason? NoTaper { get; init; }

        /// <summary>How far the centroid lies from the line [m].</summary>
        public (double Y, double Z) Beside { get; init; }
    }

    /// <summary>Reads a member; the reason names it.</summary>
    /// <param name="member">The record of the analytical member.</param>
    /// <param name="line">The analytical member.</param>
    /// <param name="axis">Its Axis attribute in project axes, for a curved member, whose axes are known nowhere else; null if none.</param>
    /// <param name="name">Its name, for messages.</param>
    public Finding<MemberStiffness> Read(Part21Record member, AnalyticalMember line, Vector3? axis, string name)
    {
        var source = Find(member, line);
        var constants = stated.Of(member.Id);
        if (!source.Section.TryGet(out var section, out var noSection)) return OfConstants(source, noSection, constants, line, axis, name);
        if (source.NoTaper is { } noTaper) return Missing(noTaper.Code, $"{name}: {noTaper.Message}");
        if (!source.Material.Modulus.TryGet(out var modulus, out var noModulus)) return Missing(ReasonCode.NoForces, $"{name} has no modulus of elasticity: {noModulus.Message}");

        var shape = source.Taper is { } taper ? taper.Taper.At(taper.From) : section.Value.Shape;
        if (!Direction(source, line, axis, shape, out var z, out var reversed, out var noAxes)) return Missing(noAxes!.Code, $"{name}: {noAxes.Message}");
        if (Constants(shape, reversed) is not { } own) return Missing(ReasonCode.SectionNotCovered, $"{name}: the section {shape.Designation} has no torsion constant");

        var notes = ImmutableArray.CreateBuilder<string>();
        if (section.Value.Shapes.Length > 1) notes.Add($"{name}: stiffness of the first of {section.Value.Shapes.Length} readings of the section, {shape.Designation}");
        if (source.Beside != default)
            notes.Add(string.Create(CultureInfo.InvariantCulture, $"the centroid of {name} lies at y {source.Beside.Y * 1e3:0.##} mm, z {source.Beside.Z * 1e3:0.##} mm from its line, by the profile; joints and loads are on the line"));
        var course = source.Taper is { } change ? new SectionCourse(change.Taper, change.From, change.To, place => Constants(place, reversed)) : null;
        var shears = course is null && constants is { ShearAreaY: not null, ShearAreaZ: not null };
        if (course is not null) notes.Add($"{name} tapers and is taken in {SectionCourse.Steps} steps of linear stiffness");
        if (shears) own = Shearing(own, constants!, name, notes);
        var (material, facts) = MaterialOf(source, modulus.Value, name, notes);
        return new Finding<MemberStiffness>.Found(
            new MemberStiffness(own, material, z, reversed, facts.Density, facts.Expansion, shape.ExtentY, shape.ExtentZ, notes.ToImmutable()) { Course = course, ShearFlexible = shears, Beside = source.Beside },
            $"{section.Source}; E by {modulus.Source}");
    }

    /// <summary>A member whose section is known by stated constants alone: it has a stiffness, and no stresses.</summary>
    private Finding<MemberStiffness> OfConstants(Source source, Reason noSection, StatedConstants? constants, AnalyticalMember line, Vector3? axis, string name)
    {
        var why = constants is null ? "" : constants.WhyNoSection;
        if (why is not null) return Missing(noSection.Code, $"{name} has no section that can be used: {noSection.Message}{(why.Length > 0 ? $"; {why}" : "")}");
        if (!source.Material.Modulus.TryGet(out var modulus, out var noModulus)) return Missing(ReasonCode.NoForces, $"{name} has no modulus of elasticity: {noModulus.Message}");

        var z = axis;
        if (line.Line is Finding<(Vector3 Start, Vector3 End)>.Found)
        {
            if (!line.Axes.TryGet(out var axes, out var noAxes)) return Missing(noAxes.Code, $"{name}: {noAxes.Message}");

            z = axes.Value.Z;
        }

        if (z is null) return Missing(ReasonCode.AxesUnknown, $"{name} has no Axis, so its y and z are not known");

        var notes = ImmutableArray.CreateBuilder<string>();
        notes.Add($"{name}: stiffness by {constants!.Source}, since its section is not read ({noSection.Message}); the centroid is taken on its line");
        var own = new FrameSection { Name = constants.Source, Area = constants.Area!.Value, Iy = constants.Iy!.Value, Iz = constants.Iz!.Value, J = constants.J!.Value };
        var shears = constants is { ShearAreaY: not null, ShearAreaZ: not null };
        if (shears) own = Shearing(own, constants, name, notes);
        var (material, facts) = MaterialOf(source, modulus.Value, name, notes);
        return new Finding<MemberStiffness>.Found(
            new MemberStiffness(own, material, z, ReversedY: false, facts.Density, facts.Expansion, 0, 0, notes.ToImmutable()) { ShearFlexible = shears },
            $"{constants.Source}; E by {modulus.Source}");
    }

    private static FrameSection Shearing(FrameSection section, StatedConstants constants, string name, ImmutableArray<string>.Builder notes)
    {
        var (y, z) = (constants.ShearAreaY!.Value, constants.ShearAreaZ!.Value);
        notes.Add(string.Create(CultureInfo.InvariantCulture, $"{name} is flexible in shear: {constants.Source} state shear areas, {y * 1e6:0.#} mm² for Vy and {z * 1e6:0.#} mm² for Vz"));
        return section with { ShearAreaY = y, ShearAreaZ = z };
    }

    /// <summary>The material with G, weight and expansion; what is taken for want of a value is noted.</summary>
    private (FrameMaterial Material, ElasticFacts Facts) MaterialOf(Source source, double modulus, string name, ImmutableArray<string>.Builder notes)
    {
        var facts = MaterialsOf(source.Element).Select(elastic.Of).FirstOrDefault(f => f != ElasticFacts.None) ?? ElasticFacts.None;
        var poisson = (Finding<double>.Found)source.Material.Poisson;
        if (facts.ShearModulus is null && poisson.Source == "default") notes.Add(string.Create(CultureInfo.InvariantCulture, $"{name}: G by the default Poisson's ratio {poisson.Value:0.0##}"));
        if (facts.Density is null && source.Material.IsSteel)
        {
            facts = facts with { Density = MemberWeight.SteelDensity };
            notes.Add(string.Create(CultureInfo.InvariantCulture, $"{name}: density {MemberWeight.SteelDensity} kg/m³ (EN 1991-1-1, Table A.4, from memory); the model gives none"));
        }

        var shear = facts.ShearModulus ?? modulus / (2 * (1 + poisson.Value));
        var material = new FrameMaterial(
            source.Material.Name, modulus, shear, (facts.Density ?? 0) * MemberWeight.Gravity, facts.Expansion ?? 0, (source.Material.Yield as Finding<double>.Found)?.Value);
        return (material, facts);
    }

    /// <summary>What gives section and material: the analytical member itself where it has a section, else the body that it runs along.</summary>
    private Source Find(Part21Record member, AnalyticalMember line)
    {
        var own = analytical.Read(member);
        var plain = new Source(own.Section, own.Material, line.Axes, member.Id, IsBody: false) { Beside = own.Beside, Taper = own.Taper is { } taper ? (taper, 0, 1) : null };
        if (own.Section is Finding<SectionFinding>.Found) return plain;

        var bodies = relations.PhysicalOf(member.Id).SelectMany(id => _candidates[id]).ToList();
        var body = bodies.Count == 1 ? bodies[0] : bodies.Find(b => RunsAlong(b, line));
        return body is null ? plain : WithTaper(new Source(body.Section, body.Material, body.Axes, body.Element.StepId, IsBody: true), body, line);
    }

    /// <summary>The sections of a tapering body, from where the analytical member begins along it to where it ends.</summary>
    private static Source WithTaper(Source source, Member body, AnalyticalMember line)
    {
        if (body.EndSection is not { } last || body.Section is not Finding<SectionFinding>.Found first) return source;

        var isPlaced = body.Axes is Finding<MemberAxes>.Found && body.Length is Finding<double>.Found && line.Line is Finding<(Vector3 Start, Vector3 End)>.Found;
        if (!isPlaced || Taper.Of(first.Value.Shape, last.Shape) is not { } taper)
            return source with { NoTaper = new Reason(ReasonCode.SectionNotCovered, "the body that it stands for tapers in a way that is not followed") };

        var (axes, length) = (((Finding<MemberAxes>.Found)body.Axes).Value, ((Finding<double>.Found)body.Length).Value);
        var (start, end) = ((Finding<(Vector3 Start, Vector3 End)>.Found)line.Line).Value;
        double Share(Vector3 point) => Math.Clamp((point - axes.Origin).Dot(axes.X) / length, 0, 1);
        return source with { Taper = (taper, Share(start), Share(end)) };
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
