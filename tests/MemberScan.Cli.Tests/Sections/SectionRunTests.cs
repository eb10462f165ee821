using System.Text.Json;
using MemberScan.Cli.Sections;

namespace MemberScan.Cli.Tests.Sections;

public sealed class SectionRunTests
{
    private static readonly string[] s_combined = ["round 20 mm", "--forces", "N=10kN My=0.1kNm Mz=0.1kNm T=0.05kNm"];

    [Fact]
    public async Task The_keys_are_those_that_the_README_documents()
    {
        using var json = await Json([.. s_combined, "--at", "y=0mm z=10mm", "--yield", "235MPa"]);

        var root = json.RootElement;
        Assert.Equal(["section", "properties", "shear", "poisson", "forces", "utilization", "points", "governing", "closure", "state"], Keys(root));
        Assert.Equal(["area", "Iy", "Iz", "Iyz", "J", "WelY", "WelZ", "WplY", "WplZ", "Wt", "JThinWall", "yS", "zS", "JSource", "WelExtremes", "IMax", "IMin", "principalAngle", "QY", "QZ", "plasticAxisY", "plasticAxisZ", "WtThinWall", "shearAreaY", "shearAreaZ"], Keys(root.GetProperty("properties")));
        Assert.Equal(["N", "Vy", "Vz", "T", "My", "Mz"], Keys(root.GetProperty("forces")));
        Assert.Equal(["y", "z", "sigma", "tauXY", "tauXZ", "tau", "vonMises", "tresca", "sigma1", "sigma3"], Keys(root.GetProperty("points")[0]));
        var governing = root.GetProperty("governing");
        Assert.Equal(["vonMises", "tresca", "absSigma", "tau", "sigma1", "sigma3"], Keys(governing));
        Assert.All(governing.EnumerateObject(), measure => Assert.Equal(["value", "y", "z", "place"], Keys(measure.Value)));
        Assert.Equal(("elementary", 0.3, "round 20 mm"), (root.GetProperty("shear").GetString(), root.GetProperty("poisson").GetDouble(), root.GetProperty("section").GetString()));
        Assert.Equal(
            ["sigma", "tauXY", "tauXZ", "sigma1", "sigma2", "sigma3", "shearDirection", "angle", "direction1", "direction2", "direction3", "freeDirections", "largestShear", "circles", "elements"],
            Keys(root.GetProperty("state")));
        Assert.DoesNotContain("utilization", Keys((await Json(s_combined)).RootElement));
    }

    /// <summary>
    /// By hand: 10e3/314.16 + 32·√2·0.1e6/(π·20³) = 31.83 + 180.06 = 211.89 MPa, 16·0.05e6/(π·20³) = 31.83 MPa; √(σ² + 3τ²) and √(σ² + 4τ²).
    /// Properties by Gere and Timoshenko, appendix (from memory).
    /// </summary>
    [Fact]
    public async Task A_round_bar_under_all_but_shear()
    {
        using var json = await Json([.. s_combined, "--yield", "235MPa"]);

        var root = json.RootElement;
        double Most(string measure) => root.GetProperty("governing").GetProperty(measure).GetProperty("value").GetDouble() / 1e6;
        Assert.Equal(218.95, Most("vonMises"), 0.005);
        Assert.Equal(221.25, Most("tresca"), 0.005);
        Assert.Equal(211.89, Most("absSigma"), 0.005);
        Assert.Equal(31.83, Most("tau"), 0.005);
        Assert.Equal(218.95 / 235, root.GetProperty("utilization").GetDouble(), 3e-5);
        var place = root.GetProperty("governing").GetProperty("vonMises");
        Assert.Equal(-7.071e-3, place.GetProperty("y").GetDouble(), 1e-5);          // σ = −Mz·y/Iz: tension at −y and at +z
        Assert.Equal(7.071e-3, place.GetProperty("z").GetDouble(), 1e-5);
        var p = root.GetProperty("properties");
        Assert.Equal(
            [Math.PI * 1e-4, Math.PI / 4 * 1e-8, Math.PI / 2 * 1e-8, Math.PI / 4 * 1e-6, 4.0 / 3 * 1e-6],
            new[] { "area", "Iy", "J", "WelZ", "WplY" }.Select(k => p.GetProperty(k).GetDouble()), (a, b) => Math.Abs(a / b - 1) < 1e-9);
        Assert.Equal(JsonValueKind.Null, p.GetProperty("JThinWall").ValueKind);
    }

