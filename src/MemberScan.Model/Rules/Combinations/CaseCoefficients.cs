namespace MemberScan.Model.Rules.Combinations;

/// <summary>Whether the results of a load case carry the case's own coefficient already, where it is not 1.</summary>
public enum CaseCoefficients
{
    /// <summary>Not known: such cases are not superposed.</summary>
    Refuse,

    /// <summary>They carry it.</summary>
    InResults,

    /// <summary>They do not; superposition multiplies by it.</summary>
    NotInResults,
}
