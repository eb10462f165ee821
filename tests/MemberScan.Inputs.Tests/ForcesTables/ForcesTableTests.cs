using System.Globalization;
using System.Text;
using CsCheck;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.ForcesTables;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.Tests.ForcesTables;

public sealed class ForcesTableTests
{
    private const string Header = "member,situation,kind,station[m],N[kN],Vy[kN],Vz[kN],T[kNm],My[kNm],Mz[kNm]";

    [Fact]
    public void A_plain_table_is_read_in_si()
    {
        var table = Sound($"{Header}\nHR-01,SLS-1,service,0.5,12.5,-1,2,0.1,0.2,-0.3\n");

        var row = Assert.Single(table.Rows);
        Assert.Equal(new ForcesRow(2, "HR-01", "SLS-1", SituationKind.Service, 0.5, false, new SectionForces(12_500, -1000, 2000, 100, 200, -300)), row);
        Assert.Equal("hangers.csv", table.FileName);
        Assert.Null(table.Convention);
        Assert.Equal(TorsionReference.NotStated, table.Torsion);
        Assert.True(table.ActsInFull);
    }

    [Fact]
    public void Columns_stand_in_any_order_with_any_unit_and_kind_may_be_left_out()
    {
        var table = Sound("Mz[lbf*ft], N [kip] ,member,My[N·mm],T[kN·m],Vz[N],Vy[MN],station[%],situation\n1,1,GR-7,1000,1,7,1e-6,25,ULS 1\n");

        var row = Assert.Single(table.Rows);
        Assert.Equal(SituationKind.Unknown, row.Kind);
        Assert.True(row.StationIsShare);
        Assert.Equal(0.25, row.Station, 1e-15);
        // 1 kip = 4448.2216152605 N, 1 lbf·ft = 1.3558179483 N·m (NIST SP 811, from memory).
        Assert.Equal(4448.2216152605, row.Forces.N, 1e-9);
        Assert.Equal(1.3558179483, row.Forces.Mz, 1e-9);
        Assert.Equal(new SectionForces(row.Forces.N, 1, 7, 1000, 1, row.Forces.Mz), row.Forces);
    }

    [Fact]
    public void Quotes_line_ends_byte_order_mark_and_remarks_follow_RFC_4180()
    {
        var text = $"\uFEFF# gangway rails, east side\r\n{Header}\r\n\r\n\"GR \"\"7\"\", east\",\"S,1\",design,\"0\",1,0,0,0,0,0\r\n# end\r\n  \r\n\"#8\",S2,,1,0,0,0,0,0,0";

        var table = Sound(text);

        Assert.Equal(["GR \"7\", east", "#8"], table.Rows.Select(row => row.Member));
        Assert.Equal(["S,1", "S2"], table.Rows.Select(row => row.Situation));
        Assert.Equal([4, 7], table.Rows.Select(row => row.Line));
        Assert.Equal([SituationKind.Design, SituationKind.Unknown], table.Rows.Select(row => row.Kind));
    }

    [Theory]
    [InlineData(';')]
    [InlineData('\t')]
    public void Columns_may_be_parted_by_semicolons_or_tabs(char separator)
    {
        var text = Rows("\"A,1\",S 1,design,0.5,-1.25e1,0,0,0,0,0").Replace("\"A,1\"", "\"A§1\"", StringComparison.Ordinal).Replace(',', separator).Replace('§', ',');

        var row = Assert.Single(Sound(text).Rows);
        var named = Assert.Single(Sound($"sep={separator}\r\n{text}").Rows);

        Assert.Equal(("A,1", "S 1", SituationKind.Design, 0.5, -12_500.0), (row.Member, row.Situation, row.Kind, row.Station, row.Forces.N));
        Assert.Equal(row with { Line = 3 }, named);
    }

    [Fact]
    public void Envelopes_and_linear_results_are_stated_in_directives()
    {
        var table = Sound($"# situations: envelopes\n# results: linear\n{Header}\nA,B,,0,0,0,0,0,0,0\n");

        Assert.Equal((true, true, true), (table.IsEnvelope, table.IsLinear, table.ActsInFull));
        Assert.Equal((false, false), (Sound(Rows("A,B,,0,0,0,0,0,0,0")).IsEnvelope, Sound(Rows("A,B,,0,0,0,0,0,0,0")).IsLinear));
    }

