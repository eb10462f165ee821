using System.Buffers;
using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc.WriteBack;
using MemberScan.Part21;

namespace MemberScan.Ifc.Tests.WriteBack;

public sealed class ResultBlockTests
{
    [Theory]
    [InlineData("\n")]
    [InlineData("\r\n")]
    [InlineData("\r")]
    public void What_is_written_is_stripped_to_the_same_bytes(string lineEnd)
    {
        var text = Model("#1=IFCWALL();", lineEnd);

        var written = Write(text, "#2=IFCLABEL('a');", "#3=IFCLABEL('b');");
        var stripped = ResultBlock.Strip(written);

        Assert.True(stripped is { HadBlock: true, IsIntact: true });
        Assert.Equal(text, stripped.Base.ToArray());
        Assert.Equal(written, Write(stripped.Base.ToArray(), "#2=IFCLABEL('a');", "#3=IFCLABEL('b');"));
    }

    [Theory]
    [InlineData("\n")]
    [InlineData("\r\n")]
    public void The_block_stands_before_the_last_ENDSEC_and_the_rest_is_untouched(string lineEnd)
    {
        var text = Model("#1=IFCWALL('ENDSEC;');", lineEnd);

        var written = Encoding.ASCII.GetString(Write(text, "#2=IFCLABEL('a');"));

        var hash = Convert.ToHexStringLower(System.Security.Cryptography.SHA256.HashData(text));
        var block = string.Join(lineEnd, $"/* MemberScan block 1 sha256={hash} */", "#2=IFCLABEL('a');", "/* MemberScan block end */", "");
        Assert.Equal(Encoding.ASCII.GetString(text), written.Replace(block, "", StringComparison.Ordinal));
        Assert.Contains(block + "ENDSEC;" + lineEnd + "END-ISO", written, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("#1=IFCLABEL('/* MemberScan block 1 sha256=00 */');")]
    [InlineData("#1=IFCLABEL('/* MemberScan block end */');")]
    [InlineData("#1=IFCLABEL('/* MemberScan block 1 sha256=00 */ /* MemberScan block end */');")]
    public void The_words_of_the_block_in_a_string_of_the_model_are_content(string instance)
    {
        var text = Model(instance, "\n");

        var untouched = ResultBlock.Strip(text);
        var roundTrip = ResultBlock.Strip(Write(text, "#2=IFCLABEL('a');"));

        Assert.False(untouched.HadBlock);
        Assert.Equal(text, untouched.Base.ToArray());
        Assert.True(roundTrip is { HadBlock: true, IsIntact: true });
        Assert.Equal(text, roundTrip.Base.ToArray());
    }

    [Theory]
    [InlineData("/* MemberScan block 1 sha256=00 */")]
    [InlineData("/* MemberScan block end */")]
    public void The_words_of_the_block_in_a_name_that_is_written_back_survive_the_round_trip(string name)
    {
        var text = Model("#1=IFCWALL();", "\n");

        var written = Write(text, $"#2=IFCLABEL({Part21Text.String(name)});", "#3=IFCLABEL('b');");
        var stripped = ResultBlock.Strip(written);

        Assert.True(stripped is { HadBlock: true, IsIntact: true });
        Assert.Equal(text, stripped.Base.ToArray());
        Assert.True(Part21File.Read(written, "", new DiagnosticList()).TryFind(2, out var record) && record[0].TryText(out var read) && read == name);
    }

    [Fact]
    public void A_file_changed_after_the_run_loses_its_block_and_says_so()
    {
        var written = Encoding.ASCII.GetString(Write(Model("#1=IFCWALL();", "\n"), "#2=IFCLABEL('a');"));

        var stripped = ResultBlock.Strip(Encoding.ASCII.GetBytes(written.Replace("IFCWALL", "IFCSLAB", StringComparison.Ordinal)));

        Assert.True(stripped is { HadBlock: true, IsIntact: false });
        Assert.Equal(Model("#1=IFCSLAB();", "\n"), stripped.Base.ToArray());
    }

    [Theory]
    [InlineData("/* MemberScan block end */")]
    [InlineData("/* MemberScan block 1 sha256=")]
    public void A_block_without_one_of_its_marks_is_content(string mark)
    {
        var written = Encoding.ASCII.GetString(Write(Model("#1=IFCWALL();", "\n"), "#2=IFCLABEL('a');")).Replace(mark, "", StringComparison.Ordinal);

        var stripped = ResultBlock.Strip(Encoding.ASCII.GetBytes(written));

        Assert.False(stripped.HadBlock);
        Assert.Equal(written, Encoding.ASCII.GetString(stripped.Base.Span));
    }

    [Fact]
    public void A_text_that_ends_in_the_middle_of_a_mark_is_content()
    {
        foreach (var text in new[] { "", "/* MemberScan block 1 sha256=", "/* MemberScan block 1 sha256=0 *//* MemberScan block end */", "/* MemberScan block end */END" })
            Assert.False(ResultBlock.Strip(Encoding.ASCII.GetBytes(text)).HadBlock);
    }

    private static byte[] Model(string instance, string lineEnd) => Encoding.ASCII.GetBytes(string.Join(
        lineEnd, "ISO-10303-21;", "HEADER;", "FILE_DESCRIPTION((''),'2;1');", "FILE_NAME('','',(''),(''),'','','');", "FILE_SCHEMA(('IFC4'));", "ENDSEC;", "DATA;", instance, "ENDSEC;", "END-ISO-10303-21;", ""));

    private static byte[] Write(byte[] text, params string[] lines)
    {
        var file = Part21File.Read(text, "", new DiagnosticList());
        var output = new ArrayBufferWriter<byte>();
        ResultBlock.Write(output, text, file.InsertionOffset, lines, file.LineEnd);
        return output.WrittenSpan.ToArray();
    }
}
