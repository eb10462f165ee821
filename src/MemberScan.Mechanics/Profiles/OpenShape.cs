namespace MemberScan.Mechanics.Profiles;

/// <summary>The letter that an open rolled or welded profile looks like.</summary>
public enum OpenShape
{
    /// <summary>Two equal flanges and a web along z.</summary>
    I,

    /// <summary>An angle: a leg along z at the side −y and a leg along y at the bottom.</summary>
    L,

    /// <summary>A channel: a web along z at the side −y and two flanges towards +y.</summary>
    U,

    /// <summary>A flange along y at the top and a web along z below its middle.</summary>
    T,
}
