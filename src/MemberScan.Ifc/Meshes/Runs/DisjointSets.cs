namespace MemberScan.Ifc.Meshes.Runs;

/// <summary>Numbers from 0 that are joined to sets.</summary>
internal sealed class DisjointSets(int count)
{
    private readonly int[] _parent = [.. Enumerable.Range(0, count)];

    /// <summary>The number that stands for the set of another.</summary>
    public int Of(int number)
    {
        while (_parent[number] != number)
            number = _parent[number] = _parent[_parent[number]];
        return number;
    }

    /// <summary>Joins two sets; the smaller number stands for both.</summary>
    public void Join(int a, int b)
    {
        var (first, second) = (Of(a), Of(b));
        _parent[Math.Max(first, second)] = Math.Min(first, second);
    }
}
