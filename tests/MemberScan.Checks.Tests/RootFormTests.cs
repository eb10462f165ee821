namespace MemberScan.Checks.Tests;

public sealed class RootFormTests
{
    [Theory]
    [InlineData(0.25)]
    [InlineData(1.0)]
    [InlineData(37.5)]
    public void A_linear_left_side_is_its_own_root(double left) => Assert.Equal(left, RootForm.Of(s => left * s), 12);

    [Fact]
    public void A_square_gives_its_square_root() => Assert.Equal(Math.Sqrt(1.12), RootForm.Of(s => 1.12 * s * s), 12);

    [Fact]
    public void A_quadratic_gives_the_root_of_its_equation()
    {
        // a·s + b·s² = 1 with u = 1/s: u² = a·u + b, u = (a + √(a² + 4b))/2, by hand.
        Assert.Equal((0.3 + Math.Sqrt(0.09 + 4 * 0.5)) / 2, RootForm.Of(s => 0.3 * s + 0.5 * s * s), 12);
    }

    [Fact]
    public void A_jump_counts_where_it_passes_1() => Assert.Equal(1 / 1.5, RootForm.Of(s => s <= 1.5 ? 0.1 * s : double.PositiveInfinity), 12);

    [Fact]
    public void Nothing_gives_0_and_no_resistance_gives_the_largest() 
    {
        Assert.Equal(0, RootForm.Of(_ => 0));
        Assert.Equal(1e12, RootForm.Of(_ => double.PositiveInfinity));
    }

    [Fact]
    public void A_left_side_that_is_no_number_throws() => Assert.Throws<ArithmeticException>(() => RootForm.Of(_ => double.NaN));
}
