using MemberScan.Part21.Index;

namespace MemberScan.Part21.Plain;

/// <summary>Takes the instances that a scan finds, in file order.</summary>
/// <remarks>Implemented by structs, so that the scan is compiled for each and calls nothing through a table.</remarks>
internal interface IStatementSink
{
    /// <summary>Whether the text of every plain instance is used; where not, it is told only where the keyword may be wanted.</summary>
    static abstract bool NeedsText { get; }

    /// <summary>Whether the keyword may be wanted that has these as its fourth to seventh byte, lowest first; where not, that of a plain instance is told as empty.</summary>
    bool MayWant(uint letters);

    /// <summary>An instance of plain layout.</summary>
    /// <param name="offset">Of its '#' [byte].</param>
    /// <param name="id">Its number.</param>
    /// <param name="text">From '#' to ';'; empty where it is not used.</param>
    /// <param name="keyword">Its keyword; empty where it is not used.</param>
    void AddPlain(long offset, uint id, ReadOnlySpan<byte> text, ReadOnlySpan<byte> keyword);

    /// <summary>Any other instance.</summary>
    /// <param name="offset">Of its '#' [byte].</param>
    /// <param name="id">Its number.</param>
    /// <param name="text">From '#' to ';', or to where reading went on.</param>
    /// <param name="keyword">Its keyword in upper case; empty if complex or lost.</param>
    /// <param name="flags">What is known of it.</param>
    void AddOther(long offset, uint id, ReadOnlySpan<byte> text, ReadOnlySpan<byte> keyword, InstanceFlags flags);

    /// <summary>Something that is no instance follows the last one.</summary>
    void PassOver();
}
