namespace MemberScan.Statics.Sparse;

/// <summary>The shape of the factor: supernodes in the sequence of their elimination, children before parents.</summary>
internal sealed class Symbolic
{
    private readonly NodeGraph _graph;
    private readonly int[] _order;
    private readonly int[] _placeOf;

    private Symbolic(NodeGraph graph, int[] order)
    {
        (_graph, _order) = (graph, order);
        _placeOf = new int[order.Length];
        for (var i = 0; i < order.Length; i++) _placeOf[order[i]] = i;
        DofPlace = new int[order.Length];
    }

    /// <summary>The supernodes.</summary>
    public Supernode[] Supernodes { get; private set; } = [];

    /// <summary>Place of the first unknown of each node in the sequence of elimination.</summary>
    public int[] DofPlace { get; private set; }

    /// <summary>Number of unknowns.</summary>
    public int Unknowns { get; private set; }

    /// <summary>Numbers kept in the factor.</summary>
    public long Entries => Supernodes.Sum(s => (long)s.Pivots * (s.Pivots + 1) / 2 + (long)s.Pivots * s.Rows.Length);

    /// <summary>Works out the shape for an order of elimination of the nodes.</summary>
    public static Symbolic Of(NodeGraph graph, int[] order)
    {
        var made = new Symbolic(graph, order);
        made.Number(made.Groups());
        return made;
    }

    // Nodes eliminated together, and the nodes below them.
    private sealed class Group
    {
        public List<int> Nodes { get; } = [];

        public int[] Below { get; set; } = [];

        public List<Group> Children { get; } = [];

        public int Pivots { get; set; }

        public int Rest { get; set; }

        public double Size => Pivots * (Pivots + 1.0) / 2 + (double)Pivots * Rest;
    }

    private List<Group> Groups()
    {
        var groupOf = new Group?[_order.Length];
        var waiting = new List<Group>?[_order.Length];                           // children by the place of their first row below
        var roots = new List<Group>();
        var mark = new int[_order.Length];
        for (var place = 0; place < _order.Length; place++)
        {
            var node = _order[place];
            if (_graph.Weight[node] == 0) continue;

            var group = Open(place, waiting[place] ?? [], mark);
            Absorb(group);
            groupOf[place] = group;
            if (group.Below.Length == 0) roots.Add(group);
            else (waiting[group.Below[0]] ??= []).Add(group);
            waiting[place] = null;
        }

        return roots;
    }

    // A new column: its neighbours still to be eliminated, and what its children hand on.
    private Group Open(int place, List<Group> children, int[] mark)
    {
        var node = _order[place];
        var below = new List<int>();
        mark[place] = place + 1;
        foreach (var neighbour in _graph.Of(node)) Take(_placeOf[neighbour]);
        foreach (var child in children)
            foreach (var p in child.Below) Take(p);
        below.Sort();
        var group = new Group { Below = [.. below], Pivots = _graph.Weight[node], Rest = below.Sum(p => _graph.Weight[_order[p]]) };
        group.Nodes.Add(node);
        group.Children.AddRange(children);
        return group;

        void Take(int p)
        {
            if (p <= place || mark[p] == place + 1) return;
            mark[p] = place + 1;
            below.Add(p);
        }
    }

    // Children are taken in where that adds few zeros: wide panels are faster than many narrow ones.
    private static void Absorb(Group group)
    {
        for (var again = true; again;)
        {
            again = false;
            foreach (var child in group.Children.OrderByDescending(c => c.Rest).ToArray())
            {
                var (pivots, rest) = (group.Pivots + child.Pivots, group.Rest);
                var merged = pivots * (pivots + 1.0) / 2 + (double)pivots * rest;
                var zeros = (merged - group.Size - child.Size) / merged;
                if (zeros > AllowedZeros(pivots)) continue;

                group.Nodes.InsertRange(0, child.Nodes);
                group.Children.Remove(child);
                group.Children.AddRange(child.Children);
                group.Pivots = pivots;
                again = child.Children.Count > 0;
            }
        }
    }

    private static double AllowedZeros(int pivots) => pivots switch
    {
        <= 24 => 0.6,
        <= 48 => 0.3,
        <= 96 => 0.12,
        <= 192 => 0.06,
        _ => 0.03,
    };

    // Postorder by a stack of its own: the tree may be as deep as there are nodes.
    private void Number(List<Group> roots)
    {
        var sequence = new List<Group>();
        var waiting = new Stack<(Group Group, bool IsOpen)>();
        foreach (var root in Enumerable.Reverse(roots)) waiting.Push((root, false));
        while (waiting.TryPop(out var top))
        {
            if (top.IsOpen)
            {
                sequence.Add(top.Group);
                continue;
            }

            waiting.Push((top.Group, true));
            foreach (var child in Enumerable.Reverse(top.Group.Children)) waiting.Push((child, false));
        }

        var number = new Dictionary<Group, int>(ReferenceEqualityComparer.Instance);
        var first = new int[sequence.Count];
        for (var s = 0; s < sequence.Count; s++)
        {
            number[sequence[s]] = s;
            first[s] = Unknowns;
            foreach (var node in sequence[s].Nodes) (DofPlace[node], Unknowns) = (Unknowns, Unknowns + _graph.Weight[node]);
        }

        Supernodes = [.. sequence.Select((group, s) => new Supernode([.. group.Nodes], first[s], group.Pivots, RowsOf(group), [.. group.Children.Select(c => number[c])]))];
    }

    private int[] RowsOf(Group group)
    {
        var rows = new List<int>(group.Rest);
        foreach (var p in group.Below)
            for (var d = 0; d < _graph.Weight[_order[p]]; d++) rows.Add(DofPlace[_order[p]] + d);
        rows.Sort();
        return [.. rows];
    }
}
