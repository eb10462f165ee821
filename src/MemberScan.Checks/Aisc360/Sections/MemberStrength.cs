using System.Collections.Immutable;
using MemberScan.Checks.Stability;
using MemberScan.Model;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Aisc360.Sections;

/// <summary>AISC 360-22, chapters D to H: strength of straight, uniform bars, tubes and boxes at one station.</summary>
/// <remarks>
/// From memory. Keys: <c>aisc-d2 aisc-e3 aisc-f-y aisc-f-z aisc-g-y aisc-g-z aisc-h3.1 aisc-h1</c>. Shear and torsion of solid bars are held to H3.3 by
/// their stresses. Second-order effects (chapter C) must be in the forces.
/// </remarks>
public static class MemberStrength
{
    private const string Key = "aisc";
    private const string Name = "member strength";

    /// <summary>Where the checks come from.</summary>
    public static Clause Clause { get; } = StrengthFactor.Clause("D to H", "");

    /// <summary>Every check that applies at one station.</summary>
    /// <param name="c">The section, lengths and forces.</param>
    /// <returns>The checks by clause; one refusal for open sections, for the wrong kind and where a length is needed and not known.</returns>
    /// <exception cref="ArgumentException">A value is out of its range.</exception>
    public static CheckSet Check(AiscCase c)
    {
        ArgumentNullException.ThrowIfNull(c);
        c.ThrowUnlessUsable();
        if (KindRule.Refusal(Clause, StrengthFactor.KindOf(c.Method), c.Kind) is { } refusal) return CheckSet.Refused(Key, Name, refusal);
        if (!c.IsCovered) return Not(ReasonCode.CheckNotEvaluated, $"Member strength is evaluated for bars, tubes and boxes; the section is of the kind {c.Section.Kind}.");

        var moments = c.IsRound ? (Y: double.Hypot(c.Forces.My, c.Forces.Mz), Z: 0.0) : (Y: Math.Abs(c.Forces.My), Z: Math.Abs(c.Forces.Mz));
        if (!TryLengths(c, moments != default, out var y, out var z, out var why)) return Not(why.Code, why.Message);
        if (c.Forces.N < -CompressionRule.NoCompression && AxialStrength.SlenderWall(c) is { } slender) return Not(ReasonCode.SlenderWall, slender);

        var checks = ImmutableArray.CreateBuilder<NamedCheck>();
        if (c.Forces.N > 0) checks.Add(new("aisc-d2", "tension", CheckStanding.Decides, AxialStrength.CheckTension(c)));
        if (c.Forces.N < -CompressionRule.NoCompression) checks.Add(new("aisc-e3", "flexural buckling", CheckStanding.Decides, AxialStrength.CheckCompression(c, y, z)));
        if (moments.Y != 0) checks.Add(new("aisc-f-y", c.IsRound ? "bending" : "bending about y", CheckStanding.Decides, FlexuralCheck.Check(c, isAboutY: true, moments.Y, y, z)));
        if (moments.Z != 0) checks.Add(new("aisc-f-z", "bending about z", CheckStanding.Decides, FlexuralCheck.Check(c, isAboutY: false, moments.Z, y, z)));
        if (c.IsHollow) AddShear(c, checks);
        AddCombined(c, checks);
        return new CheckSet(checks.ToImmutable(), Notes(c, y, z));
    }

    private static void AddShear(AiscCase c, ImmutableArray<NamedCheck>.Builder checks)
    {
        var (vy, vz) = Shears(c);
        if (vy != 0) checks.Add(new("aisc-g-y", "shear along y", CheckStanding.Decides, ShearStrength.CheckShear(c, isAlongY: true, vy)));
        if (vz != 0) checks.Add(new("aisc-g-z", c.IsRound ? "shear" : "shear along z", CheckStanding.Decides, ShearStrength.CheckShear(c, isAlongY: false, vz)));
        if (c.Forces.T == 0) return;

        checks.Add(new("aisc-h3.1", "torsion", CheckStanding.Decides, ShearStrength.AvailableTorsion(c) is { } available
            ? ShearStrength.CheckTorsion(c, available)
            : new CheckResult.NotEvaluated(ShearStrength.TorsionClause, new Reason(ReasonCode.SlenderWall, "The wall is beyond h/t = 260; H3.1 does not hold."))));
    }

    /// <summary>H1 or H3.2 where more than one kind of force acts.</summary>
    private static void AddCombined(AiscCase c, ImmutableArray<NamedCheck>.Builder checks)
    {
        if (checks.Count < 2) return;
        if (checks.Any(check => check.Result is CheckResult.NotEvaluated))
        {
            checks.Add(new("aisc-h1", "combined forces", CheckStanding.Decides, new CheckResult.NotEvaluated(
                CombinedStrength.Clause, new Reason(ReasonCode.CheckNotEvaluated, "A strength that the interaction needs is not evaluated."))));
            return;
        }

        checks.Add(new("aisc-h1", "combined forces", CheckStanding.Decides, CombinedStrength.Check(
            Of("aisc-d2") + Of("aisc-e3"), Of("aisc-f-y"), Of("aisc-f-z"), Math.Max(Of("aisc-g-y"), Of("aisc-g-z")), Of("aisc-h3.1"))));

        double Of(string key) => checks.FirstOrDefault(check => check.Key == key)?.Utilization ?? 0;
    }

    // Of a round section the resultant along z.
    private static (double Y, double Z) Shears(AiscCase c) =>
        c.IsRound ? (0, double.Hypot(c.Forces.Vy, c.Forces.Vz)) : (Math.Abs(c.Forces.Vy), Math.Abs(c.Forces.Vz));

    /// <summary>The effective lengths; where nothing needs them the member's length stands in.</summary>
    private static bool TryLengths(AiscCase c, bool isBent, out BucklingLength y, out BucklingLength z, out Reason why)
    {
        var plain = new BucklingLength(c.Length, 1, IsAssumed: false, "member length, not decisive");
        var isSideways = isBent && !c.IsRound && Math.Abs(c.Properties.Iy - c.Properties.Iz) > 1e-9 * c.Properties.Iy;
        var isNeeded = c.Forces.N < -CompressionRule.NoCompression || isSideways;
        (y, z, why) = (plain, plain, new Reason(ReasonCode.StabilityNotChecked, ""));
        if (!isNeeded) return true;
        if (!c.LengthY.TryGet(out var foundY, out var reason) || !c.LengthZ.TryGet(out _, out reason))
        {
            why = reason;
            return false;
        }

        (y, z) = (foundY.Value, ((Finding<BucklingLength>.Found)c.LengthZ).Value);
        return true;
    }

    private static ImmutableArray<string> Notes(AiscCase c, BucklingLength y, BucklingLength z)
    {
        var notes = ImmutableArray.CreateBuilder<string>();
        notes.Add(c.WallBasis);
        if (y.IsAssumed) notes.Add($"effective length for bending about y: {y.Source}");
        if (z.IsAssumed && z != y) notes.Add($"effective length for bending about z: {z.Source}");
        if (!c.IsHollow && (c.Forces.Vy != 0 || c.Forces.Vz != 0 || c.Forces.T != 0)) notes.Add("shear and torsion of solid bars are held to H3.3(b) by their stresses");
        return notes.ToImmutable();
    }

    private static CheckSet Not(ReasonCode code, string sentence) =>
        CheckSet.Refused(Key, Name, new CheckResult.NotEvaluated(Clause, new Reason(code, sentence)));
}
