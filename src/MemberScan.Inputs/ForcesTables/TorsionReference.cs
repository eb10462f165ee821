namespace MemberScan.Inputs.ForcesTables;

/// <summary>The line about which the torsional moments of a table are taken.</summary>
public enum TorsionReference
{
    /// <summary>The table does not say; enough for sections whose shear centre is their centroid.</summary>
    NotStated,

    /// <summary>The centroid.</summary>
    Centroid,

    /// <summary>The shear centre.</summary>
    ShearCentre,
}
