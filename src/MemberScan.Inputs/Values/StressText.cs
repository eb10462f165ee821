using MemberScan.Foundation.Units;

namespace MemberScan.Inputs.Values;

/// <summary>A strength or modulus as people write it, such as <c>235MPa</c> or <c>36 ksi</c>.</summary>
public static class StressText
{
    /// <summary>Reads a strength or modulus.</summary>
    /// <param name="text">The text; at most 256 characters.</param>
    /// <param name="stress">The value [Pa], &gt; 0; 0 on failure.</param>
    /// <param name="error">One sentence that says what is wrong and how to mend it; empty on success.</param>
    public static bool TryParse(string text, out double stress, out string error)
    {
        ArgumentNullException.ThrowIfNull(text);
        return QuantityText.TryRead(text, Quantity.Stress, "235MPa", out stress, out error);
    }
}
