using MemberScan.Foundation.Geometry;

namespace MemberScan.Model.Loads;

/// <summary>Force and couple of a load, both as right-handed vectors in the same axes; a load acts on the member.</summary>
/// <param name="Force">Force [N], or per length [N/m].</param>
/// <param name="Couple">Couple [N·m], or per length [N·m/m].</param>
public readonly record struct LoadVector(Vector3 Force, Vector3 Couple)
{
    /// <summary>Sum.</summary>
    public static LoadVector operator +(in LoadVector a, in LoadVector b) => new(a.Force + b.Force, a.Couple + b.Couple);

    /// <summary>Multiple.</summary>
    public static LoadVector operator *(double factor, in LoadVector a) => new(factor * a.Force, factor * a.Couple);
}
