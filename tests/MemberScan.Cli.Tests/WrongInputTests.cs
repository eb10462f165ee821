using System.IO.Compression;
using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.ForcesTables;
using MemberScan.Inputs.SettingsFiles;

namespace MemberScan.Cli.Tests;

/// <summary>Whatever is wrong with an input, the message says where it stands and what to do.</summary>
public sealed class WrongInputTests
{
    private const string Header = "member,situation,kind,station[m],N[kN],Vy[kN],Vz[kN],T[kNm],My[kNm],Mz[kNm]\n";

    public static TheoryData<string, int, string> Settings => new()
    {
        { "{", 1, "" },
        { "{\n  \"basis\": {\n    \"servise\": null\n  }\n}", 3, "did you mean 'service'?" },
        { "{\"display\": \"metric\"}", 1, "known are si" },
        { "{\n\"forces\": {\"convention\": \"both-faces\"}}", 2, "known are positive-face, end-forces" },
        { "{\"basis\": {\"service\": {\"omega\": 0.5}}}", 1, "give a number from 1 to 100" },
        { "{\"stability\": {\"lengthFactor\": \"2\"}}", 1, "give a number without quotes" },
        { "{\"units\": {\"TORQUEUNIT\": \"kN\"}}", 1, "give one of" },
        { "{\"display\": \"si\",\n\n\"display\": \"si\"}", 3, "keep one of them" },
        { "{\"forces\": {\"kinds\": [{\"pattern\": \"ULS*\"}]}}", 1, "add it" },
        { "[]", 1, "give an object in braces" },
    };

    public static TheoryData<string, int, string> Tables => new()
    {
        { "", 1, "its first line names the columns" },
        { Header, 1, "add the section forces" },
        { Header + "P-1,S,service,0,1,0,0,0,0\n", 2, "" },
        { Header + "P-1,S,service,0,1,0,0,0,0,0\nP-1,S,service,1,x,0,0,0,0,0\n", 3, "" },
        { Header + "P-1,S,service,0,NaN,0,0,0,0,0\n", 2, "" },
        { Header + "P-1,S,service,0,1e999,0,0,0,0,0\n", 2, "" },
        { Header + "P-1,S,service,-1,1,0,0,0,0,0\n", 2, "measure from the start of the member" },
        { Header + "P-1,S,servce,0,1,0,0,0,0,0\n", 2, "did you mean 'service'?" },
        { Header + ",S,service,0,1,0,0,0,0,0\n", 2, "name the member" },
        { Header + "P-1,S,service,0,1,0,0,0,0,0\nP-1,S,design,1,1,0,0,0,0,0\n", 3, "a situation has one kind" },
        { Header.Replace(',', ';') + "P-1;S;service;0;1,5;0;0;0;0;0\n", 2, "point" },
        { Header.Replace("N[kN]", "N", StringComparison.Ordinal) + "P-1,S,service,0,1,0,0,0,0,0\n", 1, "" },
        { Header.Replace("[kNm]", "[kN]", StringComparison.Ordinal), 1, "" },
        { Header.Replace("Vy", "Vx", StringComparison.Ordinal), 1, "" },
        { Header.Replace(",Mz[kNm]", "", StringComparison.Ordinal), 1, "add it as" },
        { "# convention: end-force\n" + Header, 1, "did you mean 'end-forces'?" },
        { Header + "\"P-1,S,service,0,1,0,0,0,0,0\n", 2, "add its closing quote" },
    };

    [Theory]
    [MemberData(nameof(Settings))]
    public void A_wrong_settings_file_is_refused_with_line_and_remedy(string text, int line, string remedy)
    {
        var diagnostics = new DiagnosticList();

        var settings = SettingsFile.Read(Encoding.UTF8.GetBytes(text), "landing.json", diagnostics);

        Assert.Null(settings);
        AssertPlaced(diagnostics, "landing.json", line, remedy);
    }

    [Theory]
    [MemberData(nameof(Tables))]
    public void A_wrong_forces_table_is_refused_with_line_and_remedy(string text, int line, string remedy)
    {
        var diagnostics = new DiagnosticList();

        var table = ForcesTable.Read(Encoding.UTF8.GetBytes(text), "landing.csv", diagnostics);

        Assert.Null(table);
        AssertPlaced(diagnostics, "landing.csv", line, remedy);
    }

