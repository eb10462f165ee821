using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using System.Text.RegularExpressions;
using AngleSharp.Dom;
using AngleSharp.Html.Parser;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Page;
using MemberScan.Reporting.Script;
using MemberScan.Screening.Comparison;
using MemberScan.Screening.Record;
using MemberScan.Screening.Record.Given;

namespace MemberScan.Reporting.Tests;

/// <summary>The page is read back with an independent HTML parser.</summary>
public sealed class HtmlReportTests
{
    [Fact]
    public void Prints_the_three_counts_with_their_sum()
    {
        var page = Parse(FerryLanding.Small());

        Assert.Equal("3 within limit + 2 overstressed + 4 not checked = 9 candidates", page.QuerySelector(".sum")!.TextContent);
    }

    [Fact]
    public void Has_exactly_one_place_for_every_candidate_and_every_link_leads_to_a_place()
    {
        var record = FerryLanding.Small();

        var page = Parse(record);

        Assert.Equal(record.Members.Length, page.QuerySelectorAll("[id^='member-']").Length);
        Assert.All(record.Members, m => Assert.NotNull(page.GetElementById("member-" + m.Key.Replace('/', '-'))));
        Assert.All(page.QuerySelectorAll("a[href]"), a => Assert.NotNull(page.GetElementById(a.GetAttribute("href")![1..])));
        Assert.Equal(page.All.Count(e => e.HasAttribute("id")), page.All.Where(e => e.HasAttribute("id")).Select(e => e.Id).Distinct().Count());
    }

    [Fact]
    public void Asks_nothing_of_the_network_and_runs_only_its_embedded_scripts()
    {
        var page = Parse(FerryLanding.Small());

        Assert.Empty(page.QuerySelectorAll("link, img, iframe, object, embed, base, form, [src], [style], [srcset]"));
        Assert.All(page.QuerySelectorAll("[href]"), e => Assert.StartsWith("#", e.GetAttribute("href"), StringComparison.Ordinal));
        Assert.DoesNotContain(page.All.SelectMany(e => e.Attributes), a => a.Name.StartsWith("on", StringComparison.OrdinalIgnoreCase));
        Assert.Equal(Scripts, page.QuerySelectorAll("script:not([type])").Select(s => s.TextContent));
        Assert.DoesNotContain("://", WithoutScripts(page.Source.Text), StringComparison.Ordinal);
        Assert.DoesNotContain("@import", page.QuerySelector("style")!.TextContent, StringComparison.Ordinal);
    }

    // A policy's hash is that of its element's text (Content Security Policy Level 3, hash-source).
    [Fact]
    public void Allows_its_own_style_sheet_and_scripts_by_hash_and_nothing_else()
    {
        var page = Parse(FerryLanding.Small());

        var style = Hash(Assert.Single(page.QuerySelectorAll("style")).TextContent);
        var scripts = string.Join(' ', page.QuerySelectorAll("script:not([type])").Select(s => Hash(s.TextContent)));
        Assert.Equal(
            $"default-src 'none'; style-src {style}; script-src {scripts}; base-uri 'none'; form-action 'none'",
            page.QuerySelector("meta[http-equiv='Content-Security-Policy']")!.GetAttribute("content"));

        static string Hash(string text) => $"'sha256-{Convert.ToBase64String(SHA256.HashData(Encoding.UTF8.GetBytes(text)))}'";
    }

