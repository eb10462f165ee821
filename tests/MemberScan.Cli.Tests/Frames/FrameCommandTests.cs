using System.Text.Json;

namespace MemberScan.Cli.Tests.Frames;

/// <summary>The frame command: its format as others use it, numbers in the units of the file, refusals with code 64.</summary>
public sealed class FrameCommandTests
{
    private const string Sections = """ "materials": { "S": { "E": 210000, "G": 80769, "unitWeight": 7.7e-5, "yield": 235, "expansion": 1.2e-5 } }, "sections": { "rod": "round 20 mm", "bare": { "A": 4475, "Iy": 2.2e7, "Iz": 7.4e6, "Iyz": 0, "J": 1.8e7, "Asy": 0, "Asz": 0 } }, """;

    private const string Cantilever = $$"""
        { "units": { "length": "mm", "force": "N" }, "nodes": { "A": [0, 0, 0], "B": [2000, 0, 0] }, {{Sections}}
          "members": { "m1": { "start": "A", "end": "B", "section": "MEMBER_SECTION", "material": "S" } },
          "supports": { "A": { "ux": "fixed", "uy": "fixed", "uz": "fixed", "rx": "fixed", "ry": "fixed", "rz": "fixed" } },
          "situations": { "S1": { "kind": "KIND", "nodeLoads": [ { "node": "B", "F": [0, 0, -100], "M": [0, 0, 0] } ] } }, "stations": [0, 500, 2000] }
        """;

    [Fact]
    public async Task A_cantilever_in_millimetres_and_newtons()
    {
        using var json = await Solve(Cantilever.Replace("MEMBER_SECTION", "bare", StringComparison.Ordinal).Replace("KIND", "service", StringComparison.Ordinal), 0);

        var s = json.RootElement.GetProperty("situations").GetProperty("S1");
        // PL³/3EI and its slope (any structural handbook).
        Near(-100 * 8e9 / (3 * 210000 * 2.2e7), s.GetProperty("displacements").GetProperty("B")[2].GetDouble());
        Near(100 * 4e6 / (2 * 210000 * 2.2e7), s.GetProperty("displacements").GetProperty("B")[4].GetDouble());
        Near(100, s.GetProperty("reactions").GetProperty("A")[2].GetDouble());
        Near(-200_000, s.GetProperty("reactions").GetProperty("A")[4].GetDouble());
        Assert.False(s.GetProperty("reactions").TryGetProperty("B", out _));
        var rows = s.GetProperty("members").GetProperty("m1").GetProperty("stations");
        Assert.Equal(3, rows.GetArrayLength());
        Assert.Equal(500, rows[1].GetProperty("x").GetDouble());
        Near(150_000, rows[1].GetProperty("My").GetDouble());
        Near(-100, rows[1].GetProperty("Vz").GetDouble());
        Assert.Equal(["x", "N", "Vy", "Vz", "T", "My", "Mz", "ux", "uy", "uz"], rows[0].EnumerateObject().Select(p => p.Name));
        Assert.True(s.GetProperty("residual").GetDouble() < 1e-12);
        Assert.False(s.GetProperty("members").GetProperty("m1").TryGetProperty("utilization", out _));
    }

    [Theory]
    [InlineData("service", 1.67)]
    [InlineData("design", 1.00)]
    public async Task Utilization_of_a_rod(string kind, double factor)
    {
        using var json = await Solve(Cantilever.Replace("MEMBER_SECTION", "rod", StringComparison.Ordinal).Replace("KIND", kind, StringComparison.Ordinal), 1);

        // σ = M·32/πd³ at the root.
        var stress = 200_000 * 32 / (Math.PI * 8000);
        Near(stress * factor / 235, json.RootElement.GetProperty("situations").GetProperty("S1").GetProperty("members").GetProperty("m1").GetProperty("utilization").GetDouble(), 1e-3);
    }

