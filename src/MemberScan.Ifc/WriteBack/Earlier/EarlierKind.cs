namespace MemberScan.Ifc.WriteBack.Earlier;

/// <summary>In which state results of an earlier run stand in a text.</summary>
public enum EarlierKind
{
    /// <summary>There are none.</summary>
    None,

    /// <summary>A block, and the text without it has the hash that the block names.</summary>
    Intact,

    /// <summary>A block with lines of another program behind it; without those the hash is the one that the block names.</summary>
    LinesBehind,

    /// <summary>A block, but the rest of the text is another than when it was written.</summary>
    Changed,

    /// <summary>No block: another program wrote the whole file anew, and our sets stand in it under other numbers.</summary>
    Rewritten,
}
