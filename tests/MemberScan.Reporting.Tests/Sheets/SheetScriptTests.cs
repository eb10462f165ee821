using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;
using AngleSharp.Dom;
using AngleSharp.Html.Parser;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Sheets;
using MemberScan.Reporting.Sheets.Packed;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Tests.Sheets;

/// <summary>Sheets that the script draws in a real browser, beside those that the program writes.</summary>
public sealed partial class SheetScriptTests
{
    // Tenths of a picture unit; the script has five digits of what is drawn.
    private const double PlaceTolerance = 0.35;

    [Theory]
    [InlineData("gangway-rails")]
    [InlineData("mast-stays")]
    public void Shows_the_texts_and_pictures_that_the_program_writes(string sample)
    {
        var outcome = Screened.Of(sample);
        var members = outcome.Record.Members.Where(m => m.Verdict != Verdict.Overstressed && m.Governing is not null).ToList();

        var shown = Show(sample, [.. members.Select(m => m.Key)]);

        var compared = 0;
        foreach (var (member, holder) in members.Zip(shown))
        {
            var written = new HtmlParser().ParseDocument(SheetPage.Render(outcome.Record, member, outcome.Sheets)).QuerySelector("article.sheet")!;
            Assert.Equal(written.QuerySelectorAll("tr, dd, li, h3, figcaption b").Select(Plain), holder.QuerySelectorAll("tr, dd, li, h3, figcaption b").Select(Plain));
            var drawn = holder.QuerySelectorAll("svg").ToDictionary(s => s.GetAttribute("aria-label")!, StringComparer.Ordinal);
            foreach (var picture in written.QuerySelectorAll("svg").Where(s => !s.GetAttribute("aria-label")!.StartsWith("Section forces along", StringComparison.Ordinal)).DistinctBy(s => s.GetAttribute("aria-label")))
            {
                AssertSame(picture, drawn[picture.GetAttribute("aria-label")!], member);
                compared++;
            }
        }

        Assert.True(compared > 30, $"only {compared} pictures were compared");
    }

    [Fact]
    public void Packs_a_member_in_five_hundred_bytes_at_most()
    {
        // One post many times over, each with its own key, name, place and forces: what a member adds to the block.
        var outcome = Screened.Of("gangway-rails");
        var like = outcome.Record.Members.Where(m => m.Verdict == Verdict.WithinLimit && m.Situations.Length == 2).ToList();
        int Size(int times)
        {
            var members = Enumerable.Range(0, times).SelectMany(t => like.Select((m, i) => Varied(m, t * like.Count + i))).ToList();
            var record = outcome.Record with { Members = [.. members], Counts = new VerdictCounts(members.Count, 0, 0) };
            return PackedSheets.Pack(new Reporting.Page.ReportView(record, sheets: outcome.Sheets).WithoutSheet, outcome.Sheets).Length;
        }

        var (few, many) = (Size(4), Size(24));

        var each = (many - few) / (20.0 * like.Count);
        Assert.True(each <= 500, string.Create(CultureInfo.InvariantCulture, $"{each:0} bytes a member"));
    }

    [Fact]
    public void Gives_the_same_block_for_the_same_record()
    {
        var outcome = Screened.Of("mast-stays");

        Assert.Equal(HtmlReport.Render(outcome.Record, sheets: outcome.Sheets), HtmlReport.Render(outcome.Record, sheets: outcome.Sheets));
    }

    private static MemberResult Varied(MemberResult m, int number)
    {
        var random = new Random(number);
        var factor = 0.2 + 0.8 * random.NextDouble();
        var g = m.Governing!;
        return m with
        {
            Identity = m.Identity with { StepId = (ulong)(1000 + 7 * number), Tag = $"P-{number}", Name = $"Post {number} of bay {random.Next(900)}" },
            Governing = g with
            {
                Utilization = g.Utilization * factor,
                Stress = g.Stress * factor,
                Forces = factor * g.Forces,
                Trace = [.. g.Trace.Select(l => l.Unit is "N" or "N·m" or "Pa" ? l with { Value = l.Value * factor } : l)],
            },
        };
    }

