using System.Text.RegularExpressions;
using MemberScan.Cli.Tests.Screening;
using MemberScan.Model.Verdicts;

namespace MemberScan.Cli.Tests;

/// <summary>Words of a blessing or of a verdict on a design never stand in what the program says.</summary>
public sealed partial class PublicWordsTests
{
    [Fact]
    public void No_text_in_the_source_uses_them()
    {
        var sources = new[] { "src", "config" }.SelectMany(folder => Directory.EnumerateFiles(Path.Combine(Memberscan.Root, folder), "*", SearchOption.AllDirectories))
            .Where(f => Path.GetExtension(f) is ".cs" or ".razor" or ".json" && !f.Split(Path.DirectorySeparatorChar).Any(part => part is "bin" or "obj")).ToArray();

        var found = sources.SelectMany(f => Texts(f).Where(t => Unwanted().IsMatch(t)).Select(t => $"{Path.GetFileName(f)}: {t}"));

        Assert.True(sources.Length > 100);
        Assert.Empty(found);
    }

    [Fact]
    public void No_request_to_the_modeler_uses_them() =>
        Assert.All(Enum.GetValues<ReasonCode>(), code => Assert.DoesNotMatch(Unwanted(), code.Request()));

    [Theory]
    [InlineData("--help")]
    [InlineData("screen --help")]
    [InlineData("section --help")]
    [InlineData("settings --help")]
    [InlineData("settings --explain")]
    public async Task No_help_text_uses_them(string arguments)
    {
        var ran = await Memberscan.Run(arguments.Split(' '));

        Assert.True(ran.ExitCode == 0, ran.All);
        Assert.DoesNotMatch(Unwanted(), ran.Output);
    }

    [Theory]
    [MemberData(nameof(ScreenedSample.Samples), MemberType = typeof(ScreenedSample))]
    public async Task No_output_of_a_sample_uses_them(string name, int code)
    {
        var sample = await ScreenedSample.Of(name);

        Assert.True(code == sample.Ran.ExitCode, sample.Ran.All);
        var texts = new[] { sample.Ran.Output, sample.Ran.Error, sample.Report, System.Text.Encoding.UTF8.GetString(sample.Csv), System.Text.Encoding.UTF8.GetString(sample.RunJson), System.Text.Encoding.UTF8.GetString(sample.Checked) };
        Assert.All(texts, text => Assert.DoesNotMatch(Unwanted(), text));
        Assert.Contains("A screening aid for qualified engineers; not a design, not a certificate.", sample.Ran.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("approved", true)]
    [InlineData("it is Safe", true)]
    [InlineData("fails code", true)]
    [InlineData("code-compliant", true)]
    [InlineData("unsafe relaxed, safeguard, disapproved", false)]
    public void The_pattern_finds_what_it_is_for(string text, bool found) => Assert.Equal(found, Unwanted().IsMatch(text));

    // Whole files, but of C# only what stands in quotes: remarks on threads are no output.
    private static IEnumerable<string> Texts(string file) =>
        Path.GetExtension(file) == ".cs" ? File.ReadLines(file).Where(l => !l.TrimStart().StartsWith("//", StringComparison.Ordinal)).SelectMany(l => Quoted().Matches(l).Select(m => m.Value)) : File.ReadLines(file);

    [GeneratedRegex(@"\b(approved|safe|safely|compliant|compliance|fails? (the )?code)\b", RegexOptions.IgnoreCase)]
    private static partial Regex Unwanted();

    [GeneratedRegex("\"[^\"]*\"")]
    private static partial Regex Quoted();
}
