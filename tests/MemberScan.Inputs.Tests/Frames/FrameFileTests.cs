using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Inputs.Frames;
using MemberScan.Model.Forces;
using MemberScan.Model.Frames;
using MemberScan.Model.Frames.Loads;

namespace MemberScan.Inputs.Tests.Frames;

/// <summary>Frame files: units, defaults, and errors with line and column.</summary>
public sealed class FrameFileTests
{
    private const string Text = """
        { "units": { "length": "mm", "force": "kN" },
          "nodes": { "A": [0, 0, 0], "B": [2000, 0, 500] },
          "materials": { "S": { "E": 210, "G": 80, "unitWeight": 7.7e-8, "yield": 0.235, "expansion": 1.2e-5 } },
          "sections": { "rod": "round 20 mm", "bare": { "A": 4475, "Iy": 2.2e7, "Iz": 7.4e6, "Iyz": -5, "J": 1.8e7, "Asy": 10, "Asz": 20 } },
          "members": {
            "m1": { "start": "A", "end": "B", "section": "bare", "material": "S", "zDirection": [0, 1, 2], "shearFlexible": true,
                    "released": { "end": ["ry", "rz"] }, "springs": { "start": { "ux": 2, "ry": 3 } }, "offsets": { "end": [0, 0, -50] }, "stations": [0, 1000] },
            "m2": { "start": "B", "end": "A", "section": "rod", "material": "S", "shearFlexible": true, "trussOnly": true } },
          "supports": { "A": { "ux": "fixed", "uz": -8, "ry": 0.5, "rx": { "spring": 3 }, "uy": { "spring": 3 }, "axes": { "x": [1, 1, 0], "y": [-1, 1, 0] } } },
          "situations": { "S1": { "kind": "service", "selfWeight": [0, 0, -1],
              "nodeLoads": [ { "node": "B", "F": [0, 0, -1], "M": [4, 0, 0] } ],
              "memberLoads": [ { "member": "m1", "type": "point", "at": 500, "F": [0, 0, -1], "M": [0, 5, 0] },
                               { "member": "m2", "type": "line", "q1": [0, 0, -1], "m1": [6, 0, 0], "axes": "projected" },
                               { "member": "m1", "type": "line", "from": 100, "to": 200, "q1": [0, 0, -1], "q2": [0, 0, -2], "axes": "global" } ],
              "temperature": [ { "member": "m1", "uniform": 20, "gradientZ": 0.5 } ] }, "S2": {} },
          "combinations": { "C": { "kind": "design", "terms": { "S1": 1.35, "S2": 1.5 } } },
          "stations": 7 }
        """;

    /// <summary>Bare constants change linearly from end to end; of rounds the diameter does: π·15⁴/4 = 39,761 mm⁴ half way from 20 mm to 40 mm.</summary>
    [Fact]
    public void A_section_at_each_end_is_a_taper()
    {
        var text = Text.Replace("\"rod\": \"round 20 mm\"", "\"rod\": \"round 20 mm\", \"thick\": \"round 40 mm\", \"more\": { \"A\": 5000, \"Iy\": 3e7, \"Iz\": 8e6, \"J\": 2e7, \"Asy\": 10, \"Asz\": 20 }", StringComparison.Ordinal)
            .Replace("\"section\": \"rod\"", "\"section\": { \"start\": \"rod\", \"end\": \"thick\" }", StringComparison.Ordinal)
            .Replace("\"section\": \"bare\"", "\"section\": { \"start\": \"bare\", \"end\": \"more\" }", StringComparison.Ordinal);

        var members = Good(text).Frame.Members;

        Assert.Equal([0.0, 1.0], members[0].Taper.Select(t => t.Share));
        Assert.Equal(3e-5, members[0].Taper[1].Section.Iy, 1e-15);
        Assert.Equal(65, members[1].Taper.Length);
        Assert.Equal(Math.PI * Math.Pow(0.015, 4) / 4, members[1].Taper[32].Section.Iy, 1e-15);
        Assert.True(members[1].Taper[32].Section.ShearAreaZ > 0);
    }

