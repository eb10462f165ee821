using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Tests.Checking;

/// <summary>Members of rolled and drawn sections: which shear model, about which line torsion is taken, what bars a verdict.</summary>
public sealed class GeneralSectionTests
{
    private const string Angle = "IFCLSHAPEPROFILEDEF(.AREA.,$,$,80.,60.,8.,$,$,$)";

    private const string Zed = "IFCZSHAPEPROFILEDEF(.AREA.,$,$,150.,60.,5.,6.,$,$)";

    private const double Service = 235e6 / 1.67;

    [Fact]
    public void A_rolled_I_is_checked_by_the_elementary_model_with_its_table_values()
    {
        // IPE 200 of EN 10365 (from memory): A = 28.5 cm², Wel,y = 194 cm³.
        var member = Screen("IFCISHAPEPROFILEDEF(.AREA.,'IPE 200',$,100.,200.,5.6,8.5,12.,$,$)", new(20e3, 0, 0, 0, 10e3, 0));

        Assert.Equal(Verdict.WithinLimit, member.Verdict);
        Assert.Equal("elementary", member.Governing!.ShearModel);
        Assert.Equal((20e3 / 28.5e-4 + 10e3 / 194e-6) / Service, member.Governing.Utilization, 0.005);
        Assert.Contains(member.Notes, n => n.Contains("lateral-torsional buckling", StringComparison.Ordinal));
    }

    [Fact]
    public void Torsion_about_no_said_line_bars_a_verdict_where_shear_centre_and_centroid_differ()
    {
        var member = Screen(Angle, new(1e3, 0, 200, 5, 0, 0));

        Assert.Equal((Verdict.NotChecked, ReasonCode.ConventionUnknown), (member.Verdict, member.Reason!.Code));

        // N and bending alone are a lower bound, enough to call a member overstressed.
        Assert.True(member.Governing!.Stress > 1e3 / 1056e-6);
        Assert.Equal((0, 0, 0), (member.Governing.Forces.Vy, member.Governing.Forces.Vz, member.Governing.Forces.T));
        Assert.Equal(Verdict.Overstressed, Screen(Angle, new(500e3, 0, 200, 5, 0, 0)).Verdict);
    }

    [Fact]
    public void Torsion_about_the_centroid_is_moved_to_the_shear_centre()
    {
        var properties = SectionProperties.Of(new OpenProfile(OpenShape.L, 0.08, 0.06, 0.008, 0.008));
        var moved = 5 - (properties.ShearCentreY * 200 - properties.ShearCentreZ * 100);

        var centroid = Screen(Angle, new(1e3, 100, 200, 5, 0, 0), "# torsion: centroid\n");
        var centre = Screen(Angle, new(1e3, 100, 200, moved, 0, 0), "# torsion: shear-centre\n");

        Assert.Equal(centre.Governing!.Utilization, centroid.Governing!.Utilization, 1e-9);
        Assert.Equal(moved, centroid.Governing.Forces.T, 1e-9);
        Assert.Contains(centroid.Notes, n => n.StartsWith("T is moved from the centroid to the shear centre", StringComparison.Ordinal));
        Assert.Equal(Verdict.WithinLimit, centre.Verdict);
    }

    [Fact]
    public void An_outline_without_an_elementary_rule_is_decided_by_the_elastic_field_and_says_so()
    {
        // A Z is symmetric about its centroid: T needs no line. A = 1410 mm².
        var member = Screen(Zed, new(50e3, 0, 0, 0, 0, 0));

        Assert.Equal(Verdict.WithinLimit, member.Verdict);
        Assert.Equal("elasticity", member.Governing!.ShearModel);
        Assert.Equal(50e3 / 1410e-6 / Service, member.Governing.Utilization, 1e-4);
        Assert.Contains("no elementary shear model for this outline; decided by the elasticity model", member.Notes);
    }

    [Fact]
    public void Bending_of_a_Z_counts_its_product_of_inertia()
    {
        // By hand, in mm about the centroid: flanges 55 × 6 and web 150 × 5. Iy = 5·150³/12 + 2·(55·6³/12 + 330·72²), Iz = 150·5³/12 + 2·(6·55³/12 + 330·30²),
        // Iyz = 2·330·30·(−72); the fibre that N = 0, My = 1 kN·m stresses most is sought over the eight corners.
        var (iy, iz, iyz) = (5 * Math.Pow(150, 3) / 12 + 2 * (55 * 216 / 12.0 + 330.0 * 72 * 72), 150 * 125 / 12.0 + 2 * (6 * Math.Pow(55, 3) / 12 + 330.0 * 900), -2 * 330.0 * 30 * 72);
        (double Y, double Z)[] corners = [(-2.5, -75), (57.5, -75), (57.5, -69), (2.5, -69), (2.5, 75), (-57.5, 75), (-57.5, 69), (-2.5, 69)];
        var largest = corners.Max(c => Math.Abs((iz * c.Z - iyz * c.Y) * 1e6 / (iy * iz - iyz * iyz)));

        var member = Screen(Zed, new(0, 0, 0, 0, 1e3, 0));

        Assert.Equal(ReasonCode.SlenderWall, member.Reason!.Code);
        Assert.Equal(largest * 1e6, member.Governing!.Stress, 1e-3 * largest * 1e6);
        Assert.Contains(member.Governing.Trace, line => line.Symbol == "Iyz");
    }

    [Fact]
    public void The_record_keeps_the_outline_of_a_section_in_use_for_drawings()
    {
        var diagnostics = new DiagnosticList();
        var record = Landing.Run(Model(Angle), diagnostics, tables: [Table(new(1e3, 0, 0, 0, 0, 0), "")])!.Record;

        var section = Assert.Single(record.Sections);
        Assert.Equal(6, Assert.Single(section.Rings).Length);
        Assert.True(section.Iyz < 0 && section.ShearCentreY < 0 && section.ShearCentreZ < 0);
    }

    private static MemberResult Screen(string profile, SectionForces forces, string directives = "") => Landing.ScreenOne(Model(profile), Table(forces, directives));

    private static string Table(SectionForces forces, string directives)
    {
        // Shear with the moments that belong to it, so that the stretch is linear.
        var end = forces with { My = forces.My + forces.Vz, Mz = forces.Mz - forces.Vy };
        return Landing.Table(directives, Landing.Post, ("S1", "service", 0, forces), ("S1", "service", 1, end));
    }

    private static byte[] Model(string profile)
    {
        var text = Encoding.ASCII.GetString(Landing.OnePost());
        const string Tube = "IFCCIRCLEHOLLOWPROFILEDEF(.AREA.,$,$,24.15,3.2)";
        Assert.Contains(Tube, text, StringComparison.Ordinal);
        return Encoding.ASCII.GetBytes(text.Replace(Tube, profile, StringComparison.Ordinal));
    }
}
