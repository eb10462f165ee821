using System.Collections.Immutable;

namespace MemberScan.Screening.Record.Given;

/// <summary>What names a model and how it was read.</summary>
/// <param name="FileName">Name of the file, without folder.</param>
/// <param name="Container">"out of x.ifczip", or empty.</param>
/// <param name="Sha256">SHA-256 of the base model: the text without a block of ours, in hexadecimal.</param>
/// <param name="Bytes">Size of the base model [byte].</param>
/// <param name="Schema">Schema as written in the file.</param>
/// <param name="ReadAs">Schema it was read as.</param>
/// <param name="ProjectName">Name of the project; empty if none.</param>
/// <param name="OriginatingSystem">Program that wrote it, as its header says; empty if none.</param>
/// <param name="TimeStamp">Time stamp of its header; empty if none.</param>
/// <param name="ReadToEnd">Whether it could be read to its end.</param>
/// <param name="Units">Units in use.</param>
public sealed record ModelFacts(
    string FileName, string Container, string Sha256, long Bytes, string Schema, string ReadAs, string ProjectName,
    string OriginatingSystem, string TimeStamp, bool ReadToEnd, ImmutableArray<UnitLine> Units);