    [Fact]
    public void Holds_the_view_in_space_and_names_its_licence()
    {
        var page = Parse(FerryLanding.Small());

        Assert.NotNull(PageScripts.Embedded.View);
        Assert.Contains("three.js authors, MIT License", page.QuerySelector("footer")!.TextContent, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("let a = '</script>'")]
    [InlineData("let a = '</SCRIPT '")]
    [InlineData("<!-- x")]
    public void Refuses_a_script_that_would_end_its_element(string script) => Assert.Throws<InvalidOperationException>(() => PageScripts.Element(script));

    [Fact]
    public void Shows_every_number_in_US_units_where_the_settings_ask_for_them()
    {
        var small = FerryLanding.Small();

        var page = Parse(small with { Settings = [.. small.Settings, new SettingLine("display", "us", false)] });

        // 212.6 MPa, 1.250 m, 453.39 mm²; 1 ksi = 6.894757 MPa, 1 ft = 0.3048 m, 1 in = 25.4 mm (NIST SP 811, appendix B).
        var list = page.GetElementById("overstressed")!.ParentElement!;
        Assert.Contains("Stress [ksi]", list.QuerySelector("thead")!.TextContent, StringComparison.Ordinal);
        var cells = list.QuerySelectorAll("tbody tr")[0].Children.Select(c => c.TextContent).ToArray();
        Assert.Equal("30.83", cells[6]);
        Assert.Equal("4.101", cells[8]);
        Assert.Contains("0.7028", page.GetElementById("sections")!.ParentElement!.TextContent, StringComparison.Ordinal);
        Assert.Contains("stress ksi, force kip, moment kip·ft, length ft, cross-section in", page.Body!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Tells_what_changed_since_an_earlier_run()
    {
        var later = FerryLanding.Small();
        var earlier = later with { Members = [.. later.Members.Select(m => m.Key == FerryLanding.RailKey ? FerryLanding.Rail(FerryLanding.RailKey, m.Name, 0.4e3) : m)], Counts = new VerdictCounts(4, 1, 4), RunId = "00000000000000aa" };

        var page = new HtmlParser().ParseDocument(HtmlReport.Render(later, RunComparison.Of(earlier, later)));

        var part = page.GetElementById("changes")!.ParentElement!;
        Assert.Contains("1 became overstressed, 1 still overstressed, 7 unchanged; 1 worse than before", part.TextContent, StringComparison.Ordinal);
        Assert.Contains("▲ worse: became overstressed", part.QuerySelector("tbody tr")!.TextContent, StringComparison.Ordinal);
        Assert.Contains("00000000000000aa", part.TextContent, StringComparison.Ordinal);
        Assert.Null(Parse(later).GetElementById("changes"));
    }

    [Fact]
    public void Has_boxes_for_who_prepared_and_who_checked()
    {
        Assert.Equal(["Prepared by, date", "Checked by, date"], Parse(FerryLanding.Small()).QuerySelectorAll(".boxes > div").Select(b => b.TextContent));
    }

    [Fact]
    public void Groups_what_was_not_checked_by_reason_the_most_frequent_first_with_count_and_request()
    {
        var page = Parse(FerryLanding.Small());

        var headings = page.QuerySelectorAll(".reason h3").Select(h => h.TextContent.Trim());
        Assert.Equal(["◇ no-forces: 2", "◇ section-not-parametric: 1", "◇ thread-unknown: 1"], headings);
        Assert.EndsWith(ReasonCode.NoForces.Request(), page.QuerySelector(".request")!.TextContent, StringComparison.Ordinal);
        var stay = page.GetElementById("member-2O2Fr$t4X7Zf8NOew3FL06")!;
        Assert.Contains("0.883 in Full deck (service)", stay.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Lists_the_largest_utilizations_first_whatever_their_verdict()
    {
        var page = Parse(FerryLanding.Small());

        var rows = page.GetElementById("worst")!.ParentElement!.QuerySelectorAll("tbody tr");
        Assert.Equal(6, rows.Length);
        Assert.StartsWith("1.286", rows[0].TextContent.Trim(), StringComparison.Ordinal);
        Assert.Contains("◇ NOT CHECKED", rows[2].TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Shows_the_calculation_of_an_overstressed_member_line_by_line_in_shown_units()
    {
        var sheet = Parse(FerryLanding.Small()).GetElementById("member-" + FerryLanding.RailKey)!;

        var lines = sheet.QuerySelectorAll(".trace tbody tr").Select(r => string.Join(" | ", r.Children.Select(c => c.TextContent)));
        Assert.Contains("A | input | 453.4\u00A0mm² | closed form of the section | 0.7028\u00A0in²", lines);
        Assert.Contains("Iy | input | 115\u202F900\u00A0mm⁴ | closed form of the section | 0.2784\u00A0in⁴", lines);
        Assert.Contains("σ | N/A + My·z/Iy − Mz·y/Iz | 273.4\u00A0MPa | beam theory | 39.65\u00A0ksi", lines);
        Assert.Contains("fy/Ω | fy/1.67 | 212.6\u00A0MPa | allowable stress | 30.83\u00A0ksi", lines);
        Assert.NotNull(sheet.QuerySelector("svg path.material"));
        Assert.True(sheet.QuerySelector("details")!.HasAttribute("open"));
    }

    [Fact]
    public void Prints_the_cautions_the_scope_and_marks_defaults()
    {
        var record = FerryLanding.Small();

        var page = Parse(record);

        var cautions = page.QuerySelectorAll(".cautions li").Select(c => c.TextContent);
        Assert.Equal(record.Cautions, cautions);
        Assert.Contains("IfcBuildingElementProxy12no bar-like body and no forces", page.GetElementById("scope")!.ParentElement!.TextContent, StringComparison.Ordinal);
        Assert.Contains(page.GetElementById("settings")!.ParentElement!.QuerySelectorAll("tr"), r => r.TextContent == "basis.service.factor1.67default");
        Assert.Contains(page.GetElementById("settings")!.ParentElement!.QuerySelectorAll("tr"), r => r.TextContent == "forces.conventionpositive-facegiven");
    }

    [Fact]
    public void Says_it_where_nothing_was_found()
    {
        var page = Parse(FerryLanding.Record());

        Assert.Equal("0 within limit + 0 overstressed + 0 not checked = 0 candidates", page.QuerySelector(".sum")!.TextContent);
        Assert.Contains("No candidate was found in the model. Nothing was checked.", page.QuerySelector(".alarm")!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Says_it_where_the_model_is_damaged()
    {
        var small = FerryLanding.Small();

        var page = Parse(small with { HasDamage = true, Model = small.Model with { ReadToEnd = false } });

        var alarm = page.QuerySelector(".alarm")!.TextContent;
        Assert.Contains("could not be read to its end", alarm, StringComparison.Ordinal);
        Assert.Contains("Damaged records were passed over", alarm, StringComparison.Ordinal);
    }

    [Fact]
    public void Never_gives_a_verdict_by_colour_alone()
    {
        var page = Parse(FerryLanding.Small());

        Assert.All(page.QuerySelectorAll(".verdict"), v => Assert.Matches("^[●▲◇] ([A-Z ]+|[0-9.]+)$", v.TextContent.Trim()));
    }

    [Fact]
    public void Gives_the_same_text_under_a_culture_with_a_decimal_comma()
    {
        var record = FerryLanding.Small();
        var plain = HtmlReport.Render(record);
        var before = CultureInfo.CurrentCulture;

        string german;
        try
        {
            CultureInfo.CurrentCulture = new CultureInfo("de-DE");
            german = HtmlReport.Render(record);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }

        Assert.Equal(plain, german);
    }

    [Fact]
    public void Gives_a_row_and_no_sheet_to_each_of_twenty_thousand_members_within_their_limit()
    {
        var record = FerryLanding.Large(20_000);

        var text = HtmlReport.Render(record);

        Assert.Equal(400, record.Counts.Overstressed);
        Assert.Equal(record.Members.Length, text.Split("id=\"member-").Length - 1);
        Assert.InRange(Encoding.UTF8.GetByteCount(text), 1, 20_000_000);
    }

    [Fact]
    public void Stops_the_sheets_at_their_limit_and_says_so()
    {
        var members = Enumerable.Range(0, ReportView.LargestNumberOfSheets + 3)
            .Select(i => FerryLanding.Rail("Rail" + i.ToString(CultureInfo.InvariantCulture), "Rail", 1.2e3 + i));

        var page = Parse(FerryLanding.Record([.. members]));

        Assert.Equal(ReportView.LargestNumberOfSheets, page.QuerySelectorAll(".sheet").Length);
        Assert.Equal(ReportView.LargestNumberOfSheets + 3, page.QuerySelectorAll("[id^='member-']").Length);
        Assert.Contains("Sheets follow for the 500 worst of them", page.Body!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Refuses_a_record_whose_counts_are_wrong()
    {
        var record = FerryLanding.Small() with { Counts = new VerdictCounts(4, 1, 4) };

        Assert.Throws<ArgumentException>(() => HtmlReport.Render(record));
    }

    [Fact]
    public void Refuses_a_number_that_is_not_finite()
    {
        var rail = FerryLanding.Rail("Rail", "Rail", 1.32e3);
        var record = FerryLanding.Record(rail with { Governing = rail.Governing! with { Stress = double.NaN } });

        Assert.Throws<ArgumentOutOfRangeException>(() => HtmlReport.Render(record));
    }

    [Fact]
    public void Is_the_page_that_was_looked_at_and_kept()
    {
        var expected = File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "Expectations", "HtmlReport", "Ferry_landing.approved.html"));

        var actual = WithoutScripts(HtmlReport.Render(FerryLanding.Small()));

        if (actual != expected)
        {
            var received = Path.Combine(AppContext.BaseDirectory, "Expectations", "HtmlReport", "Ferry_landing.received.html");
            File.WriteAllText(received, actual);
            Assert.Fail($"The page differs from the kept one; look at {received} and, if it is right, keep it.");
        }
    }

    private static IEnumerable<string> Scripts => new[] { PageScripts.Embedded.Main, PageScripts.Embedded.View }.OfType<string>();

    // Scripts and packed data have tests of their own in a browser; here only that they are there.
    private static string WithoutScripts(string page) => Regex.Replace(
        Regex.Replace(page, "(<script[^>]*>).*?</script>", "$1…</script>", RegexOptions.Singleline), "script-src .*?; base-uri", "script-src …; base-uri");

    private static IDocument Parse(ScreeningRecord record) => new HtmlParser().ParseDocument(HtmlReport.Render(record));
}
