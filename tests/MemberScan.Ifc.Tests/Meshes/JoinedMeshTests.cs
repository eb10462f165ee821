using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Tests.Sections;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Members;
using MemberScan.Model.Rules;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Meshes;

/// <summary>Meshes whose bars are joined: each straight run is an item with its own section and length, or the mesh is refused with the reason.</summary>
public sealed class JoinedMeshTests
{
    private static readonly ReadingRules s_asked = new() { RecogniseMeshes = true };

    // Gangway rail that turns down at its end and back along the landing.
    private static readonly Vector3[] s_line = [new(0, 0, 1), new(1.2, 0, 1), new(1.2, 0.8, 1.1), new(1.2, 0.8, 0.4)];

    [Theory]
    [InlineData("faceted", 8, true)]
    [InlineData("faceted", 24, true)]
    [InlineData("faceted", 64, true)]
    [InlineData("faceted", 24, false)]
    [InlineData("triangles", 24, false)]
    [InlineData("polygons", 12, false)]
    public void A_bar_with_mitred_corners_gives_an_item_for_each_straight_run(string form, int facets, bool isHollow)
    {
        CrossSection section = isHollow ? new Tube(0.02415, 0.0032) : new Round(0.02415);
        var mesh = JoinedMesh.Along(s_line, isHollow ? [0.02415, 0.02095] : [0.02415], facets);

        var members = Read(form, mesh, Bars.Askew).Catalog.Members;

        Assert.Equal(3, members.Length);
        for (var i = 0; i < 3; i++)
        {
            var (from, to) = (Bars.Askew.Point(s_line[i]), Bars.Askew.Point(s_line[i + 1]));
            ProfileReaderTests.AssertAlike(section, Reading.Shape(members[i]), 1e-6);
            Reading.AssertNear((to - from).Length, Reading.Value(members[i].Length), 1e-8);
            Assert.Equal((i + 1, 3), (members[i].ItemNumber, members[i].ItemCount));
            var axes = Reading.Value(members[i].Axes);
            var isForward = axes.X.Dot(to - from) > 0;
            Near.Vector(isForward ? from : to, axes.Origin, 1e-8);
            Near.Vector(1 / (to - from).Length * (isForward ? to - from : from - to), axes.X, 1e-8);
            Assert.StartsWith("recognised from mesh IFC", ((Model.Finding<SectionFinding>.Found)members[i].Section).Source, StringComparison.Ordinal);
            Assert.Contains(members[i].Notes, n => n.Contains("one straight run of a mesh", StringComparison.Ordinal));
            Assert.Equal(!isHollow, members[i].Notes.Any(n => n.Contains("shows no bore", StringComparison.Ordinal)));
        }
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_bend_of_many_facets_joins_two_runs_and_is_no_run_itself(Release release)
    {
        // Quarter circle of radius 0.12 m in twelve chords between two straight parts.
        List<Vector3> line = [new(0, 0, 0)];
        for (var i = 0; i <= 12; i++) line.Add(new Vector3(1 + 0.12 * Math.Sin(i * Math.PI / 24), 0.12 - 0.12 * Math.Cos(i * Math.PI / 24), 0));
        line.Add(new Vector3(1.12, 0.92, 0));

        var members = Read("faceted", JoinedMesh.Along(line, [0.02415, 0.02095], 24), release: release).Catalog.Members;

        Assert.All(members, m => Assert.Contains(m.Notes, n => n.StartsWith("12 straight pieces of the mesh are shorter than 3 times", StringComparison.Ordinal)));
        Assert.Equal([1, 0.8], members.Select(m => Math.Round(Reading.Value(m.Length), 8)));
        Assert.All(members, m => ProfileReaderTests.AssertAlike(new Tube(0.02415, 0.0032), Reading.Shape(m), 1e-6));
    }

    [Fact]
    public void A_post_on_the_flat_side_of_a_bar_reaches_to_its_axis()
    {
        // A rail of 80 × 40 mm, 2 m long, with a round post of 30 mm that ends 0.9 m above its upper face: 0.92 m from its axis.
        var members = Read("faceted", JoinedMesh.FlatWith(2, 0.080, 0.040, 0.015, 0.9, 16)).Catalog.Members;

        Assert.Equal(2, members.Length);
        var flat = Assert.IsType<Rectangle>(Reading.Shape(members[0]));
        Assert.Equal([0.040, 0.080], new[] { flat.Width, flat.Depth }.Order(), (a, b) => Math.Abs(a - b) < 1e-9);
        Reading.AssertNear(2, Reading.Value(members[0].Length), 1e-9);
        ProfileReaderTests.AssertAlike(new Round(0.015), Reading.Shape(members[1]), 1e-6);
        Reading.AssertNear(0.92, Reading.Value(members[1].Length), 1e-9);
        Near.Vector(new Vector3(1, 0, 0), Reading.Value(members[1].Axes).Origin, 1e-9);
    }

    [Fact]
    public void Bodies_that_share_a_shell_are_items_of_their_own_and_what_is_no_bar_among_them_is_told()
    {
        var bars = JoinedMesh.Along([new(0, 0, 0), new(2, 0, 0)], [0.02415, 0.02095], 24).With(JoinedMesh.Along([new(1, 0, -0.03), new(1, 0, -1)], [0.010], 12));
        var cone = JoinedMesh.Along([new(3, 0, 0), new(3, 0, 0.5)], [0.02], 12).Changed(p => p.Z > 0.4 ? new Vector3(3 + 0.5 * (p.X - 3), 0.5 * p.Y, p.Z) : p);

        var members = Read("faceted", bars.With(cone)).Catalog.Members;

        Assert.Equal(["tube", "round"], members.Select(m => Reading.Shape(m).Kind));
        Assert.Equal([2, 0.97], members.Select(m => Math.Round(Reading.Value(m.Length), 8)));
        Assert.All(members, m => Assert.Contains(m.Notes, n => n.Contains("1 further bodies", StringComparison.Ordinal) && n.Contains("1 of its 3 parts", StringComparison.Ordinal)));
    }

    [Fact]
    public void Without_being_asked_for_the_runs_are_told_and_not_used()
    {
        var model = Bars.Model(Release.Ifc4);
        Add(model, "faceted", JoinedMesh.Along(s_line, [0.02415, 0.02095], 24));

        var why = Reading.Why(Reading.Of(model).Only.Section);

        Assert.Equal(ReasonCode.MeshNotAllowed, why.Code);
        Assert.Contains("could be recognised as 3 bars (tube 48.3", why.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("tapered", "no straight prism")]
    [InlineData("twisted", "its ends differ")]
    [InlineData("curved", "no straight piece of it is three times")]
    [InlineData("curved behind a run", "in a row")]
    [InlineData("reduced between runs", "belongs to no straight piece")]
    [InlineData("drilled", "a hole in it")]
    [InlineData("dented", "lie on no straight piece")]
    [InlineData("pointed", "neither plane nor on another bar")]
    [InlineData("bore drawn as a body", "lies within another")]
    public void What_is_no_set_of_straight_runs_is_refused_with_the_reason(string miss, string words)
    {
        static List<Vector3> Arc(Vector3 from, double radius, double angle, int steps) =>
            [.. Enumerable.Range(0, steps + 1).Select(i => from + new Vector3(radius * Math.Sin(i * angle / steps), radius - radius * Math.Cos(i * angle / steps), 0))];
        Vector3[] corner = [new(0, 0, 0), new(1, 0, 0), new(1, 1, 0)];
        var mesh = miss switch
        {
            "tapered" => JoinedMesh.Along(corner, [0.02], 16).Changed(p => p + (p.X > 0.5 ? 0.01 : 0) * p.Z * Vector3.UnitZ + (p.Y > 0.5 ? 0.1 : 0) * p.Z * Vector3.UnitZ + (p.Y < 0.5 ? 0.05 : 0) * (p.X < 0.5 ? p.Y : 0) * Vector3.UnitY),
            "twisted" => JoinedMesh.Along([new(0, 0, 0), new(1, 0, 0)], [0.02], 16).Changed(p => p.X > 0.5 ? new Vector3(p.X, p.Y - 0.05 * p.Z, p.Z + 0.05 * p.Y) : p),
            "curved" => JoinedMesh.Along(Arc(Vector3.Zero, 1, 1.5, 60), [0.02], 16),
            "curved behind a run" => JoinedMesh.Along([new(-1, 0, 0), .. Arc(Vector3.Zero, 1, 1.5, 60)], [0.02], 16),
            "reduced between runs" => JoinedMesh.Along([new(0, 0, 0), new(1, 0, 0), new(1.5, 0, 0), new(2.5, 0, 0)], [0.02], 16).Changed(p => p.X > 1.2 ? new Vector3(p.X, 0.7 * p.Y, 0.7 * p.Z) : p),
            "drilled" => JoinedMesh.FlatWith(1, 0.080, 0.040, 0.010, 0, 16),
            "dented" => Dented(),
            "pointed" => JoinedMesh.Along(corner, [0.02], 16).Changed(p => p.Y > 0.9 ? p + Math.Abs(p.Z) * Vector3.UnitY : p),
            _ => JoinedMesh.Along([new(0, 0, 0), new(1, 0, 0)], [0.02], 16).With(JoinedMesh.Along([new(0.001, 0, 0), new(0.999, 0, 0)], [0.017], 16)),
        };

        var why = Reading.Why(Assert.Single(Read("faceted", mesh).Catalog.Members).Section);

        Assert.Equal(ReasonCode.SectionNotParametric, why.Code);
        Assert.Contains(words, why.Message, StringComparison.Ordinal);
    }

    /// <summary>A square bar whose upper side has a dent in the form of a pyramid.</summary>
    private static JoinedMesh Dented()
    {
        var mesh = JoinedMesh.FlatWith(1, 0.040, 0.040, 0.010, 0.5, 4);
        mesh.Faces.RemoveAll(face => face.Any(loop => loop.Any(i => i >= 12)));
        mesh.Points.RemoveRange(12, 4);
        mesh.Points.Add(new Vector3(0.5, 0, 0.012));
        for (var k = 0; k < 4; k++) mesh.Faces.Add([[8 + k, 8 + (k + 1) % 4, 12]]);
        return mesh;
    }

    [Fact]
    public void A_hundred_bent_bars_with_noise_are_recovered_within_half_a_percent_or_refused()
    {
        var random = new Random(20260301);
        var model = Bars.Model(Release.Ifc4);
        var meant = new List<(double Radius, double Wall, double Noise, List<Vector3> Line)>();
        for (var i = 0; i < 100; i++)
        {
            var radius = 0.01 + 0.04 * random.NextDouble();
            var wall = i % 2 == 0 ? radius : radius * (0.08 + 0.3 * random.NextDouble());
            List<Vector3> line = [Vector3.Zero];
            var along = Any(random);
            for (var k = 0; k < 2 + i % 3; k++)
            {
                line.Add(line[^1] + (12 + 30 * random.NextDouble()) * radius / along.Length * along);
                var next = Any(random);
                along = 1.2 / along.Length * along + 1 / next.Length * next;
            }

            var noise = i % 4 == 0 ? 0 : wall * Math.Pow(10, -5 + 2.5 * random.NextDouble());
            var mesh = JoinedMesh.Along(line, wall < radius ? [radius, radius - wall] : [radius], 8 + 4 * random.Next(15)).Changed(p => p + noise * Any(random));
            Bars.Add(model, FormattableString.Invariant($"P{i}"), model.Bodies.FacetedBody(mesh.Points, mesh.Faces));
            meant.Add((radius, wall, noise / wall, line));
        }

        var members = Reading.Of(model, s_asked).Catalog.Members;

        var recovered = 0;
        for (var i = 0; i < meant.Count; i++)
        {
            var (radius, wall, noise, line) = meant[i];
            var runs = members.Where(m => m.Element.Name == FormattableString.Invariant($"P{i}")).ToList();
            if (!runs[0].Section.TryGet(out _, out var why))
            {
                Assert.True(noise > 1e-4, FormattableString.Invariant($"P{i}, noise {noise:E1}: {why.Message}"));
                continue;
            }

            recovered++;
            Assert.Equal(line.Count - 1, runs.Count);
            for (var k = 0; k < runs.Count; k++)
            {
                var shape = Reading.Shape(runs[k]);
                Reading.AssertNear(2 * radius, shape.ExtentY, 0.005);
                Reading.AssertNear(wall, shape is Tube tube ? tube.Wall : shape.ExtentY / 2, 0.005);
                Reading.AssertNear((line[k + 1] - line[k]).Length, Reading.Value(runs[k].Length), 0.005);
            }
        }

        Assert.InRange(recovered, 50, 100);
        TestContext.Current.TestOutputHelper!.WriteLine("{0} of 100 recovered", recovered);
    }

    private static Vector3 Any(Random random) => new(2 * random.NextDouble() - 1, 2 * random.NextDouble() - 1, 2 * random.NextDouble() - 1);

    private static Reading Read(string form, JoinedMesh mesh, Transform3? at = null, Release release = Release.Ifc4)
    {
        var model = Bars.Model(release);
        Add(model, form, mesh, at);
        return Reading.Of(model, s_asked);
    }

    private static void Add(ModelWriter model, string form, JoinedMesh mesh, Transform3? at = null) => Bars.Add(model, "R", form switch
    {
        "faceted" => model.Bodies.FacetedBody(mesh.Points, mesh.Faces),
        "triangles" => model.Bodies.Triangles(mesh.Points, mesh.Triangles()),
        _ => model.Bodies.Polygons(mesh.Points, mesh.Faces),
    }, at, "IFCRAILING");
}
