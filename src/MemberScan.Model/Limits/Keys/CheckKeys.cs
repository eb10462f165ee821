using System.Collections.Immutable;

namespace MemberScan.Model.Limits.Keys;

/// <summary>The keys of the checks beside the stress criterion, by which the settings switch them off.</summary>
public static class CheckKeys
{
    /// <summary>All of them, in the order of the standards.</summary>
    public static ImmutableArray<string> All { get; } =
    [
        "en-6.2", "en-6.2.3", "en-6.2.4", "en-6.2.5-y", "en-6.2.5-z", "en-6.2.6-y", "en-6.2.6-z", "en-6.2.7", "en-6.2.7-v", "en-6.2.9",
        "en-6.3", "en-6.3.1-y", "en-6.3.1-z", "en-6.3.2", "en-6.3.3",
        "aisc", "aisc-d2", "aisc-e3", "aisc-f-y", "aisc-f-z", "aisc-g-y", "aisc-g-z", "aisc-h1", "aisc-h3.1", "aisc-h3.3a", "aisc-h3.3b", "aisc-h3.3c",
        "rod-tension", "rod-combined", "rod-compression", "aisc-j3.7", "aisc-j3.7-other", "en-1-8-3.4", "en-1-8-3.4-other",
        "slenderness",
    ];
}
