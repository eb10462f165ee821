using MemberScan.Part21.Index;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21.Records;

/// <summary>What is known of one instance, and where its text stands.</summary>
/// <param name="Id">The number after '#'.</param>
/// <param name="Keyword">In upper case; empty if complex or lost.</param>
/// <param name="Flags">What is known of it.</param>
/// <param name="Source">Text that holds it: the whole file's, or its own.</param>
/// <param name="Start">Offset of its '#' in the file [byte].</param>
/// <param name="Length">From '#' to ';' [byte].</param>
internal readonly record struct RecordText(ulong Id, string Keyword, InstanceFlags Flags, SourceText Source, long Start, int Length)
{
    /// <summary>From '#' to ';'.</summary>
    public ReadOnlySpan<byte> Text => Source.Slice(Start, Length);
}