    [Fact]
    public void Directives_hold_wherever_they_stand_before_the_rows()
    {
        var table = Sound($"# convention: end-forces\n#torsion:centroid\n{Header}\n# Situations: load-cases\n# note: from the mast model\nA,B,,0,0,0,0,0,0,0\n");

        Assert.Equal(ForceConvention.EndForces, table.Convention);
        Assert.Equal(TorsionReference.Centroid, table.Torsion);
        Assert.False(table.ActsInFull);
    }

    [Fact]
    public void The_other_values_of_the_directives_are_read_too()
    {
        var table = Sound($"# convention: positive-face\n# torsion: shear-centre\n# torsion: shear-centre\n{Header}\nA,B,,0,0,0,0,0,0,0\n");

        Assert.Equal(ForceConvention.PositiveFace, table.Convention);
        Assert.Equal(TorsionReference.ShearCentre, table.Torsion);
    }

    [Fact]
    public void The_digest_is_that_of_the_bytes()
    {
        var text = $"{Header}\nA,B,,0,0,0,0,0,0,0\n";

        var table = Sound(text);

        // sha256sum of coreutils over the same bytes.
        Assert.Equal("be8640f4a95627d903227e4d4796fe2677758784a092c1ac6546b4fa5762b8bb", table.Sha256);
    }

