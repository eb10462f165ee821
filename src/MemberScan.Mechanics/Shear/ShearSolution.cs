namespace MemberScan.Mechanics.Shear;

/// <summary>The shear stresses of one section in one shear model, for shear forces and torsion.</summary>
internal abstract class ShearSolution
{
    /// <summary>Whether stresses of two sets of forces add up; then unit forces say all.</summary>
    public virtual bool IsLinear => true;

    /// <summary>Whether the model has an answer for torsion.</summary>
    public virtual bool CarriesTorsion => true;

    /// <summary>
    /// Whether every measure is largest on an edge or crease, whatever the forces: where through each point of the inside runs a line
    /// between two of them along which σ is linear and the shear stresses are too, so that the measures are convex on it.
    /// </summary>
    public virtual bool EdgesGovern => false;

    /// <summary>Shear stresses at a point of the material [m] for Vy, Vz [N] and T about the shear centre [N·m].</summary>
    public abstract ShearStress At(double vy, double vz, double t, double y, double z);
}
