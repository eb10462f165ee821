using System.Text;
using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Part21.Tests;

public sealed class Part21FileTests
{
    [Fact]
    public void Reads_the_header()
    {
        var (file, told) = Sample.Read(Sample.Model("#1=HANGER();"));

        Assert.Equal(["landing"], file.Header.Description);
        Assert.Equal("landing.ifc", file.Header.Name);
        Assert.Equal("2031-05-04T08:00:00", file.Header.TimeStamp);
        Assert.Equal("p", file.Header.PreprocessorVersion);
        Assert.Equal("o", file.Header.OriginatingSystem);
        Assert.Equal(["IFC4"], file.Header.Schemas);
        Assert.Empty(told.Items);
    }

    [Fact]
    public void Header_entries_of_other_shapes_and_names_are_taken_as_far_as_they_go()
    {
        var (file, told) = Sample.Read("ISO-10303-21;HEADER;FILE_DESCRIPTION($,'2;1');FILE_NAME('n');FILE_SCHEMA('IFC4');SCHEMA_POPULATION((('a','b',$)));!OWN(1);ENDSEC;DATA;ENDSEC;END-ISO-10303-21;");

        Assert.Empty(file.Header.Description);
        Assert.Equal("n", file.Header.Name);
        Assert.Equal("", file.Header.TimeStamp);
        Assert.Equal(["IFC4"], file.Header.Schemas);
        Assert.Empty(told.Items);
        Assert.True(file.ReadToEnd);
    }

    [Fact]
    public void Finds_instances_by_number_keyword_and_place()
    {
        var (file, told) = Sample.Read(Sample.Model("#7=HANGER(#3);#3=POST('a');\n#5=HANGER(#7);"));

        Assert.Equal(3, file.Count);
        Assert.Equal([7UL, 3UL, 5UL], file.Records.Select(r => r.Id));
        Assert.Equal([7UL, 5UL], file.RecordsOf("HANGER").Select(r => r.Id));
        Assert.Empty(file.RecordsOf("STAY"));
        Assert.Empty(file.RecordsOf(""));
        Assert.Equal(2, file.CountByKeyword["HANGER"]);
        Assert.Equal(["HANGER", "POST"], file.CountByKeyword.Keys);
        Assert.True(file.TryFind(3, out var post));
        Assert.Equal("POST", post.Keyword);
        Assert.Equal("#3=POST('a');"u8, post.Text);
        Assert.False(file.TryFind(4, out var none));
        Assert.Equal(default, none);
        Assert.Equal(7UL, file.HighestId);
        Assert.Empty(told.Items);
    }

    [Theory]
    [InlineData("4294967295")]
    [InlineData("4294967296")]
    [InlineData("18446744073709551615")]
    public void Numbers_beyond_32_bits_are_found(string number)
    {
        var (file, told) = Sample.Read(Sample.Model($"#1=POST();#{number}=HANGER(#1,#{number});"));

        var id = ulong.Parse(number, System.Globalization.CultureInfo.InvariantCulture);
        Assert.True(file.TryFind(id, out var record));
        Assert.Equal("HANGER", record.Keyword);
        Assert.Equal(id, file.HighestId);
        Assert.Empty(told.Items);
    }

    [Fact]
    public void Leading_zeros_do_not_count()
    {
        var (file, told) = Sample.Read(Sample.Model("#0012=POST();\n#13=HANGER(#00012);"));

        Assert.True(file.TryFind(12, out var post));
        Assert.Equal(12UL, post.Id);
        Assert.Empty(told.Items);
    }

    [Fact]
    public void Comments_stand_anywhere_between_tokens()
    {
        var (file, told) = Sample.Read("/*a;'*/ISO-10303-21/**/;/*b*/HEADER/*c*/;/*d*/FILE_DESCRIPTION/*e*/(/*f*/(/*g*/'x'/*h*/)/*i*/,/*j*/'2;1'/*k*/)/*l*/;FILE_NAME('','',(''),(''),'','','');FILE_SCHEMA(('IFC4'));ENDSEC/*m*/;DATA/*n*/;"
            + "/* #9=NOT(1); */#1/*= #2*/=/*p*/HANGER/*q(*/(/*r)*/1./*s*/,/*t*/#1/*u'*/,(/*v*/$/*w*/,/*x*/IFCLABEL/*y*/(/*z*/'a'/*)*/)))/*;*/;/*A*/ENDSEC;/*B*/END-ISO-10303-21/*C*/;/*D*/");

        Assert.Empty(told.Items);
        Assert.True(file.ReadToEnd);
        Assert.Equal(["x"], file.Header.Description);
        var record = Assert.Single(file.Records);
        Assert.Equal(3, record.ArgumentCount);
        Assert.Equal("1."u8, record[0].Text);
        Assert.Equal("#1"u8, record[1].Text);
        Assert.Equal("a", record[2].Items[1].TryText(out var text) ? text : null);
    }

    [Theory]
    [InlineData("\n", "\n")]
    [InlineData("\r\n", "\r\n")]
    [InlineData("\r", "\r")]
    public void Reads_every_line_end_and_counts_lines(string lineEnd, string expected)
    {
        var text = Sample.Model("#1=POST();\n\n#2=HANGER(\n#1);").Replace("\n", lineEnd, StringComparison.Ordinal);

        var (file, told) = Sample.Read(text);

        Assert.Equal(expected, file.LineEnd);
        Assert.Empty(told.Items);
        Assert.True(file.TryFind(2, out var hanger));
        Assert.Equal(10, hanger.Span.Line);
        Assert.Equal(text.IndexOf("#2", StringComparison.Ordinal), hanger.Span.Offset);
        Assert.Equal(2UL, hanger.Span.InstanceId);
    }

