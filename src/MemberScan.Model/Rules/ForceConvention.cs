namespace MemberScan.Model.Rules;

/// <summary>What the stored force values act on.</summary>
public enum ForceConvention
{
    /// <summary>On the cut face whose outward normal is +x: N &gt; 0 is tension.</summary>
    PositiveFace,

    /// <summary>On the two ends of the member: the values at its start change sign.</summary>
    EndForces,

    /// <summary>Found for each pair of samples at the two ends by equilibrium; where both or neither balance, not known.</summary>
    Detect,
}
