using MemberScan.Model.Frames;
using MemberScan.Statics.Assembly;
using MemberScan.Statics.Members;

namespace MemberScan.Statics.Solving;

/// <summary>What loads leave over after all members and springs have answered, worked out member by member.</summary>
/// <remarks>
/// A member answers to its end's movement against a rigid body on its start, taken with twice the working precision: how far the frame
/// moves as a whole costs no digits, nor do stiff members beside soft ones, as they would in the sum of all stiffnesses. Solutions refined
/// by this rest are in balance with the section forces that are handed out.
/// </remarks>
internal sealed class ElementResidual
{
    private readonly FrameMatrix _frame;
    private readonly double[] _maps;
    private readonly bool _hasSkewed;

    public ElementResidual(FrameMatrix frame)
    {
        _frame = frame;
        _maps = new double[72 * frame.Frame.Members.Length];
        for (var m = 0; m < frame.Frame.Members.Length; m++) frame.Maps(m, _maps.AsSpan(72 * m, 72));
        _hasSkewed = Array.Exists(frame.Frame.NodeAxes, axes => axes is not null);
    }

    /// <summary>Fills the rest of a case.</summary>
    public void Measure(LoadCase at)
    {
        at.Loads.CopyTo(at.Rest, 0);
        Span<double> strain = stackalloc double[6], forces = stackalloc double[12];
        for (var m = 0; m < _frame.Frame.Members.Length; m++)
        {
            var stiffness = _frame.Frame.Members[m];
            var maps = _maps.AsSpan(72 * m, 72);
            Strain(m, at, strain);
            Answer(stiffness, strain, forces);
            var member = stiffness.Body.Member;
            Subtract(maps[..36], forces[..6], at.Rest.AsSpan(6 * member.Start, 6));
            Subtract(maps[36..], forces[6..], at.Rest.AsSpan(6 * member.End, 6));
        }

        foreach (var support in _frame.Frame.Frame.Supports)
        {
            for (var d = 0; d < 6; d++)
            {
                var (restraint, i) = (support.Restraints[(Direction)d], 6 * support.Node + d);
                if (restraint.Kind == RestraintKind.Spring) at.Rest[i] -= restraint.Stiffness * at.High[i] + restraint.Stiffness * at.Low[i];
            }
        }
    }

    /// <summary>Movement of a member's flexible end against a rigid body on its start node, in the member's axes.</summary>
    public void Strain(int number, LoadCase at, Span<double> strain)
    {
        var member = _frame.Frame.Members[number].Body.Member;
        Span<double> relative = stackalloc double[6];
        if (_hasSkewed && (_frame.Frame.NodeAxes[member.Start] is not null || _frame.Frame.NodeAxes[member.End] is not null))
        {
            RelativeSkewed(number, at, strain);
            return;
        }

        var along = _frame.Frame.Frame.Nodes[member.End].Position - _frame.Frame.Frame.Nodes[member.Start].Position;
        var (a, b) = (6 * member.Start, 6 * member.End);
        var (high, low) = (at.High, at.Low);
        relative[0] = Less(high, low, a, b, 0, 4, along.Z, 5, along.Y);
        relative[1] = Less(high, low, a, b, 1, 5, along.X, 3, along.Z);
        relative[2] = Less(high, low, a, b, 2, 3, along.Y, 4, along.X);
        for (var k = 3; k < 6; k++) relative[k] = high[b + k] - high[a + k] + (low[b + k] - low[a + k]);
        var map = _maps.AsSpan(72 * number + 36, 36);
        for (var i = 0; i < 6; i++)
        {
            strain[i] = 0;
            for (var j = 0; j < 6; j++) strain[i] += map[6 * i + j] * relative[j];
        }
    }

    /// <summary>Forces that the nodes exert on both flexible ends for such a movement, without those of loads.</summary>
    public static void Answer(MemberStiffness stiffness, ReadOnlySpan<double> strain, Span<double> forces)
    {
        ReadOnlySpan<double> k = stiffness.Matrix;
        for (var i = 0; i < 12; i++)
        {
            var sum = 0.0;
            for (var j = 0; j < 6; j++) sum += k[12 * i + 6 + j] * strain[j];
            forces[i] = sum;
        }
    }

    // (b − a)[k] − (θa × along)[k] = (b − a)[k] − θa[p]·x + θa[q]·y, exact up to the last rounding.
    private static double Less(double[] high, double[] low, int a, int b, int k, int p, double x, int q, double y)
    {
        var (sum, rest) = (0.0, low[b + k] - low[a + k] - low[a + p] * x + low[a + q] * y);
        Add(high[b + k], ref sum, ref rest);
        Add(-high[a + k], ref sum, ref rest);
        AddProduct(-high[a + p], x, ref sum, ref rest);
        AddProduct(high[a + q], y, ref sum, ref rest);
        return sum + rest;
    }

    private static void AddProduct(double a, double b, ref double sum, ref double rest)
    {
        var product = a * b;
        rest += Math.FusedMultiplyAdd(a, b, -product);
        Add(product, ref sum, ref rest);
    }

    private static void Add(double value, ref double sum, ref double rest)
    {
        var total = sum + value;
        var part = total - sum;
        rest += (sum - (total - part)) + (value - part);
        sum = total;
    }

    // Nodes with axes of their own: both ends are first turned into the member's axes.
    private void RelativeSkewed(int number, LoadCase at, Span<double> strain)
    {
        var body = _frame.Frame.Members[number].Body;
        var maps = _maps.AsSpan(72 * number, 72);
        Span<double> start = stackalloc double[6];
        start.Clear();
        strain.Clear();
        foreach (var u in (double[][])[at.Low, at.High])
        {
            for (var i = 0; i < 6; i++)
            {
                for (var j = 0; j < 6; j++)
                {
                    start[i] += maps[6 * i + j] * u[6 * body.Member.Start + j];
                    strain[i] += maps[36 + 6 * i + j] * u[6 * body.Member.End + j];
                }
            }
        }

        for (var i = 0; i < 6; i++) strain[i] -= start[i];
        strain[1] -= start[5] * body.Length;
        strain[2] += start[4] * body.Length;
    }

    private static void Subtract(ReadOnlySpan<double> map, ReadOnlySpan<double> forces, Span<double> rest)
    {
        for (var j = 0; j < 6; j++)
        {
            var sum = 0.0;
            for (var i = 0; i < 6; i++) sum += map[6 * i + j] * forces[i];
            rest[j] -= sum;
        }
    }
}
