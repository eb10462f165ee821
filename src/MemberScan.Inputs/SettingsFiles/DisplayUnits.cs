namespace MemberScan.Inputs.SettingsFiles;

/// <summary>Units in which results are shown.</summary>
public enum DisplayUnits
{
    /// <summary>mm, kN, kN·m, MPa.</summary>
    Si,

    /// <summary>in, ft, kip, kip·ft, ksi.</summary>
    Us,
}
