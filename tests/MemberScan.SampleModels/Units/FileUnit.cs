namespace MemberScan.SampleModels.Units;

/// <summary>A named unit of a file: an SI unit with a prefix, or one that converts to SI.</summary>
/// <param name="UnitType">Literal of IfcUnitEnum, such as <c>LENGTHUNIT</c>.</param>
/// <param name="SiName">Literal of IfcSIUnitName of the unit itself or of the one it converts to.</param>
/// <param name="Prefix">Literal of IfcSIPrefix; null for none.</param>
/// <param name="ConversionName">Name of a conversion-based unit; null for an SI unit.</param>
/// <param name="Measure">Measure type of the conversion factor, such as <c>IFCLENGTHMEASURE</c>.</param>
/// <param name="Dimensions">Exponents of length, mass and time.</param>
/// <param name="Factor">One unit = factor × coherent SI unit.</param>
public sealed record FileUnit(
    string UnitType, string SiName, string? Prefix, string? ConversionName, string Measure, (int Length, int Mass, int Time) Dimensions, double Factor)
{
    private const double PoundForceNewtons = 4.4482216152605;

    private const double InchMetres = 0.0254;

    /// <summary>Metre.</summary>
    public static FileUnit Metre { get; } = Length(null, null, 1);

    /// <summary>Millimetre.</summary>
    public static FileUnit Millimetre { get; } = Length("MILLI", null, 1e-3);

    /// <summary>International inch, exactly 25.4 mm.</summary>
    public static FileUnit Inch { get; } = Length(null, "inch", InchMetres);

    /// <summary>International foot, exactly 304.8 mm.</summary>
    public static FileUnit Foot { get; } = Length(null, "foot", 12 * InchMetres);

    /// <summary>Newton.</summary>
    public static FileUnit Newton { get; } = Force(null, null, 1);

    /// <summary>Kilonewton.</summary>
    public static FileUnit Kilonewton { get; } = Force("KILO", null, 1e3);

    /// <summary>Pound-force.</summary>
    public static FileUnit PoundForce { get; } = Force(null, "lbf", PoundForceNewtons);

    /// <summary>Kip, a thousand pound-force.</summary>
    public static FileUnit Kip { get; } = Force(null, "kip", 1000 * PoundForceNewtons);

    /// <summary>Pascal.</summary>
    public static FileUnit Pascal { get; } = Pressure(null, null, 1);

    /// <summary>Megapascal.</summary>
    public static FileUnit Megapascal { get; } = Pressure("MEGA", null, 1e6);

    /// <summary>Pound-force per square inch.</summary>
    public static FileUnit Psi { get; } = Pressure(null, "psi", PoundForceNewtons / (InchMetres * InchMetres));

    /// <summary>Kip per square inch.</summary>
    public static FileUnit Ksi { get; } = Pressure(null, "ksi", 1000 * PoundForceNewtons / (InchMetres * InchMetres));

    private static FileUnit Length(string? prefix, string? name, double factor) =>
        new("LENGTHUNIT", "METRE", prefix, name, "IFCLENGTHMEASURE", (1, 0, 0), factor);

    private static FileUnit Force(string? prefix, string? name, double factor) =>
        new("FORCEUNIT", "NEWTON", prefix, name, "IFCFORCEMEASURE", (1, 1, -2), factor);

    private static FileUnit Pressure(string? prefix, string? name, double factor) =>
        new("PRESSUREUNIT", "PASCAL", prefix, name, "IFCPRESSUREMEASURE", (-1, 1, -2), factor);
}
