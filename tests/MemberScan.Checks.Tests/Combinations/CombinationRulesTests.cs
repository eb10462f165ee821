using MemberScan.Checks.Combinations;
using MemberScan.Model.Forces;
using MemberScan.Model.Rules.Combinations;

namespace MemberScan.Checks.Tests.Combinations;

/// <summary>Factors of EN 1990:2002 (A1.3.1, Tables A1.1 and A1.2(B)) and ASCE 7-22 (2.3, 2.4), written out here by hand and from memory.</summary>
public sealed class CombinationRulesTests
{
    private static readonly TaggedCase[] s_gqw = [new("G", ActionTag.Permanent), new("Q", ActionTag.Live), new("W", ActionTag.Wind)];

    [Fact]
    public void Equation_6_10_takes_each_variable_action_as_the_leading_one()
    {
        AssertSums(CombinationSet.En1990Eq610, s_gqw,
            "1.35 G", "1 G",
            "1.35 G + 1.5 Q", "1.35 G + 1.5 Q + 0.9 W", "1.35 G + 1.5 W", "1.35 G + 1.5 W + 1.05 Q",
            "1 G + 1.5 Q", "1 G + 1.5 Q + 0.9 W", "1 G + 1.5 W", "1 G + 1.5 W + 1.05 Q");
    }

    [Fact]
    public void Equations_6_10a_and_b_reduce_either_the_variable_or_the_permanent_actions()
    {
        AssertSums(CombinationSet.En1990Eq610ab, s_gqw,
            "1.35 G", "1.35 G + 1.05 Q", "1.35 G + 0.9 W", "1.35 G + 1.05 Q + 0.9 W", "1 G", "1 G + 1.05 Q", "1 G + 0.9 W", "1 G + 1.05 Q + 0.9 W",
            "1.1475 G", "1.1475 G + 1.5 Q", "1.1475 G + 1.5 Q + 0.9 W", "1.1475 G + 1.5 W", "1.1475 G + 1.5 W + 1.05 Q",
            "1 G + 1.5 Q", "1 G + 1.5 Q + 0.9 W", "1 G + 1.5 W", "1 G + 1.5 W + 1.05 Q");
    }

    [Fact]
    public void Strength_combinations_of_ASCE_7_22_are_those_of_section_2_3()
    {
        TaggedCase[] cases = [new("D", ActionTag.Permanent), new("L", ActionTag.Live), new("S", ActionTag.Snow), new("W", ActionTag.Wind), new("E", ActionTag.Seismic)];

        AssertSums(CombinationSet.Asce7Strength, cases,
            "1.4 D", "1.2 D + 1.6 L", "1.2 D + 1.6 L + 0.3 S", "1.2 D + 0.3 S", "1.2 D + 1 S", "1.2 D + 1 S + 1 L", "1.2 D + 1 S + 0.5 W",
            "1.2 D + 1 W", "1.2 D + 1 W + 1 L", "1.2 D + 1 W + 0.3 S", "1.2 D + 1 W + 1 L + 0.3 S", "0.9 D + 1 W",
            "1.2 D + 1 E", "1.2 D + -1 E", "1.2 D + 1 E + 1 L", "1.2 D + -1 E + 1 L", "1.2 D + 1 E + 0.15 S", "1.2 D + -1 E + 0.15 S",
            "1.2 D + 1 E + 1 L + 0.15 S", "1.2 D + -1 E + 1 L + 0.15 S", "0.9 D + 1 E", "0.9 D + -1 E");
    }

    [Fact]
    public void Allowable_stress_combinations_of_ASCE_7_22_are_those_of_section_2_4()
    {
        TaggedCase[] cases = [new("D", ActionTag.Permanent), new("L", ActionTag.Live), new("Lr", ActionTag.RoofLive), new("W", ActionTag.Wind)];

        AssertSums(CombinationSet.Asce7Allowable, cases,
            "1 D", "1 D + 1 L", "1 D + 1 Lr", "1 D + 0.75 L", "1 D + 0.75 Lr", "1 D + 0.75 L + 0.75 Lr", "1 D + 0.6 W",
            "1 D + 0.45 W", "1 D + 0.75 L + 0.45 W", "1 D + 0.45 W + 0.75 Lr", "1 D + 0.75 L + 0.45 W + 0.75 Lr", "0.6 D + 0.6 W");
    }

    [Fact]
    public void Parts_of_the_live_load_are_tried_in_every_choice_and_wind_cases_one_at_a_time()
    {
        TaggedCase[] cases = [new("Q1", ActionTag.Live), new("Q2", ActionTag.Live), new("W1", ActionTag.Wind), new("W2", ActionTag.Wind)];

        var sums = Sums(CombinationSet.Asce7Allowable, cases);

        Assert.Superset(new HashSet<string>(["1 Q1", "1 Q2", "1 Q1 + 1 Q2", "0.6 W1", "0.6 W2"]), sums.ToHashSet());
        Assert.DoesNotContain(sums, s => s.Contains("W1", StringComparison.Ordinal) && s.Contains("W2", StringComparison.Ordinal));
    }

    [Fact]
    public void Kind_equation_and_the_mark_from_memory_are_with_every_combination()
    {
        Assert.All(Enum.GetValues<CombinationSet>(), set =>
        {
            var generated = CombinationRules.Generate(set, s_gqw);
            Assert.All(generated.Combinations, c => Assert.Contains("from memory", c.Rule, StringComparison.Ordinal));
            Assert.All(generated.Combinations, c => Assert.Equal(set == CombinationSet.Asce7Allowable ? SituationKind.Service : SituationKind.Design, c.Kind));
            Assert.Equal(generated.Combinations.Length, generated.Combinations.Select(c => c.Name).Distinct().Count());
        });
        Assert.StartsWith("EN 1990:2002 6.10: 1.35 G", CombinationRules.Generate(CombinationSet.En1990Eq610, s_gqw).Combinations[0].Name, StringComparison.Ordinal);
    }

    [Fact]
    public void A_case_that_no_rule_holds_is_named_and_too_many_combinations_are_none()
    {
        var seismic = CombinationRules.Generate(CombinationSet.En1990Eq610, [.. s_gqw, new("E", ActionTag.Seismic)]);
        var many = CombinationRules.Generate(CombinationSet.En1990Eq610,
            [.. Enumerable.Range(1, 6).Select(i => new TaggedCase($"Q{i}", ActionTag.Live)), .. Enumerable.Range(1, 40).Select(i => new TaggedCase($"W{i}", ActionTag.Wind))]);

        Assert.Equal(["E"], seismic.LeftOut);
        Assert.True(many.IsTooLarge);
        Assert.Empty(many.Combinations);
    }

    private static void AssertSums(CombinationSet set, TaggedCase[] cases, params string[] expected) =>
        Assert.Equal(expected.Order(StringComparer.Ordinal), Sums(set, cases).Order(StringComparer.Ordinal));

    private static IEnumerable<string> Sums(CombinationSet set, TaggedCase[] cases) =>
        CombinationRules.Generate(set, cases).Combinations.Select(c => c.Name[(c.Name.IndexOf(": ", StringComparison.Ordinal) + 2)..]);
}
