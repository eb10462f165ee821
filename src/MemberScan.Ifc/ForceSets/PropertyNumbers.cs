using MemberScan.Ifc.Units;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.ForceSets;

/// <summary>Numbers of a property in SI: by the property's own unit, by the measure and the model's unit, or by the unit that the mapping states.</summary>
internal sealed class PropertyNumbers(Instances instances, ModelUnits units, UnitReader reader)
{
    /// <summary>Most values of one list or table.</summary>
    public const int MaxValues = 100_000;

    /// <summary>The numbers of a list of values, or of one value.</summary>
    /// <param name="property">Name of the property, for messages.</param>
    /// <param name="values">The list or value.</param>
    /// <param name="unit">The property's own unit.</param>
    /// <param name="unitType">Type of unit that fits, such as <c>FORCEUNIT</c>.</param>
    /// <param name="bare">SI size of a bare number; null when the mapping states none.</param>
    /// <param name="why">Why there are none.</param>
    public double[]? Read(string property, Part21Value values, Part21Value unit, string unitType, double? bare, out Reason? why)
    {
        why = null;
        double? own = null;
        if (!unit.IsEmpty && (own = OwnUnit(unit, unitType)) is null)
        {
            why = new Reason(ReasonCode.UnitMissing, $"the property '{property}' has a unit of its own that is none of {Words(unitType)}");
            return null;
        }

        var isList = values.Inner.Kind == Part21ValueKind.List && values.TypeName.Length == 0;
        if (isList && values.ItemCount > MaxValues)
        {
            why = new Reason(ReasonCode.ForcesIncomplete, $"the property '{property}' has more than {MaxValues} values");
            return null;
        }

        Part21Value[] all = isList ? [.. values.Inner.Items] : [values];
        var numbers = new double[all.Length];
        for (var i = 0; i < all.Length; i++)
            if (Number(property, all[i], own, unitType, bare, out why) is { } number) numbers[i] = number;
            else return null;
        return numbers;
    }

    private double? Number(string property, Part21Value value, double? own, string unitType, double? bare, out Reason? why)
    {
        why = null;
        if (Instances.Real(value) is not { } real || !double.IsFinite(real))
        {
            why = new Reason(ReasonCode.ForcesIncomplete, $"the property '{property}' holds something other than a number");
            return null;
        }

        if (real == 0) return 0;
        var factor = own ?? (UnitTypeOf(value.TypeName) is { } measured ? measured == unitType ? units.FactorOf(unitType) : null : bare);
        if (factor is { } known && double.IsFinite(real * known)) return real * known;

        why = new Reason(ReasonCode.UnitMissing, UnitTypeOf(value.TypeName) is { } other && other != unitType
            ? $"the property '{property}' is an {value.TypeName}, which is no measure of {Words(unitType)}"
            : $"the property '{property}' is a bare number or its unit is missing ({unitType}); the mapping can state a unit");
        return null;
    }

    private double? OwnUnit(Part21Value unit, string unitType) =>
        instances.TryFollow(unit, out var record) && Instances.Literal(record[1]) == unitType ? reader.Factor(record) : null;

    // Measures that are bare numbers have no unit type.
    private static string? UnitTypeOf(string typeName) => typeName switch
    {
        "IFCFORCEMEASURE" => "FORCEUNIT",
        "IFCTORQUEMEASURE" => "TORQUEUNIT",
        "IFCLENGTHMEASURE" or "IFCPOSITIVELENGTHMEASURE" or "IFCNONNEGATIVELENGTHMEASURE" => "LENGTHUNIT",
        "" or "IFCREAL" or "IFCINTEGER" or "IFCNUMERICMEASURE" or "IFCCOUNTMEASURE" or "IFCRATIOMEASURE" => null,
        _ => typeName,
    };

    private static string Words(string unitType) => unitType switch { "FORCEUNIT" => "force", "TORQUEUNIT" => "moment", _ => "length" };
}
