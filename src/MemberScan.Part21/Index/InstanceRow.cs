namespace MemberScan.Part21.Index;

/// <summary>Where one instance stands. Twenty-four bytes; its text is read only when asked for.</summary>
internal readonly struct InstanceRow
{
    // The low 24 bits are the keyword's number in the keyword table, the high 8 the flags.
    private readonly uint _keywordAndFlags;

    public InstanceRow(long start, int length, ulong id, int keyword, InstanceFlags flags)
    {
        Start = start;
        Length = length;
        Id = id;
        _keywordAndFlags = (uint)keyword | ((uint)flags << 24);
    }

    /// <summary>Offset of '#'.</summary>
    public long Start { get; }

    /// <summary>Number after '#'.</summary>
    public ulong Id { get; }

    /// <summary>From '#' to ';', both included [byte].</summary>
    public int Length { get; }

    public int Keyword => (int)(_keywordAndFlags & 0xFF_FFFF);

    public InstanceFlags Flags => (InstanceFlags)(_keywordAndFlags >> 24);

    public InstanceRow With(InstanceFlags flag) => new(Start, Length, Id, Keyword, Flags | flag);
}
