using MemberScan.Part21.Findings;
using MemberScan.Part21.Index;

namespace MemberScan.Part21.Streaming;

/// <summary>What the scan of one stretch of a data section gave.</summary>
internal sealed class ChunkResult
{
    /// <summary>Where the scan began.</summary>
    public required long From { get; init; }

    /// <summary>Where it stopped.</summary>
    public long End { get; set; }

    public DataStop Stop { get; set; }

    /// <summary>Number of instances.</summary>
    public long Count { get; set; }

    /// <summary>Takes the wanted instances as they pass by; null if nobody asked for that.</summary>
    public IPart21Taker? Taker { get; init; }

    public Rows<BlockEntry> Blocks { get; } = new();

    public Rows<PlaceRow> Places { get; } = new();

    public List<Finding> Findings { get; } = [];
}
