namespace MemberScan.Model.Frames;

/// <summary>How one direction is held.</summary>
public enum RestraintKind
{
    /// <summary>Not at all.</summary>
    Free,

    /// <summary>Rigidly.</summary>
    Fixed,

    /// <summary>By a linear spring.</summary>
    Spring,
}
