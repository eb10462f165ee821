using System.Globalization;
using AngleSharp.Dom;
using AngleSharp.Html.Parser;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Display;
using MemberScan.Reporting.Sheets;
using MemberScan.Screening.Record;
using MemberScan.Screening.Sheets;

namespace MemberScan.Reporting.Tests.Sheets;

public sealed class MemberSheetTests
{
    private static IDocument Page(string sample, MemberResult member) =>
        new HtmlParser().ParseDocument(SheetPage.Render(Screened.Of(sample).Record, member, Screened.Of(sample).Sheets));

    [Theory]
    [MemberData(nameof(Screened.Samples), MemberType = typeof(Screened))]
    public void Shows_the_numbers_of_the_run_record(string sample)
    {
        foreach (var member in Screened.Of(sample).Record.Members.Where(m => m.Governing is not null))
        {
            var (sheet, g) = (Page(sample, member).QuerySelector("article.sheet")!, member.Governing!);
            var text = sheet.TextContent;

            Assert.Equal(Figures.Utilization(g.Utilization), sheet.QuerySelector("summary .u")!.TextContent);
            Assert.Contains($"{ShownUnit.Stress.WithUnit(g.Stress)} against {ShownUnit.Stress.WithUnit(g.Limit)}", text, StringComparison.Ordinal);
            var forces = Table(sheet, "Section forces at the station").Select(r => r[1]);
            Assert.Equal(Enum.GetValues<ForceComponent>().Select(c => ShownUnit.Of(SheetWords.Unit(c)).WithUnit(SituationLine.Value(g.Forces, c))), forces);
            var state = g.Point.State;
            Assert.Equal(
                new[] { state.Sigma, state.TauXY, state.TauXZ, state.Tau, state.VonMises, state.Sigma1, state.Sigma3 }.Select(ShownUnit.Stress.WithUnit),
                Table(sheet, "Stresses at the point").Select(r => r[1]));
            Assert.Equal(g.Trace.Select(l => ShownUnit.Of(l.Unit).WithUnit(l.Value)), Table(sheet, "Calculation").Select(r => r[2]));
            Assert.Equal(g.Trace.Select(l => l.Source), Table(sheet, "Calculation").Select(r => r[3]));
            Assert.Equal(member.Situations.Select(s => s.Utilization is { } u ? Figures.Utilization(u) : "none"), Table(sheet, "Situations, worst first").Select(r => r[0]));
        }
    }

    // The text alone: σ, τxy, τxz and the limit as printed, von Mises worked here.
    [Theory]
    [MemberData(nameof(Screened.Samples), MemberType = typeof(Screened))]
    public void Lets_the_utilization_be_worked_out_again_from_its_text_within_half_a_percent(string sample)
    {
        foreach (var member in Screened.Of(sample).Record.Members.Where(m => m.Verdict == Verdict.Overstressed))
        {
            var sheet = Page(sample, member).QuerySelector("article.sheet")!;
            double Of(string symbol) => Table(sheet, "Calculation").Where(r => r[0] == symbol).Select(r => Number(r[2])).Last();

            var equivalent = Math.Sqrt(Of("σ") * Of("σ") + 3 * (Of("τxy") * Of("τxy") + Of("τxz") * Of("τxz")));
            var parts = Table(sheet, "What each force gives at the governing point [MPa]").Select(r => r[2]).ToList();
            var limit = Number(sheet.QuerySelectorAll("dd").Single(d => d.TextContent.Contains(" against ", StringComparison.Ordinal)).TextContent.Split(" against ")[1]);

            Assert.InRange(equivalent / limit / member.Governing!.Utilization, 0.995, 1.005);
            Assert.Equal(Of("σ"), parts.Take(6).Sum(Number), 0.02 + 0.001 * Math.Abs(Of("σ")));
        }
    }

    [Theory]
    [MemberData(nameof(Screened.Samples), MemberType = typeof(Screened))]
    public void Gives_every_value_in_us_units_too(string sample)
    {
        // 1 ksi = 6.894757 MPa, 1 kip = 4.448222 kN, 1 kip·in = 0.1129848 kN·m (NIST SP 811, appendix B.8).
        foreach (var member in Screened.Of(sample).Record.Members.Where(m => m.Verdict == Verdict.Overstressed))
        {
            var sheet = Page(sample, member).QuerySelector("article.sheet")!;
            foreach (var row in Table(sheet, "Stresses at the point")) Assert.Equal(Number(row[1]) / 6.894757, Number(row[2]), 1e-3 * Math.Abs(Number(row[2])) + 1e-9);
            var forces = Table(sheet, "Section forces at the station");
            for (var i = 0; i < 6; i++)
                Assert.Equal(Number(forces[i][1]) / (i < 3 ? 4.448222 : 0.1129848), Number(forces[i][2]), 1e-3 * Math.Abs(Number(forces[i][2])) + 1e-9);
        }
    }

