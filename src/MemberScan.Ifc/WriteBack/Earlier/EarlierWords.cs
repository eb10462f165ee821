using System.Collections.Immutable;
using System.Globalization;

namespace MemberScan.Ifc.WriteBack.Earlier;

/// <summary>What was found of earlier results, in words.</summary>
public static class EarlierWords
{
    /// <summary>References that are named; further ones are counted.</summary>
    public const int MostNamed = 10;

    /// <summary>The references, such as <c>#90 IFCRELDEFINESBYPROPERTIES refers to #77</c>.</summary>
    public static string Of(ImmutableArray<OutsideReference> references)
    {
        var named = references.Take(MostNamed).Select(r => string.Create(CultureInfo.InvariantCulture, $"#{r.By} {r.ByKeyword} refers to #{r.Ours}"));
        var more = references.Length - MostNamed;
        return string.Join(", ", named) + (more > 0 ? string.Create(CultureInfo.InvariantCulture, $" and {more} more") : "");
    }

    /// <summary>A number of instances.</summary>
    public static string Count(int instances) => string.Create(CultureInfo.InvariantCulture, $"{instances} {(instances == 1 ? "instance" : "instances")}");
}
