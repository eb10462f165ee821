using System.Text;
using System.Text.Json;
using MemberScan.Cli.Members;

namespace MemberScan.Cli.Tests.Members;

/// <summary>The members command over small models of the landing, written here as Part 21 text; positions of parameters: the EXPRESS schema of IFC4.</summary>
public sealed class MembersRunTests : IDisposable
{
    private const string Rail = """
        #10=IFCMATERIAL('S235JR',$,'steel');
        #11=IFCCIRCLEHOLLOWPROFILEDEF(.AREA.,'48.3x3.2',$,24.15,3.2);
        #12=IFCEXTRUDEDAREASOLID(#11,$,#5,2500.);
        #13=IFCSHAPEREPRESENTATION(#4,'Body','SweptSolid',(#12));
        #14=IFCPRODUCTDEFINITIONSHAPE($,$,(#13));
        #15=IFCMEMBER('2O2Fr$t4X7Zf8NOew3FLOH',$,'=Rail 1',$,$,$,#14,'GR-01',$);
        #16=IFCRELASSOCIATESMATERIAL('2O2Fr$t4X7Zf8NOew3FLOI',$,$,$,(#15),#10);
        """;

    private const string Bare = """
        #20=IFCMEMBER('2O2Fr$t4X7Zf8NOew3FLOJ',$,'Post 2',$,$,$,$,'GR-02',$);
        #21=IFCPLATE('2O2Fr$t4X7Zf8NOew3FLOK',$,'Plate',$,$,$,$,$,$);
        """;

    private const string ForcesHeader = "member,situation,kind,station[m],N[kN],Vy[kN],Vz[kN],T[kNm],My[kNm],Mz[kNm]\n";

    private readonly DirectoryInfo _folder = Directory.CreateTempSubdirectory("members");

    public void Dispose() => _folder.Delete(recursive: true);

    [Fact]
    public void A_model_with_nothing_missing_ends_with_code_0()
    {
        var model = Model(Rail);
        var forces = File("forces.csv", ForcesHeader + "GR-01,W1,service,0,1,0,0,0,0,0\nGR-01,W1,service,2.5,1,0,0,0,0,0\n");

        var (code, lines) = Run(new(model, [forces], null, null, null, false));

        Assert.Equal(0, code);
        var line = Assert.Single(lines, l => l.StartsWith("ready | ", StringComparison.Ordinal));
        Assert.Contains("tube 48.3x3.2 mm (profile IFCCIRCLEHOLLOWPROFILEDEF #11 '48.3x3.2' of IFCEXTRUDEDAREASOLID #12)", line, StringComparison.Ordinal);
        Assert.Contains("fy 235 MPa", line, StringComparison.Ordinal);
        Assert.Contains("2.5 m | 1 situation, 2 stations", line, StringComparison.Ordinal);
        Assert.Equal("landing.ifc: 1 ready + 0 with something missing = 1 candidates", lines[^1]);
    }

    [Fact]
    public void What_is_missing_is_listed_per_member_and_counted_with_a_request_per_reason()
    {
        var (code, lines) = Run(new(Model(Rail + Bare), [], null, null, null, false));

        Assert.Equal(2, code);
        Assert.Contains(lines, l => l.Contains("'Post 2'", StringComparison.Ordinal) && l.EndsWith("no-section, no-strength, length-ambiguous, no-forces", StringComparison.Ordinal));
        Assert.Contains("1 member has no grade and no strength. Name a known grade or give the yield strength in the material's properties.", lines);
        Assert.Contains(lines, l => l.StartsWith("2 members have no section forces.", StringComparison.Ordinal));
        Assert.Contains("IfcMember: 2 candidates, 1 with a section, 1 with a strength, 0 with forces", lines);
    }

    [Fact]
    public void A_model_without_candidates_ends_with_code_2_and_a_cut_one_with_code_3()
    {
        var cut = File("cut.ifc", System.IO.File.ReadAllText(Model(Rail))[..^60]);

        Assert.Equal(2, Run(new(Model("#9=IFCPLATE('2O2Fr$t4X7Zf8NOew3FLOK',$,'Plate',$,$,$,$,$,$);"), [], null, null, null, false)).Code);
        Assert.Equal(3, Run(new(cut, [], null, null, null, false)).Code);
    }

