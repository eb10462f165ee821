using System.Diagnostics;
using System.Globalization;
using System.Text;
using MemberScan.Cli.Screening;

namespace MemberScan.Cli.Tests;

/// <summary>The exit codes of product and README; 70 has no known way to it and so no test.</summary>
public sealed class ExitCodesTests
{
    private static readonly double[] s_six = [Posts.Fine, Posts.Fine, Posts.Fine, Posts.Fine, Posts.Fine, Posts.Fine];

    public static TheoryData<double[], int, string> Screenings => new()
    {
        { [Posts.Fine, Posts.Fine], 0, "2 within limit + 0 overstressed + 0 not checked = 2 candidates" },
        { [.. s_six, Posts.Over, Posts.Unknown, Posts.Unknown, Posts.Unknown], 1, "6 within limit + 1 overstressed + 3 not checked = 10 candidates" },
        { [Posts.Fine, Posts.Unknown], 2, "1 within limit + 0 overstressed + 1 not checked = 2 candidates" },
    };

    [Theory]
    [MemberData(nameof(Screenings))]
    public async Task A_screening_ends_with_the_code_of_its_worst_verdict(double[] moments, int code, string counts)
    {
        using var folder = new TemporaryFolder();
        var (model, table) = Posts.Under(moments);

        var ran = await Memberscan.Run("screen", folder.Write("posts.ifc", model), "--forces", folder.Write("posts.csv", table));

        Assert.True(code == ran.ExitCode, ran.All);
        Assert.StartsWith("posts.ifc: " + counts, ran.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(0, 0, 0)]
    [InlineData(2, 0, 2)]
    [InlineData(1, 2, 1, 0)]
    [InlineData(3, 1, 3)]
    [InlineData(64, 64, 3, 1)]
    [InlineData(130, 64, 130)]
    [InlineData(74, 130, 74)]
    [InlineData(70, 74, 70, 0)]
    public void Of_several_runs_the_code_that_weighs_most_counts(int worst, params int[] codes) => Assert.Equal(worst, ExitCodes.Worst(codes));

    [Fact]
    public void A_code_that_the_program_does_not_return_is_no_code()
    {
        Assert.Throws<ArgumentException>(() => ExitCodes.Worst([]));
        Assert.Throws<ArgumentException>(() => ExitCodes.Worst([0, 5]));
    }

    [Fact]
    public async Task A_model_without_candidates_ends_with_2()
    {
        using var folder = new TemporaryFolder();

        var ran = await Memberscan.Run("screen", folder.Write("posts.ifc", Posts.Under().Model));

        Assert.True(ran.ExitCode == 2, ran.All);
        Assert.Contains("= 0 candidates", ran.Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Damage_that_was_passed_over_is_never_0()
    {
        using var folder = new TemporaryFolder();
        var (model, table) = Posts.Under(Posts.Fine);
        var text = Encoding.ASCII.GetString(model).Replace("DATA;\n", "DATA;\n#900000=IFCPERSON($,'',,$,$,$,$,$);\n", StringComparison.Ordinal);

        var ran = await Memberscan.Run("screen", folder.Write("posts.ifc", text), "--forces", folder.Write("posts.csv", table));

        Assert.True(ran.ExitCode == 2, ran.All);
        Assert.Contains("1 within limit + 0 overstressed + 0 not checked", ran.Output, StringComparison.Ordinal);
        Assert.Matches(@"P21-0022 .*\[posts\.ifc, line \d+, byte \d+", ran.Error);
    }

    /// <summary>Highest first: 74, 64, 3, 1, 2, 0.</summary>
    [Theory]
    [InlineData("missing model, wrong settings", 74)]
    [InlineData("missing table, wrong settings", 74)]
    [InlineData("missing settings, output onto input", 74)]
    [InlineData("wrong table, cut model", 64)]
    [InlineData("wrong settings, cut model", 64)]
    [InlineData("wrong time, overstressed", 64)]
    [InlineData("cut model, overstressed", 3)]
    [InlineData("overstressed, not checked, damage", 1)]
    public async Task Of_several_codes_the_weightier_is_returned(string faults, int code)
    {
        using var folder = new TemporaryFolder();
        var (model, table) = Posts.Under(Posts.Over, Posts.Unknown);
        var text = Encoding.ASCII.GetString(model);
        if (faults.Contains("damage", StringComparison.Ordinal)) text = text.Replace("DATA;\n", "DATA;\n#900000=IFCPERSON($,'',,$,$,$,$,$);\n", StringComparison.Ordinal);
        if (faults.Contains("cut", StringComparison.Ordinal)) text = text[..^40];
        var modelName = faults.Contains("output onto input", StringComparison.Ordinal) ? "posts.checked.ifc" : "posts.ifc";
        var modelPath = folder.Write(modelName, text);
        var arguments = new List<string> { "screen", faults.Contains("missing model", StringComparison.Ordinal) ? folder["none.ifc"] : modelPath };
        arguments.AddRange(["--forces", faults.Contains("missing table", StringComparison.Ordinal) ? folder["none.csv"] : folder.Write("posts.csv", faults.Contains("wrong table", StringComparison.Ordinal) ? "x" : table)]);
        if (faults.Contains("missing settings", StringComparison.Ordinal)) arguments.AddRange(["--settings", folder["none.json"]]);
        if (faults.Contains("wrong settings", StringComparison.Ordinal)) arguments.AddRange(["--settings", folder.Write("s.json", "{")]);
        if (faults.Contains("wrong time", StringComparison.Ordinal)) arguments.AddRange(["--timestamp", "noon"]);

        var ran = await Memberscan.Run([.. arguments]);

        Assert.True(code == ran.ExitCode, ran.All);
    }

    [Theory]
    [InlineData("--help")]
    [InlineData("-h")]
    [InlineData("screen --help", "--forces", "--settings", "--kind", "--out", "--timestamp", "--verbose")]
    [InlineData("section --help", "--forces", "--at", "--shear", "--poisson", "--yield", "--json")]
    [InlineData("--version")]
    public async Task Help_is_no_fault(string arguments, params string[] names)
    {
        var ran = await Memberscan.Run(arguments.Split(' '));

        Assert.True(ran.ExitCode == 0, ran.All);
        Assert.True(ran.Output.Trim().Length > 0 && ran.Error.Length == 0, ran.All);
        Assert.All(names, name => Assert.Contains(name, ran.Output, StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("", "Required command")]
    [InlineData("scren", "'scren'")]
    [InlineData("screen", "'MODEL'")]
    [InlineData("screen a.ifc b.ifc --fast", "'--fast'")]
    [InlineData("screen a.ifc --workers many", "'many'")]
    [InlineData("members a.ifc b.ifc", "'b.ifc'")]
    [InlineData("screen a.ifc --kind both", "'both'")]
    [InlineData("screen a.ifc --out", "'--out'")]
    [InlineData("screen a.ifc --fast", "'--fast'")]
    [InlineData("section", "'SECTION'")]
    [InlineData("section x --shear thin", "'thin'")]
    public async Task Wrong_arguments_end_with_64_and_name_themselves(string arguments, string named)
    {
        var ran = await Memberscan.Run(arguments.Split(' ', StringSplitOptions.RemoveEmptyEntries));

        Assert.True(ran.ExitCode == 64, ran.All);
        Assert.Contains(named, ran.Error, StringComparison.Ordinal);
        Assert.Contains("--help", ran.Error, StringComparison.Ordinal);
        Assert.Empty(ran.Output);
    }

    [Theory]
    [InlineData("", null, null, null)]
    [InlineData(" ", null, null, null)]
    [InlineData("a.ifc", "", null, null)]
    [InlineData("a.ifc", null, "", null)]
    [InlineData("a.ifc", null, null, "")]
    public void An_empty_path_is_wrong_usage(string model, string? forces, string? settings, string? output)
    {
        var failure = Assert.Throws<Failure>(() => ScreenRun.Execute(
            new ScreenRun.Options(model, forces is null ? [] : [forces], settings, null, output, null, false), TestContext.Current.CancellationToken));

        Assert.Equal(64, failure.ExitCode);
    }

    [Fact]
    public void A_cancelled_run_writes_nothing()
    {
        using var folder = new TemporaryFolder();
        using var source = new CancellationTokenSource();
        source.Cancel();
        var options = new ScreenRun.Options(Memberscan.Sample("mast-stays.ifc"), [], null, null, folder.Path, null, false);

        Assert.ThrowsAny<OperationCanceledException>(() => ScreenRun.Execute(options, source.Token));

        Assert.Empty(folder.Names);
    }

    [Fact]
    public async Task An_interrupted_run_ends_with_130_and_writes_nothing()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "no SIGINT to a single process on this system");
        using var folder = new TemporaryFolder();
        var (model, table) = Posts.Many(6000);
        var start = Memberscan.Start(["screen", folder.Write("posts.ifc", model), "--forces", folder.Write("posts.csv", table)]);
        using var process = Process.Start(start)!;
        var output = process.StandardOutput.ReadToEndAsync(TestContext.Current.CancellationToken);

        // The stages are lines on standard error; the checking of so many sections takes far longer than the signal.
        while (await process.StandardError.ReadLineAsync(TestContext.Current.CancellationToken) is { } line && line != "checking") { }
        using (var signal = Process.Start("kill", ["-INT", process.Id.ToString(CultureInfo.InvariantCulture)])) await signal.WaitForExitAsync(TestContext.Current.CancellationToken);
        var error = await process.StandardError.ReadToEndAsync(TestContext.Current.CancellationToken);
        await process.WaitForExitAsync(TestContext.Current.CancellationToken);

        Assert.Equal((130, ""), (process.ExitCode, await output));
        Assert.Contains("Interrupted; nothing was written.", error, StringComparison.Ordinal);
        Assert.Equal(["posts.csv", "posts.ifc"], folder.Names);
    }
}
