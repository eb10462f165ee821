using MemberScan.Part21;

namespace MemberScan.Ifc.Sections.General;

/// <summary>Dimensions of a parametric profile by their places; lengths in metres.</summary>
/// <param name="Profile">The profile.</param>
/// <param name="Metre">Factor of the model's length unit.</param>
/// <param name="Radian">Factor of the model's angle unit.</param>
internal readonly record struct ParametricDims(Part21Record Profile, double Metre, double Radian)
{
    /// <summary>A length [m]; not a number where it is absent.</summary>
    public double Length(int index) => Instances.Real(Profile[index]) is { } value ? Metre * value : double.NaN;

    /// <summary>A length [m], 0 where it is absent; not a number where it is no number.</summary>
    public double Optional(int index) => Profile[index].IsEmpty ? 0 : Length(index);

    /// <summary>An angle [rad], 0 where it is absent.</summary>
    public double Slope(int index) => Profile[index].IsEmpty ? 0 : Instances.Real(Profile[index]) is { } value ? Radian * value : double.NaN;
}
