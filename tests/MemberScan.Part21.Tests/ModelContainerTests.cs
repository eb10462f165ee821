using System.IO.Compression;
using System.Text;
using MemberScan.OpenModels;
using MemberScan.Part21.Containers;

namespace MemberScan.Part21.Tests;

public sealed class ModelContainerTests : IDisposable
{
    private static readonly byte[] s_model = Encoding.ASCII.GetBytes(Sample.Model("#1=POST('landing');"));

    private readonly DirectoryInfo _folder = Directory.CreateTempSubdirectory("memberscan-");

    public void Dispose() => _folder.Delete(recursive: true);

    [Fact]
    public void A_plain_file_comes_as_it_is()
    {
        var (bytes, note) = ModelContainer.Read(Write("landing.ifczip", s_model));

        Assert.Equal(s_model, bytes);
        Assert.Equal("", note);
    }

    [Fact]
    public void The_one_model_of_a_zip_is_read_and_the_rest_named()
    {
        var zip = Zip(("docs/", null), ("docs/read me.txt", "x"u8.ToArray()), ("inner/Landing.IFC", s_model), ("__MACOSX/._Landing.ifc", [0, 5]), ("a.png", [1]), ("b.png", [2]));

        var (bytes, note) = ModelContainer.Read(Write("landing.ifc", zip));

        Assert.Equal(s_model, bytes);
        Assert.Equal("out of landing.ifc, file inner/Landing.IFC; not read: docs/read me.txt, __MACOSX/._Landing.ifc, a.png and 1 more", note);
    }

    [Fact]
    public void A_gzip_is_unpacked()
    {
        var (bytes, note) = ModelContainer.Read(Write("landing.ifc.gz", Gzip(s_model)));

        Assert.Equal(s_model, bytes);
        Assert.Equal("out of landing.ifc.gz", note);
    }

    [Fact]
    public void Two_models_in_one_zip_are_refused()
    {
        AssertRefused(Zip(("a.ifc", s_model), ("b.ifc", s_model)), "holds 2 models");
    }

    [Fact]
    public void A_zip_without_a_model_is_refused()
    {
        AssertRefused(Zip(("a.txt", s_model)), "no file that ends in .ifc");
        AssertRefused(Zip(), "no file that ends in .ifc");
        AssertRefused(Zip(("a.ifcxml", s_model)), "holds ifcXML");
    }

    [Fact]
    public void An_encrypted_model_is_refused()
    {
        var zip = Zip(("a.ifc", s_model));
        zip[6] |= 1;                                                       // APPNOTE.TXT 4.4.4: bit 0 of the general purpose flag, in the local header
        zip[zip.AsSpan().IndexOf("PK\u0001\u0002"u8) + 8] |= 1;            // and in the central directory

        AssertRefused(zip, "is encrypted");
    }

    [Fact]
    public void A_damaged_archive_is_refused()
    {
        var packed = new byte[4000];
        new Random(21).NextBytes(packed);
        var zip = Zip(("a.ifc", packed));

        AssertRefused(zip[..^30], "damaged zip");
        AssertRefused(Flip(zip, 1000), "damaged zip");
        AssertRefused("PK\u0003\u0004"u8.ToArray(), "damaged zip");

        var gzip = Gzip(packed);
        AssertRefused(gzip[..^9], "damaged gzip");
        AssertRefused(gzip[..^4], "damaged gzip");
        AssertRefused(Flip(gzip, 1000), "damaged gzip");
        AssertRefused(gzip[..5], "damaged gzip");
    }

    [Fact]
    public void A_stored_byte_that_changed_is_found_by_the_checksum()
    {
        var buffer = new MemoryStream();
        using (var archive = new ZipArchive(buffer, ZipArchiveMode.Create, leaveOpen: true))
        {
            using var entry = archive.CreateEntry("a.ifc", CompressionLevel.NoCompression).Open();
            entry.Write(s_model);
        }

        var zip = buffer.ToArray();
        var at = zip.AsSpan().IndexOf("landing.ifc"u8);

        AssertRefused(Flip(zip, at), "damaged zip");
    }

    [Fact]
    public void The_checksum_is_the_one_of_the_standard()
    {
        // Check value of CRC-32/ISO-HDLC, from the catalogue of parametrised CRC algorithms (from memory).
        Assert.Equal(0xCBF43926u, Checksum.Of("123456789"u8));
    }

    [Fact]
    public void What_unpacks_to_more_than_200_times_its_size_is_refused()
    {
        var zeros = new byte[20_000_000];

        AssertRefused(Zip(("a.ifc", zeros)), "more than 200 times");
        AssertRefused(Gzip(zeros), "more than 200 times");
    }

    [Fact]
    public void A_declared_size_is_not_believed()
    {
        var zip = Zip(("a.ifc", new byte[20_000_000]));
        var directory = zip.AsSpan().IndexOf("PK\u0001\u0002"u8);
        BitConverter.TryWriteBytes(zip.AsSpan(directory + 24), 1000);      // APPNOTE.TXT 4.3.12: uncompressed size

        AssertRefused(zip, "landing");
    }

