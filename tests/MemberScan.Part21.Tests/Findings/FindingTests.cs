using System.Reflection;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Part21.Findings;

namespace MemberScan.Part21.Tests.Findings;

/// <summary>Each code with the place it names. ‹ marks the byte where the finding must be told; it is no part of the text.</summary>
public sealed class FindingTests
{
    [Theory]
    [InlineData("P21-0014", 2, "#2=HANGER(1,‹'open,$);")]
    [InlineData("P21-0014", 2, "#2=HANGER(1,‹'open,$);\n#3=POST(1);\n#4=POST('b')")]
    [InlineData("P21-0015", 2, "#2=HANGER(1,‹/* open,$);")]
    [InlineData("P21-0015", 2, "#2=HANGER(1)‹/* open;")]
    [InlineData("P21-0015", 0, "‹/* open #2=HANGER(1);")]
    [InlineData("P21-0016", 2, "#2=HANGER((1,2)‹;")]
    [InlineData("P21-0016", 2, "#2=HANGER((1,2‹;")]
    [InlineData("P21-0016", 2, "#2=HANGER('a;b',1‹;")]
    [InlineData("P21-0016", 2, "#2=HANGER(1,#3 ‹=POST(1);")]
    [InlineData("P21-0017", 2, "#2=HANGER(1,2)‹);")]
    [InlineData("P21-0017", 2, "#2=HANGER('O'‹Neil',2);")]
    [InlineData("P21-0017", 2, "#2=HANGER((1)‹2,3);")]
    [InlineData("P21-0017", 2, "#2=HANGER(1‹(2),3);")]
    [InlineData("P21-0017", 2, "#2=HANGER(1) ‹and more;")]
    [InlineData("P21-0017", 2, "#2=HANGER((1 2‹/* ) */,3));")]
    [InlineData("P21-0018", 2, "‹#2 HANGER(1);")]
    [InlineData("P21-0018", 2, "#2=‹12;")]
    [InlineData("P21-0018", 2, "#2=HANGER‹;")]
    [InlineData("P21-0018", 0, "‹#99999999999999999999=HANGER(1);")]
    [InlineData("P21-0018", 0, "‹#=HANGER(1);")]
    [InlineData("P21-0019", 2, "#2=‹&SCOPE #8=POST(); ENDSCOPE HANGER(1);")]
    public void A_bad_instance_costs_itself_and_is_told(string code, int id, string line)
    {
        var (file, told) = ReadMarked(line, out var offset, out var lineNumber);

        var found = Assert.Single(told.Items, d => d.Code == code);
        Assert.Equal(Severity.Warning, found.Severity);
        Assert.Equal(offset, found.Span!.Value.Offset);
        Assert.Equal(lineNumber, found.Span!.Value.Line);
        Assert.Equal((ulong)id, found.Span!.Value.InstanceId);
        Assert.True(file.HasDamage);
        Assert.True(file.ReadToEnd);
        Assert.True(file.InsertionOffset > 0);
        Assert.True(!file.TryFind(2, out var bad) || (bad.IsDamaged && bad.ArgumentCount == 0 && bad[0].Kind == Part21ValueKind.Absent));
        Assert.True(file.TryFind(1, out var before) && before[0].TryText(out var first) && first == "before");
        Assert.True(file.TryFind(9, out var after) && after[0].TryText(out var last) && last == "after");
    }

