using MemberScan.Model.Frames.Loads;

namespace MemberScan.Statics;

/// <summary>The answer of a frame to one situation.</summary>
public abstract class SituationResult
{
    private protected SituationResult()
    {
    }

    /// <summary>The situation.</summary>
    public abstract FrameSituation Situation { get; }

    /// <summary>Largest unbalanced force or moment at any unknown, <c>max|f − K·u|</c>, against the largest load <c>max|f|</c> [-].</summary>
    public abstract double Residual { get; }

    /// <summary>Backward error <c>‖f − K·u‖/(‖K‖‖u‖ + ‖f‖)</c>, largest norms [-].</summary>
    public abstract double BackwardError { get; }

    /// <summary>What is left of all loads and reactions together, forces and moments, against the largest of them [-].</summary>
    public abstract double EquilibriumError { get; }

    /// <summary>How a node moves.</summary>
    /// <param name="node">Its number, from 0.</param>
    public abstract NodeDisplacement Displacement(int node);

    /// <summary>What the support of a node does to the frame; zero where it has none.</summary>
    /// <param name="node">Its number, from 0.</param>
    public abstract SupportReaction Reaction(int node);

    /// <summary>Section forces and displacements along a member; worked out at each call.</summary>
    /// <param name="member">Its number, from 0.</param>
    public abstract MemberResult Member(int member);
}