    [Fact]
    public void Tables_that_do_not_fit_wrong_settings_and_missing_files_end_with_their_codes()
    {
        var model = Model(Rail);
        var forces = File("forces.csv", ForcesHeader + "GR-77,W1,service,0,1,0,0,0,0,0\n");
        var settings = File("settings.json", """{ "basiss": {} }""");

        Assert.Equal(64, Assert.Throws<Failure>(() => Run(new(model, [forces], null, null, null, false))).ExitCode);
        Assert.Equal(64, Assert.Throws<Failure>(() => Run(new(model, [], settings, null, null, false))).ExitCode);
        Assert.Equal(64, Assert.Throws<Failure>(() => Run(new(model, [], null, model, null, false))).ExitCode);
        Assert.Equal(74, Assert.Throws<Failure>(() => Run(new(Path.Combine(_folder.FullName, "none.ifc"), [], null, null, null, false))).ExitCode);
        Assert.Equal(74, Assert.Throws<Failure>(() => Run(new(model, [], null, Path.Combine(_folder.FullName, "no", "folder.csv"), null, false))).ExitCode);
    }

    [Fact]
    public void The_csv_file_has_a_line_per_candidate_and_guards_texts_that_look_like_formulas()
    {
        var csv = Path.Combine(_folder.FullName, "members.csv");

        Run(new(Model(Rail + Bare), [], null, csv, null, false));

        var lines = System.IO.File.ReadAllText(csv).Split("\r\n");
        Assert.Equal(ReadinessTable.Header, lines[0]);
        Assert.Equal(4, lines.Length);
        Assert.StartsWith("2O2Fr$t4X7Zf8NOew3FLOH,2O2Fr$t4X7Zf8NOew3FLOH,,GR-01,'=Rail 1,IfcMember,", lines[1], StringComparison.Ordinal);
        Assert.Contains(",rail,", lines[1], StringComparison.Ordinal);
        Assert.Contains(",tube 48.3x3.2 mm,", lines[1], StringComparison.Ordinal);
        Assert.Contains(",235,", lines[1], StringComparison.Ordinal);
        Assert.Contains(",no,no-section; no-strength; length-ambiguous; no-forces,", lines[2], StringComparison.Ordinal);
        Assert.All(lines[..3], l => Assert.True(l.Count(c => c == ',') >= ReadinessTable.Header.Count(c => c == ',')));
    }

    [Fact]
    public void The_json_file_holds_totals_and_members_in_SI()
    {
        var json = Path.Combine(_folder.FullName, "members.json");

        Run(new(Model(Rail + Bare), [], null, null, json, false));

        using var document = JsonDocument.Parse(System.IO.File.ReadAllBytes(json));
        var root = document.RootElement;
        Assert.Equal((2, 0), (root.GetProperty("candidates").GetInt32(), root.GetProperty("ready").GetInt32()));
        var rail = root.GetProperty("members")[0];
        Assert.Equal(235e6, rail.GetProperty("strengthPa").GetDouble());
        Assert.Equal(2.5, rail.GetProperty("lengthM").GetDouble());
        Assert.Equal("no-forces", Assert.Single(rail.GetProperty("missing").EnumerateArray()).GetProperty("code").GetString());
        Assert.Contains(root.GetProperty("totals").EnumerateArray(), t => t.GetProperty("code").GetString() == "no-forces" && t.GetProperty("count").GetInt32() == 2);
    }

    private const string Forces = """
        #30=IFCPROPERTYSINGLEVALUE('Axial',$,IFCREAL(-8.),$);
        #31=IFCPROPERTYSET('2O2Fr$t4X7Zf8NOew3FLOL',$,'Forces W1',$,(#30));
        #32=IFCRELDEFINESBYPROPERTIES('2O2Fr$t4X7Zf8NOew3FLOM',$,$,$,(#15),#31);
        """;

    private const string Mapping = """
        {"forces": {"missingComponents": "MISSING", "propertySets": [{"set": "Forces *", "stations": "constant", "components": {"N": {"property": "Axial", "unit": "kN"}}}]}}
        """;

