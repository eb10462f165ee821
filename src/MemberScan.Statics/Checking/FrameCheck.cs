using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;
using MemberScan.Statics.Members;

namespace MemberScan.Statics.Checking;

/// <summary>Whether a frame can be solved at all: sizes, names, numbers, geometry, supports; loads are <see cref="LoadCheck"/>'s.</summary>
internal sealed class FrameCheck
{
    private readonly Frame _frame;
    private readonly DiagnosticList _diagnostics;
    private bool _isGood = true;

    private FrameCheck(Frame frame, DiagnosticList diagnostics) => (_frame, _diagnostics) = (frame, diagnostics);

    /// <summary>Checks a frame; null with errors that name what is wrong.</summary>
    /// <exception cref="ArgumentException">A number of a node, member or situation stands for none: the maker of the frame is at fault, not its data.</exception>
    public static CheckedFrame? Run(Frame frame, DiagnosticList diagnostics)
    {
        var check = new FrameCheck(frame, diagnostics);
        if (!check.Sizes()) return null;

        check.Names();
        check.Nodes();
        var supportOf = check.Supports(out var axes);
        var members = check.Members();
        check._isGood &= new LoadCheck(frame, diagnostics, members).Run();
        return check._isGood ? new CheckedFrame(frame, [.. members.Select(m => m!)], supportOf, axes) : null;
    }

    private bool Sizes()
    {
        Limit(_frame.Nodes.Length, FrameLimits.Nodes, "nodes");
        Limit(_frame.Members.Length, FrameLimits.Members, "members");
        Limit(_frame.Situations.Length, FrameLimits.Situations, "situations");
        if (_frame.Nodes.IsEmpty) Fail(StaticsCodes.Size, "the frame has no nodes; give at least one");
        if (_frame.Members.IsEmpty) Fail(StaticsCodes.Size, "the frame has no members; give at least one");
        if (_frame.Situations.IsEmpty) Fail(StaticsCodes.Size, "the frame has no situations; give at least one");
        if (_frame.Supports.IsEmpty) Fail(StaticsCodes.Support, "the frame has no supports, so nothing holds it; give supports");
        var loads = _frame.Situations.Sum(s => (long)s.NodeLoads.Length + s.PointLoads.Length + s.LineLoads.Length + s.Temperatures.Length + s.Terms.Length + s.Movements.Length);
        Limit(loads, FrameLimits.Loads, "loads");
        return _isGood;
    }

    private void Limit(long count, long most, string what)
    {
        if (count > most) Fail(StaticsCodes.Size, Text($"the frame has {count} {what}, the limit is {most}; take a part of it"));
    }

    private void Names()
    {
        foreach (var (what, names) in new[]
        {
            ("node", _frame.Nodes.Select(n => n.Name)), ("member", _frame.Members.Select(m => m.Name)), ("situation", _frame.Situations.Select(s => s.Name)),
        })
        {
            var seen = new HashSet<string>(StringComparer.Ordinal);
            foreach (var name in names)
                if (!seen.Add(name)) Fail(StaticsCodes.NameDoubled, $"the {what} {name} stands twice; give each a name of its own");
        }
    }

    private void Nodes()
    {
        foreach (var node in _frame.Nodes)
            if (!Holds(node.Position)) Fail(StaticsCodes.Value, $"a coordinate of node {node.Name} is not a number of a structure; give finite coordinates");
    }

    private int[] Supports(out MemberAxes?[] axes)
    {
        var supportOf = new int[_frame.Nodes.Length];
        axes = new MemberAxes?[_frame.Nodes.Length];
        Array.Fill(supportOf, -1);
        for (var s = 0; s < _frame.Supports.Length; s++)
        {
            var support = _frame.Supports[s];
            var name = _frame.Nodes[Number(support.Node, _frame.Nodes.Length, "node")].Name;
            if (supportOf[support.Node] >= 0) Fail(StaticsCodes.Support, $"node {name} has two supports; join them into one");
            supportOf[support.Node] = s;
            axes[support.Node] = Axes(support, name);
            foreach (var direction in Enum.GetValues<Direction>()) Held(support.Restraints[direction], $"the support of node {name}", direction);
        }

        return supportOf;
    }

