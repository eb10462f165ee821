using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Analysis;
using MemberScan.Ifc.Frames.Stiffness;
using MemberScan.Ifc.Frames.Topology;
using MemberScan.Model.Frames;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames;

/// <summary>The nodes, supports and members of one analysis model as they are gathered; what bars the analysis is listed, not thrown.</summary>
internal sealed class FrameAssembly
{
    /// <summary>Most refusals that are told one by one.</summary>
    private const int MostRefusals = 50;

    /// <summary>Distance that rounding of coordinates makes [m].</summary>
    private const double Rounding = 1e-9;

    private readonly NodePool _nodes = new(AnalysisFrame.NodeTolerance);
    private readonly AttachmentReader _attachments;
    private readonly Dictionary<ulong, (PointConnection Connection, int Node)> _connections = [];
    private readonly Dictionary<int, (FrameSupport Support, PointConnection Of)> _supports = [];
    private readonly Dictionary<ulong, List<int>> _piecesOf = [];
    private readonly List<FrameMember> _members = [];
    private readonly List<FramePiece> _pieces = [];
    private readonly List<MemberStiffness> _stiffness = [];
    private readonly List<Vector3> _beside = [];
    private readonly List<Reason> _refusals = [];
    private readonly List<string> _notes = [];

    public FrameAssembly() => _attachments = new AttachmentReader(_nodes, AnalysisFrame.NodeTolerance);

    /// <summary>The nodes.</summary>
    public ImmutableArray<FrameNode> Nodes => [.. _nodes.Nodes];

    /// <summary>The supports, by rising node number.</summary>
    public ImmutableArray<FrameSupport> Supports => [.. _supports.OrderBy(s => s.Key).Select(s => s.Value.Support)];

    /// <summary>The members.</summary>
    public ImmutableArray<FrameMember> Members => [.. _members];

    /// <summary>What the members are.</summary>
    public IReadOnlyList<FramePiece> Pieces => _pieces;

    /// <summary>Section and material of each member.</summary>
    public IReadOnlyList<MemberStiffness> Stiffness => _stiffness;

    /// <summary>What bars the analysis.</summary>
    public IReadOnlyList<Reason> Refusals => _refusals;

    /// <summary>What a reader must know.</summary>
    public IReadOnlyList<string> Notes => _notes;

    /// <summary>The connections with their nodes, by STEP id.</summary>
    public IReadOnlyDictionary<ulong, (PointConnection Connection, int Node)> Connections => _connections;

    /// <summary>Numbers of the frame members of an analytical member, from its start to its end.</summary>
    public IReadOnlyList<int> PiecesOf(ulong line) => _piecesOf.GetValueOrDefault(line) ?? [];

    /// <summary>From the line of a frame member to the axis through its centroids [m], project axes; loads act on the line.</summary>
    public Vector3 BesideOf(int member) => _beside[member];

    /// <summary>Length of a frame member [m].</summary>
    public double LengthOf(int member)
    {
        var bar = _members[member];
        return (_nodes.Nodes[bar.End].Position + bar.EndOffset - _nodes.Nodes[bar.Start].Position - bar.StartOffset).Length;
    }

    /// <summary>The support of a node; null if none.</summary>
    public FrameSupport? SupportOf(int node) => _supports.TryGetValue(node, out var entry) ? entry.Support : null;

    /// <summary>Adds what bars the analysis.</summary>
    public void Refuse(Reason why)
    {
        if (_refusals.Count < MostRefusals && !_refusals.Contains(why)) _refusals.Add(why);
    }

    /// <summary>Adds a note, once.</summary>
    public void Note(string note)
    {
        if (!_notes.Contains(note, StringComparer.Ordinal)) _notes.Add(note);
    }

    /// <summary>Adds a point connection: a node, and its support if it is held.</summary>
    public void Add(PointConnection connection)
    {
        var before = _nodes.Nodes.Count;
        var node = _nodes.At(connection.Position, connection.Name);
        if (_nodes.Nodes.Count == before)
            Note(string.Create(CultureInfo.InvariantCulture, $"the connection {connection.Name} and {_nodes.Nodes[node].Name} lie within {AnalysisFrame.NodeTolerance * 1e3:0.###} mm and are one node"));
        _connections[connection.Id] = (connection, node);
        if (connection.Held is not { } held) return;

        var support = new FrameSupport(node, held) { X = connection.Axes.X, Y = connection.Axes.Y };
        if (!_supports.TryGetValue(node, out var earlier)) _supports[node] = (support, connection);
        else if (earlier.Support.Restraints != held || (earlier.Support.X - support.X).Length > 1e-9 || (earlier.Support.Y - support.Y).Length > 1e-9)
            Refuse(new Reason(ReasonCode.NoForces, $"the connections {earlier.Of.Name} and {connection.Name} are one node and are held differently"));
    }

