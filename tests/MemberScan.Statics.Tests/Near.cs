namespace MemberScan.Statics.Tests;

/// <summary>Comparison by share.</summary>
internal static class Near
{
    /// <summary>Asserts that a value lies within a share of what is expected; near zero within that share of one.</summary>
    public static void Equal(double expected, double actual, double share = 1e-8) =>
        Assert.True(Math.Abs(actual - expected) <= share * Math.Max(Math.Abs(expected), 1e-300), FormattableString.Invariant($"expected {expected:R}, got {actual:R}, share {actual / expected - 1:R}"));

    /// <summary>Asserts that a value is nothing against a size.</summary>
    public static void Nothing(double actual, double size, double share = 1e-9) =>
        Assert.True(Math.Abs(actual) <= share * size, FormattableString.Invariant($"expected nothing, got {actual:R} against {size:R}"));
}