    [Theory]
    [InlineData("settings", "{\"display\": \"metric\"}", "error: INP-0105 display is 'metric'; known are si, us [input, line 1, column 13, byte 12]", "The settings file is wrong")]
    [InlineData("table", "", "error: INP-", "A forces table is wrong; nothing was written.")]
    [InlineData("table", Header + "P-1,S,service,0,1,0,0,0,0,x\n", "line 2", "A forces table is wrong; nothing was written.")]
    [InlineData("table", Header + "P-9,S,service,0,1,0,0,0,0,0\n", "error: SCR-0001 'P-9' is the key or tag of no candidate; correct it, or set forces.unknownMembers to \"list\".", "The forces table does not fit the model; nothing was written.")]
    [InlineData("table", Header + "P-1,S,service,7,1,0,0,0,0,0\n", "error: SCR-0003 The station at 7 m is beyond the end of 'P-1', which is 1 m long.", "The forces table does not fit the model; nothing was written.")]
    public async Task The_program_prints_place_and_remedy_and_writes_nothing(string kind, string text, string message, string last)
    {
        using var folder = new TemporaryFolder();
        var input = folder.Write("input", text);
        string[] option = kind == "settings" ? ["--settings", input] : ["--forces", input];

        var ran = await Memberscan.Run(["screen", folder.Write("posts.ifc", Posts.Under(Posts.Fine).Model), .. option]);

        Assert.True(ran.ExitCode == 64, ran.All);
        Assert.Contains(message, ran.Error, StringComparison.Ordinal);
        Assert.Contains(last, ran.Error, StringComparison.Ordinal);
        Assert.Equal(["input", "posts.ifc"], folder.Names);
        Assert.Empty(ran.Output);
    }

    [Theory]
    [InlineData("absent", "does not exist; check the path")]
    [InlineData("broken zip", "")]
    [InlineData("zip without a model", "")]
    [InlineData("broken gzip", "")]
    [InlineData("UTF-16", "save it as UTF-8 or ASCII")]
    public async Task A_file_that_cannot_be_read_ends_with_74_and_names_itself(string kind, string words)
    {
        using var folder = new TemporaryFolder();
        var model = kind switch
        {
            "absent" => folder["posts.ifc"],
            "broken zip" => folder.Write("posts.ifczip", "PK\u0003\u0004 and no more"),
            "zip without a model" => folder.Write("posts.ifczip", Zip("notes.txt")),
            "UTF-16" => folder.Write("posts.ifc", [0xff, 0xfe, .. Encoding.Unicode.GetBytes("ISO-10303-21;")]),
            _ => folder.Write("posts.ifc.gz", [0x1f, 0x8b, 8, 0, 0, 0, 0, 0, 0, 3, 255, 255, 255]),
        };
        var before = folder.Names.ToArray();

        var ran = await Memberscan.Run("screen", model);

        Assert.True(ran.ExitCode == 74, ran.All);
        Assert.Contains(Path.GetFileName(model), ran.Error, StringComparison.Ordinal);
        Assert.Contains(words, ran.Error, StringComparison.Ordinal);
        Assert.Equal(before, folder.Names);
    }

    /// <summary>Texts that are no models are read as far as they go: the report says what is wrong.</summary>
    [Theory]
    [InlineData("empty", "P21-0001")]
    [InlineData("other", "P21-0001")]
    [InlineData("no schema", "IFC-")]
    [InlineData("unknown schema", "IFC-")]
    public async Task A_text_that_is_no_model_ends_with_3(string kind, string finding)
    {
        using var folder = new TemporaryFolder();
        var model = Encoding.ASCII.GetString(Posts.Under(Posts.Fine).Model);
        byte[] content = kind switch
        {
            "empty" => [],
            "other" => "%PDF-1.7"u8.ToArray(),
            "no schema" => Encoding.ASCII.GetBytes(model.Replace("FILE_SCHEMA(('IFC4'));\n", "", StringComparison.Ordinal)),
            _ => Encoding.ASCII.GetBytes(model.Replace("'IFC4'", "'AP214'", StringComparison.Ordinal)),
        };

        var ran = await Memberscan.Run("screen", folder.Write("posts.ifc", content));

        Assert.True(ran.ExitCode == 3, ran.All);
        Assert.Contains(finding, ran.Error, StringComparison.Ordinal);
        Assert.Equal(["posts.ifc", "posts.members.csv", "posts.report.html", "posts.run.json"], folder.Names);
    }

    private static byte[] Zip(string entry)
    {
        using var packed = new MemoryStream();
        using (var zip = new ZipArchive(packed, ZipArchiveMode.Create, leaveOpen: true)) zip.CreateEntry(entry);
        return packed.ToArray();
    }

    private static void AssertPlaced(DiagnosticList diagnostics, string file, int line, string remedy)
    {
        var errors = diagnostics.Items.Where(d => d.Severity == Severity.Error).ToArray();
        Assert.NotEmpty(errors);
        Assert.Contains(errors, e => e.Message.Contains(remedy, StringComparison.Ordinal));
        Assert.All(errors, e =>
        {
            Assert.Equal(file, e.Span!.Value.File);
            Assert.True(e.Span.Value.Line == line && e.Span.Value.Column >= 1, $"{e.Span} {e.Message}");
            Assert.Matches(@"^INP-\d{4}$", e.Code);
        });
    }
}
