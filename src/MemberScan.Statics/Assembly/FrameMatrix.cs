using MemberScan.Model.Frames;
using MemberScan.Statics.Checking;
using MemberScan.Statics.Members;

namespace MemberScan.Statics.Assembly;

/// <summary>The stiffness of a whole frame in the axes of its nodes, six unknowns a node, and what is fixed.</summary>
internal sealed class FrameMatrix
{
    private FrameMatrix(CheckedFrame frame, BlockMatrix matrix)
    {
        (Frame, Matrix) = (frame, matrix);
        IsFixed = new bool[6 * matrix.Nodes];
        Rigid = new double[2 * matrix.Nodes];
    }

    /// <summary>The frame.</summary>
    public CheckedFrame Frame { get; }

    /// <summary>The stiffness matrix, fixed directions included.</summary>
    public BlockMatrix Matrix { get; }

    /// <summary>Which directions supports fix, six a node.</summary>
    public bool[] IsFixed { get; }

    /// <summary>Stiffness of all members at a node before joints are let go: shifts, then turns; what "nothing" is measured by.</summary>
    public double[] Rigid { get; }

    /// <summary>Adds up all members and the springs of supports.</summary>
    public static FrameMatrix Of(CheckedFrame frame)
    {
        var pairs = frame.Frame.Members.Select(m => (m.Start, m.End)).ToList();
        var made = new FrameMatrix(frame, new BlockMatrix(frame.Frame.Nodes.Length, pairs));
        Span<double> maps = stackalloc double[72];
        for (var m = 0; m < frame.Members.Length; m++)
        {
            made.Maps(m, maps);
            made.Add(m, maps);
        }

        foreach (var support in frame.Frame.Supports) made.Hold(support);
        return made;
    }

    /// <summary>Maps of both ends of a member, 36 numbers each.</summary>
    public void Maps(int member, Span<double> maps)
    {
        var body = Frame.Members[member].Body;
        EndMap.Fill(body, body.Member.StartOffset, Frame.NodeAxes[body.Member.Start], maps[..36]);
        EndMap.Fill(body, body.Member.EndOffset, Frame.NodeAxes[body.Member.End], maps[36..]);
    }

    /// <summary>Takes the forces that nodes exert on a held member from the loads of the nodes.</summary>
    public void SubtractHeld(int member, ReadOnlySpan<double> held, Span<double> loads)
    {
        Span<double> maps = stackalloc double[72];
        Maps(member, maps);
        var body = Frame.Members[member].Body;
        for (var end = 0; end < 2; end++)
        {
            var at = loads.Slice(6 * (end == 0 ? body.Member.Start : body.Member.End), 6);
            for (var j = 0; j < 6; j++)
                for (var i = 0; i < 6; i++) at[j] -= maps[36 * end + 6 * i + j] * held[6 * end + i];
        }
    }

    private void Add(int number, ReadOnlySpan<double> maps)
    {
        var stiffness = Frame.Members[number];
        var member = stiffness.Body.Member;
        AddBlock(stiffness, maps, 0, 0, Matrix.Diagonal(member.Start));
        AddBlock(stiffness, maps, 1, 1, Matrix.Diagonal(member.End));
        if (member.Start == member.End)
        {
            AddBlock(stiffness, maps, 0, 1, Matrix.Diagonal(member.Start));
            AddBlock(stiffness, maps, 1, 0, Matrix.Diagonal(member.Start));
        }
        else if (member.Start > member.End) AddBlock(stiffness, maps, 0, 1, Matrix.Block(member.Start, member.End));
        else AddBlock(stiffness, maps, 1, 0, Matrix.Block(member.End, member.Start));

        for (var i = 0; i < 12; i++)
            Rigid[2 * (i < 6 ? member.Start : member.End) + (i % 6 < 3 ? 0 : 1)] += stiffness.Rigid[i];
    }

    // block += Gᵣᵀ·K_rc·G_c
    private static void AddBlock(MemberStiffness stiffness, ReadOnlySpan<double> maps, int row, int column, Span<double> block)
    {
        Span<double> half = stackalloc double[36];
        var rowMap = maps.Slice(36 * row, 36);
        var columnMap = maps.Slice(36 * column, 36);
        for (var i = 0; i < 6; i++)
        {
            for (var j = 0; j < 6; j++)
            {
                var sum = 0.0;
                for (var k = 0; k < 6; k++) sum += stiffness.Matrix[(6 * row + i) * 12 + 6 * column + k] * columnMap[6 * k + j];
                half[6 * i + j] = sum;
            }
        }

        for (var i = 0; i < 6; i++)
        {
            for (var j = 0; j < 6; j++)
            {
                var sum = 0.0;
                for (var k = 0; k < 6; k++) sum += rowMap[6 * k + i] * half[6 * k + j];
                block[6 * i + j] += sum;
            }
        }
    }

    private void Hold(FrameSupport support)
    {
        var diagonal = Matrix.Diagonal(support.Node);
        for (var d = 0; d < 6; d++)
        {
            var restraint = support.Restraints[(Direction)d];
            IsFixed[6 * support.Node + d] = restraint.Kind == RestraintKind.Fixed;
            if (restraint.Kind == RestraintKind.Spring) diagonal[7 * d] += restraint.Stiffness;
        }
    }
}