    [Theory]
    [InlineData("P21-0021", "#2=HANGER(1)‹", 1)]
    [InlineData("P21-0022", "#2=HANGER($,‹,1);", 3)]
    [InlineData("P21-0022", "#2=HANGER(‹,1);", 2)]
    [InlineData("P21-0022", "#2=HANGER(1,‹);", 2)]
    [InlineData("P21-0022", "#2=HANGER((1.,‹,2.));", 1)]
    [InlineData("P21-0023", "#2=HANGER((‹-1.#INF,1.));", 1)]
    [InlineData("P21-0023", "#2=HANGER(1,‹.5);", 2)]
    [InlineData("P21-0023", "#2=HANGER(1,‹1.5.5 );", 2)]
    [InlineData("P21-0024", "#2=HANGER(1,‹1.E999);", 2)]
    [InlineData("P21-0024", "#2=HANGER(1,‹-1.E+309);", 2)]
    [InlineData("P21-0025", "#2=HANGER(1,‹NaN);", 2)]
    [InlineData("P21-0025", "#2=HANGER(‹#x,1);", 2)]
    [InlineData("P21-0025", "#2=HANGER(‹@,1);", 2)]
    [InlineData("P21-0026", "#2=HANGER(IFCLABEL('a'‹,'b'));", 1)]
    [InlineData("P21-0026", "#2=HANGER(IFCLABEL(‹));", 1)]
    [InlineData("P21-0027", "‹#1=HANGER(1);", 1)]
    [InlineData("P21-0028", "#2=HANGER(#1,(#9,‹#77));", 2)]
    public void A_bad_value_leaves_the_rest_of_its_instance(string code, string line, int arguments)
    {
        var (file, told) = ReadMarked(line, out var offset, out var lineNumber);

        var found = Assert.Single(told.Items);
        Assert.Equal(code, found.Code);
        Assert.Equal(Severity.Warning, found.Severity);
        Assert.Equal(offset, found.Span!.Value.Offset);
        Assert.Equal(lineNumber, found.Span!.Value.Line);
        Assert.Equal(code == "P21-0027" ? 1UL : 2UL, found.Span!.Value.InstanceId);
        Assert.True(file.HasDamage);
        Assert.True(file.ReadToEnd);
        Assert.Equal(3, file.Count);
        var bad = Assert.Single(file.RecordsOf("HANGER"));
        Assert.False(bad.IsDamaged);
        Assert.Equal(arguments, bad.ArgumentCount);
    }

    [Fact]
    public void An_empty_argument_reads_as_absent_and_the_others_keep_their_index()
    {
        var (file, _) = Sample.Read(Sample.Model("#1=HANGER($,,'c');"));
        Assert.True(file.TryFind(1, out var record));

        Assert.Equal(Part21ValueKind.Absent, record[1].Kind);
        Assert.Equal("'c'"u8, record[2].Text);
    }

    [Fact]
    public void Of_two_instances_with_one_number_the_first_is_found()
    {
        foreach (var number in new[] { "5", "500000000000" })
        {
            var (file, told) = Sample.Read(Sample.Model($"#{number}=POST('first');\n#7=POST(#{number});\n#{number}=POST('second');\n#{number}=POST('third');"));

            var id = ulong.Parse(number, System.Globalization.CultureInfo.InvariantCulture);
            Assert.True(file.TryFind(id, out var record));
            Assert.True(record[0].TryText(out var text));
            Assert.Equal("first", text);
            Assert.Equal([false, false, true, true], file.Records.Select(r => r.IsDuplicate));
            Assert.Equal(2, told.CountOf(Assert.Single(told.Items)));
            Assert.Equal(10, told.Items[0].Span!.Value.Line);
        }
    }

    [Fact]
    public void References_to_nothing_are_counted_and_their_numbers_stay_taken()
    {
        var (file, told) = Sample.Read(Sample.Model("#1=POST(#40,#41,#99999999999);\n#2=POST(#40);"));

        var found = Assert.Single(told.Items);
        Assert.Equal("P21-0028", found.Code);
        Assert.Equal(4, told.CountOf(found));
        Assert.Equal(99999999999UL, file.HighestId);
    }

    [Theory]
    [InlineData("#1=POST();\ngarbage #900 more;\n#3=POST();")]
    [InlineData("#1=POST();\n#3=POST('open #900,1);")]
    [InlineData("#1=POST();\n#3=POST(1,(2,(#900;\n#4=POST();")]
    [InlineData("#1=POST();\n#900 POST();\n#4=POST();")]
    public void Numbers_in_text_that_was_passed_over_stay_taken(string data)
    {
        var (file, _) = Sample.Read(Sample.Model(data));

        Assert.True(file.HasDamage);
        Assert.Equal(900UL, file.HighestId);
    }

    [Fact]
    public void A_string_that_swallowed_instances_gives_them_back()
    {
        var (file, told) = Sample.Read(Sample.Model("#1=POST('open,1);\n#2=POST('a');\n#3=POST('b','c');\n#4=POST('');"));

        Assert.Equal([1UL, 2UL, 3UL, 4UL], file.Records.Select(r => r.Id));
        Assert.Equal([true, false, false, false], file.Records.Select(r => r.IsDamaged));
        Assert.Equal("P21-0014", Assert.Single(told.Items).Code);
    }

