using MemberScan.Checks.Threads;
using MemberScan.Foundation.Units;
using MemberScan.Model;

namespace MemberScan.Checks.Tests.Threads;

public sealed class ThreadDesignationTests
{
    [Theory]
    [InlineData("M6", 20.1)]
    [InlineData("M8", 36.6)]
    [InlineData("M10", 58.0)]
    [InlineData("M12", 84.3)]
    [InlineData("M16", 157)]
    [InlineData("M20", 245)]
    [InlineData("M24", 353)]
    [InlineData("M30", 561)]
    [InlineData("M36", 817)]
    public void Metric_stress_areas_are_the_tabulated_ones(string text, double areaMm2)
    {
        // ISO 898-1, table of nominal stress areas, from memory; three digits are printed.
        Assert.Equal(1, Thread(text).StressArea / Si.Mm2(areaMm2), 0.0025);
    }

    [Theory]
    [InlineData("1/4\"", 0.0318, 0.027)]
    [InlineData("3/8-16", 0.0775, 0.068)]
    [InlineData("1/2\"", 0.1419, 0.126)]
    [InlineData("5/8\"", 0.226, 0.202)]
    [InlineData("3/4\"", 0.334, 0.302)]
    [InlineData("7/8\"", 0.462, 0.419)]
    [InlineData("1\"", 0.606, 0.551)]
    [InlineData("1 1/4\"", 0.969, 0.890)]
    [InlineData("1 1/2\"", 1.405, 1.294)]
    public void Unified_areas_are_the_tabulated_ones(string text, double stress, double root)
    {
        // AISC Steel Construction Manual Table 7-17 and ASME B1.1, from memory; tolerance a unit and a half of the last printed digit.
        var thread = Thread(text);

        Assert.Equal(stress, thread.StressArea / (Si.Inch * Si.Inch), stress < 0.2 ? 0.00015 : 0.001);
        Assert.Equal(root, thread.RootArea / (Si.Inch * Si.Inch), 0.0005);
    }

    [Fact]
    public void The_root_of_m12_is_9_853_mm()
    {
        // ISO 724 and ISO 898-1: d3 = 12 − 1.22687·1.75 = 9.853 mm, by hand; d2 = 10.863 mm.
        Assert.Equal(9.853, Thread("M12").RootDiameter * 1e3, 3);
        Assert.Equal(10.863, Thread("M12").PitchDiameter * 1e3, 3);
    }

    private static ThreadDesignation Thread(string text) => Assert.IsType<Finding<ThreadDesignation>.Found>(ThreadText.Find(text, "name")).Value;
}
