using System.Globalization;
using System.Text;
using CsCheck;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.Json;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Model.Forces;
using MemberScan.Model.Limits;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.Tests.SettingsFiles;

public sealed class SettingsFileTests
{
    [Fact]
    public void Every_key_is_read()
    {
        var settings = Sound("""
            {
              // the review of the landing
              "basis": { "service": { "criterion": "allowable-tresca", "omega": 1.5 }, "design": null },
              "candidates": { "always": ["IfcMember"], "withBarBodyOrForces": ["ifcbeam",] },
              "forces": {
                "convention": "end-forces", "components": "global-axes", "turnDegrees": 90, "turnDegreesByMember": { "GR-07": -45.5 },
                "missingComponents": "zero", "unknownMembers": "list",
                "kinds": [{ "pattern": "ULS*", "kind": "design" }, { "kind": "service", "pattern": "SLS?1" }]
              },
              "units": { "TORQUEUNIT": "kN·m", "MODULUSOFELASTICITYUNIT": "ksi" },
              "materials": {
                "grades": [{ "name": "Own", "pattern": "own ?steel", "standard": "mill certificate", "modulus": "205 GPa", "poisson": 0.29, "isSteel": true,
                             "yields": [{ "upTo": "16 mm", "yield": "240 MPa" }, { "yield": "33 ksi" }] }],
                "poisson": 0.25
              },
              "stability": { "lengthFactor": 1 },
              "display": "si",
            }
            """);

        Assert.Equal(new Basis(new StressLimit(Criterion.AllowableTresca, 1.5), null), settings.Basis);
        Assert.Equal(["IfcMember"], settings.Reading.Candidates.Always);
        Assert.Equal(["ifcbeam"], settings.Reading.Candidates.WithBarBodyOrForces);
        var forces = settings.Reading.Forces;
        Assert.Equal((ForceConvention.EndForces, ForceComponents.GlobalAxes, 90.0), (forces.Convention, forces.Components, forces.TurnDegrees));
        Assert.Equal(-45.5, Assert.Single(forces.TurnDegreesByMember).Value);
        Assert.True(forces.MissingComponentsAreZero);
        Assert.True(forces.ListUnknownMembers);
        Assert.Equal([new KindPattern("ULS*", SituationKind.Design), new KindPattern("SLS?1", SituationKind.Service)], forces.Kinds);
        Assert.Equal(1000, settings.Reading.MissingUnits["TORQUEUNIT"]);
        Assert.Equal(6.894757e6, settings.Reading.MissingUnits["MODULUSOFELASTICITYUNIT"], 1e1);     // NIST SP 811, from memory
        var grade = settings.Reading.Grades[0];
        Assert.Equal(("Own", 205e9, 0.29, false), (grade.Name, grade.Modulus, grade.Poisson, grade.FromMemory));
        Assert.Equal([new YieldRange(0.016, 240e6), new YieldRange(double.PositiveInfinity, 33 * Foundation.Units.Si.Ksi(1))], grade.Yields);
        Assert.Equal("S235", settings.Reading.Grades[1].Name);
        Assert.Equal(0.25, settings.Reading.DefaultPoisson);
        Assert.Equal((1.0, DisplayUnits.Si), (settings.LengthFactor, settings.Display));
    }

    public static TheoryData<string> AbsentKeys => new()
    {
        "{}",
        """{"basis": {}}""",
        """{"basis": {"service": {}, "design": {}}}""",
        """{"candidates": {}, "forces": {}, "units": {}, "materials": {}, "stability": {}}""",
    };

    [Theory]
    [MemberData(nameof(AbsentKeys))]
    public void An_absent_key_is_the_documented_default(string text)
    {
        var settings = Sound(text);

        Assert.Equal(Settings.Default.Effective, settings.Effective);
        Assert.All(settings.Effective, setting => Assert.True(setting.IsDefault, setting.Key));
    }

