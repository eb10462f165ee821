using MemberScan.Checks.Walls;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.Walls;

public sealed class SlenderWallTests
{
    private static readonly double s_fy = Si.MPa(235);

    [Theory]
    [InlineData(235, 1.00)]
    [InlineData(275, 0.92)]
    [InlineData(355, 0.81)]
    [InlineData(460, 0.71)]
    public void Epsilon_is_as_printed_under_table_5_2(double fyMPa, double printed)
    {
        // EN 1993-1-1:2005 Table 5.2, foot line, from memory.
        Assert.Equal(printed, SlenderWall.Epsilon(Si.MPa(fyMPa)), 2);
    }

    [Fact]
    public void Internal_parts_meet_the_printed_limits_of_pure_compression_and_pure_bending()
    {
        // EN 1993-1-1:2005 Table 5.2 sheet 1, class 3, from memory: 42ε in compression, 124ε in bending.
        Assert.Equal(42, SlenderWall.InternalPartLimit(psi: 1, epsilon: 1), 9);
        Assert.Equal(124, SlenderWall.InternalPartLimit(psi: -1, epsilon: 1), 9);
        Assert.Equal(42 / 0.67, SlenderWall.InternalPartLimit(psi: 0, epsilon: 1), 9);
        Assert.Equal(123.5, SlenderWall.InternalPartLimit(psi: -0.999999, epsilon: 1), 1);
        Assert.Equal(62 * 3 * Math.Sqrt(2), SlenderWall.InternalPartLimit(psi: -2, epsilon: 1), 9);
    }

    [Theory]
    [InlineData(90, true)]
    [InlineData(90.1, false)]
    public void A_compressed_tube_is_within_class_3_up_to_90_epsilon_squared(double diameterMm, bool within)
    {
        var tube = new Tube(Si.Mm(diameterMm) / 2, Si.Mm(1));

        var result = SlenderWall.Check(tube, PropertiesOf(tube), new SectionForces(-1000, 0, 0, 0, 0, 0), s_fy);

        AssertWithin(within, result);
    }

    [Theory]
    [InlineData(59.5, true)]
    [InlineData(59.7, false)]
    public void A_tube_of_S355_has_its_limit_at_59_6(double diameterMm, bool within)
    {
        // 90·235/355 = 59.58, by hand.
        var tube = new Tube(Si.Mm(diameterMm) / 2, Si.Mm(1));

        var result = SlenderWall.Check(tube, PropertiesOf(tube), new SectionForces(-1000, 0, 0, 0, 0, 0), Si.MPa(355));

        AssertWithin(within, result);
    }

    [Fact]
    public void A_tube_in_bending_has_a_compressed_side_and_one_in_enough_tension_has_none()
    {
        var tube = new Tube(Si.Mm(100), Si.Mm(1));
        var properties = PropertiesOf(tube);
        var moment = 100.0;
        var balance = moment * tube.OuterRadius / properties.Iy * properties.Area;

        var bent = SlenderWall.Check(tube, properties, new SectionForces(0, 0, 0, 0, 0.6 * moment, -0.8 * moment), s_fy);
        var stretched = SlenderWall.Check(tube, properties, new SectionForces(balance, 0, 0, 0, 0.6 * moment, -0.8 * moment), s_fy);

        AssertWithin(false, bent);
        Assert.Null(stretched);
    }

    [Theory]
    [InlineData(135, true)]
    [InlineData(135.2, false)]
    public void A_box_in_compression_is_within_class_3_up_to_42_epsilon(double sideMm, bool within)
    {
        // c = side − 3t, so c/t = 42 at side = 45t.
        var box = new Box(Si.Mm(sideMm), Si.Mm(60), Si.Mm(3));

        var result = SlenderWall.Check(box, PropertiesOf(box), new SectionForces(-1000, 0, 0, 0, 0, 0), s_fy);

        AssertWithin(within, result);
    }

    [Theory]
    [InlineData(5000, 0)]
    [InlineData(-5000, 0)]
    [InlineData(0, 5000)]
    [InlineData(0, -5000)]
    public void Bending_compresses_the_flange_of_its_side_and_the_wide_one_decides(double my, double mz)
    {
        // Walls 240 and 80 mm wide, 4 mm thick: c/t = 57 > 42 in the wide ones, 17 in the narrow ones.
        var wideAlongY = new Box(Si.Mm(240), Si.Mm(80), Si.Mm(4));

        var result = SlenderWall.Check(wideAlongY, PropertiesOf(wideAlongY), new SectionForces(0, 0, 0, 0, my, mz), s_fy);

        // About y the wide wall is compressed evenly (42ε); about z it is a web in pure bending (124ε).
        AssertWithin(mz != 0, result);
    }

