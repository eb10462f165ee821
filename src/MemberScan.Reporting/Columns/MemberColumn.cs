using MemberScan.Reporting.Display;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Columns;

/// <summary>One column of a typed table of candidates.</summary>
public sealed class MemberColumn
{
    private readonly Func<MemberResult, string?>? _text;
    private readonly Func<MemberResult, double?>? _number;

    private MemberColumn(string name, ColumnKind kind, ShownUnit? unit, string siSuffix, Func<MemberResult, string?>? text, Func<MemberResult, double?>? number) =>
        (Name, Kind, Unit, SiName, _text, _number) = (name, kind, unit, name + siSuffix, text, number);

    /// <summary>Its name, without unit.</summary>
    public string Name { get; }

    /// <summary>Type of its values.</summary>
    public ColumnKind Kind { get; }

    /// <summary>Unit that people read it in; null where it has none.</summary>
    public ShownUnit? Unit { get; }

    /// <summary>Its name with the SI unit behind it, such as <c>limit_Pa</c>.</summary>
    public string SiName { get; }

    /// <summary>A column of texts; empty ones count as not known.</summary>
    internal static MemberColumn Text(string name, Func<MemberResult, string?> value) => new(name, ColumnKind.Text, null, "", value, null);

    /// <summary>A column of whole numbers.</summary>
    internal static MemberColumn Integer(string name, Func<MemberResult, double?> value) => new(name, ColumnKind.Integer, null, "", null, value);

    /// <summary>A column of numbers.</summary>
    internal static MemberColumn Number(string name, ShownUnit? unit, string siSuffix, Func<MemberResult, double?> value) => new(name, ColumnKind.Number, unit, siSuffix, null, value);

    /// <summary>The text of a candidate; null where not known.</summary>
    public string? TextOf(MemberResult member) => _text?.Invoke(member) is { Length: > 0 } text ? text : null;

    /// <summary>The number of a candidate in SI; null where not known.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is not finite.</exception>
    public double? NumberOf(MemberResult member)
    {
        var number = _number?.Invoke(member);
        if (number is { } value && !double.IsFinite(value)) throw new ArgumentOutOfRangeException(nameof(member), $"{Name} of {member?.Key} is not finite.");
        return number;
    }
}
