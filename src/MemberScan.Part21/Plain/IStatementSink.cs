namespace MemberScan.Part21.Plain;

/// <summary>Takes the instances that a scan finds, in file order.</summary>
/// <remarks>Implemented by structs, so that the scan is compiled for each and calls nothing through a table.</remarks>
internal interface IStatementSink
{
    /// <summary>Whether lengths are used; where not, those of plain statements are told as 0.</summary>
    static abstract bool NeedsLength { get; }

    /// <summary>Whether the keyword is used that has these as its fourth to seventh byte (lowest first); where not, that of a plain statement is told as empty.</summary>
    bool MayWant(uint letters);

    /// <summary>An instance.</summary>
    /// <param name="offset">Of its '#' [byte].</param>
    /// <param name="length">From '#' to ';' [byte].</param>
    /// <param name="id">Its number.</param>
    /// <param name="keyword">Its keyword as written; empty if complex or lost.</param>
    /// <param name="flags">What is known of it.</param>
    void Add(long offset, int length, uint id, ReadOnlySpan<byte> keyword, Index.InstanceFlags flags);
}
