using System.Globalization;
using System.Text;

namespace MemberScan.Part21.Tests;

public sealed class Part21ValueTests
{
    // ISO 10303-21, string encoding: the examples of the IFC implementer's literature for each directive; ISO 8859 parts as published by ISO.
    [Theory]
    [InlineData(@"\S\D", "Ä")]
    [InlineData(@"\PA\\S\D", "Ä")]
    [InlineData(@"\X\C4", "Ä")]
    [InlineData(@"\X2\00C4\X0\", "Ä")]
    [InlineData(@"\PB\\S\!", "Ą")]                   // ISO 8859-2, A1
    [InlineData(@"\PC\\S\!", "Ħ")]                   // ISO 8859-3, A1
    [InlineData(@"\PD\\S\""", "ĸ")]                  // ISO 8859-4, A2
    [InlineData(@"\PE\\S\*", "Њ")]                   // ISO 8859-5, AA
    [InlineData(@"\PF\\S\G", "ا")]                   // ISO 8859-6, C7
    [InlineData(@"\PG\\S\a", "α")]                   // ISO 8859-7, E1
    [InlineData(@"\PH\\S\`", "א")]                   // ISO 8859-8, E0
    [InlineData(@"\PI\\S\P", "Ğ")]                   // ISO 8859-9, D0
    [InlineData(@"\PE\\S\*\PA\\S\D", "ЊÄ")]
    [InlineData(@"\X2\03B103B2\X0\", "αβ")]
    [InlineData(@"\X2\03b103B2\X0\", "αβ")]
    [InlineData(@"\X2\\X0\", "")]
    [InlineData(@"\X4\0001F600\X0\", "\U0001F600")]
    [InlineData(@"\X2\D83DDE00\X0\", "\U0001F600")]
    [InlineData(@"\X2\D83D\X0\\X2\DE00\X0\", "\U0001F600")]
    [InlineData(@"O''Neil", "O'Neil")]
    [InlineData(@"''", "'")]
    [InlineData(@"", "")]
    [InlineData(@"a\\b", @"a\b")]
    [InlineData(@"a\\S\D", @"a\S\D")]
    [InlineData(@"rail\N\post\F\", "railpost")]
    [InlineData(@"\S\Drger h\S\ttel", "Ärger hôtel")]
    public void Decodes_every_directive(string spelling, string text)
    {
        var value = Sample.Value($"'{spelling}'");

        Assert.Equal(Part21ValueKind.Text, value.Kind);
        Assert.True(value.TryText(out var decoded));
        Assert.Equal(text, decoded);
    }

    [Theory]
    [InlineData(@"C:\temp\new")]
    [InlineData(@"\X2\00C\X0\")]
    [InlineData(@"\X2\00C4")]
    [InlineData(@"\X2\00G4\X0\")]
    [InlineData(@"\X4\00110000\X0\")]
    [InlineData(@"\X4\0000D83D\X0\")]
    [InlineData(@"\X\G4")]
    [InlineData(@"\X\C")]
    [InlineData(@"\PJ\")]
    [InlineData(@"\PA")]
    [InlineData(@"\S")]
    [InlineData(@"C:\S\")]
    [InlineData(@"\")]
    public void A_backslash_that_begins_no_directive_stands_for_itself(string text)
    {
        Assert.True(Sample.Value($"'{text}'").TryText(out var decoded));

        Assert.Equal(text, decoded);
    }

    // The grammar lets \S\ take a single apostrophe; writers that double it exist as well. § is ISO 8859-1, A7 = 27 + 80.
    [Theory]
    [InlineData(@"'ends in \S\''", "ends in §")]
    [InlineData(@"'ends in \S\'''", "ends in §")]
    [InlineData(@"'a \S\'' b'", "a § b")]
    [InlineData(@"'a \S\' b'", "a § b")]
    [InlineData(@"'a \S\'''' b'", "a §' b")]
    [InlineData(@"'\PA\\S\'' , b'", @"§|")]
    public void Page_directive_takes_an_apostrophe_single_or_doubled(string spelling, string text)
    {
        // Where a comma follows the apostrophes the string is taken as closed; what is left is then no value.
        var (file, _) = Sample.Read(Sample.Model($"#1=HANGER({spelling});"));
        Assert.True(file.TryFind(1, out var record));

        if (text.EndsWith('|'))
        {
            Assert.True(record.IsDamaged);
            return;
        }

        Assert.True(record[0].TryText(out var decoded));
        Assert.Equal(text, decoded);
        Assert.Equal(1, record.ArgumentCount);
    }

    [Fact]
    public void Half_a_surrogate_pair_reads_as_the_replacement_character()
    {
        Assert.True(Sample.Value(@"'a\X2\D83D\X0\b'").TryText(out var decoded));

        Assert.Equal("a\uFFFDb", decoded);
    }

    [Fact]
    public void Control_characters_within_a_string_do_not_count()
    {
        Assert.True(Sample.Value("'mast\r\n stay\t\u007F\\X2\\00\nC4\\X0\\'").TryText(out var decoded));

        Assert.Equal("mast stayÄ", decoded);
    }

    [Fact]
    public void Raw_bytes_are_utf_8_where_valid_and_windows_1252_elsewhere()
    {
        var utf8 = Encoding.Latin1.GetString(Encoding.UTF8.GetBytes("Fähre ⌀48"));

        Assert.True(Sample.Value($"'{utf8}'").TryText(out var fromUtf8));
        Assert.True(Sample.Value("'F\u00E4hre \u0080 \u00D848'").TryText(out var fromWindows));

        Assert.Equal("Fähre ⌀48", fromUtf8);
        Assert.Equal("Fähre € Ø48", fromWindows);
    }

    [Theory]
    [InlineData("12", 12)]
    [InlineData("+42", 42)]
    [InlineData("-7", -7)]
    [InlineData("1.", 1)]
    [InlineData("-0.5", -0.5)]
    [InlineData("1.E-05", 1e-5)]
    [InlineData("1.0E-005", 1e-5)]
    [InlineData("6.02E23", 6.02e23)]
    [InlineData("1.5e+3", 1500)]
    [InlineData("2E3", 2000)]
    [InlineData("0.1", 0.1)]
    [InlineData("IFCLENGTHMEASURE(48.3)", 48.3)]
    [InlineData("IFCPOSITIVELENGTHMEASURE ( /* wall */ 3.2 )", 3.2)]
    [InlineData("9007199254740993", 9007199254740992)]        // 2^53 + 1: to even (IEEE 754)
    [InlineData("9007199254740993.00000000000000000001", 9007199254740994)]
    [InlineData("2.2250738585072011E-308", 2.2250738585072011E-308)]   // the largest subnormal but one, a known stumbling block of parsers
    [InlineData("1.E-400", 0)]
    public void Reads_a_real(string spelling, double expected)
    {
        Assert.True(Sample.Value(spelling).TryReal(out var value));

        Assert.Equal(expected, value);
    }

    [Theory]
    [InlineData("12", Part21ValueKind.Integer)]
    [InlineData("1.5", Part21ValueKind.Real)]
    [InlineData("1E5", Part21ValueKind.Real)]
    [InlineData("#12", Part21ValueKind.Reference)]
    [InlineData("$", Part21ValueKind.Unset)]
    [InlineData("*", Part21ValueKind.Derived)]
    [InlineData("'x'", Part21ValueKind.Text)]
    [InlineData(".T.", Part21ValueKind.Enumeration)]
    [InlineData("\"0F\"", Part21ValueKind.Binary)]
    [InlineData("()", Part21ValueKind.List)]
    [InlineData("((1.,2.),(3.,4.))", Part21ValueKind.List)]
    [InlineData("IFCLABEL('x')", Part21ValueKind.Typed)]
    [InlineData("!OWN_TYPE(1)", Part21ValueKind.Typed)]
    [InlineData("-1.#INF", Part21ValueKind.Malformed)]
    [InlineData("-1.#IND", Part21ValueKind.Malformed)]
    [InlineData(".5", Part21ValueKind.Malformed)]
    [InlineData("1,5", Part21ValueKind.Integer)]
    [InlineData("1.5.2", Part21ValueKind.Malformed)]
    [InlineData("1 2", Part21ValueKind.Malformed)]
    [InlineData("1E", Part21ValueKind.Malformed)]
    [InlineData("-", Part21ValueKind.Malformed)]
    [InlineData("NaN", Part21ValueKind.Malformed)]
    [InlineData("INF", Part21ValueKind.Malformed)]
    [InlineData("#", Part21ValueKind.Malformed)]
    [InlineData("#x", Part21ValueKind.Malformed)]
    [InlineData("#99999999999999999999999", Part21ValueKind.Malformed)]
    [InlineData(".T", Part21ValueKind.Malformed)]
    [InlineData(".1.", Part21ValueKind.Malformed)]
    [InlineData("\"7F\"", Part21ValueKind.Malformed)]
    [InlineData("IFCLABEL('x','y')", Part21ValueKind.Malformed)]
    [InlineData("IFCLABEL()", Part21ValueKind.Malformed)]
    [InlineData("@", Part21ValueKind.Malformed)]
    public void Tells_the_kind(string spelling, Part21ValueKind kind)
    {
        Assert.Equal(kind, Sample.Value(spelling).Kind);
    }

    [Theory]
    [InlineData("1.E999")]
    [InlineData("-1.#INF")]
    [InlineData("'1.5'")]
    [InlineData("$")]
    [InlineData("#1")]
    [InlineData("(1.)")]
    [InlineData("IFCLABEL('1.')")]
    public void What_is_no_finite_number_reads_as_none(string spelling)
    {
        Assert.False(Sample.Value(spelling).TryReal(out var value));

        Assert.Equal(0, value);
    }

    [Theory]
    [InlineData("9223372036854775807", true, long.MaxValue)]
    [InlineData("9223372036854775808", false, 0)]
    [InlineData("5.", true, 5)]
    [InlineData("1.E3", true, 1000)]
    [InlineData("5.5", false, 0)]
    [InlineData("1.E19", false, 0)]
    [InlineData("IFCINTEGER(-3)", true, -3)]
    [InlineData("'3'", false, 0)]
    public void Reads_an_integer_or_a_real_without_fraction(string spelling, bool isInteger, long expected)
    {
        Assert.Equal(isInteger, Sample.Value(spelling).TryInteger(out var value));
        Assert.Equal(expected, value);
    }

    [Fact]
    public void Numbers_read_the_same_in_a_culture_with_a_decimal_comma()
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = new CultureInfo("de-DE");

            Assert.True(Sample.Value("1.5").TryReal(out var value));

            Assert.Equal("1,5", 1.5.ToString(CultureInfo.CurrentCulture));
            Assert.Equal(1.5, value);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void Typed_values_open_layer_by_layer()
    {
        var value = Sample.Value("ifcOuter /* a */ ( IFCINNER ( .Rigid. ) )");

        Assert.Equal("IFCOUTER", value.TypeName);
        Assert.Equal("IFCINNER", value.Inner.TypeName);
        Assert.Equal(".Rigid."u8, value.Inner.Inner.Text);
        Assert.True(value.TryEnumeration(out var literal));
        Assert.Equal("RIGID", literal);
    }

    [Fact]
    public void Lists_give_their_items_in_order()
    {
        var value = Sample.Value("( 1. , /* , ) */ (#7,'a,b)''(') , $ )");

        Assert.Equal(3, value.ItemCount);
        Assert.Equal("1."u8, value.Items[0].Text);
        Assert.True(value.Items[1].Items[0].TryReference(out var id));
        Assert.Equal(7UL, id);
        Assert.True(value.Items[1].Items[1].TryText(out var text));
        Assert.Equal("a,b)'(", text);
        Assert.Equal(Part21ValueKind.Unset, value.Items[2].Kind);
        Assert.True(value.Items[2].IsEmpty);
    }

    [Fact]
    public void A_value_knows_where_it_stands()
    {
        var text = Sample.Model("#1=HANGER($, 12.5 );");
        var (file, _) = Sample.Read(text);
        Assert.True(file.TryFind(1, out var record));

        Assert.Equal(text.IndexOf("12.5", StringComparison.Ordinal), record[1].Offset);
        Assert.Equal(-1, record[2].Offset);
        Assert.Equal(Part21ValueKind.Absent, record[2].Kind);
    }

    [Fact]
    public void The_default_value_is_absent()
    {
        var value = default(Part21Value);

        Assert.Equal(Part21ValueKind.Absent, value.Kind);
        Assert.True(value.IsEmpty);
        Assert.True(value.Text.IsEmpty);
        Assert.Empty(value.Items);
        Assert.False(value.TryText(out _) || value.TryReal(out _) || value.TryReference(out _) || value.TryEnumeration(out _));
    }
}
