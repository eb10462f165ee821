using MemberScan.Model.Forces;

namespace MemberScan.Checks.Aisc360;

/// <summary>A pair of factors of a clause: Ω for ASD and φ for LRFD.</summary>
/// <param name="Omega">Safety factor Ω [-], ≥ 1.</param>
/// <param name="Phi">Resistance factor φ [-], in (0, 1].</param>
/// <remarks>From memory: B3.1 and B3.2 and the clauses that name the factors.</remarks>
public readonly record struct StrengthFactor(double Omega, double Phi)
{
    /// <summary>Yielding, buckling, shear of hollow sections, torsion: Ω = 1.67, φ = 0.90.</summary>
    public static StrengthFactor Member { get; } = new(1.67, 0.90);

    /// <summary>Rupture, bolts and threaded parts: Ω = 2.00, φ = 0.75.</summary>
    public static StrengthFactor Rupture { get; } = new(2.00, 0.75);

    /// <summary>Available strength of a nominal one.</summary>
    public double Available(double nominal, DesignMethod method) => method == DesignMethod.Asd ? nominal / Omega : Phi * nominal;

    /// <summary>The factor in words, such as <c>/Ω, Ω = 1.67</c>.</summary>
    public string Words(DesignMethod method) => method == DesignMethod.Asd ? $"/Ω, Ω = {Shown.Number(Omega)}" : $"·φ, φ = {Shown.Number(Phi)}";

    /// <summary>Name of the method as printed.</summary>
    public static string Name(DesignMethod method) => method == DesignMethod.Asd ? "ASD" : "LRFD";

    /// <summary>Kind of situation that a method is for.</summary>
    public static SituationKind KindOf(DesignMethod method) => method == DesignMethod.Asd ? SituationKind.Service : SituationKind.Design;

    internal static Clause Clause(string section, string equation) => new("AISC 360-22", section, equation, FromMemory: true);
}
