using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;
using MemberScan.Statics.Assembly;
using MemberScan.Statics.Checking;
using MemberScan.Statics.Members;

namespace MemberScan.Statics.Mechanisms;

/// <summary>Directions of single nodes that nothing resists: a shift is a mechanism; a turn is held, for as long as nothing loads it.</summary>
/// <remarks>
/// Where all members at a node are hinged the node itself could spin without anything noticing; the section forces do not depend on it.
/// Nodes of a truss may also spin together, held to each other by the torsion of bars alone; a little stiffness is added against that, and
/// what it would have to carry shows in the rest of the solution, which leaves it out.
/// </remarks>
internal static class FreeDirections
{
    /// <summary>What is left of a stiffness below this share of the members' own, before joints were let go, is rounding.</summary>
    private const double Nothing = 1e-12;

    /// <summary>What is added against spinning together, as a share of the members' own stiffness.</summary>
    private const double Little = 1e-7;

    /// <summary>Names that a note gives at most.</summary>
    private const int MostNames = 12;

    /// <summary>Finds them and holds the turns by adding to the matrix; false with an error that names node and direction of a shift.</summary>
    public static bool TryHold(FrameMatrix matrix, List<HeldTurn> held, DiagnosticList diagnostics)
    {
        var nodes = matrix.Frame.Frame.Nodes;
        var isHinged = HingedAllRound(matrix);
        for (var node = 0; node < nodes.Length; node++)
        {
            foreach (var axis in Unresisted(matrix, node, isTurn: false))
            {
                diagnostics.Add(StaticsCodes.Mechanism, Severity.Error,
                    $"the frame is a mechanism: nothing holds node {nodes[node].Name} against a shift along {Name(axis, isTurn: false, matrix, node)}{Joining(matrix, node)}; add a support or a member, or close a release");
                return false;
            }

            foreach (var axis in Unresisted(matrix, node, isTurn: true))
            {
                held.Add(new HeldTurn(node, axis));
                Stiffen(matrix, node, axis, 1);
            }

            if (!isHinged[node]) continue;
            foreach (var axis in (Vector3[])[Vector3.UnitX, Vector3.UnitY, Vector3.UnitZ]) Stiffen(matrix, node, axis, Little);
        }

        if (held.Count > 0) Tell(matrix, held, diagnostics);
        return true;
    }

    /// <summary>The direction nearest to an axis, as the end of a phrase.</summary>
    public static string Name(Vector3 axis, bool isTurn, FrameMatrix matrix, int node)
    {
        var k = Math.Abs(axis.X) >= Math.Max(Math.Abs(axis.Y), Math.Abs(axis.Z)) - 1e-9 ? 0 : Math.Abs(axis.Y) >= Math.Abs(axis.Z) - 1e-9 ? 1 : 2;
        var word = FrameCheck.Word((Direction)(k + (isTurn ? 3 : 0)));
        var own = matrix.Frame.NodeAxes[node] is null ? "" : " of its support";
        return Math.Max(Math.Abs(axis.X), Math.Max(Math.Abs(axis.Y), Math.Abs(axis.Z))) > 0.99 ? $"{word}{own}" : $"{word}{own} and others together";
    }

    private static string Joining(FrameMatrix matrix, int node)
    {
        var names = matrix.Frame.Frame.Members.Where(m => m.Start == node || m.End == node).Select(m => m.Name).Take(MostNames).ToArray();
        return names.Length == 0 ? ", where no member ends" : $" (members there: {string.Join(", ", names)})";
    }

    private static void Tell(FrameMatrix matrix, List<HeldTurn> held, DiagnosticList diagnostics)
    {
        var names = held.Take(MostNames).Select(h => $"{matrix.Frame.Frame.Nodes[h.Node].Name} {Name(h.Axis, isTurn: true, matrix, h.Node)}");
        var more = held.Count > MostNames ? $" and {held.Count - MostNames} more" : "";
        diagnostics.Add(StaticsCodes.FreeTurn, Severity.Note,
            $"nothing resists the turn of these nodes and nothing loads it, since every member there is hinged; it is given as 0 and changes no force: {string.Join(", ", names)}{more}");
    }

    private static IEnumerable<Vector3> Unresisted(FrameMatrix matrix, int node, bool isTurn)
    {
        var (at, rigid) = (isTurn ? 3 : 0, matrix.Rigid[2 * node + (isTurn ? 1 : 0)]);
        var d = matrix.Matrix.Diagonal(node);
        double[] block = [d[7 * at], d[7 * (at + 1)], d[7 * (at + 2)], d[6 * at + at + 1], d[6 * at + at + 2], d[6 * (at + 1) + at + 2]];
        var reference = Math.Max(rigid, block[0] + block[1] + block[2]);
        if (reference == 0) reference = 1;
        var isFixed = matrix.IsFixed.AsSpan(6 * node + at, 3);
        if (isFixed[0]) (block[0], block[3], block[4]) = (reference, 0, 0);
        if (isFixed[1]) (block[1], block[3], block[5]) = (reference, 0, 0);
        if (isFixed[2]) (block[2], block[4], block[5]) = (reference, 0, 0);
        if (block[0] * block[1] * block[2] == 0 || rigid > 0)
            return [.. SymmetricThree.Of(block[0], block[1], block[2], block[3], block[4], block[5]).Where(p => p.Value <= Nothing * reference).Select(p => p.Axis)];
        return [];
    }

    // Nodes at which no member end bends: hinged about y and z there, or truss members.
    private static bool[] HingedAllRound(FrameMatrix matrix)
    {
        var isHinged = new bool[matrix.Frame.Frame.Nodes.Length];
        Array.Fill(isHinged, true);
        foreach (var stiffness in matrix.Frame.Members)
        {
            var member = stiffness.Body.Member;
            isHinged[member.Start] &= IsOpen(member, 4) && IsOpen(member, 5);
            isHinged[member.End] &= IsOpen(member, 10) && IsOpen(member, 11);
        }

        return isHinged;

        static bool IsOpen(FrameMember member, int joint) => MemberStiffness.JointOf(member, joint).Kind == RestraintKind.Free;
    }

    private static void Stiffen(FrameMatrix matrix, int node, Vector3 axis, double share)
    {
        var stiffness = share * matrix.Rigid[2 * node + 1];
        if (!(stiffness > 0)) stiffness = 1;
        ReadOnlySpan<double> a = [axis.X, axis.Y, axis.Z];
        var diagonal = matrix.Matrix.Diagonal(node);
        for (var i = 0; i < 3; i++)
            for (var j = 0; j < 3; j++) diagonal[6 * (3 + i) + 3 + j] += stiffness * a[i] * a[j];
    }
}
