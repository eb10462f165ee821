using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Checks.Allowable;

/// <summary>Axial force and moments over the plastic resistances at a limit stress: information beside an elastic value, never a verdict.</summary>
/// <remarks>
/// Plain mechanics. The shares are added, which is cautious; of round sections the resultant moment counts. Shear and torsion are left
/// out, and so is local buckling.
/// </remarks>
public static class PlasticRatio
{
    /// <summary>Where the ratio comes from.</summary>
    public static Clause Clause { get; } = new("", "ratio to the plastic moment, information", "", FromMemory: false);

    /// <summary>The ratio of one state of forces.</summary>
    /// <param name="section">The section.</param>
    /// <param name="properties">Its properties.</param>
    /// <param name="forces">Section forces; finite.</param>
    /// <param name="limitStress">Stress at which the section is taken as plastic, such as <c>fy/Ω</c> [Pa], &gt; 0.</param>
    /// <returns>The ratio [-] with its calculation.</returns>
    /// <exception cref="ArgumentException">A force is not finite.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The limit stress is not above zero.</exception>
    public static CheckResult.Evaluated Of(CrossSection section, SectionProperties properties, in SectionForces forces, double limitStress)
    {
        ArgumentNullException.ThrowIfNull(properties);
        if (!forces.IsFinite) throw new ArgumentException("the section forces must be finite numbers", nameof(forces));
        if (!double.IsFinite(limitStress) || limitStress <= 0)
            throw new ArgumentOutOfRangeException(nameof(limitStress), limitStress, "the limit stress must be a finite number above zero");

        var (my, mz) = section is Round or Tube ? (double.Hypot(forces.My, forces.Mz), 0) : (Math.Abs(forces.My), Math.Abs(forces.Mz));
        var axial = Math.Abs(forces.N) / (properties.Area * limitStress);
        var (aboutY, aboutZ) = (my / (properties.WplY * limitStress), mz / (properties.WplZ * limitStress));
        return new Calculation(Clause)
            .Given("limit stress", limitStress, "Pa", "limit of the stress check")
            .Given("A", properties.Area, "m²", "section")
            .Given("WplY", properties.WplY, "m³", "section")
            .Given("WplZ", properties.WplZ, "m³", "section")
            .Found("N share", $"|N|/(A·limit) = {Shown.KN(Math.Abs(forces.N))} kN / ({Shown.Mm2(properties.Area)} mm²·{Shown.MPa(limitStress)} MPa)", axial, "-", "plastic axial force")
            .Found("My share", $"My/(WplY·limit) = {Shown.Number(my / 1e3)} kN·m / ({Shown.Mm3(properties.WplY)} mm³·{Shown.MPa(limitStress)} MPa)", aboutY, "-", "plastic moment")
            .Found("Mz share", $"Mz/(WplZ·limit) = {Shown.Number(mz / 1e3)} kN·m / ({Shown.Mm3(properties.WplZ)} mm³·{Shown.MPa(limitStress)} MPa)", aboutZ, "-", "plastic moment")
            .Utilization($"sum of the shares = {Shown.Number(axial)} + {Shown.Number(aboutY)} + {Shown.Number(aboutZ)}", axial + aboutY + aboutZ);
    }
}
