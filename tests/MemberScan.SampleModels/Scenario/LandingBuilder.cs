using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Sections;
using MemberScan.SampleModels.Writing;

namespace MemberScan.SampleModels.Scenario;

/// <summary>Writes members of a sample into a model, with their analytical side, and keeps what was meant.</summary>
internal sealed class LandingBuilder(ModelWriter writer, string name, Transform3 sharedFrame, bool resultsInGlobalAxes)
{
    private readonly Dictionary<string, int> _materials = [];
    private readonly Dictionary<CrossSection, int> _maps = [];
    private readonly Dictionary<CrossSection, List<int>> _mapped = [];
    private readonly Dictionary<string, int> _resultGroups = [];
    private readonly List<SampleMember> _members = [];
    private AnalysisWriter? _analysis;

    /// <summary>The model.</summary>
    public ModelWriter Writer => writer;

    /// <summary>Members written so far.</summary>
    public IReadOnlyList<SampleMember> Members => _members;

    /// <summary>Starts the analysis model with result groups of two combinations of a permanent and an imposed case.</summary>
    public void StartAnalysis(string serviceName, string designName, string imposedName = "Q", string imposedSource = "LIVE_LOAD_Q")
    {
        _analysis = writer.StartAnalysis(AnalysisName, sharedFrame);
        var permanent = _analysis.LoadCase("G", "PERMANENT_G", "DEAD_LOAD_G");
        var imposed = _analysis.LoadCase(imposedName, "VARIABLE_Q", imposedSource);
        _resultGroups[serviceName] = _analysis.ResultGroup("R " + serviceName, _analysis.LoadCombination(serviceName, "SLS", (permanent, 1), (imposed, 1)));
        _resultGroups[designName] = _analysis.ResultGroup("R " + designName, _analysis.LoadCombination(designName, "ULS", (permanent, 1.35), (imposed, 1.5)));
    }

    /// <summary>Writes a member and gives the number of its element.</summary>
    public int Add(SampleMember member)
    {
        var keyed = member with { Key = writer.GlobalIdOf(member.Keyword, member.Tag ?? member.Name) };
        _members.Add(keyed);
        if (member.Body == SampleBody.AnalyticalOnly) return AddAnalyticalOnly(keyed);

        var element = writer.Element(member.Keyword, member.Name, Placement(member), Shape(member), new ElementOptions
        {
            Key = member.Tag ?? member.Name,
            Tag = member.Tag,
            PredefinedType = member.PredefinedType,
            NameSpelling = member.NameSpelling,
        });
        if (member.Body == SampleBody.Mapped) _mapped[member.Section].Add(element);
        writer.Associate(member.Body == SampleBody.ProfileSet ? ProfileSetUsage(member) : Material(member.Material), element);
        if (_analysis is not null && !member.Situations.IsEmpty) _analysis.Link(element, Analytical(keyed));
        return element;
    }

    /// <summary>Writes one railing whose body has a swept disk per item; the items' forces are for a table.</summary>
    public int AddRailing(string railingName, string tag, params SampleMember[] items)
    {
        var globalId = writer.GlobalIdOf("IFCRAILING", tag);
        _members.AddRange(items.Select((item, i) => item with { Key = $"{globalId}/{i + 1}", Name = railingName, Keyword = "IFCRAILING", Tag = tag, Body = SampleBody.RailingItem }));
        var solids = items.Select(item => Disk(item)).ToArray();
        var railing = writer.Element("IFCRAILING", railingName, writer.LocalPlacement(Transform3.Identity), writer.Bodies.Shape("AdvancedSweptSolid", solids),
            new ElementOptions { Key = tag, Tag = tag, PredefinedType = "GUARDRAIL" });
        writer.Associate(Material(items[0].Material), railing);
        return railing;
    }

    /// <summary>Types for the mapped members, then the whole.</summary>
    public SampleModel Build(ImmutableArray<byte> forcesTable, ImmutableArray<byte> description)
    {
        foreach (var (section, elements) in _mapped)
            writer.TypeObject("IFCMEMBERTYPE", section.Designation, "MEMBER", _maps[section], elements);
        return new SampleModel(name, [.. writer.Build()], forcesTable, description, [.. _members]);
    }

    private int? Placement(SampleMember member) => member.Body == SampleBody.SweptDisk
        ? writer.LocalPlacement(Transform3.Identity)
        : writer.LocalPlacement(new Transform3(member.Axes.Origin, member.Axes.Y, member.Axes.Z, member.Axes.X));

