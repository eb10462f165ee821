using MemberScan.Checks.En1993;
using MemberScan.Checks.En1993.Sections;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Checks.Tests.En1993.Sections;

public sealed class ClassificationTests
{
    [Theory]
    [InlineData(50, 1)]
    [InlineData(50.1, 2)]
    [InlineData(70, 2)]
    [InlineData(70.1, 3)]
    [InlineData(90, 3)]
    [InlineData(90.1, 4)]
    public void Tubes_change_class_at_50_70_and_90_epsilon_squared(double slenderness, int number)
    {
        // EN 1993-1-1:2005, Table 5.2 sheet 3, from memory; S235, ε = 1.
        var tube = new Tube(Si.Mm(slenderness) / 2, Si.Mm(1));

        Assert.Equal(number, Classification.Of(Cases.Of(tube, 235, nKN: -1)).Number);
        Assert.Equal(number, Classification.Of(Cases.Of(tube, 235, myKNm: 0.01)).Number);
        Assert.Equal(1, Classification.Of(Cases.Of(tube, 235, nKN: 1)).Number);
    }

    [Theory]
    [InlineData(33, 1)]
    [InlineData(33.1, 2)]
    [InlineData(38, 2)]
    [InlineData(38.1, 3)]
    [InlineData(42, 3)]
    [InlineData(42.1, 4)]
    public void Compressed_walls_change_class_at_33_38_and_42_epsilon(double slenderness, int number)
    {
        // Table 5.2 sheet 1, from memory; side = c + 3t.
        var box = new Box(Si.Mm(3 * (slenderness + 3)), Si.Mm(60), Si.Mm(3));

        Assert.Equal(number, Classification.Of(Cases.Of(box, 235, nKN: -1)).Number);
        Assert.Equal(number, Classification.Of(Cases.Of(box, 235, myKNm: 1)).Number);
    }

    [Theory]
    [InlineData(72, 1)]
    [InlineData(72.1, 2)]
    [InlineData(83, 2)]
    [InlineData(83.2, 3)]
    [InlineData(123.9, 3)]
    [InlineData(124.1, 4)]
    public void Webs_in_bending_change_class_at_72_83_and_124_epsilon(double slenderness, int number)
    {
        // α = 0.5: 36/0.5 = 72 and 41.5/0.5 = 83; Table 5.2 sheet 1, from memory. The flanges of c = 51 mm, 3 mm, are of class 1.
        var box = new Box(Si.Mm(60), Si.Mm(3 * (slenderness + 3)), Si.Mm(3));

        Assert.Equal(number, Classification.Of(Cases.Of(box, 235, myKNm: 1)).Number);
    }

    [Fact]
    public void The_limits_of_the_table_meet_at_alpha_one_half_and_1()
    {
        Assert.Equal(33, Classification.InternalPartLimit(1, alpha: 1, psi: 1, epsilon: 1), 12);
        Assert.Equal(38, Classification.InternalPartLimit(2, alpha: 1, psi: 1, epsilon: 1), 12);
        Assert.Equal(72, Classification.InternalPartLimit(1, alpha: 0.5, psi: -1, epsilon: 1), 12);
        Assert.Equal(72, Classification.InternalPartLimit(1, alpha: 0.5000001, psi: -1, epsilon: 1), 3);
        Assert.Equal(82.9, Classification.InternalPartLimit(2, alpha: 0.5000001, psi: -1, epsilon: 1), 1);
    }

    [Fact]
    public void Compression_widens_the_compressed_part_of_a_web()
    {
        // c = 200 − 24 = 176 mm: α = ½(1 + 300000/(2·176·8·355)) = 0.650, by hand.
        var result = Classification.Of(Cases.Of(new Box(Si.Mm(60), Si.Mm(200), Si.Mm(8), Si.Mm(12), Si.Mm(8)), 355, nKN: -300, myKNm: 10));

        Assert.Equal(0.650, result.Lines.Single(l => l.Symbol == "α").Value, 3);
    }

    [Fact]
    public void Bending_about_both_axes_takes_every_wall_as_compressed_evenly()
    {
        var box = new Box(Si.Mm(60), Si.Mm(3 * 53), Si.Mm(3));

        Assert.Equal(1, Classification.Of(Cases.Of(box, 235, myKNm: 1)).Number);
        Assert.Equal(4, Classification.Of(Cases.Of(box, 235, myKNm: 1, mzKNm: 0.1)).Number);
        Assert.Equal(1, Classification.Of(Cases.Of(box, 235, nKN: 100, myKNm: 1, mzKNm: 0.1)).Number);
    }

    [Fact]
    public void Stainless_steel_has_limits_of_its_own()
    {
        // EN 1993-1-4:2006, Table 5.2, from memory: 25.7, 26.7, 30.7 ε with ε = √(235/220·200/210) = 1.0086.
        Assert.Equal(1.0086, Classification.Epsilon(Si.MPa(220), Si.GPa(200), SteelKind.Stainless), 4);
        foreach (var (slenderness, number) in new[] { (25.9, 1), (26.0, 2), (26.9, 2), (27.0, 3), (30.9, 3), (31.0, 4) })
        {
            var box = new Box(Si.Mm(3 * (slenderness + 3)), Si.Mm(60), Si.Mm(3));
            var c = Cases.Of(box, 220, nKN: -1) with { Steel = SteelKind.Stainless, Modulus = Si.GPa(200) };

            Assert.Equal(number, Classification.Of(c).Number);
        }
    }

    [Fact]
    public void Solid_bars_are_of_class_1_whatever_acts() => Assert.Equal(1, Classification.Of(Cases.Of(Cases.Flat20x60, 355, nKN: -100)).Number);
}
