using System.Diagnostics.CodeAnalysis;
using MemberScan.Foundation.Units;

namespace MemberScan.Inputs.Values;

/// <summary>Unit symbols with the quantity that is asked for.</summary>
internal static class UnitText
{
    /// <summary>Reads a symbol; the error is a clause that tells what is wrong and what is known.</summary>
    public static bool TryRead(string symbol, Quantity quantity, [NotNullWhen(true)] out Unit? unit, out string error)
    {
        error = "";
        if (symbol.Trim().Length == 0)
        {
            unit = null;
            error = $"the unit is missing; give one of {Known(quantity)}";
            return false;
        }

        if (!Unit.TryParse(symbol, out unit))
        {
            error = $"{Excerpt.Of(symbol)} is not a unit of {Word(quantity)}; {NearestName.Advice(symbol, [.. Unit.SymbolsOf(quantity)])}";
            return false;
        }

        if (unit.Quantity == quantity) return true;

        error = $"{Excerpt.Of(symbol)} is a unit of {Word(unit.Quantity)}, not of {Word(quantity)}; give one of {Known(quantity)}";
        return false;
    }

    public static string Known(Quantity quantity) => string.Join(", ", Unit.SymbolsOf(quantity));

    public static string Word(Quantity quantity) => quantity switch
    {
        Quantity.Length => "length",
        Quantity.Force => "force",
        Quantity.Moment => "moment",
        Quantity.Stress => "stress",
        Quantity.Ratio => "ratio",
        Quantity.Angle => "angle",
        _ => throw new ArgumentOutOfRangeException(nameof(quantity)),
    };
}
