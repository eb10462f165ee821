using MemberScan.Mechanics.Sections;

namespace MemberScan.Checks.En1993.Members;

/// <summary>A buckling curve with its imperfection factor.</summary>
/// <param name="Name">a0, a, b, c or d.</param>
/// <param name="Alpha">Imperfection factor α [-].</param>
/// <remarks>From memory: EN 1993-1-1:2005, Tables 6.1 and 6.2.</remarks>
public sealed record BucklingCurve(string Name, double Alpha)
{
    private const double HighStrength = 460e6;

    /// <summary>Curve a0, α = 0.13.</summary>
    public static BucklingCurve A0 { get; } = new("a0", 0.13);

    /// <summary>Curve a, α = 0.21.</summary>
    public static BucklingCurve A { get; } = new("a", 0.21);

    /// <summary>Curve b, α = 0.34.</summary>
    public static BucklingCurve B { get; } = new("b", 0.34);

    /// <summary>Curve c, α = 0.49.</summary>
    public static BucklingCurve C { get; } = new("c", 0.49);

    /// <summary>Curve d, α = 0.76.</summary>
    public static BucklingCurve D { get; } = new("d", 0.76);

    /// <summary>Curve of a bar, tube or box: Table 6.2; of stainless steel d, the least favourable of EN 1993-1-4, Table 5.3.</summary>
    /// <param name="section">The section.</param>
    /// <param name="forming">How a hollow section was made.</param>
    /// <param name="f_y">Nominal yield strength [Pa].</param>
    /// <param name="steel">Carbon or stainless steel.</param>
    /// <exception cref="ArgumentOutOfRangeException">The section is open or drawn.</exception>
    public static BucklingCurve Of(CrossSection section, HollowForming forming, double f_y, SteelKind steel) => section switch
    {
        Round or Rectangle or RoundedRectangle or Tube or Box when steel == SteelKind.Stainless => D,
        Round or Rectangle or RoundedRectangle => C,
        Tube or Box when forming == HollowForming.HotFinished => f_y >= HighStrength ? A0 : A,
        Tube or Box => C,
        _ => throw new ArgumentOutOfRangeException(nameof(section), "no curve for this kind of section here"),
    };

    /// <summary>Curves of a rolled I section about its strong and its weak axis: Table 6.2, S235 to S420 below 460 MPa.</summary>
    /// <param name="h">Depth [m].</param>
    /// <param name="b">Width of the flanges [m].</param>
    /// <param name="t_f">Thickness of the flanges [m].</param>
    /// <param name="f_y">Nominal yield strength [Pa].</param>
    public static (BucklingCurve Strong, BucklingCurve Weak) OfRolledI(double h, double b, double t_f, double f_y)
    {
        var isHigh = f_y >= HighStrength;
        return (h / b > 1.2, t_f) switch
        {
            (true, <= 0.040) => isHigh ? (A0, A0) : (A, B),
            (true, <= 0.100) => isHigh ? (A, A) : (B, C),
            (false, <= 0.100) => isHigh ? (A, A) : (B, C),
            // Deep sections with flanges over 100 mm are not in the table; they take the row of the others.
            _ => isHigh ? (C, C) : (D, D),
        };
    }
}
