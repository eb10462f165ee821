namespace MemberScan.Checks.Deflection;

/// <summary>A limit of deflection that the reviewer names for a role.</summary>
/// <param name="Name">Its name, as printed beside the value; not empty.</param>
/// <param name="Role">Role of the members that it is for, such as <c>post</c>.</param>
/// <param name="SpanOver">Span over the largest deflection [-], such as 200 for L/200; null for none.</param>
/// <param name="Largest">Largest deflection [m]; null for none. With both the smaller one counts.</param>
public sealed record DeflectionLimit(string Name, string Role, double? SpanOver, double? Largest)
{
    /// <summary>Largest deflection for a span [m].</summary>
    /// <param name="span">Span, of a cantilever its length [m], &gt; 0.</param>
    /// <exception cref="InvalidOperationException">The limit has neither of its two values above zero.</exception>
    public double For(double span)
    {
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(span);
        var largest = Math.Min(SpanOver is > 0 and { } ratio ? span / ratio : double.PositiveInfinity, Largest is > 0 and { } value ? value : double.PositiveInfinity);
        return double.IsFinite(largest) ? largest : throw new InvalidOperationException($"the deflection limit '{Name}' has no value above zero");
    }
}
