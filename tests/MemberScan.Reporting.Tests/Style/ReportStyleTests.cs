using System.Globalization;
using System.Text.RegularExpressions;
using MemberScan.Reporting.Style;

namespace MemberScan.Reporting.Tests.Style;

public sealed class ReportStyleTests
{
    private static readonly string s_text = ReportStyle.For(FerryLanding.Small()).Text;

    // Relative luminance and contrast ratio: Web Content Accessibility Guidelines 2.1, success criterion 1.4.3: at least 4.5 for text.
    [Theory]
    [InlineData("ink", "paper")]
    [InlineData("soft", "paper")]
    [InlineData("within", "paper")]
    [InlineData("over", "paper")]
    [InlineData("over", "over-band")]
    [InlineData("open", "paper")]
    [InlineData("link", "paper")]
    public void Sets_text_that_stands_out_from_its_ground(string text, string ground)
    {
        var (a, b) = (Luminance(text), Luminance(ground));

        Assert.True((Math.Max(a, b) + 0.05) / (Math.Min(a, b) + 0.05) >= 4.5);
    }

    [Fact]
    public void Holds_nothing_that_ends_its_element_or_loads_a_file()
    {
        Assert.DoesNotContain("<", s_text, StringComparison.Ordinal);
        Assert.DoesNotContain("\r", s_text, StringComparison.Ordinal);
        Assert.All(Regex.Matches(s_text, @"url\(([^)]*)\)").Select(m => m.Groups[1].Value), target => Assert.StartsWith("#", target, StringComparison.Ordinal));
    }

    [Fact]
    public void Prints_file_run_and_page_number_in_the_margins()
    {
        Assert.Contains("@top-left { content: \"ferry-landing-east.ifc\"; }", s_text, StringComparison.Ordinal);
        Assert.Contains("@top-right { content: \"Run 5f1d0c2ab97e4438\"; }", s_text, StringComparison.Ordinal);
        Assert.Contains("counter(page) \" of \" counter(pages)", s_text, StringComparison.Ordinal);
    }

    private static double Luminance(string name)
    {
        var hex = Regex.Match(s_text, $"--{name}: #([0-9a-f]{{6}});").Groups[1].Value;
        var channels = Enumerable.Range(0, 3).Select(i => int.Parse(hex.AsSpan(2 * i, 2), NumberStyles.HexNumber, CultureInfo.InvariantCulture) / 255.0)
            .Select(c => c <= 0.03928 ? c / 12.92 : Math.Pow((c + 0.055) / 1.055, 2.4)).ToArray();
        return 0.2126 * channels[0] + 0.7152 * channels[1] + 0.0722 * channels[2];
    }
}
