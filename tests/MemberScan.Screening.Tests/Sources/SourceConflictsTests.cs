using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Tests.Sources;

/// <summary>A post with results of 10 kN in the combination C1 of the model, and a table beside it.</summary>
public sealed class SourceConflictsTests
{
    [Theory]
    [InlineData(10e3, "C1", "")]
    [InlineData(11e3, "C1", "'C1': results in the model (IFCSTRUCTURALPOINTREACTION #")]
    [InlineData(10e3, "C2", "results in the model have 1 situation that the forces table does not have: 'C1'")]
    public void Another_source_is_shown_where_it_says_something_else(double force, string situation, string words)
    {
        var member = Screen(force, situation);

        Assert.Contains("results in the model are not used for this member: the forces table comes first", member.Notes);
        Assert.Equal(words.Length > 0, member.Notes.Any(n => n.StartsWith("'C1': ", StringComparison.Ordinal) || n.StartsWith("results in the model have", StringComparison.Ordinal)));
        if (words.Length > 0) Assert.Contains(member.Notes, n => n.StartsWith(words, StringComparison.Ordinal));
    }

    [Fact]
    public void The_difference_is_a_share_of_the_largest_force() =>
        // 11 kN in the table against 10 kN in the model: 1/11 of the largest.
        Assert.Contains(Screen(11e3, "C1").Notes, n => n.EndsWith("differ by 9.1 % of the largest force or moment, at 0 m", StringComparison.Ordinal));

    private static MemberResult Screen(double force, string situation)
    {
        var writer = Landing.Writer();
        var post = Landing.Add(writer, Landing.Shape(writer, Landing.PostTube, 1));
        var analysis = writer.StartAnalysis("Landing analysis", Transform3.Identity);
        var line = analysis.CurveMember("A P-1", Vector3.Zero, Vector3.UnitZ, Vector3.UnitY);
        analysis.Link(post, line);
        var group = analysis.ResultGroup("R", analysis.LoadCombination("C1", "SLS", (analysis.LoadCase("G"), 1)));
        foreach (var place in new[] { Vector3.Zero, Vector3.UnitZ }) analysis.PointReaction(line, group, new(10e3, 0, 0, 0, 0, 0), place);
        return Landing.ScreenOne(writer.Build(), Landing.Constant(new SectionForces(force, 0, 0, 0, 0, 0), situation: situation));
    }
}
