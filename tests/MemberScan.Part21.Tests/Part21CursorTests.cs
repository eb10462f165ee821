using System.Text;
using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Part21.Tests;

/// <summary>Walking over arguments without decoding what is passed over.</summary>
public sealed class Part21CursorTests
{
    private const string Record =
        "#1=STAY(#12,-1.5E-3,42,'it''s \\X2\\00E4\\X0\\',.NOTDEFINED.,.T.,.U.,\"3F0A\",$,*,IFCLABEL('x'),((1.,2.),(3.)),IFCLIST((1,2)),0.1);";

    [Fact]
    public void Every_kind_of_value_is_read()
    {
        using var index = Index(Record);
        Assert.True(index.CreateLookup().TryFind(1, out var stay));
        var cursor = stay.Arguments;

        Assert.True(cursor.MoveNext() && cursor.TryReference(out var id) && id == 12);
        Assert.True(cursor.MoveNext() && cursor.TryReal(out var real) && real == -1.5e-3);
        Assert.True(cursor.MoveNext() && cursor.TryInteger(out var integer) && integer == 42);
        Assert.True(cursor.MoveNext());
        Assert.True(cursor.TryText(out string text));
        Assert.Equal("it's ä", text);
        Assert.True(cursor.MoveNext() && cursor.TryEnumeration(out var literal) && literal.SequenceEqual("NOTDEFINED"u8));
        Assert.True(cursor.MoveNext() && cursor.TryLogical(out var yes) && yes == true);
        Assert.True(cursor.MoveNext() && cursor.TryLogical(out var unknown) && unknown is null);
        Assert.True(cursor.MoveNext() && cursor.TryBinary(out var digits, out var unused) && digits.SequenceEqual("F0A"u8) && unused == 3);
        Assert.True(cursor.MoveNext() && cursor.Kind == Part21ValueKind.Unset);
        Assert.True(cursor.MoveNext() && cursor.Kind == Part21ValueKind.Derived);
        Assert.True(cursor.MoveNext() && cursor.TypeName.SequenceEqual("IFCLABEL"u8));
        Assert.True(cursor.TryText(out text));
        Assert.Equal("x", text);
        Assert.True(cursor.MoveNext());
        var rows = cursor.Items;
        Assert.True(rows.Move(2));
        var items = rows.Items;
        Assert.True(items.MoveNext() && items.TryReal(out var three) && three == 3 && !items.MoveNext());
        Assert.True(cursor.Move(2) && cursor.TryReal(out var last) && last == 0.1);
        Assert.False(cursor.MoveNext());
        Assert.Equal(Part21ValueKind.Absent, new Part21Cursor().Kind);
    }

    [Fact]
    public void A_text_goes_into_a_buffer_as_it_goes_into_a_string()
    {
        using var index = Index("#1=STAY('\\S\\D\\PB\\\\S\\!\\X4\\0001F600\\X0\\ \\X2\\D83D\\X0\\ C:\\temp \\X\\C4','\t\u00e4','plain');");
        Assert.True(index.CreateLookup().TryFind(1, out var stay));
        var buffer = new char[200];

        for (var cursor = stay.Arguments; cursor.MoveNext();)
        {
            Assert.True(cursor.TryText(out string text));
            Assert.True(cursor.TryText(buffer, out var length));
            Assert.Equal(text, new string(buffer, 0, length));
            Assert.False(cursor.TryText(new char[1], out _));
        }
    }

    [Fact]
    public void Nothing_is_allocated_on_the_way()
    {
        using var index = Index(Record);
        var lookup = index.CreateLookup();
        var buffer = new char[100];
        for (var i = 0; i < 10; i++) _ = Walk(lookup, buffer);
        var before = GC.GetAllocatedBytesForCurrentThread();

        var count = 0;
        for (var i = 0; i < 1000; i++) count += Walk(lookup, buffer);
        var allocated = GC.GetAllocatedBytesForCurrentThread() - before;

        // One object in each walk would be 24,000 bytes at least; the runtime itself may need a little once.
        Assert.Equal(14_000, count);
        Assert.InRange(allocated, 0, 2_000);
    }

    private static int Walk(Part21Lookup lookup, char[] buffer)
    {
        if (!lookup.TryFind(1, out var stay)) return 0;

        var count = 0;
        for (var cursor = stay.Arguments; cursor.MoveNext(); count++)
        {
            _ = cursor.TryReal(out _);
            _ = cursor.TryReference(out _);
            _ = cursor.TryText(buffer, out _);
            _ = cursor.TryLogical(out _);
            for (var items = cursor.Items; items.MoveNext();) _ = items.TryReal(out _);
        }

        return count;
    }

    private static Part21Index Index(string data) =>
        Part21Index.Over(Encoding.Latin1.GetBytes(Sample.Model(data)), "landing.ifc", [], new DiagnosticList(), 1);
}
