using MemberScan.Mechanics.Forces;
using MemberScan.Model.Frames;

namespace MemberScan.Statics.Members;

/// <summary>
/// Forces on both flexible ends of a member for their displacements, in its axes, with what its joints let go: 12 × 12 row-major,
/// start before end, each shift x y z then turn x y z.
/// </summary>
/// <remarks>
/// From the flexibility of the end against the clamped start: with <c>k</c> its inverse and <c>H</c> carrying the section forces of the
/// end to the start, <c>K = [H·k·Hᵀ, −H·k; −k·Hᵀ, k]</c>. Joints are then eliminated one by one: r, the member's side of joint r, leaves
/// the equations by its own, <c>(K_rr + s)·u_r = s·n − ΣK_rb·u_b − p_r</c>, and the node's side n takes its place.
/// </remarks>
internal sealed class MemberStiffness
{
    /// <summary>Pivots of a joint below this share of the stiffness before any joint was let go are nothing but rounding.</summary>
    private const double Nothing = 1e-12;

    private readonly double[] _end = new double[36];
    private readonly List<Elimination> _joints = [];

    private MemberStiffness(MemberBody body) => Body = body;

    /// <summary>One joint let go: its number, its spring, its pivot (0 where nothing resists) and its row as it was eliminated.</summary>
    private sealed record Elimination(int Number, double Spring, double Pivot, double[] Row);

    /// <summary>The flexible part.</summary>
    public MemberBody Body { get; }

    /// <summary>The matrix.</summary>
    public double[] Matrix { get; } = new double[144];

    /// <summary>Diagonal before any joint was let go: what the size of the matrix is measured by.</summary>
    public double[] Rigid { get; } = new double[12];

    /// <summary>Numbers of joints that nothing resists, since others were let go before; the member turns or slides freely there.</summary>
    public IEnumerable<int> FreeJoints => _joints.Where(j => j.Pivot == 0).Select(j => j.Number);

    /// <summary>Makes the matrix; null where the section's numbers are so far apart that nothing is left of them.</summary>
    public static MemberStiffness? TryOf(MemberBody body)
    {
        var made = new MemberStiffness(body);
        if (!SmallMatrix.TryInvert(body.EndFlexibility(), made._end)) return null;

        made.Fill();
        for (var i = 0; i < 12; i++) made.Rigid[i] = made.Matrix[i * 13];
        for (var i = 0; i < 12; i++) made.LetGo(i, JointOf(body.Member, i));
        return made;
    }

    /// <summary>The joint of one of the twelve directions, truss action included.</summary>
    public static Restraint JointOf(FrameMember member, int number)
    {
        var direction = (Direction)(number % 6);
        var isHinge = direction is Direction.Ry or Direction.Rz || (direction == Direction.Rx && number > 6);
        if (member.TrussOnly && isHinge) return Restraint.Free;

        return (number < 6 ? member.StartJoint : member.EndJoint)[direction];
    }

    /// <summary>Forces on both flexible ends under loads while the nodes are held, joints let go.</summary>
    /// <param name="loading">The loads.</param>
    /// <param name="forces">Receives twelve forces that the nodes exert on the member.</param>
    /// <param name="unresisted">Receives the force at each joint that nothing resists; 0 elsewhere.</param>
    public void HeldForces(MemberLoading loading, Span<double> forces, Span<double> unresisted)
    {
        unresisted.Clear();
        var start = loading.CantileverStart(Body.Length);
        var moved = EndOf(start, loading);
        Span<double> free = [moved.X, moved.Y, moved.Z, moved.TurnX, moved.TurnY, moved.TurnZ];
        Span<double> end = stackalloc double[6];
        for (var i = 0; i < 6; i++)
            for (var j = 0; j < 6; j++) end[i] -= _end[i * 6 + j] * free[j];

        var held = new SectionForces(end[0], end[1], end[2], end[3], end[4], end[5]);
        Write(start + MemberLoading.ToStart(held, Body.Length), held, forces);
        foreach (var joint in _joints)
        {
            var p = forces[joint.Number];
            if (joint.Pivot == 0) unresisted[joint.Number] = p;
            else
                for (var a = 0; a < 12; a++) forces[a] -= joint.Row[a] * p / joint.Pivot;
            forces[joint.Number] = joint.Pivot == 0 ? 0 : joint.Spring * p / joint.Pivot;
        }
    }

