namespace MemberScan.Statics.Checking;

/// <summary>Sizes up to which a frame is solved, and numbers that no structure has.</summary>
internal static class FrameLimits
{
    /// <summary>Most nodes.</summary>
    public const int Nodes = 200_000;

    /// <summary>Most members.</summary>
    public const int Members = 400_000;

    /// <summary>Most situations.</summary>
    public const int Situations = 10_000;

    /// <summary>Most loads and terms of all situations together.</summary>
    public const int Loads = 10_000_000;

    /// <summary>Most stations of a member.</summary>
    public const int Stations = 100_000;

    /// <summary>Shortest flexible length, absolute [m].</summary>
    public const double ShortestLength = 1e-6;

    /// <summary>Largest magnitude of any number in SI; powers of larger ones overflow.</summary>
    public const double LargestNumber = 1e30;

    /// <summary>Smallest magnitude of a stiffness constant in SI; products of smaller ones underflow.</summary>
    public const double SmallestConstant = 1e-40;

    /// <summary>How far beyond the end of a member a load may lie, as a share of the length: rounding of units.</summary>
    public const double Beyond = 1e-9;
}
