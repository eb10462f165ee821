using System.Text.Json.Serialization;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Cli.Sections;

/// <summary>The smallest size that would pass with one dimension free: a hint for the modeler, no design.</summary>
/// <param name="Dimension">The free dimension in words.</param>
/// <param name="Value">Its value, rounded up to a hundredth of a millimetre [m]; null where no size passes.</param>
/// <param name="Section">The section of that size.</param>
internal sealed record SmallestSize(
    [property: JsonPropertyName("dimension")] string Dimension,
    [property: JsonPropertyName("value")] double? Value,
    [property: JsonPropertyName("section")] string? Section)
{
    private const double Step = 1e-5;
    private const double Largest = 10;

    /// <summary>The sizes of a round bar, a tube and a box by the elementary model; none for other kinds.</summary>
    public static IReadOnlyList<SmallestSize> Of(CrossSection section, SectionForces[] states, double yield) => section switch
    {
        Round => [Search("diameter", d => Round.Fault(d / 2) is null ? new Round(d / 2) : null, 0, Largest, states, yield)],
        Tube tube =>
        [
            Search("wall, outer diameter kept", t => Tube.Fault(tube.OuterRadius, t) is null ? new Tube(tube.OuterRadius, t) : null, 0, tube.OuterRadius, states, yield),
            Search("outer diameter, wall kept", d => Tube.Fault(d / 2, tube.Wall) is null ? new Tube(d / 2, tube.Wall) : null, 2 * tube.Wall, Largest, states, yield),
        ],
        // The corner radii keep their ratio to the wall.
        Box box =>
        [
            Search(
                "wall, width and depth kept",
                t => Box.Fault(box.Width, box.Depth, t, box.OuterRadius * t / box.Wall, box.InnerRadius * t / box.Wall) is null
                    ? new Box(box.Width, box.Depth, t, box.OuterRadius * t / box.Wall, box.InnerRadius * t / box.Wall) : null,
                0, Math.Min(box.Width, box.Depth) / 2, states, yield),
        ],
        _ => [],
    };

    // Halving between what fails and what passes; sizes that are no section fail where too small and end the search where too large.
    private static SmallestSize Search(string dimension, Func<double, CrossSection?> make, double from, double to, SectionForces[] states, double yield)
    {
        var (low, high) = ((long)Math.Floor(from / Step), (long)Math.Ceiling(to / Step));
        while (high > low + 1 && make(high * Step) is null) high--;
        if (high <= low || !Passes(make(high * Step), states, yield)) return new SmallestSize(dimension, null, null);

        while (high - low > 1)
        {
            var middle = (low + high) / 2;
            if (Passes(make(middle * Step), states, yield)) high = middle;
            else low = middle;
        }

        return new SmallestSize(dimension, high * Step, make(high * Step)!.Designation);
    }

    private static bool Passes(CrossSection? section, SectionForces[] states, double yield)
    {
        if (section is null || !StressField.TryCreate(section, ShearModel.Elementary, 0, out var field, out _)) return false;

        foreach (var forces in states)
            if (!(field.Govern(forces, StressMeasure.VonMises).Value <= yield)) return false;
        return true;
    }
}
