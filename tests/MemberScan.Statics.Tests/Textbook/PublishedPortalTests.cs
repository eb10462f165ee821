using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;

namespace MemberScan.Statics.Tests.Textbook;

/// <summary>
/// The portal of the open model structural-portal-frame-results-ifc4.ifc: 192 × 120 in, fixed bases, 100 lbf/in down on the right half of the
/// beam. Figures in lbf and in, read by hand from its point and curve reactions.
/// </summary>
public sealed class PublishedPortalTests
{
    private const double Height = 120, Span = 192, Load = 100;

    /// <summary>
    /// What the file stores comes from a stiffer section than it names, and from members that shear: EA = 3.625e9 lbf, EI = 7.25e10 lbf·in²,
    /// GAs = 1.15e9 lbf give its displacements back.
    /// </summary>
    [Fact]
    public void The_stored_results_come_from_another_section_than_the_file_names()
    {
        var result = Solve(3.625e9, 7.25e10, 1.15e9);

        var (left, right) = (result.Displacement(1), result.Displacement(2));
        Near.Equal(-0.00112040278567376, left.Shift.X, 1e-6);
        Near.Equal(-7.54271659073925E-05, left.Shift.Z, 1e-6);
        Near.Equal(3.08969735441016E-05, left.Turn.Y, 1e-6);
        Near.Equal(-0.00119575654821984, right.Shift.X, 1e-6);
        Near.Equal(-0.000242365937540883, right.Shift.Z, 1e-6);
        Near.Equal(-6.94996291089951E-05, right.Turn.Y, 1e-6);
        Near.Equal(1422.66326629449, result.Reaction(0).Force.X, 1e-4);
        Near.Equal(2278.52897011915, result.Reaction(0).Force.Z, 1e-4);
        Near.Equal(66694.8548930371, result.Reaction(0).Moment.Y, 1e-4);
        Near.Equal(-1422.73493120008, result.Reaction(3).Force.X, 1e-4);
        Near.Equal(7321.47102988085, result.Reaction(3).Force.Z, 1e-4);
        Near.Equal(-43375.4476654014, result.Reaction(3).Moment.Y, 1e-4);
        Near.Equal(104027.289932507, Math.Abs(result.Member(0).ForcesAt(Height, true).My), 1e-4);
        Near.Equal(127343.989381682, Math.Abs(result.Member(2).ForcesAt(0, true).My), 1e-4);
    }

    /// <summary>The section that the file names (8.84 in², 170 in⁴), E read as 29e6 psi and no shear, as an independent solver has it.</summary>
    [Fact]
    public void The_section_that_the_file_names_gives_other_forces()
    {
        var result = Solve(29e6 * 8.84, 29e6 * 170, null);

        Near.Equal(1454.9, result.Reaction(0).Force.X, 4e-5);
        Near.Equal(69549, Math.Abs(result.Reaction(0).Moment.Y), 1e-5);
        Near.Equal(46094, Math.Abs(result.Reaction(3).Moment.Y), 1.2e-5);
        Near.Equal(105035, Math.Abs(result.Member(1).ForcesAt(0, true).My), 1e-5);
        Near.Equal(128490, Math.Abs(result.Member(1).ForcesAt(Span, true).My), 1e-5);
    }

    private static SituationResult Solve(double ea, double ei, double? gas)
    {
        var material = new FrameMaterial("E29", 29e6, 11.2e6);
        var section = new FrameSection { Name = "portal", Area = ea / 29e6, Iy = ei / 29e6, Iz = ei / 29e6, J = 1, ShearAreaY = (gas ?? 0) / 11.2e6, ShearAreaZ = (gas ?? 0) / 11.2e6 };
        var draft = new FrameDraft();
        draft.Node("A", 0, 0, 0);
        draft.Node("B", 0, 0, Height);
        draft.Node("C", Span, 0, Height);
        draft.Node("D", Span, 0, 0);
        foreach (var (name, a, b) in new[] { ("left", "A", "B"), ("beam", "B", "C"), ("right", "C", "D") })
            draft.Member(name, a, b, section, m => m with { ShearFlexible = gas is not null, ZDirection = name == "beam" ? Vector3.UnitZ : Vector3.UnitX }, material);
        draft.Support("A", Restraints.AllFixed).Support("D", Restraints.AllFixed);
        draft.Situation("S", s => s with { LineLoads = [new(1, Span / 2, Span, new(0, 0, -Load), new(0, 0, -Load), Model.Frames.Loads.LoadAxes.Global)] });
        return draft.Solve().Situations[0];
    }
}
