using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Model.Limits;

namespace MemberScan.Inputs.Tests.SettingsFiles;

/// <summary>The ready bases of <c>config/basis</c> are whole settings files.</summary>
public sealed class BasisFilesTests
{
    [Fact]
    public void Every_basis_is_read_without_a_finding()
    {
        var files = Directory.GetFiles(Folder(), "*.json");

        Assert.NotEmpty(files);
        Assert.All(files, file => Read(Path.GetFileName(file)));
    }

    [Fact]
    public void Allowable_stress_is_for_service_and_en_1993_for_design_situations_alone()
    {
        Assert.Equal(new Basis(new StressLimit(Criterion.AllowableVonMises, 1.67), null), Read("allowable-stress.json").Basis);
        Assert.Equal(new Basis(null, new StressLimit(Criterion.En1993Elastic, 1.00)), Read("en-1993.json").Basis);
    }

    [Fact]
    public void The_bases_of_AISC_360_take_the_design_wall_and_are_for_one_kind_of_situation_each()
    {
        var (asd, lrfd) = (Read("aisc-360-asd.json"), Read("aisc-360-lrfd.json"));

        // AISC 360-22, B3.1 and B3.2: Ω = 1.67, φ = 0.90 (from memory).
        Assert.Equal(new Basis(new StressLimit(Criterion.Aisc360Asd, 1.67), null), asd.Basis);
        Assert.Equal(new Basis(null, new StressLimit(Criterion.Aisc360Lrfd, 1 / 0.90)), lrfd.Basis);
        Assert.Equal((WallBasis.ByGrade, WallBasis.ByGrade), (asd.Limits.WallInForce, lrfd.Limits.WallInForce));
    }

    [Fact]
    public void Every_basis_is_embedded_as_it_stands_in_its_folder()
    {
        Assert.Equal(Directory.GetFiles(Folder(), "*.json").Select(file => "basis/" + Path.GetFileName(file)).Order(StringComparer.Ordinal), ShippedFiles.Bases.Order(StringComparer.Ordinal));
        Assert.All(ShippedFiles.Bases, name => Assert.Equal(File.ReadAllBytes(Path.Combine(Folder(), Path.GetFileName(name))), ShippedFiles.Read(name).ToArray()));
    }

    private static Settings Read(string name)
    {
        var diagnostics = new DiagnosticList();
        var settings = SettingsFile.Read(File.ReadAllBytes(Path.Combine(Folder(), name)), name, diagnostics);

        Assert.Empty(diagnostics.Items);
        return settings!;
    }

    private static string Folder()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
            if (File.Exists(Path.Combine(folder.FullName, "MemberScan.sln"))) return Path.Combine(folder.FullName, "config", "basis");
        throw new DirectoryNotFoundException("The tests run outside the repository.");
    }
}
