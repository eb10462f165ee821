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
    private readonly GoverningSearch? _fillets;
    private readonly Lazy<Closure> _closure;

    /// <summary>The field of a section with its shear solution.</summary>
    public SectionField(
        CrossSection section, ShearModel model, double poisson, SectionProperties properties, ShearSolution shear)
        : base(section, model, poisson, properties)
    {
        _shear = shear;
        _outline = Outline.Of(section, shear.HasPeaks);
        _search = new GoverningSearch(this, shear, _outline);
        if (shear.HasPeaks && section is Box { InnerRadius: > 0 } box) _fillets = new GoverningSearch(this, shear, new FilletOutline(box));
        _closure = new Lazy<Closure>(() => ClosureIntegral.Of(this, shear, _outline));
    }

    /// <inheritdoc/>
    public override FieldError? NumericalError => _shear.NumericalError;

    /// <inheritdoc/>
    public override Closure Closure => _closure.Value;

    /// <inheritdoc/>
    public override StressState At(in SectionForces forces, double y, double z)
    {
        var shear = _shear.At(forces.Vy, forces.Vz, forces.T, y, z);
        return new StressState(BendingStress.At(Properties, forces, y, z), shear.XY, shear.XZ);
    }

    /// <inheritdoc/>
    public override bool Contains(double y, double z) => _outline.Contains(y, z, Outline.OnEdge * _outline.Extent);

    /// <inheritdoc/>
    public override bool Decides(double y, double z) => _outline.Decides(y, z);

    /// <inheritdoc/>
    public override GoverningPoint? FilletPeak(in SectionForces forces, StressMeasure measure)
    {
        if (!forces.IsFinite) throw new ArgumentException("section forces must be finite numbers", nameof(forces));

        return _fillets?.Find(forces, measure);
    }

    /// <inheritdoc/>
    public override GoverningPoint Govern(in SectionForces forces, StressMeasure measure)
    {
        if (!forces.IsFinite) throw new ArgumentException("section forces must be finite numbers", nameof(forces));

        return _search.Find(forces, measure);
    }
}
