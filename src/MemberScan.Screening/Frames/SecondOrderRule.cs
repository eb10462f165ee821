using MemberScan.Model.Frames;

namespace MemberScan.Screening.Frames;

/// <summary>How near a compressed member comes to its Euler load, where a first-order analysis begins to err.</summary>
internal static class SecondOrderRule
{
    /// <summary>Share of the Euler load from which results say so [-]: 10 %, as EN 1993-1-1:2005 5.2.1(3) has for frames (αcr ≥ 10; from memory).</summary>
    public const double Warned = 0.1;

    /// <summary>Compression as a share of the Euler load <c>π²·E·Imin/L²</c> of the member hinged at both its ends [-]; 0 for tension.</summary>
    /// <param name="member">The member.</param>
    /// <param name="length">Its length [m].</param>
    /// <param name="axial">Axial force [N], tension positive.</param>
    public static double Share(FrameMember member, double length, double axial)
    {
        if (axial >= 0) return 0;

        // Of a tapering member the thinnest section counts for its whole length, which tells too early.
        var least = member.Taper.Select(t => t.Section).Append(member.Section).Min(Least);
        return -axial * length * length / (Math.PI * Math.PI * member.Material.E * least);
    }

    private static double Least(FrameSection section) =>
        0.5 * (section.Iy + section.Iz) - Math.Sqrt(0.25 * (section.Iy - section.Iz) * (section.Iy - section.Iz) + section.Iyz * section.Iyz);
}
