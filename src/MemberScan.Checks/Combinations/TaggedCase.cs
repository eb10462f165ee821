using MemberScan.Model.Rules.Combinations;

namespace MemberScan.Checks.Combinations;

/// <summary>A load case whose action is known.</summary>
/// <param name="Name">Name of the case.</param>
/// <param name="Tag">Its action.</param>
public sealed record TaggedCase(string Name, ActionTag Tag);
