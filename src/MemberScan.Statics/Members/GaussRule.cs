namespace MemberScan.Statics.Members;

/// <summary>Points and weights of Gauss–Legendre on [0, 1].</summary>
/// <remarks>Source: any table of quadrature; the roots and weights follow from the Legendre polynomials P2, P4 in closed form, P8 as tabulated by Abramowitz and Stegun 25.4 (from memory, tested on powers).</remarks>
internal static class GaussRule
{
    private static readonly double s_root2 = 1 / Math.Sqrt(3);
    private static readonly double s_inner4 = Math.Sqrt(3.0 / 7 - 2.0 / 7 * Math.Sqrt(6.0 / 5)), s_outer4 = Math.Sqrt(3.0 / 7 + 2.0 / 7 * Math.Sqrt(6.0 / 5));
    private static readonly double s_heavy4 = (18 + Math.Sqrt(30)) / 36, s_light4 = (18 - Math.Sqrt(30)) / 36;

    /// <summary>Exact up to the third power.</summary>
    public static (double X, double Weight)[] Two { get; } = Symmetric((s_root2, 1));

    /// <summary>Exact up to the seventh power.</summary>
    public static (double X, double Weight)[] Four { get; } = Symmetric((s_inner4, s_heavy4), (s_outer4, s_light4));

    /// <summary>Exact up to the fifteenth power.</summary>
    public static (double X, double Weight)[] Eight { get; } = Symmetric(
        (0.18343464249564980, 0.36268378337836198), (0.52553240991632899, 0.31370664587788729),
        (0.79666647741362674, 0.22238103445337447), (0.96028985649753623, 0.10122853629037626));

    private static (double X, double Weight)[] Symmetric(params (double Root, double Weight)[] half) =>
        [.. half.SelectMany(h => new[] { (0.5 - 0.5 * h.Root, 0.5 * h.Weight), (0.5 + 0.5 * h.Root, 0.5 * h.Weight) }).OrderBy(p => p.Item1)];
}
