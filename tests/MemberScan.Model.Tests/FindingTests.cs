using MemberScan.Model.Verdicts;

namespace MemberScan.Model.Tests;

public sealed class FindingTests
{
    [Fact]
    public void Is_either_a_value_with_its_source_or_a_reason()
    {
        Finding<double> found = new Finding<double>.Found(235e6, "property");
        Finding<double> missing = new Finding<double>.Missing(new Reason(ReasonCode.NoStrength, "none"));

        Assert.True(found.TryGet(out var value, out var noReason));
        Assert.Equal((235e6, "property"), (value.Value, value.Source));
        Assert.Null(noReason);
        Assert.False(missing.TryGet(out var noValue, out var why));
        Assert.Equal(ReasonCode.NoStrength, why.Code);
        Assert.Null(noValue);
    }
}
