using MemberScan.Part21.Plain;

namespace MemberScan.Part21.Tests.Plain;

/// <summary>Classes of bytes: the wide look-up against one byte at a time.</summary>
public sealed class ByteClassesTests
{
    [Fact]
    public void Every_byte_is_in_the_same_classes_by_both_ways()
    {
        var bytes = new byte[256];
        for (var i = 0; i < bytes.Length; i++) bytes[i] = (byte)i;
        var wide = new ulong[ByteClasses.Words];
        var plain = new ulong[ByteClasses.Words];

        for (var i = 0; i < 4; i++)
        {
            new ByteClasses(wide).Load(ref bytes[64 * i], i);
            new ByteClasses(plain).LoadEach(ref bytes[64 * i], i);
        }

        Assert.Equal(plain, wide);
    }

    [Theory]
    [InlineData('\'', ByteClasses.Quote)]
    [InlineData('7', ByteClasses.Digit)]
    [InlineData('Q', ByteClasses.Letter)]
    [InlineData(';', ByteClasses.Semicolon)]
    [InlineData('\r', ByteClasses.LineEnd)]
    [InlineData('E', ByteClasses.Exponent)]
    public void A_byte_is_in_its_class(char letter, int expected)
    {
        var bytes = new byte[64];
        Array.Fill(bytes, (byte)0xC4);
        bytes[5] = (byte)letter;
        var words = new ulong[ByteClasses.Words];

        new ByteClasses(words).Load(ref bytes[0], 0);

        Assert.Equal(1UL << 5, words[expected]);
    }
}