    [Fact]
    public void Text_between_statements_is_passed_over_up_to_the_next_one()
    {
        var (file, told) = ReadMarked("‹what is this?; 'x");

        Assert.Equal("P21-0009", told.Code);
        Assert.Equal(2, file.Count);
        Assert.True(file.HasDamage);
        Assert.True(file.ReadToEnd);
    }

    [Theory]
    [InlineData("P21-0001", false, "‹a letter, not a model")]
    [InlineData("P21-0001", false, "‹")]
    [InlineData("P21-0001", false, "‹It speaks of ISO-10303-21; but is none")]
    [InlineData("P21-0002", false, "‹I\0S\0O\0-\0")]
    [InlineData("P21-0002", false, "‹\u00FF\u00FEI\0S\0O\0-\0")]
    [InlineData("P21-0007", true, "‹From: the yard\n\nISO-10303-21;\nHEADER;\nFILE_DESCRIPTION((''),'');FILE_NAME('');FILE_SCHEMA(('IFC4'));ENDSEC;\nDATA;\nENDSEC;\nEND-ISO-10303-21;\n")]
    [InlineData("P21-0003", false, Sample.Header + "#1=POST();\nENDSEC;\n‹")]
    [InlineData("P21-0003", false, Sample.Header + "#1=POST();\n‹")]
    [InlineData("P21-0005", false, "ISO-10303-21;HEADER;FILE_DESCRIPTION((''),'');FILE_NAME('');FILE_SCHEMA(('IFC4'));ENDSEC;END-ISO-10303-21;")]
    [InlineData("P21-0004", false, Sample.Header + "#1=POST();\n" + Sample.Footer + "-----\n‹" + Sample.Header + "#1=POST();\n" + Sample.Footer)]
    [InlineData("P21-0006", false, Sample.Header + "#1=POST();\n‹END-ISO-10303-21;\n")]
    [InlineData("P21-0008", true, Sample.Header + "#1=POST();\n" + Sample.Footer + "‹and a postscript")]
    [InlineData("P21-0009", true, Sample.Header + "#1=POST();\nENDSEC;\n‹#2=POST();\nEND-ISO-10303-21;\n")]
    [InlineData("P21-0012", true, "ISO-10303-21;\nHEADER;\nFILE_DESCRIPTION((''),'');\nFILE_NAME('n');\n‹FILE_POPULATION('x,'y');\nFILE_SCHEMA(('IFC4'));\nENDSEC;\nDATA;\nENDSEC;\nEND-ISO-10303-21;\n")]
    [InlineData("P21-0021", true, "ISO-10303-21;HEADER;FILE_DESCRIPTION((''),'');FILE_NAME('');FILE_SCHEMA(('IFC4'));ENDSEC;DATA;ENDSEC;END-ISO-10303-21‹")]
    public void Damage_to_the_frame_is_told(string code, bool readToEnd, string marked)
    {
        var text = marked.Replace("‹", "", StringComparison.Ordinal);
        var offset = marked.IndexOf('‹', StringComparison.Ordinal);

        var (file, told) = Sample.Read(text);

        var found = Assert.Single(told.Items);
        Assert.Equal(code, found.Code);
        Assert.Equal(readToEnd ? Severity.Warning : Severity.Error, found.Severity);
        Assert.Equal(offset, found.Span!.Value.Offset);
        if (offset >= 0) Assert.Equal(1 + text[..offset].Count(c => c == '\n'), found.Span!.Value.Line);
        Assert.Equal(readToEnd, file.ReadToEnd);
        Assert.True(file.HasDamage);
    }

    [Fact]
    public void A_missing_header_entry_is_told()
    {
        var (file, told) = Sample.Read(Sample.Model("").Replace("FILE_SCHEMA(('IFC4'));\n", "", StringComparison.Ordinal));

        Assert.Equal("P21-0013", Assert.Single(told.Items).Code);
        Assert.Empty(file.Header.Schemas);
        Assert.True(file.ReadToEnd);
        Assert.False(file.HasDamage);
    }

