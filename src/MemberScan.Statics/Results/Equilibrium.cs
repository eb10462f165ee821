using MemberScan.Foundation.Geometry;
using MemberScan.Statics.Solving;

namespace MemberScan.Statics.Results;

/// <summary>The balance of all loads and reactions, taken from the loads themselves and not from what the solver made of them.</summary>
internal static class Equilibrium
{
    /// <summary>What is left of forces, and of moments about the middle of the nodes, against the sum of their magnitudes; the larger share.</summary>
    public static double ErrorOf(SituationResult result, FrameSolution solution, int number)
    {
        var frame = solution.Matrix.Frame;
        var nodes = frame.Frame.Nodes;
        var middle = 1.0 / nodes.Length * nodes.Aggregate(Vector3.Zero, (sum, node) => sum + node.Position);
        var (balance, size) = (new Balance(middle), nodes.Max(node => (node.Position - middle).Length));

        var loads = new double[6 * nodes.Length];
        solution.Loads[number].AddNodeLoads(loads);
        for (var n = 0; n < nodes.Length; n++) balance.Add(nodes[n].Position, Global(n, 0), Global(n, 3));
        foreach (var support in frame.Frame.Supports)
        {
            var reaction = result.Reaction(support.Node);
            balance.Add(nodes[support.Node].Position, reaction.Force, reaction.Moment);
        }

        for (var m = 0; m < frame.Members.Length; m++)
        {
            var (body, loading) = (frame.Members[m].Body, solution.Loads[number].LoadingOf(m));
            if (loading.IsEmpty) continue;

            var end = loading.At(default, body.Length, afterJump: true);        // minus the resultant about the end
            var (x, y, z) = (body.Axes.X, body.Axes.Y, body.Axes.Z);
            balance.Add(body.Axes.Origin + body.Length * x, -(end.N * x + end.Vy * y + end.Vz * z), -(end.T * x + end.My * y + end.Mz * z));
        }

        return balance.Error(size);

        Vector3 Global(int node, int from)
        {
            var v = loads.AsSpan(6 * node + from, 3);
            return frame.NodeAxes[node] is { } axes ? v[0] * axes.X + v[1] * axes.Y + v[2] * axes.Z : new Vector3(v[0], v[1], v[2]);
        }
    }

    private sealed class Balance(Vector3 about)
    {
        private Vector3 _force, _moment;
        private double _forces, _moments;

        public void Add(Vector3 at, Vector3 force, Vector3 moment)
        {
            var arm = (at - about).Cross(force);
            _force += force;
            _moment += moment + arm;
            _forces += force.Length;
            _moments += moment.Length + arm.Length;
        }

        public double Error(double size)
        {
            var moments = _moments + _forces * size;
            return Math.Max(_forces > 0 ? _force.Length / _forces : 0, moments > 0 ? _moment.Length / moments : 0);
        }
    }
}