    [Fact]
    public void Forces_only_shows_what_a_mapping_found_and_what_it_could_not_use()
    {
        var model = Model(Rail + Bare + Forces);
        var used = Run(new(model, [], File("zero.json", Mapping.Replace("MISSING", "zero", StringComparison.Ordinal)), null, null, false) { ForcesOnly = true });
        var refused = Run(new(model, [], File("refuse.json", Mapping.Replace("MISSING", "refuse", StringComparison.Ordinal)), null, null, false) { ForcesOnly = true });
        var nothing = Run(new(model, [], null, null, null, false) { ForcesOnly = true });

        Assert.Equal((0, 2), (used.Code, used.Lines.Length));
        Assert.Equal(
            "usable | 2O2Fr$t4X7Zf8NOew3FLOH | '=Rail 1' | 'W1' | kind not stated | acts in full | 2 stations 0 to 2.5 m; N -8 kN, Vy 0 kN, Vz 0 kN, T 0 kNm, My 0 kNm, Mz 0 kNm"
                + " | property set 'Forces W1' #31 | in the member's axes; components left out count as zero: Vy, Vz, T, My, Mz",
            used.Lines[0]);
        Assert.Equal("landing.ifc: 1 situations usable + 0 not = 1 on 1 of 2 candidates", used.Lines[1]);
        Assert.Equal(2, refused.Code);
        Assert.StartsWith("not used | 2O2Fr$t4X7Zf8NOew3FLOH | '=Rail 1' | 'W1' | kind not stated | acts in full | forces-incomplete: ", refused.Lines[0], StringComparison.Ordinal);
        Assert.Equal((2, "landing.ifc: 0 situations usable + 0 not = 0 on 0 of 2 candidates"), (nothing.Code, nothing.Lines[^1]));
    }

    [Fact]
    public void The_forces_template_is_a_table_that_is_refused_until_it_is_filled()
    {
        var path = Path.Combine(_folder.FullName, "to-fill.csv");
        var model = Model(Rail + Bare);

        Run(new(model, [], null, null, null, false) { Template = path });

        var text = System.IO.File.ReadAllText(path);
        var lines = text.Split("\r\n", StringSplitOptions.RemoveEmptyEntries);
        Assert.Equal(ForcesTemplate.Header, lines.First(l => l[0] != '#'));
        Assert.Equal(["2O2Fr$t4X7Zf8NOew3FLOH,,,0,,,,,,", "2O2Fr$t4X7Zf8NOew3FLOH,,,2.5,,,,,,"], lines.Where(l => l.StartsWith("2O2", StringComparison.Ordinal)));
        Assert.Contains(lines, l => l.Contains("'Post 2'", StringComparison.Ordinal) && l.EndsWith("no certain length, so it has no rows here", StringComparison.Ordinal));
        Assert.Equal(64, Assert.Throws<Failure>(() => Run(new(model, [path], null, null, null, false))).ExitCode);

        System.IO.File.WriteAllText(path, text.Replace(",,,0,,,,,,", ",S,service,0,1,0,0,0,0,0", StringComparison.Ordinal).Replace(",,,2.5,,,,,,", ",S,service,2.5,1,0,0,0,0,0", StringComparison.Ordinal));
        Assert.Contains(Run(new(model, [path], null, null, null, false)).Lines, l => l.StartsWith("ready | 2O2Fr$t4X7Zf8NOew3FLOH", StringComparison.Ordinal));
    }

    [Fact]
    public void The_table_for_a_terminal_names_every_member()
    {
        var output = new StringWriter();

        MembersRun.Execute(new(Model(Rail + Bare), [], null, null, null, false), output, plain: false, TestContext.Current.CancellationToken);

        Assert.Contains("Post 2", output.ToString(), StringComparison.Ordinal);
        Assert.Contains("missing", output.ToString(), StringComparison.Ordinal);
    }

    private static (int Code, string[] Lines) Run(MembersRun.Options options)
    {
        var output = new StringWriter();
        var code = MembersRun.Execute(options, output, plain: true, CancellationToken.None);
        return (code, output.ToString().Split(Environment.NewLine, StringSplitOptions.RemoveEmptyEntries));
    }

    private string Model(string instances) => File("landing.ifc", $"""
        ISO-10303-21;
        HEADER;
        FILE_DESCRIPTION((''),'2;1');
        FILE_NAME('landing.ifc','2026-01-15T08:00:00',(''),(''),'','','');
        FILE_SCHEMA(('IFC4'));
        ENDSEC;
        DATA;
        #1=IFCPROJECT('2O2Fr$t4X7Zf8NOew3FLOA',$,'Cable-ferry landing',$,$,$,$,(#4),#2);
        #2=IFCUNITASSIGNMENT((#3));
        #3=IFCSIUNIT(*,.LENGTHUNIT.,.MILLI.,.METRE.);
        #4=IFCGEOMETRICREPRESENTATIONCONTEXT($,'Model',3,1.E-05,$,$);
        #5=IFCDIRECTION((0.,0.,1.));
        {instances}
        ENDSEC;
        END-ISO-10303-21;

        """);

    private string File(string name, string text)
    {
        var path = Path.Combine(_folder.FullName, name);
        System.IO.File.WriteAllText(path, text, new UTF8Encoding(encoderShouldEmitUTF8Identifier: false));
        return path;
    }
}
