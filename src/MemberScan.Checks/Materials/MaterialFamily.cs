namespace MemberScan.Checks.Materials;

/// <summary>Materials that are limited in different ways.</summary>
public enum MaterialFamily
{
    /// <summary>Not told by the name.</summary>
    Unknown,

    /// <summary>Carbon steel.</summary>
    CarbonSteel,

    /// <summary>Stainless steel: its 0.2 % proof strength stands for the yield strength.</summary>
    Stainless,

    /// <summary>Aluminium: its strength falls beside welds.</summary>
    Aluminium,

    /// <summary>Timber: no limit of ours.</summary>
    Timber,

    /// <summary>Glass: brittle, no limit of ours.</summary>
    Glass,

    /// <summary>Concrete and masonry: no limit of ours.</summary>
    Mineral,
}
