using System.Diagnostics.CodeAnalysis;
using MemberScan.Model.Verdicts;

namespace MemberScan.Model;

/// <summary>A value with its source, or the reason why there is none.</summary>
/// <typeparam name="T">Kind of value.</typeparam>
public abstract record Finding<T>
{
    private Finding()
    {
    }

    /// <summary>Takes the finding apart: the value with its source, or the reason.</summary>
    public bool TryGet([NotNullWhen(true)] out Found? found, [NotNullWhen(false)] out Reason? why)
    {
        found = this as Found;
        why = (this as Missing)?.Why;
        return found is not null;
    }

    /// <summary>The value and where it comes from.</summary>
    /// <param name="Value">The value, in SI.</param>
    /// <param name="Source">Property, profile, grade table, setting or file line, in words.</param>
    public sealed record Found(T Value, string Source) : Finding<T>;

    /// <summary>There is none.</summary>
    /// <param name="Why">The reason.</param>
    public sealed record Missing(Reason Why) : Finding<T>;
}
