using MemberScan.Checks.Aisc360;
using MemberScan.Checks.Aisc360.Stresses;
using MemberScan.Checks.Allowable;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.Aisc360.Stresses;

/// <summary>A gangway post of pipe 1.900 × 0.145 in, Fy = 35 ksi, under a force at 42 in above its base.</summary>
public sealed class PipePostTests
{
    private static readonly Tube s_nominal = new(Si.In(1.900) / 2, Si.In(0.145));
    private static readonly double s_fy = Si.Ksi(35);

    [Fact]
    public void On_the_nominal_wall_200_lbf_are_1_229_of_fy_over_1_67_and_the_plastic_note_is_0_895()
    {
        // By hand: 8400 lbf·in / 0.3262 in³ = 25.75 ksi over 35/1.67 = 20.96 ksi; Z = (1.9³ − 1.61³)/6 = 0.4476 in³.
        var result = AllowableStress.VonMises(ExtremeFibre(s_nominal, 200), s_fy, omega: 1.67);
        var plastic = PlasticRatio.Of(s_nominal, SectionProperties.Of(s_nominal), Forces(200), s_fy / 1.67);

        Assert.Equal(1.229, result.Utilization, 3);
        Assert.Equal(0.895, plastic.Utilization, 3);
    }

    [Theory]
    [InlineData(DesignMethod.Asd, SituationKind.Service, 200, 1.300, 0.952)]
    [InlineData(DesignMethod.Lrfd, SituationKind.Design, 320, 1.384, 1.014)]
    public void On_the_design_wall_the_ratios_are_larger_and_the_wall_is_printed(
        DesignMethod method, SituationKind kind, double pounds, double elastic, double plastic)
    {
        // By hand: t = 0.93·0.145 = 0.13485 in, S = 0.3084 in³, Z = 0.4211 in³ (AISC Manual, Pipe 1 1/2 Std: 0.309 and 0.421, from memory).
        var design = (Tube)DesignWall.Of(s_nominal, DesignWall.Share);
        var words = DesignWall.Words(s_nominal, DesignWall.Share);

        var result = Assert.IsType<CheckResult.Evaluated>(ElasticLimit.Check(ExtremeFibre(design, pounds), s_fy, method, kind, words));
        var ratio = PlasticRatio.Of(design, SectionProperties.Of(design), Forces(pounds), StrengthFactor.Member.Available(s_fy, method));

        Assert.Equal(elastic, result.Utilization, 3);
        Assert.Equal(plastic, ratio.Utilization, 3);
        Assert.Contains("design wall 0.93·3.683 mm = 3.4252 mm", result.Trace[0].Source, StringComparison.Ordinal);
    }

    [Fact]
    public void Forces_of_a_design_situation_are_refused_by_fy_over_1_67()
    {
        var result = ElasticLimit.Check(ExtremeFibre(s_nominal, 320), s_fy, DesignMethod.Asd, SituationKind.Design, "nominal wall");

        Assert.Equal(ReasonCode.KindWithoutLimit, Assert.IsType<CheckResult.NotEvaluated>(result).Why.Code);
    }

    private static SectionForces Forces(double pounds) => new(0, 0, Si.Lbf(pounds), 0, Si.LbfIn(pounds * 42), 0);

    private static StressState ExtremeFibre(Tube tube, double pounds)
    {
        Assert.True(StressField.TryCreate(tube, ShearModel.Elementary, poisson: 0.3, out var field, out _));
        return field.Govern(Forces(pounds), StressMeasure.VonMises).State;
    }
}