    private MemberAxes? Axes(FrameSupport support, string name)
    {
        if (support.X == Vector3.UnitX && support.Y == Vector3.UnitY) return null;

        if (!support.X.IsFinite || !support.Y.IsFinite || MemberAxes.From(Vector3.Zero, support.X, support.Y) is not { } turned)
        {
            Fail(StaticsCodes.Support, $"the axes of the support of node {name} do not span a plane; give an x and a y that are not parallel");
            return null;
        }

        return new MemberAxes(Vector3.Zero, turned.X, turned.Z, turned.X.Cross(turned.Z));       // From takes z: here it is y
    }

    private void Held(Restraint restraint, string where, Direction direction)
    {
        if (restraint.Kind == RestraintKind.Spring && !(restraint.Stiffness is > FrameLimits.SmallestConstant and < FrameLimits.LargestNumber))
            Fail(StaticsCodes.Value, Text($"the spring in {Word(direction)} of {where} is {restraint.Stiffness:R}; give a finite stiffness above zero"));
        if (!(Math.Abs(restraint.Displacement) < FrameLimits.LargestNumber))
            Fail(StaticsCodes.Value, Text($"the displacement in {Word(direction)} of {where} is not a finite number"));
        if (restraint.Displacement != 0 && restraint.Kind != RestraintKind.Fixed)
            Fail(StaticsCodes.Support, Text($"a displacement is forced upon {Word(direction)} of {where}, which is not fixed; fix it"));
    }

    private MemberStiffness?[] Members()
    {
        var made = new MemberStiffness?[_frame.Members.Length];
        var constants = new HashSet<object>(ReferenceEqualityComparer.Instance);
        for (var m = 0; m < made.Length; m++)
        {
            var member = _frame.Members[m];
            var wasGood = _isGood;
            if (constants.Add(member.Material)) Material(member.Material);
            foreach (var section in (FrameSection[])[member.Section, .. member.Taper.Select(t => t.Section)])
            {
                if (constants.Add(section)) Section(section);
                if (member.ShearFlexible) ShearAreas(section, member);
            }

            Joints(member);
            Taper(member);
            var body = Body(member);
            Stations(member, body);
            if (body is null || !_isGood || !wasGood) continue;

            made[m] = MemberStiffness.TryOf(body);
            if (made[m] is null) Fail(StaticsCodes.Value, $"the stiffnesses of member {member.Name} are too far apart to be solved; check the units of its section and material");
        }

        return made;
    }

    private MemberBody? Body(FrameMember member)
    {
        var start = _frame.Nodes[Number(member.Start, _frame.Nodes.Length, "node")].Position + member.StartOffset;
        var end = _frame.Nodes[Number(member.End, _frame.Nodes.Length, "node")].Position + member.EndOffset;
        if (!Holds(member.StartOffset) || !Holds(member.EndOffset))
        {
            Fail(StaticsCodes.Value, $"an offset of member {member.Name} is not a finite number; give finite offsets");
            return null;
        }

        var along = end - start;
        if (!(along.Length >= FrameLimits.ShortestLength))
        {
            Fail(StaticsCodes.NoLength, $"member {member.Name} has no length; its ends must lie apart");
            return null;
        }

        if (MemberDirections.Of(start, along, member.ZDirection) is { } axes) return new MemberBody(member, axes, along.Length);

        Fail(StaticsCodes.ZDirection, $"the z direction of member {member.Name} is zero or runs along the member; give one across it");
        return null;
    }

    private void Material(FrameMaterial m)
    {
        Constant(m.E, $"E of material {m.Name}");
        Constant(m.G, $"G of material {m.Name}");
        if (!(m.UnitWeight is >= 0 and < FrameLimits.LargestNumber)) Fail(StaticsCodes.Value, Text($"the unit weight of material {m.Name} is {m.UnitWeight:R}; give a finite number, zero or above"));
        if (!(Math.Abs(m.Expansion) < FrameLimits.LargestNumber)) Fail(StaticsCodes.Value, $"the expansion of material {m.Name} is not a finite number");
        if (m.Yield is { } yield) Constant(yield, $"the yield strength of material {m.Name}");
    }

