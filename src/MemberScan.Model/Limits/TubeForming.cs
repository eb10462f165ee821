namespace MemberScan.Model.Limits;

/// <summary>How hollow sections were made: it decides their buckling curve.</summary>
public enum TubeForming
{
    /// <summary>Not known; taken as cold formed.</summary>
    Unknown,

    /// <summary>Hot finished (EN 10210).</summary>
    HotFinished,

    /// <summary>Cold formed (EN 10219).</summary>
    ColdFormed,
}
