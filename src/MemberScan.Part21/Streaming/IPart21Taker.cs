namespace MemberScan.Part21.Streaming;

/// <summary>Takes the wanted instances of a stretch of the file while the pass goes over them, so that they need not be read again.</summary>
/// <remarks>
/// A stretch may be gone over twice, and several by different threads at a time: each time it gets a taker of its own, and those that count
/// stand in <see cref="Part21Index.Takers"/>. A taker keeps nothing of an instance but what it copies.
/// </remarks>
public interface IPart21Taker
{
    /// <summary>Takes an instance; called in file order.</summary>
    /// <param name="instance">Good until the call returns.</param>
    void Take(in Part21Instance instance);
}
