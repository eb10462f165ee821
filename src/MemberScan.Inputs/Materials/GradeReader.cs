using System.Collections.Immutable;
using MemberScan.Foundation.Units;
using MemberScan.Inputs.Json;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.Materials;

/// <summary>Reads a list of grades, of the shipped table or of the settings.</summary>
internal static class GradeReader
{
    public static readonly ImmutableArray<string> Keys = ["name", "pattern", "standard", "yields", "modulus", "poisson", "isSteel", "fromMemory"];
    public static readonly ImmutableArray<string> YieldKeys = ["upTo", "yield"];

    /// <summary>Largest Poisson's ratio [-]; at 0.5 the elasticity formulas end.</summary>
    public const double LargestPoisson = 0.499;

    private static readonly (double Least, double Most) s_yield = (Si.MPa(10), Si.MPa(3000));
    private static readonly (double Least, double Most) s_modulus = (Si.GPa(1), Si.GPa(1000));
    private static readonly (double Least, double Most) s_thickness = (Si.Mm(0.1), Si.Mm(10_000));

    /// <summary>Reads the grades; wrong ones are errors and left out.</summary>
    public static ImmutableArray<Grade> Read(JsonItem list, string path, JsonValues values)
    {
        var grades = ImmutableArray.CreateBuilder<Grade>();
        var number = 0;
        foreach (var item in values.List(list, path))
        {
            number++;
            if (OfOne(item, $"{path}[{number}]", values) is not { } grade) continue;
            if (grades.Any(other => other.Name == grade.Name))
                values.Fail(InputCodes.EntryDoubled, item, $"{path}[{number}] has the name {Excerpt.Of(grade.Name)} of an earlier one; keep one of them");
            else
                grades.Add(grade);
        }

        return grades.ToImmutable();
    }

    private static Grade? OfOne(JsonItem item, string path, JsonValues values)
    {
        if (!values.Has(item, path, "name", "pattern", "standard", "yields", "modulus", "poisson", "isSteel")) return null;

        string? name = null, pattern = null, standard = null;
        double? modulus = null, poisson = null;
        bool? isSteel = null, fromMemory = false;
        ImmutableArray<YieldRange> yields = [];
        foreach (var (key, _, value) in values.Object(item, path, Keys))
        {
            var at = $"{path}.{key}";
            switch (key)
            {
                case "name": name = values.Text(value, at); break;
                case "pattern": pattern = Pattern(value, at, values); break;
                case "standard": standard = values.Text(value, at); break;
                case "yields": yields = Yields(value, at, values); break;
                case "modulus": modulus = values.Quantity(value, at, Quantity.Stress, "210 GPa", s_modulus.Least, s_modulus.Most); break;
                case "poisson": poisson = values.Number(value, at, 0, LargestPoisson); break;
                case "isSteel": isSteel = values.Flag(value, at); break;
                default: fromMemory = values.Flag(value, at); break;
            }
        }

        return name is null || pattern is null || standard is null || modulus is null || poisson is null || isSteel is null
            || fromMemory is null || yields.IsEmpty
            ? null
            : new Grade(name, pattern, standard, yields, modulus.Value, poisson.Value, isSteel.Value, fromMemory.Value);
    }

    private static string? Pattern(JsonItem item, string path, JsonValues values)
    {
        if (values.Text(item, path) is not { } pattern) return null;
        if (values.PatternFault(pattern) is not { } fault) return pattern;

        values.Fail(InputCodes.PatternUnusable, item, $"{path}: {fault}");
        return null;
    }

    private static ImmutableArray<YieldRange> Yields(JsonItem list, string path, JsonValues values)
    {
        var ranges = ImmutableArray.CreateBuilder<YieldRange>();
        foreach (var item in values.List(list, path))
        {
            if (Range(item, $"{path}[{ranges.Count + 1}]", values) is not { } range) return [];
            if (ranges.Count > 0 && range.UpTo <= ranges[^1].UpTo)
            {
                values.Fail(InputCodes.OutOfRange, item, $"{path} is not in the order of thickness; give the thinnest range first and the open one last");
                return [];
            }

            ranges.Add(range);
        }

        if (ranges.Count == 0 && list.Items.IsEmpty && list.Kind == System.Text.Json.JsonValueKind.Array)
            values.Fail(InputCodes.KeyMissing, list, $"{path} is empty; give at least one yield strength");
        return ranges.ToImmutable();
    }

    // Without "upTo" the range is open.
    private static YieldRange? Range(JsonItem item, string path, JsonValues values)
    {
        if (!values.Has(item, path, "yield")) return null;

        double? upTo = double.PositiveInfinity, yield = null;
        foreach (var (key, _, value) in values.Object(item, path, YieldKeys))
        {
            var at = $"{path}.{key}";
            if (key == "upTo") upTo = values.Quantity(value, at, Quantity.Length, "16 mm", s_thickness.Least, s_thickness.Most);
            else yield = values.Quantity(value, at, Quantity.Stress, "235 MPa", s_yield.Least, s_yield.Most);
        }

        return upTo is null || yield is null ? null : new YieldRange(upTo.Value, yield.Value);
    }
}
