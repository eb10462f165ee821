namespace MemberScan.Inputs.Tests;

public sealed class NearestNameTests
{
    private static readonly string[] s_kinds = ["round", "tube", "rectangle", "box"];

    [Theory]
    [InlineData("tub", "tube")]
    [InlineData("TUBE", "tube")]
    [InlineData("rectangel", "rectangle")]
    [InlineData("bxo", "box")]
    [InlineData("ruond", "round")]
    [InlineData("rect", "rectangle")]
    public void A_slip_of_the_pen_finds_its_name(string given, string expected)
    {
        Assert.Equal(expected, NearestName.Of(given, s_kinds));
    }

    [Theory]
    [InlineData("")]
    [InlineData("q")]
    [InlineData("angle iron")]
    [InlineData("cube!!")]
    public void A_word_that_is_near_to_nothing_finds_nothing(string given)
    {
        Assert.Null(NearestName.Of(given, s_kinds));
    }

    [Fact]
    public void Very_long_words_are_not_searched_for()
    {
        var longWord = new string('a', NearestName.LongestName + 1);

        Assert.Null(NearestName.Of(longWord, [longWord]));
        Assert.NotNull(NearestName.Of(longWord[1..], [longWord]));
    }

    [Fact]
    public void Advice_asks_after_the_nearest_name_or_lists_the_known_ones()
    {
        Assert.Equal("did you mean 'tube'?", NearestName.Advice("tubes", s_kinds));
        Assert.Equal("known are round, tube, rectangle, box", NearestName.Advice("girder", s_kinds));
        Assert.Equal("known are 0, 1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11 and 3 more",
            NearestName.Advice("girder", [.. Enumerable.Range(0, 15).Select(i => $"{i}")]));
    }
}
