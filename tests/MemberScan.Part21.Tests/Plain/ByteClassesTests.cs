using MemberScan.Part21.Plain;

namespace MemberScan.Part21.Tests.Plain;

/// <summary>Classes of bytes: the wide look-up against one byte at a time.</summary>
public sealed class ByteClassesTests
{
    [Fact]
    public void Every_byte_is_in_the_same_classes_by_both_ways()
    {
        var random = new Random(73);
        for (var round = 0; round < 200; round++)
        {
            // All bytes in order first, so that each comes once at least; then any behind any.
            var bytes = new byte[577];
            for (var i = 0; i < bytes.Length; i++) bytes[i] = round == 0 ? (byte)i : (byte)random.Next(round % 2 == 0 ? 256 : 128);
            var wide = new ulong[ByteClasses.Words];
            var plain = new ulong[ByteClasses.Words];

            for (var i = 0; i < 8; i++)
            {
                new ByteClasses(wide).Load(ref bytes[1 + 64 * i], i > 0 || round % 3 > 0, i);
                new ByteClasses(plain).LoadEach(ref bytes[1 + 64 * i], i > 0 || round % 3 > 0, i);
            }

            Assert.Equal(plain, wide);
            new ByteClasses(wide).Columns(1, out var comma, out _, out var equals, out _, out _, out _, out _, out _);
            Assert.Equal(new ByteClasses(wide).Of(ByteClasses.Comma), comma);
            Assert.Equal(new ByteClasses(wide).Of(ByteClasses.EqualsSign), equals);
        }
    }

    [Theory]
    [InlineData('\'', ByteClasses.Quote)]
    [InlineData('7', ByteClasses.Numeric)]
    [InlineData('-', ByteClasses.Numeric)]
    [InlineData('Q', ByteClasses.Letter)]
    [InlineData(';', ByteClasses.Semicolon)]
    [InlineData('\r', ByteClasses.LineEnd)]
    [InlineData('\r', ByteClasses.Blank)]
    public void A_byte_is_in_its_class(char letter, int expected)
    {
        for (var word = 0; word < 8; word++)
        {
            var bytes = new byte[64];
            Array.Fill(bytes, (byte)0xC4);
            bytes[5] = (byte)letter;
            var words = new ulong[ByteClasses.Words];

            new ByteClasses(words).Load(ref bytes[0], false, word);

            Assert.Equal(1UL << 5, new ByteClasses(words).Of(expected)[word]);
        }
    }

    [Theory]
    [InlineData("(,", true)]
    [InlineData("(A", false)]
    [InlineData("E-", false)]
    [InlineData("A-", true)]
    [InlineData("1.", false)]
    [InlineData("..", true)]
    [InlineData(",)", true)]
    [InlineData("( ", false)]
    [InlineData("1 ", true)]
    [InlineData("1a", true)]
    [InlineData("#A", true)]
    public void Bytes_that_do_not_go_together_are_marked(string pair, bool isMisplaced)
    {
        var bytes = new byte[64];
        Array.Fill(bytes, (byte)'1');
        bytes[20] = (byte)pair[0];
        bytes[21] = (byte)pair[1];
        var words = new ulong[ByteClasses.Words];

        new ByteClasses(words).Load(ref bytes[0], false, 3);

        Assert.Equal(isMisplaced, (new ByteClasses(words).Of(ByteClasses.Misplaced)[3] >> 21 & 1) != 0);
    }
}
