using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;
using MemberScan.Model.Frames.Loads;
using MemberScan.Statics.Members;

namespace MemberScan.Statics.Checking;

/// <summary>Whether the loads of a frame hold: finite, on their members, movements on fixed directions, combinations one level deep.</summary>
internal sealed class LoadCheck(Frame frame, DiagnosticList diagnostics, MemberStiffness?[] members)
{
    private readonly Dictionary<int, FrameSupport> _supports = frame.Supports.GroupBy(s => s.Node).ToDictionary(g => g.Key, g => g.First());
    private bool _isGood = true;

    /// <summary>Checks all situations; false with errors.</summary>
    public bool Run()
    {
        foreach (var situation in frame.Situations) Check(situation);
        return _isGood;
    }

    private void Check(FrameSituation s)
    {
        if (!FrameCheck.Holds(s.SelfWeight)) Fail(StaticsCodes.Value, $"the self-weight of situation {s.Name} is not a finite vector");
        foreach (var load in s.NodeLoads)
        {
            var name = frame.Nodes[FrameCheck.Number(load.Node, frame.Nodes.Length, "node")].Name;
            Finite(load.Force, load.Moment, $"a load on node {name} in situation {s.Name}");
        }

        foreach (var load in s.PointLoads) Check(s, load);
        foreach (var load in s.LineLoads) Check(s, load);
        foreach (var t in s.Temperatures)
        {
            var name = NameOf(t.Member);
            if (!FrameCheck.Holds(new Vector3(t.Uniform, t.GradientY, t.GradientZ))) Fail(StaticsCodes.Value, $"a temperature of member {name} in situation {s.Name} is not a finite number");
        }

        foreach (var movement in s.Movements) Check(s, movement);
        foreach (var term in s.Terms) Check(s, term);
    }

    private void Check(FrameSituation s, MemberPointLoad load)
    {
        var name = NameOf(load.Member);
        Finite(load.Force, load.Moment, $"a point load on member {name} in situation {s.Name}");
        if (members[load.Member] is { } member && !IsOn(load.At, member.Body.Length))
            Fail(StaticsCodes.Load, Text($"a point load of situation {s.Name} lies at {load.At:R} m of member {name}, whose flexible length is {member.Body.Length:R} m"));
    }

    private void Check(FrameSituation s, MemberLineLoad load)
    {
        var name = NameOf(load.Member);
        Finite(load.ForceFrom, load.ForceTo, $"a line load on member {name} in situation {s.Name}");
        Finite(load.MomentFrom, load.MomentTo, $"a line load on member {name} in situation {s.Name}");
        if (members[load.Member] is not { } member) return;

        var (from, to) = (load.From ?? 0, load.To ?? member.Body.Length);
        if (!IsOn(from, member.Body.Length) || !IsOn(to, member.Body.Length))
            Fail(StaticsCodes.Load, Text($"a line load of situation {s.Name} from {from:R} m to {to:R} m reaches beyond member {name}, whose flexible length is {member.Body.Length:R} m"));
        if (!(from < to)) Fail(StaticsCodes.Load, Text($"a line load of situation {s.Name} on member {name} runs from {from:R} m to {to:R} m; it must begin before it ends"));
    }

    private void Check(FrameSituation s, SupportMovement movement)
    {
        var name = frame.Nodes[FrameCheck.Number(movement.Node, frame.Nodes.Length, "node")].Name;
        if (!(Math.Abs(movement.Value) < FrameLimits.LargestNumber)) Fail(StaticsCodes.Value, $"a movement of node {name} in situation {s.Name} is not a finite number");
        if (!_supports.TryGetValue(movement.Node, out var support) || support.Restraints[movement.Direction].Kind != RestraintKind.Fixed)
            Fail(StaticsCodes.Load, $"situation {s.Name} moves node {name} in {FrameCheck.Word(movement.Direction)}, where no support fixes it; fix it");
    }

    private void Check(FrameSituation s, SituationTerm term)
    {
        var other = frame.Situations[FrameCheck.Number(term.Situation, frame.Situations.Length, "situation")];
        if (!(Math.Abs(term.Factor) < FrameLimits.LargestNumber)) Fail(StaticsCodes.Value, $"a factor of situation {s.Name} is not a finite number");
        if (!other.Terms.IsEmpty) Fail(StaticsCodes.Load, $"situation {s.Name} combines {other.Name}, which is a combination itself; name its parts");
    }

    private string NameOf(int member) => frame.Members[FrameCheck.Number(member, frame.Members.Length, "member")].Name;

    private void Finite(Vector3 a, Vector3 b, string what)
    {
        if (!FrameCheck.Holds(a) || !FrameCheck.Holds(b)) Fail(StaticsCodes.Value, $"{what} is not a finite vector");
    }

    private static bool IsOn(double x, double length) => x >= -FrameLimits.Beyond * length && x <= (1 + FrameLimits.Beyond) * length;

    private void Fail(string code, string message)
    {
        _isGood = false;
        diagnostics.Add(code, Severity.Error, message);
    }

    private static string Text(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
