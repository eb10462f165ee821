namespace MemberScan.Part21.Plain;

/// <summary>Where the masks stand that the rules of plain layout leave: eight words each, outside of strings only; opening brackets without the outermost of a statement.</summary>
internal static class Found
{
    public const int Bad = 0, Open = 8, Close = 16, Semicolon = 24, EqualsSign = 32, Blank = 40;

    /// <summary>Words of all.</summary>
    public const int Words = 48;
}
