using MemberScan.Part21;
using MemberScan.Part21.Streaming;

namespace MemberScan.Benchmarks.Question;

/// <summary>Element → set or type, taken from relations while the pass goes over them: pairs of numbers, the element in the high half.</summary>
internal sealed class RelationPairs : IPart21Taker
{
    private readonly List<ulong> _sets = [], _types = [];

    /// <summary>All pairs, in order of the element.</summary>
    public static (ulong[] Sets, ulong[] Types) Joined(IReadOnlyList<IPart21Taker> takers)
    {
        var (sets, types) = (new List<ulong>(), new List<ulong>());
        foreach (var taker in takers)
        {
            sets.AddRange(((RelationPairs)taker)._sets);
            types.AddRange(((RelationPairs)taker)._types);
        }

        sets.Sort();
        types.Sort();
        return ([.. sets], [.. types]);
    }

    public void Take(in Part21Instance instance)
    {
        var isOfSet = instance.Is("IFCRELDEFINESBYPROPERTIES"u8);
        if (!isOfSet && !instance.Is("IFCRELDEFINESBYTYPE"u8)) return;

        var pairs = isOfSet ? _sets : _types;
        var arguments = instance.Arguments;
        if (!arguments.Move(5)) return;
        var elements = arguments.Items;
        if (!arguments.MoveNext() || !arguments.TryReference(out var target)) return;
        while (elements.MoveNext())
            if (elements.TryReference(out var element))
                pairs.Add((ulong)element << 32 | target);
    }
}
