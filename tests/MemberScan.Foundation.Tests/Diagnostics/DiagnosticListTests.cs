using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Foundation.Tests.Diagnostics;

public sealed class DiagnosticListTests
{
    [Fact]
    public void Equal_findings_are_counted_and_keep_the_place_of_the_first()
    {
        var list = new DiagnosticList();

        list.Add("IFC-0006", Severity.Warning, "twice", SourceSpan.At("a.ifc", 3, 1));
        list.Add("IFC-0006", Severity.Warning, "twice", SourceSpan.At("a.ifc", 9, 1));
        list.Add("IFC-0006", Severity.Warning, "another");
        list.Add("IFC-0005", Severity.Note, "twice");

        Assert.Equal([("IFC-0006", "twice"), ("IFC-0006", "another"), ("IFC-0005", "twice")], list.Items.Select(d => (d.Code, d.Message)));
        Assert.Equal([2, 1, 1], list.Items.Select(list.CountOf));
        Assert.Equal(3, list.Items[0].Span!.Value.Line);
    }

    [Fact]
    public void Errors_are_told_apart_from_the_rest()
    {
        var list = new DiagnosticList();

        list.Add("IFC-0001", Severity.Warning, "a");
        var before = list.HasErrors;
        list.Add("IFC-0002", Severity.Error, "b");

        Assert.False(before);
        Assert.True(list.HasErrors);
        Assert.Equal(0, list.CountOf(new Diagnostic("IFC-0002", Severity.Error, "never", null)));
    }

    [Theory]
    [InlineData("forces.csv", -1, 12, 4, 0, "forces.csv, line 12, column 4")]
    [InlineData("", 431, 12, 0, 7, "line 12, byte 431 (#7)")]
    [InlineData("", 0, 0, 0, 0, "byte 0")]
    public void A_place_is_told_in_words(string file, long offset, long line, int column, ulong id, string words) =>
        Assert.Equal(words, new SourceSpan(file, offset, line, column, id).ToString());
}
