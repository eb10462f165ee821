namespace MemberScan.Part21.Plain;

/// <summary>Where the masks stand that the rules of plain layout leave, eight words each.</summary>
internal static class Found
{
    /// <summary>Bytes at which a statement stops to be plain.</summary>
    public const int Bad = 0;

    /// <summary>What follows a statement and is not blank.</summary>
    public const int Start = 8;

    /// <summary>Semicolons outside of strings.</summary>
    public const int Semicolon = 16;

    /// <summary>Words of all.</summary>
    public const int Words = 24;
}
