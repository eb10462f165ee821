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
    /// <summary>The sizes of a round bar, a tube and a box by the elementary model; none for other kinds.</summary>
    public static IReadOnlyList<SmallestSize> Of(CrossSection section, SectionForces[] states, double yield) =>
        [.. SizeSearch.Of(section, size => Passes(size, states, yield)).Select(s => new SmallestSize(s.Dimension, s.Value, s.Section?.Designation))];

    private static bool Passes(CrossSection section, SectionForces[] states, double yield)
    {
        if (!StressField.TryCreate(section, ShearModel.Elementary, 0, out var field, out _)) return false;

        foreach (var forces in states)
            if (!(field.Govern(forces, StressMeasure.VonMises).Value <= yield)) return false;
        return true;
    }
}
