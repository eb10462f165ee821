using MemberScan.Mechanics.Sections;

namespace MemberScan.Checks.Aisc360;

/// <summary>AISC 360-22, B4.2: the wall that hollow sections are calculated with.</summary>
/// <remarks>From memory: 0.93 of the nominal wall, and the whole of it for box sections and for sections to ASTM A1065 and A1085.</remarks>
public static class DesignWall
{
    /// <summary>Design wall over nominal wall of hollow sections of other standards than A1065 and A1085 [-].</summary>
    public const double Share = 0.93;

    /// <summary>Where the rule comes from.</summary>
    public static Clause Clause { get; } = StrengthFactor.Clause("B4.2", "");

    /// <summary>The share by the name of the grade: 1 for A1065 and A1085, else 0.93.</summary>
    /// <param name="gradeName">Name of the material's grade, such as <c>A1085</c>; may be empty.</param>
    public static double ShareOf(string gradeName)
    {
        ArgumentNullException.ThrowIfNull(gradeName);
        return gradeName.Contains("A1085", StringComparison.OrdinalIgnoreCase) || gradeName.Contains("A1065", StringComparison.OrdinalIgnoreCase) ? 1 : Share;
    }

    /// <summary>The section with its design wall; sections that are not hollow stay as they are.</summary>
    /// <param name="nominal">The section with its nominal wall.</param>
    /// <param name="share">Design wall over nominal wall [-], in (0, 1].</param>
    /// <remarks>The outer size stays; corner radii shrink with the wall, as the tabulated 2.0t and 1.0t of the design wall do.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">The share is not in (0, 1].</exception>
    public static CrossSection Of(CrossSection nominal, double share)
    {
        ArgumentNullException.ThrowIfNull(nominal);
        if (!(share > 0 && share <= 1)) throw new ArgumentOutOfRangeException(nameof(share), share, "the share must be above 0 and at most 1");

        return nominal switch
        {
            Tube tube => new Tube(tube.OuterRadius, share * tube.Wall),
            Box box => new Box(box.Width, box.Depth, share * box.Wall, share * box.OuterRadius, share * box.InnerRadius),
            _ => nominal,
        };
    }

    /// <summary>The basis of the wall in words, for every result that hangs on it.</summary>
    public static string Words(CrossSection nominal, double share) => nominal switch
    {
        Tube tube => OfWall(tube.Wall, share),
        Box box => OfWall(box.Wall, share),
        _ => "gross section",
    };

    private static string OfWall(double wall, double share) => share < 1
        ? $"design wall {Shown.Number(share)}·{Shown.Mm(wall)} mm = {Shown.Mm(share * wall)} mm ({Clause})"
        : $"nominal wall {Shown.Mm(wall)} mm ({Clause})";
}
