using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.SampleModels.Units;
using MemberScan.SampleModels.Writing;

namespace MemberScan.SampleModels.Scenario;

/// <summary>Trapezes under the landing's deck as an analysis model with supports and loads and without results.</summary>
public static class DeckTrapezes
{
    /// <summary>File name without extension.</summary>
    public const string Name = "deck-trapezes";

    private const double Half = 0.6, Drop = 0.8;
    private const string Service = "GZG: G + Q";
    private const string Design = "GZT: 1.35 G + 1.5 Q";

    private static readonly SampleMaterial s_s235 = new("S235JR", Si.MPa(235), Si.GPa(210), InProperties: true);

    /// <summary>One trapeze: two rods and the strut between their feet.</summary>
    /// <param name="Strut">Section of the strut.</param>
    /// <param name="RodMm">Diameter of the rods [mm].</param>
    /// <param name="Dead">Permanent load on the strut, downwards [N/m].</param>
    /// <param name="Pipes">Imposed loads on the strut, downwards: places from its start [m] and forces [N].</param>
    private sealed record Trapeze(CrossSection Strut, double RodMm, double Dead, ImmutableArray<(double At, double Force)> Pipes);

    private static readonly ImmutableArray<Trapeze> s_trapezes =
    [
        new(new Tube(Si.Mm(24.15), Si.Mm(3.2)), 12, Si.KN(0.3), [(0.3, Si.KN(1.6)), (0.9, Si.KN(1.6))]),
        new(new Tube(Si.Mm(24.15), Si.Mm(3.2)), 12, Si.KN(0.3), [(0.8, Si.KN(3.2))]),
        new(new Rectangle(Si.Mm(12), Si.Mm(60)), 10, Si.KN(0.3), [(0.3, Si.KN(2.5)), (0.9, Si.KN(2.5))]),
        new(new Rectangle(Si.Mm(12), Si.Mm(80)), 6, Si.KN(0.3), [(0.3, Si.KN(4)), (0.9, Si.KN(4))]),
    ];

    /// <summary>Writes the sample.</summary>
    public static SampleModel Write()
    {
        var writer = new ModelWriter(SchemaVersion.Ifc4, ModelUnits.MillimetreKilonewton, Name);
        var builder = new LandingBuilder(writer, Name, Transform3.Identity, resultsInGlobalAxes: false);
        var frame = new FrameWriter(writer, "Trapezes");
        var (dead, imposed) = (frame.Case("G", onTop: false), frame.Case("Q", onTop: false));
        for (var i = 0; i < s_trapezes.Length; i++) Add(builder, frame, i + 1, s_trapezes[i], dead, imposed);
        frame.Combination(Service, "SLS", (dead, 1), (imposed, 1));
        frame.Combination(Design, "ULS", (dead, 1.35), (imposed, 1.5));
        frame.Finish();
        return builder.Build([], DescriptionPage.Write(Prose, builder.Members));
    }

    private static void Add(LandingBuilder builder, FrameWriter frame, int number, Trapeze trapeze, int dead, int imposed)
    {
        var x = 1.5 * number;
        Vector3[] tops = [new(x, -Half, 0), new(x, Half, 0)], feet = [new(x, -Half, -Drop), new(x, Half, -Drop)];
        var clamp = frame.Condition("fixed", "fixed", "fixed", "fixed", "fixed", "fixed");
        var hinge = frame.Condition("fixed", "fixed", "fixed", "fixed", "free", "free");

        var strut = Member($"Trapeze strut {number}", $"TZ-{number}0", trapeze.Strut, feet[0], Vector3.UnitY, Vector3.UnitZ, 2 * Half, Both(Strut(trapeze, isDead: true), Strut(trapeze, isDead: false)));
        var line = Write(builder, frame, strut);
        frame.LineAction(line, dead, new(0, 0, -trapeze.Dead));
        foreach (var (at, force) in trapeze.Pipes) frame.PointAction(line, imposed, new(0, 0, -force), place: feet[0] + at * Vector3.UnitY);
        for (var side = 0; side < 2; side++)
        {
            // A rod carries its end's reaction of the strut.
            var (g, q) = (trapeze.Dead * Half, trapeze.Pipes.Sum(p => p.Force * (side == 0 ? 2 * Half - p.At : p.At) / (2 * Half)));
            var rod = Member($"Trapeze rod {number}{"ab"[side]}", $"TZ-{number}{side + 1}", new Round(Si.Mm(trapeze.RodMm / 2)), tops[side], -Vector3.UnitZ, Vector3.UnitX, Drop,
                Both(Effects.Cantilever(Drop, g), Effects.Cantilever(Drop, q)));
            var rodLine = Write(builder, frame, rod);
            frame.Join(rodLine, frame.Node($"Top {rod.Tag}", tops[side], clamp));
            var foot = frame.Node($"Foot {rod.Tag}", feet[side]);
            frame.Join(rodLine, foot);
            frame.Join(line, foot, hinge);
        }
    }

