namespace MemberScan.Part21.Index;

/// <summary>The anchor of a block: its first instance.</summary>
internal struct BlockEntry
{
    /// <summary>Length of a block [byte].</summary>
    public const int Length = 4096;

    /// <summary>Number of the block in the file, from 0.</summary>
    public int Block;

    /// <summary>Number of its first instance.</summary>
    public uint FirstId;

    /// <summary>Number of its last instance.</summary>
    public uint LastId;

    /// <summary>Where its first instance begins, from the start of the block [byte].</summary>
    public ushort Within;

    /// <summary>Whether its numbers rise from instance to instance.</summary>
    public bool Rises;

    /// <summary>Whether its instances are all of plain layout, and only blanks between them.</summary>
    public bool IsPlain;

    /// <summary>Offset of its first instance [byte].</summary>
    public readonly long Start => (long)Block * Length + Within;

    /// <summary>Offset behind the block [byte].</summary>
    public readonly long End => (long)(Block + 1) * Length;
}
