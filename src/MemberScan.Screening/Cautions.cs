using System.Collections.Immutable;

namespace MemberScan.Screening;

/// <summary>The cautions that every output prints.</summary>
public static class Cautions
{
    /// <summary>One sentence each.</summary>
    public static ImmutableArray<string> Lines { get; } =
    [
        "A screening aid for qualified engineers; not a design, not a certificate.",
        "Not covered unless shown: connections, anchors, welds, base plates, holes and notches, local effects, local and member buckling, "
            + "lateral-torsional buckling, second-order effects, restrained warping, deflection, fatigue, vibration, fire, seismic.",
        "Local codes and the licensed engineer in charge decide.",
    ];
}