    private void Section(FrameSection s)
    {
        Constant(s.Area, $"A of section {s.Name}");
        Constant(s.Iy, $"Iy of section {s.Name}");
        Constant(s.Iz, $"Iz of section {s.Name}");
        Constant(s.J, $"J of section {s.Name}");
        if (!(s.Iyz * s.Iyz < s.Iy * s.Iz)) Fail(StaticsCodes.Value, Text($"Iyz of section {s.Name} is {s.Iyz:R}; its square must be below Iy·Iz"));
        if (!(Math.Abs(s.ShearCentreY) + Math.Abs(s.ShearCentreZ) < FrameLimits.LargestNumber)) Fail(StaticsCodes.Value, $"the shear centre of section {s.Name} is not a finite place");
    }

    private void ShearAreas(FrameSection s, FrameMember member)
    {
        foreach (var (name, area) in new[] { ("Asy", s.ShearAreaY), ("Asz", s.ShearAreaZ) })
            if (!(area is > FrameLimits.SmallestConstant and < FrameLimits.LargestNumber))
                Fail(StaticsCodes.Value, Text($"{name} of section {s.Name} is {area:R}, but member {member.Name} is flexible in shear; give a finite shear area above zero"));
    }

    private void Constant(double value, string what)
    {
        if (!(value is > FrameLimits.SmallestConstant and < FrameLimits.LargestNumber)) Fail(StaticsCodes.Value, Text($"{what} is {value:R}; give a finite number above zero"));
    }

    private void Joints(FrameMember member)
    {
        foreach (var direction in Enum.GetValues<Direction>())
        {
            Held(member.StartJoint[direction], $"the start of member {member.Name}", direction);
            Held(member.EndJoint[direction], $"the end of member {member.Name}", direction);
            if (member.StartJoint[direction].Displacement != 0 || member.EndJoint[direction].Displacement != 0)
                Fail(StaticsCodes.Value, $"a displacement is forced upon a joint of member {member.Name}; only supports can be moved");
        }
    }

    private void Taper(FrameMember member)
    {
        var points = member.Taper;
        if (points.IsEmpty) return;

        var rises = points.Length >= 2 && points[0].Share == 0 && points[^1].Share == 1;
        for (var k = 1; k < points.Length; k++) rises &= points[k].Share > points[k - 1].Share;
        if (!rises) Fail(StaticsCodes.Value, $"the sections along member {member.Name} do not rise from share 0 to share 1; put them in order");
    }

    private void Stations(FrameMember member, MemberBody? body)
    {
        var stations = member.Stations ?? _frame.Stations;
        var count = Math.Max(stations.Count, stations.Positions.Length);
        if (count > FrameLimits.Stations) Fail(StaticsCodes.Size, Text($"member {member.Name} has {count} stations, the limit is {FrameLimits.Stations}"));
        foreach (var x in stations.Positions)
            if (body is not null && !(x >= 0 && x <= (1 + FrameLimits.Beyond) * body.Length))
                Fail(StaticsCodes.Station, Text($"a station at {x:R} m lies beyond member {member.Name}, whose flexible length is {body.Length:R} m; give the member stations of its own"));
    }

    private void Fail(string code, string message)
    {
        _isGood = false;
        _diagnostics.Add(code, Severity.Error, message);
    }

    internal static string Word(Direction direction) => direction switch
    {
        Direction.Ux => "ux",
        Direction.Uy => "uy",
        Direction.Uz => "uz",
        Direction.Rx => "rx",
        Direction.Ry => "ry",
        _ => "rz",
    };

    internal static int Number(int number, int count, string what) =>
        number >= 0 && number < count ? number : throw new ArgumentException(Text($"number {number} stands for no {what}; there are {count}"));

    internal static bool Holds(Vector3 v) => Math.Abs(v.X) + Math.Abs(v.Y) + Math.Abs(v.Z) < FrameLimits.LargestNumber;

    private static string Text(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
