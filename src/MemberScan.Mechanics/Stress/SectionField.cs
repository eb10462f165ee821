using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Outlines;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Shear;

namespace MemberScan.Mechanics.Stress;

/// <summary>A stress field made of the bending formula for σ and a shear solution.</summary>
internal sealed class SectionField : StressField
{
    private readonly ShearSolution _shear;
    private readonly Outline _outline;
    private readonly GoverningSearch _search;
    private readonly Lazy<Closure> _closure;

    /// <summary>The field of a section with its shear solution.</summary>
    public SectionField(
        CrossSection section, ShearModel model, double poisson, SectionProperties properties, ShearSolution shear)
        : base(section, model, poisson, properties)
    {
        _shear = shear;
        _outline = Outline.Of(section);
        _search = new GoverningSearch(this, shear, _outline);
        _closure = new Lazy<Closure>(() => ClosureIntegral.Of(this, _outline));
    }

    /// <inheritdoc/>
    public override bool CarriesTorsion => _shear.CarriesTorsion;

    /// <inheritdoc/>
    public override Closure Closure => _closure.Value;

    /// <inheritdoc/>
    public override StressState At(in SectionForces forces, double y, double z)
    {
        if (forces.T != 0 && !CarriesTorsion) ThrowTorsion();

        var shear = _shear.At(forces.Vy, forces.Vz, forces.T, y, z);
        return new StressState(SigmaAt(forces, y, z), shear.XY, shear.XZ);
    }

    /// <inheritdoc/>
    public override bool Contains(double y, double z) => _outline.Contains(y, z, Outline.OnEdge * _outline.Extent);

    /// <inheritdoc/>
    public override GoverningPoint Govern(in SectionForces forces, StressMeasure measure)
    {
        if (!forces.IsFinite) throw new ArgumentException("section forces must be finite numbers", nameof(forces));
        if (forces.T != 0 && !CarriesTorsion) ThrowTorsion();

        return _search.Find(forces, measure);
    }

    // Principal axes: every section of closed form has two axes of symmetry.
    private double SigmaAt(in SectionForces forces, double y, double z) =>
        forces.N / Properties.Area + forces.My * z / Properties.Iy - forces.Mz * y / Properties.Iz;

    private void ThrowTorsion() =>
        throw new ArgumentException($"the {(Model == ShearModel.Elementary ? "elementary" : "elasticity")} model of a {Section.Kind} carries no torsion");
}
