using MemberScan.Part21;

namespace MemberScan.Ifc;

/// <summary>Following references from instance to instance, and reading what stands in their arguments.</summary>
internal sealed class Instances(Part21File file)
{
    /// <summary>Longest chain of references that any reader follows: placements, mapped items, boolean operands.</summary>
    public const int MaxDepth = 200;

    /// <summary>The file.</summary>
    public Part21File File { get; } = file;

    /// <summary>Finds the instance that a reference names; false when it names none.</summary>
    public bool TryFollow(Part21Value value, out Part21Record record) => File.TryFollow(value, out record);

    /// <summary>The instances that a list of references names, missing ones left out; a single reference counts as a list of one.</summary>
    public IEnumerable<Part21Record> FollowAll(Part21Value list)
    {
        if (list.Kind == Part21ValueKind.Reference)
        {
            if (TryFollow(list, out var single)) yield return single;
            yield break;
        }

        foreach (var item in list.Inner.Items)
            if (TryFollow(item, out var record))
                yield return record;
    }

    /// <summary>The instances that a list of references names; null when any item names none. For lists whose meaning changes when one is missing.</summary>
    public List<Part21Record>? FollowEach(Part21Value list)
    {
        var items = list.Inner.Items;
        var records = new List<Part21Record>(items.Count);
        foreach (var item in items)
        {
            if (!TryFollow(item, out var record)) return null;

            records.Add(record);
        }

        return records;
    }

    /// <summary>Numbers of the instances that a list of references names, whether they exist or not.</summary>
    public static IEnumerable<ulong> IdsOf(Part21Value list)
    {
        foreach (var item in list.Inner.Items)
            if (item.TryReference(out var id))
                yield return id;
    }

    /// <summary>A string, decoded; empty when there is none.</summary>
    public static string Text(Part21Value value) => value.TryText(out var text) ? text : "";

    /// <summary>An enumeration literal in upper case; empty when there is none.</summary>
    public static string Literal(Part21Value value) => value.TryEnumeration(out var literal) ? literal : "";

    /// <summary>A number; null when there is none.</summary>
    public static double? Real(Part21Value value) => value.TryReal(out var real) ? real : null;

    /// <summary>Numbers of a list; null when any item is none.</summary>
    public static double[]? Reals(Part21Value list)
    {
        if (list.Inner.Kind != Part21ValueKind.List) return null;

        var items = list.Inner.Items;
        var reals = new double[items.Count];
        for (var i = 0; i < reals.Length; i++)
            if (!items[i].TryReal(out reals[i]))
                return null;
        return reals;
    }
}
