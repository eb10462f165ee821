using System.Buffers;
using MemberScan.Part21.Findings;
using MemberScan.Part21.Index;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21.Reading;

/// <summary>Tells each reference to an instance that does not exist.</summary>
internal static class DanglingReferences
{
    private static readonly SearchValues<byte> s_stops = SearchValues.Create("#'/"u8);

    /// <remarks>A second pass over the text, made only when the marks show that there is such a reference.</remarks>
    public static void Tell(SourceText source, InstanceTable instances, ReferenceMarks marks, FindingLog log)
    {
        if (marks.AllFoundIn(instances.Ids)) return;

        for (var i = 0; i < instances.Count; i++)
        {
            ref readonly var row = ref instances[i];
            if ((row.Flags & InstanceFlags.Damaged) == 0) Tell(source, instances.Ids, row, log);
        }
    }

    private static void Tell(SourceText source, IdIndex ids, in InstanceRow row, FindingLog log)
    {
        var text = source.Slice(row.Start, row.Length);
        var at = 1;
        while (true)
        {
            var hop = text[at..].IndexOfAny(s_stops);
            if (hop < 0) return;

            at += hop;
            if (text[at] == '\'')
            {
                at = StringToken.End(text, at);
            }
            else if (text[at] == '/')
            {
                at = Math.Max(at + 1, Blanks.Skip(text, at));
            }
            else
            {
                var hash = at++;
                if (Numerals.TryRead(text, ref at, out var id) && !ids.TryFind(id, out _)) log.Tell(FindingKinds.Dangling, row.Start + hash, row.Id);
            }

            if (at < 0) return;
        }
    }
}
