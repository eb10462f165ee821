using System.Globalization;
using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.OpenModels;
using MemberScan.Part21.Edits;

namespace MemberScan.Part21.Tests.Edits;

/// <summary>Changes over a text: what they name changes, and no other byte.</summary>
public sealed class Part21EditsTests
{
    private const string Data = "#1=RAIL('a',#2);\r\n/* ; */ #2 = POST(1.);\r\n#7=STAY($);#3=RAIL('b',#99);\r\n";
    private static readonly string s_text = Sample.Header + Data + Sample.Footer;

    [Fact]
    public void No_change_gives_the_same_bytes_for_every_open_model()
    {
        OpenModel.SkipIfAbsent();
        foreach (var path in OpenModel.All)
        {
            var (bytes, _) = ModelContainer.Read(path);

            Assert.Equal(bytes, Written(bytes, _ => { }));
        }
    }

    [Fact]
    public void No_change_gives_the_same_bytes_for_ten_thousand_changed_models()
    {
        OpenModel.SkipIfAbsent();
        byte[][] models = [.. OpenModel.All.Select(p => ModelContainer.Read(p).Bytes).Where(b => b.Length < 50_000)];
        var random = new Random(210303);
        for (var i = 0; i < 10_000; i++)
        {
            var bytes = Mutations.Next(random, models[i % models.Length]);

            Assert.True(bytes.AsSpan().SequenceEqual(Written(bytes, _ => { })), $"Change {i} does not come back.");
        }
    }

    [Fact]
    public void A_change_leaves_every_other_byte()
    {
        var written = Written(Encoding.ASCII.GetBytes(s_text), edits =>
        {
            edits.Replace(2, "POST(2.5)");
            edits.Remove(7);
            Assert.Equal(100u, edits.Append("IFCLABEL('x')"));
            Assert.Equal(101u, edits.Append("IFCSET((#100,#1),$)"));
        });

        var expected = s_text
            .Replace("#2 = POST(1.);", "#2=POST(2.5);", StringComparison.Ordinal)
            .Replace("#7=STAY($);", "", StringComparison.Ordinal)
            .Replace("\r\nENDSEC", "\r\n#100=IFCLABEL('x');\n#101=IFCSET((#100,#1),$);\nENDSEC", StringComparison.Ordinal);
        Assert.Equal(expected, Encoding.ASCII.GetString(written));
    }

    [Fact]
    public void Appended_numbers_are_above_references_to_nothing_and_numbers_in_texts()
    {
        Written(Encoding.ASCII.GetBytes(Sample.Model("#1=A(#500,'#600');/* #700 */")), edits => Assert.Equal(701u, edits.Append("A()")));
    }

    [Fact]
    public void Line_ends_are_those_of_the_text()
    {
        var text = Encoding.ASCII.GetBytes(Sample.Model("#1=A();").Replace("\n", "\r\n", StringComparison.Ordinal));

        var written = Written(text, edits => edits.Append("B()"));

        Assert.Contains("#1=A();\r\n#2=B();\r\nENDSEC;\r\n", Encoding.ASCII.GetString(written), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("POST(1.")]
    [InlineData("POST(1.);#9=POST(2.)")]
    [InlineData("POST(1,,2)")]
    [InlineData("POST('ä')")]
    [InlineData("POST(1.5.)")]
    [InlineData("")]
    [InlineData("(A()B())")]
    public void What_is_no_sound_record_is_refused(string record)
    {
        using var index = Index(Encoding.ASCII.GetBytes(s_text));
        var edits = new Part21Edits(index);

        Assert.Throws<ArgumentException>(() => edits.Append(record));
        Assert.Throws<ArgumentException>(() => edits.Replace(1, record));
        Assert.True(edits.IsEmpty);
    }

    [Fact]
    public void An_instance_that_is_not_there_cannot_be_changed()
    {
        using var index = Index(Encoding.ASCII.GetBytes(s_text));

        Assert.Throws<ArgumentException>(() => new Part21Edits(index).Remove(5));
    }

    [Fact]
    public void Nothing_is_appended_where_no_place_or_no_number_is_left()
    {
        using var cut = Index(Encoding.ASCII.GetBytes(Sample.Header + "#1=A();"));
        using var full = Index(Encoding.ASCII.GetBytes(Sample.Model("#4294967295=A();")));

        Assert.Throws<InvalidOperationException>(() => new Part21Edits(cut).Append("A()"));
        Assert.Throws<InvalidOperationException>(() => new Part21Edits(full).Append("A()"));
    }

    [Fact]
    public void A_culture_changes_nothing()
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = new CultureInfo("de-DE");

            var written = Written(Encoding.ASCII.GetBytes(s_text), edits => edits.Append($"A({Part21Text.Real(1234.5)})"));

            Assert.Contains("#100=A(1234.5);", Encoding.ASCII.GetString(written), StringComparison.Ordinal);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void A_file_is_saved_over_itself_as_a_whole_and_no_other_is_left()
    {
        var folder = Directory.CreateTempSubdirectory("memberscan-");
        var path = Path.Combine(folder.FullName, "landing.ifc");
        File.WriteAllText(path, s_text);
        using (var index = Part21Index.Open(path, [], new DiagnosticList()))
        {
            var edits = new Part21Edits(index);
            edits.Append("IFCLABEL('x')");

            edits.Save(path);
        }

        Assert.Equal(s_text.Replace("\r\nENDSEC", "\r\n#100=IFCLABEL('x');\nENDSEC", StringComparison.Ordinal), File.ReadAllText(path));
        Assert.Equal([path], Directory.GetFiles(folder.FullName));
        folder.Delete(recursive: true);
    }

    [Fact]
    public void A_failed_save_leaves_nothing_behind()
    {
        var folder = Directory.CreateTempSubdirectory("memberscan-");
        var target = Path.Combine(folder.FullName, "landing.ifc");
        Directory.CreateDirectory(Path.Combine(target, "in the way"));
        using var index = Index(Encoding.ASCII.GetBytes(s_text));

        Assert.ThrowsAny<Exception>(() => new Part21Edits(index).Save(target));

        Assert.Empty(Directory.GetFiles(folder.FullName));
        folder.Delete(recursive: true);
    }

    private static Part21Index Index(byte[] bytes) => Part21Index.Over(bytes, "landing.ifc", [], new DiagnosticList(), 1);

    private static byte[] Written(byte[] bytes, Action<Part21Edits> change)
    {
        using var index = Index(bytes);
        var edits = new Part21Edits(index);
        change(edits);
        using var output = new MemoryStream();
        edits.WriteTo(output);
        return output.ToArray();
    }
}