    [Fact]
    public void Blanks_and_control_characters_after_the_end_are_nothing()
    {
        var (file, told) = Sample.Read(Sample.Model("#1=POST();") + "\r\n\u001A\0 /* end */\n");

        Assert.Empty(told.Items);
        Assert.True(file.ReadToEnd);
    }

    [Fact]
    public void A_file_cut_off_anywhere_is_not_read_to_its_end()
    {
        var text = Sample.Model("#1=POST('a;b',(1.,2.));/* c */\n#2=(A()B(1));");
        var whole = text.IndexOf("END-ISO-10303-21", StringComparison.Ordinal) + "END-ISO-10303-21".Length;

        for (var length = 0; length < text.Length; length++)
        {
            var (file, told) = Sample.Read(text[..length]);

            Assert.Equal(length >= whole, file.ReadToEnd);
            if (length < whole) Assert.True(told.HasErrors);
        }
    }

    [Fact]
    public void No_single_slip_in_one_instance_costs_another()
    {
        var before = string.Concat(Enumerable.Range(1, 5).Select(i => $"#{i}=POST('p{i}',(#1,#2),$);\n"));
        var after = string.Concat(Enumerable.Range(21, 5).Select(i => $"#{i}=RAIL('r;{i}',IFCREAL(1.5),'#{i}');\n"));
        const string Victim = "#10=HANGER('it''s',#1,(1.,(2.,3.)),.T.,IFCLABEL('x'),$);";

        for (var at = 0; at <= Victim.Length; at++)
        {
            foreach (var slip in new[] { "", "'", "(", ")", ",", ";", "#", "=", "\"", "/*", "*/", "\\", "\n", ".", "x", "5", "\u00E4", "\0" })
            {
                AssertOthersRead(before + Victim[..at] + slip + Victim[Math.Min(at + 1, Victim.Length)..] + "\n" + after);
                AssertOthersRead(before + Victim[..at] + slip + Victim[at..] + "\n" + after);
            }
        }
    }

    [Fact]
    public void Codes_are_unique_and_say_what_was_done()
    {
        var kinds = typeof(FindingKinds).GetFields(BindingFlags.Static | BindingFlags.Public).Select(f => (FindingKind)f.GetValue(null)!).ToList();

        Assert.Equal(Enumerable.Range(1, kinds.Count).Select(n => $"P21-{n:0000}"), kinds.Select(k => k.Code).Order(StringComparer.Ordinal));
        Assert.All(kinds, k => Assert.EndsWith(".", k.Message, StringComparison.Ordinal));
        Assert.All(kinds, k => Assert.True(!k.EndsReading || (k.IsDamage && k.Severity == Severity.Error)));
    }

    private static void AssertOthersRead(string data)
    {
        var (file, _) = Sample.Read(Sample.Model(data));

        Assert.True(file.ReadToEnd, data);
        for (var i = 1; i <= 5; i++)
        {
            Assert.True(file.TryFind((ulong)i, out var post), data);
            Assert.True(post.Text.SequenceEqual(System.Text.Encoding.ASCII.GetBytes($"#{i}=POST('p{i}',(#1,#2),$);")), data);
        }

        for (var i = 21; i <= 25; i++)
        {
            Assert.True(file.TryFind((ulong)i, out var rail), data);
            Assert.True(rail.Keyword == "RAIL" && rail.ArgumentCount == 3 && rail[2].TryText(out var text) && text == $"#{i}", data);
        }
    }

    private static (Part21File File, DiagnosticList Told) ReadMarked(string line, out int offset, out int lineNumber)
    {
        var marked = Sample.Model($"#1=POST('before');\n{line}\n#9=POST('after');");
        offset = marked.IndexOf('‹', StringComparison.Ordinal);
        lineNumber = 1 + marked[..offset].Count(c => c == '\n');
        return Sample.Read(marked.Replace("‹", "", StringComparison.Ordinal));
    }

    private static (Part21File File, Diagnostic Told) ReadMarked(string line)
    {
        var (file, told) = ReadMarked(line, out var offset, out var lineNumber);
        var found = Assert.Single(told.Items);
        Assert.Equal(offset, found.Span!.Value.Offset);
        Assert.Equal(lineNumber, found.Span!.Value.Line);
        return (file, found);
    }
}
