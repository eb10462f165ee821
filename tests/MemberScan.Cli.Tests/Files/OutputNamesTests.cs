using MemberScan.Cli.Files;

namespace MemberScan.Cli.Tests.Files;

public sealed class OutputNamesTests
{
    [Theory]
    [InlineData("landing.ifc", "landing")]
    [InlineData("landing.IFC", "landing")]
    [InlineData("landing.checked.ifc", "landing")]
    [InlineData("landing.checked.checked.ifc", "landing.checked")]
    [InlineData("landing.ifczip", "landing")]
    [InlineData("landing.ifc.gz", "landing")]
    [InlineData("landing.checked.ifc.gz", "landing")]
    [InlineData("landing v2.1.ifc", "landing v2.1")]
    [InlineData("landing", "landing")]
    [InlineData(".ifc", ".ifc")]
    public void The_base_name_drops_the_endings_of_a_model_and_one_checked(string model, string name)
    {
        var names = OutputNames.For(model, "out");

        Assert.Equal(
            new[] { ".checked.ifc", ".report.html", ".members.csv", ".run.json" }.Select(e => Path.Combine("out", name + e)),
            [names.CheckedModel, names.Report, names.MembersTable, names.RunRecord]);
    }

    [Fact]
    public void Without_a_folder_the_outputs_stand_beside_the_model()
    {
        using var folder = new TemporaryFolder();

        var names = OutputNames.For(folder["landing.ifc"], null);

        Assert.Equal(folder["landing.checked.ifc"], names.CheckedModel);
    }

    [Fact]
    public void An_input_is_found_by_whatever_name_its_folder_is_called()
    {
        using var folder = new TemporaryFolder();
        Directory.CreateDirectory(folder["models"]);
        Directory.CreateSymbolicLink(folder["link"], folder["models"]);
        var model = Path.Combine(folder["models"], "landing.checked.ifc");
        File.WriteAllText(model, "x");

        var clashes = new[] { folder["models"], folder["link"], Path.Combine(folder["models"], "..", "models"), folder["elsewhere"] }
            .Select(output => OutputNames.For(model, output).Clashes([model]).Count());

        Assert.Equal([1, 1, 1, 0], clashes);
    }
}
