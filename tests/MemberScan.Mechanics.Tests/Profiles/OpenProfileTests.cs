using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.Tests.Profiles;

public sealed class OpenProfileTests
{
    public static TheoryData<int> Numbers => [.. Enumerable.Range(0, ProfileSamples.All.Length)];

    // EN 10365, IPE 200 (from memory): A 28.5 cm², Iy 1943 cm⁴, Iz 142.4 cm⁴, Wel 194.3 and 28.47 cm³, Wpl 220.6 and 44.61 cm³.
    [Fact]
    public void A_rolled_beam_has_the_tabulated_values()
    {
        var p = SectionProperties.Of(new OpenProfile(OpenShape.I, 0.200, 0.100, 0.0056, 0.0085, 0.012));

        Printed.Agrees("28.5", p.Area * 1e4, "A");
        Printed.Agrees("1943", p.Iy * 1e8, "Iy");
        Printed.Agrees("142.4", p.Iz * 1e8, "Iz");
        Printed.Agrees("194.3", p.WelY * 1e6, "Wel,y");
        Printed.Agrees("28.47", p.WelZ * 1e6, "Wel,z");
        Printed.Agrees("220.6", p.WplY * 1e6, "Wpl,y");
        Printed.Agrees("44.61", p.WplZ * 1e6, "Wpl,z");
    }

    // Thin-wall theory (any text): e = 3b²tf/(6b·tf + h·tw) outside the web's middle line, b and h of the middle line; J = Σbt³/3.
    [Fact]
    public void A_thin_channel_has_the_known_shear_centre_and_torsion_constant()
    {
        var section = new OpenProfile(OpenShape.U, 0.100, 0.050, 0.002, 0.002);
        var p = SectionProperties.Of(section);
        var (b, h, t) = (0.049, 0.098, 0.002);

        var e = 3 * b * b * t / (6 * b * t + h * t);

        Assert.Equal(e, section.CentroidY * -1 + 0.001 - p.ShearCentreY, 2e-3 * e);
        Assert.Equal(0, p.ShearCentreZ);
        Assert.Equal(1, p.J!.Value / p.JThinWall!.Value, 0.01);
        Assert.Equal((2 * b + h) * t * t * t / 3, p.JThinWall!.Value, 1e-15);
    }

    // Thin-wall theory: the shear centre of an angle is where the middle lines of its legs meet.
    [Fact]
    public void A_thin_angle_has_its_shear_centre_where_its_legs_meet()
    {
        var section = new OpenProfile(OpenShape.L, 0.100, 0.080, 0.002, 0.002);
        var p = SectionProperties.Of(section);

        Assert.Equal(0.001 - section.CentroidY, p.ShearCentreY, 2e-4);
        Assert.Equal(0.001 - section.CentroidZ, p.ShearCentreZ, 2e-4);
    }

    // An equal angle 100 × 100 × 10 mm by hand. A = 10·100 + 90·10 = 1900 mm²; centroid (1000·5 + 900·55)/1900 = 28.684 mm from either back.
    // I = 100·10³/12 + 1000·(50 − 28.684)² … about either axis; Iyz from the two rectangles; principal axes at 45°.
    [Fact]
    public void An_angle_bends_about_its_principal_axes()
    {
        const double C = 28.68421052631579;                                        // mm

        var leg1 = (Area: 1000.0, Y: 5 - C, Z: 50 - C);
        var leg2 = (Area: 900.0, Y: 55 - C, Z: 5 - C);
        var i = 10 * 1e6 / 12 + leg1.Area * leg1.Z * leg1.Z + 90 * 1e3 / 12 + leg2.Area * leg2.Z * leg2.Z;
        var product = leg1.Area * leg1.Y * leg1.Z + leg2.Area * leg2.Y * leg2.Z;   // mm⁴, negative
        var (strong, weak) = (i - product, i + product);
        var section = new OpenProfile(OpenShape.L, 0.1, 0.1, 0.01, 0.01);
        var field = Samples.Field(section, ShearModel.Elementary);
        var moment = 1e6;                                                          // N·mm about y

        // u at 45° from y towards z: strong for a product below zero. M·cos 45° about u, −M·sin 45° about v.
        double Sigma(double y, double z)
        {
            var (u, v) = ((y + z) * Math.Sqrt(0.5), (z - y) * Math.Sqrt(0.5));
            return moment * Math.Sqrt(0.5) * (v / strong + u / weak);
        }

        var p = field.Properties;
        Assert.Equal(i * 1e-12, p.Iy, 1e-12 * i * 1e-12);
        Assert.Equal(product * 1e-12, p.Iyz, 1e-12 * i * 1e-12);
        Assert.Equal(weak * 1e-12, p.IMin, 1e-12 * i * 1e-12);
        Assert.Equal(strong * 1e-12, p.IMax, 1e-12 * i * 1e-12);
        Assert.Equal(Math.PI / 4, p.PrincipalAngle, 1e-9);
        foreach (var (y, z) in new[] { (-C, 100 - C), (-C, -C), (100 - C, -C), (10 - C, 10 - C) })
            Assert.Equal(Sigma(y, z), field.At(new SectionForces(0, 0, 0, 0, 1000, 0), y / 1000, z / 1000).Sigma / 1e6, 1e-6);
        var largest = field.Govern(new SectionForces(0, 0, 0, 0, 1000, 0), StressMeasure.AbsoluteSigma);
        Assert.Equal(Sigma(10 - C, 100 - C), largest.Value / 1e6, 1e-6);
    }

