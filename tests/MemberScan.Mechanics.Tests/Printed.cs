using System.Globalization;

namespace MemberScan.Mechanics.Tests;

/// <summary>A number as a table prints it.</summary>
internal static class Printed
{
    /// <summary>Asserts that a computed value rounds to the printed digits.</summary>
    /// <remarks>Half a unit of the last digit and a trifle: one printed 0.291 is 0.2915002.</remarks>
    public static void Agrees(string printed, double computed, string what)
    {
        var value = double.Parse(printed, CultureInfo.InvariantCulture);
        var point = printed.IndexOf('.', StringComparison.Ordinal);
        var decimals = point < 0 ? 0 : printed.Length - point - 1;
        var half = 0.501 * Math.Pow(10, -decimals);
        Assert.True(Math.Abs(computed - value) <= half, $"{what}: printed {printed}, computed {computed:G8}");
    }
}
