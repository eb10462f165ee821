namespace MemberScan.Part21.Plain;

/// <summary>Why the scan of plain statements stopped.</summary>
internal enum PlainStop
{
    /// <summary>A statement reaches beyond what is loaded; or blanks do.</summary>
    More,

    /// <summary>The next statement begins where the scan was to stop, or beyond.</summary>
    Until,

    /// <summary>The statement is not of plain layout, or damaged.</summary>
    NotPlain,

    /// <summary>What follows a statement is no instance.</summary>
    NoInstance,
}
