using MemberScan.Foundation.Units;

namespace MemberScan.Inputs.Values;

/// <summary>One number with its unit, such as <c>16 mm</c> or <c>235MPa</c>.</summary>
internal static class QuantityText
{
    /// <summary>Reads a value of the quantity in SI, above zero; the error is one sentence with the remedy.</summary>
    public static bool TryRead(string text, Quantity quantity, string example, out double value, out string error)
    {
        value = 0;
        if (text.Length > ValueScanner.LongestText)
        {
            error = $"the text is longer than {ValueScanner.LongestText} characters; write for example {example}";
            return false;
        }

        var scanner = new ValueScanner(text);
        if (!scanner.TryNumber(out var number, out error)) return false;
        if (!UnitText.TryRead(scanner.Rest.ToString(), quantity, out var unit, out error)) return false;

        var read = number * unit.Factor;
        if (!double.IsFinite(read) || read <= 0)
        {
            error = $"{Excerpt.Of(text)} is not a finite value above zero; write for example {example}";
            return false;
        }

        value = read;
        return true;
    }
}
