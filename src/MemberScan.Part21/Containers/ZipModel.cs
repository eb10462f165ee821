using System.IO.Compression;

namespace MemberScan.Part21.Containers;

/// <summary>The one model in a zip archive.</summary>
internal static class ZipModel
{
    private const int NamesInNote = 3;
    private const int LongestName = 80;

    public static (byte[] Bytes, string Note) Read(Stream file, string name, long maxBytes, int maxRatio)
    {
        try
        {
            using var archive = new ZipArchive(file, ZipArchiveMode.Read, leaveOpen: true);
            var entry = FindModel(archive, name, out var ignored);
            if (entry.IsEncrypted) throw new RefusedContainer($"The model in {name} is encrypted; give it without a password.");

            using var packed = entry.Open();
            var packedLength = Math.Min(entry.CompressedLength, file.Length);
            var bytes = Expansion.Unpack(packed, packedLength, maxBytes, maxRatio, name);
            if (bytes.Length != entry.Length || Checksum.Of(bytes) != entry.Crc32) throw Damaged(name);

            return (bytes, Note(name, entry, ignored));
        }
        catch (Exception fault) when (fault is InvalidDataException or NotSupportedException or ArgumentException or OverflowException or EndOfStreamException)
        {
            throw Damaged(name);
        }
    }

    private static ZipArchiveEntry FindModel(ZipArchive archive, string name, out List<string> ignored)
    {
        ignored = [];
        var models = new List<ZipArchiveEntry>();
        var otherEncoding = false;
        foreach (var entry in archive.Entries)
        {
            if (entry.FullName.EndsWith('/')) continue;

            // Some archivers add a shadow of every file under this folder, with the same ending.
            var isShadow = entry.FullName.StartsWith("__MACOSX/", StringComparison.Ordinal);
            if (!isShadow && entry.Name.EndsWith(".ifc", StringComparison.OrdinalIgnoreCase)) models.Add(entry);
            else ignored.Add(Shown(entry.FullName));
            otherEncoding |= entry.Name.EndsWith(".ifcxml", StringComparison.OrdinalIgnoreCase);
        }

        if (models.Count == 1) return models[0];
        if (models.Count > 1) throw new RefusedContainer($"{name} holds {models.Count} models ({Shown(models[0].FullName)}, {Shown(models[1].FullName)}); pack one only.");
        throw new RefusedContainer(otherEncoding
            ? $"{name} holds ifcXML, which is not read; export the model as IFC-SPF (.ifc)."
            : $"{name} holds no file that ends in .ifc; pack the model itself.");
    }

    private static string Note(string name, ZipArchiveEntry entry, List<string> ignored)
    {
        var note = $"out of {name}, file {Shown(entry.FullName)}";
        if (ignored.Count == 0) return note;

        var more = ignored.Count > NamesInNote ? $" and {ignored.Count - NamesInNote} more" : "";
        return $"{note}; not read: {string.Join(", ", ignored.Take(NamesInNote))}{more}";
    }

    // Names in an archive are anyone's text: no control characters, no endless ones.
    private static string Shown(string entryName)
    {
        var shown = new string([.. entryName.Take(LongestName).Select(c => char.IsControl(c) || char.IsSurrogate(c) ? '?' : c)]);
        return entryName.Length > LongestName ? shown + "…" : shown;
    }

    private static RefusedContainer Damaged(string name) => new($"{name} is a damaged zip archive; pack or fetch it again.");
}
