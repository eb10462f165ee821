using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Screening;

/// <summary>The numbers that stresses are worked out for; beyond them powers of a double underflow to zero or overflow, and a stress would be lost.</summary>
public static class NumberRange
{
    /// <summary>Extents outside this range [m] are no section of a structure.</summary>
    private const double LeastExtent = 1e-9, LargestExtent = 1e9;

    /// <summary>Nominal stress [Pa] from which on no search for the largest one is made; its square is still a number.</summary>
    private const double LargestStress = 1e100;

    /// <summary>Forces [N] and moments [N·m] below this are none; their square would underflow.</summary>
    public const double LeastForce = 1e-100;

    /// <summary>Whether the powers of a section's dimensions are numbers to calculate with.</summary>
    public static bool Holds(CrossSection section)
    {
        ArgumentNullException.ThrowIfNull(section);
        if (Math.Min(section.ExtentY, section.ExtentZ) < LeastExtent || Math.Max(section.ExtentY, section.ExtentZ) > LargestExtent) return false;

        var p = SectionProperties.Of(section);
        return double.IsNormal(p.Area) && double.IsNormal(p.Iy) && double.IsNormal(p.Iz);
    }

    /// <summary>Whether the stresses of a section under given forces are numbers to calculate with.</summary>
    /// <param name="section">A section that <see cref="Holds(CrossSection)"/>.</param>
    /// <param name="p">Its properties.</param>
    /// <param name="forces">The forces.</param>
    public static bool Holds(CrossSection section, SectionProperties p, in SectionForces forces)
    {
        ArgumentNullException.ThrowIfNull(section);
        ArgumentNullException.ThrowIfNull(p);
        var extent = Math.Max(section.ExtentY, section.ExtentZ);
        var nominal = (Math.Abs(forces.N) + Math.Abs(forces.Vy) + Math.Abs(forces.Vz)) / p.Area
            + (Math.Abs(forces.T) + Math.Abs(forces.My) + Math.Abs(forces.Mz)) * extent / Math.Min(p.Iy, p.Iz);
        return nominal <= LargestStress
            && IsNoneOrMore(forces.N) && IsNoneOrMore(forces.Vy) && IsNoneOrMore(forces.Vz)
            && IsNoneOrMore(forces.T) && IsNoneOrMore(forces.My) && IsNoneOrMore(forces.Mz);

        static bool IsNoneOrMore(double force) => force == 0 || Math.Abs(force) >= LeastForce;
    }
}
