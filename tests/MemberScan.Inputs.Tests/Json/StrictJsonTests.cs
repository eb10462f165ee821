using System.Text;
using System.Text.Json;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.Json;

namespace MemberScan.Inputs.Tests.Json;

public sealed class StrictJsonTests
{
    [Fact]
    public void Values_know_their_bytes()
    {
        var text = "\uFEFF/* é */ {\"a\\u0062\": [1.50, \"x\\ny\", null,], // end\n \"c\": true}";
        var bytes = Encoding.UTF8.GetBytes(text);

        var root = StrictJson.Read(new JsonSource(bytes, "s.json", new DiagnosticList()))!;

        Assert.Equal(["ab", "c"], root.Entries.Select(entry => entry.Key));
        Assert.Equal("\"a\\u0062\"", Encoding.UTF8.GetString(bytes.AsSpan(root.Entries[0].KeyOffset, 9)));
        var items = root.Entries[0].Value.Items;
        Assert.Equal([JsonValueKind.Number, JsonValueKind.String, JsonValueKind.Null], items.Select(item => item.Kind));
        Assert.Equal(["1.50", "x\ny", ""], items.Select(item => item.Text));
        Assert.Equal((byte)'1', bytes[items[0].Offset]);
        Assert.Equal((byte)'t', bytes[root.Entries[1].Value.Offset]);
    }

    [Fact]
    public void A_fault_of_the_syntax_does_not_pass_on_control_characters()
    {
        var diagnostics = new DiagnosticList();

        var root = StrictJson.Read(new JsonSource("{\"a\": \u001b}"u8.ToArray(), "s.json", diagnostics));

        Assert.Null(root);
        Assert.DoesNotContain(Assert.Single(diagnostics.Items).Message, char.IsControl);
    }
}
