namespace MemberScan.Model.Rules.Combinations;

/// <summary>A standard's set of combinations that can be generated from tagged load cases.</summary>
public enum CombinationSet
{
    /// <summary>EN 1990:2002, equation 6.10; design.</summary>
    En1990Eq610,

    /// <summary>EN 1990:2002, equations 6.10a and 6.10b; design.</summary>
    En1990Eq610ab,

    /// <summary>ASCE 7-22, section 2.3 (strength); design.</summary>
    Asce7Strength,

    /// <summary>ASCE 7-22, section 2.4 (allowable stress); service.</summary>
    Asce7Allowable,
}