    [Fact]
    public void Lines_are_counted_across_any_block()
    {
        var random = new Random(21);
        var bytes = new byte[100_000];
        for (var i = 0; i < bytes.Length; i++) bytes[i] = "\r\nxxxx"u8[random.Next(6)];
        var (file, _) = Sample.Read(bytes);

        var line = 1L;
        for (var i = 0; i < bytes.Length; i++)
        {
            Assert.Equal(line, file.SpanAt(i).Line);
            if (bytes[i] == '\n' || (bytes[i] == '\r' && (i + 1 == bytes.Length || bytes[i + 1] != '\n'))) line++;
        }

        Assert.Equal(line, file.SpanAt(bytes.Length).Line);
        Assert.Equal(0, file.SpanAt(bytes.Length + 1).Line);
    }

    [Fact]
    public void Without_any_line_end_it_is_line_feed()
    {
        var (file, _) = Sample.Read(Sample.Model("#1=POST();").Replace("\n", "", StringComparison.Ordinal));

        Assert.Equal("\n", file.LineEnd);
        Assert.True(file.ReadToEnd);
    }

    [Fact]
    public void A_byte_order_mark_and_blanks_may_stand_in_front()
    {
        var (file, told) = Sample.Read([0xEF, 0xBB, 0xBF, .. Encoding.ASCII.GetBytes(" \n" + Sample.Model("#1=POST();"))]);

        Assert.Empty(told.Items);
        Assert.Equal(1, file.Count);
    }

    [Fact]
    public void Lower_case_is_taken()
    {
        var (file, told) = Sample.Read("iso-10303-21;header;file_description((''),'');file_name('n');file_schema(('IFC4'));endsec;data;#1=ifcBeam(.element.,1.5e3);endsec;end-iso-10303-21;");

        Assert.Empty(told.Items);
        var beam = Assert.Single(file.RecordsOf("IFCBEAM"));
        Assert.True(beam[0].TryEnumeration(out var literal));
        Assert.Equal("ELEMENT", literal);
        Assert.True(file.ReadToEnd);
    }

    [Fact]
    public void Several_data_sections_are_one_population()
    {
        var text = Sample.Header.Replace("DATA;", "DATA('a;',('IFC4'));", StringComparison.Ordinal) + "#1=POST(#2);\nENDSEC;\nDATA('b',('IFC4'));\n#2=POST(#1);\n" + Sample.Footer;

        var (file, told) = Sample.Read(text);

        Assert.Empty(told.Items);
        Assert.Equal(2, file.Count);
        Assert.Equal(text.LastIndexOf("ENDSEC", StringComparison.Ordinal), file.InsertionOffset);
    }

    [Fact]
    public void Insertion_stands_before_the_end_of_data_not_before_a_string_that_says_so()
    {
        var text = Sample.Model("#1=POST('\nENDSEC;\n');/*\nENDSEC;\n*/");

        var (file, told) = Sample.Read(text);

        Assert.Empty(told.Items);
        Assert.Equal(text.LastIndexOf("ENDSEC", StringComparison.Ordinal), file.InsertionOffset);
    }

    [Fact]
    public void Numbers_within_strings_and_comments_are_no_references()
    {
        var (file, told) = Sample.Read(Sample.Model("#1=POST('#99',/*#98*/'it''s #97');"));

        Assert.Empty(told.Items);
        Assert.Equal(1UL, file.HighestId);
    }

    [Fact]
    public void A_complex_instance_is_passed_over_and_told()
    {
        var (file, told) = Sample.Read(Sample.Model("#1=(POST(1,(2))RAIL('a;b',#2));\n#2=HANGER();"));

        Assert.Equal(2, file.Count);
        Assert.True(file.TryFind(1, out var complex));
        Assert.True(complex.IsComplex);
        Assert.False(complex.IsDamaged);
        Assert.Equal("", complex.Keyword);
        Assert.Equal(0, complex.ArgumentCount);
        Assert.Equal("#1=(POST(1,(2))RAIL('a;b',#2));"u8, complex.Text);
        Assert.Equal("P21-0020", Assert.Single(told.Items).Code);
        Assert.False(file.HasDamage);
        Assert.Equal(["HANGER"], file.CountByKeyword.Keys);
    }

    [Fact]
    public void Sections_of_edition_3_are_skipped()
    {
        var text = Sample.Header.Replace("DATA;", "ANCHOR;\n<a>=#1;\n<b;c>='x;ENDSEC;';\nENDSEC;\nREFERENCE;\n#5=<other.ifc#x>;\nENDSEC;\nDATA;", StringComparison.Ordinal)
            + "#1=POST();\n" + Sample.Footer + "SIGNATURE;\nMIIB'no string\nENDSEC;\n";

        var (file, told) = Sample.Read(text);

        Assert.Equal(["P21-0010", "P21-0011"], told.Items.Select(d => d.Code));
        Assert.All(told.Items, d => Assert.Equal(Severity.Note, d.Severity));
        Assert.Equal(2, told.CountOf(told.Items[0]));
        Assert.Equal(1, file.Count);
        Assert.True(file.ReadToEnd);
        Assert.False(file.HasDamage);
    }

    [Fact]
    public void The_default_record_is_no_instance()
    {
        var none = default(Part21Record);

        Assert.Equal(0UL, none.Id);
        Assert.Equal("", none.Keyword);
        Assert.Equal(0, none.ArgumentCount);
        Assert.Empty(none.Arguments());
        Assert.Equal(Part21ValueKind.Absent, none[0].Kind);
        Assert.False(none.IsComplex || none.IsDamaged || none.IsDuplicate);
        Assert.True(none.Text.IsEmpty);
        Assert.Equal(-1, none.Span.Offset);
    }
}
