using MemberScan.Model.Verdicts;

namespace MemberScan.Model.Tests.Verdicts;

public sealed class ReasonCodesTests
{
    /// <summary>The closed list as the product names it.</summary>
    private const string ClosedList =
        "no-section section-not-parametric section-not-covered section-invalid mesh-not-allowed wall-over-radius no-strength strength-implausible material-not-covered no-forces "
        + "forces-incomplete no-combination stations-too-coarse kind-unknown kind-without-limit length-ambiguous axes-unknown placement-not-supported unit-missing convention-unknown "
        + "thread-unknown stability-not-checked slender-wall check-not-evaluated damaged-record";

    [Fact]
    public void Codes_are_spelled_as_the_closed_list() =>
        Assert.Equal(ClosedList.Split(' '), Enum.GetValues<ReasonCode>().Select(c => c.Text()));

    [Fact]
    public void Each_code_has_a_request_of_its_own_in_a_whole_sentence()
    {
        var requests = Enum.GetValues<ReasonCode>().Select(c => c.Request()).ToList();

        Assert.Equal(requests.Count, requests.Distinct(StringComparer.Ordinal).Count());
        Assert.All(requests, r => Assert.Matches("^[A-Z].{20,}[.]$", r));
    }

    [Fact]
    public void No_request_judges()
    {
        string[] banned = ["approved", "safe", "fails code", "code compliant"];

        Assert.All(Enum.GetValues<ReasonCode>(), c => Assert.DoesNotContain(banned, word => c.Request().Contains(word, StringComparison.OrdinalIgnoreCase)));
    }

    [Fact]
    public void A_code_outside_the_list_has_no_request() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => ((ReasonCode)99).Request());
}
