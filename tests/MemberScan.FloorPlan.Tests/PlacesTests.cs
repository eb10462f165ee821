using System.Text.RegularExpressions;

namespace MemberScan.FloorPlan.Tests;

/// <summary>No file names a folder of one machine or the address of a package registry.</summary>
public sealed class PlacesTests
{
    // The patterns are built from pieces so that this file does not match itself.
    private static readonly Regex s_folder = new(
        @"(?<![\w.)}\]*$-])/(?:wo" + "rk|ho" + @"me|ro" + "ot|Us" + @"ers)/\w", RegexOptions.CultureInvariant);

    private static readonly Regex s_drive = new(@"\b[C-Z]:\\+(?:Us" + @"ers|wo" + @"rk|dev|src)\\", RegexOptions.CultureInvariant | RegexOptions.IgnoreCase);

    private static readonly Regex s_registry = new(
        @"\b(?:nu" + @"get\.org|npm" + @"js\.(?:org|com)|ya" + @"rnpkg\.com|deb" + @"ian\.org|py" + @"pi\.org|pk" + @"gs\.dev\.azure\.com|pack" + @"ages\.microsoft\.com|arti" + @"factory)\b",
        RegexOptions.CultureInvariant | RegexOptions.IgnoreCase);

    [Fact]
    public void No_text_file_names_a_folder_of_a_machine_or_a_registry()
    {
        var faults = new List<string>();
        foreach (var file in SourceTree.Files.Where(IsText))
        {
            var lines = SourceTree.Text(file).Split('\n');
            faults.AddRange(lines.Select((line, i) => (line, i)).Where(l => IsFault(l.line)).Select(l => $"{file}:{l.i + 1}"));
        }

        Assert.True(SourceTree.Files.Count(IsText) > 50);
        Assert.Empty(faults);
    }

    [Theory]
    [InlineData("tests/web-ifc/package-lock.json")]
    [InlineData("tests/MemberScan.Browser.Tests/types/package-lock.json")]
    [InlineData("src/MemberScan.Reporting/Space/package-lock.json")]
    public void A_node_lock_file_holds_no_address(string file)
    {
        var text = SourceTree.Text(file);

        Assert.DoesNotContain("resolved", text, StringComparison.Ordinal);
        Assert.Contains("integrity", text, StringComparison.Ordinal);
    }

    [Fact]
    public void The_patterns_find_what_they_are_for()
    {
        string[] bad = ["see /wo" + "rk/project/x", "\"/ho" + "me/someone\"", "cd /ro" + "ot/x", @"C:\Us" + @"ers\someone", "https://api.nu" + "get.org/v3", "registry.npm" + "js.org"];
        string[] good = ["src/wo" + "rk/x", "$root/ho" + "me/x", "http://schemas.example.org/x", "the route/ro" + "ot/x", "/usr/bin/env bash"];

        Assert.All(bad, line => Assert.True(IsFault(line), line));
        Assert.All(good, line => Assert.False(IsFault(line), line));
    }

    private static bool IsFault(string line) => s_folder.IsMatch(line) || s_drive.IsMatch(line) || s_registry.IsMatch(line);

    private static bool IsText(string file)
    {
        using var stream = File.OpenRead(Path.Combine(SourceTree.Root, file));
        Span<byte> start = stackalloc byte[4096];
        var read = stream.ReadAtLeast(start, start.Length, throwOnEndOfStream: false);
        return !start[..read].Contains((byte)0);
    }
}
