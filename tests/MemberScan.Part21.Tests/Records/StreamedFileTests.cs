using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.OpenModels;

namespace MemberScan.Part21.Tests.Records;

/// <summary>A file that stays on disk against the same held in memory: the same records, whatever the text.</summary>
public sealed class StreamedFileTests
{
    [Fact]
    public void Open_models_read_the_same()
    {
        OpenModel.SkipIfAbsent();
        foreach (var path in OpenModel.All)
        {
            var (bytes, _) = ModelContainer.Read(path);
            if (bytes.Length < 4_000_000) AssertAgrees(bytes);
        }
    }

    [Fact]
    public void Random_changes_read_the_same()
    {
        var text = new StringBuilder(Sample.Header);
        for (var id = 1; id < 60; id++) text.Append(System.Globalization.CultureInfo.InvariantCulture, $"#{id}=POST('a''b;',#{id + 1},1.5,.T.,(1.,-2.E-3),IFCLABEL('x'),$,*);\n");
        var bytes = Encoding.ASCII.GetBytes(text + Sample.Footer);

        var random = new Random(210303);
        for (var i = 0; i < 1000; i++) AssertAgrees(Mutations.Next(random, bytes));
    }

    [Fact]
    public void A_number_used_twice_leads_to_the_first_and_the_second_is_known_as_such()
    {
        var (file, _) = Open("#1=HANGER('first');\n#2=POST(#1);\n#1=HANGER('second');", ["HANGER", "POST"]);
        using (file)
        {
            Assert.Equal([false, true], file.RecordsOf("HANGER").Select(h => h.IsDuplicate));
            Assert.True(file.TryFollow(file.RecordsOf("POST").Single()[0], out var hanger));
            Assert.True(hanger[0].TryText(out var text));
            Assert.Equal("first", text);
        }
    }

    [Fact]
    public void A_reference_to_nothing_is_told_once_when_it_is_followed()
    {
        var (file, told) = Open("#1=HANGER('x',\n#9,#8);", ["HANGER"]);
        using (file)
        {
            var hanger = file.RecordsOf("HANGER").Single();
            Assert.Empty(told.Items);
            Assert.False(file.HasDamage);

            for (var i = 0; i < 2; i++) Assert.False(file.TryFollow(hanger[1], out _));

            var dangling = Assert.Single(told.Items);
            Assert.Equal("P21-0028", dangling.Code);
            Assert.Equal(1, told.CountOf(dangling));
            Assert.Equal(1UL, dangling.Span!.Value.InstanceId);
            Assert.Equal(9, dangling.Span!.Value.Line);
            Assert.True(file.HasDamage);
        }
    }

    [Fact]
    public void A_keyword_not_named_beforehand_is_a_broken_contract()
    {
        var (file, _) = Open("#1=HANGER('x');", ["HANGER"]);
        using (file)
        {
            Assert.Throws<ArgumentException>(() => file.RecordsOf("POST").ToList());
            Assert.Throws<InvalidOperationException>(() => file.Bytes);
        }
    }

    private static (Part21File File, DiagnosticList Told) Open(string data, string[] wanted)
    {
        var told = new DiagnosticList();
        return (Part21File.Over(Part21Index.Over(Encoding.Latin1.GetBytes(Sample.Model(data)), "landing.ifc", wanted, told), wanted, told), told);
    }

    private static void AssertAgrees(byte[] bytes)
    {
        var held = Part21File.Read(bytes, "landing.ifc", new DiagnosticList());
        string[] wanted = [.. held.CountByKeyword.Keys];
        var told = new DiagnosticList();
        using var streamed = Part21File.Over(Part21Index.Over(bytes, "landing.ifc", wanted, told), wanted, told);

        var inMemory = held.Records.Where(r => r.Id <= uint.MaxValue && r.Keyword.Length > 0).ToList();
        var onDisk = streamed.Records.ToList();
        Assert.Equal(inMemory.Count, onDisk.Count);
        for (var i = 0; i < onDisk.Count; i++)
        {
            var (a, b) = (inMemory[i], onDisk[i]);
            Assert.Equal((a.Id, a.Keyword, a.IsComplex, a.IsDamaged, a.IsDuplicate), (b.Id, b.Keyword, b.IsComplex, b.IsDamaged, b.IsDuplicate));
            Assert.True(a.Text.SequenceEqual(b.Text));
            if (i % 16 == 0) Assert.Equal(a.Span, b.Span);
            var (values, same) = (a.Arguments(), b.Arguments());
            Assert.Equal(values.Count, same.Count);
            for (var j = 0; j < values.Count; j++)
            {
                Assert.Equal((values[j].Kind, values[j].Offset, values[j].ItemCount), (same[j].Kind, same[j].Offset, same[j].ItemCount));
                Assert.True(values[j].Text.SequenceEqual(same[j].Text));
                Assert.Equal((values[j].TryText(out var text), text), (same[j].TryText(out var sameText), sameText));
            }
        }
    }
}