    [Theory]
    [MemberData(nameof(Numbers))]
    public void Elasticity_gives_back_all_six_section_forces(int number)
    {
        foreach (var poisson in new[] { 0, 0.3, 0.49 })
        {
            var field = Samples.Field(ProfileSamples.All[number], ShearModel.Elasticity, poisson);

            Assert.True(field.Closure.LargestError <= 1e-5, $"{field.Section.Designation}: {field.Closure}");
        }
    }

    [Theory]
    [MemberData(nameof(Numbers))]
    public void No_point_of_the_section_exceeds_the_governing_one(int number)
    {
        var section = ProfileSamples.All[number];
        var random = new Random(40 + number);
        foreach (var model in section is OpenProfile ? new[] { ShearModel.Elementary, ShearModel.Elasticity } : [ShearModel.Elasticity])
        {
            var field = Samples.Field(section, model);
            (double Y, double Z)[] points = [.. Samples.Points(field, random, 6000).Concat(EdgePoints(section)).Where(at => field.Contains(at.Y, at.Z) && field.Decides(at.Y, at.Z))];
            for (var state = 0; state < 12; state++)
            {
                var forces = Samples.Forces(field, random);
                foreach (var measure in Enum.GetValues<StressMeasure>())
                {
                    var found = field.Govern(forces, measure);
                    var brute = points.Max(at => Math.Abs(Of(measure, field.At(forces, at.Y, at.Z))));

                    Assert.True(field.Contains(found.Y, found.Z) && field.Decides(found.Y, found.Z), $"{section.Designation} {found}");
                    Assert.True(Math.Abs(found.Value) >= brute * (1 - 1e-3), $"{section.Designation} {model} {measure}: {found.Value} at {found.Y}, {found.Z} ({found.Place}) against {brute}");
                    Assert.NotEmpty(found.Place);
                }
            }
        }
    }

    // Equilibrium of the hand calculation: the flow of a web adds up to the shear force along it.
    [Fact]
    public void The_web_of_an_elementary_beam_carries_nearly_all_of_the_shear_along_it()
    {
        var field = Samples.Field(new OpenProfile(OpenShape.I, 0.2, 0.1, 0.006, 0.009), ShearModel.Elementary);
        var sum = 0.0;
        for (var k = 0; k < 1000; k++) sum += field.At(new SectionForces(0, 0, 1, 0, 0, 0), 0, -0.091 + 0.182 * (k + 0.5) / 1000).TauXZ * 0.006 * 0.182 / 1000;

        Assert.InRange(sum, 0.93, 1.0);
        Assert.InRange(field.Closure.Vy, 0.99, 1.01);
    }

    [Fact]
    public void Dimensions_that_make_no_profile_are_refused()
    {
        Assert.Equal(SectionFaultKind.WallOverRadius, OpenProfile.Fault(OpenShape.I, 0.1, 0.1, 0.005, 0.05)!.Kind);
        Assert.Equal(SectionFaultKind.WallOverRadius, OpenProfile.Fault(OpenShape.L, 0.1, 0.1, 0.1, 0.1)!.Kind);
        Assert.Equal(SectionFaultKind.NotPositive, OpenProfile.Fault(OpenShape.L, 0.1, 0.1, 0.01, 0.02)!.Kind);
        Assert.Equal(SectionFaultKind.NotPositive, OpenProfile.Fault(OpenShape.U, double.NaN, 0.1, 0.01, 0.02)!.Kind);
        Assert.Equal(SectionFaultKind.NotPositive, OpenProfile.Fault(OpenShape.U, 0.1, 0.1, 0.01, 0.02, -1)!.Kind);
        Assert.Equal(SectionFaultKind.RadiusTooLarge, OpenProfile.Fault(OpenShape.T, 0.1, 0.1, 0.01, 0.02, 0.05)!.Kind);
        Assert.Null(OpenProfile.Fault(OpenShape.T, 0.1, 0.1, 0.01, 0.02, 0.04));
    }

    private static double Of(StressMeasure measure, StressState state) => measure switch
    {
        StressMeasure.VonMises => state.VonMises,
        StressMeasure.Tresca => state.Tresca,
        StressMeasure.AbsoluteSigma => state.Sigma,
        StressMeasure.Tau => state.Tau,
        StressMeasure.Sigma1 => state.Sigma1,
        _ => state.Sigma3,
    };

    private static IEnumerable<(double Y, double Z)> EdgePoints(CrossSection section)
    {
        var edges = section is OpenProfile profile ? profile.Edges : ((OutlineSection)section).Edges;
        return edges.SelectMany(edge => Enumerable.Range(0, 101).Select(k => edge.At(k / 100.0)));
    }
}
