using System.Text.RegularExpressions;
using MemberScan.Checks.En1993.Sections;
using MemberScan.Checks.Tests.En1993.Sections;

namespace MemberScan.Checks.Tests;

/// <summary>What a reader sees of a check.</summary>
public sealed partial class WordsTests
{
    private static readonly CheckSet s_set = SectionResistance.Check(
        Cases.Of(Cases.Rhs200x100x8, 355, nKN: -300, vyKN: 100, vzKN: 200, tKNm: 10, myKNm: 30, mzKNm: 15));

    [Fact]
    public void No_text_of_a_check_judges()
    {
        var texts = s_set.Checks.SelectMany(c => ((CheckResult.Evaluated)c.Result).Trace.SelectMany(l => new[] { l.Symbol, l.Formula, l.Source }).Append(c.Name)).Concat(s_set.Notes);

        Assert.All(texts, text => Assert.DoesNotMatch(Judging(), text));
    }

    [Fact]
    public void A_reader_gets_the_utilization_from_the_printed_numbers()
    {
        // Of a linear check: action over resistance as printed with four figures.
        foreach (var result in s_set.Checks.Where(c => c.Key is "en-6.2.4" or "en-6.2.5-y" or "en-6.2.5-z" or "en-6.2.6-y" or "en-6.2.6-z" or "en-6.2.7").Select(c => (CheckResult.Evaluated)c.Result))
        {
            var numbers = Numbers().Matches(result.Trace[^1].Formula).Select(m => double.Parse(m.Value, System.Globalization.CultureInfo.InvariantCulture)).ToArray();

            Assert.Equal(result.Utilization, numbers[^3] / numbers[^2], 0.005 * result.Utilization);
            Assert.Equal(result.Utilization, numbers[^1], 0.005 * result.Utilization);
        }
    }

    [GeneratedRegex(@"\b(?:approved|safe|compliant|fails code)\b", RegexOptions.IgnoreCase)]
    private static partial Regex Judging();

    [GeneratedRegex(@"\d+(?:\.\d+)?(?:E[+-]\d+)?")]
    private static partial Regex Numbers();
}
