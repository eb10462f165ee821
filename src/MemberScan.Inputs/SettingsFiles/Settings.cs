using System.Collections.Immutable;
using MemberScan.Model.Limits;
using MemberScan.Model.Members;
using MemberScan.Model.Presets;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.SettingsFiles;

/// <summary>Everything that a reviewer may set for a run.</summary>
public sealed record Settings
{
    private static readonly Lazy<Settings> s_default = new(SettingsFile.ReadShipped);

    /// <summary>The shipped default settings, none of them given.</summary>
    public static Settings Default => s_default.Value;

    /// <summary>The limits.</summary>
    public required Basis Basis { get => Limits.Basis; init => Limits = Limits with { Basis = value }; }

    /// <summary>Everything that decides which checks are made and against what, for members that no rule names.</summary>
    public LimitSet Limits { get; init; } = new();

    /// <summary>Limits of some members; the first that fits counts.</summary>
    public ImmutableArray<LimitRule> LimitRules { get; init; } = [];

    /// <summary>How models and tables are read; its grades are those of the settings, then the shipped ones.</summary>
    public required ReadingRules Reading { get; init; }

    /// <summary>Buckling length over member length, for the rule of 4 % of the Euler load [-], in [0.5, 100].</summary>
    public required double LengthFactor
    {
        get => Limits.Stability.LengthFactor;
        init => Limits = Limits with { Stability = Limits.Stability with { LengthFactor = value } };
    }

    /// <summary>Assumed loads that are switched on.</summary>
    public LoadRules Loads { get; init; } = new();

    /// <summary>Units in which results are shown.</summary>
    public required DisplayUnits Display { get; init; }

    /// <summary>Keys that were given; the others are in force as defaults.</summary>
    public required ImmutableHashSet<string> Given { get; init; }

    /// <summary>Line of each key of the file that was read, by its path; empty for the shipped settings.</summary>
    public ImmutableDictionary<string, int> Places { get; init; } = ImmutableDictionary<string, int>.Empty;

    /// <summary>The limits of a member.</summary>
    /// <param name="member">The member.</param>
    public LimitSet LimitsOf(Member member) => LimitRules.FirstOrDefault(rule => rule.When.Fits(member))?.Limits ?? Limits;

    /// <summary>Where a setting in force comes from, in words: "default", or a line of the file.</summary>
    /// <param name="setting">One of <see cref="Effective"/>.</param>
    /// <param name="fileName">Name of the file that was read.</param>
    public string SourceOf(EffectiveSetting setting, string fileName)
    {
        ArgumentNullException.ThrowIfNull(setting);
        if (setting.IsDefault) return "default";

        var key = setting.Key.IndexOf('[', StringComparison.Ordinal) is var bracket and >= 0 ? setting.Key[..bracket] : setting.Key;
        return Places.TryGetValue(key, out var line) ? string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{fileName}, line {line}") : "command line";
    }

    /// <summary>Every setting in force, in a stable order and as canonical text; computed anew from the values at each call.</summary>
    public ImmutableArray<EffectiveSetting> Effective => EffectiveSettings.Of(this);
}