    private static SampleMember Member(string name, string tag, CrossSection section, Vector3 start, Vector3 along, Vector3 z, double length, ImmutableArray<SampleSituation> situations) => new()
    {
        Name = name,
        Tag = tag,
        Section = section,
        Material = s_s235,
        Axes = MemberAxes.From(start, along, z)!,
        Length = length,
        Situations = situations,
    };

    /// <summary>The body, and the analytical member that stands for it.</summary>
    private static int Write(LandingBuilder builder, FrameWriter frame, SampleMember member)
    {
        var element = builder.Add(member);
        var line = frame.Member(member.Name, member.Axes.Origin, member.Axes.Origin + member.Length * member.Axes.X, member.Axes.Z);
        builder.Writer.Rooted("IFCRELASSIGNSTOPRODUCT", "link " + member.Tag, null, Spelling.References([line]), "$", Spelling.Reference(element));
        return line;
    }

    /// <summary>The strut as a simple span: w·x(L − x)/2 of the permanent load, P·b·x/L and P·a·(L − x)/L of each pipe; loads downwards, so all negative.</summary>
    private static ImmutableArray<ForceStation> Strut(Trapeze trapeze, bool isDead)
    {
        const double L = 2 * Half;
        var pipes = isDead ? [] : trapeze.Pipes;
        var stations = ImmutableArray.CreateBuilder<ForceStation>();
        foreach (var x in Enumerable.Range(0, 9).Select(i => L * i / 8).Concat(trapeze.Pipes.Select(p => p.At)).Distinct().Order())
        {
            if (x > 0) stations.Add(At(x, afterJump: false));
            if (x == 0 || trapeze.Pipes.Any(p => p.At.Equals(x))) stations.Add(At(x, afterJump: true));
        }

        return stations.ToImmutable();

        ForceStation At(double x, bool afterJump)
        {
            var (v, m) = isDead ? (-trapeze.Dead * (L / 2 - x), -trapeze.Dead * x * (L - x) / 2) : (0, 0);
            foreach (var (a, p) in pipes)
            {
                var isBefore = x < a || (x.Equals(a) && !afterJump);
                v -= isBefore ? p * (L - a) / L : -p * a / L;
                m -= x <= a ? p * (L - a) * x / L : p * a * (L - x) / L;
            }

            return new ForceStation(x, new SectionForces(0, 0, v, 0, m, 0));
        }
    }

    private static ImmutableArray<SampleSituation> Both(ImmutableArray<ForceStation> g, ImmutableArray<ForceStation> q) =>
        [new(Service, true, Effects.Combine(1, g, 1, q)), new(Design, false, Effects.Combine(1.35, g, 1.5, q))];

    private const string Prose = """
        # deck-trapezes.ifc

        Trapezes under the deck of a cable-ferry landing, IFC4, millimetre, kilonewton, megapascal. Everything in it is invented for demonstration.

        What it shows:

        - an analysis model with supports, releases and loads and without results: `screen` solves it by its own frame analysis and says so on every result;
        - members that give the analytical lines their sections and materials, linked by IfcRelAssignsToProduct;
        - load cases `G` (uniform on the struts) and `Q` (pipes as point loads), combinations `GZG: G + Q` and `GZT: 1.35 G + 1.5 Q` with their factors;
        - struts hinged on the feet of two rods, which are clamped under the deck: simple spans, so that the calculation below needs no frame.
          Self-weight is left out.
        """;
}
