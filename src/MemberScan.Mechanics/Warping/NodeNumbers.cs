using MemberScan.Mechanics.Meshes;

namespace MemberScan.Mechanics.Warping;

/// <summary>Numbers for the nodes on the sides of patches: what lies at the same place has the same number.</summary>
internal sealed class NodeNumbers
{
    // Share of the scale below which two places are one: well below the nearest two nodes of any mesh, well above rounding.
    private const double Same = 2e-12;
    private readonly Dictionary<(long, long), int> _cells = [];
    private readonly List<(double Y, double Z)> _places = [];
    private readonly double _cell;

    /// <summary>Numbers the nodes of a mesh for a degree.</summary>
    public NodeNumbers(PatchMesh mesh, SpectralRule rule)
    {
        _cell = 4 * Same * mesh.Scale;
        var n = rule.Count;
        OfPatch = new int[mesh.Patches.Count][];
        for (var e = 0; e < OfPatch.Length; e++)
        {
            var numbers = new int[4 * (n - 1)];
            for (var k = 0; k < numbers.Length; k++)
            {
                var (i, j) = Side(k, n);
                numbers[k] = Number(mesh.Patches[e].At(rule.Nodes[i], rule.Nodes[j]), Same * mesh.Scale);
            }

            OfPatch[e] = numbers;
        }
    }

    /// <summary>For each patch the numbers of its 4·degree side nodes, in the order of <see cref="Side"/>.</summary>
    public int[][] OfPatch { get; }

    /// <summary>Number of nodes.</summary>
    public int Count => _places.Count;

    /// <summary>Place of a node [m].</summary>
    public (double Y, double Z) Place(int node) => _places[node];

    /// <summary>Row and column of a side node: once around from the corner (−1, −1).</summary>
    public static (int I, int J) Side(int k, int n) => (k / (n - 1)) switch
    {
        0 => (k, 0),
        1 => (n - 1, k - (n - 1)),
        2 => (n - 1 - (k - 2 * (n - 1)), n - 1),
        _ => (0, n - 1 - (k - 3 * (n - 1))),
    };

    private int Number((double Y, double Z) at, double tolerance)
    {
        var (cy, cz) = ((long)Math.Floor(at.Y / _cell), (long)Math.Floor(at.Z / _cell));
        for (var dy = -1; dy <= 1; dy++)
        {
            for (var dz = -1; dz <= 1; dz++)
            {
                if (_cells.TryGetValue((cy + dy, cz + dz), out var found)
                    && Math.Abs(_places[found].Y - at.Y) <= tolerance && Math.Abs(_places[found].Z - at.Z) <= tolerance) return found;
            }
        }

        _cells.TryAdd((cy, cz), _places.Count);
        _places.Add(at);
        return _places.Count - 1;
    }
}
