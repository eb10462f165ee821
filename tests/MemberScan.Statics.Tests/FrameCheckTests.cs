using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;
using MemberScan.Model.Frames.Loads;

namespace MemberScan.Statics.Tests;

/// <summary>Bad frames are refused, each with the code of its fault and the name of what is wrong.</summary>
public sealed class FrameCheckTests
{
    public static TheoryData<string, string, string> Faults => new()
    {
        { "no members", "STA-0001", "members" },
        { "too many stations", "STA-0001", "m1" },
        { "not finite", "STA-0002", "N1" },
        { "negative E", "STA-0002", "E of material S" },
        { "no area", "STA-0002", "A of section bar" },
        { "Iyz", "STA-0002", "Iyz of section bar" },
        { "no shear area", "STA-0002", "Asz of section bar" },
        { "spring", "STA-0002", "uz of the support of node N0" },
        { "doubled", "STA-0003", "N0" },
        { "no length", "STA-0004", "m1" },
        { "z along x", "STA-0005", "m1" },
        { "no supports", "STA-0006", "no supports" },
        { "two supports", "STA-0006", "N0" },
        { "support axes", "STA-0006", "N0" },
        { "moved but free", "STA-0006", "N0" },
        { "load beyond", "STA-0007", "m1" },
        { "line backwards", "STA-0007", "m1" },
        { "movement", "STA-0007", "N1" },
        { "nested", "STA-0007", "combines C" },
        { "station beyond", "STA-0012", "m1" },
    };

    [Theory]
    [MemberData(nameof(Faults))]
    public void A_fault_is_named(string fault, string code, string named)
    {
        var diagnostics = new DiagnosticList();

        Assert.Null(FrameSolver.Solve(Broken(fault), diagnostics));

        var first = diagnostics.Items.First(d => d.Severity == Severity.Error);
        Assert.Equal(code, first.Code);
        Assert.Contains(named, first.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_number_that_stands_for_no_node_is_the_callers_fault() =>
        Assert.Throws<ArgumentException>(() => FrameSolver.Solve(Good() with { Supports = [new FrameSupport(7, Restraints.AllFixed)] }, new()));

    [Fact]
    public void Few_digits_are_told()
    {
        var draft = FrameDraft.Beam(1000, 1000).Support("N0", Restraints.AllFixed);
        draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1000", new(0, 0, -1))] });
        var diagnostics = new DiagnosticList();

        var result = FrameSolver.Solve(draft.Frame, diagnostics);

        Assert.NotNull(result);
        Assert.Equal("STA-0011", Assert.Single(diagnostics.Items).Code);
        Near.Equal(-1e9 / (3 * 210e9 * FrameDraft.Bar.Iy), result.Situations[0].Displacement(1000).Shift.Z, 1e-3);
    }

    private static Frame Good()
    {
        var draft = FrameDraft.Beam(2, 1).Support("N0", Restraints.AllFixed);
        return draft.Situation("S", s => s).Frame;
    }

    private static Frame Broken(string fault)
    {
        var good = Good();
        var (member, situation, section) = (good.Members[0], good.Situations[0], FrameDraft.Bar);
        return fault switch
        {
            "no members" => good with { Members = [] },
            "too many stations" => Of(member with { Stations = FrameStations.Equal(200_000) }),
            "not finite" => good with { Nodes = good.Nodes.SetItem(1, new FrameNode("N1", new Vector3(double.NaN, 0, 0))) },
            "negative E" => Of(member with { Material = FrameDraft.Steel with { E = -1 } }),
            "no area" => Of(member with { Section = section with { Area = 0 } }),
            "Iyz" => Of(member with { Section = section with { Iyz = 1 } }),
            "no shear area" => Of(member with { ShearFlexible = true, Section = section with { ShearAreaZ = 0 } }),
            "spring" => Held(Restraints.AllFixed.With(Direction.Uz, Restraint.Spring(-3))),
            "doubled" => good with { Nodes = good.Nodes.Add(good.Nodes[0]) },
            "no length" => Of(member with { EndOffset = new Vector3(-2, 0, 0) }),
            "z along x" => Of(member with { ZDirection = new Vector3(5, 0, 0) }),
            "no supports" => good with { Supports = [] },
            "two supports" => good with { Supports = good.Supports.Add(good.Supports[0]) },
            "support axes" => good with { Supports = [good.Supports[0] with { Y = new Vector3(3, 0, 0) }] },
            "moved but free" => Held(Restraints.AllFixed.With(Direction.Uz, new Restraint(RestraintKind.Free, 0, 0.1))),
            "load beyond" => Loaded(situation with { PointLoads = [new(0, 2.1, new(0, 0, 1), default, LoadAxes.Local)] }),
            "line backwards" => Loaded(situation with { LineLoads = [new(0, 1.5, 0.5, new(0, 0, 1), new(0, 0, 1), LoadAxes.Local)] }),
            "movement" => Loaded(situation with { Movements = [new(1, Direction.Ux, 0.1)] }),
            "nested" => good with { Situations = [situation, new FrameSituation { Name = "C", Terms = [new(0, 1)] }, new FrameSituation { Name = "D", Terms = [new(1, 1)] }] },
            "station beyond" => Of(member with { Stations = FrameStations.At([0, 2.5]) }),
            _ => throw new ArgumentOutOfRangeException(nameof(fault)),
        };

        Frame Of(FrameMember changed) => good with { Members = [changed] };

        Frame Held(Restraints restraints) => good with { Supports = [new FrameSupport(0, restraints)] };

        Frame Loaded(FrameSituation loaded) => good with { Situations = [loaded] };
    }
}