    [Fact]
    public void What_is_larger_than_the_largest_model_is_refused()
    {
        Assert.Equal(2_000_000_000, ModelContainer.MaxModelBytes);
        Assert.Equal(200, ModelContainer.MaxExpansion);
        var path = Path.Combine(_folder.FullName, "large.ifc");
        using (var file = File.Create(path)) file.SetLength(ModelContainer.MaxModelBytes + 1);

        Assert.Contains("largest model", Assert.Throws<InvalidDataException>(() => ModelContainer.Read(path)).Message, StringComparison.Ordinal);
        Assert.Contains("largest model", Assert.Throws<InvalidDataException>(() => ModelContainer.Read(Write("a.gz", Gzip(s_model)), 100, 200)).Message, StringComparison.Ordinal);
        Assert.Contains("largest model", Assert.Throws<InvalidDataException>(() => ModelContainer.Read(Write("a.zip", Zip(("a.ifc", s_model))), 100, 200)).Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("<?xml version=\"1.0\"?><ifcXML/>", "XML")]
    [InlineData("\u00EF\u00BB\u00BF\r\n<ifcXML/>", "XML")]
    [InlineData(" {\"type\":\"ifcJSON\"}", "JSON")]
    [InlineData("[]", "JSON")]
    [InlineData("\u00FF\u00FEI\0S\0O\0", "UTF-16")]
    [InlineData("\u00FE\u00FF\0I\0S\0O", "UTF-16")]
    [InlineData("I\0S\0O\0-\0", "UTF-16")]
    public void Another_encoding_is_refused_wherever_it_comes_from(string text, string said)
    {
        var bytes = Encoding.Latin1.GetBytes(text);

        AssertRefused(bytes, said);
        AssertRefused(Zip(("a.ifc", bytes)), said);
        AssertRefused(Gzip(bytes), said);
    }

    [Fact]
    public void An_empty_file_is_an_empty_text()
    {
        Assert.Empty(ModelContainer.Read(Write("empty.ifc", [])).Bytes);
    }

    [Fact]
    public void A_missing_file_is_a_reading_error()
    {
        Assert.ThrowsAny<IOException>(() => ModelContainer.Read(Path.Combine(_folder.FullName, "none.ifc")));
        Assert.ThrowsAny<IOException>(() => ModelContainer.Read(_folder.FullName));
    }

    [Fact]
    public void Random_damage_to_an_archive_is_refused_or_harmless()
    {
        var random = new Random(21);
        foreach (var archive in new[] { Zip(("a.ifc", s_model)), Gzip(s_model) })
        {
            for (var i = 0; i < 1000; i++)
            {
                var bytes = (byte[])archive.Clone();
                for (var n = random.Next(1, 4); n > 0; n--) bytes[random.Next(4, bytes.Length)] = (byte)random.Next(256);
                var path = Write("landing.ifc", bytes);

                var refusal = Record.Exception(() => Assert.Equal(s_model, ModelContainer.Read(path).Bytes));

                Assert.True(refusal is null or InvalidDataException, refusal?.ToString());
            }
        }
    }

    [Fact]
    public void The_open_zip_holds_its_model()
    {
        var (bytes, note) = ModelContainer.Read(OpenModel.Path("stair-railings-ifc2x3.ifczip"));

        Assert.Equal(267054, bytes.Length);                                // INVENTORY.md of the open models
        Assert.Equal("out of stair-railings-ifc2x3.ifczip, file IFC-traphekken.ifc", note);
    }

    private void AssertRefused(byte[] bytes, string said)
    {
        var refusal = Assert.Throws<InvalidDataException>(() => ModelContainer.Read(Write("landing.ifc", bytes)));

        Assert.Contains(said, refusal.Message, StringComparison.Ordinal);
        Assert.StartsWith("landing.ifc ", refusal.Message.Replace("The model in ", "", StringComparison.Ordinal), StringComparison.Ordinal);
        Assert.EndsWith(".", refusal.Message, StringComparison.Ordinal);
    }

    private string Write(string name, byte[] bytes)
    {
        var path = Path.Combine(_folder.FullName, name);
        File.WriteAllBytes(path, bytes);
        return path;
    }

    private static byte[] Flip(byte[] bytes, int at)
    {
        var changed = (byte[])bytes.Clone();
        changed[at] ^= 1;
        return changed;
    }

    private static byte[] Zip(params (string Name, byte[]? Bytes)[] entries)
    {
        var buffer = new MemoryStream();
        using (var archive = new ZipArchive(buffer, ZipArchiveMode.Create, leaveOpen: true))
        {
            foreach (var (name, bytes) in entries)
            {
                using var entry = archive.CreateEntry(name).Open();
                if (bytes is not null) entry.Write(bytes);
            }
        }

        return buffer.ToArray();
    }

    private static byte[] Gzip(byte[] bytes)
    {
        var buffer = new MemoryStream();
        using (var gzip = new GZipStream(buffer, CompressionLevel.SmallestSize, leaveOpen: true)) gzip.Write(bytes);
        return buffer.ToArray();
    }
}
