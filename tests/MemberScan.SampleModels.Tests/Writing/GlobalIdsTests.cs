using MemberScan.SampleModels.Writing;

namespace MemberScan.SampleModels.Tests.Writing;

/// <summary>GlobalIds against known pairs of UUID digits and compressed text (base 64 with the alphabet of the IFC documentation).</summary>
public sealed class GlobalIdsTests
{
    [Theory]
    [InlineData("f70dd363bfe3495d84a02c02dcb7d4d2", "3t3TDZl_D9NOIWB0BSjzJI")]
    [InlineData("00112233445566778899aabbccddeeff", "004I8pH5LcTuYPghlCtUx$")]
    [InlineData("ffffffffffffffffffffffffffffffff", "3$$$$$$$$$$$$$$$$$$$$$")]
    [InlineData("00000000000000000000000000000000", "0000000000000000000000")]
    public void Sixteen_bytes_become_22_characters(string uuidDigits, string expected)
    {
        var text = GlobalIds.Compress(Convert.FromHexString(uuidDigits));

        Assert.Equal(expected, text);
    }

    [Fact]
    public void The_same_name_gives_the_same_id_and_another_name_another()
    {
        var one = GlobalIds.From("gangway-rails/IFCMEMBER/P-01");
        var again = GlobalIds.From("gangway-rails/IFCMEMBER/P-01");
        var other = GlobalIds.From("gangway-rails/IFCMEMBER/P-02");

        Assert.Equal(one, again);
        Assert.NotEqual(one, other);
        Assert.Equal(22, one.Length);
    }
}
