namespace MemberScan.Ifc.Frames;

/// <summary>Which axial forces a member can carry; a linear analysis does not know of it, so its results are held against it.</summary>
public enum AxialSense
{
    /// <summary>Tension and compression.</summary>
    Both,

    /// <summary>Tension only: a cable or tension member.</summary>
    TensionOnly,

    /// <summary>Compression only.</summary>
    CompressionOnly,
}
