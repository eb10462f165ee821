using MemberScan.Foundation.Units;

namespace MemberScan.Foundation.Tests.Units;

/// <summary>NIST SP 811 appendix B: 1 kip = 4.448222 kN, 1 ksi = 6.894757 MPa, 1 lbf·in = 0.1129848 N·m.</summary>
public sealed class SiTests
{
    [Fact]
    public void Figures_of_a_book_become_SI()
    {
        Assert.Equal(0.3, Si.Mm(300), 15);
        Assert.Equal(0.0508, Si.In(2), 15);
        Assert.Equal(1e-4, Si.Mm2(100), 15);
        Assert.Equal(1e-6, Si.Cm3(1), 15);
        Assert.Equal(1e-8, Si.Cm4(1), 1e-20);
        Assert.Equal(1e-12, Si.Mm4(1), 1e-24);
        Assert.Equal(355e6, Si.MPa(355));
        Assert.Equal(210e9, Si.GPa(210));
        Assert.Equal(250e3, Si.KN(250));
        Assert.Equal(12e3, Si.KNm(12));
        Assert.Equal(6.894757e6, Si.Ksi(1), 0.5);
        Assert.Equal(4448.222, Si.Lbf(1000), 0.0005);
        Assert.Equal(0.1129848, Si.LbfIn(1), 0.00000005);
    }
}
