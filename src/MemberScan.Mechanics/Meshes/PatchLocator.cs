namespace MemberScan.Mechanics.Meshes;

/// <summary>Finds the patch that a point lies in.</summary>
internal sealed class PatchLocator
{
    private const int MostCells = 64;
    private readonly PatchMesh _mesh;
    private readonly int[][] _cells;
    private readonly int _count;
    private readonly double _leastY;
    private readonly double _leastZ;
    private readonly double _perY;
    private readonly double _perZ;
    private readonly double _near;

    /// <summary>A raster over the mesh.</summary>
    public PatchLocator(PatchMesh mesh)
    {
        _mesh = mesh;
        _near = 1e-12 * mesh.Scale;
        _count = Math.Clamp((int)Math.Sqrt(4 * mesh.Patches.Count), 4, MostCells);
        (_leastY, _leastZ) = (mesh.Patches.Min(p => p.LeastY), mesh.Patches.Min(p => p.LeastZ));
        _perY = _count / (mesh.Patches.Max(p => p.LargestY) - _leastY);
        _perZ = _count / (mesh.Patches.Max(p => p.LargestZ) - _leastZ);
        var cells = new List<int>[_count * _count];
        for (var i = 0; i < cells.Length; i++) cells[i] = [];
        for (var e = 0; e < mesh.Patches.Count; e++)
        {
            var patch = mesh.Patches[e];
            for (var i = Cell(patch.LeastY, _leastY, _perY); i <= Cell(patch.LargestY, _leastY, _perY); i++)
                for (var j = Cell(patch.LeastZ, _leastZ, _perZ); j <= Cell(patch.LargestZ, _leastZ, _perZ); j++)
                    cells[i * _count + j].Add(e);
        }

        _cells = [.. cells.Select(list => list.ToArray())];
    }

    /// <summary>The patch and its coordinates for a point; the nearest one for a point a little outside.</summary>
    public int Find(double y, double z, out double xi, out double eta)
    {
        var (best, least) = (-1, double.PositiveInfinity);
        (xi, eta) = (0, 0);
        foreach (var e in _cells[Cell(y, _leastY, _perY) * _count + Cell(z, _leastZ, _perZ)])
        {
            var patch = _mesh.Patches[e];
            if (y < patch.LeastY || y > patch.LargestY || z < patch.LeastZ || z > patch.LargestZ) continue;

            var miss = patch.Locate(y, z, out var a, out var b);
            if (miss >= least) continue;
            (best, least, xi, eta) = (e, miss, a, b);
            if (miss <= _near) break;
        }

        return best >= 0 ? best : Nearest(y, z, out xi, out eta);
    }

    private int Nearest(double y, double z, out double xi, out double eta)
    {
        var (best, least) = (0, double.PositiveInfinity);
        (xi, eta) = (0, 0);
        for (var e = 0; e < _mesh.Patches.Count; e++)
        {
            var miss = _mesh.Patches[e].Locate(y, z, out var a, out var b);
            if (miss < least) (best, least, xi, eta) = (e, miss, a, b);
        }

        return best;
    }

    private int Cell(double at, double least, double per) => Math.Clamp((int)((at - least) * per), 0, _count - 1);
}
