namespace MemberScan.Inputs.SettingsFiles;

/// <summary>One setting in force.</summary>
/// <param name="Key">Its key, such as <c>forces.convention</c>; entries of lists and maps carry their number or name.</param>
/// <param name="Value">Its value as canonical text: the same value always gives the same text.</param>
/// <param name="IsDefault">Whether it was not given.</param>
public sealed record EffectiveSetting(string Key, string Value, bool IsDefault);
