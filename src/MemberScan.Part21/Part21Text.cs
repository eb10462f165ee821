namespace MemberScan.Part21;

/// <summary>Values in the spelling of Part 21, in any culture.</summary>
public static class Part21Text
{
    /// <summary>A real: shortest digits that read back the same, with the point that Part 21 demands, upper-case E.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite: it has no spelling.</exception>
    public static string Real(double value) => throw new NotImplementedException();

    /// <summary>A string in apostrophes, ASCII only; everything else as <c>\X2\…\X0\</c> or <c>\X4\…\X0\</c>.</summary>
    public static string String(string text) => throw new NotImplementedException();
}
