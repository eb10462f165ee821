using MemberScan.Model.Frames;
using MemberScan.Statics.Checking;
using MemberScan.Statics.Members;

namespace MemberScan.Statics.Assembly;

/// <summary>Everything that acts in one situation, its terms included.</summary>
internal sealed class SituationLoads
{
    private readonly CheckedFrame _frame;
    private readonly (LoadIndex Loads, double Factor)[] _parts;

    /// <summary>Gathers a situation.</summary>
    /// <param name="frame">The frame.</param>
    /// <param name="indices">One for each situation of the frame.</param>
    /// <param name="number">Number of the situation.</param>
    public SituationLoads(CheckedFrame frame, LoadIndex[] indices, int number)
    {
        _frame = frame;
        _parts = [(indices[number], 1), .. indices[number].Situation.Terms.Select(term => (indices[term.Situation], term.Factor))];
    }

    /// <summary>The loads of a member.</summary>
    public MemberLoading LoadingOf(int member)
    {
        MemberLoading? loading = null;
        foreach (var (loads, factor) in _parts)
            if (loads.Loads(member)) loads.AddTo(loading ??= new MemberLoading(), _frame.Members[member].Body, member, factor);
        return loading ?? MemberLoading.None;
    }

    /// <summary>Forces and moments on nodes in their axes, six a node.</summary>
    public void AddNodeLoads(Span<double> forces)
    {
        foreach (var (loads, factor) in _parts)
        {
            foreach (var load in loads.Situation.NodeLoads)
            {
                var (force, moment) = (load.Force, load.Moment);
                if (_frame.NodeAxes[load.Node] is { } axes) (force, moment) = (axes.Components(force), axes.Components(moment));
                Add(forces.Slice(6 * load.Node, 6), factor, force, moment);
            }
        }
    }

    /// <summary>Displacements of fixed directions, six a node, in the axes of the nodes.</summary>
    public void SetMovements(Span<double> displacements)
    {
        foreach (var support in _frame.Frame.Supports)
            for (var d = 0; d < 6; d++) displacements[6 * support.Node + d] = support.Restraints[(Direction)d].Displacement;
        foreach (var (loads, factor) in _parts)
            foreach (var movement in loads.Situation.Movements) displacements[6 * movement.Node + (int)movement.Direction] += factor * movement.Value;
    }

    private static void Add(Span<double> at, double factor, Foundation.Geometry.Vector3 force, Foundation.Geometry.Vector3 moment)
    {
        at[0] += factor * force.X;
        at[1] += factor * force.Y;
        at[2] += factor * force.Z;
        at[3] += factor * moment.X;
        at[4] += factor * moment.Y;
        at[5] += factor * moment.Z;
    }
}
