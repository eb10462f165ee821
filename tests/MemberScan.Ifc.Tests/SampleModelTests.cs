using MemberScan.Ifc.Tests.Sections;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;
using MemberScan.SampleModels.Scenario;

namespace MemberScan.Ifc.Tests;

/// <summary>The samples of the landing, read back and compared with what their writer meant, member by member. The writer shares no code with the reader.</summary>
public sealed class SampleModelTests
{
    private static readonly Lazy<System.Collections.Immutable.ImmutableArray<SampleModel>> s_samples = new(SampleModel.All);

    public static TheoryData<string> Names => ["gangway-rails", "deck-hangers", "mast-stays"];

    [Theory]
    [MemberData(nameof(Names))]
    public void Candidates_sections_lengths_and_axes_are_those_that_were_meant(string name)
    {
        var (sample, reading) = Read(name);

        Assert.Equal(sample.Members.Select(m => m.Key).Order(StringComparer.Ordinal), reading.Catalog.Members.Select(m => m.Key).Order(StringComparer.Ordinal));
        foreach (var meant in sample.Members)
        {
            var member = reading.Catalog.Members.Single(m => m.Key == meant.Key);
            if (meant.Body == SampleBody.Brep)
            {
                Assert.Equal(ReasonCode.SectionNotParametric, Reading.Why(member.Section).Code);
                continue;
            }

            ProfileReaderTests.AssertAlike(meant.Section, Reading.Value(member.Section).Shape);
            Reading.AssertNear(meant.Length, Reading.Value(member.Length));
            var axes = Reading.Value(member.Axes);
            Near.Vector(meant.Axes.Origin, axes.Origin);
            Near.Vector(meant.Axes.X, axes.X);
            Near.Vector(meant.Axes.Z, axes.Z);
        }
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Strengths_and_moduli_in_the_model_are_those_that_were_meant(string name)
    {
        var (sample, reading) = Read(name);

        foreach (var meant in sample.Members)
        {
            var material = reading.Catalog.Members.Single(m => m.Key == meant.Key).Material;
            Assert.Equal(meant.Material.Name, material.Name);
            if (meant.Material.InProperties && meant.Material.Strength is { } strength) Reading.AssertNear(strength, Reading.Value(material.Yield));
            else Assert.Equal(ReasonCode.NoStrength, Reading.Why(material.Yield).Code);
            if (meant.Material.InProperties && meant.Material.Modulus is { } modulus) Reading.AssertNear(modulus, Reading.Value(material.Modulus));
        }
    }

    [Theory]
    [InlineData("gangway-rails")]
    [InlineData("mast-stays")]
    public void Section_forces_are_those_that_were_meant(string name)
    {
        var (sample, reading) = Read(name);

        var compared = 0;
        foreach (var meant in sample.Members)
            foreach (var forces in reading.Forces.Where(f => f.MemberKey == meant.Key))
            {
                var situation = meant.Situations.Single(s => s.Name == forces.Situation.Name);
                Assert.Null(forces.Unusable);
                Assert.True(forces.Situation.ActsInFull);
                Assert.Equal(situation.IsService ? SituationKind.Service : SituationKind.Design, forces.Situation.Kind);
                var stations = ForceLine.Build(forces.Stations, meant.Length).Stations;
                Assert.Equal(situation.Stations.Length, stations.Length);
                foreach (var (expected, actual) in situation.Stations.Zip(stations))
                {
                    Assert.True(Math.Abs(expected.X - actual.X) < 1e-9);
                    Near.Forces(expected.Forces, actual.Forces, 1e-8);
                }

                compared++;
            }

        Assert.True(compared >= 10, $"{compared}");
    }

    private static (SampleModel Sample, Reading Reading) Read(string name)
    {
        var sample = s_samples.Value.Single(s => s.Name == name);
        return (sample, Reading.Of(sample.Model.AsMemory()));
    }
}