    [Fact]
    public void A_factor_alone_keeps_the_default_criterion_and_a_criterion_alone_the_default_factor()
    {
        var factor = Sound("""{"basis": {"service": {"omega": 2}}}""");
        var criterion = Sound("""{"basis": {"service": {"criterion": "allowable-tresca"}}}""");

        Assert.Equal(new StressLimit(Criterion.AllowableVonMises, 2), factor.Basis.Service);
        Assert.Equal(new StressLimit(Criterion.AllowableTresca, 1.67), criterion.Basis.Service);
        Assert.Equal(Basis.Default.Design, factor.Basis.Design);
    }

    [Fact]
    public void A_class_moved_to_one_list_leaves_the_default_of_the_other()
    {
        var settings = Sound("""{"candidates": {"always": ["IfcBeam", "IfcBuildingElementProxy"]}}""");

        Assert.Equal(["IfcBeam", "IfcBuildingElementProxy"], settings.Reading.Candidates.Always);
        Assert.DoesNotContain("IfcBuildingElementProxy", settings.Reading.Candidates.WithBarBodyOrForces);
        Assert.Contains("IfcTendon", settings.Reading.Candidates.WithBarBodyOrForces);
    }

    public static TheoryData<string, string, int, int, string> Wrong => new()
    {
        { "", "INP-0101", 1, 1, "" },
        { "{\n  \"display\" \"si\"\n}", "INP-0101", 2, 13, "" },
        { "{\n  \"stability\": {\"lengthFactor\": NaN}\n}", "INP-0101", 2, 33, "" },
        { "{} {}", "INP-0101", 1, 4, "" },
        { "[]", "INP-0104", 1, 1, "the file is a list; give an object in braces" },
        { "{\"display\": \"\\ud800\"}", "INP-0101", 1, 13, "the text holds half of a surrogate pair; write the whole character" },
        { "{\n  \"bases\": {}\n}", "INP-0102", 2, 3, "'bases' is not a key; did you mean 'basis'?" },
        { "{\"basis\": {\"servise\": null}}", "INP-0102", 1, 12, "'servise' is not a key of basis; did you mean 'service'?" },
        { "{\"basis\": {\"service\": {\"gammaM0\": 1}}}", "INP-0102", 1, 24, "'gammaM0' is not a key of basis.service; known are criterion, omega" },
        { "{\"forces\": {\"turndegrees\": 1}}", "INP-0102", 1, 13, "'turndegrees' is not a key of forces; did you mean 'turnDegrees'?" },
        { "{\"forces\": {\"kinds\": [{\"pattern\": \"a\", \"kind\": \"design\", \"x\": 1}]}}", "INP-0102", 1, 58, "'x' is not a key of forces.kinds[1]; known are pattern, kind" },
        { "{\"units\": {\"TORQUE\": \"kN·m\"}}", "INP-0102", 1, 12, "'TORQUE' is not a key of units; did you mean 'TORQUEUNIT'?" },
        { "{\"display\": \"si\",\n\"display\": \"us\"}", "INP-0103", 2, 1, "the key 'display' stands twice in one object; keep one of them" },
        { "{\"basis\": []}", "INP-0104", 1, 11, "basis is a list; give an object in braces" },
        { "{\"basis\": {\"service\": {\"omega\": \"1.67\"}}}", "INP-0104", 1, 33, "basis.service.omega is a text; give a number without quotes" },
        { "{\"basis\": {\"service\": {\"omega\": null}}}", "INP-0104", 1, 33, "basis.service.omega is null; give a number without quotes" },
        { "{\"display\": 1}", "INP-0104", 1, 13, "display is a number; give one of the texts \"si\", \"us\"" },
        { "{\"candidates\": {\"always\": \"IfcBeam\"}}", "INP-0104", 1, 27, "candidates.always is a text; give a list in square brackets" },
        { "{\"candidates\": {\"always\": [7]}}", "INP-0104", 1, 28, "candidates.always is a number; give a text in quotes" },
        { "{\"forces\": {\"kinds\": [true]}}", "INP-0104", 1, 23, "forces.kinds[1] is true or false; give an object in braces" },
        { "{\"materials\": {\"grades\": [" + Grade("\"isSteel\": true", "\"isSteel\": \"yes\"") + "]}}", "INP-0104", 1, 160, "materials.grades[1].isSteel is a text; give true or false" },
        { "{\"basis\": {\"service\": {\"criterion\": \"en-1993-1-1-elastic\"}}}", "INP-0105", 1, 37, "basis.service.criterion is 'en-1993-1-1-elastic'; known are allowable-von-mises, allowable-tresca, aisc-360-asd, largest-normal-stress" },
        { "{\"forces\": {\"convention\": \"endforces\"}}", "INP-0105", 1, 27, "forces.convention is 'endforces'; did you mean 'end-forces'?" },
        { "{\"forces\": {\"kinds\": [{\"pattern\": \"a\", \"kind\": \"unknown\"}]}}", "INP-0105", 1, 48, "forces.kinds[1].kind is 'unknown'; known are service, design" },
        { "{\"display\": \"SI\"}", "INP-0105", 1, 13, "display is 'SI'; did you mean 'si'?" },
        { "{\"candidates\": {\"always\": [\"Beam\"]}}", "INP-0105", 1, 28, "'Beam' in candidates.always is not a class name; write it as the schema does, such as IfcMember" },
        { "{\"candidates\": {\"always\": [\"lfcBeam\"]}}", "INP-0105", 1, 28, "'lfcBeam' in candidates.always is not a class name; did you mean 'IfcBeam'?" },
        { "{\"basis\": {\"service\": {\"omega\": 0.99}}}", "INP-0106", 1, 33, "basis.service.omega is '0.99'; give a number from 1 to 100" },
        { "{\"basis\": {\"design\": {\"gammaM0\": 1e999}}}", "INP-0106", 1, 34, "basis.design.gammaM0 is '1e999'; give a number from 1 to 100" },
        { "{\"forces\": {\"turnDegreesByMember\": {\"GR-1\": 361}}}", "INP-0106", 1, 45, "forces.turnDegreesByMember.'GR-1' is '361'; give a number from -360 to 360" },
        { "{\"materials\": {\"poisson\": 0.5}}", "INP-0106", 1, 27, "materials.poisson is '0.5'; give a number from 0 to 0.499" },
        { "{\"stability\": {\"lengthFactor\": 0.4}}", "INP-0106", 1, 32, "stability.lengthFactor is '0.4'; give a number from 0.5 to 100" },
        { "{\"materials\": {\"grades\": [" + Grade("235 MPa", "235 GPa") + "]}}", "INP-0106", 1, 98, "materials.grades[1].yields[1].yield is '235 GPa', which cannot be meant; write for example \"235 MPa\"" },
        { "{\"materials\": {\"grades\": [" + Grade("[{\"yield\": \"235 MPa\"}]", "[{\"yield\": \"235 MPa\"}, {\"upTo\": \"5 mm\", \"yield\": \"240 MPa\"}]") + "]}}", "INP-0106", 1, 110, "materials.grades[1].yields is not in the order of thickness; give the thinnest range first and the open one last" },
        { "{\"forces\": {\"kinds\": [{\"pattern\": \" \", \"kind\": \"design\"}]}}", "INP-0107", 1, 35, "forces.kinds[1].pattern is empty, longer than 256 characters or holds control characters; give a plain text" },
        { "{\"forces\": {\"turnDegreesByMember\": {\"\": 1}}}", "INP-0107", 1, 37, "a key of forces.turnDegreesByMember is empty or longer than 256 characters; give a name" },
        { "{\"forces\": {\"kinds\": [{\"pattern\": \"" + new string('*', 257) + "\", \"kind\": \"design\"}]}}", "INP-0107", 1, 35, "forces.kinds[1].pattern is empty, longer than 256 characters or holds control characters; give a plain text" },
        { "{\"units\": {\"TORQUEUNIT\": \"kN\"}}", "INP-0108", 1, 26, "units.TORQUEUNIT: 'kN' is a unit of force, not of moment; give one of N·m, kN·m, MN·m, N·mm, kN·mm, kN·cm, lbf·in, lbf·ft, kip·in, kip·ft" },
        { "{\"units\": {\"LENGTHUNIT\": \"MM\"}}", "INP-0108", 1, 26, "units.LENGTHUNIT: 'MM' is not a unit of length; did you mean 'mm'?" },
        { "{\"materials\": {\"grades\": [" + Grade("210 GPa", "210") + "]}}", "INP-0108", 1, 122, "materials.grades[1].modulus: the unit is missing; give one of Pa, kPa, MPa, GPa, N/mm2, kN/m2, kN/cm2, psi, ksi" },
        { "{\"forces\": {\"kinds\": [{\"pattern\": \"a\"}]}}", "INP-0109", 1, 23, "forces.kinds[1] lacks the key 'kind'; add it" },
        { "{\"materials\": {\"grades\": [" + Grade(", \"poisson\": 0.3", "") + "]}}", "INP-0109", 1, 27, "materials.grades[1] lacks the key 'poisson'; add it" },
        { "{\"materials\": {\"grades\": [" + Grade("[{\"yield\": \"235 MPa\"}]", "[]") + "]}}", "INP-0109", 1, 87, "materials.grades[1].yields is empty; give at least one yield strength" },
        { "{\"materials\": {\"grades\": [" + Grade("S9", "S(9") + "]}}", "INP-0110", 1, 52, "materials.grades[1].pattern: it is not a regular expression (InsufficientClosingParentheses after 3 characters); mend it" },
        { "{\"materials\": {\"grades\": [" + Grade("S9", "a)|(b") + "]}}", "INP-0110", 1, 52, "materials.grades[1].pattern: it is not a regular expression (InsufficientOpeningParentheses after 2 characters); mend it" },
        { "{\"materials\": {\"grades\": [" + Grade("S9", "(?=S)S9") + "]}}", "INP-0110", 1, 52, "materials.grades[1].pattern: it looks around or back, or repeats too much, for a bounded time; simplify it" },
        { "{\"materials\": {\"grades\": [" + Grade("S9", ".*") + "]}}", "INP-0110", 1, 52, "materials.grades[1].pattern: it fits the empty name; let it demand at least one letter" },
        { "{\"candidates\": {\"always\": [\"IfcBeam\", \"ifcbeam\"]}}", "INP-0112", 1, 39, "'ifcbeam' stands in candidates.always already; keep it once" },
        { "{\"candidates\": {\"always\": [\"IfcBeam\"], \"withBarBodyOrForces\": [\"IfcBeam\"]}}", "INP-0112", 1, 64, "'IfcBeam' stands in candidates.always already; keep it once" },
        { "{\"forces\": {\"kinds\": [{\"pattern\": \"a\", \"kind\": \"design\"}, {\"pattern\": \"A\", \"kind\": \"service\"}]}}", "INP-0112", 1, 59, "forces.kinds[2] has the pattern 'A' of an earlier one; keep one of them" },
        { "{\"materials\": {\"grades\": [" + Grade("", "") + ",\n" + Grade("", "") + "]}}", "INP-0112", 2, 1, "materials.grades[2] has the name 'X' of an earlier one; keep one of them" },
    };