    public static TheoryData<string, string, int, int, string> Wrong => new()
    {
        { "", "INP-0002", 1, 1, $"the table is empty; its first line names the columns: {Header}" },
        { "# only a remark\n", "INP-0002", 1, 1, $"the table is empty; its first line names the columns: {Header}" },
        { Header + "\n", "INP-0003", 1, 1, "the table has a header but no rows; add the section forces or leave the table out" },
        { "# x\nmember;situation,kind;station[m]\n", "INP-0004", 2, 7, "the columns of the header are parted by more than one of comma, semicolon and tab; save the table with one of them" },
        { "member\tsituation;kind\n", "INP-0004", 1, 17, "the columns of the header are parted by more than one of comma, semicolon and tab; save the table with one of them" },
        { Rows("A,B,,0,0,0,0,0,0,0").Replace(',', ';').Replace("B;;0;0", "B;;0;1,5", StringComparison.Ordinal), "INP-0013", 2, 8, "N is '1,5', with a comma; write the number with a decimal point and without grouping" },
        { Rows("A,B,,0,0,0,0,0,0,0").Replace(',', '\t').Replace("\t0\t0\t0\n", "\t0\t0\t1,000.5\n", StringComparison.Ordinal), "INP-0013", 2, 18, "Mz is '1,000.5', with a comma; write the number with a decimal point and without grouping" },
        { Rows("A;B;;0;0;0;0;0;0"), "INP-0009", 2, 1, "the row has 1 fields, the header 10" },
        { Rows("A,B,,0,0,0,0,0,0,0").Replace(',', ';').Replace("A;", "A;;", StringComparison.Ordinal), "INP-0009", 2, 19, "the row has 11 fields, the header 10" },
        { "# situations: envelope\n" + Rows("A,B,,0,0,0,0,0,0,0"), "INP-0019", 1, 1, "'envelope' is not a value of the directive 'situations'; did you mean 'envelopes'?" },
        { "# results: nonlinear\n" + Rows("A,B,,0,0,0,0,0,0,0"), "INP-0019", 1, 1, "'nonlinear' is not a value of the directive 'results'; did you mean 'linear'?" },
        { "# situations: envelopes\n# situations: load-cases\n" + Rows("A,B,,0,0,0,0,0,0,0"), "INP-0020", 2, 1, "the directive 'situations' says load-cases here and envelopes above; keep one of the two" },
        { Rows("A,B,,0,0x1F,0,0,0,0,0"), "INP-0011", 2, 8, "N is '0x1F', which is not a number; write digits with a decimal point, such as -12.5 or 3e-2" },
        { Rows("A,B,,0,1e,0,0,0,0,0"), "INP-0011", 2, 8, "N is '1e', which is not a number; write digits with a decimal point, such as -12.5 or 3e-2" },
        { Rows("A,B,,0,--1,0,0,0,0,0"), "INP-0011", 2, 8, "N is '--1', which is not a number; write digits with a decimal point, such as -12.5 or 3e-2" },
        { Rows("A,B,,0,1e400,0,0,0,0,0"), "INP-0012", 2, 8, "N is '1e400', which is not finite; give a finite number" },
        { "remark," + Header + "\n", "INP-0005", 1, 1, "'remark' is not a column; known are member, situation, kind, station, N, Vy, Vz, T, My, Mz" },
        { Header.Replace("situation", "situatoin", StringComparison.Ordinal) + "\n", "INP-0005", 1, 8, "'situatoin' is not a column; did you mean 'situation'?" },
        { Header + ",\n", "INP-0005", 1, Header.Length + 2, "column 11 has no name; name it or take it out" },
        { Header + ",N[kN]\n", "INP-0006", 1, Header.Length + 2, "the column 'N' stands twice; keep one of them" },
        { Header + ",station[%]\n", "INP-0006", 1, Header.Length + 2, "the column 'station' stands twice; keep one of them" },
        { Header.Replace(",Mz[kNm]", "", StringComparison.Ordinal) + "\n", "INP-0007", 1, 1, "the column 'Mz' is missing; add it as Mz[kNm]" },
        { Header.Replace("N[kN]", "N", StringComparison.Ordinal) + "\n", "INP-0008", 1, 34, "column 'N': the unit is missing; give one of N, kN, MN, lbf, kip in brackets, such as N[kN]" },
        { Header.Replace("N[kN]", "N[kn]", StringComparison.Ordinal) + "\n", "INP-0008", 1, 34, "column 'N': 'kn' is not a unit of force; did you mean 'kN'?" },
        { Header.Replace("My[kNm]", "My[kN]", StringComparison.Ordinal) + "\n", "INP-0008", 1, 61, "column 'My': 'kN' is a unit of force, not of moment; give one of N·m, kN·m, MN·m, N·mm, kN·mm, kN·cm, lbf·in, lbf·ft, kip·in, kip·ft" },
        { Header.Replace("member", "member[m]", StringComparison.Ordinal) + "\n", "INP-0008", 1, 1, "the column 'member' has no unit; write it without brackets" },
        { Header.Replace("N[kN]", "N[%]", StringComparison.Ordinal) + "\n", "INP-0008", 1, 34, "column 'N': '%' is a unit of ratio, not of force; give one of N, kN, MN, lbf, kip" },
        { Rows("A,B,,0,1,2,3,4,5"), "INP-0009", 2, 16, "the row has 9 fields, the header 10" },
        { Rows("A,B,,0,1,5,2,0,4,5,6"), "INP-0009", 2, 20, "the row has 11 fields, the header 10; perhaps a number has a decimal comma: write it with a point" },
        { Rows(",B,,0,0,0,0,0,0,0"), "INP-0010", 2, 1, "the field 'member' is empty; name the member" },
        { Rows("Ä,,,0,0,0,0,0,0,0"), "INP-0010", 2, 3, "the field 'situation' is empty; name the situation" },
        { Rows("A,B,,0,0,0,,0,0,0"), "INP-0010", 2, 12, "the field 'Vz' is empty; write the number, 0 where it is zero" },
        { Rows("A,B,,0,0,0,0,#DIV/0!,0,0"), "INP-0011", 2, 14, "T is '#DIV/0!', which is not a number; write digits with a decimal point, such as -12.5 or 3e-2" },
        { Rows("A,B,,0,0,0,0,0,NaN,0"), "INP-0012", 2, 16, "My is 'NaN', which is not finite; give a finite number" },
        { Rows("A,B,,0,1e306,0,0,0,0,0"), "INP-0012", 2, 8, "N is '1e306', which is not finite; give a finite number" },
        { Rows("A,B,,0,\"1,5\",0,0,0,0,0"), "INP-0013", 2, 9, "N is '1,5', with a comma; write the number with a decimal point and without grouping" },
        { Rows("A,B,,-0.1,0,0,0,0,0,0"), "INP-0014", 2, 6, "the station '-0.1' is negative; measure from the start of the member" },
        { Rows("A,B,,100.1,0,0,0,0,0,0").Replace("station[m]", "station[%]", StringComparison.Ordinal), "INP-0014", 2, 6, "the station '100.1' is more than 100 %; give it as a share of the member's length" },
        { Rows("A,B,Service,0,0,0,0,0,0,0"), "INP-0015", 2, 5, "'Service' is not a kind of situation; did you mean 'service'?" },
        { Rows("A,B,service,0,0,0,0,0,0,0\nA,B,design,1,0,0,0,0,0,0"), "INP-0016", 3, 5, "situation 'B' of member 'A' is design here and service on line 2; a situation has one kind" },
        { Rows("A,B,service,0,0,0,0,0,0,0\nA,B,,1,0,0,0,0,0,0"), "INP-0016", 3, 5, "situation 'B' of member 'A' is without a kind here and service on line 2; a situation has one kind" },
        { Rows("\"A,B,,0,0,0,0,0,0,0"), "INP-0017", 2, 1, "the quoted field that begins here is not closed; add its closing quote" },
        { Rows("\"A\"x,B,,0,0,0,0,0,0,0"), "INP-0017", 2, 4, "text follows the closing quote of a field; double the quotes inside a quoted field" },
        { Rows("A\"x,B,,0,0,0,0,0,0,0"), "INP-0017", 2, 2, "a quote stands inside an unquoted field; put the whole field in quotes and double those inside" },
        { Rows("A,B,,0,0,0,0,0,0,0\rC,B,,0,0,0,0,0,0,0"), "INP-0018", 2, 19, "a carriage return stands without a line feed; save the table with line ends CR LF or LF" },
        { "# convention: positive\n" + Rows("A,B,,0,0,0,0,0,0,0"), "INP-0019", 1, 1, "'positive' is not a value of the directive 'convention'; did you mean 'positive-face'?" },
        { "# torsion: shear-center\n" + Rows("A,B,,0,0,0,0,0,0,0"), "INP-0019", 1, 1, "'shear-center' is not a value of the directive 'torsion'; did you mean 'shear-centre'?" },
        { "# situation: load-cases\n" + Rows("A,B,,0,0,0,0,0,0,0"), "INP-0019", 1, 1, "'situation' is not a directive; did you mean 'situations'? A remark may not look like one" },
        { "# torsion: centroid\n# torsion: shear-centre\n" + Rows("A,B,,0,0,0,0,0,0,0"), "INP-0020", 2, 1, "the directive 'torsion' says shear-centre here and centroid above; keep one of the two" },
        { Rows("A,B,,0,0,0,0,0,0,0\n# torsion: centroid"), "INP-0021", 3, 1, "the directive 'torsion' stands after the first row; move it to the top, for it holds for the whole file" },
        { Rows("\"A\nB\",B,,0,0,0,0,0,0,0"), "INP-0024", 2, 2, "the member 'A?B' holds a line end, control or direction character; take it out" },
        { Rows("A,\"B\n\",,\"0\",x,0,0,0,0,0"), "INP-0024", 2, 4, "the situation 'B?' holds a line end, control or direction character; take it out" },
    };

