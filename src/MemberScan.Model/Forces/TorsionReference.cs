namespace MemberScan.Model.Forces;

/// <summary>The line about which torsional moments are taken.</summary>
public enum TorsionReference
{
    /// <summary>The source does not say; enough for sections whose shear centre is their centroid.</summary>
    NotStated,

    /// <summary>The centroid.</summary>
    Centroid,

    /// <summary>The shear centre.</summary>
    ShearCentre,
}
