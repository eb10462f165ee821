using MemberScan.Checks.Stability;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Forces;

namespace MemberScan.Checks.En1993.Members;

/// <summary>A straight, uniform member under the design forces of one situation.</summary>
public sealed record MemberCase
{
    /// <summary>The section, gross.</summary>
    public required CrossSection Section { get; init; }

    /// <summary>Its properties.</summary>
    public required SectionProperties Properties { get; init; }

    /// <summary>Largest actions along the member.</summary>
    public required MemberActions Actions { get; init; }

    /// <summary>Kind of the situation; only design situations are held against these resistances.</summary>
    public required SituationKind Kind { get; init; }

    /// <summary>Yield strength f_y, of stainless steel the 0.2 % proof strength [Pa], &gt; 0.</summary>
    public required double Yield { get; init; }

    /// <summary>Modulus of elasticity E [Pa], &gt; 0.</summary>
    public double Modulus { get; init; } = 210e9;

    /// <summary>Poisson's ratio ν [-], for the shear modulus <c>E/(2(1 + ν))</c>.</summary>
    public double Poisson { get; init; } = 0.3;

    /// <summary>Carbon or stainless steel.</summary>
    public SteelKind Steel { get; init; }

    /// <summary>How a hollow section was made.</summary>
    public HollowForming Forming { get; init; }

    /// <summary>Buckling length for bending about y and for lateral-torsional buckling, or why it is not known.</summary>
    public required Finding<BucklingLength> LengthY { get; init; }

    /// <summary>Buckling length for bending about z, or why it is not known.</summary>
    public required Finding<BucklingLength> LengthZ { get; init; }

    /// <summary>Partial factor γM1 [-], ≥ 1.</summary>
    public double GammaM1 { get; init; } = 1;

    /// <summary>Where the strength comes from, in words.</summary>
    public string YieldSource { get; init; } = "material of the member";

    /// <summary>Where the partial factor comes from, in words.</summary>
    public string GammaSource { get; init; } = "settings";

    internal BucklingCurve Curve => BucklingCurve.Of(Section, Forming, Yield, Steel);

    internal string CurveSource => Steel == SteelKind.Stainless
        ? $"least favourable of {Clauses.OfStainless("Table 5.3")}"
        : Section is Tube or Box && Forming == HollowForming.Unknown ? "Table 6.2, cold formed assumed (from memory)" : "Table 6.2 (from memory)";

    internal bool IsRound => Section is Round or Tube;

    internal bool IsCovered => Section is Round or Tube or Rectangle or RoundedRectangle or Box;

    internal void ThrowUnlessUsable()
    {
        ThrowUnlessPositive(Yield, nameof(Yield));
        ThrowUnlessPositive(Modulus, nameof(Modulus));
        if (!double.IsFinite(GammaM1) || GammaM1 < 1) throw new ArgumentOutOfRangeException(nameof(GammaM1), GammaM1, "the factor must be a finite number of at least 1");
        if (!(Poisson is >= 0 and < 0.5)) throw new ArgumentOutOfRangeException(nameof(Poisson), Poisson, "Poisson's ratio must lie in [0, 0.5)");
    }

    private static void ThrowUnlessPositive(double value, string name)
    {
        if (!double.IsFinite(value) || value <= 0) throw new ArgumentOutOfRangeException(name, value, "the value must be a finite number above zero");
    }
}
