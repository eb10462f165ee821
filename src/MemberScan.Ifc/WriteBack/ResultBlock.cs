using System.Buffers;
using System.Security.Cryptography;
using System.Text;
using MemberScan.Part21.Containers;

namespace MemberScan.Ifc.WriteBack;

/// <summary>The block of instances that this program appends to a model, between two comments just before the last <c>ENDSEC</c>.</summary>
public static class ResultBlock
{
    private const string Begin = "/* MemberScan block 1 sha256=";
    private const string End = "/* MemberScan block end */";
    private const int HashLength = 64;

    // The words of a mark inside a string of the block would be taken for the mark; the escape decodes to the same text.
    internal const string OpeningWords = "/* MemberScan block";
    private const string EscapedOpeningWords = @"\X2\002F\X0\* MemberScan block";

    /// <summary>What stripping found.</summary>
    /// <param name="Base">The text without a block of ours; the text itself when it has none.</param>
    /// <param name="HadBlock">Whether there was a block.</param>
    /// <param name="IsIntact">Whether the text without it still has the hash that the block names.</param>
    public readonly record struct Stripped(ReadOnlyMemory<byte> Base, bool HadBlock, bool IsIntact);

    /// <summary>Takes a block of ours out of a text.</summary>
    public static Stripped Strip(ReadOnlyMemory<byte> text)
    {
        var bytes = text.Span;

        // Only where the closing ENDSEC follows is it the block; the same words in a string are content.
        var end = EndOfBlock(bytes);
        if (end < 0) return new Stripped(text, false, true);

        var begin = bytes[..end].LastIndexOf(Encoding.ASCII.GetBytes(Begin));
        if (begin < 0) return new Stripped(text, false, true);

        var stripped = new byte[bytes.Length - (end - begin)];
        bytes[..begin].CopyTo(stripped);
        bytes[end..].CopyTo(stripped.AsSpan(begin));
        var declared = Encoding.ASCII.GetString(bytes.Slice(begin + Begin.Length, Math.Min(HashLength, bytes.Length - begin - Begin.Length)));
        return new Stripped(stripped, true, string.Equals(declared, Sha256(stripped), StringComparison.Ordinal));
    }

    // Offset behind the end mark and its line end, where ENDSEC follows; −1 if nowhere.
    private static int EndOfBlock(ReadOnlySpan<byte> bytes)
    {
        var mark = Encoding.ASCII.GetBytes(End);
        for (var rest = bytes; rest.LastIndexOf(mark) is var at and >= 0; rest = rest[..at])
        {
            var end = at + mark.Length;
            if (bytes[end..].StartsWith("\r\n"u8)) end += 2;
            else if (bytes[end..].StartsWith("\n"u8) || bytes[end..].StartsWith("\r"u8)) end += 1;

            var next = bytes.Slice(end, Math.Min(6, bytes.Length - end));
            if (Ascii.EqualsIgnoreCase(next, "ENDSEC"u8)) return end;
        }

        return -1;
    }

    /// <summary>Where the last block stands, also when other lines follow it: from its opening comment to behind its last line end; null when there is none.</summary>
    internal static Range? Locate(ReadOnlySpan<byte> text) => BlockMarks.Find(text, Encoding.ASCII.GetBytes(Begin), Encoding.ASCII.GetBytes(End));

    /// <summary>The hash that a block names.</summary>
    internal static string DeclaredHash(ReadOnlySpan<byte> text, Range block)
    {
        var rest = text[block][Begin.Length..];
        return Encoding.ASCII.GetString(rest[..Math.Min(HashLength, rest.Length)]);
    }

    /// <summary>The two comments around a block, each with its line end.</summary>
    internal static Range[] MarksOf(ReadOnlySpan<byte> text, Range block)
    {
        var begin = block.Start.Value;
        var opening = begin + text[begin..].IndexOf("*/"u8) + 2;
        var closing = begin + text[block].LastIndexOf(Encoding.ASCII.GetBytes(End));
        return [begin..BlockMarks.LineEnd(text, opening), closing..block.End.Value];
    }

    /// <summary>SHA-256 in lower-case hexadecimal.</summary>
    public static string Sha256(ReadOnlySpan<byte> bytes) => Convert.ToHexStringLower(SHA256.HashData(bytes));

    /// <summary>Writes a text with a block before the <c>E</c> of its last <c>ENDSEC</c>; nothing else changes.</summary>
    /// <param name="output">Receives the text.</param>
    /// <param name="baseText">The text without a block.</param>
    /// <param name="insertionOffset">Offset of that <c>E</c>.</param>
    /// <param name="lines">Instances, one per line, without line ends.</param>
    /// <param name="lineEnd">Line end of the text.</param>
    public static void Write(IBufferWriter<byte> output, ReadOnlySpan<byte> baseText, long insertionOffset, IEnumerable<string> lines, string lineEnd)
    {
        ArgumentNullException.ThrowIfNull(output);
        ArgumentNullException.ThrowIfNull(lines);
        ArgumentOutOfRangeException.ThrowIfNegative(insertionOffset);
        var at = checked((int)insertionOffset);
        output.Write(baseText[..at]);
        foreach (var line in Block(Sha256(baseText), lines))
        {
            output.Write(Encoding.ASCII.GetBytes(line));
            output.Write(Encoding.ASCII.GetBytes(lineEnd));
        }

        output.Write(baseText[at..]);
    }

    /// <summary>As <see cref="Write(IBufferWriter{byte}, ReadOnlySpan{byte}, long, IEnumerable{string}, string)"/>, to a file; a text on disk is not held in memory.</summary>
    /// <param name="output">Receives the text.</param>
    /// <param name="baseText">The text without a block.</param>
    /// <param name="sha256">SHA-256 of the text without a block.</param>
    /// <param name="insertionOffset">Offset of that <c>E</c>.</param>
    /// <param name="lines">Instances, one per line, without line ends.</param>
    /// <param name="lineEnd">Line end of the text.</param>
    public static void Write(FileStream output, ModelText baseText, string sha256, long insertionOffset, IEnumerable<string> lines, string lineEnd)
    {
        ArgumentNullException.ThrowIfNull(output);
        ArgumentNullException.ThrowIfNull(baseText);
        ArgumentNullException.ThrowIfNull(lines);
        ArgumentOutOfRangeException.ThrowIfNegative(insertionOffset);
        baseText.CopyTo(0, insertionOffset, output);
        foreach (var line in Block(sha256, lines))
        {
            output.Write(Encoding.ASCII.GetBytes(line));
            output.Write(Encoding.ASCII.GetBytes(lineEnd));
        }

        baseText.CopyTo(insertionOffset, baseText.Length, output);
    }

    private static IEnumerable<string> Block(string sha256, IEnumerable<string> lines) =>
        lines.Select(line => line.Replace(OpeningWords, EscapedOpeningWords, StringComparison.Ordinal)).Prepend($"{Begin}{sha256} */").Append(End);
}
