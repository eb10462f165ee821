using MemberScan.Foundation.Diagnostics;
using MemberScan.Part21.Index;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21;

/// <summary>One instance such as <c>#12=IFCBEAM(…)</c>: a small handle, free to copy; the default value is no instance.</summary>
public readonly record struct Part21Record
{
    private readonly Part21File? _file;

    // Row in the table of a text held in memory, offset of one that stays on disk.
    private readonly long _place;

    internal Part21Record(Part21File file, long place) => (_file, _place) = (file, place);

    internal long Place => _place;

    /// <summary>The number after '#'; 0 for the default value.</summary>
    public ulong Id => _file is null ? 0 : _file.TextOf(_place).Id;

    /// <summary>The keyword in upper case; empty for a complex instance and for a damaged one whose keyword is lost.</summary>
    public string Keyword => _file is null ? "" : _file.TextOf(_place).Keyword;

    /// <summary>Whether the instance is of the external mapping <c>#1=(A(…)B(…))</c>; it then has no arguments here.</summary>
    public bool IsComplex => Has(InstanceFlags.Complex);

    /// <summary>Whether its arguments cannot be told apart; they then read as absent.</summary>
    public bool IsDamaged => Has(InstanceFlags.Damaged);

    /// <summary>Whether an instance further up has the same number; references lead to that one.</summary>
    public bool IsDuplicate => _file is not null && _file.IsDuplicate(_place);

    /// <summary>Number of arguments.</summary>
    public int ArgumentCount
    {
        get
        {
            var count = 0;
            for (var list = new ParameterList(ArgumentText(out _, out _)); list.MoveNext();) count++;
            return count;
        }
    }

    /// <summary>All arguments in order, found in one pass; none where they cannot be told apart.</summary>
    public IReadOnlyList<Part21Value> Arguments()
    {
        var length = ArgumentText(out var source, out var start).Length;
        return length == 0 ? [] : Part21Value.All(source!, start, length);
    }

    /// <summary>An argument by its index from 0; a value of kind <see cref="Part21ValueKind.Absent"/> beyond the last.</summary>
    /// <remarks>The arguments before it are passed over each time.</remarks>
    public Part21Value this[int index]
    {
        get
        {
            ArgumentOutOfRangeException.ThrowIfNegative(index);
            var list = new ParameterList(ArgumentText(out var source, out var start));
            for (var i = 0; list.MoveNext(); i++)
            {
                if (i == index) return new Part21Value(source!, start + list.Start, list.End - list.Start, list.Kind);
            }

            return default;
        }
    }

    /// <summary>From '#' to ';', both included; a damaged instance reaches to where reading went on.</summary>
    public ReadOnlySpan<byte> Text => _file is null ? default : _file.TextOf(_place).Text;

    /// <summary>Where it stands.</summary>
    public SourceSpan Span
    {
        get
        {
            if (_file is null) return new SourceSpan("", -1, 0, 0, 0);

            var record = _file.TextOf(_place);
            return _file.SpanAt(record.Start, record.Id);
        }
    }

    private bool Has(InstanceFlags flag) => _file is not null && (_file.TextOf(_place).Flags & flag) != 0;

    // What stands between the brackets, and its offset in the file.
    private ReadOnlySpan<byte> ArgumentText(out SourceText? source, out long start)
    {
        start = 0;
        source = null;
        if (_file is null) return default;

        var record = _file.TextOf(_place);
        if ((record.Flags & (InstanceFlags.Damaged | InstanceFlags.Complex)) != 0) return default;

        source = record.Source;
        var text = record.Text;
        var numberEnd = 1;
        _ = Numerals.TryRead(text, ref numberEnd, out _);
        var word = Blanks.Skip(text, Blanks.Skip(text, numberEnd) + 1);
        var bracket = Blanks.Skip(text, Words.End(text, word));
        var end = Brackets.End(text, bracket);
        start = record.Start + bracket + 1;
        return text[(bracket + 1)..(end - 1)];
    }
}