    /// <summary>
    /// 40 mm wide, 150 mm deep at the root and 60 mm at the tip, by hand with ξ from the tip, h = 60 + 0.045ξ and M = Pξ: the deflection is
    /// 12P/(E·b)·∫ξ²/h³ dξ = 12P/(E·b·k³)·[ln(h₁/h₂) + 2h₂/h₁ − h₂²/(2h₁²) − 3/2]; the bending stress 6Pξ/(b·h²) is largest where h = 120 mm, ξ = 1333.3 mm,
    /// 13.889 MPa for 1 kN, not at the root (13.333 MPa).
    /// </summary>
    [Fact]
    public async Task A_member_that_tapers_has_the_section_of_each_place()
    {
        var text = Cantilever.Replace("\"MEMBER_SECTION\"", "{ \"start\": \"thick\", \"end\": \"thin\" }", StringComparison.Ordinal).Replace("KIND", "service", StringComparison.Ordinal)
            .Replace("\"rod\":", "\"thick\": \"rectangle 40x150 mm\", \"thin\": \"rectangle 40x60 mm\", \"rod\":", StringComparison.Ordinal).Replace("-100]", "-1000]", StringComparison.Ordinal);

        using var json = await Solve(text, 0);

        var s = json.RootElement.GetProperty("situations").GetProperty("S1");
        var k = 0.045;
        var bracket = Math.Log(2.5) + 2 * 60 / 150.0 - 60 * 60 / (2 * 150.0 * 150) - 1.5;
        Near(-12 * 1000 / (210000 * 40 * k * k * k) * bracket, s.GetProperty("displacements").GetProperty("B")[2].GetDouble(), 1e-3);
        Near(13.889 * 1.67 / 235, s.GetProperty("members").GetProperty("m1").GetProperty("utilization").GetDouble(), 1e-3);
    }

    /// <summary>A cantilever whose support sinks by 8 mm and turns by 0.001 rad about y moves as a rigid body: the end by −8 − 0.001·2000 mm.</summary>
    [Fact]
    public async Task A_support_moves_in_one_situation_and_not_in_the_other()
    {
        var text = Cantilever.Replace("MEMBER_SECTION", "bare", StringComparison.Ordinal).Replace("KIND", "service", StringComparison.Ordinal)
            .Replace("\"situations\": {", "\"situations\": { \"S0\": { \"supportMovements\": { \"A\": { \"uz\": -8, \"ry\": 0.001 } } },", StringComparison.Ordinal);

        using var json = await Solve(text, 0);

        var situations = json.RootElement.GetProperty("situations");
        Near(-10, situations.GetProperty("S0").GetProperty("displacements").GetProperty("B")[2].GetDouble());
        Near(-100 * 8e9 / (3 * 210000 * 2.2e7), situations.GetProperty("S1").GetProperty("displacements").GetProperty("B")[2].GetDouble());
    }

    [Fact]
    public async Task The_whole_format_is_read()
    {
        var text = $$"""
            { "units": { "length": "mm", "force": "N" }, "nodes": { "A": [0, 0, 0], "B": [2000, 0, 0] }, {{Sections}}
              "members": { "m1": { "start": "A", "end": "B", "section": "bare", "material": "S", "zDirection": [0, 0, 1], "shearFlexible": false,
                  "released": { "start": [], "end": [] }, "springs": { "start": { "ry": 1e9 } }, "offsets": { "start": [0, 0, 0], "end": [0, 0, -50] } } },
              "supports": { "A": { "ux": "fixed", "uy": "fixed", "uz": -8.0, "rx": { "spring": 1e9 }, "ry": "fixed", "rz": "fixed" } },
              "situations": { "S1": { "kind": "service", "selfWeight": [0, 0, -1], "nodeLoads": [ { "node": "B", "F": [0, 0, -1000], "M": [0, 0, 0] } ],
                  "memberLoads": [ { "member": "m1", "type": "point", "at": 500, "F": [0, 0, -100], "M": [0, 0, 0], "axes": "global" },
                                   { "member": "m1", "type": "line", "from": 0, "to": 2000, "q1": [0, 0, -1], "q2": [0, 0, -2], "m1": [0, 0, 0], "m2": [0, 0, 0], "axes": "local" } ],
                  "temperature": [ { "member": "m1", "uniform": 20, "gradientY": 0, "gradientZ": 0 } ] } },
              "stations": 11 }
            """;
        using var json = await Solve(text, 0);

        var s = json.RootElement.GetProperty("situations").GetProperty("S1");
        // The supports of the format hold everything at A: all loads come down there, less the slope of the flexible part by 50 mm in 2000.
        var length = Math.Sqrt(2000.0 * 2000 + 50 * 50);
        var line = 3000.0 * 2000 / length;
        Near(1000 + 100 + line + 7.7e-5 * 4475 * length, s.GetProperty("reactions").GetProperty("A")[2].GetDouble(), 1e-4);
        Near(-8, s.GetProperty("displacements").GetProperty("A")[2].GetDouble());
        Assert.Equal(11, s.GetProperty("members").GetProperty("m1").GetProperty("stations").GetArrayLength());
    }

