using System.Collections.Immutable;
using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Part21;
using MemberScan.Part21.Containers;

namespace MemberScan.Ifc.WriteBack.Earlier;

/// <summary>Results of an earlier run in a text, and the text without them.</summary>
/// <param name="Kind">In which state they stand there.</param>
/// <param name="Base">The text without them; the text itself where others refer to them.</param>
/// <param name="Instances">How many instances were taken out.</param>
/// <param name="References">Instances of others that refer to ours; then nothing is taken out.</param>
public sealed record EarlierResults(EarlierKind Kind, ReadOnlyMemory<byte> Base, int Instances, ImmutableArray<OutsideReference> References)
{
    /// <summary>Finds them. A text without any is only searched for our marks.</summary>
    /// <param name="text">The whole text.</param>
    /// <param name="name">Name of its file.</param>
    public static EarlierResults Find(ReadOnlyMemory<byte> text, string name)
    {
        var stripped = ResultBlock.Strip(text);
        if (stripped is { HadBlock: true, IsIntact: true } && OwnInstances.AreAll(Taken(text, stripped.Base), out var count)) return new EarlierResults(EarlierKind.Intact, stripped.Base, count, []);
        if (ResultBlock.Locate(text.Span) is { } block) return OfBlock(text, name, block);
        if (stripped.HadBlock && OwnInstances.AreAll(Taken(text, stripped.Base), out count)) return new EarlierResults(EarlierKind.Changed, stripped.Base, count, []);
        if (text.Span.IndexOf(Encoding.ASCII.GetBytes(StressCheckSet.SetName)) < 0) return new EarlierResults(EarlierKind.None, text, 0, []);

        var own = OwnInstances.Recognised(Part21File.Read(text, name, new DiagnosticList()));
        var kind = own.Records.Any() ? EarlierKind.Rewritten : EarlierKind.None;
        return Without(text, kind, [], own);
    }

    /// <summary>Whether a text may hold any: none of the words that they carry stands in a text that does not.</summary>
    public static bool MayBeIn(ModelText text)
    {
        ArgumentNullException.ThrowIfNull(text);
        return text.Contains(Encoding.ASCII.GetBytes(ResultBlock.OpeningWords), Encoding.ASCII.GetBytes(StressCheckSet.SetName));
    }

    private static EarlierResults OfBlock(ReadOnlyMemory<byte> text, string name, Range block)
    {
        var file = Part21File.Read(text, name, new DiagnosticList());
        var own = OwnInstances.In(file, block);
        var kind = file.InsertionOffset >= block.End.Value && IsOriginal(text.Span, block, (int)file.InsertionOffset) ? EarlierKind.LinesBehind : EarlierKind.Changed;
        return Without(text, kind, ResultBlock.MarksOf(text.Span, block), own);
    }

    // Whether the text up to the block and from the ENDSEC on is the one that the block was written for.
    private static bool IsOriginal(ReadOnlySpan<byte> bytes, Range block, int endOfData)
    {
        byte[] original = [.. bytes[..block.Start.Value], .. bytes[endOfData..]];
        return ResultBlock.DeclaredHash(bytes, block) == ResultBlock.Sha256(original);
    }

    private static EarlierResults Without(ReadOnlyMemory<byte> text, EarlierKind kind, IEnumerable<Range> marks, OwnInstances own)
    {
        if (own.Outside.Count > 0) return new EarlierResults(kind, text, 0, [.. own.Outside]);
        if (kind == EarlierKind.None) return new EarlierResults(kind, text, 0, []);

        var records = own.Records.Select(r => WholeLine(text.Span, r.Text)).ToList();
        var cuts = records.Concat(marks).OrderBy(r => r.Start.Value);
        using var rest = new MemoryStream(text.Length);
        var at = 0;
        foreach (var cut in cuts)
        {
            rest.Write(text.Span[at..cut.Start.Value]);
            at = cut.End.Value;
        }

        rest.Write(text.Span[at..]);
        return new EarlierResults(kind, rest.ToArray(), records.Count, []);
    }

    // An instance with the line end behind it where it fills its line; the instance alone where it shares it.
    private static Range WholeLine(ReadOnlySpan<byte> text, ReadOnlySpan<byte> instance)
    {
        _ = text.Overlaps(instance, out var start);
        var end = start + instance.Length;
        var fillsLine = start == 0 || text[start - 1] is (byte)'\n' or (byte)'\r';
        return fillsLine ? start..BlockMarks.LineEnd(text, end) : start..end;
    }

    // What a text has more than the one without it, in one stretch.
    private static ReadOnlySpan<byte> Taken(ReadOnlyMemory<byte> text, ReadOnlyMemory<byte> without) =>
        text.Span.Slice(text.Span.CommonPrefixLength(without.Span), text.Length - without.Length);
}
