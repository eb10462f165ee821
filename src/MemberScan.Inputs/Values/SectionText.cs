using System.Collections.Immutable;
using System.Diagnostics.CodeAnalysis;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Inputs.Values;

/// <summary>Cross-sections as people write them, such as <c>tube 48.3x3.2 mm</c>.</summary>
/// <remarks>
/// <c>round 25 mm</c> (diameter), <c>tube 48.3x3.2 mm</c> (outer diameter × wall), <c>rectangle 40x80 mm</c> (y × z), <c>rectangle 60x100 mm r 15</c>,
/// <c>box 50x30x3 mm</c> (y × z × wall, sharp), <c>box 50x30x3 mm ro 6 ri 3</c>; <c>L 100x80x8 mm</c> (z × y × legs),
/// <c>I 200x100x5.6x8.5 mm r 12</c>, U and T alike (depth along z × width along y × web × flange, root radius). A length without a unit has that of the last dimension.
/// </remarks>
public static class SectionText
{
    private static readonly ImmutableArray<string> s_kinds = ["round", "tube", "rectangle", "box", "I", "L", "U", "T"];

    /// <summary>Reads a section.</summary>
    /// <param name="text">The text; at most 256 characters.</param>
    /// <param name="section">The section; null on failure.</param>
    /// <param name="error">One sentence that says what is wrong and how to mend it; empty on success.</param>
    public static bool TryParse(string text, [NotNullWhen(true)] out CrossSection? section, out string error)
    {
        ArgumentNullException.ThrowIfNull(text);
        section = null;
        if (text.Length > ValueScanner.LongestText)
        {
            error = $"the section text is longer than {ValueScanner.LongestText} characters; write it like 'tube 48.3x3.2 mm'";
            return false;
        }

        var scanner = new ValueScanner(text);
        var kind = scanner.Word();
        kind = kind.Length == 1 ? kind.ToUpperInvariant() : kind.ToLowerInvariant();
        if (!s_kinds.Contains(kind))
        {
            error = kind.Length == 0
                ? $"the section kind is missing; begin with one of {string.Join(", ", s_kinds)}, such as 'tube 48.3x3.2 mm'"
                : $"{Excerpt.Of(kind)} is not a section kind; {NearestName.Advice(kind, s_kinds)}";
            return false;
        }

        var radii = new Dictionary<string, double>(StringComparer.Ordinal);
        if (!TryDimensions(ref scanner, kind, out var dimensions, out var factor, out error)) return false;
        if (!TryRadii(ref scanner, kind, factor, radii, out error)) return false;

        error = Fault(kind, dimensions, radii)?.Message ?? "";
        if (error.Length == 0) section = Make(kind, dimensions, radii);
        return section is not null;
    }

    private static bool TryDimensions(
        ref ValueScanner scanner, string kind, out List<double> dimensions, out double factor, out string error)
    {
        dimensions = [];
        factor = double.NaN;
        var own = new List<bool>();
        do
        {
            if (!scanner.TryNumber(out var number, out error)) return false;

            var hasUnit = !scanner.AtEnd && scanner.Rest[0] is not ('x' or 'X' or '×') && !StartsRadius(scanner.Rest, kind);
            if (hasUnit && !TryUnit(scanner.UnitWord(), out factor, out error)) return false;
            dimensions.Add(hasUnit ? number * factor : number);
            own.Add(hasUnit);
        }
        while (scanner.Take("xX×"));

        if (dimensions.Count != Count(kind))
        {
            error = $"{(kind is "I" or "L" ? "an" : "a")} {kind} has {Meaning(kind)}, but {dimensions.Count} {(dimensions.Count == 1 ? "is" : "are")} given";
            return false;
        }

        if (!own[^1])
        {
            error = $"the unit is missing; give one of {UnitText.Known(Quantity.Length)} after the last dimension";
            return false;
        }

        for (var i = 0; i < dimensions.Count; i++)
            if (!own[i]) dimensions[i] *= factor;
        return true;
    }

