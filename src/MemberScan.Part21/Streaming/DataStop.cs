namespace MemberScan.Part21.Streaming;

/// <summary>Why the scan of a data section stopped.</summary>
internal enum DataStop
{
    /// <summary>The next statement begins where the scan was to stop, or beyond.</summary>
    Until,

    /// <summary><c>ENDSEC</c> or the beginning of another section.</summary>
    Section,

    /// <summary>End of the text.</summary>
    End,

    /// <summary>A limit.</summary>
    Limit,
}
