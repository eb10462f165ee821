namespace MemberScan.Checks.Stability;

/// <summary>How the ends of a member are held against displacement across it.</summary>
public enum EndHold
{
    /// <summary>Not known.</summary>
    Unknown,

    /// <summary>Both ends are held.</summary>
    BothEnds,

    /// <summary>One end is held and fixed against rotation, the other is free.</summary>
    BaseOnly,
}