    private static IReadOnlyList<IElement> Show(string sample, string[] keys)
    {
        var folder = Directory.CreateTempSubdirectory("memberscan-sheets");
        try
        {
            var outcome = Screened.Of(sample);
            var call = $$"""
                <script>
                window.onerror = m => { document.title = 'error ' + m; };
                (async () => {
                  for (const key of {{System.Text.Json.JsonSerializer.Serialize(keys)}}) {
                    const holder = document.createElement('section');
                    holder.className = 'holder';
                    document.body.append(holder);
                    if (!await memberScan.showSheet(holder, key)) holder.textContent = 'absent';
                  }
                  document.title = 'shown';
                })().catch(e => { document.title = 'error ' + e.stack; });
                </script>
                """;
            // The page's policy would rightly refuse the test's own script.
            var page = PolicyTag().Replace(HtmlReport.Render(outcome.Record, sheets: outcome.Sheets), "").Replace("</body>", call + "</body>", StringComparison.Ordinal);
            var file = Path.Combine(folder.FullName, "page.html");
            File.WriteAllText(file, page, new UTF8Encoding(false));

            var shown = new HtmlParser().ParseDocument(Chromium.Run(folder, "--virtual-time-budget=20000", "--dump-dom", new Uri(file).AbsoluteUri));

            Assert.Equal("shown", shown.Title);
            return [.. shown.QuerySelectorAll("section.holder")];
        }
        finally
        {
            folder.Delete(recursive: true);
        }
    }

    private static void AssertSame(IElement written, IElement drawn, MemberResult member)
    {
        var what = $"{member.Tag} {written.GetAttribute("aria-label")}";
        Assert.Equal(written.QuerySelectorAll("text").Select(t => t.TextContent), drawn.QuerySelectorAll("text").Select(t => t.TextContent));
        string Kinds(IElement picture) => string.Join(' ', picture.QuerySelectorAll("*").Select(e => $"{e.LocalName}.{e.ClassName}"));
        Assert.True(Kinds(written) == Kinds(drawn), $"{what}:\n{Kinds(written)}\n{Kinds(drawn)}");
        foreach (var (a, b) in written.QuerySelectorAll("path:not(.flow), circle, rect").Where(e => !IsContour(e)).Zip(drawn.QuerySelectorAll("path:not(.flow), circle, rect").Where(e => !IsContour(e))))
            foreach (var name in new[] { "d", "cx", "cy", "r", "x", "y", "width", "height" })
            {
                var (left, right) = (Places(a.GetAttribute(name)), Places(b.GetAttribute(name)));
                Assert.True(left.Length == right.Length && left.Zip(right).All(p => Math.Abs(p.First - p.Second) <= PlaceTolerance), $"{what}, {a.ClassName} {name}:\n{a.GetAttribute(name)}\n{b.GetAttribute(name)}");
            }
    }

    // A contour may keep one corner more or less; its own test compares values. Its reach must agree all the same.
    private static bool IsContour(IElement path) => path.ParentElement?.HasAttribute("clip-path") == true;

    private static double[] Places(string? data) => data is null ? [] : [.. PlaceNumber().Matches(data).Select(m => double.Parse(m.Value, CultureInfo.InvariantCulture))];

    private static string Plain(IElement element) => Blanks().Replace(element.TextContent, " ").Trim();

    [GeneratedRegex("-?[0-9]+(?:\\.[0-9]+)?")]
    private static partial Regex PlaceNumber();

    [GeneratedRegex("<meta http-equiv=\"Content-Security-Policy\"[^>]*>")]
    private static partial Regex PolicyTag();

    [GeneratedRegex("[ \n]+")]
    private static partial Regex Blanks();
}
