namespace MemberScan.Screening.Comparison;

/// <summary>By what a candidate of one run was found again in the other.</summary>
public enum MatchedBy
{
    /// <summary>GlobalId and number of the item.</summary>
    GlobalId,

    /// <summary>Tag, which each run has once among those left over.</summary>
    Tag,

    /// <summary>Class, section and both ends of the axis within a millimetre.</summary>
    Axis,
}
