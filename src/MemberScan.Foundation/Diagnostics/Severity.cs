namespace MemberScan.Foundation.Diagnostics;

/// <summary>How much a finding weighs.</summary>
public enum Severity
{
    /// <summary>Worth knowing; nothing was lost.</summary>
    Note,

    /// <summary>Something was repaired, assumed or passed over; results may be incomplete.</summary>
    Warning,

    /// <summary>Something could not be used.</summary>
    Error,
}
