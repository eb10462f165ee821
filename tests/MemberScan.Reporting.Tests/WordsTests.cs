using System.Text;
using System.Text.RegularExpressions;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Display;

namespace MemberScan.Reporting.Tests;

/// <summary>A screening aid gives no blessing: some words never stand in an output.</summary>
public sealed class WordsTests
{
    private const string Forbidden = @"\bapproved?\b|\bsafe(ly|ty)?\b|fails? code|code[ -]complian|\bcertified\b";

    [Fact]
    public void No_output_uses_a_word_that_blesses_or_condemns()
    {
        var record = FerryLanding.Small();
        string[] outputs =
        [
            HtmlReport.Render(record), HtmlReport.Render(FerryLanding.Record()),
            Encoding.UTF8.GetString(MembersTable.Write(record)), Encoding.UTF8.GetString(RunRecord.Write(record)),
            HtmlReport.Render(FerryLanding.Record([.. Enum.GetValues<ReasonCode>().Select(code => FerryLanding.Open(code.Text(), "", code, "why"))])),
        ];

        Assert.All(outputs, output => Assert.DoesNotMatch(new Regex(Forbidden, RegexOptions.IgnoreCase), output));
    }

    [Fact]
    public void The_three_verdicts_have_their_words_and_different_shapes()
    {
        var words = Enum.GetValues<Verdict>().Select(v => v.Word());
        var symbols = Enum.GetValues<Verdict>().Select(v => v.Symbol());

        Assert.Equal(["WITHIN LIMIT", "OVERSTRESSED", "NOT CHECKED"], words);
        Assert.Equal(3, symbols.Distinct().Count());
    }

    [Theory]
    [InlineData("within limit")]
    [InlineData("")]
    [InlineData(null)]
    public void Reads_no_verdict_from_other_words(string? word) => Assert.False(VerdictWords.TryParse(word, out _));
}
