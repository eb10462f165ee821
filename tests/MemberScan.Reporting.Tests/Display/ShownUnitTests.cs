using MemberScan.Reporting.Display;

namespace MemberScan.Reporting.Tests.Display;

public sealed class ShownUnitTests
{
    // 1 MPa = 1 N/mm²; second moment of 48.3 × 3.2: 11.6 cm⁴ = 116 000 mm⁴ (EN 10219-2:2006, from memory).
    [Theory]
    [InlineData("Pa", 355e6, "355.0\u00A0MPa")]
    [InlineData("N", -800, "\u22120.8000\u00A0kN")]
    [InlineData("N·m", 1320, "1.320\u00A0kN·m")]
    [InlineData("m", 0.0483, "48.30\u00A0mm")]
    [InlineData("m²", 4.53e-4, "453.0\u00A0mm²")]
    [InlineData("m³", 4.80e-6, "4800\u00A0mm³")]
    [InlineData("m⁴", 11.6e-8, "116\u202F000\u00A0mm⁴")]
    [InlineData("-", 1.2874, "1.287")]
    [InlineData("kg", 12.5, "12.50\u00A0kg")]
    [InlineData("N", 1e-10, "≈\u00A00\u00A0kN")]
    [InlineData("N", 0, "0\u00A0kN")]
    public void Shows_an_SI_value_with_its_unit(string unit, double si, string expected) =>
        Assert.Equal(expected, ShownUnit.Of(unit).WithUnit(si));
}
