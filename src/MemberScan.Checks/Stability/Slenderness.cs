using System.Globalization;

namespace MemberScan.Checks.Stability;

/// <summary>Slenderness of a member against customary largest values: a note, never a verdict.</summary>
/// <remarks>300 for tension and 200 for compression: user notes of AISC 360-22, D1 and E2, from memory; recommendations, not limits.</remarks>
public static class Slenderness
{
    /// <summary>Customary largest L/r of members in tension, rods and hangers excepted [-].</summary>
    public const double CustomaryInTension = 300;

    /// <summary>Customary largest Lc/r of members in compression [-].</summary>
    public const double CustomaryInCompression = 200;

    /// <summary>Where the values come from.</summary>
    public static Clause Clause { get; } = new("AISC 360-22", "D1 and E2, user notes", "", FromMemory: true);

    /// <summary>The slenderness over its customary largest value, as information.</summary>
    /// <param name="length">Member length in tension, buckling length in compression [m], &gt; 0.</param>
    /// <param name="radiusOfGyration">Smaller radius of gyration [m], &gt; 0.</param>
    /// <param name="isCompressed">Whether the member is compressed.</param>
    public static NamedCheck Note(double length, double radiusOfGyration, bool isCompressed)
    {
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(length);
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(radiusOfGyration);
        var slenderness = length / radiusOfGyration;
        var largest = isCompressed ? CustomaryInCompression : CustomaryInTension;
        var result = new Calculation(Clause)
            .Given("L", length, "m", isCompressed ? "buckling length" : "member length")
            .Given("r", radiusOfGyration, "m", "section, smaller radius of gyration")
            .Found("L/r", $"{Shown.Mm(length)}/{Shown.Mm(radiusOfGyration)}", slenderness, "-", "slenderness")
            .Utilization(string.Create(CultureInfo.InvariantCulture, $"(L/r)/{largest:0}"), slenderness / largest);
        return new NamedCheck("slenderness", isCompressed ? "slenderness in compression, customary" : "slenderness in tension, customary", CheckStanding.Informs, result);
    }
}
