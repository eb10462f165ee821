using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc.Analysis;
using MemberScan.Ifc.Analysis.Loads;
using MemberScan.Ifc.Bodies;
using MemberScan.Ifc.Curves;
using MemberScan.Ifc.ForceSets;
using MemberScan.Ifc.Frames;
using MemberScan.Ifc.Frames.Loading;
using MemberScan.Ifc.Frames.Stiffness;
using MemberScan.Ifc.Frames.Topology;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Materials;
using MemberScan.Ifc.Members;
using MemberScan.Ifc.Meshes;
using MemberScan.Ifc.Schema;
using MemberScan.Ifc.Sections;
using MemberScan.Ifc.Units;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Rules;
using MemberScan.Part21;

namespace MemberScan.Ifc;

/// <summary>A building model: what its records mean. Reads candidates and their section forces on demand.</summary>
public sealed class IfcModel
{
    private readonly Instances _instances;
    private readonly Relations _relations;
    private readonly PlacementReader _placements;
    private readonly UnitReader _unitReader;
    private readonly AnalyticalMemberReader _analytical;
    private readonly Lazy<ForceSetReader> _forceSets;
    private readonly ReadingRules _rules;
    private readonly DiagnosticList _diagnostics;

    private IfcModel(Part21File file, SchemaVersion schema, ReadingRules rules, DiagnosticList diagnostics)
    {
        (File, Schema, _rules, _diagnostics) = (file, schema, rules, diagnostics);
        _instances = new Instances(file);
        _unitReader = new UnitReader(_instances, diagnostics);
        Units = ModelUnits.Read(_instances, _unitReader, rules, diagnostics);
        _relations = new Relations(_instances);
        _placements = new PlacementReader(_instances, Units);
        _forceSets = new Lazy<ForceSetReader>(() => new ForceSetReader(_instances, Units, _unitReader, rules.Forces));
        _analytical = new AnalyticalMemberReader(_instances, _relations, _placements, Units, schema, diagnostics);
    }

    /// <summary>The text that the model is read from.</summary>
    public Part21File File { get; }

    /// <summary>The schema it is read by.</summary>
    public SchemaVersion Schema { get; }

    /// <summary>Identifier of the schema it is read by.</summary>
    public string SchemaText => SchemaName.Text(Schema);

    /// <summary>Its units.</summary>
    public ModelUnits Units { get; }

    /// <summary>Name of its project; empty if none.</summary>
    public string ProjectName => File.RecordsOf("IFCPROJECT").Select(p => Instances.Text(p[2])).FirstOrDefault() ?? "";

    /// <summary>Keywords in upper case whose instances a model is asked for, for a text that stays on disk.</summary>
    /// <param name="rules">How the model will be read.</param>
    public static IReadOnlyCollection<string> KeywordsAsked(ReadingRules rules)
    {
        ArgumentNullException.ThrowIfNull(rules);
        return AskedKeywords.For(rules);
    }

    /// <summary>Opens a model; null, with an error in <paramref name="diagnostics"/>, when its schema is not read.</summary>
    public static IfcModel? Open(Part21File file, ReadingRules rules, DiagnosticList diagnostics)
    {
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(rules);
        ArgumentNullException.ThrowIfNull(diagnostics);
        return SchemaName.Resolve(file.Header.Schemas, diagnostics) is { } schema ? new IfcModel(file, schema, rules, diagnostics) : null;
    }

