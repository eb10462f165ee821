namespace MemberScan.Reporting.Display;

/// <summary>A unit in which the report shows SI values.</summary>
/// <param name="Symbol">Symbol as printed; empty for a ratio.</param>
/// <param name="Size">One unit = size × SI unit.</param>
public sealed record ShownUnit(string Symbol, double Size)
{
    /// <summary>Magnitudes of a shown value below this are rounding of the computation and printed as "≈ 0" [shown unit].</summary>
    public const double Negligible = 1e-9;

    /// <summary>Stress and strength: MPa.</summary>
    public static ShownUnit Stress { get; } = new("MPa", 1e6);

    /// <summary>Force: kN.</summary>
    public static ShownUnit Force { get; } = new("kN", 1e3);

    /// <summary>Moment of a force: kN·m.</summary>
    public static ShownUnit Moment { get; } = new("kN·m", 1e3);

    /// <summary>Dimension of a cross-section: mm.</summary>
    public static ShownUnit Dimension { get; } = new("mm", 1e-3);

    /// <summary>Area: mm².</summary>
    public static ShownUnit Area { get; } = new("mm²", 1e-6);

    /// <summary>Section modulus: mm³.</summary>
    public static ShownUnit Modulus { get; } = new("mm³", 1e-9);

    /// <summary>Second moment of area: mm⁴.</summary>
    public static ShownUnit SecondMoment { get; } = new("mm⁴", 1e-12);

    /// <summary>The unit in which a value of a calculation is shown.</summary>
    /// <param name="siUnit">SI unit of the value: <c>m</c>, <c>m²</c>, <c>m³</c>, <c>m⁴</c>, <c>N</c>, <c>N·m</c>, <c>Pa</c>, <c>-</c>; any other is shown as it is.</param>
    public static ShownUnit Of(string siUnit) => siUnit switch
    {
        "m" => Dimension,
        "m²" => Area,
        "m³" => Modulus,
        "m⁴" => SecondMoment,
        "N" => Force,
        "N·m" => Moment,
        "Pa" => Stress,
        "-" or "" => new ShownUnit("", 1),
        _ => new ShownUnit(siUnit, 1),
    };

    /// <summary>The number alone, for a column or row that names the unit.</summary>
    /// <param name="si">Value in SI.</param>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite.</exception>
    public string Figure(double si)
    {
        var shown = si / Size;
        return shown != 0 && Math.Abs(shown) < Negligible && Symbol.Length > 0 ? "≈\u00A00" : Figures.Significant(shown);
    }

    /// <summary>Number and unit, held together by a space that does not break a line.</summary>
    /// <param name="si">Value in SI.</param>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite.</exception>
    public string WithUnit(double si) => Symbol.Length > 0 ? Figure(si) + '\u00A0' + Symbol : Figure(si);
}