    [Fact]
    public void Draws_contours_arrows_circles_elements_lines_and_axes_without_a_script()
    {
        var member = Screened.Of("gangway-rails").Record.Members.First(m => m.Tag == "P-06");

        var page = Page("gangway-rails", member);

        Assert.Empty(page.QuerySelectorAll("script, [style], [onclick]"));
        Assert.Equal(3, page.QuerySelectorAll(".field input[type=radio]").Length);
        Assert.All(new[] { "vm", "sg", "ta" }, layer => Assert.True(page.QuerySelectorAll($".field .layer.{layer} path").Length >= 4));
        Assert.Single(page.QuerySelectorAll(".field .neutral"));
        Assert.Equal(3, page.QuerySelectorAll(".alone svg").Length);
        Assert.Equal(3, page.QuerySelectorAll(".mohr").Length);
        Assert.Equal(2, page.QuerySelectorAll(".element").Length);
        Assert.Equal(2, page.QuerySelectorAll(".along svg").Length);
        Assert.Single(page.QuerySelectorAll(".axes svg .bar"));
        Assert.Equal(page.All.Count(e => e.HasAttribute("id")), page.All.Where(e => e.HasAttribute("id")).Select(e => e.Id).Distinct().Count());
    }

    [Theory]
    [InlineData("<script>alert(1)</script>")]
    [InlineData("\"><img src=x onerror=alert(1)>")]
    [InlineData("</svg></style><script>1</script>")]
    [InlineData("javascript:alert(1)|,\u0001\u0009")]
    public void Shows_a_hostile_name_as_the_text_it_is(string hostile)
    {
        var outcome = Screened.Of("gangway-rails");
        var first = outcome.Record.Members.First(m => m.Tag == "P-06");
        var member = first with
        {
            Identity = first.Identity with { Name = hostile, Tag = hostile, Storey = hostile },
            Material = hostile,
            Notes = [hostile],
        };
        var record = outcome.Record with { Members = [.. outcome.Record.Members.Select(m => ReferenceEquals(m, first) ? member : m)] };

        var page = new HtmlParser().ParseDocument(SheetPage.Render(record, member, outcome.Sheets));

        Assert.Empty(page.QuerySelectorAll("script, img, [src], [onerror]"));
        Assert.Equal(ForeignText.Name(hostile), page.QuerySelector("summary h3 bdi")!.TextContent);
        Assert.DoesNotContain(SheetText.Lines(member, outcome.Sheets), l => l.Any(char.IsControl));
    }

    [Fact]
    public void Says_on_the_terminal_what_the_page_says()
    {
        var outcome = Screened.Of("gangway-rails");
        var member = outcome.Record.Members.First(m => m.Tag == "P-06");

        var lines = SheetText.Lines(member, outcome.Sheets).ToList();

        var sheet = Page("gangway-rails", member).QuerySelector("article.sheet")!;
        foreach (var row in Table(sheet, "Calculation"))
            Assert.Contains(lines, l => l.StartsWith($"  {row[0]} = {row[2]}", StringComparison.Ordinal) && l.Contains(row[1], StringComparison.Ordinal) && l.EndsWith($"[{row[3]}]", StringComparison.Ordinal));
        foreach (var row in Table(sheet, "Section forces at the station")) Assert.Contains(lines, l => l.Contains(row[0], StringComparison.Ordinal) && l.Contains($"{row[1]} ({row[2]})", StringComparison.Ordinal));
    }

    private static List<string[]> Table(IElement sheet, string caption) =>
    [
        .. sheet.QuerySelectorAll("table").Single(t => t.QuerySelector("caption")?.TextContent == caption)
            .QuerySelectorAll("tbody tr").Select(r => r.Children.Select(c => c.TextContent.Trim()).ToArray()),
    ];

    private static double Number(string text)
    {
        var plain = text.Split('\u00A0')[0].Replace("\u202F", "", StringComparison.Ordinal).Replace('\u2212', '-');
        return plain == "≈" ? 0 : double.Parse(plain, CultureInfo.InvariantCulture);
    }
}
