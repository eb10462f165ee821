using System.Collections.Immutable;
using MemberScan.Foundation.Units;

namespace MemberScan.Inputs.Values;

/// <summary>A point of a cross-section as people write it, such as <c>y=0mm z=10mm</c>; both are required.</summary>
public static class PointText
{
    private static readonly ImmutableArray<(string Name, Quantity Quantity)> s_known = [("y", Quantity.Length), ("z", Quantity.Length)];

    /// <summary>Reads a point.</summary>
    /// <param name="text">The text; at most 256 characters.</param>
    /// <param name="y">Distance from the centroid along y [m]; 0 on failure.</param>
    /// <param name="z">Distance from the centroid along z [m]; 0 on failure.</param>
    /// <param name="error">One sentence that says what is wrong and how to mend it; empty on success.</param>
    public static bool TryParse(string text, out double y, out double z, out string error)
    {
        ArgumentNullException.ThrowIfNull(text);
        (y, z) = (0, 0);
        var values = new Dictionary<string, double>(StringComparer.Ordinal);
        if (!Assignments.TryRead(text, s_known, values, out error)) return false;

        if (values.Count == s_known.Length)
        {
            (y, z) = (values["y"], values["z"]);
            return true;
        }

        error = $"'{(values.ContainsKey("y") ? "z" : "y")}' is missing; give both, such as y=0mm z=10mm";
        return false;
    }
}
