using System.Collections.Immutable;

namespace MemberScan.SampleModels.Scenario;

/// <summary>A sample: its files and its members as they are meant.</summary>
/// <param name="Name">File name without extension.</param>
/// <param name="Model">Bytes of the IFC file.</param>
/// <param name="ForcesTable">Bytes of the forces table beside it; empty when there is none.</param>
/// <param name="Description">Bytes of the Markdown page beside it.</param>
/// <param name="Members">Every candidate.</param>
public sealed record SampleModel(
    string Name, ImmutableArray<byte> Model, ImmutableArray<byte> ForcesTable, ImmutableArray<byte> Description, ImmutableArray<SampleMember> Members)
{
    /// <summary>All samples, written anew.</summary>
    public static ImmutableArray<SampleModel> All() => [GangwayRails.Write(), DeckHangers.Write(), DeckTrapezes.Write(), MastStays.Write()];

    /// <summary>The files of the sample: name and bytes.</summary>
    public IEnumerable<(string FileName, ImmutableArray<byte> Bytes)> Files()
    {
        yield return (Name + ".ifc", Model);
        if (ForcesTable.Length > 0) yield return (Name + ".forces.csv", ForcesTable);
        yield return (Name + ".md", Description);
    }
}
