using System.Collections.Frozen;
using MemberScan.Foundation.Units;

namespace MemberScan.Checks.Threads;

/// <summary>Pitches of the coarse series, for designations that name no pitch.</summary>
/// <remarks>Metric: ISO 261, unified: ASME B1.1 (UNC); both from memory.</remarks>
internal static class CoarseSeries
{
    private static readonly FrozenDictionary<double, double> s_pitchesMm = new Dictionary<double, double>
    {
        [3] = 0.5, [4] = 0.7, [5] = 0.8, [6] = 1, [8] = 1.25, [10] = 1.5, [12] = 1.75, [14] = 2, [16] = 2, [18] = 2.5, [20] = 2.5,
        [22] = 2.5, [24] = 3, [27] = 3, [30] = 3.5, [33] = 3.5, [36] = 4, [39] = 4, [42] = 4.5, [45] = 4.5, [48] = 5, [52] = 5,
        [56] = 5.5, [60] = 5.5, [64] = 6,
    }.ToFrozenDictionary();

    // Diameter in sixteenths of an inch → threads per inch.
    private static readonly FrozenDictionary<int, double> s_threadsPerInch = new Dictionary<int, double>
    {
        [4] = 20, [5] = 18, [6] = 16, [7] = 14, [8] = 13, [9] = 12, [10] = 11, [12] = 10, [14] = 9, [16] = 8, [18] = 7, [20] = 7,
        [22] = 6, [24] = 6, [28] = 5, [32] = 4.5, [36] = 4.5, [40] = 4, [44] = 4, [48] = 4, [52] = 4, [56] = 4, [60] = 4, [64] = 4,
    }.ToFrozenDictionary();

    /// <summary>Coarse pitch of a metric thread [m]; null for a diameter outside the series.</summary>
    public static double? MetricPitch(double diameterMm) => s_pitchesMm.TryGetValue(diameterMm, out var pitch) ? Si.Mm(pitch) : null;

    /// <summary>Pitch of the unified coarse series [m]; null for a diameter outside the series.</summary>
    public static double? UnifiedPitch(double diameterInches)
    {
        var sixteenths = 16 * diameterInches;
        return sixteenths == Math.Floor(sixteenths) && sixteenths <= 64 && s_threadsPerInch.TryGetValue((int)sixteenths, out var count) ? Si.Inch / count : null;
    }
}
