namespace MemberScan.Inputs.SettingsFiles.Limits;

/// <summary>The words of <c>threads.rule</c>: automatic, then those of <see cref="Model.Limits.Threads.ThreadRule"/> in its order.</summary>
internal enum ThreadWord
{
    Automatic,
    Basis,
    Allowable,
    Aisc360,
    En1993,
}
