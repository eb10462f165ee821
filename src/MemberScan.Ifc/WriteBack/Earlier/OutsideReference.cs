namespace MemberScan.Ifc.WriteBack.Earlier;

/// <summary>An instance of ours that one of another program refers to.</summary>
/// <param name="Ours">Number of ours.</param>
/// <param name="By">Number of the other.</param>
/// <param name="ByKeyword">Keyword of the other, upper case.</param>
public readonly record struct OutsideReference(ulong Ours, ulong By, string ByKeyword);
