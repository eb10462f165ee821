using MemberScan.Model.Frames.Loads;

namespace MemberScan.Statics.Members;

/// <summary>Strains of a cross-section, each the partner in work of its section force.</summary>
/// <param name="Axial">Of the axis [-].</param>
/// <param name="ShearY">Along y [-].</param>
/// <param name="ShearZ">Along z [-].</param>
/// <param name="Twist">Turn about x per length [1/m].</param>
/// <param name="BendY">Turn about y per length [1/m].</param>
/// <param name="BendZ">Turn about z per length [1/m].</param>
internal readonly record struct Strains(double Axial, double ShearY, double ShearZ, double Twist, double BendY, double BendZ)
{
    public static Strains operator +(in Strains a, in Strains b) => new(
        a.Axial + b.Axial, a.ShearY + b.ShearY, a.ShearZ + b.ShearZ, a.Twist + b.Twist, a.BendY + b.BendY, a.BendZ + b.BendZ);

    /// <summary>Free strains of a change of temperature: <c>ε = α(ΔT + gy·y + gz·z)</c>, and <c>ε = ε0 + κy·z − κz·y</c>.</summary>
    public static Strains OfTemperature(double expansion, in MemberTemperature t) =>
        new(expansion * t.Uniform, 0, 0, 0, expansion * t.GradientZ, -expansion * t.GradientY);
}
