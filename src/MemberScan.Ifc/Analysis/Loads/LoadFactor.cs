namespace MemberScan.Ifc.Analysis.Loads;

/// <summary>The factor of a load group or case within a combination.</summary>
/// <param name="Group">STEP id of the group.</param>
/// <param name="Factor">Factor of its actions, or of its results [-].</param>
internal readonly record struct LoadFactor(ulong Group, double Factor);
