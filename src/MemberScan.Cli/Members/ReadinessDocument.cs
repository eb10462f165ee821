using System.Collections.Immutable;

namespace MemberScan.Cli.Members;

/// <summary>The shape of the JSON file of the members command; SI values.</summary>
internal sealed record ReadinessDocument(
    string File, string Sha256, string Schema, bool ReadToEnd, bool HasDamage, int Candidates, int Ready, ImmutableArray<ReadinessDocument.Total> Totals,
    ImmutableArray<ReadinessDocument.Passed> PassedOver, ImmutableArray<ReadinessDocument.Candidate> Members)
{
    /// <summary>How many candidates lack one thing.</summary>
    internal sealed record Total(string Code, int Count, string Request);

    /// <summary>Elements that are no candidates.</summary>
    internal sealed record Passed(string Class, int Count, string Why);

    /// <summary>Something missing.</summary>
    internal sealed record Lack(string Code, string Message);

    /// <summary>One candidate; strength in Pa, length in m.</summary>
    internal sealed record Candidate(
        string Key, string GlobalId, int Item, string Tag, string Name, string Class, string PredefinedType, string TypeName, string RoleGuess, string Storey,
        string StoreyPath, string Assembly, string Layer, string Section, string SectionSource,
        string Material, double? StrengthPa, string StrengthSource, double? LengthM, string LengthSource, int Situations, int Stations, string ForcesSource,
        bool Ready, ImmutableArray<Lack> Missing, ImmutableArray<string> Notes);
}
