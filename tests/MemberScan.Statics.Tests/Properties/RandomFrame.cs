using CsCheck;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;
using MemberScan.Model.Frames.Loads;

namespace MemberScan.Statics.Tests.Properties;

/// <summary>Seeded small space frames with everything in them: offsets, releases, springs, skewed supports, shear, askew sections, all kinds of loads.</summary>
internal static class RandomFrame
{
    public static readonly Gen<Frame> Frames = Gen.Int[1, 1_000_000].Select(seed => Of(seed));

    public static Frame Of(int seed)
    {
        var random = new Random(seed);
        var nodes = random.Next(3, 8);
        var draft = new FrameDraft();
        for (var n = 0; n < nodes; n++) draft.Node($"N{n}", n * 2.5 + Next(), 3 * Next(), 3 * Next());
        for (var n = 1; n < nodes; n++) draft.Member($"m{n}", $"N{n - 1}", $"N{n}", Section(random), m => Change(m, random));
        if (nodes > 3) draft.Member("brace", "N0", $"N{nodes - 1}", Section(random));
        draft.Support("N0", Restraints.AllFixed);
        var spring = Restraints.AllFree.With(Direction.Ux, Restraint.Spring(1e5)).With(Direction.Uz, Restraint.Fixed).With(Direction.Ry, Restraint.Spring(3e4));
        draft.Support($"N{nodes - 1}", spring, new Vector3(1, Next(), Next()), new Vector3(Next(), 1, Next()));
        foreach (var name in new[] { "a", "b" }) draft.Situation(name, s => Loads(s, draft, random, nodes));
        return draft.Frame;

        double Next() => random.NextDouble() - 0.5;
    }

    public static FrameResult Solve(Frame frame, int threads = 1)
    {
        var diagnostics = new Foundation.Diagnostics.DiagnosticList();
        var result = FrameSolver.Solve(frame, diagnostics, threads);
        Assert.True(result is not null, string.Join("; ", diagnostics.Items.Select(d => d.Message)));
        return result;
    }

    private static FrameSection Section(Random random) => FrameDraft.Bar with
    {
        Iyz = (random.NextDouble() - 0.5) * 3e-7,
        ShearCentreY = 0.02 * (random.NextDouble() - 0.5),
        ShearCentreZ = 0.02 * (random.NextDouble() - 0.5),
    };

    private static FrameMember Change(FrameMember m, Random random)
    {
        var small = new Vector3(0.1 * random.NextDouble(), 0.1 * random.NextDouble(), -0.1 * random.NextDouble());
        m = m with { ShearFlexible = random.Next(2) == 0, ZDirection = new Vector3(random.NextDouble() - 0.5, random.NextDouble() - 0.5, 2) };
        return random.Next(4) switch
        {
            0 => m with { StartOffset = small, EndOffset = -small },
            1 => m with { StartJoint = Restraints.AllFixed.With(Direction.Ry, Restraint.Free).With(Direction.Rz, Restraint.Spring(1e4)) },
            2 => m with { EndJoint = Restraints.AllFixed.With(Direction.Ux, Restraint.Spring(1e6)).With(Direction.Rx, Restraint.Spring(1e4)) },
            _ => m,
        };
    }

    private static FrameSituation Loads(FrameSituation s, FrameDraft draft, Random random, int nodes)
    {
        var axes = (LoadAxes)random.Next(3);
        return s with
        {
            SelfWeight = new Vector3(0, 0.2, -1),
            NodeLoads = [draft.Load("N1", V(1000), V(300))],
            PointLoads = [new(0, 0.4, V(500), V(100), axes), new(1, 0.9, V(500), V(100), LoadAxes.Local)],
            LineLoads = [new MemberLineLoad(0, 0.2, 0.7, V(400), V(400), axes) { MomentFrom = V(50), MomentTo = V(50) }, new(1, null, null, V(300), V(300), LoadAxes.Global)],
            Temperatures = [new(0, 15, 40, -30)],
            Movements = [new(nodes - 1, Direction.Uz, 0.002 * random.NextDouble())],
        };

        Vector3 V(double size) => size * new Vector3(random.NextDouble() - 0.5, random.NextDouble() - 0.5, random.NextDouble() - 0.5);
    }
}
