using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Checking;

namespace MemberScan.Screening.Tests.Checking;

/// <summary>Section with its shear centre at (10, −20) mm from the centroid: T_S = T − (y_S·Vz − z_S·Vy), engineering convention of the product.</summary>
public sealed class TorsionMoveTests
{
    private static readonly Rectangle s_shape = new(0.040, 0.080);

    private static readonly SectionProperties s_properties = SectionProperties.Of(s_shape) with { ShearCentreY = 0.010, ShearCentreZ = -0.020 };

    [Fact]
    public void A_moment_about_the_centroid_is_moved()
    {
        var findings = new SituationFindings(Forces(TorsionAxis.Centroid));

        var moved = TorsionMove.Of(findings.Forces, s_properties, findings, out var isKnown);

        // 5 − (0.010·300 − (−0.020)·200) = 5 − 7 = −2 N·m.
        Assert.True(isKnown);
        Assert.Equal(-2, moved[0].Forces.T, 1e-12);
        Assert.Contains("T is moved from the centroid to the shear centre", Assert.Single(findings.Notes), StringComparison.Ordinal);
    }

    [Fact]
    public void A_moment_about_the_shear_centre_or_in_a_section_of_one_point_stays()
    {
        var (stated, symmetric) = (Forces(TorsionAxis.ShearCentre), Forces(TorsionAxis.NotStated));

        Assert.Equal(stated.Stations, TorsionMove.Of(stated, s_properties, new SituationFindings(stated), out var isKnown));
        Assert.True(isKnown);
        Assert.Equal(symmetric.Stations, TorsionMove.Of(symmetric, SectionProperties.Of(s_shape), new SituationFindings(symmetric), out isKnown));
        Assert.True(isKnown);
    }

    [Fact]
    public void A_source_that_does_not_say_is_not_used()
    {
        var findings = new SituationFindings(Forces(TorsionAxis.NotStated));

        _ = TorsionMove.Of(findings.Forces, s_properties, findings, out var isKnown);

        Assert.False(isKnown);
        Assert.Equal(ReasonCode.ConventionUnknown, Assert.Single(findings.Blockers).Code);
    }

    private static MemberForces Forces(TorsionAxis axis) => new()
    {
        MemberKey = "M",
        Situation = new Situation("S", SituationKind.Service, "", true, ""),
        Stations = [new ForceStation(0, new SectionForces(0, 200, 300, 5, 0, 0))],
        Source = "table",
        TorsionAxis = axis,
    };
}
