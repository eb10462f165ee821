namespace MemberScan.Screening.Contacts;

/// <summary>How two members touch.</summary>
public enum ContactKind
{
    /// <summary>An end of the first lies at an end of the second.</summary>
    EndToEnd,

    /// <summary>An end of the first lies at the side of the second.</summary>
    EndToSide,

    /// <summary>They cross between their ends.</summary>
    Crossing,

    /// <summary>They run beside each other over a stretch; no point is where they touch.</summary>
    Alongside,
}
