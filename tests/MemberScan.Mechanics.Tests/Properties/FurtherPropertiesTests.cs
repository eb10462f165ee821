using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Mechanics.Tests.Profiles;

namespace MemberScan.Mechanics.Tests.Properties;

/// <summary>Extreme moduli, first moments, the axis of equal areas, shear areas and the thin-wall torsion modulus.</summary>
public sealed class FurtherPropertiesTests
{
    // T 60 × 60 × 7 by hand, mm: flange 60·7 at z 56.5, web 53·7 at 26.5: A = 791, centroid 42.4292 from the bottom. Equal areas:
    // 395.5 = 7·56.5 from the bottom, which is in the flange: 371 in the web, 24.5/60 = 0.4083 into the flange, so at 53.4083.
    // Wpl = 371·(53.4083 − 26.5) + 60·(0.4083² + 6.5917²)/2 = 11 291.5.
    [Fact]
    public void A_tee_by_hand()
    {
        var p = SectionProperties.Of(new OpenProfile(OpenShape.T, 0.060, 0.060, 0.007, 0.007));
        var centroid = (420 * 56.5 + 371 * 26.5) / 791;
        var iy = 60 * 343 / 12.0 + 420 * Math.Pow(56.5 - centroid, 2) + 7 * 148877 / 12.0 + 371 * Math.Pow(centroid - 26.5, 2);

        Assert.Equal(iy / (60 - centroid), p.Extremes.YTop * 1e9, 1e-6);
        Assert.Equal(iy / centroid, p.Extremes.YBottom * 1e9, 1e-6);
        Assert.Equal(p.Extremes.YBottom, p.WelY, 1e-18);
        Assert.Equal(p.Extremes.ZRight, p.Extremes.ZLeft, 1e-15);
        Assert.Equal(53 + 24.5 / 60 - centroid, p.PlasticAxisZ * 1e3, 1e-6);
        Assert.Equal(0, p.PlasticAxisY);
        Assert.Equal(371 * (53 + 24.5 / 60 - 26.5) + 30 * (Math.Pow(24.5 / 60, 2) + Math.Pow(7 - 24.5 / 60, 2)), p.WplY * 1e9, 1e-5);
        // The part above the centroid: the flange and 53 − 42.4292 of the web.
        Assert.Equal(420 * (56.5 - centroid) + 7 * (53 - centroid) * (53 - centroid) / 2, p.QY * 1e9, 1e-6);
    }

    // Gere and Timoshenko, appendix (from memory): half disc 2r³/3, rectangle bh²/8, tube 2(ro³ − ri³)/3.
    [Fact]
    public void First_moments_are_the_textbook_ones()
    {
        Assert.Equal(2.0 / 3, SectionProperties.Of(new Round(1)).QY, 1e-12);
        Assert.Equal(2 * 7 / 3.0, SectionProperties.Of(new Tube(2, 1)).QZ, 1e-12);
        var rectangle = SectionProperties.Of(new Rectangle(0.04, 0.08));
        Assert.Equal(0.04 * 0.0064 / 8, rectangle.QY, 1e-15);
        Assert.Equal(0.08 * 0.0016 / 8, rectangle.QZ, 1e-15);
    }

    // The centroid is where first moments above and below agree; an outline and the named kind have the same.
    [Fact]
    public void A_box_and_its_outline_have_the_same_first_moments_and_axes()
    {
        var box = SectionProperties.Of(new Box(0.05, 0.1, 0.005, 0.01, 0.005));
        var outline = SectionProperties.Of(new OutlineSection("box", [ProfileSamples.Rounded(0.05, 0.1, 0.01), ProfileSamples.Rounded(0.04, 0.09, 0.005)]));

        Assert.Equal(box.QY, outline.QY, 1e-9 * box.QY);
        Assert.Equal(box.QZ, outline.QZ, 1e-9 * box.QZ);
        Assert.Equal((0, 0), (outline.PlasticAxisY, outline.PlasticAxisZ));
        Assert.Equal(box.Extremes.YTop, outline.Extremes.YBottom, 1e-9 * box.WelY);
    }

