using System.Collections.Frozen;
using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Part21;

namespace MemberScan.Ifc.Units;

/// <summary>Size of unit instances in SI, and their words.</summary>
internal sealed class UnitReader(Instances instances, DiagnosticList diagnostics)
{
    private static readonly FrozenDictionary<string, double> s_prefixes = new Dictionary<string, double>(StringComparer.Ordinal)
    {
        ["EXA"] = 1e18,
        ["PETA"] = 1e15,
        ["TERA"] = 1e12,
        ["GIGA"] = 1e9,
        ["MEGA"] = 1e6,
        ["KILO"] = 1e3,
        ["HECTO"] = 1e2,
        ["DECA"] = 1e1,
        ["DECI"] = 1e-1,
        ["CENTI"] = 1e-2,
        ["MILLI"] = 1e-3,
        ["MICRO"] = 1e-6,
        ["NANO"] = 1e-9,
        ["PICO"] = 1e-12,
        ["FEMTO"] = 1e-15,
        ["ATTO"] = 1e-18,
    }.ToFrozenDictionary(StringComparer.Ordinal);

    // What a name promises; the factor in the file counts, a difference is only told.
    private static readonly FrozenDictionary<string, double> s_promised = new Dictionary<string, double>(StringComparer.OrdinalIgnoreCase)
    {
        ["inch"] = 0.0254,
        ["foot"] = 0.3048,
        ["yard"] = 0.9144,
        ["mile"] = 1609.344,
        ["square inch"] = 0.00064516,
        ["square foot"] = 0.09290304,
        ["cubic inch"] = 0.000016387064,
        ["cubic foot"] = 0.028316846592,
        ["degree"] = Math.PI / 180,
        ["pound"] = 0.45359237,
        ["lbf"] = 4.4482216152605,
        ["pound-force"] = 4.4482216152605,
        ["kip"] = 4448.2216152605,
        ["psi"] = 6894.757293168361,
        ["ksi"] = 6894757.293168361,
        ["pound-force per square inch"] = 6894.757293168361,
    }.ToFrozenDictionary(StringComparer.OrdinalIgnoreCase);

    /// <summary>One unit = factor × SI unit; null when the unit has no factor.</summary>
    public double? Factor(Part21Record unit) => Factor(unit, depth: 0);

    /// <summary>The unit in words, such as "millimetre" or "pound-force".</summary>
    public string Words(Part21Record unit) => Words(unit, depth: 0);

    private double? Factor(Part21Record unit, int depth)
    {
        if (depth > 8) return null;

        return unit.Keyword switch
        {
            "IFCSIUNIT" => SiFactor(unit),
            "IFCCONVERSIONBASEDUNIT" or "IFCCONVERSIONBASEDUNITWITHOFFSET" => ConversionFactor(unit, depth),
            "IFCDERIVEDUNIT" => DerivedFactor(unit, depth),
            _ => null,
        };
    }

    private static double? SiFactor(Part21Record unit)
    {
        var prefix = 1.0;
        if (!unit[2].IsEmpty && !s_prefixes.TryGetValue(Instances.Literal(unit[2]), out prefix)) return null;

        return Instances.Literal(unit[3]) switch
        {
            "" => null,
            "GRAM" => prefix * 1e-3,
            "SQUARE_METRE" => prefix * prefix,       // the prefix belongs to the metre
            "CUBIC_METRE" => prefix * prefix * prefix,
            _ => prefix,
        };
    }

    private double? ConversionFactor(Part21Record unit, int depth)
    {
        if (!instances.TryFollow(unit[3], out var measure) || Instances.Real(measure[0]) is not { } value) return null;
        if (!instances.TryFollow(measure[1], out var component) || Factor(component, depth + 1) is not { } inner) return null;

        var factor = value * inner;
        if (!double.IsFinite(factor) || factor <= 0) return null;

        var name = Instances.Text(unit[2]).Trim();
        if (s_promised.TryGetValue(name, out var promised) && Math.Abs(factor / promised - 1) > 1e-4)
            diagnostics.Add("IFC-0004", Severity.Warning, string.Create(CultureInfo.InvariantCulture, $"Unit '{name}' is defined as {factor:R} SI units, not {promised:R}; the definition in the model counts."), unit.Span);
        return factor;
    }

    private double? DerivedFactor(Part21Record unit, int depth)
    {
        if (instances.FollowEach(unit[0]) is not { Count: > 0 } elements) return null;

        var factor = 1.0;
        foreach (var element in elements)
        {
            if (!element[1].TryInteger(out var exponent) || Math.Abs(exponent) > 12) return null;
            if (!instances.TryFollow(element[0], out var component) || Factor(component, depth + 1) is not { } inner) return null;

            factor *= Math.Pow(inner, exponent);
        }

        return double.IsFinite(factor) && factor > 0 ? factor : null;
    }

    private string Words(Part21Record unit, int depth)
    {
        if (depth > 8) return "?";

        switch (unit.Keyword)
        {
            case "IFCSIUNIT":
                return (Instances.Literal(unit[2]) + Instances.Literal(unit[3])).ToLowerInvariant().Replace('_', ' ');
            case "IFCDERIVEDUNIT":
                var parts = instances.FollowAll(unit[0]).Select(element =>
                {
                    var name = instances.TryFollow(element[0], out var component) ? Words(component, depth + 1) : "?";
                    return element[1].TryInteger(out var exponent) && exponent == 1 ? name : string.Create(CultureInfo.InvariantCulture, $"{name}^{exponent}");
                });
                return string.Join(" · ", parts);
            default:
                var text = Instances.Text(unit[2]).Trim();
                return text.Length > 0 ? text : unit.Keyword;
        }
    }
}
