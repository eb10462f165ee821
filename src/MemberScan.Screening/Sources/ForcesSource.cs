using MemberScan.Foundation.Diagnostics;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Rules;

namespace MemberScan.Screening.Sources;

/// <summary>Section forces of one kind of source: tables, results in the model, or property sets.</summary>
internal sealed class ForcesSource
{
    private readonly ILookup<string, MemberForces> _byMember;

    private ForcesSource(string name, IReadOnlyList<MemberForces> all, CaseCombinations combinations)
    {
        (Name, All, Combinations) = (name, all, combinations);
        _byMember = all.ToLookup(f => f.MemberKey, StringComparer.Ordinal);
    }

    /// <summary>Its name in notes.</summary>
    public string Name { get; }

    /// <summary>All forces of it.</summary>
    public IReadOnlyList<MemberForces> All { get; }

    /// <summary>Combinations of its load cases.</summary>
    public CaseCombinations Combinations { get; }

    /// <summary>Puts a source together.</summary>
    /// <param name="name">Its name in notes.</param>
    /// <param name="all">All forces of it.</param>
    /// <param name="rules">The settings.</param>
    /// <param name="diagnostics">Takes what is wrong with combinations of its cases.</param>
    public static ForcesSource Of(string name, IReadOnlyList<MemberForces> all, ForceRules rules, DiagnosticList diagnostics) =>
        new(name, all, CaseCombinations.Over(rules, all, name, diagnostics));

    /// <summary>The forces of a candidate, in the order of the source.</summary>
    public IReadOnlyList<MemberForces> Of(Member member) => [.. _byMember[member.Key]];
}
