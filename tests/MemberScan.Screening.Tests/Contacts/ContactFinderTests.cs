using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Screening.Contacts;

namespace MemberScan.Screening.Tests.Contacts;

public sealed class ContactFinderTests
{
    private static readonly Tube s_tube = new(24.15e-3, 3.2e-3);

    [Fact]
    public void A_post_under_a_rail_touches_it_with_its_end_at_the_rails_side()
    {
        // The rail's lower surface lies 10 mm above the post's upper end: gap = 1.05 + 0.010 + 0.02415 − 0.02415 − 1.05.
        var contact = Assert.Single(Find(
            Bar("post", new(0, 0, 0), new(0, 0, 1.05)),
            Bar("rail", new(-1, 0, 1.05 + 0.010 + 0.02415), new(1, 0, 1.05 + 0.010 + 0.02415))).All);

        Assert.Equal(("post", "rail", ContactKind.EndToSide, true), (contact.First, contact.Second, contact.Kind, contact.IsCertain));
        Assert.Equal((1.05, 1.0, 0.010), (contact.FirstAt, Math.Round(contact.SecondAt, 9), Math.Round(contact.Gap, 9)));
    }

    [Theory]
    [InlineData(0.024, true)]
    [InlineData(0.026, false)]
    [InlineData(0.074, false)]
    public void Gaps_up_to_the_tolerance_are_certain_and_up_to_three_times_as_wide_in_doubt(double gap, bool isCertain)
    {
        var contact = Assert.Single(Find(Bar("a", new(0, 0, 0), new(1, 0, 0)), Bar("b", new(1 + gap, 0, 0), new(2, 0, 0))).All);

        Assert.Equal((ContactKind.EndToEnd, isCertain), (contact.Kind, contact.IsCertain));
        Assert.Equal(gap, contact.Gap, 9);
    }

    [Fact]
    public void Wider_gaps_are_no_contacts() => Assert.Empty(Find(Bar("a", new(0, 0, 0), new(1, 0, 0)), Bar("b", new(1.076, 0, 0), new(2, 0, 0))).All);

    [Fact]
    public void Crossing_and_alongside_are_told_apart()
    {
        var crossing = Assert.Single(Find(Bar("a", new(0, 0, 0), new(2, 0, 0)), Bar("b", new(1, -1, 0.05), new(1, 1, 0.05))).All);
        var alongside = Assert.Single(Find(Bar("a", new(0, 0, 0), new(2, 0, 0)), Bar("b", new(0.5, 0, 0.05), new(2.5, 0, 0.05))).All);

        Assert.Equal((ContactKind.Crossing, 1.0, 1.0), (crossing.Kind, crossing.FirstAt, crossing.SecondAt));
        Assert.Equal(ContactKind.Alongside, alongside.Kind);
    }

    [Fact]
    public void A_flat_reaches_farther_along_its_width_than_along_its_thickness()
    {
        // Member y is global Y here, z global Z: the flat reaches 30 mm along Y and 6 mm along Z.
        var flat = new Rectangle(0.060, 0.012);

        Assert.Equal(0.020, Assert.Single(Find(Bar("flat", new(0, 0, 0), new(2, 0, 0), flat), Bar("rod", new(1, 0.074150, -1), new(1, 0.074150, 1))).All).Gap, 9);
        Assert.Empty(Find(Bar("flat", new(0, 0, 0), new(2, 0, 0), flat), Bar("rod", new(1, -1, 0.12), new(1, 1, 0.12))).All);
    }

    [Fact]
    public void The_sweep_finds_what_all_pairs_find()
    {
        // A grid of 8 × 8 crossing rails, each of 7 m: every pair of the two families touches.
        var bars = Enumerable.Range(0, 8).SelectMany(i => new[]
        {
            Bar($"x{i}", new(0, i, 0), new(7, i, 0)),
            Bar($"y{i}", new(i, 0, 0.05), new(i, 7, 0.05)),
        }).ToArray();

        var contacts = Find(bars);

        Assert.Equal(64, contacts.All.Length);
        Assert.Equal(8, contacts.Of("x3").Count());
        Assert.Equal(contacts.All.Select(c => c.Words), Find([.. bars.Reverse()]).All.Select(c => c.Words));
    }

    private static ContactList Find(params Member[] members) => ContactFinder.Find([.. members], 0.025);

    private static Member Bar(string key, Vector3 start, Vector3 end, CrossSection? section = null)
    {
        var axes = MemberAxes.From(start, end - start, Vector3.UnitZ) ?? MemberAxes.From(start, end - start, Vector3.UnitX)!;
        return new Member
        {
            Key = key,
            Element = new ElementIdentity(1, key, "IfcMember", "", key, "", "", ""),
            ItemNumber = 0,
            ItemCount = 1,
            Role = "rail",
            Section = new Finding<SectionFinding>.Found(new SectionFinding(ImmutableArray.Create<CrossSection>(section ?? s_tube), "", []), "test"),
            Length = new Finding<double>.Found((end - start).Length, "test"),
            Axes = new Finding<MemberAxes>.Found(axes, "test"),
            Material = new Material("", new Finding<double>.Found(235e6, "test"), new Finding<double>.Found(210e9, "test"), new Finding<double>.Found(0.3, "test"), true),
        };
    }
}
