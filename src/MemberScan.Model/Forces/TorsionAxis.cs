namespace MemberScan.Model.Forces;

/// <summary>The line about which the torsional moment of forces is taken.</summary>
public enum TorsionAxis
{
    /// <summary>The source does not say; of no matter where centroid and shear centre are one.</summary>
    NotStated,

    /// <summary>The line of centroids.</summary>
    Centroid,

    /// <summary>The line of shear centres.</summary>
    ShearCentre,
}
