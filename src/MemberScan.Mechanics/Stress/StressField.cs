using System.Diagnostics.CodeAnalysis;
using MemberScan.Mechanics.Fields;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Resultants;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Shear;
using MemberScan.Mechanics.Warping;

namespace MemberScan.Mechanics.Stress;

/// <summary>The stresses of one cross-section in one shear model, for any section forces.</summary>
/// <remarks>Immutable and safe for several threads: made once per section, shared by all members that have it.</remarks>
public abstract class StressField
{
    private protected StressField(CrossSection section, ShearModel model, double poisson, SectionProperties properties) =>
        (Section, Model, Poisson, Properties) = (section, model, poisson, properties);

    /// <summary>The section.</summary>
    public CrossSection Section { get; }

    /// <summary>The shear model.</summary>
    public ShearModel Model { get; }

    /// <summary>Poisson's ratio ν [-], in [0, 0.5); of no effect in the elementary model.</summary>
    public double Poisson { get; }

    /// <summary>Properties of the section.</summary>
    public SectionProperties Properties { get; }

    /// <summary>Whether the model has an answer for T ≠ 0: not the elementary one of a rounded rectangle too slender for a numerical field.</summary>
    public virtual bool CarriesTorsion => true;

    /// <summary>The error that is left in a numerical field; null for closed forms and series.</summary>
    public virtual FieldError? NumericalError => null;

    /// <summary>How well the field gives back the six section forces.</summary>
    public abstract Closure Closure { get; }

    /// <summary>Shear areas of this model by energy [m²].</summary>
    public abstract ShearAreas ShearAreas { get; }

    /// <summary>Makes the field of a section; false with a sentence when the model has none for it.</summary>
    /// <param name="section">The section.</param>
    /// <param name="model">The shear model.</param>
    /// <param name="poisson">Poisson's ratio ν [-], in [0, 0.5).</param>
    /// <param name="field">The field.</param>
    /// <param name="whyNot">Why there is none, such as "there is no elementary rule for an outline".</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="poisson"/> is outside [0, 0.5).</exception>
    public static bool TryCreate(
        CrossSection section, ShearModel model, double poisson,
        [NotNullWhen(true)] out StressField? field, [NotNullWhen(false)] out string? whyNot)
    {
        ArgumentNullException.ThrowIfNull(section);
        if (!(poisson is >= 0 and < 0.5))
            throw new ArgumentOutOfRangeException(nameof(poisson), poisson, "Poisson's ratio must lie in [0, 0.5)");

        if (section is OutlineSection && model == ShearModel.Elementary)
        {
            (field, whyNot) = (null, "there is no elementary rule for an outline; the elasticity model has it");
            return false;
        }

        if (IsSolved(section, model) && SolvedSections.TryOf(section) is null)
        {
            (field, whyNot) = (null, $"the dimensions of the {section.Kind} are too far apart for a numerical field");
            return false;
        }

        var properties = section is OutlineSection or OpenProfile ? OutlineProperties.Of(section, poisson) : SectionProperties.Of(section);
        field = new SectionField(section, model, poisson, properties, ShearSolutionOf(section, model, poisson, properties));
        whyNot = null;
        return true;
    }

    /// <summary>The stresses at a point of the material.</summary>
    /// <param name="forces">Section forces; finite.</param>
    /// <param name="y">Distance from the centroid along y [m].</param>
    /// <param name="z">Distance from the centroid along z [m].</param>
    /// <returns>The state; of no meaning for points outside the material (<see cref="Contains"/>).</returns>
    public abstract StressState At(in SectionForces forces, double y, double z);

    /// <summary>Whether a point lies in the material or on its edge (within 1e-9 of the largest extent).</summary>
    public abstract bool Contains(double y, double z);

    /// <summary>
    /// Whether a point of the material counts for <see cref="Govern"/>. In a numerical field points nearer than half a wall to a
    /// re-entrant corner do not: at a sharp one the stress is unbounded, at a rounded one it is a local peak.
    /// </summary>
    public virtual bool Decides(double y, double z) => true;

    /// <summary>The largest value at the rounded re-entrant corners, which does not decide; null where there are none.</summary>
    /// <exception cref="ArgumentException">Forces are not finite.</exception>
    public virtual GoverningPoint? FilletPeak(in SectionForces forces, StressMeasure measure) => null;

    /// <summary>The place of the section where a measure is largest, among those that decide.</summary>
    /// <returns>A point of the material; its value is within 0.1 % of the true supremum of this field.</returns>
    /// <exception cref="ArgumentException">T ≠ 0 where <see cref="CarriesTorsion"/> is false, or forces not finite.</exception>
    public abstract GoverningPoint Govern(in SectionForces forces, StressMeasure measure);

    /// <summary>The largest value of every measure over many states, such as all stations and situations of a member.</summary>
    /// <param name="states">Section forces; at least one.</param>
    /// <param name="largest">Receives six governing points, in the order of <see cref="StressMeasure"/>.</param>
    /// <param name="which">Receives for each the number of its state; among equal ones the first.</param>
    /// <remarks>
    /// All states are scanned in blocks over the nodes of the section; those that may hold the largest value are then searched one
    /// by one like <see cref="Govern(in SectionForces, StressMeasure)"/>, the most promising first. The result does not hang on
    /// how the states are grouped. Allocates nothing but names of places.
    /// </remarks>
    /// <exception cref="ArgumentException">No states, forces not finite, or less room than six results.</exception>
    public abstract void GovernAll(ReadOnlySpan<SectionForces> states, Span<GoverningPoint> largest, Span<int> which);

    // Whether the shear model, or what is known of the section, hangs on a numerical field.
    private static bool IsSolved(CrossSection section, ShearModel model) =>
        section is OutlineSection or OpenProfile || (section is Box or RoundedRectangle && model == ShearModel.Elasticity);

    private static ShearSolution ShearSolutionOf(
        CrossSection section, ShearModel model, double poisson, SectionProperties properties) => (section, model) switch
        {
            (Round round, ShearModel.Elementary) => new RoundElementary(round),
            (Round round, ShearModel.Elasticity) => new RoundElasticity(round, poisson),
            (Tube tube, ShearModel.Elementary) => new TubeElementary(tube),
            (Tube tube, ShearModel.Elasticity) => new TubeElasticity(tube, poisson),
            (Rectangle rectangle, ShearModel.Elementary) => new RectangleElementary(rectangle),
            (Rectangle rectangle, ShearModel.Elasticity) => new RectangleElasticity(rectangle, poisson),
            (RoundedRectangle rounded, ShearModel.Elementary) => new RoundedRectangleElementary(
                rounded, properties, SolvedSections.TryOf(rounded) is { } solved ? new NumericalElasticity(solved, properties, 0) : null),
            (Box box, ShearModel.Elementary) => new BoxElementary(box, properties),
            (OpenProfile profile, ShearModel.Elementary) => new OpenProfileElementary(profile, properties),
            (Box or RoundedRectangle or OutlineSection or OpenProfile, ShearModel.Elasticity) => new NumericalElasticity(SolvedSections.TryOf(section)!, properties, poisson),
            _ => throw new ArgumentOutOfRangeException(nameof(model), model, "unknown shear model"),
        };
}
