using System.Text;

namespace MemberScan.Inputs.Tests;

public sealed class ShippedFilesTests
{
    [Fact]
    public void Every_shipped_file_is_embedded_as_text()
    {
        foreach (var name in ShippedFiles.Names)
        {
            var text = Encoding.UTF8.GetString(ShippedFiles.Read(name).Span);

            Assert.EndsWith("}\n", text, StringComparison.Ordinal);
            Assert.DoesNotContain('\r', text);
        }
    }

    [Fact]
    public void A_file_that_is_not_shipped_is_refused()
    {
        Assert.Throws<ArgumentException>(() => ShippedFiles.Read("settings.json"));
    }
}