    [Fact]
    public void A_web_under_tension_and_bending_has_psi_below_minus_1_and_a_higher_limit()
    {
        var box = new Box(Si.Mm(60), Si.Mm(200), Si.Mm(4));
        var properties = PropertiesOf(box);
        var bending = Si.KNm(10);

        var result = SlenderWall.Check(box, properties, new SectionForces(Si.KN(20), 0, 0, 0, bending, 0), s_fy);

        var evaluated = Assert.IsType<CheckResult.Evaluated>(result);
        var psi = evaluated.Trace.Single(line => line.Symbol == "ψ").Value;
        var c = Si.Mm(200) - 3 * Si.Mm(4);
        var (axial, end) = (Si.KN(20) / properties.Area, bending * c / 2 / properties.Iy);
        Assert.Equal((axial + end) / (axial - end), psi, 9);
        Assert.True(psi < -1);
        Assert.Equal(47 / (62 * (1 - psi) * Math.Sqrt(-psi)), evaluated.Utilization, 9);
    }

    [Fact]
    public void The_calculation_of_a_wall_names_it_and_shows_its_numbers()
    {
        var box = new Box(Si.Mm(50), Si.Mm(50), Si.Mm(4));

        var result = SlenderWall.Check(box, PropertiesOf(box), new SectionForces(-1000, 0, 0, 0, 0, 0), s_fy);

        var evaluated = Assert.IsType<CheckResult.Evaluated>(result);
        Assert.Equal(["σ1", "σ2", "ψ", "fy", "ε", "c", "c/t", "limit", "utilization"], evaluated.Trace.Select(line => line.Symbol));
        Assert.Equal("side − 3t = 50 − 3·4 mm = 38 mm", evaluated.Trace[5].Formula);
        Assert.Equal("42ε/(0.67 + 0.33ψ) = 42·1/(0.67 + 0.33·1) = 42", evaluated.Trace[7].Formula);
        Assert.Equal(9.5 / 42, evaluated.Utilization, 9);
    }

    [Fact]
    public void A_wall_whose_bending_cancels_its_compression_but_for_rounding_is_not_compressed()
    {
        var box = new Box(Si.Mm(240), Si.Mm(80), Si.Mm(4));
        var properties = PropertiesOf(box);
        var moment = Si.KNm(1.7);
        var tension = moment * (Si.Mm(80) - Si.Mm(4)) / 2 / properties.Iy * properties.Area;

        var result = SlenderWall.Check(box, properties, new SectionForces(tension, 0, 0, 0, moment, 0), s_fy);

        Assert.Null(result);
    }

    [Fact]
    public void Solid_sections_have_no_walls()
    {
        var compression = new SectionForces(-1e6, 0, 0, 0, 0, 0);

        Assert.Null(SlenderWall.Check(new Round(0.01), PropertiesOf(new Tube(0.01, 0.001)), compression, s_fy));
        Assert.Null(SlenderWall.Check(new Rectangle(0.01, 0.1), PropertiesOf(new Tube(0.01, 0.001)), compression, s_fy));
        Assert.Null(SlenderWall.Check(new RoundedRectangle(0.01, 0.1, 0.001), PropertiesOf(new Tube(0.01, 0.001)), compression, s_fy));
    }

    private static void AssertWithin(bool within, CheckResult? result)
    {
        if (within)
        {
            Assert.True(Assert.IsType<CheckResult.Evaluated>(result).Utilization <= 1 + 1e-9);
            return;
        }

        Assert.Equal(ReasonCode.SlenderWall, Assert.IsType<CheckResult.NotEvaluated>(result).Why.Code);
    }

    private static SectionProperties PropertiesOf(Tube tube)
    {
        var (outer, inner) = (tube.OuterRadius, tube.InnerRadius);
        var area = Math.PI * (outer * outer - inner * inner);
        var inertia = Math.PI / 4 * (Math.Pow(outer, 4) - Math.Pow(inner, 4));
        return PropertiesOf(area, inertia, inertia);
    }

    // Sharp corners.
    private static SectionProperties PropertiesOf(Box box)
    {
        var (b, h, bi, hi) = (box.Width, box.Depth, box.Width - 2 * box.Wall, box.Depth - 2 * box.Wall);
        return PropertiesOf(b * h - bi * hi, (b * h * h * h - bi * hi * hi * hi) / 12, (h * b * b * b - hi * bi * bi * bi) / 12);
    }

    private static SectionProperties PropertiesOf(double area, double iy, double iz) => new()
    {
        Area = area,
        Iy = iy,
        Iz = iz,
        Iyz = 0,
        J = null,
        JSource = "not needed here",
        WelY = iy,
        WelZ = iz,
        Extremes = new ExtremeModuli(iy, iy, iz, iz),
        QY = iy / 2,
        QZ = iz / 2,
        WplY = iy,
        WplZ = iz,
        Wt = null,
        JThinWall = null,
        ShearCentreY = 0,
        ShearCentreZ = 0,
    };
}
