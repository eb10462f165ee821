using MemberScan.Part21.Findings;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21.Reading;

/// <summary>Reads the header section into its entries; entries it does not know are kept as they are.</summary>
internal sealed class HeaderReader(FindingLog log, ParameterScanner parameters)
{
    // A header has three entries and a few more in later editions; the rest of a longer one is of no use.
    private const int MaxEntries = 1000;

    private readonly List<HeaderEntry> _entries = [];

    public IReadOnlyList<HeaderEntry> Entries => _entries;

    /// <summary>Reads from behind <c>HEADER;</c>.</summary>
    /// <returns>Where reading goes on.</returns>
    public int Read(ReadOnlySpan<byte> text, int at)
    {
        while (true)
        {
            var next = Blanks.Skip(text, at);
            if (next < 0)
            {
                log.Tell(FindingKinds.UnterminatedComment, ~next);
                return AfterBrokenEntry(text, ~next + 2);
            }

            at = next;
            if (at == text.Length) return at;
            if (Words.Stands(text, at, "ENDSEC"u8)) return AfterSemicolon(text, at + "ENDSEC".Length);
            if (Words.Stands(text, at, "DATA"u8) || Words.Stands(text, at, "END-ISO-10303-21"u8))
            {
                log.Tell(FindingKinds.EndOfSectionMissing, at);
                return at;
            }

            if (!TryEntry(text, ref at))
            {
                log.Tell(FindingKinds.HeaderDamaged, next);
                at = AfterBrokenEntry(text, at);
            }
        }
    }

    /// <summary>Tells if one of the three entries that every header has is missing.</summary>
    public void TellMissing()
    {
        foreach (var keyword in (ReadOnlySpan<string>)["FILE_DESCRIPTION", "FILE_NAME", "FILE_SCHEMA"])
        {
            if (!_entries.Exists(e => e.Keyword == keyword)) log.Tell(FindingKinds.HeaderIncomplete, -1);
        }
    }

    // HEADER_ENTITY = KEYWORD "(" [ PARAMETER_LIST ] ")" ";"
    private bool TryEntry(ReadOnlySpan<byte> text, ref int at)
    {
        var start = at;
        if (!Words.Begins(text[at])) return false;

        var wordEnd = Words.End(text, at);
        var bracket = Blanks.Skip(text, wordEnd);
        if (bracket < 0 || bracket == text.Length || text[bracket] != '(') return false;

        var entry = text[start..];
        var end = bracket + 1 - start;
        if (!parameters.TryScan(entry, ref end, start, 0, 0, out var fault))
        {
            at = start + Math.Max(fault.ResumeFrom, 1);
            return false;
        }

        if (_entries.Count < MaxEntries) _entries.Add(new HeaderEntry(Words.Upper(text[start..wordEnd]), bracket + 1, start + end - bracket - 2));
        at = AfterSemicolon(text, start + end);
        return true;
    }

    private int AfterSemicolon(ReadOnlySpan<byte> text, int at)
    {
        var next = Blanks.Skip(text, at);
        if (next >= 0 && next < text.Length && text[next] == ';') return next + 1;

        log.Tell(FindingKinds.SemicolonMissing, at);
        return at;
    }

    // Behind the next semicolon that ends a line: one within a string of the header rarely does.
    private static int AfterBrokenEntry(ReadOnlySpan<byte> text, int at)
    {
        while (true)
        {
            var hop = text[at..].IndexOf((byte)';');
            if (hop < 0) return text.Length;

            at += hop + 1;
            var next = at;
            while (next < text.Length && Blanks.IsBlank(text[next]) && text[next] is not ((byte)'\n' or (byte)'\r')) next++;
            if (next == text.Length || text[next] is (byte)'\n' or (byte)'\r' or (byte)'/') return next;
            if (Words.Begins(text[next])) return next;
        }
    }
}
