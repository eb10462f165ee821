using System.Collections.Immutable;

namespace MemberScan.Model.Presets;

/// <summary>What the settings say about assumed loads.</summary>
public sealed record LoadRules
{
    /// <summary>Gap between two members up to which they touch, where the settings say nothing [m].</summary>
    public const double DefaultContactTolerance = 0.025;

    /// <summary>The presets that are switched on, in the order of trial.</summary>
    public ImmutableArray<PresetUse> Presets { get; init; } = [];

    /// <summary>Gap between two members up to which they touch [m].</summary>
    public double ContactTolerance { get; init; } = DefaultContactTolerance;
}