    private int Shape(SampleMember member)
    {
        switch (member.Body)
        {
            case SampleBody.SweptDisk:
                return writer.Bodies.Shape("AdvancedSweptSolid", Disk(member));
            case SampleBody.Brep:
                return writer.Bodies.Shape("Brep", writer.Bodies.FacetedBlock(member.Section.ExtentY, member.Section.ExtentZ, member.Length));
            case SampleBody.Mapped:
                if (!_maps.TryGetValue(member.Section, out var map))
                {
                    _mapped[member.Section] = [];
                    map = _maps[member.Section] = writer.Bodies.Map(writer.Bodies.Representation("SweptSolid", Extrusion(member)));
                }

                return writer.Bodies.Shape("MappedRepresentation", writer.Bodies.MappedItem(map));
            default:
                return writer.Bodies.Shape("SweptSolid", Extrusion(member));
        }
    }

    private int Extrusion(SampleMember member) => writer.Bodies.Extrusion(Profile(member), member.Length);

    private int Profile(SampleMember member) => writer.Profiles.Of(member.Section, member.Section.Designation);

    private int Disk(SampleMember member)
    {
        var (radius, inner) = member.Section switch
        {
            Round round => (round.Radius, (double?)null),
            Tube tube => (tube.OuterRadius, tube.InnerRadius),
            _ => throw new ArgumentException("A swept disk is round.", nameof(member)),
        };
        return writer.Bodies.SweptDisk([member.Axes.Origin, member.Axes.Origin + member.Length * member.Axes.X], radius, inner);
    }

    private int Material(SampleMaterial material)
    {
        if (_materials.TryGetValue(material.Name, out var id)) return id;

        var category = writer.Schema == SchemaVersion.Ifc2X3 ? null : "steel";
        return _materials[material.Name] = material.InProperties
            ? writer.Materials.Material(material.Name, material.Strength, null, material.Modulus, 0.3, category)
            : writer.Materials.Material(material.Name, category: category);
    }

    private int ProfileSetUsage(SampleMember member) =>
        writer.Materials.ProfileSetUsage(writer.Materials.ProfileSet(member.Section.Designation, Material(member.Material), Profile(member)));

    private int AddAnalyticalOnly(SampleMember member)
    {
        // The key of an analytical member is its analysis model's name and its own: the same that its GlobalId follows from.
        var analytical = Analytical(member);
        _members[^1] = member with { Key = writer.GlobalIdOf("IFCSTRUCTURALCURVEMEMBER", $"{AnalysisName}/{member.Name}") };
        writer.Associate(ProfileSetUsage(member), analytical);
        return analytical;
    }

    /// <summary>Name of the analysis model.</summary>
    public const string AnalysisName = "Landing analysis";

    private int Analytical(SampleMember member)
    {
        var analysis = _analysis ?? throw new InvalidOperationException("The analysis has not been started.");
        var axis = Shared(member.AnalysisIsTurned ? member.Axes.Y : member.Axes.Z);
        var start = Shared(member.Axes.Origin - sharedFrame.Origin);
        var id = analysis.CurveMember(member.Body == SampleBody.AnalyticalOnly ? member.Name : "A " + (member.Tag ?? member.Name), start, start + member.Length * Shared(member.Axes.X), axis);
        foreach (var situation in member.Situations)
        {
            var stations = situation.Stations.Select(s => s with
            {
                Forces = resultsInGlobalAxes ? InSharedAxes(member.Axes, s.Forces) : member.AnalysisIsTurned ? Effects.QuarterTurned(s.Forces) : s.Forces,
            }).ToArray();
            analysis.CurveReaction(id, _resultGroups[situation.Name], stations, resultsInGlobalAxes);
        }

        return id;
    }

    private Mechanics.Forces.SectionForces InSharedAxes(MemberAxes axes, in Mechanics.Forces.SectionForces f)
    {
        var force = Shared(f.N * axes.X + f.Vy * axes.Y + f.Vz * axes.Z);
        var moment = Shared(f.T * axes.X + f.My * axes.Y + f.Mz * axes.Z);
        return new(force.X, force.Y, force.Z, moment.X, moment.Y, moment.Z);
    }

    private Vector3 Shared(Vector3 world) => new(world.Dot(sharedFrame.X), world.Dot(sharedFrame.Y), world.Dot(sharedFrame.Z));
}
