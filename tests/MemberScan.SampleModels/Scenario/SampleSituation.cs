using System.Collections.Immutable;
using MemberScan.Mechanics.Forces;

namespace MemberScan.SampleModels.Scenario;

/// <summary>The section forces of one member in one combination, in the member's own axes.</summary>
/// <param name="Name">Name of the combination.</param>
/// <param name="IsService">Service (characteristic loads); otherwise design (factored).</param>
/// <param name="Stations">Stations from end to end [m, N, N·m]; two at one place are a jump.</param>
public sealed record SampleSituation(string Name, bool IsService, ImmutableArray<ForceStation> Stations)
{
    /// <summary>The kind as a forces table spells it.</summary>
    public string Kind => IsService ? "service" : "design";
}
