namespace MemberScan.Foundation.Units;

/// <summary>Figures in the unit of a book or a file, turned into SI in sight of the reader.</summary>
/// <remarks>The factors of inch and pound-force are exact (international yard and pound agreement of 1959, standard gravity).</remarks>
public static class Si
{
    /// <summary>One inch [m].</summary>
    public const double Inch = 0.0254;

    /// <summary>One foot [m].</summary>
    public const double Foot = 0.3048;

    /// <summary>One pound-force [N].</summary>
    public const double PoundForce = 4.4482216152605;

    /// <summary>One kip, 1000 pound-force [N].</summary>
    public const double Kip = 1000 * PoundForce;

    /// <summary>One pound-force per square inch [Pa].</summary>
    public const double PoundPerSquareInch = PoundForce / (Inch * Inch);

    /// <summary>Millimetres to metres.</summary>
    public static double Mm(double mm) => mm * 1e-3;

    /// <summary>Inches to metres.</summary>
    public static double In(double inches) => inches * Inch;

    /// <summary>Square millimetres to square metres.</summary>
    public static double Mm2(double mm2) => mm2 * 1e-6;

    /// <summary>Cubic centimetres to cubic metres.</summary>
    public static double Cm3(double cm3) => cm3 * 1e-6;

    /// <summary>Centimetres to the fourth power, to metres to the fourth power.</summary>
    public static double Cm4(double cm4) => cm4 * 1e-8;

    /// <summary>Millimetres to the fourth power, to metres to the fourth power.</summary>
    public static double Mm4(double mm4) => mm4 * 1e-12;

    /// <summary>Megapascals (N/mm²) to pascals.</summary>
    public static double MPa(double megapascals) => megapascals * 1e6;

    /// <summary>Gigapascals to pascals.</summary>
    public static double GPa(double gigapascals) => gigapascals * 1e9;

    /// <summary>Kips per square inch to pascals.</summary>
    public static double Ksi(double ksi) => ksi * 1000 * PoundPerSquareInch;

    /// <summary>Kilonewtons to newtons.</summary>
    public static double KN(double kilonewtons) => kilonewtons * 1e3;

    /// <summary>Kilonewton metres to newton metres.</summary>
    public static double KNm(double kilonewtonMetres) => kilonewtonMetres * 1e3;

    /// <summary>Pound-force to newtons.</summary>
    public static double Lbf(double poundsForce) => poundsForce * PoundForce;

    /// <summary>Pound-force inches to newton metres.</summary>
    public static double LbfIn(double poundForceInches) => poundForceInches * (PoundForce * Inch);
}
