namespace MemberScan.Model.Presets;

/// <summary>What a load preset loads.</summary>
public enum PresetKind
{
    /// <summary>Guards and handrails: rails, their posts and their infill.</summary>
    Guard,

    /// <summary>Hanger rods and trapeze struts under a pipe.</summary>
    Hanger,

    /// <summary>Hangers of fire-sprinkler pipes: a multiple of the weight of the filled pipe, and an added load.</summary>
    SprinklerHanger,

    /// <summary>A person at work: one load downwards.</summary>
    Maintenance,
}
