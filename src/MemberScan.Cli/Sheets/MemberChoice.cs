using System.Collections.Immutable;
using MemberScan.Reporting.Display;
using MemberScan.Screening.Record;

namespace MemberScan.Cli.Sheets;

/// <summary>Finds the one candidate that a text names.</summary>
internal static class MemberChoice
{
    /// <summary>Most candidates that a message lists.</summary>
    public const int MostListed = 20;

    /// <summary>The candidate: by key, else by GlobalId, else by Tag, else by name, each letter for letter.</summary>
    /// <exception cref="Failure">None is named so, or several are; those are listed.</exception>
    public static MemberResult Of(ImmutableArray<MemberResult> members, string named)
    {
        foreach (var by in new Func<MemberResult, string>[] { m => m.Key, m => m.GlobalId, m => m.Tag, m => m.Name })
        {
            var found = members.Where(m => named.Length > 0 && by(m) == named).Take(MostListed + 1).ToList();
            if (found.Count == 1) return found[0];
            if (found.Count > 1) throw Ambiguous(found, named);
        }

        throw new Failure(ExitCodes.Usage, $"No candidate has the key, GlobalId, Tag or name '{ForeignText.Name(named)}'; 'memberscan members MODEL' lists them.");
    }

    private static Failure Ambiguous(List<MemberResult> found, string named)
    {
        var lines = found.Take(MostListed).Select(m => $"  {ForeignText.Name(m.Key)}  Tag '{ForeignText.Name(m.Tag)}'  '{ForeignText.Name(m.Name)}'");
        var more = found.Count > MostListed ? "\n  and more" : "";
        return new Failure(ExitCodes.Usage, $"'{ForeignText.Name(named)}' names several candidates; give the key of one:\n{string.Join('\n', lines)}{more}");
    }
}
