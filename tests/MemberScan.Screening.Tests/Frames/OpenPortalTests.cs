using System.Collections.Frozen;
using System.Globalization;
using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Model.Frames;
using MemberScan.OpenModels;
using MemberScan.Part21;
using MemberScan.Statics;

namespace MemberScan.Screening.Tests.Frames;

/// <summary>
/// structural-portal-frame-results-ifc4.ifc, read as a frame and solved: topology, supports and the load are the file's. Its stored results
/// are not those of its own section: they fit EA = 3.625e9 lbf, EI = 7.25e10 lbf·in² and GAs = 1.15e9 lbf (that is E = 29e6 psi with A = 125 in² and
/// I = 2,500 in⁴, against 8.7 in² and 166 in⁴ of its W10X30), and members that are flexible in shear.
/// </summary>
public sealed class OpenPortalTests
{
    private const double Pound = 4.44822162, Inch = 0.0254, E = 29e6 * Pound / (Inch * Inch);

    [Fact]
    public void With_the_stiffness_behind_the_stored_results_displacements_and_reactions_are_met()
    {
        var (area, inertia) = (3.625e9 * Pound / E, 7.25e10 * Pound * Inch * Inch / E);
        var section = new FrameSection { Name = "fitted", Area = area, Iy = inertia, Iz = inertia, J = inertia, ShearAreaY = 1.15e9 * Pound / (E / 2.6), ShearAreaZ = 1.15e9 * Pound / (E / 2.6) };

        var result = Solve(section, isShearFlexible: true);

        // #2746 and #2764, in and rad: displacements of the two knees, within 1e-6 of the largest of each kind.
        AssertMoved(result, new(0, 0, 120), -0.00112040278567376, -7.54271659073925E-05, 3.08969735441016E-05);
        AssertMoved(result, new(192, 0, 120), -0.00119575654821984, -0.000242365937540883, -6.94996291089951E-05);

        // #2740 and #2758, lbf and lbf·in, within 1e-4 of the largest.
        AssertReaction(result, Vector3.Zero, 1422.66326629449, 2278.52897011915, 66694.8548930371);
        AssertReaction(result, new(192, 0, 0), -1422.73493120008, 7321.47102988085, -43375.4476654014);
    }

    private static FrameResult Solve(FrameSection section, bool isShearFlexible)
    {
        // The file's own profile is put aside: a rectangle stands for it, whose section is replaced here.
        var text = Encoding.UTF8.GetString(ModelContainer.Read(OpenModel.Path("structural-portal-frame-results-ifc4.ifc")).Bytes)
            .Replace("IFCISHAPEPROFILEDEF(.AREA.,'W10X30',$,5.81,10.5,0.3,0.51,0.125,$,$)", "IFCRECTANGLEPROFILEDEF(.AREA.,'W10X30',$,5.81,10.5)", StringComparison.Ordinal);
        var diagnostics = new DiagnosticList();
        var rules = Settings.Default.Reading with { MissingUnits = new Dictionary<string, double> { ["TORQUEUNIT"] = Pound * Inch }.ToFrozenDictionary() };
        var model = IfcModel.Open(Part21File.Read(Encoding.UTF8.GetBytes(text), "portal.ifc", diagnostics), rules, diagnostics)!;

        var read = Assert.Single(model.ReadFrames(model.ReadMembers(_ => false).Members));

        Assert.Empty(read.Refusals);
        Assert.True(read.HasLoads && read.HasResults);
        var material = new FrameMaterial("fitted", E, E / 2.6);
        var frame = read.Frame! with { Members = [.. read.Frame.Members.Select(m => m with { Section = section, Material = material, ShearFlexible = isShearFlexible })] };
        Assert.Equal((4, 3, 2), (frame.Nodes.Length, frame.Members.Length, frame.Supports.Length));
        var result = FrameSolver.Solve(frame, diagnostics);
        Assert.True(result is not null, string.Join('\n', diagnostics.Items.Select(d => d.Message)));
        return result;
    }

    private static int Node(FrameResult result, Vector3 inches) => result.Frame.Nodes.Select((n, i) => (n, i)).Single(p => (p.n.Position - Inch * inches).Length < 1e-6).i;

    private static SupportReaction ReactionAt(FrameResult result, Vector3 inches) => result.Situations[0].Reaction(Node(result, inches));

    private static void AssertMoved(FrameResult result, Vector3 inches, double x, double z, double turn)
    {
        var moved = result.Situations[0].Displacement(Node(result, inches));
        AssertNear(x, moved.Shift.X / Inch, 1e-6 * 0.0012);
        AssertNear(z, moved.Shift.Z / Inch, 1e-6 * 0.0012);
        AssertNear(turn, moved.Turn.Y, 1e-6 * 7e-5);
    }

    private static void AssertReaction(FrameResult result, Vector3 inches, double x, double z, double moment)
    {
        var reaction = ReactionAt(result, inches);
        AssertNear(x, reaction.Force.X / Pound, 1e-4 * 7321);
        AssertNear(z, reaction.Force.Z / Pound, 1e-4 * 7321);
        AssertNear(moment, reaction.Moment.Y / (Pound * Inch), 1e-4 * 66_694);
    }

    private static void AssertNear(double expected, double actual, double within) =>
        Assert.True(Math.Abs(expected - actual) <= within, string.Create(CultureInfo.InvariantCulture, $"expected {expected:R}, got {actual:R}, within {within:R}"));
}