    [Theory]
    [MemberData(nameof(Wrong))]
    public void What_is_wrong_is_told_with_code_line_column_and_remedy(string text, string code, int line, int column, string message)
    {
        var diagnostics = new DiagnosticList();

        var table = ForcesTable.Read(Encoding.UTF8.GetBytes(text), "hangers.csv", diagnostics);

        Assert.Null(table);
        var first = diagnostics.Items[0];
        Assert.Equal((code, message), (first.Code, first.Message));
        Assert.Equal(Severity.Error, first.Severity);
        Assert.Equal(("hangers.csv", (long)line, column), (first.Span!.Value.File, first.Span.Value.Line, first.Span.Value.Column));
    }

    [Fact]
    public void Text_that_is_not_utf_8_is_told_by_its_place()
    {
        byte[] latin = [.. "# Stege\n# Gel"u8, 0xE4, .. "nder\n"u8];
        var diagnostics = new DiagnosticList();

        var table = ForcesTable.Read(latin, "rails.csv", diagnostics);

        Assert.Null(table);
        var found = Assert.Single(diagnostics.Items);
        Assert.Equal("INP-0001", found.Code);
        Assert.Equal("rails.csv, line 2, column 6, byte 13", found.Span.ToString());
    }

    [Fact]
    public void Reading_goes_on_after_an_error_and_reports_each_row()
    {
        var diagnostics = new DiagnosticList();

        var table = ForcesTable.Read(Encoding.UTF8.GetBytes(Rows("A,B,,x,y,0,0,0,0,0\nC\n\"D,B,,0,0,0,0,0,0,0\nE,B,,0,0,0,0,0,0,z")), "t.csv", diagnostics);

        Assert.Null(table);
        Assert.Equal(["INP-0011", "INP-0011", "INP-0009", "INP-0017", "INP-0011"], diagnostics.Items.Select(d => d.Code));
        Assert.Equal([2L, 2, 3, 4, 5], diagnostics.Items.Select(d => d.Span!.Value.Line));
    }