    /// <summary>By hand from σ = 211.89 and τ = 31.83 MPa: 105.945 ± √(105.945² + 31.83²) = 105.945 ± 110.623; 2θ = atan(63.66/211.89) = 16.72°.</summary>
    [Fact]
    public async Task The_state_at_the_governing_point_is_worked_out()
    {
        using var json = await Json(s_combined);
        var plain = await Memberscan.Run(["section", .. s_combined]);

        var state = json.RootElement.GetProperty("state");
        double Mpa(JsonElement e, string key) => e.GetProperty(key).GetDouble() / 1e6;
        Assert.Equal([216.57, 0, -4.68, 211.89], [Mpa(state, "sigma1"), Mpa(state, "sigma2"), Mpa(state, "sigma3"), Mpa(state, "sigma")], (a, b) => Math.Abs(a - b) < 0.01);
        Assert.Equal(16.72 / 2, state.GetProperty("angle").GetDouble() * 180 / Math.PI, 0.01);
        Assert.Equal(110.62, Mpa(state.GetProperty("largestShear"), "shear"), 0.01);
        Assert.Equal(105.95, Mpa(state.GetProperty("largestShear"), "normal"), 0.01);
        Assert.Equal([("σ1–σ3", 105.95, 110.62), ("σ1–σ2", 108.28, 108.28), ("σ2–σ3", -2.34, 2.34)],
            state.GetProperty("circles").EnumerateArray().Select(c => (c.GetProperty("name").GetString()!, Math.Round(Mpa(c, "centre"), 2), Math.Round(Mpa(c, "radius"), 2))),
            (a, b) => a.Item1 == b.Item1 && Math.Abs(a.Item2 - b.Item2) < 0.011 && Math.Abs(a.Item3 - b.Item3) < 0.011);
        // At (−7.07, 7.07) mm torsion runs towards −y −z: τxy = −T·z/J, τxz = T·y/J, both −22.51 MPa.
        Assert.Equal([("xy", 211.89, -22.51), ("xz", 211.89, -22.51)],
            state.GetProperty("elements").EnumerateArray().Select(e => (e.GetProperty("plane").GetString()!, Mpa(e, "sigma"), Mpa(e, "tau"))),
            (a, b) => a.Item1 == b.Item1 && Math.Abs(a.Item2 - b.Item2) < 0.01 && Math.Abs(a.Item3 - b.Item3) < 0.01);
        Assert.Contains("principal stresses σ1 216.57, σ2 0, σ3 -4.68 MPa; σ1 at 8.36° from x towards τ", plain.Output, StringComparison.Ordinal);
        Assert.Contains("Mohr's circles: σ1–σ3 centre 105.95, radius 110.62 MPa", plain.Output, StringComparison.Ordinal);
        Assert.Contains("stress element xy: σx 211.89, τxy -22.51 MPa", plain.Output, StringComparison.Ordinal);
    }

    /// <summary>h/b = 2: J = 0.2287·80·40³ mm⁴ = 1.171e6, τ = T/(0.24588·80·40²) = 6.354 MPa (Timoshenko and Goodier, art. 109, from memory).</summary>
    [Theory]
    [InlineData("elementary")]
    [InlineData("elasticity")]
    public async Task A_rectangle_under_torsion(string shear)
    {
        using var json = await Json("rectangle 40x80 mm", "--forces", "T=0.2kNm", "--shear", shear);

        var tau = json.RootElement.GetProperty("governing").GetProperty("tau");
        Assert.Equal(1.171e-6, json.RootElement.GetProperty("properties").GetProperty("J").GetDouble(), 0.001e-6);
        Assert.Equal(6.35e6, tau.GetProperty("value").GetDouble(), 0.01e6);
        Assert.Equal((20e-3, 0.0), (Math.Abs(tau.GetProperty("y").GetDouble()), Math.Round(tau.GetProperty("z").GetDouble(), 9)));
        Assert.Contains("middle of the long side", tau.GetProperty("place").GetString(), StringComparison.Ordinal);
        Assert.Equal(shear, json.RootElement.GetProperty("shear").GetString());
    }