    [Theory]
    [InlineData("\"section\": { \"start\": \"rod\", \"end\": \"bare\" }", "members.m2.section: a member tapers between two rounds")]
    [InlineData("\"section\": { \"start\": \"rod\", \"end\": \"rad\" }", "members.m2.section.end: there is no section 'rad'; did you mean 'rod'?")]
    [InlineData("\"section\": { \"start\": \"rod\" }", "members.m2.section")]
    public void A_taper_that_is_none_is_told(string section, string message)
    {
        var diagnostics = new DiagnosticList();

        Assert.Null(FrameFile.Read(Encoding.UTF8.GetBytes(Text.Replace("\"section\": \"rod\"", section, StringComparison.Ordinal)), "f.json", diagnostics));

        Assert.Contains(diagnostics.Items, d => d.Message.StartsWith(message, StringComparison.Ordinal));
    }

    [Fact]
    public void Movements_of_supports_belong_to_a_situation()
    {
        var text = Text.Replace("\"S2\": {}", "\"S2\": { \"supportMovements\": { \"A\": { \"uz\": -8, \"ry\": 0.5 } } }", StringComparison.Ordinal);

        var frame = Good(text).Frame;

        Assert.Equal([new SupportMovement(0, Direction.Uz, -0.008), new SupportMovement(0, Direction.Ry, 0.5)], frame.Situations[1].Movements);
        Assert.Empty(frame.Situations[0].Movements);
        var diagnostics = new DiagnosticList();
        Assert.Null(FrameFile.Read(Encoding.UTF8.GetBytes(text.Replace("\"A\": { \"uz\": -8, \"ry\": 0.5 } }", "\"Z\": { \"uz\": -8 } }", StringComparison.Ordinal)), "f.json", diagnostics));
        Assert.Contains("there is no node 'Z'", Assert.Single(diagnostics.Items).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Everything_is_turned_into_SI()
    {
        var frame = Good(Text).Frame;

        Assert.Equal(new Vector3(2, 0, 0.5), frame.Nodes[1].Position);
        var member = frame.Members[0];
        Assert.Equal(210e9, member.Material.E, 1e-3);
        Assert.Equal(77000, member.Material.UnitWeight, 1e-6);
        Assert.Equal(235e6, member.Material.Yield!.Value, 1e-3);
        Assert.Equal(4475e-6, member.Section.Area, 1e-12);
        Assert.Equal(2.2e-5, member.Section.Iy, 1e-15);
        Assert.Equal(-5e-12, member.Section.Iyz, 1e-24);
        Assert.Equal(20e-6, member.Section.ShearAreaZ, 1e-15);
        Assert.Equal(Restraint.Spring(2e6), member.StartJoint.Ux);
        Assert.Equal(Restraint.Spring(3), member.StartJoint.Ry);
        Assert.Equal((RestraintKind.Free, RestraintKind.Free, RestraintKind.Fixed), (member.EndJoint.Ry.Kind, member.EndJoint.Rz.Kind, member.EndJoint.Rx.Kind));
        Assert.Equal(-0.05, member.EndOffset.Z, 1e-15);
        Assert.Equal([0.0, 1.0], member.Stations!.Positions);
        Assert.Equal(new Vector3(0, 1, 2), member.ZDirection);
        var support = frame.Supports[0];
        Assert.Equal(Restraint.Moved(-0.008), support.Restraints.Uz);
        Assert.Equal(Restraint.Moved(0.5), support.Restraints.Ry);
        Assert.Equal(Restraint.Spring(3), support.Restraints.Rx);
        Assert.Equal(Restraint.Spring(3e6), support.Restraints.Uy);
        Assert.Equal(new Vector3(1, 1, 0), support.X);
        Assert.Equal(7, frame.Stations.Count);
    }

    [Fact]
    public void Loads_are_turned_into_SI_and_have_their_defaults()
    {
        var frame = Good(Text).Frame;

        var s = frame.Situations[0];
        Assert.Equal((SituationKind.Service, SituationKind.Unknown, SituationKind.Design), (s.Kind, frame.Situations[1].Kind, frame.Situations[2].Kind));
        Assert.Equal(new NodeLoad(1, new(0, 0, -1000), new(4, 0, 0)), s.NodeLoads[0]);
        Assert.Equal(new MemberPointLoad(0, 0.5, new(0, 0, -1000), new(0, 5, 0), LoadAxes.Local), s.PointLoads[0]);
        var uniform = s.LineLoads[0];
        Assert.Equal((1, null, null, LoadAxes.Projected), (uniform.Member, uniform.From, uniform.To, uniform.Axes));
        Assert.Equal(-1e6, uniform.ForceTo.Z, 1e-6);
        Assert.Equal(6000, uniform.MomentTo.X, 1e-9);
        Assert.Equal(-2e6, s.LineLoads[1].ForceTo.Z, 1e-6);
        Assert.Equal(500, s.Temperatures[0].GradientZ, 1e-9);
        Assert.Equal([new SituationTerm(0, 1.35), new SituationTerm(1, 1.5)], frame.Situations[2].Terms);
    }

    [Fact]
    public void A_section_text_has_its_shear_areas()
    {
        var rod = Good(Text).Frame.Members[1].Section;

        Assert.NotNull(rod.Shape);
        Assert.Equal(0.9 * Math.PI * 1e-4, rod.ShearAreaY, 1e-8);
    }

    [Theory]
    [InlineData("\"kind\": \"service\"", "\"kind\": \"servise\"", "INP-0105", "did you mean 'service'?")]
    [InlineData("\"type\": \"point\", \"at\": 500", "\"type\": \"point\"", "INP-0109", "lacks the key 'at'")]
    [InlineData("\"type\": \"point\", \"at\": 500", "\"type\": \"point\", \"at\": 500, \"from\": 3", "INP-0102", "'from'")]
    [InlineData("\"springs\": { \"start\"", "\"springs\": { \"end\"", "INP-0112", "has a spring and is released")]
    [InlineData("\"S2\": 1.5", "\"S3\": 1.5", "INP-0113", "no situation 'S3'")]
    [InlineData("[\"ry\", \"rz\"]", "[\"ry\", \"ry\"]", "INP-0112", "twice")]
    [InlineData("\"C\": { \"kind\"", "\"S1\": { \"kind\"", "INP-0112", "the name of a situation")]
    [InlineData("\"stations\": 7", "\"stations\": 7.5", "INP-0106", "no fraction")]
    [InlineData("\"stations\": 7", "\"stations\": []", "INP-0106", "empty")]
    [InlineData("\"round 20 mm\"", "\"rownd 20 mm\"", "INP-0107", "did you mean 'round'?")]
    [InlineData("\"round 20 mm\"", "20", "INP-0104", "section text")]
    [InlineData("\"A\": { \"ux\"", "\"Q\": { \"ux\"", "INP-0113", "no node 'Q'")]
    [InlineData("\"A\": 4475", "\"A\": 0", "INP-0106", "above zero")]
    public void A_fault_has_code_line_and_advice(string right, string wrong, string code, string said)
    {
        Assert.Contains(right, Text, StringComparison.Ordinal);
        var diagnostics = new DiagnosticList();

        Assert.Null(FrameFile.Read(Encoding.UTF8.GetBytes(Text.Replace(right, wrong, StringComparison.Ordinal)), "f.json", diagnostics));

        var fault = Assert.Single(diagnostics.Items);
        Assert.Equal(code, fault.Code);
        Assert.Contains(said, fault.Message, StringComparison.Ordinal);
        Assert.True(fault.Span!.Value.Line > 0 && fault.Span.Value.Column > 0);
    }

    private static FrameFile Good(string text)
    {
        var diagnostics = new DiagnosticList();
        var file = FrameFile.Read(Encoding.UTF8.GetBytes(text), "f.json", diagnostics);
        Assert.True(file is not null, string.Join("; ", diagnostics.Items.Select(d => d.Message)));
        return file;
    }
}
