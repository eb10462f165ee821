using static MemberScan.Checks.Combinations.CombinationRule;
using static MemberScan.Model.Rules.Combinations.ActionTag;

namespace MemberScan.Checks.Combinations;

/// <summary>Combinations of ASCE 7-22, sections 2.3.1, 2.3.6 and 2.4.1, 2.4.5, from memory. A seismic case acts in both directions, its vertical part with it.</summary>
internal static class Asce7
{
    /// <summary>How the factors are named in every output.</summary>
    public const string Standard = "ASCE 7-22";

    /// <summary>What a reader must know of the factors.</summary>
    public const string Remark = "live load not reduced where it accompanies; seismic in both directions, its vertical part in its case; from memory";

    /// <summary>Section 2.3, strength.</summary>
    public static IEnumerable<CombinationRule> Strength() =>
    [
        new("2.3.1-1", 1.4),
        new("2.3.1-2", 1.2, Must((Live, 1.6)), May((RoofLive, 0.5), (Snow, 0.3), (Rain, 0.5))),
        new("2.3.1-2", 1.2, Must((RoofLive, 0.5), (Snow, 0.3), (Rain, 0.5))),
        new("2.3.1-3", 1.2, Must((RoofLive, 1.6), (Snow, 1.0), (Rain, 1.6)), May((Live, 1.0), (Wind, 0.5))),
        new("2.3.1-4", 1.2, Must((Wind, 1.0)), May((Live, 1.0)), May((RoofLive, 0.5), (Snow, 0.3), (Rain, 0.5))),
        new("2.3.1-5", 0.9, Must((Wind, 1.0))),
        new("2.3.6-6", 1.2, Must((Seismic, 1.0)), May((Live, 1.0)), May((Snow, 0.15))),
        new("2.3.6-7", 0.9, Must((Seismic, 1.0))),
    ];

    /// <summary>Section 2.4, allowable stress.</summary>
    public static IEnumerable<CombinationRule> Allowable() =>
    [
        new("2.4.1-1", 1.0),
        new("2.4.1-2", 1.0, Must((Live, 1.0))),
        new("2.4.1-3", 1.0, Must((RoofLive, 1.0), (Snow, 0.7), (Rain, 1.0))),
        new("2.4.1-4", 1.0, May((Live, 0.75)), May((RoofLive, 0.75), (Snow, 0.75 * 0.7), (Rain, 0.75))),
        new("2.4.1-5", 1.0, Must((Wind, 0.6))),
        new("2.4.1-6", 1.0, May((Live, 0.75)), Must((Wind, 0.75 * 0.6)), May((RoofLive, 0.75), (Snow, 0.75 * 0.7), (Rain, 0.75))),
        new("2.4.1-7", 0.6, Must((Wind, 0.6))),
        new("2.4.5-8", 1.0, Must((Seismic, 0.7))),
        new("2.4.5-9", 1.0, Must((Seismic, 0.525)), May((Live, 0.75)), May((Snow, 0.1))),
        new("2.4.5-10", 0.6, Must((Seismic, 0.7))),
    ];
}
