using MemberScan.Reporting.Display;

namespace MemberScan.Reporting.Tests.Display;

public sealed class MemberAnchorsTests
{
    [Theory]
    [InlineData("2O2Fr$t4X7Zf8NOew3FLOH", "member-2O2Fr$t4X7Zf8NOew3FLOH")]
    [InlineData("2O2Fr$t4X7Zf8NOew3FLOH/2", "member-2O2Fr$t4X7Zf8NOew3FLOH-2")]
    [InlineData("a b-", "member-a.0020b.002D")]
    public void Names_the_place_of_a_key(string key, string anchor) => Assert.Equal(anchor, MemberAnchors.Of(key));

    [Fact]
    public void Numbers_a_key_that_is_met_again() => Assert.Equal(["member-a", "member-b", "member-a~2", "member-a~3"], MemberAnchors.OfAll(["a", "b", "a", "a"]));
}
