namespace MemberScan.Checks.En1993.Members;

/// <summary>How a hollow section was made: it decides the buckling curve.</summary>
public enum HollowForming
{
    /// <summary>Not known: taken as cold formed, the less favourable.</summary>
    Unknown,

    /// <summary>Hot finished (EN 10210).</summary>
    HotFinished,

    /// <summary>Cold formed (EN 10219).</summary>
    ColdFormed,
}
