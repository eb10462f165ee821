using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Sections;

/// <summary>Meaning of the dimensions: IFC documentation of IfcParameterizedProfileDef and its subtypes (XDim along profile x, hollow radius outer, wall uniform).</summary>
public sealed class ProfileReaderTests
{
    public static TheoryData<Release, int> Profiles
    {
        get
        {
            var data = new TheoryData<Release, int>();
            foreach (var release in Enum.GetValues<Release>())
                for (var i = 0; i < s_sections.Length; i++)
                    data.Add(release, i);
            return data;
        }
    }

    private static readonly CrossSection[] s_sections =
    [
        new Round(0.008), new Tube(0.02415, 0.0032), new Rectangle(0.060, 0.012), new RoundedRectangle(0.050, 0.020, 0.004), new Box(0.080, 0.040, 0.004, 0.008, 0.004),
    ];

    [Theory]
    [MemberData(nameof(Profiles))]
    public void Each_of_the_five_profiles_reads_to_its_section(Release release, int index)
    {
        var model = Bars.Model(release);
        Bars.Add(model, "R", model.Bodies.Extrusion(model.Profiles.Of(s_sections[index], "P 7"), 2));

        var member = Reading.Of(model).Only;

        AssertAlike(s_sections[index], Reading.Shape(member));
        Assert.Equal("P 7", Reading.Value(member.Section).Name);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_box_without_radii_is_read_sharp_and_with_cold_formed_ones(Release release)
    {
        // EN 10219-2:2006 B.3, from memory: t ≤ 6 mm gives ro = 2t, ri = t; t ≤ 10 mm 2.5t and 1.5t; beyond 3t and 2t.
        var model = Bars.Model(release);
        foreach (var wall in new[] { 0.004, 0.008, 0.012 })
            Bars.Add(model, FormattableString.Invariant($"t{wall * 1e3}"), model.Bodies.Extrusion(model.Profiles.RectangleHollow(0.2, 0.1, wall), 2));

        var reading = Reading.Of(model);

        foreach (var (name, outer, inner) in new[] { ("t4", 0.008, 0.004), ("t8", 0.020, 0.012), ("t12", 0.036, 0.024) })
        {
            var section = Reading.Value(reading.Named(name).Section);
            Assert.Equal(2, section.Shapes.Length);
            var (sharp, round) = ((Box)section.Shapes[0], (Box)section.Shapes[1]);
            Assert.Equal((0, 0), (sharp.OuterRadius, sharp.InnerRadius));
            Reading.AssertNear(outer, round.OuterRadius);
            Reading.AssertNear(inner, round.InnerRadius);
            Assert.Contains(section.Notes, n => n.Contains("radii assumed", StringComparison.Ordinal));
            Assert.Contains(reading.Named(name).Notes, n => n.Contains("radii assumed", StringComparison.Ordinal));
        }
    }

    [Fact]
    public void A_box_too_small_for_cold_formed_radii_is_read_sharp_and_says_so()
    {
        var model = Bars.Model(Release.Ifc4);
        Bars.Add(model, "R", model.Bodies.Extrusion(model.Profiles.RectangleHollow(0.030, 0.020, 0.006), 1));

        var section = Reading.Value(Reading.Of(model).Only.Section);

        Assert.Equal(0, Assert.IsType<Box>(Assert.Single(section.Shapes)).OuterRadius);
        Assert.Contains(section.Notes, n => n.Contains("do not fit", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData(0.004, null, 0.008, 0.004, "outer corner radius absent")]
    [InlineData(null, 0.010, 0.010, 0.006, "inner corner radius absent")]
    [InlineData(null, 0.003, 0.003, 0.0, "inner corner radius absent")]
    [InlineData(0.0, null, 0.0, 0.0, "outer corner radius absent")]
    public void A_box_with_one_radius_takes_the_other_from_the_wall_and_says_so(double? inner, double? outer, double expectedOuter, double expectedInner, string note)
    {
        var model = Bars.Model(Release.Ifc4);
        Bars.Add(model, "R", model.Bodies.Extrusion(model.Profiles.RectangleHollow(0.080, 0.060, 0.004, inner, outer), 1));

        var section = Reading.Value(Reading.Of(model).Only.Section);

        var box = Assert.IsType<Box>(Assert.Single(section.Shapes));
        Reading.AssertNear(expectedOuter, box.OuterRadius);
        Reading.AssertNear(expectedInner, box.InnerRadius);
        Assert.Contains(section.Notes, n => n.Contains(note, StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("IFCCIRCLEPROFILEDEF", "0.", ReasonCode.SectionInvalid)]
    [InlineData("IFCCIRCLEPROFILEDEF", "-8.", ReasonCode.SectionInvalid)]
    [InlineData("IFCCIRCLEPROFILEDEF", "$", ReasonCode.SectionInvalid)]
    [InlineData("IFCCIRCLEHOLLOWPROFILEDEF", "24.,24.", ReasonCode.WallOverRadius)]
    [InlineData("IFCCIRCLEHOLLOWPROFILEDEF", "24.,30.", ReasonCode.WallOverRadius)]
    [InlineData("IFCCIRCLEHOLLOWPROFILEDEF", "24.,0.", ReasonCode.SectionInvalid)]
    [InlineData("IFCRECTANGLEPROFILEDEF", "60.,-12.", ReasonCode.SectionInvalid)]
    [InlineData("IFCRECTANGLEPROFILEDEF", "60.,'12'", ReasonCode.SectionInvalid)]
    [InlineData("IFCROUNDEDRECTANGLEPROFILEDEF", "60.,12.,7.", ReasonCode.SectionInvalid)]
    [InlineData("IFCRECTANGLEHOLLOWPROFILEDEF", "60.,40.,20.,$,$", ReasonCode.WallOverRadius)]
    [InlineData("IFCRECTANGLEHOLLOWPROFILEDEF", "60.,40.,4.,4.,25.", ReasonCode.SectionInvalid)]
    [InlineData("IFCRECTANGLEHOLLOWPROFILEDEF", "60.,40.,4.,-1.,8.", ReasonCode.SectionInvalid)]
    [InlineData("IFCISHAPEPROFILEDEF", "100.,200.,5.,-8.,$,$,$", ReasonCode.SectionInvalid)]
    [InlineData("IFCARBITRARYCLOSEDPROFILEDEF", "#1", ReasonCode.DamagedRecord)]
    public void Dimensions_that_make_no_section_end_with_their_reason(string keyword, string dimensions, ReasonCode expected)
    {
        var model = Bars.Model(Release.Ifc4);
        var profile = model.Add(keyword, ".AREA.", "'P 7'", "$", dimensions);
        Bars.Add(model, "R", model.Bodies.Extrusion(profile, 2));

        var why = Reading.Why(Reading.Of(model).Only.Section);

        Assert.Equal(expected, why.Code);
        Assert.Contains(FormattableString.Invariant($"{keyword} #{profile} 'P 7'"), why.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_profile_that_is_a_curve_or_damaged_or_missing_gives_no_section()
    {
        var model = Bars.Model(Release.Ifc4);
        Bars.Add(model, "curve", model.Bodies.Extrusion(model.Add("IFCCIRCLEPROFILEDEF", ".CURVE.", "$", "$", "8."), 2));
        Bars.Add(model, "missing", model.Bodies.Extrusion(999_999, 2));
        Bars.Add(model, "position", model.Bodies.Extrusion(model.Add("IFCCIRCLEPROFILEDEF", ".AREA.", "$", "#999999", "8."), 2));
        Bars.Add(model, "damaged", model.Bodies.Extrusion(model.Add("IFCCIRCLEPROFILEDEF", ".AREA.", "$", "$", "8.)(9."), 2));

        var reading = Reading.Of(model);

        Assert.Equal(ReasonCode.SectionNotCovered, Reading.Why(reading.Named("curve").Section).Code);
        Assert.Equal(ReasonCode.DamagedRecord, Reading.Why(reading.Named("missing").Section).Code);
        Assert.Equal(ReasonCode.DamagedRecord, Reading.Why(reading.Named("position").Section).Code);
        Assert.Equal(ReasonCode.DamagedRecord, Reading.Why(reading.Named("damaged").Section).Code);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_profile_turned_and_shifted_by_its_position_takes_the_member_axes_along(Release release)
    {
        // Position (10, 20) mm, its x along (0.6, 0.8): profile y is then (−0.8, 0.6).
        var model = Bars.Model(release);
        var position = model.Add("IFCAXIS2PLACEMENT2D", Bars.Ref(model.Add("IFCCARTESIANPOINT", "(10.,20.)")), Bars.Ref(model.Add("IFCDIRECTION", "(0.6,0.8)")));
        var profile = model.Add("IFCRECTANGLEPROFILEDEF", ".AREA.", "$", Bars.Ref(position), "60.", "12.");
        Bars.Add(model, "R", model.Bodies.Extrusion(profile, 2), Bars.Askew);

        var axes = Reading.Value(Reading.Of(model).Only.Axes);

        Near.Vector(Bars.Askew.Point(new Vector3(0.010, 0.020, 0)), axes.Origin);
        Near.Vector(Bars.Askew.Direction(Vector3.UnitZ), axes.X);
        Near.Vector(Bars.Askew.Direction(new Vector3(0.6, 0.8, 0)), axes.Y);
        Near.Vector(Bars.Askew.Direction(new Vector3(-0.8, 0.6, 0)), axes.Z);
    }

    internal static void AssertAlike(CrossSection expected, CrossSection actual, double relative = 1e-9)
    {
        Assert.Equal(expected.GetType(), actual.GetType());
        foreach (var (e, a) in Dimensions(expected).Zip(Dimensions(actual))) Reading.AssertNear(e, a, relative);
    }

    private static double[] Dimensions(CrossSection shape) => shape switch
    {
        Round s => [s.Radius],
        Tube s => [s.OuterRadius, s.Wall],
        Rectangle s => [s.Width, s.Depth],
        RoundedRectangle s => [s.Width, s.Depth, s.CornerRadius],
        Box s => [s.Width, s.Depth, s.Wall, s.OuterRadius, s.InnerRadius],
        _ => throw new ArgumentException(shape.Kind, nameof(shape)),
    };
}
