using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests;

public sealed class KindRuleTests
{
    private static readonly Clause s_clause = new("", "a limit", "", FromMemory: false);

    [Theory]
    [InlineData(SituationKind.Service, SituationKind.Service)]
    [InlineData(SituationKind.Design, SituationKind.Design)]
    [InlineData(SituationKind.Service, SituationKind.Unknown)]
    public void A_limit_is_held_against_its_own_kind_and_a_service_limit_against_an_unknown_one(SituationKind limit, SituationKind situation) =>
        Assert.Null(KindRule.Refusal(s_clause, limit, situation));

    [Theory]
    [InlineData(SituationKind.Service, SituationKind.Design, ReasonCode.KindWithoutLimit)]
    [InlineData(SituationKind.Design, SituationKind.Service, ReasonCode.KindWithoutLimit)]
    [InlineData(SituationKind.Design, SituationKind.Unknown, ReasonCode.KindUnknown)]
    public void A_limit_of_another_kind_is_refused(SituationKind limit, SituationKind situation, ReasonCode code) =>
        Assert.Equal(code, KindRule.Refusal(s_clause, limit, situation)!.Why.Code);

    [Fact]
    public void A_limit_without_a_kind_is_a_broken_contract() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => KindRule.Refusal(s_clause, SituationKind.Unknown, SituationKind.Service));
}
