namespace MemberScan.Screening.Checking;

/// <summary>Closes in on the largest value of a function of one variable.</summary>
internal static class GoldenSection
{
    private const double Share = 0.6180339887498949;

    /// <summary>Evaluates a function ever closer to where it is largest; who calls keeps the best value that he has seen.</summary>
    /// <param name="at">The function; between the bounds with one peak.</param>
    /// <param name="a">Lower bound.</param>
    /// <param name="b">Upper bound.</param>
    /// <param name="steps">How often the stretch is shortened to 0.618 of itself.</param>
    public static void CloseIn(Func<double, double> at, double a, double b, int steps)
    {
        var (c, d) = (b - Share * (b - a), a + Share * (b - a));
        var (fc, fd) = (at(c), at(d));
        for (var i = 0; i < steps; i++)
        {
            if (fc >= fd)
            {
                (b, d, fd) = (d, c, fc);
                c = b - Share * (b - a);
                fc = at(c);
            }
            else
            {
                (a, c, fc) = (c, d, fd);
                d = a + Share * (b - a);
                fd = at(d);
            }
        }
    }
}
