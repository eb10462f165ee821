using System.Text;
using MemberScan.Inputs.Outlines;
using MemberScan.Inputs.Values;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Cli.Sections;

/// <summary>What the section command reads: the section as a text or an outline file, the forces of each situation.</summary>
internal static class SectionInput
{
    private const string OutlineKind = "outline ";

    /// <summary>The section of a text, or of <c>outline FILE</c>.</summary>
    public static CrossSection Section(string text)
    {
        var error = "";
        if (text.TrimStart().StartsWith(OutlineKind, StringComparison.OrdinalIgnoreCase))
        {
            var path = text.TrimStart()[OutlineKind.Length..].Trim();
            return OutlineText.TryParse(Content(path), Path.GetFileNameWithoutExtension(path), out var outline, out error) ? outline : throw Usage(error);
        }

        return SectionText.TryParse(text, out var section, out error) ? section : throw Usage(error);
    }

    /// <summary>The forces of all situations; one of no forces where none is given.</summary>
    public static SectionForces[] Situations(IEnumerable<string> texts)
    {
        var states = new List<SectionForces>();
        foreach (var text in texts.Where(text => text.Length > 0))
            states.Add(ForcesText.TryParse(text, out var forces, out var error) ? forces : throw Usage(error));
        return states.Count > 0 ? [.. states] : [default];
    }

    private static string Content(string path)
    {
        try
        {
            if (new FileInfo(path).Length > OutlineText.LongestText) throw Usage($"The outline file '{path}' is longer than {OutlineText.LongestText} bytes.");
            return File.ReadAllText(path, Encoding.UTF8);
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException or ArgumentException or NotSupportedException)
        {
            throw new Failure(ExitCodes.InputOutput, $"The outline file '{path}' cannot be read.", exception);
        }
    }

    private static Failure Usage(string message) => new(ExitCodes.Usage, message);
}
