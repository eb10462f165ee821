namespace MemberScan.Model.Presets;

/// <summary>A preset that is switched on, and for which members.</summary>
/// <param name="Preset">The preset.</param>
/// <param name="Members">Pattern on key, tag or name of the members, * and ? being wildcards.</param>
public sealed record PresetUse(LoadPreset Preset, string Members)
{
    /// <summary>The pipe that hangers carry; null where the preset needs none.</summary>
    public PipeSize? Pipe { get; init; }

    /// <summary>What fills the pipe, in words; empty for nothing.</summary>
    public string Contents { get; init; } = "";

    /// <summary>Density of what fills the pipe [kg/m³].</summary>
    public double ContentsDensity { get; init; }

    /// <summary>Distance between hangers along the pipe [m]; 0 where the preset needs none.</summary>
    public double Spacing { get; init; }
}
