namespace MemberScan.Part21.Reading;

/// <summary>How much a text may ask of the reader.</summary>
/// <param name="Depth">Brackets within brackets.</param>
/// <param name="InstanceLength">One instance [byte].</param>
/// <param name="StringLength">One string [byte].</param>
/// <param name="KeywordLength">One keyword [byte].</param>
/// <param name="Keywords">Different keywords.</param>
/// <param name="Instances">Instances.</param>
/// <param name="RescannedBytes">Text read a second time after damage [byte].</param>
internal sealed record ReadingLimits(
    int Depth,
    int InstanceLength,
    int StringLength,
    int KeywordLength,
    int Keywords,
    int Instances,
    long RescannedBytes);
