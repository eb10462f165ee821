using System.Collections.Immutable;
using MemberScan.SampleModels.Scenario;

namespace MemberScan.SampleModels.Tests;

/// <summary>The samples, written once for all tests.</summary>
internal static class Samples
{
    private static readonly Lazy<ImmutableArray<SampleModel>> s_all = new(SampleModel.All);

    /// <summary>All samples.</summary>
    public static ImmutableArray<SampleModel> All => s_all.Value;

    /// <summary>Names for theories.</summary>
    public static TheoryData<string> Names => [GangwayRails.Name, DeckHangers.Name, MastStays.Name];

    /// <summary>A sample by name.</summary>
    public static SampleModel Named(string name) => All.Single(s => s.Name == name);
}