    // AISC Steel Construction Manual, 14th/15th ed., Tables 1-11 and 1-12: C of square and rectangular HSS, in³ (from memory); equal to 2·Am·t.
    [Theory]
    [InlineData(2, 2, 0.116, "0.817")]
    [InlineData(3, 3, 0.233, "3.52")]
    [InlineData(4, 4, 0.233, "6.56")]
    [InlineData(6, 6, 0.233, "15.4")]
    [InlineData(4, 8, 0.233, "13.6")]
    public void The_thin_wall_torsion_modulus_is_the_tabulated_C(double width, double depth, double wall, string c)
    {
        const double Inch = 0.0254;

        var p = SectionProperties.Of(new Box(width * Inch, depth * Inch, wall * Inch, 2 * wall * Inch, wall * Inch));

        // 15.450 stands in the table as 15.4: half a digit is allowed both ways.
        Printed.Agrees(c, p.WtThinWall!.Value / (Inch * Inch * Inch), "C");
    }

    // Thin circular tube: 2πr²t (Bredt).
    [Fact]
    public void The_thin_wall_torsion_modulus_of_a_tube()
    {
        Assert.Equal(2 * Math.PI * 1.5 * 1.5, SectionProperties.Of(new Tube(2, 1)).WtThinWall!.Value, 1e-12);
        Assert.Null(SectionProperties.Of(new Rectangle(1, 2)).WtThinWall);
    }

    // Energy values A_s/A: rectangle 5/6, circle 9/10 and 6/7 (ν = 0), thin tube 1/2 (Timoshenko's energy method; any text, from memory).
    [Fact]
    public void Shear_areas_by_energy_are_the_known_ones()
    {
        Share(5.0 / 6, new Rectangle(0.04, 0.08), ShearModel.Elementary, 0.3, 1e-9);
        Share(5.0 / 6, new Rectangle(0.04, 0.08), ShearModel.Elasticity, 0, 1e-6);
        Share(9.0 / 10, new Round(0.01), ShearModel.Elementary, 0.3, 1e-9);
        Share(6.0 / 7, new Round(0.01), ShearModel.Elasticity, 0, 1e-9);
        Share(6 * 1.69 / (7 + 4.2 + 0.72), new Round(0.01), ShearModel.Elasticity, 0.3, 1e-9);             // 6(1+ν)²/(7+14ν+8ν²)
        Share(1.0 / 2, new Tube(0.1, 1e-6), ShearModel.Elementary, 0.3, 1e-4);
        Share(1.0 / 2, new Tube(0.1, 1e-6), ShearModel.Elasticity, 0, 1e-4);
        // A hardly rounded rectangle by the numerical field.
        Share(5.0 / 6, new RoundedRectangle(0.04, 0.08, 1e-4), ShearModel.Elasticity, 0, 1e-3);
    }

    // The web of a thin I carries nearly all: A_s ≈ tw·(h − tf) within some per cent (common practice).
    [Fact]
    public void The_shear_area_of_a_beam_along_its_web_is_about_that_of_the_web()
    {
        var areas = Samples.Field(new OpenProfile(OpenShape.I, 0.2, 0.1, 0.0056, 0.0085), ShearModel.Elementary).ShearAreas;

        Assert.InRange(areas.Z / (0.0056 * 0.1915), 0.9, 1.02);
        Assert.InRange(areas.Y / (2 * 0.0085 * 0.1 * 5 / 6), 0.95, 1.05);
    }

    [Fact]
    public void Every_kind_has_every_property()
    {
        foreach (var section in Samples.Sections.Concat(ProfileSamples.All))
        {
            var p = SectionProperties.Of(section);

            Assert.All([p.Area, p.Iy, p.Iz, p.IMin, p.WelY, p.WelZ, p.WplY, p.WplZ, p.QY, p.QZ, p.Wt ?? 0, p.J ?? 0], value => Assert.True(value > 0 && double.IsFinite(value), section.Designation));
            Assert.Equal(p.WelY, Math.Min(p.Extremes.YTop, p.Extremes.YBottom), 1e-9 * p.WelY);
            Assert.Equal(p.WelZ, Math.Min(p.Extremes.ZRight, p.Extremes.ZLeft), 1e-9 * p.WelZ);
            Assert.True(p.WplY > p.WelY && p.WplZ > p.WelZ);
        }
    }

    private static void Share(double expected, CrossSection section, ShearModel model, double poisson, double tolerance)
    {
        var field = Samples.Field(section, model, poisson);

        Assert.Equal(expected, field.ShearAreas.Z / field.Properties.Area, tolerance);
        if (section is not RoundedRectangle) Assert.Equal(expected, field.ShearAreas.Y / field.Properties.Area, tolerance);
    }
}
