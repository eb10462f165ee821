using System.Buffers;
using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;
using MemberScan.Ifc.WriteBack;
using MemberScan.Ifc.WriteBack.Earlier;

namespace MemberScan.Ifc.Tests.WriteBack.Earlier;

public sealed partial class EarlierResultsTests
{
    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Intact_results_give_back_the_original_bytes(Release release)
    {
        var (original, written) = Results(release);

        var found = EarlierResults.Find(written, "a.ifc");

        Assert.Equal(EarlierKind.Intact, found.Kind);
        Assert.Equal(original, found.Base.ToArray());
        Assert.Equal(Text(written).Split('\n').Length - Text(original).Split('\n').Length - 2, found.Instances);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Lines_that_another_program_wrote_behind_ours_stay(Release release)
    {
        var (original, written) = Results(release);
        const string Line = "#900001=IFCPERSON($,'Steg ''/* MemberScan block end */''',$,$,$,$,$,$);\n";

        var found = EarlierResults.Find(BeforeEnd(written, Line), "a.ifc");

        Assert.Equal(EarlierKind.LinesBehind, found.Kind);
        Assert.Equal(BeforeEnd(original, Line), found.Base.ToArray());
    }

    [Fact]
    public void Lines_of_others_inside_the_block_stay()
    {
        var (original, written) = Results(Release.Ifc4);
        const string Line = "#900001=IFCWALL('2O2Fr$t4X7Zf8NOew3FL99',$,$,$,$,$,$,$,$);\n";
        var text = Text(written).Replace("/* MemberScan block end */", Line + "/* MemberScan block end */", StringComparison.Ordinal);

        var found = EarlierResults.Find(Bytes(text), "a.ifc");

        Assert.Equal(EarlierKind.LinesBehind, found.Kind);
        Assert.Equal(BeforeEnd(original, Line), found.Base.ToArray());
    }

    [Fact]
    public void A_model_that_changed_keeps_its_changes()
    {
        var (original, written) = Results(Release.Ifc4);
        static byte[] Change(byte[] bytes) => Bytes(Text(bytes).Replace("DATA;", "DATA; /* changed */", StringComparison.Ordinal));

        var found = EarlierResults.Find(Change(written), "a.ifc");

        Assert.NotEqual(original, Change(original));
        Assert.Equal(EarlierKind.Changed, found.Kind);
        Assert.Equal(Change(original), found.Base.ToArray());
    }

    [Fact]
    public void Where_others_refer_to_ours_nothing_is_taken_out_and_they_are_named()
    {
        var (_, written) = Results(Release.Ifc4);
        var set = Regex.Match(Text(written), @"#(\d+)=IFCPROPERTYSET\('[^']*',[^,]*,'MemberScan_StressCheck'").Groups[1].Value;
        var text = BeforeEnd(written, $"#900001=IFCRELDEFINESBYPROPERTIES('2O2Fr$t4X7Zf8NOew3FL98',$,$,'not #{set} but',(#7),#{set});\n");

        var found = EarlierResults.Find(text, "a.ifc");

        Assert.Equal(new OutsideReference(ulong.Parse(set, CultureInfo.InvariantCulture), 900001, "IFCRELDEFINESBYPROPERTIES"), Assert.Single(found.References));
        Assert.Equal(text, found.Base.ToArray());
        Assert.Equal($"#900001 IFCRELDEFINESBYPROPERTIES refers to #{set}", EarlierWords.Of(found.References));
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Sets_in_a_file_that_was_written_anew_under_other_numbers_are_recognised(Release release)
    {
        var (original, written) = Results(release);

        var found = EarlierResults.Find(Renumbered(written), "a.ifc");

        Assert.Equal(EarlierKind.Rewritten, found.Kind);
        Assert.Equal(Text(Renumbered(original)), Text(found.Base.ToArray()));
    }

    [Fact]
    public void New_GlobalIds_of_the_program_that_wrote_the_file_anew_do_no_harm()
    {
        var (original, written) = Results(Release.Ifc2X3);
        static byte[] Other(byte[] bytes) => Bytes(Regex.Replace(Text(Renumbered(bytes)), @"=(IFCPROPERTYSET|IFCRELDEFINESBYPROPERTIES)\('.", "=$1('3"));

        var found = EarlierResults.Find(Other(written), "a.ifc");

        Assert.Equal(EarlierKind.Rewritten, found.Kind);
        Assert.Equal(Text(Other(original)), Text(found.Base.ToArray()));
    }

    [Fact]
    public void A_set_of_our_name_without_Program_and_RunId_is_not_ours()
    {
        var (original, _) = Results(Release.Ifc4);
        var text = BeforeEnd(original, "#800=IFCPROPERTYSINGLEVALUE('Status',$,IFCLABEL('x'),$);\n#801=IFCPROPERTYSET('2O2Fr$t4X7Zf8NOew3FL97',$,'MemberScan_StressCheck',$,(#800));\n");

        var found = EarlierResults.Find(text, "a.ifc");

        Assert.Equal(EarlierKind.None, found.Kind);
        Assert.Equal(text, found.Base.ToArray());
    }

    [Fact]
    public void An_ownership_that_others_took_over_stays()
    {
        var (_, written) = Results(Release.Ifc2X3);
        var text = Renumbered(written);
        var owner = Regex.Match(Text(text), @"#(\d+)=IFCOWNERHISTORY\([^;]*\.ADDED\.,\$,\$,\$,1768464000\)").Groups[1].Value;
        text = BeforeEnd(text, $"#900001=IFCPROJECTLIBRARY('2O2Fr$t4X7Zf8NOew3FL96',#{owner},$,$,$,$,$,$,$);\n");

        var found = EarlierResults.Find(text, "a.ifc");

        Assert.Equal(EarlierKind.Rewritten, found.Kind);
        Assert.Contains($"#{owner}=IFCOWNERHISTORY", Text(found.Base.ToArray()), StringComparison.Ordinal);
        Assert.DoesNotContain("MemberScan_StressCheck", Text(found.Base.ToArray()), StringComparison.Ordinal);
    }

    private static (byte[] Original, byte[] Written) Results(Release release)
    {
        var writer = Bars.Model(release, FileUnits.MillimetreNewton, ["PRESSUREUNIT"]);
        Bars.Add(writer, "R", Bars.Rail, 2);
        Bars.Add(writer, "S", Bars.Rail, 3);
        var model = Reading.Of(writer, new MemberScan.Model.Rules.ReadingRules()).Model;
        var elements = model.ReadMembers(_ => true).Members;
        var sets = elements.Select(m => new StressCheckSet
        {
            ElementId = m.Element.StepId,
            ElementKey = m.Key,
            Status = "WITHIN LIMIT",
            Utilization = 0.5,
            EquivalentStress = 1e8,
            RunId = "0123456789abcdef",
            Program = "MemberScan 0.1.0",
        });
        var lines = PropertySetWriter.Lines(model, sets, 1768464000, "0.1.0", withTemplate: true);
        var output = new ArrayBufferWriter<byte>();
        ResultBlock.Write(output, model.File.Bytes.Span, model.File.InsertionOffset, lines, model.File.LineEnd);
        return (model.File.Bytes.ToArray(), output.WrittenSpan.ToArray());
    }

    // What a program does that reads a model and writes it anew: other numbers, no comments.
    private static byte[] Renumbered(byte[] bytes) =>
        Bytes(Number().Replace(Regex.Replace(Text(bytes), @"/\* MemberScan block[^\n]*\n", ""), m => string.Create(CultureInfo.InvariantCulture, $"#{2 * int.Parse(m.Groups[1].Value, CultureInfo.InvariantCulture) + 5000}")));

    private static byte[] BeforeEnd(byte[] bytes, string line)
    {
        var text = Text(bytes);
        return Bytes(text.Insert(text.LastIndexOf("ENDSEC", StringComparison.Ordinal), line));
    }

    private static string Text(byte[] bytes) => Encoding.Latin1.GetString(bytes);

    private static byte[] Bytes(string text) => Encoding.Latin1.GetBytes(text);

    [GeneratedRegex(@"#(\d+)")]
    private static partial Regex Number();
}
