using System.Collections.Immutable;
using MemberScan.Checks.Materials;
using MemberScan.Foundation.Units;

namespace MemberScan.Checks.Tests.Materials;

/// <summary>A post of 6063-T5, welded at its base: 16 ksi away from the weld, 8 ksi beside it (Aluminum Design Manual, from memory).</summary>
public sealed class WeldedZoneTests
{
    private static readonly double s_parent = Si.Ksi(16), s_welded = Si.Ksi(8);

    [Fact]
    public void A_post_welded_at_its_base_has_the_welded_strength_there()
    {
        var zone = WeldedZone.Of(s_parent, s_welded, [0.0], Si.In(1));

        Assert.Equal(s_welded, zone.YieldAt(0).Yield);
        Assert.Equal(s_welded, zone.YieldAt(0.0254).Yield);
        Assert.Equal(s_parent, zone.YieldAt(0.0255).Yield);
        Assert.Contains("within 25.4 mm of the weld at 0 m", zone.YieldAt(0.01).Source, StringComparison.Ordinal);
    }

    [Fact]
    public void Where_the_welds_are_not_known_every_place_counts_as_welded()
    {
        var zone = WeldedZone.Of(s_parent, s_welded, null, Si.In(1));

        Assert.Equal(s_welded, zone.YieldAt(0.5).Yield);
        Assert.Contains("not known", zone.YieldAt(0.5).Source, StringComparison.Ordinal);
    }

    [Fact]
    public void No_welds_must_be_stated()
    {
        Assert.Equal(s_parent, WeldedZone.Of(s_parent, s_welded, ImmutableArray<double>.Empty, Si.In(1)).YieldAt(0).Yield);
    }

    [Theory]
    [InlineData(6, 20)]
    [InlineData(6.1, 30)]
    [InlineData(12, 30)]
    [InlineData(12.1, 35)]
    [InlineData(25, 35)]
    [InlineData(25.1, 40)]
    public void The_zone_reaches_by_the_thickness(double thicknessMm, double extentMm)
    {
        // EN 1999-1-1:2007, 6.1.6.3, MIG welds, from memory.
        Assert.Equal(extentMm, WeldedZone.ExtentOf(Si.Mm(thicknessMm)) * 1e3, 12);
    }

    [Fact]
    public void A_welded_zone_stronger_than_its_parent_is_refused() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => WeldedZone.Of(s_welded, s_parent, null, 0.02));
}
