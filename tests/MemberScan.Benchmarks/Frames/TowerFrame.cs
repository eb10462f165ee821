using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;
using MemberScan.Model.Frames.Loads;

namespace MemberScan.Benchmarks.Frames;

/// <summary>A space frame of columns and beams on a rectangular plan, storey above storey, feet fixed.</summary>
internal static class TowerFrame
{
    private const double Bay = 6, Storey = 3.5;

    private static readonly FrameMaterial s_steel = new("S", 210e9, 80.8e9, 78500);
    private static readonly FrameSection s_column = new() { Name = "column", Area = 1.98e-2, Iy = 3.08e-4, Iz = 1.01e-4, J = 2.4e-6 };
    private static readonly FrameSection s_beam = new() { Name = "beam", Area = 8.45e-3, Iy = 2.31e-4, Iz = 1.32e-5, J = 5.1e-7 };

    /// <summary>The frame.</summary>
    /// <param name="nx">Columns along x.</param>
    /// <param name="ny">Columns along y.</param>
    /// <param name="storeys">Storeys; six unknowns a column and storey.</param>
    /// <param name="situations">Situations of node loads, each different.</param>
    public static Frame Of(int nx, int ny, int storeys, int situations)
    {
        var nodes = new List<FrameNode>();
        var members = new List<FrameMember>();
        for (var z = 0; z <= storeys; z++)
            for (var y = 0; y < ny; y++)
                for (var x = 0; x < nx; x++) nodes.Add(new FrameNode($"{x}/{y}/{z}", new Vector3(x * Bay, y * Bay, z * Storey)));
        for (var z = 1; z <= storeys; z++)
        {
            for (var y = 0; y < ny; y++)
            {
                for (var x = 0; x < nx; x++)
                {
                    var at = Number(x, y, z);
                    Add(Number(x, y, z - 1), at, s_column);
                    if (x > 0) Add(Number(x - 1, y, z), at, s_beam);
                    if (y > 0) Add(Number(x, y - 1, z), at, s_beam);
                }
            }
        }

        return new Frame
        {
            Nodes = [.. nodes],
            Members = [.. members],
            Supports = [.. Enumerable.Range(0, nx * ny).Select(n => new FrameSupport(n, Restraints.AllFixed))],
            Situations = [.. Enumerable.Range(0, situations).Select(s => Situation(s, nodes.Count, nx * ny))],
        };

        int Number(int x, int y, int z) => (z * ny + y) * nx + x;

        void Add(int a, int b, FrameSection section) => members.Add(new FrameMember { Name = $"m{members.Count}", Start = a, End = b, Section = section, Material = s_steel });
    }

    private static FrameSituation Situation(int number, int nodes, int feet)
    {
        var random = new Random(number);
        return new FrameSituation
        {
            Name = $"S{number}",
            NodeLoads = [.. Enumerable.Range(feet, nodes - feet).Select(n => new NodeLoad(n, new Vector3(500 * random.NextDouble(), 300 * random.NextDouble(), -20_000), default))],
        };
    }
}
