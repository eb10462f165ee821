using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.Decisions;

namespace MemberScan.Inputs.Tests.Decisions;

public sealed class DecisionFileTests
{
    private const string Header = "member,decision,by,date,note\n";

    [Fact]
    public void A_table_gives_its_rows_with_their_lines()
    {
        var (decisions, _) = Read("# remarks are passed over\n" + Header + "P-1,accept until the next revision,R. Vu,2026-02-03,\"see \"\"letter 4\"\", page 2\"\r\n\nP-2,strengthen,Jörg Ø 橋 🛟,2026-02-04,\n");

        Assert.Equal(2, decisions.Length);
        Assert.Equal(("P-1", "accept until the next revision", "R. Vu", "2026-02-03", "see \"letter 4\", page 2"), (decisions[0].Member, decisions[0].Decision, decisions[0].By, decisions[0].Date, decisions[0].Note));
        Assert.Equal(("Jörg Ø 橋 🛟", "", 5L), (decisions[1].By, decisions[1].Note, decisions[1].Place.Line));
    }

    [Fact]
    public void JSON_gives_the_same()
    {
        var (decisions, _) = Read("""
            { // by hand
              "decisions": [
                { "member": "P-1", "decision": "strengthen", "by": "R. Vu", "date": "2026-02-03", "note": "with 橋" },
                { "member": "P-2", "decision": "accept", "by": "R. Vu", "date": "2026-02-03" },
              ],
            }
            """);

        Assert.Equal([("P-1", "with 橋", 3L), ("P-2", "", 4L)], decisions.Select(d => (d.Member, d.Note, d.Place.Line)));
    }

    [Theory]
    [InlineData("", "INP-0002", 1, 1)]
    [InlineData("member,decision,by,date\n", "INP-0201", 1, 1)]
    [InlineData("member;decision;by;date;note\n", "INP-0201", 1, 1)]
    [InlineData(Header + "P-1,ok,me,2026-02-03\n", "INP-0009", 2, 1)]
    [InlineData(Header + "P-1,,me,2026-02-03,\n", "INP-0202", 2, 5)]
    [InlineData(Header + "P-1,ok,me,3.2.2026,\n", "INP-0203", 2, 11)]
    [InlineData(Header + "P-1,ok,me,2026-02-30,\n", "INP-0203", 2, 11)]
    [InlineData(Header + "P-1,ok,me,2026-02-03,\nP-1,no,me,2026-02-03,\n", "INP-0204", 3, 1)]
    [InlineData(Header + "P-1,\"ok,me,2026-02-03,\n", "INP-0017", 2, 5)]
    [InlineData("{ \"decisions\": [ { \"member\": \"P-1\" } ] }", "INP-0109", 1, 18)]
    [InlineData("{ \"decision\": [] }", "INP-0102", 1, 3)]
    [InlineData("{ \"decisions\": [ { \"member\": 1, \"decision\": \"x\", \"by\": \"y\", \"date\": \"2026-02-03\" } ] }", "INP-0104", 1, 30)]
    [InlineData("{ \"decisions\": [ { \"member\": \"a\", \"decision\": \"x\", \"by\": \"y\", \"date\": \"today\" } ] }", "INP-0203", 1, 71)]
    public void What_is_wrong_is_told_with_its_place_and_nothing_is_used(string text, string code, int line, int column)
    {
        var diagnostics = new DiagnosticList();

        Assert.Null(DecisionFile.Read(Encoding.UTF8.GetBytes(text), "decisions.csv", diagnostics));
        var error = diagnostics.Items.First(d => d.Code == code);
        Assert.Equal((Severity.Error, line, column), (error.Severity, (int)error.Span!.Value.Line, error.Span.Value.Column));
    }

    [Fact]
    public void Limits_are_kept()
    {
        var longest = new string('x', DecisionFile.LongestText);
        var note = new string('橋', DecisionFile.LongestNote);
        Assert.Equal(longest, Read($"{Header}P-1,{longest},me,2026-02-03,{note}\n").Decisions[0].Decision);

        var diagnostics = new DiagnosticList();
        Assert.Null(DecisionFile.Read(Encoding.UTF8.GetBytes($"{Header}P-1,{longest}x,me,2026-02-03,{note}x\n"), "d.csv", diagnostics));
        Assert.Equal(2, diagnostics.Items.Count(d => d.Code == "INP-0202"));
        Assert.Null(DecisionFile.Read(new byte[DecisionFile.LargestFile + 1], "d.csv", diagnostics));
        Assert.Contains(diagnostics.Items, d => d.Code == "INP-0111");
    }

    private static (System.Collections.Immutable.ImmutableArray<ReviewDecision> Decisions, DiagnosticList Diagnostics) Read(string text)
    {
        var diagnostics = new DiagnosticList();
        var decisions = DecisionFile.Read(Encoding.UTF8.GetBytes(text), "decisions.csv", diagnostics);
        Assert.True(decisions is not null, string.Join("\n", diagnostics.Items));
        return (decisions.Value, diagnostics);
    }
}
