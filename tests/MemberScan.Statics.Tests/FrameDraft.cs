using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Forces;
using MemberScan.Model.Frames;
using MemberScan.Model.Frames.Loads;

namespace MemberScan.Statics.Tests;

/// <summary>A frame under construction, nodes and members by name.</summary>
internal sealed class FrameDraft
{
    /// <summary>E 210 GPa, G 80 GPa.</summary>
    public static readonly FrameMaterial Steel = new("S", 210e9, 80e9, 78500, 1.2e-5);

    /// <summary>A 40 × 80 mm bar by plain constants; shear areas 5/6 of the area.</summary>
    public static readonly FrameSection Bar = new()
    {
        Name = "bar",
        Area = 3.2e-3,
        Iy = 0.04 * 0.08 * 0.08 * 0.08 / 12,
        Iz = 0.08 * 0.04 * 0.04 * 0.04 / 12,
        J = 1.1e-6,
        ShearAreaY = 3.2e-3 / 1.2,
        ShearAreaZ = 3.2e-3 / 1.2,
    };

    private readonly List<FrameNode> _nodes = [];
    private readonly List<FrameMember> _members = [];
    private readonly List<FrameSupport> _supports = [];
    private readonly List<FrameSituation> _situations = [];

    public int Node(string name, double x, double y, double z)
    {
        _nodes.Add(new FrameNode(name, new Vector3(x, y, z)));
        return _nodes.Count - 1;
    }

    public int Node(string name) => _nodes.FindIndex(n => n.Name == name);

    public int Member(string name, string start, string end, FrameSection? section = null, Func<FrameMember, FrameMember>? change = null, FrameMaterial? material = null)
    {
        var member = new FrameMember { Name = name, Start = Node(start), End = Node(end), Section = section ?? Bar, Material = material ?? Steel };
        _members.Add(change is null ? member : change(member));
        return _members.Count - 1;
    }

    public int Member(string name) => _members.FindIndex(m => m.Name == name);

    public FrameDraft Support(string node, Restraints restraints, Vector3? x = null, Vector3? y = null)
    {
        _supports.Add(new FrameSupport(Node(node), restraints) { X = x ?? Vector3.UnitX, Y = y ?? Vector3.UnitY });
        return this;
    }

    public FrameDraft Situation(string name, Func<FrameSituation, FrameSituation> loads)
    {
        _situations.Add(loads(new FrameSituation { Name = name, Kind = SituationKind.Service }));
        return this;
    }

    public NodeLoad Load(string node, Vector3 force, Vector3 moment = default) => new(Node(node), force, moment);

    public Frame Frame => new() { Nodes = [.. _nodes], Members = [.. _members], Supports = [.. _supports], Situations = [.. _situations] };

    /// <summary>Solves; fails the test with the diagnostics when the frame is refused.</summary>
    public FrameResult Solve()
    {
        var diagnostics = new DiagnosticList();
        var result = FrameSolver.Solve(Frame, diagnostics);
        Assert.True(result is not null, string.Join("; ", diagnostics.Items.Select(d => d.Message)));
        return result;
    }

    /// <summary>Solves a frame that must be refused; the one error.</summary>
    public Diagnostic Refused()
    {
        var diagnostics = new DiagnosticList();
        Assert.Null(FrameSolver.Solve(Frame, diagnostics));
        return diagnostics.Items.First(d => d.Severity == Severity.Error);
    }

    /// <summary>A straight beam along X of members of equal length, node names N0, N1, …; member names m1, m2, ….</summary>
    public static FrameDraft Beam(double length, int parts, FrameSection? section = null, Func<FrameMember, FrameMember>? change = null)
    {
        var draft = new FrameDraft();
        for (var i = 0; i <= parts; i++) draft.Node($"N{i}", length * i / parts, 0, 0);
        for (var i = 1; i <= parts; i++) draft.Member($"m{i}", $"N{i - 1}", $"N{i}", section, change);
        return draft;
    }
}