    [Fact]
    public async Task A_jump_at_a_station_gives_two_rows()
    {
        var text = Cantilever.Replace("MEMBER_SECTION", "bare", StringComparison.Ordinal).Replace("KIND", "service", StringComparison.Ordinal)
            .Replace("\"nodeLoads\"", "\"memberLoads\": [ { \"member\": \"m1\", \"type\": \"point\", \"at\": 500, \"F\": [0, 0, -40], \"axes\": \"global\" } ], \"nodeLoads\"", StringComparison.Ordinal);
        using var json = await Solve(text, 0);

        var rows = json.RootElement.GetProperty("situations").GetProperty("S1").GetProperty("members").GetProperty("m1").GetProperty("stations");
        Assert.Equal([0.0, 500, 500, 2000], rows.EnumerateArray().Select(r => r.GetProperty("x").GetDouble()));
        Near(-140, rows[1].GetProperty("Vz").GetDouble());
        Near(-100, rows[2].GetProperty("Vz").GetDouble());
    }

    [Theory]
    [InlineData("\"start\": \"A\"", "\"begin\": \"A\"", "'begin' is not a key of members.m1")]
    [InlineData("\"start\": \"A\"", "\"start\": \"AA\"", "there is no node 'AA'")]
    [InlineData("\"section\": \"bare\"", "\"section\": \"bar\"", "did you mean 'bare'?")]
    [InlineData("\"ux\": \"fixed\"", "\"ux\": \"fixd\"", "did you mean 'fixed'?")]
    [InlineData("\"ux\": \"fixed\"", "\"ux\": true", "supports.A.ux")]
    [InlineData("\"E\": 210000", "\"E\": -210000", "materials.S.E")]
    [InlineData("[2000, 0, 0]", "[2000, 0]", "nodes.B has 2 numbers")]
    [InlineData("[2000, 0, 0]", "[0, 0, 0]", "member m1 has no length")]
    [InlineData("\"ux\": \"fixed\", \"uy\"", "\"uy\"", "moves along ux")]
    [InlineData("\"material\": \"S\" }", "\"material\": \"S\", \"zDirection\": [1, 0, 0] }", "z direction of member m1")]
    [InlineData("\"stations\": [0, 500, 2000]", "\"stations\": 1", "stations is '1'")]
    [InlineData("\"stations\": [0, 500, 2000]", "\"stations\": [0, 2500]", "member m1")]
    [InlineData("\"length\": \"mm\"", "\"length\": \"mmm\"", "units.length")]
    public async Task What_is_wrong_is_named_and_ends_with_64(string right, string wrong, string named)
    {
        using var folder = new TemporaryFolder();
        var text = Cantilever.Replace("MEMBER_SECTION", "bare", StringComparison.Ordinal).Replace("KIND", "service", StringComparison.Ordinal);
        Assert.Contains(right, text, StringComparison.Ordinal);
        var path = Path.Combine(folder.Path, "frame.json");
        await File.WriteAllTextAsync(path, text.Replace(right, wrong, StringComparison.Ordinal), TestContext.Current.CancellationToken);

        var ran = await Memberscan.Run("frame", path);

        Assert.True(ran.ExitCode == 64, ran.All);
        Assert.Contains(named, ran.Error, StringComparison.Ordinal);
        Assert.Empty(ran.Output);
    }

    [Fact]
    public async Task Text_output_is_the_same_in_a_german_culture()
    {
        var start = Memberscan.Start(["frame", Memberscan.Sample("rail-post.frame.json")]);
        start.Environment["LANG"] = "de_DE.UTF-8";
        start.Environment["DOTNET_SYSTEM_GLOBALIZATION_INVARIANT"] = "0";
        var (german, plain) = (await Memberscan.Run(start), await Memberscan.Run("frame", Memberscan.Sample("rail-post.frame.json")));

        Assert.True(german.ExitCode == plain.ExitCode, german.All);
        Assert.Equal(plain.Output, german.Output);
        Assert.Contains("Situation factored (kind: design)", plain.Output, StringComparison.Ordinal);
        Assert.Contains("utilization", plain.Output, StringComparison.Ordinal);
        Assert.Contains("A screening aid for qualified engineers; not a design, not a certificate.", plain.Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_file_that_is_not_there_ends_with_74() => Assert.Equal(74, (await Memberscan.Run("frame", "no-such.frame.json")).ExitCode);

    private static async Task<JsonDocument> Solve(string text, int code)
    {
        using var folder = new TemporaryFolder();
        var path = Path.Combine(folder.Path, "frame.json");
        await File.WriteAllTextAsync(path, text, TestContext.Current.CancellationToken);
        var ran = await Memberscan.Run("frame", path, "--json");
        Assert.True(ran.ExitCode == code, ran.All);
        return JsonDocument.Parse(ran.Output);
    }

    private static void Near(double expected, double actual, double share = 1e-8) =>
        Assert.True(Math.Abs(actual - expected) <= share * Math.Abs(expected), FormattableString.Invariant($"expected {expected:R}, got {actual:R}"));
}
