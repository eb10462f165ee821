using System.Collections;

namespace MemberScan.Reporting.Tests;

/// <summary>Equality of records whose arrays compare by reference: property by property, element by element.</summary>
internal static class Deep
{
    public static void Equal(object? expected, object? actual, string path = "record")
    {
        if (expected is null || actual is null || expected is string || expected.GetType().IsPrimitive || expected.GetType().IsEnum)
        {
            Assert.True(Equals(expected, actual), $"{path}: expected {expected}, got {actual}");
            return;
        }

        Assert.True(expected.GetType() == actual.GetType(), path);
        if (expected is IEnumerable expectedItems)
        {
            var (left, right) = (expectedItems.Cast<object?>().ToList(), ((IEnumerable)actual).Cast<object?>().ToList());
            Assert.True(left.Count == right.Count, $"{path}: {left.Count} and {right.Count} elements");
            for (var index = 0; index < left.Count; index++) Equal(left[index], right[index], $"{path}[{index}]");
            return;
        }

        foreach (var property in expected.GetType().GetProperties().Where(p => p.GetMethod is { IsStatic: false } && p.GetIndexParameters().Length == 0))
            Equal(property.GetValue(expected), property.GetValue(actual), $"{path}.{property.Name}");
    }
}
