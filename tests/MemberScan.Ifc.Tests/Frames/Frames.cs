using System.Collections.Frozen;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Frames;
using MemberScan.Model.Rules;

namespace MemberScan.Ifc.Tests.Frames;

/// <summary>Small frames of the ferry landing, written and read back.</summary>
internal static class Frames
{
    /// <summary>Units of stiffness, which the written models do not name: kN/m and kN·m/rad.</summary>
    public static ReadingRules Rules { get; } = new()
    {
        MissingUnits = new Dictionary<string, double> { ["LINEARSTIFFNESSUNIT"] = 1e3, ["ROTATIONALSTIFFNESSUNIT"] = 1e3 }.ToFrozenDictionary(),
    };

    /// <summary>A model with steel of stated E and ν on its members.</summary>
    public static ModelWriter Model(Release release) => new(release, FileUnits.MillimetreNewton, "landing");

    /// <summary>A frame of one bar from (0, 0, 0) to (2, 0, 0) m, its left end fixed and its right end free; <paramref name="shape"/> may add to it.</summary>
    public static AnalysisFrame Bar(Release release, Action<FrameWriter, int, (int A, int B)>? shape = null)
    {
        var model = Model(release);
        var writer = new FrameWriter(model, "Landing");
        var fixedEnd = writer.Condition("fixed", "fixed", "fixed", "fixed", "fixed", "fixed");
        var (a, b) = (writer.Node("A", Vector3.Zero, fixedEnd), writer.Node("B", new Vector3(2, 0, 0)));
        var bar = writer.Member("Strut", Vector3.Zero, new Vector3(2, 0, 0), Vector3.UnitZ);
        Steel(model, writer, bar);
        if (shape is null)
        {
            writer.Join(bar, a);
            writer.Join(bar, b);
        }
        else
        {
            shape(writer, bar, (a, b));
        }

        writer.Finish();
        return Read(model);
    }

    /// <summary>Gives members the rail's tube of S235 with E = 210 GPa and ν = 0.3.</summary>
    public static void Steel(ModelWriter model, FrameWriter writer, params int[] members) =>
        writer.Section(model.Materials.Material("S235JR", 235e6, null, 210e9, 0.3), model.Profiles.Of(Bars.Rail), members);

    /// <summary>The one frame of a model.</summary>
    public static AnalysisFrame Read(ModelWriter model) => Assert.Single(Read(model.Build()));

    /// <summary>The frames of a file.</summary>
    public static IReadOnlyList<AnalysisFrame> Read(byte[] bytes, ReadingRules? rules = null)
    {
        var diagnostics = new DiagnosticList();
        var model = IfcModel.Open(Part21.Part21File.Read(bytes, "landing.ifc", diagnostics), rules ?? Rules, diagnostics);
        Assert.NotNull(model);
        return model.ReadFrames(model.ReadMembers(_ => false).Members);
    }
}
