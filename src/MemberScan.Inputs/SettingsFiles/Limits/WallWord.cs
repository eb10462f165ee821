namespace MemberScan.Inputs.SettingsFiles.Limits;

/// <summary>The words of <c>basis.wall</c>: automatic, then those of <see cref="Model.Limits.WallBasis"/> in its order.</summary>
internal enum WallWord
{
    Automatic,
    Nominal,
    Design,
    ByGrade,
}
