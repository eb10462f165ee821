namespace MemberScan.Reporting.Topics;

/// <summary>Release of the BIM Collaboration Format.</summary>
public enum BcfVersion
{
    /// <summary>BCF 2.1.</summary>
    Bcf21,

    /// <summary>BCF 3.0.</summary>
    Bcf30,
}
