using MemberScan.Ifc.WriteBack;

namespace MemberScan.Ifc.Tests.WriteBack;

public sealed class GlobalIdsTests
{
    /// <summary>UUIDs and their 22 characters: test vectors of the published algorithm (bytes in printed order, two characters, then five times four).</summary>
    [Theory]
    [InlineData("f70dd363bfe3495d84a02c02dcb7d4d2", "3t3TDZl_D9NOIWB0BSjzJI")]
    [InlineData("00112233445566778899aabbccddeeff", "004I8pH5LcTuYPghlCtUx$")]
    [InlineData("ffffffffffffffffffffffffffffffff", "3$$$$$$$$$$$$$$$$$$$$$")]
    [InlineData("00000000000000000000000000000000", "0000000000000000000000")]
    public void Sixteen_bytes_are_compressed_as_published(string hex, string expected) =>
        Assert.Equal(expected, GlobalIds.Compress(Convert.FromHexString(hex)));

    [Fact]
    public void Ids_from_texts_repeat_differ_and_are_well_formed()
    {
        var texts = Enumerable.Range(0, 5000).Select(i => FormattableString.Invariant($"MemberScan_StressCheck|{i}|set")).ToList();

        var ids = texts.ConvertAll(GlobalIds.From);

        Assert.Equal(ids, texts.ConvertAll(GlobalIds.From));
        Assert.Equal(ids.Count, ids.Distinct(StringComparer.Ordinal).Count());
        Assert.All(ids, id => Assert.Matches("^[0-3][0-9A-Za-z_$]{21}$", id));
    }

    [Fact]
    public void The_uuid_behind_an_id_is_of_version_8_and_of_the_standard_variant()
    {
        // RFC 9562, section 5.8: version 8 in the high bits of octet 6, variant 10 in those of octet 8.
        const string Alphabet = "0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz_$";
        var bits = GlobalIds.From("gangway").Aggregate(UInt128.Zero, (sum, c) => (sum << 6) | (uint)Alphabet.IndexOf(c, StringComparison.Ordinal));

        Assert.Equal(8u, (uint)(bits >> 76) & 0xF);
        Assert.Equal(2u, (uint)(bits >> 62) & 0x3);
    }
}
