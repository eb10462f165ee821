namespace MemberScan.Mechanics.Stress;

/// <summary>What is sought to be largest over a section.</summary>
public enum StressMeasure
{
    /// <summary>Largest equivalent stress of von Mises.</summary>
    VonMises,

    /// <summary>Largest equivalent stress of Tresca.</summary>
    Tresca,

    /// <summary>Normal stress of the largest magnitude; the value keeps its sign.</summary>
    AbsoluteSigma,

    /// <summary>Largest resultant shear stress.</summary>
    Tau,

    /// <summary>Largest principal stress.</summary>
    Sigma1,

    /// <summary>Smallest principal stress (most negative).</summary>
    Sigma3,
}