    private static bool TryRadii(
        ref ValueScanner scanner, string kind, double factor, Dictionary<string, double> radii, out string error)
    {
        error = "";
        var names = RadiiOf(kind);
        while (!scanner.AtEnd)
        {
            var rest = scanner.Rest;
            var name = scanner.Word().ToLowerInvariant();
            if (!names.Contains(name))
            {
                error = names.IsEmpty || name.Length == 0
                    ? $"{Excerpt.Of(rest)} after the dimensions is not understood; leave it out"
                    : $"{Excerpt.Of(name)} is not a corner radius of a {kind}; {NearestName.Advice(name, names)}";
                return false;
            }

            _ = scanner.Take("=");
            if (!scanner.TryNumber(out var number, out error)) return false;

            var ownFactor = factor;
            if (!scanner.AtEnd && !StartsRadius(scanner.Rest, kind) && !TryUnit(scanner.UnitWord(), out ownFactor, out error)) return false;
            if (radii.TryAdd(name, number * ownFactor)) continue;
            error = $"'{name}' is given twice; give it once";
            return false;
        }

        if (radii.Count == 1 && names.Length == 2)
        {
            error = $"'{names.Single(name => !radii.ContainsKey(name))}' is missing; give both radii, ro outside and ri inside, or neither for sharp corners";
            return false;
        }

        return true;
    }

    private static bool TryUnit(string symbol, out double factor, out string error)
    {
        var known = UnitText.TryRead(symbol, Quantity.Length, out var unit, out error);
        factor = unit?.Factor ?? double.NaN;
        return known;
    }

    private static bool StartsRadius(ReadOnlySpan<char> rest, string kind)
    {
        var scanner = new ValueScanner(rest);
        return RadiiOf(kind).Contains(scanner.Word().ToLowerInvariant());
    }

    private static ImmutableArray<string> RadiiOf(string kind) => kind switch
    {
        "rectangle" => ["r"],
        "box" => ["ro", "ri"],
        "I" or "L" or "U" or "T" => ["r"],
        _ => [],
    };

    private static int Count(string kind) => kind switch { "round" => 1, "box" or "L" => 3, "I" or "U" or "T" => 4, _ => 2 };

    private static string Meaning(string kind) => kind switch
    {
        "round" => "1 dimension (the diameter)",
        "tube" => "2 dimensions (outer diameter x wall)",
        "rectangle" => "2 dimensions (width along y x depth along z)",
        "L" => "3 dimensions (leg along z x leg along y x thickness)",
        "I" or "U" or "T" => "4 dimensions (depth along z x width along y x web x flange)",
        _ => "3 dimensions (width along y x depth along z x wall)",
    };

    private static SectionFault? Fault(string kind, List<double> d, Dictionary<string, double> radii) => kind switch
    {
        "round" => Round.Fault(d[0] / 2),
        "tube" => Tube.Fault(d[0] / 2, d[1]),
        "rectangle" when radii.TryGetValue("r", out var radius) => RoundedRectangle.Fault(d[0], d[1], radius),
        "rectangle" => Rectangle.Fault(d[0], d[1]),
        "I" or "L" or "U" or "T" => OpenProfile.Fault(Shape(kind), d[0], d[1], d[2], d[^1], radii.GetValueOrDefault("r")),
        _ => Box.Fault(d[0], d[1], d[2], radii.GetValueOrDefault("ro"), radii.GetValueOrDefault("ri")),
    };

    private static CrossSection Make(string kind, List<double> d, Dictionary<string, double> radii) => kind switch
    {
        "round" => new Round(d[0] / 2),
        "tube" => new Tube(d[0] / 2, d[1]),
        "rectangle" when radii.TryGetValue("r", out var radius) => new RoundedRectangle(d[0], d[1], radius),
        "rectangle" => new Rectangle(d[0], d[1]),
        "I" or "L" or "U" or "T" => new OpenProfile(Shape(kind), d[0], d[1], d[2], d[^1], radii.GetValueOrDefault("r")),
        _ => new Box(d[0], d[1], d[2], radii.GetValueOrDefault("ro"), radii.GetValueOrDefault("ri")),
    };

    private static OpenShape Shape(string kind) => kind switch { "I" => OpenShape.I, "L" => OpenShape.L, "U" => OpenShape.U, _ => OpenShape.T };
}
