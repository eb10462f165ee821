namespace MemberScan.Part21.Index;

/// <summary>Where an instance of a wanted keyword stands.</summary>
/// <param name="Offset">Of its '#' [byte].</param>
/// <param name="Id">Its number.</param>
/// <param name="Keyword">Number of the keyword among the wanted ones.</param>
internal readonly record struct PlaceRow(long Offset, uint Id, int Keyword);
