using MemberScan.Model.Forces;
using MemberScan.Model.Limits;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Checking.Further;

namespace MemberScan.Screening.Checking;

/// <summary>What one situation gave on one member.</summary>
internal sealed class SituationFindings(MemberForces forces)
{
    /// <summary>The forces.</summary>
    public MemberForces Forces { get; } = forces;

    /// <summary>The limit that it was held against; null for none.</summary>
    public StressLimit? Limit { get; set; }

    /// <summary>The checks beside the stress criterion, each where it is worst.</summary>
    public FurtherFindings Further { get; } = new();

    /// <summary>Largest stress by the elementary model.</summary>
    public Found? Elementary { get; set; }

    /// <summary>Largest stress by the elasticity model.</summary>
    public Found? Elasticity { get; set; }

    /// <summary>What bars a verdict within the limit.</summary>
    public List<Reason> Blockers { get; } = [];

    /// <summary>What a reader must know.</summary>
    public List<string> Notes { get; } = [];

    /// <summary>Larger of the two models.</summary>
    public Found? Largest => Found.Larger(Elementary, Elasticity);

    /// <summary>Adds what bars a verdict, once.</summary>
    public void Bar(ReasonCode code, string message) => Bar(new Reason(code, message));

    /// <summary>Adds what bars a verdict, once.</summary>
    public void Bar(Reason reason)
    {
        if (!Blockers.Contains(reason)) Blockers.Add(reason);
    }

    /// <summary>Adds a note, once.</summary>
    public void Note(string note)
    {
        if (!Notes.Contains(note, StringComparer.Ordinal)) Notes.Add(note);
    }
}
