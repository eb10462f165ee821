namespace MemberScan.Screening.Record.Given;

/// <summary>One effective setting.</summary>
/// <param name="Key">Its key, such as <c>forces.convention</c>.</param>
/// <param name="Value">Its value as text.</param>
/// <param name="IsDefault">Whether it was not given.</param>
public sealed record SettingLine(string Key, string Value, bool IsDefault);
