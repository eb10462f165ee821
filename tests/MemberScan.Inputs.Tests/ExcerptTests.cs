namespace MemberScan.Inputs.Tests;

public sealed class ExcerptTests
{
    [Fact]
    public void Control_and_direction_characters_are_not_passed_on()
    {
        Assert.Equal("'a?[31mb?c?'", Excerpt.Of("a\u001b[31mb\u202Ec\n"));
    }

    [Fact]
    public void Long_text_is_cut()
    {
        var shown = Excerpt.Of(new string('x', 10_000));

        Assert.Equal($"'{new string('x', Excerpt.LongestText)}…'", shown);
    }
}
