using System.Collections.Frozen;

namespace MemberScan.Foundation.Units;

/// <summary>A unit as people write it: its symbol, what it measures, and its size in SI.</summary>
/// <param name="Symbol">The symbol in our own spelling.</param>
/// <param name="Quantity">What it measures.</param>
/// <param name="Factor">One unit = factor × SI unit.</param>
public sealed record Unit(string Symbol, Quantity Quantity, double Factor)
{
    private static readonly (string Spelling, string Symbol)[] s_spellings =
    [
        ("inch", "in"), ("\"", "in"), ("'", "ft"), ("lb", "lbf"), ("kips", "kip"), ("k", "kip"), ("kipf", "kip"),
        ("kips·ft", "kip·ft"), ("kips·in", "kip·in"), ("lb·in", "lbf·in"), ("lb·ft", "lbf·ft"), ("in·lbf", "lbf·in"), ("ft·lbf", "lbf·ft"),
    ];

    private static readonly FrozenDictionary<string, Unit> s_known = Known().ToFrozenDictionary(StringComparer.Ordinal);

    /// <summary>Symbols that <see cref="TryParse"/> knows for a quantity, in our own spelling, in the order of the table.</summary>
    public static IReadOnlyList<string> SymbolsOf(Quantity quantity) =>
        [.. Basic().Where(u => u.Quantity == quantity).Select(u => u.Symbol)];

    /// <summary>Reads a unit symbol such as <c>kN</c>, <c>kN·m</c>, <c>kNm</c>, <c>lbf*in</c>, <c>N/mm2</c>.</summary>
    /// <remarks>Case matters (mN is not MN). A dot, star, hyphen or blank between the parts of a moment may be left out.</remarks>
    public static bool TryParse(string text, [System.Diagnostics.CodeAnalysis.NotNullWhen(true)] out Unit? unit)
    {
        ArgumentNullException.ThrowIfNull(text);
        return s_known.TryGetValue(Dotted(text), out unit);
    }

    /// <summary>One spelling for every mark between the parts of a moment; no mark is dropped, so "kN·m·m" is not "kN·mm".</summary>
    private static string Dotted(string text) => text.Trim()
        .Replace('⋅', '·').Replace('*', '·').Replace('-', '·').Replace(' ', '·').Replace('²', '2');

    private static Dictionary<string, Unit> Known()
    {
        var known = new Dictionary<string, Unit>(StringComparer.Ordinal);
        foreach (var unit in Basic()) Add(unit.Symbol, unit);
        foreach (var (spelling, symbol) in s_spellings) Add(spelling, known[symbol]);
        return known;

        void Add(string spelling, Unit unit)
        {
            known[spelling] = unit;
            known[spelling.Replace("·", "", StringComparison.Ordinal)] = unit;
        }
    }

    private static Unit[] Basic() =>
    [
        new("m", Quantity.Length, 1), new("mm", Quantity.Length, 1e-3), new("cm", Quantity.Length, 1e-2),
        new("in", Quantity.Length, Si.Inch), new("ft", Quantity.Length, Si.Foot),
        new("N", Quantity.Force, 1), new("kN", Quantity.Force, 1e3), new("MN", Quantity.Force, 1e6),
        new("lbf", Quantity.Force, Si.PoundForce), new("kip", Quantity.Force, Si.Kip),
        new("N·m", Quantity.Moment, 1), new("kN·m", Quantity.Moment, 1e3), new("MN·m", Quantity.Moment, 1e6),
        new("N·mm", Quantity.Moment, 1e-3), new("kN·mm", Quantity.Moment, 1), new("kN·cm", Quantity.Moment, 10),
        new("lbf·in", Quantity.Moment, Si.PoundForce * Si.Inch), new("lbf·ft", Quantity.Moment, Si.PoundForce * Si.Foot),
        new("kip·in", Quantity.Moment, Si.Kip * Si.Inch), new("kip·ft", Quantity.Moment, Si.Kip * Si.Foot),
        new("Pa", Quantity.Stress, 1), new("kPa", Quantity.Stress, 1e3), new("MPa", Quantity.Stress, 1e6),
        new("GPa", Quantity.Stress, 1e9), new("N/mm2", Quantity.Stress, 1e6), new("kN/m2", Quantity.Stress, 1e3),
        new("kN/cm2", Quantity.Stress, 1e7),
        new("psi", Quantity.Stress, Si.PoundPerSquareInch), new("ksi", Quantity.Stress, 1000 * Si.PoundPerSquareInch),
        new("%", Quantity.Ratio, 0.01),
        new("rad", Quantity.Angle, 1), new("deg", Quantity.Angle, Math.PI / 180),
    ];
}
