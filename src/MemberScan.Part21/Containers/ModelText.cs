using System.Security.Cryptography;
using MemberScan.Part21.Edits;
using MemberScan.Part21.Sources;
using Microsoft.Win32.SafeHandles;

namespace MemberScan.Part21.Containers;

/// <summary>The text of a model: held in memory, or left on disk where it is large.</summary>
/// <remarks>Safe for several threads. A file that stays on disk must not change while it is open; one that became shorter is told by an <see cref="IOException"/>.</remarks>
public sealed class ModelText : IDisposable
{
    /// <summary>Longest plain file that is held in memory [byte]; archives always are.</summary>
    public const long LongestHeld = 64L << 20;

    private const int WindowLength = 4 << 20;

    private readonly SafeFileHandle? _file;
    private readonly ReadOnlyMemory<byte> _held;

    private ModelText(string name, string note, ReadOnlyMemory<byte> held)
    {
        (Name, Note, _held) = (name, note, held);
        Source = new MemorySource(held);
    }

    private ModelText(string name, SafeFileHandle file)
    {
        (Name, Note, _file) = (name, "", file);
        Source = new FileSource(file);
    }

    /// <summary>Name of the file, without folder.</summary>
    public string Name { get; }

    /// <summary>"out of x.ifczip" for a text out of an archive; empty for a plain file.</summary>
    public string Note { get; }

    /// <summary>Length of the text [byte].</summary>
    public long Length => Source.Length;

    /// <summary>Whether the text stays on disk.</summary>
    public bool IsOnDisk => _file is not null;

    /// <summary>The text in memory.</summary>
    /// <exception cref="InvalidOperationException">It stays on disk.</exception>
    public ReadOnlyMemory<byte> Held => IsOnDisk ? throw new InvalidOperationException($"The text of {Name} stays on disk.") : _held;

    internal ByteSource Source { get; }

    /// <summary>A text in memory.</summary>
    /// <param name="text">The whole text.</param>
    /// <param name="name">Name of its file, without folder.</param>
    /// <param name="note">Note about the container that it came out of.</param>
    public static ModelText Of(ReadOnlyMemory<byte> text, string name, string note = "")
    {
        ArgumentNullException.ThrowIfNull(name);
        ArgumentNullException.ThrowIfNull(note);
        return new ModelText(name, note, text);
    }

    /// <summary>Opens a model file, or takes the one model out of an archive.</summary>
    /// <param name="path">Path of the file.</param>
    /// <param name="longestHeld">Longest plain file that is held in memory [byte].</param>
    /// <exception cref="InvalidDataException">As <see cref="ModelContainer.Read(string)"/>, or a plain file is longer than <see cref="Part21Index.MaxBytes"/>.</exception>
    /// <exception cref="IOException">The file cannot be read.</exception>
    public static ModelText Open(string path, long longestHeld = LongestHeld)
    {
        ArgumentException.ThrowIfNullOrEmpty(path);
        var name = Path.GetFileName(path);
        var text = new ModelText(name, Handle(path));
        try
        {
            if (text.Length <= longestHeld || ModelContainer.IsArchive(path))
            {
                text.Dispose();
                var (bytes, note) = ModelContainer.Read(path);
                return new ModelText(name, note, bytes);
            }

            Part21Index.RefuseTooLong(text.Length, name);
            ModelContainer.RefuseForeign(text.Source, name);
            return text;
        }
        catch
        {
            text.Dispose();
            throw;
        }
    }

    /// <summary>The same text in memory.</summary>
    /// <exception cref="InvalidDataException">It is longer than <see cref="ModelContainer.MaxModelBytes"/>.</exception>
    public ModelText ToHeld()
    {
        if (!IsOnDisk) return this;
        if (Length > ModelContainer.MaxModelBytes)
            throw new InvalidDataException($"{Name} has {Length} bytes and holds results of an earlier run; above {ModelContainer.MaxModelBytes} bytes these are not taken out. Start from the model without results.");

        var bytes = new byte[Length];
        _ = Source.Read(0, bytes);
        return new ModelText(Name, Note, bytes);
    }

    /// <summary>SHA-256 of the text in lower-case hexadecimal.</summary>
    public string Sha256()
    {
        if (!IsOnDisk) return Convert.ToHexStringLower(SHA256.HashData(_held.Span));

        using var hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
        var window = new byte[WindowLength];
        for (var at = 0L; at < Length;)
        {
            var count = Source.Read(at, window);
            hash.AppendData(window, 0, count);
            at += count;
        }

        return Convert.ToHexStringLower(hash.GetHashAndReset());
    }

    /// <summary>Whether any of some byte strings stands in the text, also inside strings and comments of it.</summary>
    /// <param name="words">Each not empty.</param>
    public bool Contains(params IReadOnlyList<byte[]> words)
    {
        ArgumentNullException.ThrowIfNull(words);
        var overlap = words.Max(w => w.Length) - 1;
        var found = 0;
        Parallel.For(0L, (Length + WindowLength - 1) / WindowLength, () => new byte[WindowLength + overlap], (number, state, window) =>
        {
            var part = window.AsSpan(0, Source.Read(number * WindowLength, window));
            foreach (var word in words)
            {
                if (part.IndexOf(word) < 0) continue;

                Interlocked.Exchange(ref found, 1);
                state.Stop();
            }

            return window;
        }, _ => { });
        return found != 0;
    }

    /// <summary>Writes a stretch of the text behind what a file holds; from file to file within the kernel where that can be.</summary>
    /// <param name="from">First byte.</param>
    /// <param name="until">Behind the last byte.</param>
    /// <param name="output">The file; its position moves on.</param>
    public void CopyTo(long from, long until, FileStream output)
    {
        ArgumentNullException.ThrowIfNull(output);
        ArgumentOutOfRangeException.ThrowIfNegative(from);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(until, Length);
        output.Flush();
        var position = output.Position;
        if (_file is not null) KernelCopy.Copy(_file, ref from, until, output.SafeFileHandle, ref position);
        output.Position = position;

        var window = from < until ? new byte[(int)Math.Min(WindowLength, until - from)] : [];
        while (from < until)
        {
            var part = window.AsSpan(0, Source.Read(from, window.AsSpan(0, (int)Math.Min(window.Length, until - from))));
            if (part.IsEmpty) throw new IOException($"{Name} became shorter while it was read.");

            output.Write(part);
            from += part.Length;
        }
    }

    /// <inheritdoc />
    public void Dispose() => _file?.Dispose();

    private static SafeFileHandle Handle(string path)
    {
        try
        {
            return File.OpenHandle(path, options: FileOptions.RandomAccess);
        }
        catch (UnauthorizedAccessException fault)
        {
            throw new IOException(fault.Message, fault);
        }
    }
}
