using System.Collections.Immutable;

namespace MemberScan.Checks;

/// <summary>The lines of one check while it is made.</summary>
internal sealed class Calculation(Clause clause)
{
    private const double Tolerance = 1e-9;

    private readonly ImmutableArray<TraceLine>.Builder _lines = ImmutableArray.CreateBuilder<TraceLine>();

    /// <summary>Where the check comes from.</summary>
    public Clause Clause => clause;

    /// <summary>An input with its source.</summary>
    public Calculation Given(string symbol, double value, string unit, string source)
    {
        _lines.Add(new TraceLine(symbol, "", value, unit, source));
        return this;
    }

    /// <summary>A value found by a formula; of the check's own clause unless another source is named.</summary>
    public Calculation Found(string symbol, string formula, double value, string unit, string? source = null)
    {
        _lines.Add(new TraceLine(symbol, $"{formula} = {InUnit(value, unit)}", value, unit, source ?? clause.ToString()));
        return this;
    }

    /// <summary>Lines made elsewhere.</summary>
    public Calculation With(IEnumerable<TraceLine> lines)
    {
        _lines.AddRange(lines);
        return this;
    }

    /// <summary>The last line: the utilization.</summary>
    public CheckResult.Evaluated Utilization(string formula, double value)
    {
        if (!double.IsFinite(value) || value < 0)
            throw new ArithmeticException($"{clause}: the utilization is not a finite number of at least 0");

        Found("utilization", formula, value, "-");
        return new CheckResult.Evaluated(clause, value, _lines.ToImmutable());
    }

    /// <summary>The last two lines: a clause's own left side, and its root form where the left side is not linear in the load.</summary>
    /// <param name="formula">Formula of the left side with numbers.</param>
    /// <param name="leftSide">Left side under a multiple of the load, not falling as the multiple grows.</param>
    public CheckResult.Evaluated RootOf(string formula, Func<double, double> leftSide)
    {
        var (left, utilization) = (leftSide(1), RootForm.Of(leftSide));
        if (double.IsFinite(left)) Found("left side", formula, left, "-");
        else _lines.Add(new TraceLine("left side", $"{formula}: no resistance is left", double.MaxValue, "-", clause.ToString()));

        if (Math.Abs(left - utilization) <= Tolerance * utilization) return Utilization("left side", utilization);

        var multiple = utilization > 0 ? 1 / utilization : 0;
        return Utilization($"1/s, s = {Shown.Number(multiple)} being the multiple of the forces at which the left side reaches 1", utilization);
    }

    private static string InUnit(double value, string unit) => unit switch
    {
        "Pa" => Shown.MPa(value) + " MPa",
        "N" => Shown.KN(value) + " kN",
        "N·m" => Shown.Number(value / 1e3) + " kN·m",
        "m" => Shown.Mm(value) + " mm",
        "m²" => Shown.Mm2(value) + " mm²",
        "m³" => Shown.Mm3(value) + " mm³",
        "m⁴" => Shown.Number(value * 1e12) + " mm⁴",
        _ => Shown.Number(value),
    };
}
