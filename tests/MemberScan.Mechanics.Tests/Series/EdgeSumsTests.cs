using System.Numerics;
using MemberScan.Mechanics.Series;

namespace MemberScan.Mechanics.Tests.Series;

public sealed class EdgeSumsTests
{
    // Lewin (1981): Li2(1) = π²/6, Li2(−1) = −π²/12, Li2(1/2) = π²/12 − ½ln²2, Im Li2(i) = Catalan's constant.
    [Fact]
    public void The_dilogarithm_has_its_known_values()
    {
        Assert.Equal(Math.PI * Math.PI / 6, Dilogarithm.Of(1).Real, 1e-15);
        Assert.Equal(-Math.PI * Math.PI / 12, Dilogarithm.Of(-1).Real, 1e-14);
        Assert.Equal(Math.PI * Math.PI / 12 - Math.Log(2) * Math.Log(2) / 2, Dilogarithm.Of(0.5).Real, 1e-15);
        Assert.Equal(0.915965594177219015, Dilogarithm.Of(Complex.ImaginaryOne).Imaginary, 1e-14);
        Assert.Equal(-Math.PI * Math.PI / 48, Dilogarithm.Of(Complex.ImaginaryOne).Real, 1e-14);
        Assert.Equal(Complex.Zero, Dilogarithm.Of(0));
    }

    [Fact]
    public void The_dilogarithm_is_its_series()
    {
        var random = new Random(11);
        for (var i = 0; i < 200; i++)
        {
            var z = Complex.FromPolarCoordinates(0.95 * random.NextDouble(), 2 * Math.PI * random.NextDouble());
            var (sum, power) = (Complex.Zero, z);
            for (var m = 1; m < 900; m++, power *= z) sum += power / ((double)m * m);

            Assert.True((sum - Dilogarithm.Of(z)).Magnitude <= 1e-13, $"{z}");
        }
    }

    [Fact]
    public void Sums_near_the_edge_are_what_very_many_terms_give()
    {
        foreach (var (xi, eta, lambda) in new[] { (0.3, 1.9, 2.0), (-1.2, -1.5, 1.6), (0.0, 0.4, 3.0), (1.5, 2.9, 3.0), (0.7, -5.95, 6.0) })
        {
            var odd = EdgeSums.OddOverCosh(xi, eta, lambda);
            var flat = EdgeSums.OddOverSinh(xi, eta, lambda);
            var all = EdgeSums.AlternatingOverCosh(xi, eta, lambda);

            Assert.Equal(Direct(1, 2, xi, eta, lambda, Math.Cos, Math.Sinh, Math.Cosh), odd.CosSinh, 1e-12);
            Assert.Equal(Direct(1, 2, xi, eta, lambda, Math.Sin, Math.Cosh, Math.Cosh), odd.SinCosh, 1e-12);
            Assert.Equal(Direct(1, 2, xi, eta, lambda, Math.Cos, Math.Cosh, Math.Sinh), flat.CosCosh, 1e-12);
            Assert.Equal(Direct(1, 2, xi, eta, lambda, Math.Sin, Math.Sinh, Math.Sinh), flat.SinSinh, 1e-12);
            Assert.Equal(Direct(-1, 1, xi, eta, lambda, Math.Cos, Math.Cosh, Math.Cosh), all.CosCosh, 1e-12);
            Assert.Equal(Direct(-1, 1, xi, eta, lambda, Math.Sin, Math.Sinh, Math.Cosh), all.SinSinh, 1e-12);
        }
    }

    [Fact]
    public void The_quadrature_is_exact_for_high_powers()
    {
        Assert.Equal(1, GaussLegendre.UnitInterval.Sum(p => p.Weight), 1e-14);
        Assert.Equal(1.0 / 40, GaussLegendre.UnitInterval.Sum(p => p.Weight * Math.Pow(p.At, 39)), 1e-14);
    }

    // Plain summation. Where hyperbolic functions near overflow both are half an exponential; the terms then vanish soon.
    private static double Direct(
        double sign, int stride, double xi, double eta, double lambda,
        Func<double, double> wave, Func<double, double> above, Func<double, double> below)
    {
        var sum = 0.0;
        for (var n = 1; n < 2000; n += stride, sign = -sign)
        {
            var ratio = n * lambda < 300
                ? above(n * eta) / below(n * lambda)
                : Math.Sign(above(Math.Sign(eta))) * Math.Exp(n * (Math.Abs(eta) - lambda));
            sum += sign / ((double)n * n) * wave(n * xi) * ratio;
        }

        return sum;
    }
}
