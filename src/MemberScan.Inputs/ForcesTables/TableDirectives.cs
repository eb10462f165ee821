using MemberScan.Model.Rules;

namespace MemberScan.Inputs.ForcesTables;

/// <summary>What the directive remarks of a table say: <c># name: value</c>.</summary>
internal sealed class TableDirectives(Action<string, int, string> fail)
{
    private static readonly string[] s_names = ["convention", "torsion", "situations", "results"];

    private readonly Dictionary<string, string> _values = new(StringComparer.Ordinal);

    public ForceConvention? Convention => _values.GetValueOrDefault("convention") switch
    {
        null => null,
        "positive-face" => ForceConvention.PositiveFace,
        _ => ForceConvention.EndForces,
    };

    public TorsionReference Torsion => _values.GetValueOrDefault("torsion") switch
    {
        null => TorsionReference.NotStated,
        "centroid" => TorsionReference.Centroid,
        _ => TorsionReference.ShearCentre,
    };

    public bool ActsInFull => _values.GetValueOrDefault("situations") != "load-cases";

    public bool IsEnvelope => _values.GetValueOrDefault("situations") == "envelopes";

    public bool IsLinear => _values.ContainsKey("results");

    /// <summary>Takes a remark, its '#' included; passes over what is no directive.</summary>
    /// <remarks>
    /// A single word near a directive's name before a colon is taken for a slip of the pen: passing over it would change the meaning unsaid.
    /// </remarks>
    public void Take(string remark, int start, bool afterRows)
    {
        var colon = remark.IndexOf(':', StringComparison.Ordinal);
        if (colon < 0) return;

        var name = remark[1..colon].Trim().ToLowerInvariant();
        var value = remark[(colon + 1)..].Trim().ToLowerInvariant();
        if (NearestName.Of(name, s_names) is not { } nearest) return;

        if (nearest != name)
            Fail(InputCodes.DirectiveUnknown, $"{Excerpt.Of(name)} is not a directive; did you mean '{nearest}'? A remark may not look like one");
        else if (!ValuesOf(name).Contains(value))
            Fail(InputCodes.DirectiveUnknown, $"{Excerpt.Of(value)} is not a value of the directive '{name}'; {NearestName.Advice(value, ValuesOf(name))}");
        else if (afterRows)
            Fail(InputCodes.DirectiveLate, $"the directive '{name}' stands after the first row; move it to the top, for it holds for the whole file");
        else if (_values.TryGetValue(name, out var earlier) && earlier != value)
            Fail(InputCodes.DirectiveContradicted, $"the directive '{name}' says {value} here and {earlier} above; keep one of the two");
        else
            _values[name] = value;

        void Fail(string code, string message) => fail(code, start, message);
    }

    private static string[] ValuesOf(string name) => name switch
    {
        "convention" => ["positive-face", "end-forces"],
        "torsion" => ["centroid", "shear-centre"],
        "situations" => ["load-cases", "envelopes"],
        _ => ["linear"],
    };
}
