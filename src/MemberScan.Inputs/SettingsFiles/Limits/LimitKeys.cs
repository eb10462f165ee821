using System.Collections.Immutable;
using MemberScan.Model.Limits;
using MemberScan.Model.Limits.Threads;

namespace MemberScan.Inputs.SettingsFiles.Limits;

/// <summary>Keys, words and ranges of the limits in a settings file; the published schema says the same.</summary>
internal static class LimitKeys
{
    public static readonly ImmutableArray<string> Brittle = ["tension", "compression", "situations"];
    public static readonly ImmutableArray<string> Checks = ["off"];
    public static readonly ImmutableArray<string> Threads = ["rule", "area", "allowable", "fu", "cutThread", "temperatureFactor", "byMember"];
    public static readonly ImmutableArray<string> Weld = ["members", "weldedYield"];
    public static readonly ImmutableArray<string> Deflection = ["name", "role", "spanOver", "largest"];
    public static readonly ImmutableArray<string> Rule = ["when", "set"];
    public static readonly ImmutableArray<string> When = ["role", "class", "name", "storey"];
    public static readonly ImmutableArray<string> Set = ["basis", "checks", "stability", "threads", "welds", "deflection"];

    /// <summary>Most entries of a list of limits.</summary>
    public const int MostEntries = 500;

    public static readonly (double Least, double Most) TemperatureFactor = (0.01, 1);
    public static readonly (double Least, double Most) SpanOver = (1, 10_000);

    /// <summary>Strengths and allowable stresses outside this range [Pa] cannot be meant.</summary>
    public static readonly (double Least, double Most) Stress = (0.1e6, 5000e6);

    /// <summary>Deflections outside this range [m] cannot be meant.</summary>
    public static readonly (double Least, double Most) Length = (1e-5, 10);

    public static readonly WordTable<WallWord> Walls = new(
        ("automatic", WallWord.Automatic), ("nominal", WallWord.Nominal), ("design-0.93", WallWord.Design), ("by-grade", WallWord.ByGrade));
    public static readonly WordTable<ThreadWord> ThreadRules = new(
        ("automatic", ThreadWord.Automatic), ("basis", ThreadWord.Basis), ("allowable", ThreadWord.Allowable), ("aisc-360-j3.7", ThreadWord.Aisc360), ("en-1993-1-8", ThreadWord.En1993));
    public static readonly WordTable<ThreadAreaBasis> Areas = new(("root", ThreadAreaBasis.Root), ("stress", ThreadAreaBasis.Stress), ("nominal", ThreadAreaBasis.Nominal));
    public static readonly WordTable<bool> Ends = new(("from-contacts", true), ("by-role", false));
    public static readonly WordTable<TubeForming> Forming = new(("unknown", TubeForming.Unknown), ("hot-finished", TubeForming.HotFinished), ("cold-formed", TubeForming.ColdFormed));

    /// <summary>The wall of a word; null for automatic.</summary>
    public static WallBasis? Of(WallWord word) => word == WallWord.Automatic ? null : (WallBasis)((int)word - 1);

    /// <summary>The word of a wall.</summary>
    public static WallWord Of(WallBasis? wall) => wall is { } given ? (WallWord)((int)given + 1) : WallWord.Automatic;

    /// <summary>The rule of a word; null for automatic.</summary>
    public static ThreadRule? Of(ThreadWord word) => word == ThreadWord.Automatic ? null : (ThreadRule)((int)word - 1);

    /// <summary>The word of a rule.</summary>
    public static ThreadWord Of(ThreadRule? rule) => rule is { } given ? (ThreadWord)((int)given + 1) : ThreadWord.Automatic;
}
