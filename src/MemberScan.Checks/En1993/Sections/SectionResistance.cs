using System.Collections.Immutable;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.En1993.Sections;

/// <summary>EN 1993-1-1:2005, 6.2.3 to 6.2.10: resistance of bars, tubes and boxes, gross section, class by 5.5.</summary>
/// <remarks>From memory. Class 4 and slender webs are not checked. Keys: <c>en-6.2.3</c> … <c>en-6.2.9</c>.</remarks>
public static class SectionResistance
{
    private const string Key = "en-6.2";
    private const string Name = "section resistance";

    /// <summary>Where the checks come from.</summary>
    public static Clause Clause { get; } = Clauses.Of("6.2.3 to 6.2.10");

    /// <summary>Every check that applies to a section under its forces.</summary>
    /// <param name="c">The section and its forces.</param>
    /// <returns>The checks by clause; one refusal for open sections, for the wrong kind and for class 4.</returns>
    /// <exception cref="ArgumentException">A value is out of its range.</exception>
    public static CheckSet Check(SectionCase c)
    {
        ArgumentNullException.ThrowIfNull(c);
        c.ThrowUnlessUsable();
        if (KindRule.Refusal(Clause, SituationKind.Design, c.Kind) is { } refusal) return CheckSet.Refused(Key, Name, refusal);
        if (!c.IsCovered)
            return Not(ReasonCode.CheckNotEvaluated, $"The section resistance is evaluated for bars, tubes and boxes; the section is of the kind {c.Section.Kind}.");
        if (c.Forces.T != 0 && c.Properties.Wt is null)
            return Not(ReasonCode.CheckNotEvaluated, $"The torsional resistance is not known: {c.Properties.JSource}.");

        var section = Classification.Of(c);
        if (section.Number > 3)
            return Not(ReasonCode.SlenderWall, $"The section is of class 4 ({section.Part}); its effective section is not calculated.");
        if (IsSlenderInShear(c) is { } slender) return Not(ReasonCode.SlenderWall, slender);

        var checks = ImmutableArray.CreateBuilder<NamedCheck>();
        Add(c.Forces.N > 0 ? "en-6.2.3" : "en-6.2.4", c.Forces.N > 0 ? "tension" : "compression", AxialResistance.Check(c));
        Add("en-6.2.5-y", c.IsRound ? "bending" : "bending about y", BendingResistance.Check(c, section, isAboutY: true));
        Add("en-6.2.5-z", "bending about z", BendingResistance.Check(c, section, isAboutY: false));
        Add("en-6.2.6-y", "shear along y", ShearResistance.CheckShear(c, isAlongY: true));
        Add("en-6.2.6-z", c.Section is Box ? "shear along z" : "shear", ShearResistance.CheckShear(c, isAlongY: false));
        Add("en-6.2.7", "torsion", ShearResistance.CheckTorsion(c));
        Add("en-6.2.7-v", "shear with torsion", ShearResistance.CheckCombined(c));
        Add("en-6.2.9", "bending with shear and axial force", CombinedResistance.Check(c, section));
        return new CheckSet(checks.ToImmutable(), checks.Count == 0 ? [] : [$"class {section.Number} ({section.Part}), {Classification.Clause}"]);

        void Add(string key, string name, CheckResult.Evaluated? result)
        {
            if (result is not null) checks.Add(new NamedCheck(key, name, CheckStanding.Decides, result));
        }
    }

    /// <summary>6.2.6(6): webs beyond 72ε/η need EN 1993-1-5, with η = 1.0.</summary>
    private static string? IsSlenderInShear(SectionCase c)
    {
        if (c.Section is not Box box || (c.Forces.Vy == 0 && c.Forces.Vz == 0 && c.Forces.T == 0)) return null;

        var limit = 72 * Classification.Epsilon(c.Yield, c.Modulus, c.Steel);
        var side = c.Forces.T != 0 || (c.Forces.Vy != 0 && c.Forces.Vz != 0) ? Math.Max(box.Width, box.Depth) : c.Forces.Vz != 0 ? box.Depth : box.Width;
        var slenderness = (side - 2 * box.Wall) / box.Wall;
        return slenderness <= limit * (1 + 1e-9)
            ? null
            : $"The wall has h_w/t = {Shown.Number(slenderness)}, more than 72ε = {Shown.Number(limit)}; its shear buckling is not checked.";
    }

    private static CheckSet Not(ReasonCode code, string sentence) =>
        CheckSet.Refused(Key, Name, new CheckResult.NotEvaluated(Clause, new Reason(code, sentence)));
}
