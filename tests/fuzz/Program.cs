using MemberScan.Foundation.Diagnostics;
using MemberScan.Part21;
using MemberScan.Part21.Edits;
using SharpFuzz;

// One file given: it is read once, so that a finding can be repeated. No argument: the fuzzer hands over inputs.
if (args is [var path]) Check(File.ReadAllBytes(path));
else Fuzzer.OutOfProcess.Run(stream =>
{
    using var copy = new MemoryStream();
    stream.CopyTo(copy);
    Check(copy.ToArray());
});

// Whatever the bytes: both readers find the same instances, an untouched text comes back byte for byte, and every value can be walked.
static void Check(byte[] bytes)
{
    var file = Part21File.Read(bytes, "fuzz.ifc", new DiagnosticList());
    string[] wanted = [.. file.CountByKeyword.Keys];
    using var index = Part21Index.Over(bytes, "fuzz.ifc", wanted, new DiagnosticList(), 1);
    using var output = new MemoryStream();
    new Part21Edits(index).WriteTo(output);
    if (!output.ToArray().AsSpan().SequenceEqual(bytes)) throw new InvalidOperationException("The text does not come back.");
    if (index.InsertionOffset != file.InsertionOffset) throw new InvalidOperationException("The ends of the data differ.");

    var lookup = index.CreateLookup();
    var inIndex = 0;
    foreach (var record in file.Records)
    {
        if (record.Id > uint.MaxValue) continue;

        inIndex++;
        if (!file.TryFind(record.Id, out var first) || !lookup.TryFind((uint)record.Id, out var instance)) throw new InvalidOperationException($"#{record.Id} is not found.");
        if (first.Span.Offset != instance.Offset || !first.Text.SequenceEqual(instance.Text)) throw new InvalidOperationException($"#{record.Id} differs.");
        Walk(instance.Arguments, first.Arguments());
    }

    if (inIndex != index.Count) throw new InvalidOperationException($"The numbers of instances differ: {inIndex} and {index.Count}.");
    foreach (var keyword in wanted)
        if (index.OffsetsOf(keyword).Length != file.RecordsOf(keyword).Count(r => r.Id <= uint.MaxValue))
            throw new InvalidOperationException($"The instances of {keyword} differ.");
}

static void Walk(Part21Cursor cursor, IReadOnlyList<Part21Value> values)
{
    foreach (var value in values)
    {
        if (!cursor.MoveNext() || cursor.Kind != value.Kind || !cursor.Text.SequenceEqual(value.Text)) throw new InvalidOperationException("A value differs.");
        _ = cursor.TryReal(out _);
        _ = cursor.TryInteger(out _);
        _ = cursor.TryReference(out _);
        _ = cursor.TryLogical(out _);
        _ = cursor.TryBinary(out _, out _);
        if (value.TryText(out var text) != cursor.TryText(out var same) || text != same) throw new InvalidOperationException("A text differs.");
        if (value.Kind == Part21ValueKind.List) Walk(cursor.Items, value.Items);
    }
}
