using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Curves;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Curves;

/// <summary>Lengths and bend radii by hand; parameters of curves as in the IFC documentation (a polyline counts its segments, a circle its angle in the plane-angle unit).</summary>
public sealed class DirectrixReaderTests
{
    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_polyline_adds_its_segments_and_counts_its_corners(Release release)
    {
        var model = Bars.Model(release);
        Bars.Add(model, "R", model.Bodies.SweptDisk([Vector3.Zero, new Vector3(3, 0, 0), new Vector3(3, 4, 0), new Vector3(3, 6, 0)], 0.01));

        var member = Reading.Of(model).Only;

        Reading.AssertNear(9, Reading.Value(member.Length));
        Assert.False(member.IsStraight);
        Assert.Empty(member.BendRadii);
        Assert.Contains(member.Notes, n => n.Contains("1 mitred corner", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("0.5", "2.25", 1.5 + 4 + 0.5)]
    [InlineData("$", "1.", 3)]
    [InlineData("1.", "$", 6)]
    [InlineData("0.", "3.", 9)]
    public void Parameters_of_a_polyline_count_segments_not_lengths(string from, string to, double length)
    {
        var member = Disk(model => (Polyline(model, Vector3.Zero, new Vector3(3, 0, 0), new Vector3(3, 4, 0), new Vector3(3, 6, 0)), from, to));

        Reading.AssertNear(length, Reading.Value(member.Length));
    }

    [Theory]
    [InlineData("0.", "3000.")]
    [InlineData("-1.", "1.")]
    [InlineData("2.", "1.")]
    [InlineData("1.", "1.")]
    public void Parameters_beyond_the_curve_leave_the_length_ambiguous(string from, string to)
    {
        var member = Disk(model => (Polyline(model, Vector3.Zero, new Vector3(3, 0, 0)), from, to));

        Assert.Equal(ReasonCode.LengthAmbiguous, Reading.Why(member.Section).Code);
        Assert.Contains("ambiguous", Reading.Why(member.Section).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_repeated_point_of_a_polyline_counts_as_a_step_of_the_parameter()
    {
        var member = Disk(model => (Polyline(model, Vector3.Zero, Vector3.Zero, new Vector3(3, 0, 0), new Vector3(5, 0, 0)), "1.", "2."));

        Reading.AssertNear(3, Reading.Value(member.Length));
        Assert.True(member.IsStraight);
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void An_indexed_curve_with_arcs_has_arc_lengths_and_bend_radii(Release release)
    {
        // 2 m straight, a quarter circle of radius 0.5 m, 1 m straight: a gangway rail that turns down.
        var c = 0.5 * Math.Sqrt(0.5);
        var member = Disk(model =>
        {
            var points = model.Add("IFCCARTESIANPOINTLIST3D", Points(model, (0, 0), (2, 0), (2 + c, 0.5 - c), (2.5, 0.5), (2.5, 1.5)));
            return (model.Add("IFCINDEXEDPOLYCURVE", Bars.Ref(points), "(IFCLINEINDEX((1,2)),IFCARCINDEX((2,3,4)),IFCLINEINDEX((4,5)))", ".F."), "$", "$");
        }, release);

        Reading.AssertNear(2 + Math.PI / 4 + 1, Reading.Value(member.Length));
        Reading.AssertNear(0.5, Assert.Single(member.BendRadii));
        Assert.False(member.IsStraight);
        Assert.DoesNotContain(member.Notes, n => n.Contains("mitred", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData(false, Math.PI / 2)]
    [InlineData(true, 3 * Math.PI / 2)]
    public void An_arc_of_three_points_goes_through_the_middle_one(bool longWay, double angle)
    {
        var r = 0.5;
        var middle = longWay ? (-r * Math.Sqrt(0.5), -r * Math.Sqrt(0.5)) : (r * Math.Sqrt(0.5), r * Math.Sqrt(0.5));
        var member = Disk(model =>
        {
            var points = model.Add("IFCCARTESIANPOINTLIST3D", Points(model, (r, 0), middle, (0, r)));
            return (model.Add("IFCINDEXEDPOLYCURVE", Bars.Ref(points), "(IFCARCINDEX((1,2,3)))", "$"), "$", "$");
        });

        Reading.AssertNear(r * angle, Reading.Value(member.Length));
        Near.Vector(longWay ? -Vector3.UnitY : Vector3.UnitY, Reading.Value(member.Axes).X);
    }

    [Theory]
    [InlineData("(IFCLINEINDEX((0,1)))")]
    [InlineData("(IFCLINEINDEX((1,9)))")]
    [InlineData("(IFCARCINDEX((1,2)))")]
    [InlineData("(IFCARCINDEX((1,2,3)))")]
    public void Indices_that_make_no_curve_leave_the_length_ambiguous(string segments)
    {
        // The three points lie on one line, so they make no arc.
        var member = Disk(model => (model.Add("IFCINDEXEDPOLYCURVE", Bars.Ref(model.Add("IFCCARTESIANPOINTLIST3D", Points(model, (0, 0), (1, 0), (2, 0)))), segments, "$"), "$", "$"));

        Assert.Equal(ReasonCode.LengthAmbiguous, Reading.Why(member.Section).Code);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_composite_curve_joins_lines_and_trimmed_arcs_in_the_unit_of_plane_angles(Release release)
    {
        // 1 m along X, then a quarter circle of 0.4 m about (1, 0.4), from −90° to 0°; its trims are in degrees.
        var text = Composite(release, degrees: true, "IFCPARAMETERVALUE(-90.)", "IFCPARAMETERVALUE(0.)", ".T.", ".PARAMETER.", ".T.");

        var member = Reading.Of(text).Only;

        Reading.AssertNear(1 + 0.4 * Math.PI / 2, Reading.Value(member.Length));
        Reading.AssertNear(0.4, Assert.Single(member.BendRadii));
        Assert.DoesNotContain(member.Notes, n => n.Contains("mitred", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("IFCPARAMETERVALUE(270.)", "IFCPARAMETERVALUE(360.)", ".T.", ".PARAMETER.", ".T.", Math.PI / 2)]
    [InlineData("IFCPARAMETERVALUE(0.)", "IFCPARAMETERVALUE(270.)", ".F.", ".PARAMETER.", ".F.", Math.PI / 2)]
    [InlineData("IFCPARAMETERVALUE(-90.)", "IFCPARAMETERVALUE(0.)", ".F.", ".PARAMETER.", ".T.", 3 * Math.PI / 2)]
    [InlineData("#60", "#61", ".T.", ".CARTESIAN.", ".T.", Math.PI / 2)]
    [InlineData("#60,IFCPARAMETERVALUE(10.)", "#61,IFCPARAMETERVALUE(20.)", ".T.", ".CARTESIAN.", ".T.", Math.PI / 2)]
    [InlineData("#60,IFCPARAMETERVALUE(10.)", "#61,IFCPARAMETERVALUE(20.)", ".T.", ".PARAMETER.", ".T.", Math.PI / 18)]
    public void Trims_wrap_and_senses_choose_one_of_the_arcs(string trim1, string trim2, string sense, string master, string sameSense, double angle)
    {
        var member = Reading.Of(Composite(Release.Ifc4, degrees: true, trim1, trim2, sense, master, sameSense)).Only;

        Reading.AssertNear(1 + 0.4 * angle, Reading.Value(member.Length));
    }

    [Theory]
    [InlineData("0.2", "1.", 0.8)]
    [InlineData("0.5", "91.", 0.5 + 0.2 * Math.PI)]
    public void Parameters_of_a_composite_curve_run_through_its_segments(string from, string to, double length)
    {
        var text = Composite(Release.Ifc4, degrees: true, "IFCPARAMETERVALUE(-90.)", "IFCPARAMETERVALUE(0.)", ".T.", ".PARAMETER.", ".T.", from, to);

        Reading.AssertNear(length, Reading.Value(Reading.Of(text).Only.Length));
    }

    /// <summary>0 to 1 is the first piece by the standard; common practice among exporters is to mean the whole curve.</summary>
    [Fact]
    public void Parameters_0_to_1_on_a_longer_curve_are_ambiguous()
    {
        var text = Composite(Release.Ifc4, degrees: true, "IFCPARAMETERVALUE(-90.)", "IFCPARAMETERVALUE(0.)", ".T.", ".PARAMETER.", ".T.", "0.", "1.");

        Assert.Equal(ReasonCode.LengthAmbiguous, Reading.Why(Reading.Of(text).Only.Section).Code);
    }

    [Fact]
    public void Part_of_an_arc_is_not_guessed()
    {
        var text = Composite(Release.Ifc4, degrees: true, "IFCPARAMETERVALUE(-90.)", "IFCPARAMETERVALUE(0.)", ".T.", ".PARAMETER.", ".T.", "0.", "46.");

        Assert.Equal(ReasonCode.LengthAmbiguous, Reading.Why(Reading.Of(text).Only.Section).Code);
    }

    [Fact]
    public void Trims_are_in_radians_where_the_project_says_so_or_nothing()
    {
        var text = Composite(Release.Ifc4, degrees: false, "IFCPARAMETERVALUE(-1.5)", "IFCPARAMETERVALUE(0.)", ".T.", ".PARAMETER.", ".T.");

        Reading.AssertNear(1 + 0.4 * 1.5, Reading.Value(Reading.Of(text).Only.Length));
    }

    [Theory]
    [InlineData("IFCPARAMETERVALUE(0.5)", "IFCPARAMETERVALUE(2.)", 3)]
    [InlineData("IFCPARAMETERVALUE(2.)", "IFCPARAMETERVALUE(0.5)", 3)]
    public void A_trimmed_line_counts_in_steps_of_its_vector(string trim1, string trim2, double length)
    {
        var member = Disk(model =>
        {
            var vector = model.Add("IFCVECTOR", Bars.Ref(model.Direction(new Vector3(0, 5, 0))), "2000.");
            var line = model.Add("IFCLINE", Bars.Ref(model.Point(Vector3.Zero)), Bars.Ref(vector));
            return (model.Add("IFCTRIMMEDCURVE", Bars.Ref(line), $"({trim1})", $"({trim2})", ".T.", ".PARAMETER."), "$", "$");
        });

        Reading.AssertNear(length, Reading.Value(member.Length));
    }

    [Fact]
    public void A_fillet_radius_rounds_every_corner()
    {
        // Two legs of 1 m at a right angle, fillet 0.2 m: 2 × (1 − 0.2) + 0.2·π/2.
        var model = Bars.Model(Release.Ifc4);
        var line = Polyline(model, Vector3.Zero, new Vector3(1, 0, 0), new Vector3(1, 1, 0));
        Bars.Add(model, "R", model.Add("IFCSWEPTDISKSOLIDPOLYGONAL", Bars.Ref(line), "10.", "$", "$", "$", "200."));

        var member = Reading.Of(model).Only;

        Reading.AssertNear(1.6 + 0.1 * Math.PI, Reading.Value(member.Length));
        Reading.AssertNear(0.2, Assert.Single(member.BendRadii));
    }

    [Fact]
    public void A_curve_that_lost_a_point_or_a_segment_leaves_the_length_ambiguous()
    {
        var point = Disk(model => (model.Add("IFCPOLYLINE", $"({Bars.Ref(model.Point(Vector3.Zero))},#999999,{Bars.Ref(model.Point(new Vector3(1, 1, 0)))})"), "$", "$"));
        var segment = Disk(model =>
        {
            var leg = model.Add("IFCCOMPOSITECURVESEGMENT", ".CONTINUOUS.", ".T.", Bars.Ref(Polyline(model, Vector3.Zero, Vector3.UnitX)));
            return (model.Add("IFCCOMPOSITECURVE", $"({Bars.Ref(leg)},#999999)", ".F."), "$", "$");
        });

        Assert.Equal(ReasonCode.LengthAmbiguous, Reading.Why(point.Section).Code);
        Assert.Equal(ReasonCode.LengthAmbiguous, Reading.Why(segment.Section).Code);
    }

    [Fact]
    public void A_spline_and_a_composite_curve_in_itself_are_not_read()
    {
        var spline = Disk(model => (model.Add("IFCBSPLINECURVEWITHKNOTS", "1", "()", ".UNSPECIFIED.", ".F.", ".F.", "(2,2)", "(0.,1.)", ".UNSPECIFIED."), "$", "$"));
        var circle = Disk(model =>
        {
            var next = model.Add("IFCLABELHOLDER") + 1;
            model.Add("IFCCOMPOSITECURVE", Bars.Refs(next + 1), ".F.");
            model.Add("IFCCOMPOSITECURVESEGMENT", ".CONTINUOUS.", ".T.", Bars.Ref(next));
            return (next, "$", "$");
        });

        Assert.Equal(ReasonCode.LengthAmbiguous, Reading.Why(spline.Section).Code);
        Assert.Equal(ReasonCode.LengthAmbiguous, Reading.Why(circle.Section).Code);
    }

    [Fact]
    public void A_curve_of_more_pieces_than_the_limit_is_not_read()
    {
        var member = Disk(model =>
        {
            var (a, b) = (model.Point(Vector3.Zero), model.Point(Vector3.UnitX));
            return (model.Add("IFCPOLYLINE", Spelling.References(Enumerable.Range(0, CurveReader.MaxPieces + 1).Select(i => i % 2 == 0 ? a : b))), "$", "$");
        });

        Assert.Equal(ReasonCode.LengthAmbiguous, Reading.Why(member.Section).Code);
    }

    private static Member Disk(Func<ModelWriter, (int Curve, string From, string To)> write, Release release = Release.Ifc4)
    {
        var model = Bars.Model(release);
        var (curve, from, to) = write(model);
        Bars.Add(model, "R", model.Add("IFCSWEPTDISKSOLID", Bars.Ref(curve), "10.", "$", from, to));
        return Reading.Of(model).Only;
    }

    private static int Polyline(ModelWriter model, params Vector3[] points) => model.Add("IFCPOLYLINE", Spelling.References(points.Select(model.Point)));

    private static string Points(ModelWriter model, params (double X, double Y)[] points) =>
        Spelling.List(points.Select(p => $"({model.Units.LengthText(p.X)},{model.Units.LengthText(p.Y)},0.)"));

    private static byte[] Composite(
        Release release, bool degrees, string trim1, string trim2, string sense, string master, string sameSense, string from = "$", string to = "$") => Reading.Text(
        release,
        "#1=IFCPROJECT('0YvctVUKr0kugbFTf53O9L',$,'P',$,$,$,$,$,#2);", degrees ? "#2=IFCUNITASSIGNMENT((#3,#4));" : "#2=IFCUNITASSIGNMENT((#3));",
        "#3=IFCSIUNIT(*,.LENGTHUNIT.,$,.METRE.);", "#4=IFCCONVERSIONBASEDUNIT($,.PLANEANGLEUNIT.,'degree',#5);",
        "#5=IFCMEASUREWITHUNIT(IFCPLANEANGLEMEASURE(0.017453292519943295),#6);", "#6=IFCSIUNIT(*,.PLANEANGLEUNIT.,$,.RADIAN.);",
        "#10=IFCMEMBER('2O2Fr$t4X7Zf8NOew3FLOH',$,'R',$,$,$,#11,$,$);", "#11=IFCPRODUCTDEFINITIONSHAPE($,$,(#12));",
        "#12=IFCSHAPEREPRESENTATION($,'Body','AdvancedSweptSolid',(#13));", $"#13=IFCSWEPTDISKSOLID(#20,0.01,$,{from},{to});",
        "#20=IFCCOMPOSITECURVE((#21,#22),.F.);", "#21=IFCCOMPOSITECURVESEGMENT(.CONTINUOUS.,.T.,#30);", $"#22=IFCCOMPOSITECURVESEGMENT(.CONTINUOUS.,{sameSense},#40);",
        "#30=IFCPOLYLINE((#31,#60));", "#31=IFCCARTESIANPOINT((0.,0.,0.));", "#60=IFCCARTESIANPOINT((1.,0.,0.));", "#61=IFCCARTESIANPOINT((1.4,0.4,0.));",
        $"#40=IFCTRIMMEDCURVE(#41,({trim1}),({trim2}),{sense},{master});", "#41=IFCCIRCLE(#42,0.4);",
        "#42=IFCAXIS2PLACEMENT3D(#43,$,$);", "#43=IFCCARTESIANPOINT((1.,0.4,0.));");
}
