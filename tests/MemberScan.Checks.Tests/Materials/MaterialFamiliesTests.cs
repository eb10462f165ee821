using MemberScan.Checks.Materials;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.Materials;

public sealed class MaterialFamiliesTests
{
    [Theory]
    [InlineData("S235JR", MaterialFamily.CarbonSteel)]
    [InlineData("Steel", MaterialFamily.CarbonSteel)]
    [InlineData("Baustahl", MaterialFamily.CarbonSteel)]
    [InlineData("ASTM A36", MaterialFamily.CarbonSteel)]
    [InlineData("A500 Gr B", MaterialFamily.CarbonSteel)]
    [InlineData("Glasgow steel", MaterialFamily.CarbonSteel)]
    [InlineData("Stainless steel 1.4404", MaterialFamily.Stainless)]
    [InlineData("1.4301", MaterialFamily.Stainless)]
    [InlineData("Edelstahl geschliffen", MaterialFamily.Stainless)]
    [InlineData("AISI 316L", MaterialFamily.Stainless)]
    [InlineData("6063-T5", MaterialFamily.Aluminium)]
    [InlineData("EN AW-6082 T6", MaterialFamily.Aluminium)]
    [InlineData("Aluminium, eloxiert", MaterialFamily.Aluminium)]
    [InlineData("Laminated glass", MaterialFamily.Glass)]
    [InlineData("Verbundsicherheitsglas", MaterialFamily.Glass)]
    [InlineData("Brettschichtholz GL24h", MaterialFamily.Timber)]
    [InlineData("Timber C24", MaterialFamily.Timber)]
    [InlineData("Stahlbeton C30/37", MaterialFamily.Mineral)]
    [InlineData("", MaterialFamily.Unknown)]
    [InlineData("Material 7", MaterialFamily.Unknown)]
    public void A_name_tells_its_family(string name, MaterialFamily family) => Assert.Equal(family, MaterialFamilies.Of(name));

    [Fact]
    public void A_name_beyond_the_limit_tells_nothing() =>
        Assert.Equal(MaterialFamily.Unknown, MaterialFamilies.Of("steel" + new string(' ', MaterialFamilies.LongestName)));

    [Theory]
    [InlineData(MaterialFamily.Timber)]
    [InlineData(MaterialFamily.Glass)]
    [InlineData(MaterialFamily.Mineral)]
    public void Timber_glass_and_mineral_are_refused_unless_a_limit_is_given(MaterialFamily family)
    {
        var refusal = MaterialFamilies.Refusal(family, hasGivenLimit: false);

        Assert.Equal(ReasonCode.MaterialNotCovered, refusal!.Code);
        Assert.Contains("settings", refusal.Message, StringComparison.Ordinal);
        Assert.Null(MaterialFamilies.Refusal(family, hasGivenLimit: true));
        Assert.True(MaterialFamilies.IsBrittle(family));
    }

    [Theory]
    [InlineData(MaterialFamily.Stainless)]
    [InlineData(MaterialFamily.Aluminium)]
    [InlineData(MaterialFamily.Unknown)]
    public void Metals_are_not_refused_here(MaterialFamily family)
    {
        Assert.Null(MaterialFamilies.Refusal(family, hasGivenLimit: false));
        Assert.False(MaterialFamilies.IsBrittle(family));
    }
}
