namespace MemberScan.Cli.Screening.Many;

/// <summary>One of several models.</summary>
/// <param name="Path">Its path.</param>
/// <param name="Below">Folder of the model below the folder or pattern that it was found by; empty for one given by name. Outputs under <c>--out</c> keep it.</param>
internal sealed record FoundModel(string Path, string Below);
