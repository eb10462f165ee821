using System.Globalization;
using System.Text;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.SampleModels.HandCalculation;
using MemberScan.SampleModels.Scenario;
using MemberScan.SampleModels.Tests.Writing;

namespace MemberScan.SampleModels.Tests.Scenario;

public sealed class SampleModelTests
{
    public static TheoryData<string> Names => Samples.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void The_committed_files_are_what_the_generator_writes(string name)
    {
        foreach (var (fileName, bytes) in Samples.Named(name).Files())
        {
            var committed = File.ReadAllBytes(Path.Combine(RepositoryFolder.Root, "sample-models", fileName));

            Assert.True(bytes.AsSpan().SequenceEqual(committed), $"{fileName} differs; write the samples anew with tests/MemberScan.SampleModels");
        }
    }

    [Fact]
    public void The_folder_holds_nothing_else()
    {
        // The space frame is written by hand, not by the generator.
        var expected = Samples.All.SelectMany(s => s.Files()).Select(f => f.FileName).Append("rail-post.frame.json").Order(StringComparer.Ordinal);

        var found = Directory.EnumerateFileSystemEntries(Path.Combine(RepositoryFolder.Root, "sample-models")).Select(Path.GetFileName).Order(StringComparer.Ordinal);

        Assert.Equal(expected, found);
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Every_instance_fits_its_schema(string name)
    {
        var file = new WrittenFile(Samples.Named(name).Model);

        var faults = SchemaTable.Of(file.Schema).Faults(file);

        Assert.Empty(faults);
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Every_member_stands_in_the_file_under_its_key(string name)
    {
        var sample = Samples.Named(name);
        var file = new WrittenFile(sample.Model);

        var keys = sample.Members.Select(m => m.Key).ToArray();

        Assert.Equal(keys.Length, keys.Distinct(StringComparer.Ordinal).Count());
        foreach (var member in sample.Members)
        {
            var instance = Assert.Single(file.Of(member.Keyword), i => i.Parameters[0] == $"'{member.Key.Split('/')[0]}'");
            if (member.NameSpelling is { } spelling) Assert.Equal(spelling, instance.Parameters[2]);
        }
    }

    /// <summary>dMy/dx = Vz, dMz/dx = −Vy: with shear running straight between stations the mean of its ends is exact.</summary>
    [Theory]
    [MemberData(nameof(Names))]
    public void Stations_reach_both_ends_and_are_in_equilibrium(string name)
    {
        foreach (var member in Samples.Named(name).Members)
        {
            foreach (var situation in member.Situations)
            {
                Assert.Equal(0, situation.Stations[0].X);
                Assert.Equal(member.Length, situation.Stations[^1].X, 1e-12);
                foreach (var (a, b) in situation.Stations.Zip(situation.Stations.Skip(1)))
                {
                    var length = b.X - a.X;
                    Assert.True(length >= 0, member.Name);
                    Assert.Equal(a.Forces.My + (a.Forces.Vz + b.Forces.Vz) / 2 * length, b.Forces.My, 1e-6);
                    Assert.Equal(a.Forces.Mz - (a.Forces.Vy + b.Forces.Vy) / 2 * length, b.Forces.Mz, 1e-6);
                    if (length > 0)
                    {
                        Assert.Equal(a.Forces.N, b.Forces.N, 1e-9);
                        Assert.Equal(a.Forces.T, b.Forces.T, 1e-9);
                    }
                }
            }
        }
    }

    [Theory]
    [InlineData(GangwayRails.Name, 34, 6, 3)]
    [InlineData(DeckHangers.Name, 16, 2, 3)]
    [InlineData(MastStays.Name, 12, 1, 1)]
    public void The_intended_counts_stand_in_the_description(string name, int candidates, int overstressed, int notChecked)
    {
        var sample = Samples.Named(name);

        var verdicts = sample.Members.Select(m => HandVerdict.Of(m).Verdict).ToArray();

        Assert.Equal(candidates, verdicts.Length);
        Assert.Equal(overstressed, verdicts.Count(v => v == "OVERSTRESSED"));
        Assert.Equal(notChecked, verdicts.Count(v => v == "NOT CHECKED"));
        Assert.Contains(
            string.Create(CultureInfo.InvariantCulture, $"{candidates} candidates: {overstressed} OVERSTRESSED, {notChecked} NOT CHECKED, {candidates - overstressed - notChecked} WITHIN LIMIT."),
            Encoding.UTF8.GetString([.. sample.Description]), StringComparison.Ordinal);
    }

    /// <summary>No member is so near its limit that the choice of the shear model would turn the verdict.</summary>
    [Theory]
    [MemberData(nameof(Names))]
    public void No_utilization_is_within_five_percent_of_one(string name)
    {
        foreach (var member in Samples.Named(name).Members)
        {
            if (HandVerdict.Of(member).Utilization is { } utilization)
                Assert.True(Math.Abs(utilization - 1) > 0.05, $"{member.Name}: {utilization}");
        }
    }

    /// <summary>The stored components, turned by the edge and Axis that the file gives, are the intended forces again.</summary>
    [Fact]
    public void Global_components_turn_back_into_member_axes()
    {
        var sample = Samples.Named(MastStays.Name);
        var file = new WrittenFile(sample.Model);
        var read = 0;

        foreach (var member in sample.Members)
        {
            var analytical = file.Of("IFCSTRUCTURALCURVEMEMBER").Single(m => m.Parameters[2] == $"'A {member.Tag}'");
            var axes = AxesOf(file, analytical.Parameters);
            var reactions = Reactions(file, analytical.Id);
            Assert.Equal(2, reactions.Length);
            foreach (var (reaction, situation) in reactions.Zip(member.Situations))
            {
                Assert.Equal(".GLOBAL_COORDS.", reaction[8]);
                var values = WrittenFile.List(file.At(reaction[7])[1]);
                foreach (var (value, station) in values.Zip(situation.Stations))
                {
                    var turned = Turned(axes, [.. file.At(value)[1..].Select(WrittenFile.Number)]);
                    Assert.Equal(Numbers(station.Forces), Numbers(turned), (a, b) => Math.Abs(a - b) < 1e-5);
                    read++;
                }
            }
        }

        Assert.Equal(sample.Members.Sum(m => m.Situations.Sum(s => s.Stations.Length)), read);
    }

    /// <summary>Components in the analytical member's axes (edge and Axis of the file) are the intended forces in the element's own axes, the turned bracket's too.</summary>
    [Fact]
    public void Local_components_follow_the_analytical_axes()
    {
        var sample = Samples.Named(GangwayRails.Name);
        var file = new WrittenFile(sample.Model);
        var read = 0;

        foreach (var analytical in file.Of("IFCSTRUCTURALCURVEMEMBER"))
        {
            var member = sample.Members.Single(m => analytical.Parameters[2] == $"'A {m.Tag}'" || analytical.Parameters[0] == $"'{m.Key}'");
            var axes = AxesOf(file, analytical.Parameters);
            Assert.Equal(member.AnalysisIsTurned, Math.Abs(axes.Z.Dot(member.Axes.Z)) < 1e-9);
            foreach (var (reaction, situation) in Reactions(file, analytical.Id).Zip(member.Situations))
            {
                Assert.Equal(".LOCAL_COORDS.", reaction[8]);
                foreach (var (value, station) in WrittenFile.List(file.At(reaction[7])[1]).Zip(situation.Stations))
                {
                    double[] c = [.. file.At(value)[1..].Select(WrittenFile.Number)];
                    var force = c[0] * axes.X + c[1] * axes.Y + c[2] * axes.Z;
                    var moment = c[3] * axes.X + c[4] * axes.Y + c[5] * axes.Z;
                    var turned = Turned(member.Axes, [force.X, force.Y, force.Z, moment.X / 1e3, moment.Y / 1e3, moment.Z / 1e3]);
                    Assert.Equal(Numbers(station.Forces), Numbers(turned), (a, b) => Math.Abs(a - b) < 1e-6);
                    read++;
                }
            }
        }

        Assert.Equal(sample.Members.Where(m => m.Body != SampleBody.RailingItem).Sum(m => m.Situations.Sum(s => s.Stations.Length)), read);
    }

    [Fact]
    public void A_forces_table_names_members_by_key_and_by_tag()
    {
        var sample = Samples.Named(DeckHangers.Name);

        var rows = Encoding.UTF8.GetString([.. sample.ForcesTable]).Split('\n').Skip(3).Where(r => r.Length > 0).Select(r => r.Split(',')[0]).Distinct().ToArray();

        Assert.Contains(rows, r => r == "HR-02");
        Assert.Contains(rows, r => r == sample.Members[0].Key);
        Assert.All(rows, r => Assert.Contains(sample.Members, m => m.Key == r || m.Tag == r));
        Assert.Equal(sample.Members.Count(m => !m.Situations.IsEmpty), rows.Length);
    }

    private static string[][] Reactions(WrittenFile file, int analytical) =>
        [.. file.Of("IFCRELCONNECTSSTRUCTURALACTIVITY").Where(r => r.Parameters[4] == $"#{analytical}").Select(r => file.At(r.Parameters[5]))];

    private static MemberAxes AxesOf(WrittenFile file, string[] member)
    {
        var edge = file.At(WrittenFile.List(file.At(WrittenFile.List(file.At(member[6])[2])[0])[3])[0]);
        var (start, end) = (Vector(file.Numbers(file.At(edge[0])[0])), Vector(file.Numbers(file.At(edge[1])[0])));
        return MemberAxes.From(start, end - start, Vector(file.Numbers(member[8])))!;
    }

    private static Vector3 Vector(double[] components) => new(components[0], components[1], components[2]);

    private static SectionForces Turned(MemberAxes axes, double[] global)
    {
        var force = axes.Components(new(global[0], global[1], global[2]));
        var moment = axes.Components(new(global[3], global[4], global[5]));
        return new(force.X, force.Y, force.Z, moment.X, moment.Y, moment.Z);
    }

    private static double[] Numbers(SectionForces f) => [f.N, f.Vy, f.Vz, f.T, f.My, f.Mz];
}