    [Fact]
    public void Reading_stops_after_50_errors_and_says_so()
    {
        var diagnostics = new DiagnosticList();
        var rows = string.Join('\n', Enumerable.Range(1, 200).Select(i => $"M{i},B,,x{i},0,0,0,0,0,0"));

        var table = ForcesTable.Read(Encoding.UTF8.GetBytes(Rows(rows)), "t.csv", diagnostics);

        Assert.Null(table);
        Assert.Equal(TableLimits.MostErrors, diagnostics.Items.Count(d => d.Severity == Severity.Error));
        Assert.Equal(("INP-0023", Severity.Note), (diagnostics.Items[^1].Code, diagnostics.Items[^1].Severity));
        Assert.Contains("after 50 errors", diagnostics.Items[^1].Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_field_of_the_longest_length_is_read_and_a_longer_one_is_not()
    {
        var longest = new string('m', TableLimits.LongestField);

        Assert.Equal(longest, Sound(Rows($"{longest},B,,0,0,0,0,0,0,0")).Rows[0].Member);
        AssertLimit(Rows($"{longest}m,B,,0,0,0,0,0,0,0"), TableLimits.Default);
        AssertLimit(Rows($"\"{longest}m\",B,,0,0,0,0,0,0,0"), TableLimits.Default);
        AssertLimit(Rows($"\"{longest}{longest}"), TableLimits.Default);
    }

    [Fact]
    public void A_row_or_remark_longer_than_the_limit_is_refused()
    {
        AssertLimit(Rows("A" + new string(',', TableLimits.LongestRow)), TableLimits.Default);
        AssertLimit("#" + new string('-', TableLimits.LongestRow) + "\n" + Rows("A,B,,0,0,0,0,0,0,0"), TableLimits.Default);
    }

    [Fact]
    public void More_rows_than_the_limit_are_refused()
    {
        var text = Rows("A,B,,0,0,0,0,0,0,0\nA,B,,1,0,0,0,0,0,0");

        Assert.Equal(2, Read(text, TableLimits.Default with { Rows = 2 }).Table!.Rows.Length);
        AssertLimit(text, TableLimits.Default with { Rows = 1 });
        Assert.Equal(50_000_000, TableLimits.Default.Rows);
    }

    [Fact]
    public void More_names_than_the_limit_are_refused()
    {
        var text = Rows("A,B,,0,0,0,0,0,0,0\nC,B,,1,0,0,0,0,0,0");

        Assert.Equal(2, Read(text, TableLimits.Default with { Names = 3 }).Table!.Rows.Length);
        AssertLimit(text, TableLimits.Default with { Names = 2 });
        Assert.Equal(5_000_000, TableLimits.Default.Names);
    }

    /// <summary>Three windows long, in pieces of few bytes: what a window loses or doubles at its edges would show.</summary>
    [Fact]
    public void A_table_of_any_length_is_read_through_its_window()
    {
        var lines = Enumerable.Range(0, 50_000).Select(i => string.Create(CultureInfo.InvariantCulture, $"M{i / 10},\"S {i % 3}\",,{i % 10},{i},{-i},{i / 7.0:R},0,1e-{i % 9},0")).ToArray();
        var bytes = Encoding.UTF8.GetBytes(Rows(string.Join('\n', lines)));
        Assert.True(bytes.Length > 2 * Inputs.ForcesTables.Rows.RowWindow.Size);
        var (rows, diagnostics) = (new List<ForcesRow>(), new DiagnosticList());

        var table = ForcesTable.Stream(new Dripping(bytes), "t.csv", diagnostics, (in ForcesRow row) => rows.Add(row));

        Assert.Empty(diagnostics.Items);
        Assert.Empty(table!.Rows);
        Assert.Equal(Convert.ToHexStringLower(System.Security.Cryptography.SHA256.HashData(bytes)), table.Sha256);
        Assert.Equal(lines.Length, rows.Count);
        Assert.All(rows.Select((row, i) => (row, i)), r =>
        {
            Assert.Equal((r.i + 2, $"M{r.i / 10}", $"S {r.i % 3}", r.i % 10), (r.row.Line, r.row.Member, r.row.Situation, (int)r.row.Station));
            Assert.Equal((r.i * 1e3, -r.i * 1e3, r.i / 7.0 * 1e3), (r.row.Forces.N, r.row.Forces.Vy, r.row.Forces.Vz));
        });
    }

    [Fact]
    public void Errors_far_down_have_their_place_too()
    {
        var rows = string.Join('\n', Enumerable.Repeat("A,B,,0,0,0,0,0,0,0", 100_000)) + "\nA,B,,0,x,0,0,0,0,0";

        var (table, diagnostics) = Read(Rows(rows), TableLimits.Default);

        Assert.Null(table);
        Assert.Equal((100_002L, 8, (long)(Header.Length + 1 + 100_000 * 19 + 7)), (diagnostics.Items[0].Span!.Value.Line, diagnostics.Items[0].Span!.Value.Column, diagnostics.Items[0].Span!.Value.Offset));
    }

    [Fact]
    public void Names_that_repeat_are_kept_once()
    {
        var table = Sound(Rows("A,B,,0,0,0,0,0,0,0\nA,B,,1,0,0,0,0,0,0"));

        Assert.Same(table.Rows[0].Member, table.Rows[1].Member);
        Assert.Same(table.Rows[0].Situation, table.Rows[1].Situation);
    }

    [Fact]
    public void The_culture_of_the_machine_changes_nothing()
    {
        var culture = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("fr-FR");

            Assert.Equal(1500, Sound(Rows("A,B,,0,1.5,0,0,0,0,0")).Rows[0].Forces.N);
        }
        finally
        {
            CultureInfo.CurrentCulture = culture;
        }
    }

    [Fact]
    public void Any_bytes_at_all_give_a_table_or_an_error()
    {
        var piece = Gen.OneOf(Header, "\n", "\r\n", "\r", ",", "\"", "#", "A", "0", "1e3", "service", "# convention: end-forces\n", ";", "\uFEFF", "é", "\0");
        Gen.Select(Gen.Bool, piece.Array[0, 60]).Sample((headed, pieces) =>
        {
            var text = (headed ? Header + "\n" : "") + string.Concat(pieces);
            var diagnostics = new DiagnosticList();

            var table = ForcesTable.Read(Encoding.UTF8.GetBytes(text), "t.csv", diagnostics);

            Assert.Equal(table is null, diagnostics.HasErrors);
            Assert.All(diagnostics.Items, found => Assert.True(found.Span is { Line: > 0, Column: > 0 }));
        }, iter: 20_000, seed: "0000000000001");
    }

    [Fact]
    public void Rows_written_as_csv_are_read_back()
    {
        var name = Gen.String[Gen.Char["AZ09 ,\"#-é"], 1, 8].Where(text => text.Trim().Length > 0);
        var number = Gen.Double[-1e6, 1e6];
        Gen.Select(name, number, number, number).Array[1, 20].Sample(written =>
        {
            var rows = written.Select(w => string.Create(CultureInfo.InvariantCulture,
                $"{Quoted(w.Item1)},S,,{Math.Abs(w.Item2):R},{w.Item3:R},{w.Item4:R},0,0,0,0"));

            var table = Sound(Rows(string.Join("\r\n", rows)));

            Assert.Equal(written.Select(w => (w.Item1, Math.Abs(w.Item2), w.Item3 * 1e3, w.Item4 * 1e3)),
                table.Rows.Select(row => (row.Member, row.Station, row.Forces.N, row.Forces.Vy)));
        }, iter: 500, seed: "0000000000001");
    }

    private static string Quoted(string text) => $"\"{text.Replace("\"", "\"\"", StringComparison.Ordinal)}\"";

    private static string Rows(string rows) => $"{Header}\n{rows}\n";

    private static ForcesTable Sound(string text)
    {
        var (table, diagnostics) = Read(text, TableLimits.Default);
        Assert.True(table is not null, string.Join("; ", diagnostics.Items));
        Assert.Empty(diagnostics.Items);
        return table;
    }

    private static void AssertLimit(string text, TableLimits limits)
    {
        var (table, diagnostics) = Read(text, limits);
        Assert.Null(table);
        Assert.Equal("INP-0022", diagnostics.Items[0].Code);
    }

    private static (ForcesTable? Table, DiagnosticList Diagnostics) Read(string text, TableLimits limits)
    {
        var diagnostics = new DiagnosticList();
        return (ForcesTable.Read(Encoding.UTF8.GetBytes(text), "hangers.csv", diagnostics, limits), diagnostics);
    }

    private sealed class Dripping(byte[] bytes) : MemoryStream(bytes)
    {
        private int _count;

        public override int Read(byte[] buffer, int offset, int count) => base.Read(buffer, offset, Math.Min(count, 1 + (_count++ * 7919 % 5000)));
    }
}
