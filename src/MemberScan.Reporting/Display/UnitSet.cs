using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Display;

/// <summary>The units in which a report shows SI values.</summary>
/// <remarks>Sizes of the US customary units: NIST Special Publication 811 (2008), appendix B.</remarks>
public sealed record UnitSet
{
    private UnitSet(string name) => Name = name;

    /// <summary>Key of the setting that chooses the set.</summary>
    public const string Setting = "display";

    /// <summary>Megapascal, kilonewton, metre, millimetre.</summary>
    public static UnitSet Si { get; } = new("si")
    {
        Stress = ShownUnit.Stress,
        Force = ShownUnit.Force,
        Moment = ShownUnit.Moment,
        Length = new ShownUnit("m", 1),
        Dimension = ShownUnit.Dimension,
        Area = ShownUnit.Area,
        Modulus = ShownUnit.Modulus,
        SecondMoment = ShownUnit.SecondMoment,
    };

    /// <summary>Kip per square inch, kip, foot, inch.</summary>
    public static UnitSet Us { get; } = new("us")
    {
        Stress = new ShownUnit("ksi", 4448.2216152605 / (0.0254 * 0.0254)),
        Force = new ShownUnit("kip", 4448.2216152605),
        Moment = new ShownUnit("kip·ft", 4448.2216152605 * 0.3048),
        Length = new ShownUnit("ft", 0.3048),
        Dimension = new ShownUnit("in", 0.0254),
        Area = new ShownUnit("in²", 0.0254 * 0.0254),
        Modulus = new ShownUnit("in³", 0.0254 * 0.0254 * 0.0254),
        SecondMoment = new ShownUnit("in⁴", 0.0254 * 0.0254 * 0.0254 * 0.0254),
    };

    /// <summary>Name in the settings: <c>si</c> or <c>us</c>.</summary>
    public string Name { get; }

    /// <summary>Stress and strength.</summary>
    public required ShownUnit Stress { get; init; }

    /// <summary>Force.</summary>
    public required ShownUnit Force { get; init; }

    /// <summary>Moment of a force.</summary>
    public required ShownUnit Moment { get; init; }

    /// <summary>Length of and station along a member.</summary>
    public required ShownUnit Length { get; init; }

    /// <summary>Dimension of a cross-section.</summary>
    public required ShownUnit Dimension { get; init; }

    /// <summary>Area.</summary>
    public required ShownUnit Area { get; init; }

    /// <summary>Section modulus.</summary>
    public required ShownUnit Modulus { get; init; }

    /// <summary>Second moment of area.</summary>
    public required ShownUnit SecondMoment { get; init; }

    /// <summary>What is shown in which unit, in one line.</summary>
    public string Words =>
        $"stress {Stress.Symbol}, force {Force.Symbol}, moment {Moment.Symbol}, length {Length.Symbol}, cross-section {Dimension.Symbol}";

    /// <summary>The set that the settings of a run choose; SI where they say nothing.</summary>
    public static UnitSet Of(ScreeningRecord record)
    {
        ArgumentNullException.ThrowIfNull(record);
        return record.Settings.Any(s => s is { Key: Setting, Value: "us" }) ? Us : Si;
    }

    /// <summary>A station or length with three decimals, without its unit.</summary>
    /// <param name="metres">Length [m].</param>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite.</exception>
    public string Station(double metres) => Figures.Fixed(metres / Length.Size, 3);
}
