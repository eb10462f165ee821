using System.Diagnostics;
using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Part21;

namespace MemberScan.Benchmarks.Question;

/// <summary>The question asked of <see cref="Part21Index"/>, which leaves the text on disk.</summary>
internal sealed class IndexedQuestion
{
    private const string Member = "IFCMEMBER", ByProperties = "IFCRELDEFINESBYPROPERTIES", ByType = "IFCRELDEFINESBYTYPE";
    private const int Depth = 8;

    private readonly Part21Lookup _lookup;
    private readonly Answer _answer = new();

    // One list of numbers for each depth of following: the text of an instance is good until the next look-up.
    private readonly List<uint>[] _ids = [.. Enumerable.Range(0, Depth).Select(_ => new List<uint>())];
    private char[] _text = new char[1024];

    private IndexedQuestion(Part21Index index) => _lookup = index.CreateLookup();

    public static Answer Ask(string path, int threads)
    {
        var watch = Stopwatch.StartNew();
        using var index = Part21Index.Open(path, [Member, ByProperties, ByType], new DiagnosticList(), threads, () => new RelationPairs());
        var opened = watch.Elapsed;
        var (first, second) = (GC.CollectionCount(0), GC.CollectionCount(1));
        if (threads == 0) threads = Environment.ProcessorCount;

        var pairs = RelationPairs.Joined(index.Takers);
        var related = watch.Elapsed;
        var members = index.OffsetsOf(Member).ToArray();
        var parts = new Answer[threads];
        Run(threads, part =>
        {
            var question = new IndexedQuestion(index);
            var (from, to) = (members.Length * part / threads, members.Length * (part + 1) / threads);
            for (var i = from; i < to; i++) question.Ask(members[i], pairs);
            parts[part] = question._answer;
        });

        for (var i = 1; i < threads; i++) parts[0].Add(parts[i]);
        if (Environment.GetEnvironmentVariable("QUESTION_TIMES") is not null)
            Console.Error.WriteLine($"open {opened.TotalMilliseconds:F0} relations {(related - opened).TotalMilliseconds:F0} members {(watch.Elapsed - related).TotalMilliseconds:F0} ms, collections {first} ({second} above generation 0) in the pass, {GC.CollectionCount(0)} ({GC.CollectionCount(1)}) in all");
        return parts[0];
    }

    /// <summary>The pass alone, timed within the process after one to warm up.</summary>
    public static int Pass(string path, int threads)
    {
        for (var i = 0; i < 4; i++)
        {
            var watch = Stopwatch.StartNew();
            using var index = Part21Index.Open(path, [Member, ByProperties, ByType], new DiagnosticList(), threads);
            Console.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{index.Count} instances {watch.Elapsed.TotalMilliseconds:F0} ms {index.Length / watch.Elapsed.TotalSeconds / 1e9:F2} GB/s"));
        }

        return 0;
    }

    private static void Run(int threads, Action<int> work)
    {
        var others = new Thread[threads - 1];
        for (var i = 0; i < others.Length; i++)
        {
            var part = i + 1;
            others[i] = new Thread(() => work(part));
            others[i].Start();
        }

        work(0);
        foreach (var other in others) other.Join();
    }

    private void Ask(long offset, (ulong[] Sets, ulong[] Types) pairs)
    {
        if (!_lookup.TryReadAt(offset, out var member)) return;

        var id = member.Id;
        _answer.Members++;
        var arguments = member.Arguments;
        arguments.Move(3);
        Text(arguments);
        arguments.Move(4);
        if (arguments.TryReference(out var product)) Follow(product, 3, 0, (question, shape) => question.Items(shape, 1));

        foreach (var set in Of(pairs.Sets, id)) Set((uint)set);
        foreach (var type in Of(pairs.Types, id)) Follow((uint)type, 6, 0, (question, set) => question.Set(set));
    }

    private static ReadOnlySpan<ulong> Of(ulong[] pairs, uint element)
    {
        var from = Array.BinarySearch(pairs, (ulong)element << 32);
        if (from < 0) from = ~from;
        var to = from;
        while (to < pairs.Length && pairs[to] >> 32 == element) to++;
        return pairs.AsSpan(from, to - from);
    }

    // Goes to each instance that a list argument (1 for the first) of an instance names.
    private void Follow(uint id, int argument, int depth, Action<IndexedQuestion, uint> visit)
    {
        if (depth >= Depth || !_lookup.TryFind(id, out var instance)) return;

        var arguments = instance.Arguments;
        if (!arguments.Move(argument)) return;
        var ids = Ids(arguments.Items, depth);
        for (var i = 0; i < ids.Count; i++) visit(this, ids[i]);
    }

    private List<uint> Ids(Part21Cursor items, int depth)
    {
        var ids = _ids[depth];
        ids.Clear();
        while (items.MoveNext())
            if (items.TryReference(out var id))
                ids.Add(id);
        return ids;
    }

    private void Items(uint shape, int depth)
    {
        if (depth >= Depth || !_lookup.TryFind(shape, out var instance)) return;

        var arguments = instance.Arguments;
        if (!arguments.Move(4)) return;
        var ids = Ids(arguments.Items, depth);
        for (var i = 0; i < ids.Count; i++) Item(ids[i], depth);
    }

    private void Item(uint id, int depth)
    {
        if (!_lookup.TryFind(id, out var item)) return;

        var isMapped = item.Is("IFCMAPPEDITEM"u8);
        if (!isMapped && !item.Is("IFCEXTRUDEDAREASOLID"u8)) return;
        if (!TryReference(item, 1, out var target)) return;

        if (!isMapped) Dimensions(target);
        else if (_lookup.TryFind(target, out var map) && TryReference(map, 2, out var shape)) Items(shape, depth + 1);
    }

    private static bool TryReference(Part21Instance instance, int argument, out uint id)
    {
        id = 0;
        var arguments = instance.Arguments;
        return arguments.Move(argument) && arguments.TryReference(out id);
    }

    private void Dimensions(uint profile)
    {
        if (!_lookup.TryFind(profile, out var instance)) return;

        var arguments = instance.Arguments;
        arguments.Move(3);
        while (arguments.MoveNext())
        {
            if (!arguments.TryReal(out var dimension)) continue;
            _answer.Dimensions++;
            _answer.SumOfDimensions += dimension;
        }
    }

    private void Set(uint id)
    {
        if (!_lookup.TryFind(id, out var set)) return;

        _answer.Sets++;
        var isSet = set.Is("IFCPROPERTYSET"u8);
        var arguments = set.Arguments;
        arguments.Move(3);
        Text(arguments);
        if (!arguments.Move(isSet ? 2 : 3)) return;
        var ids = Ids(arguments.Items, Depth - 1);
        for (var i = 0; i < ids.Count; i++) Part(ids[i], isSet);
    }

    private void Part(uint id, bool isProperty)
    {
        if (!_lookup.TryFind(id, out var part)) return;

        if (isProperty) _answer.Properties++;
        else _answer.Quantities++;
        var arguments = part.Arguments;
        arguments.MoveNext();
        Text(arguments);
        arguments.Move(isProperty ? 2 : 3);
        if (arguments.TryReal(out var number)) _answer.SumOfValues += number;
        else Text(arguments);
    }

    private void Text(in Part21Cursor value)
    {
        if (_text.Length < value.Text.Length) _text = new char[value.Text.Length];
        if (value.TryText(_text, out var length)) _answer.Characters += length;
    }
}
