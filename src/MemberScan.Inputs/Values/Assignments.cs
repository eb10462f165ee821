using System.Collections.Immutable;
using MemberScan.Foundation.Units;

namespace MemberScan.Inputs.Values;

/// <summary>Texts such as <c>N=10kN My=0.1 kNm</c>: names with a number and its unit, each at most once.</summary>
internal static class Assignments
{
    /// <summary>Reads the values in SI by name; the error is one sentence with the remedy.</summary>
    public static bool TryRead(
        string text, ImmutableArray<(string Name, Quantity Quantity)> known, Dictionary<string, double> values, out string error)
    {
        error = "";
        var names = known.Select(entry => entry.Name).ToArray();
        if (text.Length > ValueScanner.LongestText)
        {
            error = $"the text is longer than {ValueScanner.LongestText} characters; give at most {string.Join(", ", names)}";
            return false;
        }

        var scanner = new ValueScanner(text);
        while (!scanner.AtEnd)
        {
            var rest = scanner.Rest;
            var name = scanner.Word();
            var index = Array.IndexOf(names, name);
            if (index < 0)
            {
                error = name.Length == 0
                    ? $"{Excerpt.Of(rest)} is not understood; write name=number unit, such as {Example(known[0])}"
                    : $"{Excerpt.Of(name)} is not one of the names; {NearestName.Advice(name, names)}";
                return false;
            }

            if (!TryValue(ref scanner, known[index], out var value, out error)) return false;
            if (!values.TryAdd(name, value))
            {
                error = $"'{name}' is given twice; give it once";
                return false;
            }

            _ = scanner.Take(",;");
        }

        if (values.Count > 0) return true;
        error = $"no value is given; write for example {Example(known[0])}";
        return false;
    }

    private static bool TryValue(ref ValueScanner scanner, (string Name, Quantity Quantity) entry, out double value, out string error)
    {
        value = 0;
        if (!scanner.Take("="))
        {
            error = $"after '{entry.Name}' stands no '='; write for example {Example(entry)}";
            return false;
        }

        if (!scanner.TryNumber(out var number, out error))
        {
            error = $"{entry.Name}: {error}";
            return false;
        }

        var unitWord = scanner.UnitWord();
        if (!scanner.AtEnd && scanner.Rest[0] == '=') unitWord = "";      // the word was the next name
        if (!UnitText.TryRead(unitWord, entry.Quantity, out var unit, out error))
        {
            error = $"{entry.Name}: {error}";
            return false;
        }

        value = number * unit.Factor;
        if (double.IsFinite(value)) return true;
        error = $"{entry.Name}: the value is too large; {NumberText.Remedy(NumberFault.NotFinite)}";
        return false;
    }

    private static string Example((string Name, Quantity Quantity) entry) => entry.Quantity switch
    {
        Quantity.Force => $"{entry.Name}=10kN",
        Quantity.Moment => $"{entry.Name}=0.1kNm",
        _ => $"{entry.Name}=10mm",
    };
}
