namespace MemberScan.Part21;

/// <summary>How much a text may ask of the reader; what goes beyond is told, never followed.</summary>
public static class Part21Limits
{
    /// <summary>Brackets within brackets in one instance; beyond, the instance counts as damaged (P21-0029).</summary>
    public const int Depth = 64;

    /// <summary>Length of one instance from '#' to ';' [byte]; beyond, it counts as damaged (P21-0030).</summary>
    public const int InstanceLength = 64 * 1024 * 1024;

    /// <summary>Length of one string with its apostrophes [byte]; beyond, the instance counts as damaged (P21-0031).</summary>
    public const int StringLength = 16 * 1024 * 1024;

    /// <summary>Length of one keyword [byte]; beyond, the instance counts as damaged (P21-0032).</summary>
    public const int KeywordLength = 255;

    /// <summary>Different keywords in one file; instances of further ones count as damaged (P21-0033).</summary>
    public const int Keywords = 65_536;

    /// <summary>Instances in one file; reading stops there (P21-0034).</summary>
    public const int Instances = 200_000_000;

    /// <summary>Text that may be read a second time while looking for the next sound instance [byte]; reading stops beyond (P21-0035).</summary>
    public const long RescannedBytes = 256L * 1024 * 1024;
}
