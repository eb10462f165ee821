namespace MemberScan.Model.Forces;

/// <summary>Whether the forces of a situation carry load factors.</summary>
public enum SituationKind
{
    /// <summary>The source does not say.</summary>
    Unknown,

    /// <summary>Characteristic loads, for allowable stress.</summary>
    Service,

    /// <summary>Factored loads, for design strength.</summary>
    Design,
}
