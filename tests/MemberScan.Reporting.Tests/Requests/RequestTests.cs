using System.Text;
using System.Xml.Linq;
using AngleSharp.Html.Parser;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Requests;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Tests.Requests;

public sealed class RequestTests
{
    [Fact]
    public void The_table_asks_for_each_unchecked_candidate_once_with_its_request()
    {
        var lines = Encoding.UTF8.GetString(RequestTable.Write(FerryLanding.Small())).Split("\r\n");

        Assert.Equal(RequestTable.Header, lines[0]);
        Assert.Equal(4 + 2, lines.Length);
        Assert.Contains(lines, l => l.StartsWith("2O2Fr$t4X7Zf8NOew3FL07,2O2Fr$t4X7Zf8NOew3FL07,,Trapeze strut 1,", StringComparison.Ordinal) && l.Contains("no-forces", StringComparison.Ordinal) && l.Contains(ReasonCode.NoForces.Request(), StringComparison.Ordinal));
    }

    [Fact]
    public void The_page_groups_by_reason_and_runs_nothing()
    {
        var page = new HtmlParser().ParseDocument(RequestPage.Render(FerryLanding.Small()));

        Assert.Equal(["section-not-parametric: 1", "no-forces: 2", "thread-unknown: 1"], page.QuerySelectorAll("h2").Select(h => h.TextContent));
        Assert.Equal(4, page.QuerySelectorAll("tbody tr").Length);
        Assert.Empty(page.QuerySelectorAll("script,img,link,iframe"));
    }

    [Fact]
    public void Hostile_names_stay_text()
    {
        var record = FerryLanding.Record(FerryLanding.Open("2O2Fr$t4X7Zf8NOew3FL01", "=1+1<script>alert('橋 🛟')</script>", ReasonCode.NoStrength, "none"));

        Assert.Empty(new HtmlParser().ParseDocument(RequestPage.Render(record)).QuerySelectorAll("script"));
        Assert.Contains("'=1+1<script>alert('橋 🛟')</script>", Encoding.UTF8.GetString(RequestTable.Write(record)), StringComparison.Ordinal);
    }

    [Fact]
    public void The_specification_is_valid_and_names_exactly_the_members_that_lack_something()
    {
        var record = Lacking();
        var ids = RequestIds.Write(record)!;

        Assert.Empty(SchemaFiles.Faults(ids, "ids-1.0", "xmlschema-stub.xsd", "ids.xsd"));
        var root = XDocument.Load(new MemoryStream(ids)).Root!;
        XNamespace ns = "http://standards.buildingsmart.org/IDS", xs = "http://www.w3.org/2001/XMLSchema";
        var specifications = root.Descendants(ns + "specification").ToList();
        var strength = Assert.Single(specifications);
        Assert.Equal("no-strength", strength.Attribute("identifier")!.Value);
        Assert.Equal(["IFCMEMBER", "2O2Fr$t4X7Zf8NOew3FL01", "2O2Fr$t4X7Zf8NOew3FL02"], strength.Descendants(xs + "enumeration").Select(e => e.Attribute("value")!.Value));
        Assert.Single(strength.Descendants(ns + "requirements").Elements(ns + "material"));
        Assert.Contains("section-not-parametric: 1", root.Descendants(ns + "description").Single().Value, StringComparison.Ordinal);
        Assert.Contains("no-forces: 1", root.Descendants(ns + "description").Single().Value, StringComparison.Ordinal);
    }

    [Fact]
    public void The_specification_demands_nothing_that_the_reader_does_not_take()
    {
        var root = XDocument.Load(new MemoryStream(RequestIds.Write(Lacking())!)).Root!;
        XNamespace ns = "http://standards.buildingsmart.org/IDS";

        // A material's grade is read from any element; property sets are read only through a mapping of the settings.
        Assert.Equal(["material"], root.Descendants(ns + "requirements").Elements().Select(e => e.Name.LocalName).Distinct(StringComparer.Ordinal));
    }

    [Fact]
    public void Nothing_that_the_format_can_say_gives_no_specification() =>
        Assert.Null(RequestIds.Write(FerryLanding.Record(FerryLanding.Open("2O2Fr$t4X7Zf8NOew3FL01", "", ReasonCode.NoForces, "none"))));

    private static ScreeningRecord Lacking() => FerryLanding.Record(
        FerryLanding.Open("2O2Fr$t4X7Zf8NOew3FL01", "a", ReasonCode.NoStrength, "none"), FerryLanding.Open("2O2Fr$t4X7Zf8NOew3FL02", "b", ReasonCode.NoStrength, "none"),
        FerryLanding.Open("2O2Fr$t4X7Zf8NOew3FL03", "c", ReasonCode.SectionNotParametric, "mesh"), FerryLanding.Open("2O2Fr$t4X7Zf8NOew3FL04", "d", ReasonCode.NoForces, "none"));
}