    [Fact]
    public async Task The_largest_normal_stress_keeps_its_sign()
    {
        using var json = await Json("round 20 mm", "--forces", "N=-10kN My=0.1kNm");

        var governing = json.RootElement.GetProperty("governing");
        var expected = -(10e3 / 314.159265 + 32 * 0.1e6 / (Math.PI * 8000)) * 1e6;
        Assert.Equal(expected, governing.GetProperty("absSigma").GetProperty("value").GetDouble(), 1e3);
        Assert.Equal(expected, governing.GetProperty("sigma3").GetProperty("value").GetDouble(), 1e3);
        Assert.True(governing.GetProperty("sigma1").GetProperty("value").GetDouble() > 0);
    }

    /// <summary>Rail post of 42 in, 200 lbf: 8400 lbf·in over 0.3262 in³ gives 25.75 ksi (published nominal wall of pipe 1 1/2, ASME B36.10, from memory).</summary>
    [Theory]
    [InlineData("35ksi", 0, 0.7358)]
    [InlineData("25ksi", 1, 1.0300)]
    public async Task Inches_and_pounds_are_read_and_over_the_yield_strength_is_1(string yield, int code, double utilization)
    {
        var ran = await Memberscan.Run("section", "tube 1.900x0.145 in", "--forces", "Vz=200lbf My=8400lbf·in", "--yield", yield, "--json");

        Assert.True(code == ran.ExitCode, ran.All);
        using var json = JsonDocument.Parse(ran.Output);
        Assert.Equal(utilization, json.RootElement.GetProperty("utilization").GetDouble(), 1e-4);
        Assert.Equal(25.75 * 6.894757e6, json.RootElement.GetProperty("governing").GetProperty("absSigma").GetProperty("value").GetDouble(), 0.005 * 6.894757e6);
    }

    [Fact]
    public async Task Plain_text_gives_the_same_figures_with_their_units()
    {
        var ran = await Memberscan.Run(["section", .. s_combined, "--at", "y=0mm z=10mm"]);

        Assert.True(ran.ExitCode == 0, ran.All);
        Assert.Contains("largest von Mises: 218.95 MPa", ran.Output, StringComparison.Ordinal);
        Assert.Contains("largest Tresca: 221.25 MPa", ran.Output, StringComparison.Ordinal);
        Assert.Contains("A    314.159 mm²", ran.Output, StringComparison.Ordinal);
        Assert.Contains("at y 0 mm, z 10 mm: σ 159.15 MPa", ran.Output, StringComparison.Ordinal);         // 31.83 + 127.32
    }

