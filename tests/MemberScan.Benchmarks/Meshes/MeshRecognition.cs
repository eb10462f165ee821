using System.Diagnostics;
using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc;
using MemberScan.Model.Rules;
using MemberScan.Part21;
using MemberScan.SampleModels.Units;
using MemberScan.SampleModels.Writing;

namespace MemberScan.Benchmarks.Meshes;

/// <summary>Recognition of 10,000 faceted bodies, each a tube of twelve chords with points of its own.</summary>
internal static class MeshRecognition
{
    private const int Bodies = 10_000, Chords = 12;

    /// <summary>Reads them twice, the second time after everything is compiled, and prints the processor time.</summary>
    public static int Run()
    {
        var bytes = Model();
        foreach (var round in new[] { "first", "second" })
        {
            var before = Environment.CpuUsage.TotalTime;
            var clock = Stopwatch.StartNew();
            var diagnostics = new DiagnosticList();
            var model = IfcModel.Open(Part21File.Read(bytes, "landing.ifc", diagnostics), new ReadingRules { RecogniseMeshes = true }, diagnostics)!;
            var opened = Environment.CpuUsage.TotalTime;
            var found = model.ReadMembers(_ => false).Members.Count(m => m.Section.TryGet(out _, out _));
            var done = Environment.CpuUsage.TotalTime;
            Console.WriteLine(string.Create(
                CultureInfo.InvariantCulture,
                $"{round}: {found} of {Bodies} recognised; text {(opened - before).TotalSeconds:0.00} s, members {(done - opened).TotalSeconds:0.00} s of processor time; {clock.Elapsed.TotalSeconds:0.00} s wall"));
        }

        return 0;
    }

    private static ReadOnlyMemory<byte> Model()
    {
        var writer = new ModelWriter(SchemaVersion.Ifc4, ModelUnits.MillimetreNewton, "landing");
        for (var i = 0; i < Bodies; i++)
        {
            var solid = writer.Bodies.FacetedBody(Points(0.001 * i), Faces());
            writer.Element("IFCMEMBER", $"Hanger {i.ToString(CultureInfo.InvariantCulture)}", writer.LocalPlacement(Transform3.Identity), writer.Bodies.Shape("Brep", solid));
        }

        return writer.Build();
    }

    // Outer and inner ring at the start, then at the end.
    private static Vector3[] Points(double offset)
    {
        Vector3 At(double radius, double z, int k) => new(offset + radius * Math.Cos(2 * Math.PI * k / Chords), radius * Math.Sin(2 * Math.PI * k / Chords), z);
        return [.. from z in new[] { 0.0, 2.0 } from radius in new[] { 0.02415, 0.02095 } from k in Enumerable.Range(0, Chords) select At(radius, z, k)];
    }

    private static List<IReadOnlyList<IReadOnlyList<int>>> Faces()
    {
        int[] Ring(int from) => [.. Enumerable.Range(from, Chords)];
        var faces = new List<IReadOnlyList<IReadOnlyList<int>>> { new[] { Ring(0), Ring(Chords) }, new[] { Ring(2 * Chords), Ring(3 * Chords) } };
        foreach (var ring in new[] { 0, Chords })
            for (var k = 0; k < Chords; k++)
            {
                var next = (k + 1) % Chords;
                faces.Add(new[] { new[] { ring + k, ring + next, ring + next + 2 * Chords, ring + k + 2 * Chords } });
            }

        return faces;
    }
}
