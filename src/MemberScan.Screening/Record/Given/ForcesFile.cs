namespace MemberScan.Screening.Record.Given;

/// <summary>A file of forces beside the model.</summary>
/// <param name="FileName">Name of the file, without folder.</param>
/// <param name="Sha256">SHA-256 in hexadecimal.</param>
/// <param name="Rows">Rows read.</param>
/// <param name="RowsOfUnknownMembers">Rows of members that the model does not have; listed because the settings allow it.</param>
/// <param name="Convention">Sign convention, in words.</param>
public sealed record ForcesFile(string FileName, string Sha256, int Rows, int RowsOfUnknownMembers, string Convention);
