using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Frames;
using MemberScan.Model.Frames;

namespace MemberScan.Ifc.Tests.Frames;

/// <summary>Nodes, supports, releases and eccentricities of analysis models, in the three schemas.</summary>
public sealed class TopologyTests
{
    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_cantilever_has_two_nodes_a_fixed_support_and_one_member_with_section_and_material(Release release)
    {
        var read = Frames.Bar(release);

        Assert.Empty(read.Refusals);
        var frame = read.Frame!;
        Assert.Equal([Vector3.Zero, new Vector3(2, 0, 0)], frame.Nodes.Select(n => n.Position));
        Assert.Equal(["'A'", "'B'"], frame.Nodes.Select(n => n.Name.Split(' ')[0]));
        var support = Assert.Single(frame.Supports);
        Assert.Equal((0, Restraints.AllFixed), (support.Node, support.Restraints));
        var member = Assert.Single(frame.Members);
        Assert.Equal((0, 1, Restraints.AllFixed, Restraints.AllFixed, false), (member.Start, member.End, member.StartJoint, member.EndJoint, member.TrussOnly));
        Near.Vector(Vector3.UnitZ, member.ZDirection!.Value);

        // CHS 48.3 × 3.2: A 4.53 cm², I 11.6 cm⁴, It 23.2 cm⁴ (EN 10210-2 tables, from memory); G = E/(2(1 + ν)).
        Assert.Equal(4.53, member.Section.Area * 1e4, 2);
        Assert.Equal(11.6, member.Section.Iy * 1e8, 1);
        Assert.Equal(23.2, member.Section.J * 1e8, 1);
        Reading.AssertNear(210e9, member.Material.E);
        Reading.AssertNear(210e9 / 2.6, member.Material.G);
        Assert.False(read.HasResults);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Ends_within_the_tolerance_are_one_node_and_ends_beyond_it_are_not(Release release)
    {
        var model = Frames.Model(release);
        var writer = new FrameWriter(model, "Landing");
        var left = writer.Member("Left", Vector3.Zero, new Vector3(2, 0, 0), Vector3.UnitZ);
        var right = writer.Member("Right", new Vector3(2.00005, 0, 0), new Vector3(4, 0, 0), Vector3.UnitZ);
        var far = writer.Member("Far", new Vector3(4.0005, 0, 0), new Vector3(6, 0, 0), Vector3.UnitZ);
        Frames.Steel(model, writer, left, right, far);
        writer.Finish();

        var frame = Frames.Read(model).Frame!;

        Assert.Equal(5, frame.Nodes.Length);
        Assert.Equal(frame.Members[0].End, frame.Members[1].Start);
        Assert.NotEqual(frame.Members[1].End, frame.Members[2].Start);
        Reading.AssertNear(5e-5, frame.Members[1].StartOffset.X, 1e-6);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Releases_and_springs_come_in_the_encoding_of_the_schema(Release release)
    {
        var read = Frames.Bar(release, (writer, bar, nodes) =>
        {
            writer.Join(bar, nodes.A, writer.Condition("fixed", "fixed", "fixed", "fixed", "250.", "free"));
            writer.Join(bar, nodes.B, writer.Condition("fixed", "40.", "fixed", "free", "free", "free"));
        });

        var member = Assert.Single(read.Frame!.Members);

        // The test's settings give kN/m and kN·m/rad as units of stiffness.
        Assert.Equal(Restraints.AllFixed.With(Direction.Ry, Restraint.Spring(250e3)).With(Direction.Rz, Restraint.Free), member.StartJoint);
        Assert.Equal(Restraints.Pinned.With(Direction.Uy, Restraint.Spring(40e3)), member.EndJoint);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_direction_that_is_left_out_is_neither_free_nor_fixed_and_bars_the_analysis(Release release)
    {
        var read = Frames.Bar(release, (writer, bar, nodes) => writer.Join(bar, nodes.A, writer.Condition("fixed", "fixed", "fixed", "$", "fixed", "fixed")));

        Assert.Null(read.Frame);
        Assert.Contains("'Strut'", Assert.Single(read.Refusals).Message, StringComparison.Ordinal);
        Assert.Contains("does not say how Rx is held", read.Refusals[0].Message, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void A_release_in_a_turned_system_is_said_in_the_axes_of_the_member(Release release)
    {
        // The system's x is the member's y: free about the system's x is free about the member's y.
        var turned = Bars.Frame(Vector3.Zero, Vector3.UnitZ, Vector3.UnitY);
        var read = Frames.Bar(release, (writer, bar, nodes) => writer.Join(bar, nodes.A, writer.Condition("fixed", "fixed", "fixed", "free", "fixed", "fixed"), turned));

        Assert.Equal(Restraints.AllFixed.With(Direction.Ry, Restraint.Free), Assert.Single(read.Frame!.Members).StartJoint);
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void A_release_in_askew_axes_is_refused_by_name(Release release)
    {
        var read = Frames.Bar(release, (writer, bar, nodes) => writer.Join(bar, nodes.A, writer.Condition("fixed", "fixed", "fixed", "free", "fixed", "fixed"), Bars.Askew));

        Assert.Contains("of 'Strut'", Assert.Single(read.Refusals).Message, StringComparison.Ordinal);
        Assert.Contains("askew", read.Refusals[0].Message, StringComparison.Ordinal);
        Assert.Null(read.Frame);
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void A_skewed_support_keeps_its_system_within_the_shared_placement(Release release)
    {
        var model = Frames.Model(release);
        var writer = new FrameWriter(model, "Landing", Bars.Askew);
        var roller = writer.Condition("free", "fixed", "fixed", "free", "free", "free");
        writer.Node("A", Vector3.Zero, roller, Bars.Frame(Vector3.Zero, Vector3.UnitX, Vector3.UnitY));
        Frames.Steel(model, writer, writer.Member("Strut", Vector3.Zero, new Vector3(2, 0, 0), Vector3.UnitZ));
        writer.Finish();

        var frame = Frames.Read(model).Frame!;

        var support = Assert.Single(frame.Supports);
        Near.Vector(Bars.Askew.Direction(Vector3.UnitY), support.X);
        Near.Vector(Bars.Askew.Direction(Vector3.UnitZ), support.Y);
        Near.Vector(Bars.Askew.Point(Vector3.Zero), frame.Nodes[support.Node].Position);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void An_eccentric_joint_is_a_rigid_offset_from_the_node_to_the_member(Release release)
    {
        var model = Frames.Model(release);
        var writer = new FrameWriter(model, "Landing");
        var node = writer.Node("A", new Vector3(0, 0, 0.1), writer.Condition("fixed", "fixed", "fixed", "fixed", "fixed", "fixed"));
        var bar = writer.Member("Strut", Vector3.Zero, new Vector3(2, 0, 0), Vector3.UnitZ);
        Frames.Steel(model, writer, bar);
        writer.Join(bar, node, eccentricity: new Vector3(0, 0, -0.1));
        writer.Finish();

        var member = Assert.Single(Frames.Read(model).Frame!.Members);

        Near.Vector(new Vector3(0, 0, -0.1), member.StartOffset);
        Assert.Equal(Vector3.Zero, member.EndOffset);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_joint_off_the_member_without_eccentricity_is_refused(Release release)
    {
        var model = Frames.Model(release);
        var writer = new FrameWriter(model, "Landing");
        var node = writer.Node("A", new Vector3(0, 0, 0.012));
        var bar = writer.Member("Strut", Vector3.Zero, new Vector3(2, 0, 0), Vector3.UnitZ);
        Frames.Steel(model, writer, bar);
        writer.Join(bar, node);
        writer.Finish();

        Assert.Contains("12 mm off it", Assert.Single(Frames.Read(model).Refusals).Message, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_joint_between_the_ends_parts_the_member(Release release)
    {
        var model = Frames.Model(release);
        var writer = new FrameWriter(model, "Landing");
        var node = writer.Node("Middle", new Vector3(0.5, 0, 0));
        var bar = writer.Member("Strut", Vector3.Zero, new Vector3(2, 0, 0), Vector3.UnitZ);
        Frames.Steel(model, writer, bar);
        writer.Join(bar, node);
        writer.Finish();

        var read = Frames.Read(model);

        Assert.Equal([0, 0.5], read.Pieces.Select(p => Math.Round(p.From, 9)));
        Assert.Equal(read.Frame!.Members[0].End, read.Frame.Members[1].Start);
        Assert.All(read.Pieces, p => Reading.AssertNear(2, p.LineLength));
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void An_arc_is_a_chain_of_chords_that_turn_by_five_degrees_at_most(Release release)
    {
        var model = Frames.Model(release);
        var writer = new FrameWriter(model, "Landing");
        var arc = writer.ArcMember("Bow", 3, 0, Math.PI / 2, Vector3.UnitZ);
        Frames.Steel(model, writer, arc);
        writer.Finish();

        var read = Frames.Read(model);

        Assert.Equal(18, read.Frame!.Members.Length);
        Assert.All(read.Frame.Nodes, n => Reading.AssertNear(3, n.Position.Length));
        Assert.Contains(read.Notes, n => n.Contains("'Bow'", StringComparison.Ordinal) && n.Contains("chords", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("PIN_JOINED_MEMBER", AxialSense.Both, true)]
    [InlineData("CABLE", AxialSense.TensionOnly, true)]
    [InlineData("COMPRESSION_MEMBER", AxialSense.CompressionOnly, true)]
    [InlineData("RIGID_JOINED_MEMBER", AxialSense.Both, false)]
    public void The_predefined_type_says_which_axial_forces_a_member_carries(string type, AxialSense sense, bool isTruss)
    {
        var model = Frames.Model(Release.Ifc4);
        var writer = new FrameWriter(model, "Landing");
        Frames.Steel(model, writer, writer.Member("Stay", Vector3.Zero, new Vector3(0, 0, 2), Vector3.UnitX, type));
        writer.Finish();

        var read = Frames.Read(model);

        Assert.Equal((sense, isTruss), (Assert.Single(read.Pieces).Sense, Assert.Single(read.Frame!.Members).TrussOnly));
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Members_without_section_or_modulus_are_refused_by_name(Release release)
    {
        var model = Frames.Model(release);
        var writer = new FrameWriter(model, "Landing");
        writer.Member("Bare", Vector3.Zero, new Vector3(2, 0, 0), Vector3.UnitZ);
        writer.Section(model.Materials.Material("Landing mix"), model.Profiles.Of(Bars.Rail), writer.Member("Soft", new Vector3(2, 0, 0), new Vector3(4, 0, 0), Vector3.UnitZ));
        writer.Finish();

        var read = Frames.Read(model);

        Assert.Null(read.Frame);
        Assert.Contains(read.Refusals, r => r.Message.Contains("'Bare'", StringComparison.Ordinal) && r.Message.Contains("no section", StringComparison.Ordinal));
        Assert.Contains(read.Refusals, r => r.Message.Contains("'Soft'", StringComparison.Ordinal) && r.Message.Contains("no modulus of elasticity", StringComparison.Ordinal));
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_member_without_a_section_takes_that_of_the_body_that_it_stands_for(Release release)
    {
        // The flat lies with its 60 mm along the body's profile X; the analytical member runs against the body.
        var model = Frames.Model(release);
        var body = Bars.Add(model, "Strut", Bars.Flat, 2, Bars.Frame(Vector3.Zero, Vector3.UnitX, Vector3.UnitY));
        model.Associate(model.Materials.Material("S235JR", 235e6, null, 210e9, 0.3), body);
        var writer = new FrameWriter(model, "Landing");
        var line = writer.Member("Line", new Vector3(2, 0, 0), Vector3.Zero, Vector3.UnitZ);
        if (release == Release.Ifc2X3) model.Rooted("IFCRELCONNECTSSTRUCTURALELEMENT", "link", null, Bars.Ref(body), Bars.Ref(line));
        else model.Rooted("IFCRELASSIGNSTOPRODUCT", "link", null, Bars.Refs(line), "$", Bars.Ref(body));
        writer.Finish();

        var member = Assert.Single(Frames.Read(model).Frame!.Members);

        // b h³/12 with b = 60 mm along the body's y (global Y) and h = 12 mm along its z (global Z).
        Reading.AssertNear(0.060 * Math.Pow(0.012, 3) / 12, member.Section.Iy);
        Near.Vector(Vector3.UnitZ, member.ZDirection!.Value);
    }

    [Fact]
    public void A_surface_member_in_the_model_bars_the_analysis_by_name()
    {
        var model = Frames.Model(Release.Ifc4);
        var writer = new FrameWriter(model, "Landing");
        Frames.Steel(model, writer, writer.Member("Strut", Vector3.Zero, new Vector3(2, 0, 0), Vector3.UnitZ));
        writer.Item(model.Rooted("IFCSTRUCTURALSURFACEMEMBER", "Deck", "Deck", "$", "$", "$", ".SHELL.", "$"));
        writer.Finish();

        Assert.Contains("'Deck'", Assert.Single(Frames.Read(model).Refusals).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Connections_at_one_place_that_are_held_differently_bar_the_analysis()
    {
        var read = Frames.Bar(Release.Ifc4, (writer, bar, nodes) => writer.Node("C", Vector3.Zero, writer.Condition("fixed", "fixed", "fixed", "free", "free", "free")));

        Assert.Contains("held differently", Assert.Single(read.Refusals).Message, StringComparison.Ordinal);
    }
}
