using System.Collections.Immutable;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;

namespace MemberScan.Inputs.Values;

/// <summary>Section forces as people write them, such as <c>N=10kN My=0.1kNm</c>; what is left out is zero.</summary>
public static class ForcesText
{
    private static readonly ImmutableArray<(string Name, Quantity Quantity)> s_known =
    [
        ("N", Quantity.Force), ("Vy", Quantity.Force), ("Vz", Quantity.Force),
        ("T", Quantity.Moment), ("My", Quantity.Moment), ("Mz", Quantity.Moment),
    ];

    /// <summary>Reads section forces.</summary>
    /// <param name="text">The text; at most 256 characters, at least one value.</param>
    /// <param name="forces">The forces in SI, signs as in <see cref="SectionForces"/>; all zero on failure.</param>
    /// <param name="error">One sentence that says what is wrong and how to mend it; empty on success.</param>
    public static bool TryParse(string text, out SectionForces forces, out string error)
    {
        ArgumentNullException.ThrowIfNull(text);
        var values = new Dictionary<string, double>(StringComparer.Ordinal);
        var read = Assignments.TryRead(text, s_known, values, out error);
        forces = read
            ? new SectionForces(Of("N"), Of("Vy"), Of("Vz"), Of("T"), Of("My"), Of("Mz"))
            : default;
        return read;

        double Of(string name) => values.GetValueOrDefault(name);
    }
}