    [Theory]
    [MemberData(nameof(Wrong))]
    public void What_is_wrong_is_told_with_code_line_column_and_remedy(string text, string code, int line, int column, string message)
    {
        var diagnostics = new DiagnosticList();

        var settings = SettingsFile.Read(Encoding.UTF8.GetBytes(text), "landing.json", diagnostics);

        Assert.Null(settings);
        var found = Assert.Single(diagnostics.Items);
        if (message.Length > 0) Assert.Equal(message, found.Message);
        else Assert.StartsWith("this is not JSON: ", found.Message, StringComparison.Ordinal);
        Assert.Equal((code, Severity.Error), (found.Code, found.Severity));
        Assert.Equal(("landing.json", (long)line, column), (found.Span!.Value.File, found.Span.Value.Line, found.Span.Value.Column));
        Assert.DoesNotContain("LineNumber", found.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void All_errors_of_a_file_are_told_at_once()
    {
        var diagnostics = new DiagnosticList();

        _ = SettingsFile.Read("{\"display\": \"x\",\n\"basis\": {\"service\": {\"omega\": 0}},\n\"nope\": 1}"u8.ToArray(), "s.json", diagnostics);

        Assert.Equal(["INP-0102", "INP-0105", "INP-0106"], diagnostics.Items.Select(found => found.Code).Order());
    }

    [Fact]
    public void Only_the_first_50_errors_are_told_and_a_note_says_so()
    {
        var diagnostics = new DiagnosticList();
        var keys = string.Join(",\n", Enumerable.Range(1, 60).Select(i => $"\"wrong{i}\": 1"));

        var settings = SettingsFile.Read(Encoding.UTF8.GetBytes($"{{{keys}}}"), "s.json", diagnostics);

        Assert.Null(settings);
        Assert.Equal(JsonSource.MostErrors, diagnostics.Items.Count(found => found.Severity == Severity.Error));
        Assert.Equal("INP-0023", diagnostics.Items[^1].Code);
    }

    [Fact]
    public void Nesting_and_size_have_a_limit()
    {
        var (deep, large) = (new DiagnosticList(), new DiagnosticList());

        Assert.Null(SettingsFile.Read(Encoding.UTF8.GetBytes(new string('[', StrictJson.DeepestNesting + 1)), "s.json", deep));
        Assert.Null(SettingsFile.Read(new byte[StrictJson.LargestFile + 1], "s.json", large));

        Assert.Equal("INP-0101", Assert.Single(deep.Items).Code);
        Assert.Equal("INP-0111", Assert.Single(large.Items).Code);
    }

    [Fact]
    public void Text_that_is_not_utf_8_is_told_by_its_place()
    {
        var diagnostics = new DiagnosticList();

        var settings = SettingsFile.Read((byte[])[.. "{\n// Gel"u8, 0xE4, .. "nder\n}"u8], "s.json", diagnostics);

        Assert.Null(settings);
        Assert.Equal("s.json, line 2, column 7, byte 8", Assert.Single(diagnostics.Items).Span.ToString());
    }

    [Fact]
    public void A_byte_order_mark_does_not_shift_the_column()
    {
        var diagnostics = new DiagnosticList();

        _ = SettingsFile.Read(Encoding.UTF8.GetBytes("\uFEFF{\"display\": 1}"), "s.json", diagnostics);

        Assert.Equal(13, Assert.Single(diagnostics.Items).Span!.Value.Column);
    }

    [Fact]
    public void The_culture_of_the_machine_changes_nothing()
    {
        var culture = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");

            Assert.Equal(1.5, Sound("""{"basis": {"service": {"omega": 1.5}}}""").Basis.Service!.Factor);
        }
        finally
        {
            CultureInfo.CurrentCulture = culture;
        }
    }

    [Fact]
    public void Any_text_at_all_gives_settings_or_an_error_with_its_place()
    {
        var piece = Gen.OneOf("{", "}", "[", "]", ":", ",", "\"basis\"", "\"service\"", "\"forces\"", "\"kinds\"", "\"units\"", "\"materials\"", "\"grades\"",
            "null", "1", "1e999", "true", "// x\n", "/*", "\"", "\\ud800", "é");
        Gen.Select(Gen.Bool, piece.Array[0, 25]).Sample((braced, pieces) =>
        {
            var text = braced ? "{" + string.Concat(pieces) + "}" : string.Concat(pieces);
            var diagnostics = new DiagnosticList();

            var settings = SettingsFile.Read(Encoding.UTF8.GetBytes(text), "s.json", diagnostics);

            Assert.Equal(settings is null, diagnostics.HasErrors);
            Assert.All(diagnostics.Items, found => Assert.True(found.Span is { Line: > 0, Column: > 0 }));
        }, iter: 20_000, seed: "0000000000001");
    }

    private static Settings Sound(string text)
    {
        var diagnostics = new DiagnosticList();
        var settings = SettingsFile.Read(Encoding.UTF8.GetBytes(text), "landing.json", diagnostics);
        Assert.True(settings is not null, string.Join("; ", diagnostics.Items));
        Assert.Empty(diagnostics.Items);
        return settings;
    }

    // One sound grade, then one text in it replaced.
    private static string Grade(string from, string to)
    {
        const string Sound = """{"name": "X", "pattern": "S9", "standard": "own", "yields": [{"yield": "235 MPa"}], "modulus": "210 GPa", "poisson": 0.3, "isSteel": true}""";
        return from.Length == 0 ? Sound : Sound.Replace(from, to, StringComparison.Ordinal);
    }
}
