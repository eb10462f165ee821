using MemberScan.Part21.Index;

namespace MemberScan.Part21.Reading;

/// <summary>What reading a text gave.</summary>
internal sealed record ReadingResult
{
    public required InstanceTable Instances { get; init; }

    /// <summary>The parameters of each header entry, between its brackets.</summary>
    public required IReadOnlyList<HeaderEntry> Header { get; init; }

    public required bool ReadToEnd { get; init; }

    public required bool HasDamage { get; init; }

    public required ulong HighestId { get; init; }

    /// <summary>Offset of the last data section's ENDSEC [byte]; −1 if none.</summary>
    public required long InsertionOffset { get; init; }
}
