using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Forces;

namespace MemberScan.Checks.En1993.Sections;

/// <summary>A cross-section under the design forces of one situation at one station.</summary>
public sealed record SectionCase
{
    /// <summary>The section, gross.</summary>
    public required CrossSection Section { get; init; }

    /// <summary>Its properties.</summary>
    public required SectionProperties Properties { get; init; }

    /// <summary>Section forces; finite.</summary>
    public required SectionForces Forces { get; init; }

    /// <summary>Kind of the situation; only design situations are held against these resistances.</summary>
    public required SituationKind Kind { get; init; }

    /// <summary>Yield strength f_y, of stainless steel the 0.2 % proof strength [Pa], &gt; 0.</summary>
    public required double Yield { get; init; }

    /// <summary>Modulus of elasticity E [Pa], &gt; 0; used with stainless steel alone.</summary>
    public double Modulus { get; init; } = 210e9;

    /// <summary>Carbon or stainless steel.</summary>
    public SteelKind Steel { get; init; }

    /// <summary>Partial factor γM0 [-], ≥ 1.</summary>
    public double GammaM0 { get; init; } = 1;

    /// <summary>Where the strength comes from, in words.</summary>
    public string YieldSource { get; init; } = "material of the member";

    /// <summary>Where the partial factor comes from, in words.</summary>
    public string GammaSource { get; init; } = "settings";

    internal bool IsRound => Section is Round or Tube;

    internal bool IsSolid => Section is Round or Rectangle or RoundedRectangle;

    internal bool IsCovered => IsSolid || Section is Tube or Box;

    /// <summary>Resultant moment of a round section, or the moment about y [N·m], ≥ 0.</summary>
    internal static (double My, double Mz) Moments(bool isRound, in SectionForces forces) =>
        isRound ? (double.Hypot(forces.My, forces.Mz), 0) : (Math.Abs(forces.My), Math.Abs(forces.Mz));

    /// <summary>The lines of strength and factor that every resistance begins with.</summary>
    internal IEnumerable<TraceLine> StrengthLines()
    {
        yield return new("f_y", "", Yield, "Pa", YieldSource);
        yield return new("γM0", "", GammaM0, "-", GammaSource);
    }

    internal void ThrowUnlessUsable()
    {
        if (!Forces.IsFinite) throw new ArgumentException("the section forces must be finite numbers", nameof(Forces));
        if (!double.IsFinite(Yield) || Yield <= 0) throw new ArgumentOutOfRangeException(nameof(Yield), Yield, "the strength must be a finite number above zero");
        if (!double.IsFinite(Modulus) || Modulus <= 0) throw new ArgumentOutOfRangeException(nameof(Modulus), Modulus, "the modulus must be a finite number above zero");
        if (!double.IsFinite(GammaM0) || GammaM0 < 1) throw new ArgumentOutOfRangeException(nameof(GammaM0), GammaM0, "the factor must be a finite number of at least 1");
    }
}
