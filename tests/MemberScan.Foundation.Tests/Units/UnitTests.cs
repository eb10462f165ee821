using MemberScan.Foundation.Units;

namespace MemberScan.Foundation.Tests.Units;

/// <summary>Factors: international yard and pound agreement of 1959 (0.3048 m, 0.45359237 kg), standard gravity 9.80665 m/s², SI brochure; NIST SP 811 appendix B for psi and ksi.</summary>
public sealed class UnitTests
{
    private const double PoundForce = 0.45359237 * 9.80665;

    [Theory]
    [InlineData("kN·m", "kN·m")]
    [InlineData("kNm", "kN·m")]
    [InlineData("kN*m", "kN·m")]
    [InlineData("kN-m", "kN·m")]
    [InlineData("kN m", "kN·m")]
    [InlineData("kN⋅m", "kN·m")]
    [InlineData(" kN ", "kN")]
    [InlineData("N/mm²", "N/mm2")]
    [InlineData("inch", "in")]
    [InlineData("\"", "in")]
    [InlineData("'", "ft")]
    [InlineData("kips", "kip")]
    [InlineData("k", "kip")]
    [InlineData("lb", "lbf")]
    [InlineData("kip-ft", "kip·ft")]
    [InlineData("kips-in", "kip·in")]
    [InlineData("lbf-in", "lbf·in")]
    [InlineData("in-lbf", "lbf·in")]
    [InlineData("ft·lbf", "lbf·ft")]
    [InlineData("%", "%")]
    public void Spellings_lead_to_one_symbol(string spelling, string symbol)
    {
        Assert.True(Unit.TryParse(spelling, out var unit));
        Assert.Equal(symbol, unit.Symbol);
    }

    [Theory]
    [InlineData("mn")]
    [InlineData("mN")]
    [InlineData("KN")]
    [InlineData("KNM")]
    [InlineData("Mm")]
    [InlineData("MM")]
    [InlineData("mpa")]
    [InlineData("kg")]
    [InlineData("m2")]
    [InlineData("")]
    [InlineData(" ")]
    [InlineData("kN·m·m")]
    [InlineData("N-m-m")]
    [InlineData("k·N")]
    [InlineData("kN/m")]
    public void Case_matters_and_other_units_are_not_known(string spelling) => Assert.False(Unit.TryParse(spelling, out _));

    [Theory]
    [InlineData("in", Quantity.Length, 0.0254)]
    [InlineData("ft", Quantity.Length, 0.3048)]
    [InlineData("lbf", Quantity.Force, PoundForce)]
    [InlineData("kip", Quantity.Force, 1000 * PoundForce)]
    [InlineData("kN·cm", Quantity.Moment, 10)]
    [InlineData("N·mm", Quantity.Moment, 1e-3)]
    [InlineData("lbf·in", Quantity.Moment, PoundForce * 0.0254)]
    [InlineData("kip·ft", Quantity.Moment, 1000 * PoundForce * 0.3048)]
    [InlineData("psi", Quantity.Stress, 6894.757)]
    [InlineData("ksi", Quantity.Stress, 6894757)]
    [InlineData("kN/cm2", Quantity.Stress, 1e7)]
    [InlineData("deg", Quantity.Angle, 0.017453292519943295)]
    [InlineData("%", Quantity.Ratio, 0.01)]
    public void Units_measure_what_is_published(string symbol, Quantity quantity, double factor)
    {
        Assert.True(Unit.TryParse(symbol, out var unit));

        Assert.Equal(quantity, unit.Quantity);
        Assert.InRange(unit.Factor / factor, 1 - 1e-7, 1 + 1e-7);
    }

    [Fact]
    public void Every_listed_symbol_is_read_back_to_itself()
    {
        foreach (var quantity in Enum.GetValues<Quantity>())
        {
            Assert.NotEmpty(Unit.SymbolsOf(quantity));
            foreach (var symbol in Unit.SymbolsOf(quantity))
            {
                Assert.True(Unit.TryParse(symbol, out var unit), symbol);
                Assert.Equal((symbol, quantity), (unit.Symbol, unit.Quantity));
            }
        }
    }
}
