using MemberScan.Model.Forces;
using MemberScan.Model.Rules;

namespace MemberScan.Model.Tests.Rules;

public sealed class KindPatternTests
{
    [Theory]
    [InlineData("ULS*", "ULS 1", true)]
    [InlineData("ULS*", "uls", true)]
    [InlineData("ULS*", "my ULS", false)]
    [InlineData("*wind*", "1.35 G + 1.5 Wind W", true)]
    [InlineData("CO?", "CO1", true)]
    [InlineData("CO?", "CO12", false)]
    [InlineData("CO?", "CO", false)]
    [InlineData("G (a) [b] .x", "g (A) [B] .X", true)]
    [InlineData("a.c", "abc", false)]
    public void Stars_and_question_marks_stand_for_characters_and_case_does_not_matter(string pattern, string name, bool fits) =>
        Assert.Equal(fits, new KindPattern(pattern, SituationKind.Design).Fits(name));
}
