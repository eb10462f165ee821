using MemberScan.Model.Verdicts;

namespace MemberScan.Model;

/// <summary>A value with its source, or the reason why there is none.</summary>
/// <typeparam name="T">Kind of value.</typeparam>
public abstract record Finding<T>
{
    private Finding()
    {
    }

    /// <summary>The value and where it comes from.</summary>
    /// <param name="Value">The value, in SI.</param>
    /// <param name="Source">Property, profile, grade table, setting or file line, in words.</param>
    public sealed record Found(T Value, string Source) : Finding<T>;

    /// <summary>There is none.</summary>
    /// <param name="Why">The reason.</param>
    public sealed record Missing(Reason Why) : Finding<T>;
}
