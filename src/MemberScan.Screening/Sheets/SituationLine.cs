using System.Collections.Immutable;
using MemberScan.Mechanics.Forces;

namespace MemberScan.Screening.Sheets;

/// <summary>The section forces of one situation along a member, and the utilization.</summary>
/// <param name="Situation">Name.</param>
/// <param name="Kind">"service", "design" or "unknown".</param>
/// <param name="Lines">Points in rising order of places: one line; of an envelope two, least and largest values.</param>
public sealed record SituationLine(string Situation, string Kind, ImmutableArray<ImmutableArray<LinePoint>> Lines)
{
    /// <summary>Whether what acts together is lost: then there is no utilization along the member.</summary>
    public bool IsEnvelope => Lines.Length > 1;

    /// <summary>Whether T was brought from the centroid to the shear centre.</summary>
    public bool IsTorsionMoved { get; init; }

    /// <summary>Least and largest value of a force with their places; of equal ones the first.</summary>
    public (LinePoint Least, LinePoint Largest) Extremes(ForceComponent component)
    {
        var all = Lines.SelectMany(l => l);
        return (all.MinBy(p => Value(p.Forces, component)), all.MaxBy(p => Value(p.Forces, component)));
    }

    /// <summary>One of the six forces [N] or [N·m].</summary>
    public static double Value(in SectionForces forces, ForceComponent component) => component switch
    {
        ForceComponent.N => forces.N,
        ForceComponent.Vy => forces.Vy,
        ForceComponent.Vz => forces.Vz,
        ForceComponent.T => forces.T,
        ForceComponent.My => forces.My,
        ForceComponent.Mz => forces.Mz,
        _ => throw new ArgumentOutOfRangeException(nameof(component)),
    };
}
