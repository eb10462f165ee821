namespace MemberScan.Statics;

/// <summary>Stable codes of the findings about a frame.</summary>
internal static class StaticsCodes
{
    public const string Size = "STA-0001";
    public const string Value = "STA-0002";
    public const string NameDoubled = "STA-0003";
    public const string NoLength = "STA-0004";
    public const string ZDirection = "STA-0005";
    public const string Support = "STA-0006";
    public const string Load = "STA-0007";
    public const string Mechanism = "STA-0008";
    public const string DigitsLost = "STA-0009";
    public const string FreeTurn = "STA-0010";
    public const string DigitsFew = "STA-0011";
    public const string Station = "STA-0012";
}
