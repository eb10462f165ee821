using System.Globalization;
using MemberScan.Checks.Threads;
using MemberScan.Foundation.Units;
using MemberScan.Model;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.Threads;

public sealed class ThreadTextTests
{
    [Theory]
    [InlineData("M12", "M12x1.75")]
    [InlineData("M12x1.75", "M12x1.75")]
    [InlineData("M12×1.25", "M12x1.25")]
    [InlineData("Hanger rod M 10 L=800", "M10x1.5")]
    [InlineData("Gewindestange M8x1,25 verzinkt", "M8x1.25")]
    [InlineData("M12x80", "M12x1.75")]
    [InlineData("M16 x 2 x 450", "M16x2")]
    [InlineData("M12, hanger M12", "M12x1.75")]
    [InlineData("3/8-16 UNC", "3/8-16")]
    [InlineData("3/8\"-16", "3/8-16")]
    [InlineData("rod 3/8\" - 16 UNC x 4 ft", "3/8-16")]
    [InlineData("1/2\"", "1/2-13")]
    [InlineData("1/2 in", "1/2-13")]
    [InlineData("1/2-13", "1/2-13")]
    [InlineData("1/2-20 UNF", "1/2-20")]
    [InlineData("1 1/4-7 UNC", "1 1/4-7")]
    [InlineData("1-1/4\"", "1 1/4-7")]
    [InlineData("0.375-16 UNC", "3/8-16")]
    [InlineData("1\"-8 UNC", "1-8")]
    public void A_designation_is_found_in_its_text(string text, string thread)
    {
        var found = Assert.IsType<Finding<ThreadDesignation>.Found>(ThreadText.Find(text, "name"));

        Assert.Equal(thread, found.Value.ToString());
        Assert.Equal("name", found.Source);
    }

    [Theory]
    [InlineData("")]
    [InlineData("Hanger rod")]
    [InlineData("rod 10 mm")]
    [InlineData("1/2")]
    [InlineData("ROOM12")]
    [InlineData("M12 or M16")]
    [InlineData("M12, 1/2\"")]
    [InlineData("M11")]
    [InlineData("M0")]
    [InlineData("M12x0.01")]
    [InlineData("M12x9")]
    [InlineData("0/8-16")]
    [InlineData("3/0-16")]
    [InlineData("3/8-1")]
    [InlineData("5/7\"")]
    [InlineData("2024-12")]
    public void What_names_no_thread_or_two_is_unknown_and_says_the_remedy(string text)
    {
        var missing = Assert.IsType<Finding<ThreadDesignation>.Missing>(ThreadText.Find(text, "name"));

        Assert.Equal(ReasonCode.ThreadUnknown, missing.Why.Code);
        Assert.Contains("give the thread as M12", missing.Why.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_text_beyond_the_limit_is_not_searched()
    {
        Assert.IsType<Finding<ThreadDesignation>.Missing>(ThreadText.Find("M12 " + new string('x', ThreadText.LongestText), "name"));
        Assert.IsType<Finding<ThreadDesignation>.Found>(ThreadText.Find("M12 " + new string('-', ThreadText.LongestText - 4), "name"));
    }

    [Fact]
    public void The_culture_does_not_matter()
    {
        var before = CultureInfo.CurrentCulture;
        CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
        try
        {
            var found = Assert.IsType<Finding<ThreadDesignation>.Found>(ThreadText.Find("M8x1.25", "name"));
            Assert.Equal(Si.Mm(1.25), found.Value.Pitch, 12);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}
