using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Reporting.Drawing;
using MemberScan.Screening.Contacts;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Tests.Drawing;

public sealed class ContactSketchTests
{
    private const string Model = "simple spans between posts at 0 m, 1.8 m, the top rail";

    [Fact]
    public void Contacts_are_marked_from_the_start_of_the_member_whichever_of_the_two_it_is()
    {
        var rail = Rail();
        var sketch = ContactSketch.Of(rail, [Touch("P-2", 0, rail.Key, 1.8, 0.001, true), Touch(rail.Key, 0, "P-1", 1.1, 0, true), Touch(rail.Key, 3.1, "P-3", 1.1, 0.06, false), Touch("P-1", 0, "P-9", 1, 0, true)])!;

        Assert.Equal(Model, sketch.Model);
        Assert.Equal([('A', 0.0, "P-1", true), ('B', 1.8, "P-2", true), ('C', 3.1, "P-3", false)], sketch.Marks.Select(m => (m.Letter, m.At, m.Other, m.IsCertain)));
        Assert.Equal(0, sketch.NotShown);
    }

    [Fact]
    public void There_is_no_sketch_without_assumed_forces_or_contacts()
    {
        var rail = Rail();

        Assert.Null(ContactSketch.Of(rail, []));
        Assert.Null(ContactSketch.Of(FerryLanding.Rail("key", "rail", 1e3), [Touch("key", 0, "P-1", 1, 0, true)]));
    }

    [Fact]
    public void Contacts_beyond_the_letters_are_counted()
    {
        var rail = Rail();
        var many = Enumerable.Range(0, 30).Select(i => Touch(rail.Key, 0.1 * i, $"P-{i}", 1, 0, true)).ToImmutableArray();

        var sketch = ContactSketch.Of(rail, many)!;

        Assert.Equal((ContactSketch.MostMarks, 4), (sketch.Marks.Length, sketch.NotShown));
    }

    [Fact]
    public void The_sheet_of_an_overstressed_member_shows_the_sketch()
    {
        var rail = Rail();
        var record = FerryLanding.Record(rail) with { Contacts = [Touch(rail.Key, 0, "P-1", 1.1, 0, true), Touch(rail.Key, 1.8, "P-2", 1.1, 0.06, false)] };

        var page = HtmlReport.Render(record);

        Assert.Contains("Supports and ends as assumed", page, StringComparison.Ordinal);
        Assert.Contains("class=\"contacts\"", page, StringComparison.Ordinal);
        Assert.Contains("P-2", page, StringComparison.Ordinal);
        Assert.Contains("in doubt", page, StringComparison.Ordinal);
    }

    private static MemberResult Rail()
    {
        var rail = FerryLanding.Rail(FerryLanding.RailKey, "Gangway rail", 1.32e3);
        return rail with { Length = 3.6, Situations = [.. rail.Situations.Select(s => s with { ForcesSource = "assumed: load preset 'guard'", Conversion = "assumed: " + Model })] };
    }

    private static Contact Touch(string first, double firstAt, string second, double secondAt, double gap, bool isCertain) =>
        new(first, firstAt, second, secondAt, ContactKind.EndToSide, gap, 0.05, isCertain, Vector3.Zero);
}