    [Theory]
    [InlineData("N=1.5kN", "C")]
    [InlineData("N=1.5kN", "de_DE.UTF-8")]
    public async Task Numbers_have_a_point_in_every_language(string forces, string language)
    {
        var start = Memberscan.Start(["section", "round 20.5 mm", "--forces", forces, "--poisson", "0.25", "--at", "y=0mm z=1.5mm"]);
        start.Environment["LC_ALL"] = start.Environment["LANG"] = language;
        start.Environment.Remove("DOTNET_SYSTEM_GLOBALIZATION_INVARIANT");

        var ran = await Memberscan.Run(start);

        Assert.True(ran.ExitCode == 0, ran.All);
        Assert.Contains("N 1.5 kN", ran.Output, StringComparison.Ordinal);
        Assert.Contains("z 1.5 mm", ran.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("rund 20 mm", "", "", "", "")]
    [InlineData("round 20", "", "", "", "")]
    [InlineData("round 0 mm", "", "", "", "above zero")]
    [InlineData("tube 20x10 mm", "", "", "", "")]
    [InlineData("round 20,5 mm", "", "", "", "")]
    [InlineData("round 1e-120 mm", "My=1kNm", "", "", "check their units")]
    [InlineData("round 20 mm", "My=1e300kNm", "", "", "check their units")]
    [InlineData("round 20 mm", "N=1e-320kN", "", "", "check their units")]
    [InlineData("round 20 mm", "N=1", "", "", "")]
    [InlineData("round 20 mm", "N=1kNm", "", "", "")]
    [InlineData("round 20 mm", "Q=1kN", "", "", "")]
    [InlineData("round 20 mm", "N=1kN N=2kN", "", "", "")]
    [InlineData("round 20 mm", "N=1kN", "y=0mm z=11mm", "", "lies outside the material of round 20 mm")]
    [InlineData("tube 48.3x3.2 mm", "N=1kN", "y=0mm z=0mm", "", "lies outside the material of tube 48.3x3.2 mm")]
    [InlineData("round 20 mm", "N=1kN", "y=0mm z=1", "", "")]
    [InlineData("round 20 mm", "N=1kN", "z=10mm", "", "give both")]
    [InlineData("round 20 mm", "N=1kN", "", "0MPa", "above zero")]
    [InlineData("round 20 mm", "N=1kN", "", "235", "")]
    public void A_wrong_text_is_refused_with_a_remedy(string section, string forces, string point, string yield, string words)
    {
        var failure = Assert.Throws<Failure>(() => SectionRun.Execute(new SectionRun.Options(
            section, forces, point.Length > 0 ? [point] : [], "elementary", 0.3, yield.Length > 0 ? yield : null, Json: true)));

        Assert.Equal(64, failure.ExitCode);
        Assert.Contains(words, failure.Message, StringComparison.Ordinal);
        Assert.True(failure.Message.Length > 20, failure.Message);
    }

    [Theory]
    [InlineData("0.5")]
    [InlineData("-0.1")]
    [InlineData("0,3")]
    [InlineData("NaN")]
    public async Task A_Poisson_ratio_out_of_range_is_refused(string poisson)
    {
        var ran = await Memberscan.Run("section", "round 20 mm", $"--poisson={poisson}");

        Assert.True(ran.ExitCode == 64, ran.All);
        Assert.Contains("give a number from 0 to below 0.5", ran.Error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Both_shear_models_stand_side_by_side_where_asked_for()
    {
        using var json = await Json("box 50x100x5 mm ro 10 ri 5", "--forces", "Vz=20kN T=0.5kNm My=1kNm", "--shear", "both", "--yield", "355MPa");

        var (own, other) = (json.RootElement.GetProperty("governing"), json.RootElement.GetProperty("comparison"));
        Assert.Equal(["shear", "governing", "difference", "filletVonMises", "stressChange"], Keys(other));
        var ratio = other.GetProperty("governing").GetProperty("vonMises").GetProperty("value").GetDouble() / own.GetProperty("vonMises").GetProperty("value").GetDouble();
        Assert.Equal(ratio - 1, other.GetProperty("difference").GetDouble(), 1e-12);
        Assert.InRange(ratio, 0.9, 1.1);
        Assert.Equal(1e3 / (4.084e-5 * 355e6), json.RootElement.GetProperty("plastic").GetProperty("My").GetDouble(), 1e-4);   // Wpl of EN 10219-2's annex formula
    }

    [Fact]
    public async Task Several_situations_are_held_apart_and_the_largest_decides()
    {
        var ran = await Memberscan.Run("section", "round 20 mm", "--forces", "N=10kN", "--forces", "My=0.2kNm", "--forces", "N=20kN", "--yield", "235MPa", "--json");

        Assert.True(ran.ExitCode == 1, ran.All);
        using var json = JsonDocument.Parse(ran.Output);
        Assert.Equal(2, json.RootElement.GetProperty("situation").GetInt32());
        Assert.Equal([31.83, 254.65, 63.66], json.RootElement.GetProperty("situations").EnumerateArray().Select(s => s.GetProperty("vonMises").GetProperty("value").GetDouble() / 1e6), (a, b) => Math.Abs(a - b) < 0.005);
        Assert.Equal(254.65 / 235, json.RootElement.GetProperty("utilization").GetDouble(), 3e-5);
    }

    /// <summary>By hand: 32·M/(π·d³) = fy gives d = (32·0.2e6/(π·235))^⅓ = 20.543 mm, so 20.55 mm.</summary>
    [Fact]
    public async Task The_smallest_diameter_is_the_one_found_by_hand()
    {
        var ran = await Memberscan.Run("section", "round 20 mm", "--forces", "My=0.2kNm", "--yield", "235MPa", "--smallest");

        Assert.True(ran.ExitCode == 1, ran.All);
        Assert.Contains("hint for the modeler, elementary model: smallest diameter: 20.55 mm", ran.Output, StringComparison.Ordinal);
        Assert.Contains("moment over plastic moment Wpl·fy, for information: My 0.638", ran.Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task An_outline_from_a_file_is_drawn_to_scale()
    {
        using var folder = new TemporaryFolder();
        var (outline, drawing) = (Path.Combine(folder.Path, "gusset.json"), Path.Combine(folder.Path, "gusset.svg"));
        await File.WriteAllTextAsync(outline, """{ "unit": "mm", "outer": { "points": [[0, 0], [60, 0], [60, 40], [0, 40]] }, "holes": [{ "circle": [30, 20, 8] }] }""", TestContext.Current.CancellationToken);

        var ran = await Memberscan.Run("section", $"outline {outline}", "--forces", "My=1kNm T=0.1kNm", "--shear", "elasticity", "--svg", drawing, "--json");

        Assert.True(ran.ExitCode == 0, ran.All);
        using var json = JsonDocument.Parse(ran.Output);
        Assert.Equal((60 * 40 - Math.PI * 64) * 1e-6, json.RootElement.GetProperty("properties").GetProperty("area").GetDouble(), 1e-12);
        var svg = await File.ReadAllTextAsync(drawing, TestContext.Current.CancellationToken);
        Assert.StartsWith("<svg", svg, StringComparison.Ordinal);
        Assert.Equal(2, svg.Split("<polygon").Length - 1);
        Assert.Contains("largest von Mises", svg, StringComparison.Ordinal);
        Assert.Equal((3, 2), (svg.Split("class=\"mohr\"").Length - 1, svg.Split("class=\"element\"").Length - 1));
        System.Xml.Linq.XDocument.Parse(svg);
        Assert.Equal(["gusset.json", "gusset.svg"], folder.Names);
    }

    [Fact]
    public void An_outline_has_no_elementary_model_and_the_remedy_is_told()
    {
        using var folder = new TemporaryFolder();
        var path = Path.Combine(folder.Path, "plate.json");
        File.WriteAllText(path, """{ "unit": "mm", "outer": { "points": [[0, 0], [60, 0], [60, 40], [0, 40]] } }""");

        var failure = Assert.Throws<Failure>(() => SectionRun.Execute(new SectionRun.Options($"outline {path}", "N=1kN", [], "elementary", 0.3, null, Json: true)));

        Assert.Equal(64, failure.ExitCode);
        Assert.EndsWith("use --shear elasticity.", failure.Message, StringComparison.Ordinal);
    }

    private static async Task<JsonDocument> Json(params string[] arguments)
    {
        var ran = await Memberscan.Run(["section", .. arguments, "--json"]);
        Assert.True(ran.ExitCode == 0 && ran.Error.Length == 0, ran.All);
        return JsonDocument.Parse(ran.Output);
    }

    private static IEnumerable<string> Keys(JsonElement element) => element.EnumerateObject().Select(p => p.Name);
}
