namespace MemberScan.Screening.Comparison;

/// <summary>What became of a candidate from one run to the next.</summary>
public enum Movement
{
    /// <summary>Overstressed now, not so before.</summary>
    BecameOverstressed,

    /// <summary>Overstressed in both.</summary>
    StillOverstressed,

    /// <summary>Had a verdict, has none now.</summary>
    NoLongerChecked,

    /// <summary>Only in the later run.</summary>
    New,

    /// <summary>Only in the earlier run.</summary>
    Gone,

    /// <summary>Overstressed before, within the limit now.</summary>
    Cured,

    /// <summary>Not checked before, within the limit now.</summary>
    NowWithinLimit,

    /// <summary>The same verdict, from other inputs.</summary>
    ChangedInput,

    /// <summary>The same verdict from the same inputs.</summary>
    Unchanged,
}
