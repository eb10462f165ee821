using MemberScan.Checks.Stability;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Forces;

namespace MemberScan.Checks.Aisc360.Sections;

/// <summary>A member's section with its lengths under the forces of one situation at one station.</summary>
/// <remarks>The section is that of the design wall (<see cref="DesignWall.Of"/>); the caller makes it, since its properties take their time.</remarks>
public sealed record AiscCase
{
    /// <summary>The section that is calculated with; of hollow sections with the design wall.</summary>
    public required CrossSection Section { get; init; }

    /// <summary>Its properties.</summary>
    public required SectionProperties Properties { get; init; }

    /// <summary>The wall it has, in words: <see cref="DesignWall.Words"/>.</summary>
    public required string WallBasis { get; init; }

    /// <summary>Section forces; finite.</summary>
    public required SectionForces Forces { get; init; }

    /// <summary>Kind of the situation.</summary>
    public required SituationKind Kind { get; init; }

    /// <summary>ASD for service situations, LRFD for design situations.</summary>
    public required DesignMethod Method { get; init; }

    /// <summary>Yield strength F_y [Pa], &gt; 0.</summary>
    public required double Yield { get; init; }

    /// <summary>Modulus of elasticity E [Pa], &gt; 0; 29 000 ksi.</summary>
    public double Modulus { get; init; } = Si.Ksi(29_000);

    /// <summary>Effective length for bending about y, and for lateral-torsional buckling, or why it is not known.</summary>
    public required Finding<BucklingLength> LengthY { get; init; }

    /// <summary>Effective length for bending about z, or why it is not known.</summary>
    public required Finding<BucklingLength> LengthZ { get; init; }

    /// <summary>Length of the member [m], &gt; 0; for shear and torsion of tubes.</summary>
    public required double Length { get; init; }

    /// <summary>Where the strength comes from, in words.</summary>
    public string YieldSource { get; init; } = "material of the member";

    internal bool IsRound => Section is Round or Tube;

    internal bool IsHollow => Section is Tube or Box;

    internal bool IsCovered => Section is Round or Tube or Rectangle or RoundedRectangle or Box;

    internal IEnumerable<TraceLine> StrengthLines()
    {
        yield return new("F_y", "", Yield, "Pa", YieldSource);
        yield return new("E", "", Modulus, "Pa", "material of the member");
        yield return new("wall", "", WallOf(Section), "m", WallBasis);
    }

    internal void ThrowUnlessUsable()
    {
        if (!Forces.IsFinite) throw new ArgumentException("the section forces must be finite numbers", nameof(Forces));
        ThrowUnlessPositive(Yield, nameof(Yield));
        ThrowUnlessPositive(Modulus, nameof(Modulus));
        ThrowUnlessPositive(Length, nameof(Length));
    }

    private static double WallOf(CrossSection section) => section switch
    {
        Tube tube => tube.Wall,
        Box box => box.Wall,
        _ => Math.Min(section.ExtentY, section.ExtentZ),
    };

    private static void ThrowUnlessPositive(double value, string name)
    {
        if (!double.IsFinite(value) || value <= 0) throw new ArgumentOutOfRangeException(name, value, "the value must be a finite number above zero");
    }
}
