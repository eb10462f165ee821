namespace MemberScan.Model.Limits.Threads;

/// <summary>The area that a given allowable stress holds for.</summary>
public enum ThreadAreaBasis
{
    /// <summary>Root area.</summary>
    Root,

    /// <summary>Tensile stress area.</summary>
    Stress,

    /// <summary>Circle of the nominal diameter.</summary>
    Nominal,
}
