using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Verdicts;

namespace MemberScan.Model.Loads;

/// <summary>A load on one analytical member as the model has it, without factors; SI.</summary>
public sealed record MemberLoad
{
    /// <summary>STEP id of the analytical member.</summary>
    public required ulong Member { get; init; }

    /// <summary>STEP id of the action.</summary>
    public required ulong Action { get; init; }

    /// <summary>STEP ids of the load groups and cases that hold the action, in the order of the model; empty when none does.</summary>
    public required ImmutableArray<ulong> Groups { get; init; }

    /// <summary>How it lies along the member.</summary>
    public required LoadShape Shape { get; init; }

    /// <summary>Where it begins, from the member's start [m]; of a point load its place.</summary>
    public required double From { get; init; }

    /// <summary>Where it ends [m]; of a point load its place.</summary>
    public required double To { get; init; }

    /// <summary>The load at its beginning; of half sine and parabola in the middle.</summary>
    public required LoadVector Start { get; init; }

    /// <summary>The load at its end; of other shapes than a linear one the same as <see cref="Start"/>.</summary>
    public required LoadVector End { get; init; }

    /// <summary>The axes of the components.</summary>
    public required LoadAxes Axes { get; init; }

    /// <summary>Whether a line load is per length of the member's projection square to the load; otherwise per length of the member.</summary>
    public bool IsProjected { get; init; }

    /// <summary>Class and STEP ids, in words.</summary>
    public required string Source { get; init; }

    /// <summary>Why the load cannot be used; null when it can. A load that cannot be used still acts.</summary>
    public Reason? Unusable { get; init; }

    /// <summary>The load in the member's own axes and per length of the member.</summary>
    /// <param name="load">Components of this load, at its start or end.</param>
    /// <param name="axes">Axes of the analytical member.</param>
    /// <remarks>A projected load q on a member that makes the angle β with it gives q·sin β per length of the member.</remarks>
    public LoadVector Along(in LoadVector load, MemberAxes axes)
    {
        ArgumentNullException.ThrowIfNull(axes);
        if (Axes == LoadAxes.Member) return load;

        var share = IsProjected && Shape != LoadShape.Point && load.Force.TryNormalize(out var direction) ? direction.Cross(axes.X).Length : 1;
        return share * new LoadVector(axes.Components(load.Force), axes.Components(load.Couple));
    }
}