    /// <summary>Displacement of the member's own start from those of both joints' node sides.</summary>
    /// <param name="nodes">Twelve displacements of the nodes' sides.</param>
    /// <param name="loading">The loads.</param>
    public EndDisplacement StartSide(ReadOnlySpan<double> nodes, MemberLoading loading)
    {
        Span<double> u = stackalloc double[12], p = stackalloc double[_joints.Count], forces = stackalloc double[12], unresisted = stackalloc double[12];
        nodes.CopyTo(u);
        if (_joints.Count > 0) JointForces(loading, forces, unresisted, p);
        for (var k = _joints.Count - 1; k >= 0; k--)
        {
            var joint = _joints[k];
            if (joint.Pivot == 0) continue;

            var sum = joint.Spring * nodes[joint.Number] - p[k];
            for (var b = 0; b < 12; b++)
                if (b != joint.Number) sum -= joint.Row[b] * u[b];
            u[joint.Number] = sum / joint.Pivot;
        }

        return new EndDisplacement(u[0], u[1], u[2], u[3], u[4], u[5]);
    }

    // The force at each joint at the moment of its elimination.
    private void JointForces(MemberLoading loading, Span<double> forces, Span<double> unresisted, Span<double> atJoints)
    {
        var rigid = new MemberStiffness(Body);
        _end.CopyTo(rigid._end, 0);
        rigid.HeldForces(loading, forces, unresisted);
        for (var k = 0; k < _joints.Count; k++)
        {
            var joint = _joints[k];
            atJoints[k] = forces[joint.Number];
            if (joint.Pivot == 0) continue;
            var p = forces[joint.Number];
            for (var a = 0; a < 12; a++) forces[a] -= joint.Row[a] * p / joint.Pivot;
            forces[joint.Number] = joint.Spring * p / joint.Pivot;
        }
    }

    private EndDisplacement EndOf(in SectionForces start, MemberLoading loading)
    {
        if (loading.IsEmpty) return default;

        var moved = default(EndDisplacement);
        var breaks = loading.Breaks(Body.Length, Body.TaperPlaces);
        for (var k = 0; k + 1 < breaks.Count; k++) moved = Body.Follow(start, loading, breaks[k], moved, breaks[k + 1]);
        return moved;
    }

    private void Fill()
    {
        Span<double> h = stackalloc double[36];                                  // section forces of the end → of the start
        for (var i = 0; i < 6; i++) h[i * 7] = 1;
        (h[4 * 6 + 2], h[5 * 6 + 1]) = (-Body.Length, Body.Length);
        Span<double> hk = stackalloc double[36];
        Multiply(h, _end, hk, transposed: false);
        Span<double> hkh = stackalloc double[36];
        Multiply(hk, h, hkh, transposed: true);
        for (var i = 0; i < 6; i++)
        {
            for (var j = 0; j < 6; j++)
            {
                Matrix[i * 12 + j] = 0.5 * (hkh[i * 6 + j] + hkh[j * 6 + i]);
                Matrix[i * 12 + 6 + j] = Matrix[(6 + j) * 12 + i] = -hk[i * 6 + j];
                Matrix[(6 + i) * 12 + 6 + j] = _end[i * 6 + j];
            }
        }
    }

    private void LetGo(int r, Restraint joint)
    {
        if (joint.Kind == RestraintKind.Fixed) return;

        var spring = joint.Stiffness;
        var row = Matrix.AsSpan(r * 12, 12).ToArray();
        var pivot = row[r] + spring;
        if (row[r] <= Nothing * Rigid[r]) pivot = spring;                        // nothing but the spring
        _joints.Add(new Elimination(r, spring, pivot, row));
        for (var a = 0; a < 12; a++)
            for (var b = 0; b < 12; b++)
                if (pivot > 0) Matrix[a * 12 + b] -= row[a] * row[b] / pivot;
        for (var a = 0; a < 12; a++) Matrix[a * 12 + r] = Matrix[r * 12 + a] = pivot > 0 ? row[a] * spring / pivot : 0;
        Matrix[r * 13] = pivot > 0 ? spring * (row[r] <= Nothing * Rigid[r] ? 0 : row[r]) / pivot : 0;
    }

    // a·b, or a·bᵀ.
    private static void Multiply(ReadOnlySpan<double> a, ReadOnlySpan<double> b, Span<double> product, bool transposed)
    {
        for (var i = 0; i < 6; i++)
        {
            for (var j = 0; j < 6; j++)
            {
                var sum = 0.0;
                for (var k = 0; k < 6; k++) sum += a[i * 6 + k] * (transposed ? b[j * 6 + k] : b[k * 6 + j]);
                product[i * 6 + j] = sum;
            }
        }
    }

    private static void Write(in SectionForces start, in SectionForces end, Span<double> forces)
    {
        (forces[0], forces[1], forces[2], forces[3], forces[4], forces[5]) = (-start.N, -start.Vy, -start.Vz, -start.T, -start.My, -start.Mz);
        (forces[6], forces[7], forces[8], forces[9], forces[10], forces[11]) = (end.N, end.Vy, end.Vz, end.T, end.My, end.Mz);
    }
}
