using System.Collections.Immutable;
using MemberScan.Checks.En1993.Sections;
using MemberScan.Checks.Stability;
using MemberScan.Mechanics.Forces;
using MemberScan.Model;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.En1993.Members;

/// <summary>EN 1993-1-1:2005, 6.3.1 to 6.3.3: stability of straight, uniform bars, tubes and boxes.</summary>
/// <remarks>From memory. Keys: <c>en-6.3.1-y</c>, <c>en-6.3.1-z</c>, <c>en-6.3.2</c>, <c>en-6.3.3</c>. Second-order effects beyond these formulas are not covered.</remarks>
public static class MemberResistance
{
    private const string Key = "en-6.3";
    private const string Name = "member stability";

    /// <summary>Where the checks come from.</summary>
    public static Clause Clause { get; } = Clauses.Of("6.3.1 to 6.3.3");

    /// <summary>Every check that applies to a member under its actions.</summary>
    /// <param name="c">The member.</param>
    /// <returns>The checks by clause; one refusal for open sections, class 4, the wrong kind and a length that is not known. Empty in pure tension.</returns>
    /// <exception cref="ArgumentException">A value is out of its range.</exception>
    public static CheckSet Check(MemberCase c)
    {
        ArgumentNullException.ThrowIfNull(c);
        c.ThrowUnlessUsable();
        if (KindRule.Refusal(Clause, SituationKind.Design, c.Kind) is { } refusal) return CheckSet.Refused(Key, Name, refusal);

        var isCompressed = c.Actions.Compression > CompressionRule.NoCompression;
        var moments = c.IsRound ? (Y: c.Actions.M, Z: 0.0) : (Y: c.Actions.My, Z: c.Actions.Mz);
        if (!isCompressed && moments is { Y: 0, Z: 0 }) return CheckSet.Empty;
        if (!c.IsCovered) return Not(ReasonCode.StabilityNotChecked, $"Member stability is evaluated for bars, tubes and boxes; the section is of the kind {c.Section.Kind}.");

        var section = Classification.Of(ClassCase(c));
        if (section.Number > 3) return Not(ReasonCode.SlenderWall, $"The section is of class 4 ({section.Part}); its effective section is not calculated.");
        if (!isCompressed && c.IsRound) return CheckSet.Empty;
        if (!c.LengthY.TryGet(out var lengthY, out var why) || !c.LengthZ.TryGet(out _, out why)) return Not(why.Code, why.Message);

        var lengthZ = ((Finding<BucklingLength>.Found)c.LengthZ).Value;
        var p = c.Properties;
        var y = new BendingAxis("y", p.Iy, p.WelY, p.WplY, lengthY.Value);
        var z = new BendingAxis("z", p.Iz, p.WelZ, p.WplZ, lengthZ);
        var isYStrong = p.Iy >= p.Iz;
        var (strong, weak) = isYStrong ? (y, z) : (z, y);
        var acting = isYStrong ? (Strong: moments.Y, Weak: moments.Z) : (Strong: moments.Z, Weak: moments.Y);
        if (LateralTorsionalBuckling.IsSusceptible(c, strong, weak) && acting.Strong != 0 && c.Properties.JAnnex is null && c.Properties.J is null)
            return Not(ReasonCode.CheckNotEvaluated, $"The torsion constant is not known: {c.Properties.JSource}.");

        return Evaluated(c, section, y, z, strong, weak, acting, isCompressed);
    }

    private static CheckSet Evaluated(
        MemberCase c, SectionClass section, BendingAxis y, BendingAxis z, BendingAxis strong, BendingAxis weak, (double Strong, double Weak) acting, bool isCompressed)
    {
        var isPlastic = section.Number <= 2;
        var checks = ImmutableArray.CreateBuilder<NamedCheck>();
        if (isCompressed)
        {
            Add("en-6.3.1-y", "flexural buckling about y", FlexuralBuckling.Check(c, y));
            Add("en-6.3.1-z", "flexural buckling about z", FlexuralBuckling.Check(c, z));
        }

        Add("en-6.3.2", "lateral-torsional buckling", LateralTorsionalBuckling.Check(c, strong, weak, acting.Strong, isPlastic));
        if (isCompressed && c.Steel == SteelKind.Stainless && acting != default)
        {
            checks.Add(new NamedCheck("en-6.3.3", "bending and compression", CheckStanding.Decides, new CheckResult.NotEvaluated(
                BucklingInteraction.Clause, new Reason(ReasonCode.StabilityNotChecked, "Bending with compression of stainless steel members (EN 1993-1-4, 5.5) is not evaluated."))));
        }
        else
        {
            Add("en-6.3.3", "bending and compression", BucklingInteraction.Check(c, strong, weak, acting, isPlastic));
        }

        if (isCompressed)
        {
            var radius = Math.Sqrt(c.Properties.IMin / c.Properties.Area);
            checks.Add(Slenderness.Note(Math.Max(y.Length.Value, z.Length.Value), radius, isCompressed: true));
        }

        return new CheckSet(checks.ToImmutable(), [$"class {section.Number} ({section.Part}), {Classification.Clause}", .. AssumedNotes(y, z)]);

        void Add(string key, string name, CheckResult.Evaluated? result)
        {
            if (result is not null) checks.Add(new NamedCheck(key, name, CheckStanding.Decides, result));
        }
    }

    private static IEnumerable<string> AssumedNotes(BendingAxis y, BendingAxis z)
    {
        if (y.Length.IsAssumed) yield return $"buckling length for bending about y: {y.Length.Source}";
        if (z.Length.IsAssumed && z.Length != y.Length) yield return $"buckling length for bending about z: {z.Length.Source}";
    }

    // The largest compression with the largest moments: the least favourable class along the member.
    private static SectionCase ClassCase(MemberCase c) => new()
    {
        Section = c.Section,
        Properties = c.Properties,
        Forces = new SectionForces(-c.Actions.Compression, 0, 0, 0, c.IsRound ? c.Actions.M : c.Actions.My, c.IsRound ? 0 : c.Actions.Mz),
        Kind = c.Kind,
        Yield = c.Yield,
        Modulus = c.Modulus,
        Steel = c.Steel,
    };

    private static CheckSet Not(ReasonCode code, string sentence) =>
        CheckSet.Refused(Key, Name, new CheckResult.NotEvaluated(Clause, new Reason(code, sentence)));
}
