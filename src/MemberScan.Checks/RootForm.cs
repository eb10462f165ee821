namespace MemberScan.Checks;

/// <summary>Turns a criterion that is not linear in the load into a utilization that is.</summary>
internal static class RootForm
{
    /// <summary>Multiples of the load beyond these are none and endless.</summary>
    private const double Least = 1e-12, Largest = 1e12;

    private const int Halvings = 60;

    /// <summary><c>1/s</c> with s the multiple of the load at which the left side first passes 1.</summary>
    /// <param name="leftSide">Left side under a multiple of the load; not falling as the multiple grows, infinite where no resistance is left.</param>
    /// <returns>The utilization [-], at most 1e12; 0 where no multiple reaches 1.</returns>
    /// <exception cref="ArithmeticException">The left side is not a number.</exception>
    public static double Of(Func<double, double> leftSide)
    {
        double At(double multiple)
        {
            var left = leftSide(multiple);
            return double.IsNaN(left) ? throw new ArithmeticException("a left side is not a number") : left;
        }

        double within = 1, beyond = 1;
        if (At(1) <= 1)
        {
            do
            {
                within = beyond;
                beyond *= 2;
                if (beyond > Largest) return 0;
            }
            while (At(beyond) <= 1);
        }
        else
        {
            do
            {
                beyond = within;
                within /= 2;
                if (within < Least) return 1 / Least;
            }
            while (At(within) > 1);
        }

        for (var i = 0; i < Halvings; i++)
        {
            var middle = 0.5 * (within + beyond);
            if (At(middle) <= 1) within = middle;
            else beyond = middle;
        }

        return 1 / within;
    }
}
