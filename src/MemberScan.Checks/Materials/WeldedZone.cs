using System.Collections.Immutable;

namespace MemberScan.Checks.Materials;

/// <summary>Strength of an aluminium member beside its welds and away from them.</summary>
/// <remarks>
/// Where the welds are not known, every place counts as welded. Extent from memory: EN 1999-1-1:2007, 6.1.6.3, MIG welds, one bead: 20 mm to 6 mm of
/// wall, 30 mm to 12 mm, 35 mm to 25 mm, 40 mm beyond; Aluminum Design Manual: 1 in.
/// </remarks>
public sealed record WeldedZone
{
    private WeldedZone(double parent, double welded, ImmutableArray<double>? welds, double extent) =>
        (ParentYield, WeldedYield, Welds, Extent) = (parent, welded, welds, extent);

    /// <summary>0.2 % proof strength of the parent metal [Pa].</summary>
    public double ParentYield { get; }

    /// <summary>0.2 % proof strength of the welded zone [Pa], not above that of the parent metal.</summary>
    public double WeldedYield { get; }

    /// <summary>Places of welds, distances from the member's start [m]; null when they are not known.</summary>
    public ImmutableArray<double>? Welds { get; }

    /// <summary>Reach of the welded zone to either side of a weld [m].</summary>
    public double Extent { get; }

    /// <summary>The zones of a member.</summary>
    /// <param name="parentYield">Proof strength of the parent metal [Pa], &gt; 0.</param>
    /// <param name="weldedYield">Proof strength of the welded zone [Pa], &gt; 0, at most that of the parent metal.</param>
    /// <param name="welds">Places of welds from the member's start [m]; null when they are not known, empty for none.</param>
    /// <param name="extent">Reach of the zone to either side [m], &gt; 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is out of its range.</exception>
    public static WeldedZone Of(double parentYield, double weldedYield, ImmutableArray<double>? welds, double extent)
    {
        if (!double.IsFinite(parentYield) || parentYield <= 0) throw new ArgumentOutOfRangeException(nameof(parentYield), parentYield, "the strength must be a finite number above zero");
        if (!(weldedYield > 0 && weldedYield <= parentYield)) throw new ArgumentOutOfRangeException(nameof(weldedYield), weldedYield, "the strength of the welded zone must be above zero and not above the parent metal's");
        if (!double.IsFinite(extent) || extent <= 0) throw new ArgumentOutOfRangeException(nameof(extent), extent, "the extent must be a finite number above zero");
        return new WeldedZone(parentYield, weldedYield, welds, extent);
    }

    /// <summary>Reach of the zone by the thickness of the wall: EN 1999-1-1:2007, 6.1.6.3, from memory [m].</summary>
    /// <param name="thickness">Thickness of the wall [m], &gt; 0.</param>
    public static double ExtentOf(double thickness)
    {
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(thickness);
        return thickness switch { <= 0.006 => 0.020, <= 0.012 => 0.030, <= 0.025 => 0.035, _ => 0.040 };
    }

    /// <summary>The strength at a place, with the reason in words.</summary>
    /// <param name="x">Distance from the member's start [m].</param>
    public (double Yield, string Source) YieldAt(double x)
    {
        if (Welds is not { } welds) return (WeldedYield, "welded zone: the places of welds are not known, every place counts as welded");

        foreach (var weld in welds)
            if (Math.Abs(x - weld) <= Extent)
                return (WeldedYield, $"welded zone: within {Shown.Mm(Extent)} mm of the weld at {Shown.Number(weld)} m");
        return (ParentYield, welds.IsEmpty ? "parent metal: no welds, as stated" : $"parent metal: farther than {Shown.Mm(Extent)} mm from every weld");
    }
}
