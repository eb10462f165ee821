namespace MemberScan.Mechanics.Shear;

/// <summary>The shear stresses of one section in one shear model, for shear forces and torsion.</summary>
internal abstract class ShearSolution
{
    /// <summary>Whether stresses of two sets of forces add up; then unit forces say all.</summary>
    public virtual bool IsLinear => true;

    /// <summary>Whether the model has an answer for torsion.</summary>
    public virtual bool CarriesTorsion => true;

    /// <summary>Whether the shear stresses peak at re-entrant corners.</summary>
    public virtual bool HasPeaks => false;

    /// <summary>The error that is left in J and in the shear stresses [-]; null for closed forms and series.</summary>
    public virtual FieldError? NumericalError => null;

    /// <summary>
    /// Whether every measure is largest on an edge or crease, whatever the forces: where through each point of the inside runs a line
    /// between two of them along which σ is linear and the shear stresses are too, so that the measures are convex on it.
    /// </summary>
    public virtual bool EdgesGovern => false;

    /// <summary>Shear stresses at a point of the material [m] for Vy, Vz [N] and T about the shear centre [N·m].</summary>
    public abstract ShearStress At(double vy, double vz, double t, double y, double z);

    /// <summary>Shear stresses at a point for a unit of Vy, of Vz and of T, each alone.</summary>
    public virtual (ShearStress Vy, ShearStress Vz, ShearStress T) UnitsAt(double y, double z) =>
        (At(1, 0, 0, y, z), At(0, 1, 0, y, z), At(0, 0, 1, y, z));
}
