using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;

namespace MemberScan.SampleModels.HandCalculation;

/// <summary>Elementary formulas of one section, written from the textbooks and apart from the product: area, inertia, stresses at many points.</summary>
internal abstract class HandSection
{
    /// <summary>Area [m²].</summary>
    public required double Area { get; init; }

    /// <summary>Second moment about y [m⁴].</summary>
    public required double Iy { get; init; }

    /// <summary>Second moment about z [m⁴].</summary>
    public required double Iz { get; init; }

    /// <summary>The ways to read a section: one, but two for a box without corner radii (sharp, and cold-formed after EN 10219-2).</summary>
    public static IReadOnlyList<HandSection> Of(CrossSection section) => section switch
    {
        Round round => [new HandRound(round.Radius, 0)],
        Tube tube => [new HandRound(tube.OuterRadius, tube.InnerRadius)],
        Rectangle rectangle => [HandSolid.From(rectangle.Width, rectangle.Depth, 0)],
        RoundedRectangle rounded => [HandSolid.From(rounded.Width, rounded.Depth, rounded.CornerRadius)],
        Box { OuterRadius: 0, InnerRadius: 0 } box => [HandBox.From(box.Width, box.Depth, box.Wall, 0, 0), ColdFormed(box)],
        Box box => [HandBox.From(box.Width, box.Depth, box.Wall, box.OuterRadius, box.InnerRadius)],
        _ => throw new ArgumentException($"No formulas for {section.Kind}.", nameof(section)),
    };

    /// <summary>The point with the largest equivalent stress under forces that act together.</summary>
    public abstract HandPoint Worst(in SectionForces forces);

    /// <summary>σ = N/A + My·z/Iy − Mz·y/Iz.</summary>
    protected double Normal(in SectionForces f, double y, double z) => f.N / Area + f.My * z / Iy - f.Mz * y / Iz;

    // EN 10219-2 (from memory): up to 6 mm ro = 2 t, ri = t.
    private static HandBox ColdFormed(Box box) => box.Wall <= 6e-3
        ? HandBox.From(box.Width, box.Depth, box.Wall, 2 * box.Wall, box.Wall)
        : throw new ArgumentException("Radii of thicker walls are not needed here.", nameof(box));
}
