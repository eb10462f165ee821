using MemberScan.Mechanics.Edges;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Meshes;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Mechanics.Tests.Profiles;

namespace MemberScan.Mechanics.Tests.Warping;

/// <summary>Numerical fields of boxes, open profiles and outlines against a boundary integral and against an energy bound.</summary>
public sealed class IndependentRouteTests
{
    private const double Poisson = 0.3;

    private static readonly Dictionary<string, CrossSection> s_sections = new()
    {
        ["sharp box"] = new Box(0.060, 0.040, 0.006),
        ["box whose arcs have two centres"] = new Box(0.050, 0.040, 0.008, 0.006, 0.004),
        ["round outside, nearly sharp inside"] = new Box(0.050, 0.050, 0.005, 0.010, 0.002),
        ["angle"] = ProfileSamples.All[0],
        ["rolled angle"] = ProfileSamples.All[1],
        ["rolled beam"] = ProfileSamples.All[2],
        ["rolled channel"] = ProfileSamples.All[3],
        ["tee"] = ProfileSamples.All[4],
        ["plate with a hole"] = ProfileSamples.All[5],
        ["half disc"] = ProfileSamples.All[6],
        ["gusset"] = new OutlineSection("gusset", [[new(0, 0), new(0.060, 0), new(0.060, 0.012), new(0.020, 0.030), new(0.012, 0.050), new(0, 0.050)]]),
    };

    public static TheoryData<string> Names => [.. s_sections.Keys];

    // Of open walls the route finds small stresses as differences of large ones and lacks the digits; their bounds stand below.
    public static TheoryData<string> CompactNames => [.. s_sections.Where(pair => pair.Value is not OpenProfile).Select(pair => pair.Key)];

    [Theory]
    [MemberData(nameof(CompactNames))]
    public void The_torsion_constant_and_the_stresses_agree_with_a_boundary_integral(string name)
    {
        var section = s_sections[name];
        var field = Samples.Field(section, ShearModel.Elasticity, Poisson);
        var p = field.Properties;
        var (route, shape) = RouteOf(section);

        Assert.InRange(p.J!.Value / route.J(p.Iy + p.Iz), 1 - 5e-4, 1 + 5e-4);

        // dσ/dx = y needs Vy = Iz, Vz = Iyz; dσ/dx = z needs Vy = Iyz, Vz = Iy.
        (SectionForces Forces, Func<double, double, (double XY, double XZ)> Stress)[] cases =
        [
            (new SectionForces(0, 0, 0, p.J!.Value, 0, 0), route.Twist()),
            (new SectionForces(0, p.Iz, p.Iyz, 0, 0, 0), route.Flexure(1, 0, Poisson)),
            (new SectionForces(0, p.Iyz, p.Iy, 0, 0, 0), route.Flexure(0, 1, Poisson)),
        ];
        var points = Points(field, shape);
        foreach (var (forces, stress) in cases)
        {
            var largest = field.Govern(forces, StressMeasure.Tau).Value;
            var peak = field.FilletPeak(forces, StressMeasure.Tau)?.Value ?? 0;
            foreach (var (y, z) in points)
            {
                var (xy, xz) = stress(y, z);
                var state = field.At(forces, y, z);
                var difference = double.Hypot(state.TauXY - xy, state.TauXZ - xz);
                var allowed = field.Decides(y, z) ? 0.005 * largest : 0.01 * Math.Max(largest, peak);

                Assert.True(difference <= allowed, $"{name}, {forces} at {y:G5}, {z:G5}: {state.TauXY:G6}, {state.TauXZ:G6} against {xy:G6}, {xz:G6}, largest {largest:G5}");
            }
        }
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void The_torsion_constant_lies_between_its_bounds(string name)
    {
        var section = s_sections[name];
        var upper = Samples.Field(section, ShearModel.Elasticity).Properties.J!.Value;

        var lower = EnergyBound.J(MeshOf(section), OutlineRings.VerticesOf(section), 8);

        Assert.InRange(upper / lower, 1 - 1e-7, 1.0005);
    }

    private static PatchMesh MeshOf(CrossSection section) => section switch
    {
        Box box => WalledMesh.Of(box),
        OpenProfile profile => JunctionMesh.Of(ProfileJunctions.Of(profile), ProfileJunctions.IsQuarter(profile), 0.5 * Math.Max(profile.Width, profile.Depth)),
        _ => OutlineMesh.TryOf(new OutlineShape(ProfileEdges.Of(section)))!,
    };

    private static (BoundaryIntegral Route, OutlineShape Shape) RouteOf(CrossSection section)
    {
        const int AtCorners = 6, AtJoints = 2;

        var edges = OutlineRings.EdgesOf(section);
        var shape = new OutlineShape(edges);
        var route = new BoundaryIntegral();
        foreach (var edge in edges.Where(edge => edge.Length > 0))
        {
            var panel = Math.Min(1.0 * shape.Thickness(edge, 0.5), 0.25 * shape.Extent);
            int Halvings(double share) => edges.Any(other => other != edge && IsSmooth(edge, share, other, 1 - share)) ? AtJoints : AtCorners;
            route.Edge(edge, edge.IsArc ? Math.Min(panel, 0.6 * edge.Radius) : panel, Halvings(0), Halvings(1));
        }

        return (route, shape);
    }

    // Whether two edges meet without a corner.
    private static bool IsSmooth(EdgeCurve one, double share, EdgeCurve other, double there)
    {
        var ((y, z), (dy, dz)) = one.WithSlope(share);
        var ((oy, oz), (ody, odz)) = other.WithSlope(there);
        return double.Hypot(y - oy, z - oz) <= 1e-9 * one.Length && Math.Abs(dy * odz - dz * ody) <= 1e-6 * double.Hypot(dy, dz) * double.Hypot(ody, odz);
    }

    // Points that decide, some of them close to an edge; at rounded re-entrant corners also those that do not.
    private static List<(double Y, double Z)> Points(StressField field, OutlineShape shape)
    {
        var points = Samples.Points(field, new Random(3), 120).Where(at => field.Decides(at.Y, at.Z)).ToList();
        foreach (var edge in shape.Edges.Where(edge => edge.Length > 0))
        {
            var thickness = shape.Thickness(edge, 0.5);
            foreach (var share in new[] { 0.23, 0.5, 0.81 })
            {
                var ((y, z), (dy, dz)) = edge.WithSlope(share);
                var depth = 0.04 * Math.Min(thickness, edge.IsArc ? edge.Radius : thickness) / double.Hypot(dy, dz);
                var at = (Y: y - depth * dz, Z: z + depth * dy);
                if (field.Decides(at.Y, at.Z) || (edge.IsArc && edge.Sweep < 0)) points.Add(at);
            }
        }

        return points;
    }
}