    /// <summary>Adds a curve member as one or several frame members.</summary>
    /// <param name="record">Its record.</param>
    /// <param name="line">The analytical member.</param>
    /// <param name="course">Its course.</param>
    /// <param name="stiffness">Its section and material.</param>
    /// <param name="joints">Its joints.</param>
    /// <param name="releases">Reads the condition of a joint.</param>
    public void Add(Part21Record record, AnalyticalMember line, Course course, MemberStiffness stiffness, IReadOnlyList<Joint> joints, ReleaseReader releases)
    {
        var name = ConnectionReader.Named(record);
        if (_attachments.Read(name, course, joints, _connections, out var why) is not { } ties)
        {
            Refuse(why!);
            return;
        }

        var (sense, isTruss) = Sense(Instances.Literal(record[7]));
        if (isTruss && ties.Count > 2) Refuse(new Reason(ReasonCode.NoForces, $"{name} carries axial force alone ({Instances.Literal(record[7])}) and yet is bent, curved or joined between its ends"));

        var numbers = _piecesOf[record.Id] = [];
        for (var i = 1; i < ties.Count; i++)
        {
            var (start, end) = (ties[i - 1], ties[i]);
            var from = AttachmentReader.PointAt(course, start.At);
            if (AxesOf(from, AttachmentReader.PointAt(course, end.At) - from, stiffness.Z) is not { } axes)
            {
                Refuse(new Reason(ReasonCode.AxesUnknown, $"the Axis of {name} lies along it, so its y and z are not known"));
                return;
            }

            var startJoint = Release(start, i == 1, name, line, axes, releases);
            var endJoint = Release(end, i == ties.Count - 1, name, line, axes, releases);
            if (startJoint is null || endJoint is null) return;

            if (TaperOf(stiffness, start, end, course, name) is not { } taper) return;

            // A member that carries axial force alone is hinged on its line, since an arm beside the hinge would turn freely.
            var beside = isTruss ? Vector3.Zero : stiffness.Beside.Y * axes.Y + stiffness.Beside.Z * axes.Z;
            numbers.Add(_members.Count);
            _beside.Add(beside);
            _members.Add(new FrameMember
            {
                Name = ties.Count == 2 ? name : string.Create(CultureInfo.InvariantCulture, $"{name}, part {i}"),
                Start = start.Node,
                End = end.Node,
                Section = taper.IsEmpty ? stiffness.Section : taper[0].Section,
                Taper = taper,
                ShearFlexible = stiffness.ShearFlexible,
                Material = stiffness.Material,
                ZDirection = axes.Z,
                TrussOnly = isTruss,
                StartJoint = startJoint,
                EndJoint = endJoint,
                StartOffset = Offset(start.Node, from + beside),
                EndOffset = Offset(end.Node, AttachmentReader.PointAt(course, end.At) + beside),
            });
            _pieces.Add(new FramePiece(record.Id, name, start.At, course.Length, sense, axes, course.Points.Length == 2));
            _stiffness.Add(stiffness);
        }
    }

    /// <summary>Axes of a stretch; without a direction of z global +Z, for an upright one global +X.</summary>
    private static MemberAxes? AxesOf(Vector3 from, Vector3 along, Vector3? z) => z is { } given
        ? MemberAxes.From(from, along, given)
        : along.TryNormalize(out var x) && x.Cross(Vector3.UnitZ).Length < 1e-3 ? MemberAxes.From(from, along, Vector3.UnitX) : MemberAxes.From(from, along, Vector3.UnitZ);

    /// <summary>The sections along a stretch; none for a member of one section, null where one has no torsion constant.</summary>
    private ImmutableArray<TaperPoint>? TaperOf(MemberStiffness stiffness, Attachment start, Attachment end, Course course, string name)
    {
        if (stiffness.Course is not { } sections) return [];
        if (sections.Between(start.At / course.Length, end.At / course.Length) is { } taper) return taper;

        Refuse(new Reason(ReasonCode.SectionNotCovered, $"{name}: a section of its taper has no torsion constant"));
        return null;
    }

    /// <summary>From a node to a point; nothing where rounding alone parts them.</summary>
    private Vector3 Offset(int node, Vector3 point) => point - _nodes.Nodes[node].Position is var offset && offset.Length > Rounding ? offset : Vector3.Zero;

    private Restraints? Release(Attachment tie, bool isEnd, string name, AnalyticalMember line, MemberAxes axes, ReleaseReader releases)
    {
        if (tie.Relation is not { } relation) return Restraints.AllFixed;
        if (releases.Read(relation, name, line, axes, out var why) is not { } held)
        {
            Refuse(why!);
            return null;
        }

        if (isEnd || held == Restraints.AllFixed) return held;

        Refuse(new Reason(ReasonCode.NoForces, $"{name} has a release between its ends (#{relation.Id}), which is not covered"));
        return null;
    }

    private static (AxialSense Sense, bool IsTruss) Sense(string predefinedType) => predefinedType switch
    {
        "PIN_JOINED_MEMBER" => (AxialSense.Both, true),
        "CABLE" or "TENSION_MEMBER" => (AxialSense.TensionOnly, true),
        "COMPRESSION_MEMBER" => (AxialSense.CompressionOnly, true),
        _ => (AxialSense.Both, false),
    };
}
