using System.Globalization;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Stability;

/// <summary>Whether a compressed member may be judged by its stresses alone: EN 1993-1-1:2005, 6.3.1.2(4), from memory.</summary>
/// <remarks>No stability check is made here; a member beyond the rule is left unchecked and says so.</remarks>
public static class CompressionRule
{
    /// <summary>Largest N_Ed/N_cr for which buckling effects may be ignored [-].</summary>
    public const double LargestShare = 0.04;

    /// <summary>Compression up to this counts as none [N]: rounding of a force that is zero.</summary>
    public const double NoCompression = 1e-9;

    private const double Tolerance = 1e-9;

    /// <summary>Where the rule comes from.</summary>
    public static Clause Clause { get; } = new("EN 1993-1-1:2005", "6.3.1.2(4)", "", FromMemory: true);

    /// <summary>Euler load of a bar.</summary>
    /// <param name="modulus">Modulus of elasticity E [Pa], &gt; 0.</param>
    /// <param name="secondMoment">Second moment of area I [m⁴], &gt; 0.</param>
    /// <param name="bucklingLength">Buckling length L_cr [m], &gt; 0.</param>
    /// <returns><c>π²·E·I/L_cr²</c> [N], &gt; 0.</returns>
    public static double EulerLoad(double modulus, double secondMoment, double bucklingLength) =>
        Math.PI * Math.PI * modulus * secondMoment / (bucklingLength * bucklingLength);

    /// <summary>Holds the compression of a member against 4 % of its Euler load.</summary>
    /// <param name="N">Axial force [N], tension positive; finite.</param>
    /// <param name="E">Modulus of elasticity [Pa], &gt; 0; null when it is not known.</param>
    /// <param name="whyNoModulus">Why the modulus is not known, in words; not used otherwise.</param>
    /// <param name="IMin">The smaller principal second moment [m⁴], &gt; 0.</param>
    /// <param name="length">Length of the member [m], &gt; 0.</param>
    /// <param name="lengthFactor">Buckling length over member length [-], &gt; 0.</param>
    /// <returns>
    /// Null without compression (no rule applies); utilization <c>|N|/(0.04·Ncr)</c> [-] up to 1;
    /// not evaluated, <see cref="ReasonCode.StabilityNotChecked"/>, beyond it or without a modulus.
    /// </returns>
    /// <exception cref="ArgumentOutOfRangeException">A value is out of its range.</exception>
    public static CheckResult? Check(double N, double? E, string whyNoModulus, double IMin, double length, double lengthFactor)
    {
        if (!double.IsFinite(N)) throw new ArgumentOutOfRangeException(nameof(N), N, "the axial force must be a finite number");
        ThrowUnlessPositive(IMin, nameof(IMin));
        ThrowUnlessPositive(length, nameof(length));
        ThrowUnlessPositive(lengthFactor, nameof(lengthFactor));
        if (E is { } given) ThrowUnlessPositive(given, nameof(E));
        if (N >= -NoCompression) return null;

        if (E is not { } modulus)
        {
            return NotChecked(string.Create(CultureInfo.InvariantCulture,
                $"The member is compressed by {Shown.KN(-N)} kN and its Euler load is not known ({whyNoModulus}); no stability check is made."));
        }

        var bucklingLength = lengthFactor * length;
        var eulerLoad = EulerLoad(modulus, IMin, bucklingLength);
        var share = -N / eulerLoad;
        var utilization = share / LargestShare;
        return utilization > 1 + Tolerance
            ? NotChecked($"The compression of {Shown.KN(-N)} kN is {Shown.Number(100 * share)} % of the Euler load of {Shown.KN(eulerLoad)} kN "
                + $"(buckling length {Shown.Number(bucklingLength)} m), more than 4 %; no stability check is made.")
            : new CheckResult.Evaluated(Clause, utilization,
            [
                new("N_Ed", "", N, "N", "section force, tension positive"),
                new("E", "", modulus, "Pa", "material of the member"),
                new("I_min", "", IMin, "m⁴", "section, smaller principal second moment"),
                new("L", "", length, "m", "member length"),
                new("L_cr", $"{Shown.Number(lengthFactor)}·L = {Shown.Number(lengthFactor)}·{Shown.Number(length)} m = {Shown.Number(bucklingLength)} m",
                    bucklingLength, "m", "settings, stability.lengthFactor"),
                new("N_cr", $"π²·E·I_min/L_cr² = π²·{Shown.MPa(modulus)}·{Shown.Number(IMin * 1e12)}/{Shown.Mm(bucklingLength)}² N = {Shown.KN(eulerLoad)} kN",
                    eulerLoad, "N", "Euler load"),
                new("N_Ed/N_cr", $"{Shown.KN(-N)} / {Shown.KN(eulerLoad)} = {Shown.Number(share)}", share, "-", Clause.ToString()),
                new("utilization", $"(N_Ed/N_cr)/0.04 = {Shown.Number(share)}/0.04 = {Shown.Number(utilization)}", utilization, "-", Clause.ToString()),
            ]);
    }

    private static CheckResult.NotEvaluated NotChecked(string sentence) =>
        new(Clause, new Reason(ReasonCode.StabilityNotChecked, sentence));

    private static void ThrowUnlessPositive(double value, string name)
    {
        if (!double.IsFinite(value) || value <= 0)
            throw new ArgumentOutOfRangeException(name, value, "the value must be a finite number above zero");
    }
}