    /// <summary>Reads all candidates.</summary>
    /// <param name="isNamed">Whether a table names the element; that makes elements of some classes candidates.</param>
    public MemberCatalog ReadMembers(Func<ElementIdentity, bool> isNamed)
    {
        var curves = new CurveReader(_instances, _placements, Units);
        var profiles = new ProfileReader(_instances, _placements, curves, Units);
        var directrices = new DirectrixReader(_instances, curves, Units);
        var sweeps = new SweptBodyReader(_instances, _placements, profiles, directrices, Units);
        var meshes = new MeshBodyReader(new MeshReader(_instances, _placements, Units), _rules.RecogniseMeshes);
        var bodies = new BodyReader(_instances, _placements, sweeps, new DiskBodyReader(directrices, Units), new PrimitiveReader(_placements, Units), meshes);
        var facts = new MaterialFactsReader(_instances, Units, _unitReader);
        var materials = new MaterialReader(_instances, _relations, facts, profiles, _rules);
        return new MemberReader(_instances, _relations, _placements, bodies, profiles, materials, _analytical, Schema, _rules.Candidates, _rules.RecogniseMeshes, new RoleGuess(_rules.Roles), _diagnostics).Read(isNamed);
    }

    /// <summary>Reads the section forces of candidates from the model's result groups.</summary>
    public ImmutableArray<MemberForces> ReadForces(ImmutableArray<Member> members)
    {
        var places = new ActivityPlaces(_instances, _placements, Units);
        var reactions = new ReactionReader(_instances, places, Units, _rules.Forces, _diagnostics);
        var situations = new SituationReader(_instances, _rules.Forces);
        var tree = new LoadTree(_instances, _rules.Forces);
        var loads = new SituationLoads(_instances, tree, new MemberLoadReader(_instances, _relations, places, tree, Units, Schema));
        var combinations = new CombinedForces(_instances, tree, situations, _diagnostics);
        return new ModelForcesReader(_instances, _relations, new BodyLines(_instances, _relations, _analytical, _diagnostics), reactions, situations, loads, combinations, _diagnostics).Read(members);
    }

    /// <summary>Whether an element has a property set that the settings map to section forces.</summary>
    public bool HasForcesInSets(ElementIdentity element)
    {
        ArgumentNullException.ThrowIfNull(element);
        return _forceSets.Value.HasForces(element.StepId);
    }

    /// <summary>Reads the section forces of candidates from their property sets, through the mappings of the settings.</summary>
    public ImmutableArray<MemberForces> ReadForcesInSets(ImmutableArray<Member> members) => _forceSets.Value.Read(members);

    /// <summary>Reads the structural analysis models as frames.</summary>
    /// <param name="members">The candidates, which give sections and materials to the analytical members that stand for them.</param>
    public ImmutableArray<AnalysisFrame> ReadFrames(ImmutableArray<Member> members)
    {
        var curves = new CurveReader(_instances, _placements, Units);
        var profiles = new ProfileReader(_instances, _placements, curves, Units);
        var materials = new MaterialReader(_instances, _relations, new MaterialFactsReader(_instances, Units, _unitReader), profiles, _rules);
        var source = new AnalyticalSource(_instances, _relations, profiles, materials);
        var stiffness = new StiffnessReader(_instances, _relations, source, new StatedConstantsReader(_instances, _relations, Units, _unitReader), new ElasticFactsReader(_instances, Units, _unitReader), members);
        var boundaries = new BoundaryReader(Units, Schema);
        var tree = new LoadTree(_instances, _rules.Forces);
        var memberLoads = new MemberLoadReader(_instances, _relations, new ActivityPlaces(_instances, _placements, Units), tree, Units, Schema);
        var loads = new FrameLoadReader(
            _instances, _relations, _analytical, tree, memberLoads, new NodeLoadReader(_instances, _relations, Units), new SituationReader(_instances, _rules.Forces));
        return new FrameReader(
            _instances, _relations, _placements, _analytical, curves, new JointReader(_instances, _placements, Units),
            new ConnectionReader(_instances, _placements, boundaries, Schema), new ReleaseReader(_instances, _placements, boundaries), loads, stiffness).Read();
    }

    /// <summary>Lays section forces of analytical members on the candidates that they stand for.</summary>
    /// <param name="members">The candidates.</param>
    /// <param name="forces">Forces along analytical members.</param>
    public ImmutableArray<MemberForces> LayForces(ImmutableArray<Member> members, IEnumerable<LineForces> forces) =>
        LaidForces.Of(members, forces, new BodyLines(_instances, _relations, _analytical, _diagnostics));
}
