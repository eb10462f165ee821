using MemberScan.Mechanics.Forces;
using MemberScan.Model.Frames;

namespace MemberScan.Statics.Members;

/// <summary>Strains of one cross-section for its section forces, all about the centroid.</summary>
internal readonly struct SectionFlexibility
{
    private readonly double _axial, _shearY, _shearZ, _twist, _yy, _yz, _zz, _centreY, _centreZ;

    public SectionFlexibility(FrameSection section, FrameMaterial material, bool shearFlexible)
    {
        var d = material.E * (section.Iy * section.Iz - section.Iyz * section.Iyz);
        _axial = 1 / (material.E * section.Area);
        (_shearY, _shearZ) = shearFlexible ? (1 / (material.G * section.ShearAreaY), 1 / (material.G * section.ShearAreaZ)) : (0, 0);
        _twist = 1 / (material.G * section.J);
        (_yy, _yz, _zz) = (section.Iz / d, section.Iyz / d, section.Iy / d);
        (_centreY, _centreZ) = (section.ShearCentreY, section.ShearCentreZ);
    }

    /// <summary>Strains of given section forces; T about the centroid.</summary>
    /// <remarks>
    /// The twist goes by the torsion about the shear centre, and carries the centroid, which lies off it, sideways. Bending is the
    /// inverse of <c>My = E(Iy·κy − Iyz·κz)</c>, <c>Mz = E(Iz·κz − Iyz·κy)</c>.
    /// </remarks>
    public Strains Of(in SectionForces f)
    {
        var twist = _twist * AboutShearCentre(f);
        return new Strains(
            _axial * f.N, _shearY * f.Vy + _centreZ * twist, _shearZ * f.Vz - _centreY * twist,
            twist, _yy * f.My + _yz * f.Mz, _yz * f.My + _zz * f.Mz);
    }

    /// <summary>Torsion about the shear centre [N·m] from that about the centroid.</summary>
    public double AboutShearCentre(in SectionForces f) => f.T - _centreY * f.Vz + _centreZ * f.Vy;
}
