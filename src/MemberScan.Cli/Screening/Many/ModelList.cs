using System.Text;
using System.Text.RegularExpressions;

namespace MemberScan.Cli.Screening.Many;

/// <summary>Models by name, folder or pattern, in the order given; those of a folder or pattern in the order of their paths by code points.</summary>
internal static class ModelList
{
    /// <summary>Most models of one run; more belong into a queue.</summary>
    public const int MostModels = 100_000;

    private static readonly string[] s_endings = [".ifc", ".ifczip", ".ifc.gz"];

    // What this program writes: never an input of a run over a folder.
    private static readonly string[] s_ours = [".checked.ifc", ".restored.ifc"];

    private static readonly EnumerationOptions s_below = new() { RecurseSubdirectories = true, AttributesToSkip = FileAttributes.ReparsePoint, MatchType = MatchType.Simple };

    /// <summary>Whether an argument is a folder or a pattern rather than the name of a file.</summary>
    public static bool IsSeveral(string argument) => !File.Exists(argument) && (Directory.Exists(argument) || argument.AsSpan().ContainsAny('*', '?'));

    /// <summary>The models of the arguments, each once.</summary>
    /// <exception cref="Failure">An argument is empty or finds no model, a folder may not be read, or there are too many.</exception>
    public static IReadOnlyList<FoundModel> Of(IEnumerable<string> arguments)
    {
        var found = new List<FoundModel>();
        var met = new HashSet<string>(StringComparer.Ordinal);
        foreach (var argument in arguments)
        {
            if (string.IsNullOrWhiteSpace(argument)) throw new Failure(ExitCodes.Usage, "A path is empty; give models, folders or patterns.");

            var models = IsSeveral(argument) ? Matching(argument) : [new FoundModel(argument, "")];
            if (models.Count == 0) throw new Failure(ExitCodes.Usage, $"'{argument}' finds no model (.ifc, .ifczip or .ifc.gz; *.checked.ifc and *.restored.ifc are passed over in folders and patterns).");

            foreach (var model in models)
                if (met.Add(Path.GetFullPath(model.Path))) found.Add(model);
            if (found.Count > MostModels) throw new Failure(ExitCodes.Usage, $"There are more than {MostModels} models; screen them in parts.");
        }

        return found;
    }

    private static List<FoundModel> Matching(string argument)
    {
        var (root, pattern) = Directory.Exists(argument) ? (argument, null) : Split(argument);
        if (!Directory.Exists(root)) return [];

        try
        {
            return
            [
                .. Directory.EnumerateFiles(root, "*", s_below).Take(50 * MostModels).Select(path => (Path: path, Inner: Path.GetRelativePath(root, path).Replace('\\', '/')))
                    .Where(f => pattern?.IsMatch(f.Inner) ?? true).Where(f => Ends(f.Path, s_endings) && !Ends(f.Path, s_ours))
                    .OrderBy(f => f.Inner, StringComparer.Ordinal).Select(f => new FoundModel(f.Path, Path.GetDirectoryName(f.Inner) ?? "")),
            ];
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            throw new Failure(ExitCodes.InputOutput, $"The folder '{root}' cannot be read: {e.Message}", e);
        }
    }

    private static bool Ends(string path, string[] endings) => endings.Any(ending => path.EndsWith(ending, StringComparison.OrdinalIgnoreCase));

    /// <summary>The folder before the first part with a wildcard, and a pattern for what stands below it.</summary>
    private static (string Root, Regex Pattern) Split(string argument)
    {
        var parts = argument.Split(Path.DirectorySeparatorChar);
        var first = Array.FindIndex(parts, p => p.AsSpan().ContainsAny('*', '?'));
        var root = string.Join(Path.DirectorySeparatorChar, parts[..first]);
        if (root.Length == 0) root = first > 0 ? Path.DirectorySeparatorChar.ToString() : ".";
        return (root, PatternOf(parts.AsSpan(first)));
    }

    // '*' and '?' stay within a part; '**' as a part stands for any number of folders.
    private static Regex PatternOf(ReadOnlySpan<string> parts)
    {
        var pattern = new StringBuilder("^");
        for (var i = 0; i < parts.Length; i++)
        {
            if (parts[i] == "**") pattern.Append(i == parts.Length - 1 ? ".*" : "(?:[^/]+/)*");
            else pattern.Append(Regex.Escape(parts[i]).Replace(@"\*", "[^/]*", StringComparison.Ordinal).Replace(@"\?", "[^/]", StringComparison.Ordinal)).Append(i == parts.Length - 1 ? "" : "/");
        }

        return new Regex(pattern.Append('$').ToString(), RegexOptions.CultureInvariant | RegexOptions.NonBacktracking);
    }
}
