using MemberScan.SampleModels.Units;

namespace MemberScan.SampleModels.Writing;

/// <summary>Writes the unit assignment of a model.</summary>
internal sealed class UnitWriter(ModelWriter model)
{
    /// <summary>Writes every unit type in use except those left out; gives the number of the assignment.</summary>
    public int Assign(IReadOnlyCollection<string> leftOut)
    {
        var units = model.Units;
        var torque = () => Derived("TORQUEUNIT", (units.MomentForce, 1), (units.MomentArm, 1));
        var modulus = () => Derived("MODULUSOFELASTICITYUNIT", (units.ModulusForce, 1), (units.ModulusLength, -2));
        var lineForce = () => Derived("LINEARFORCEUNIT", (units.Force, 1), (units.Length, -1));
        (string UnitType, Func<int> Write)[] all =
        [
            ("LENGTHUNIT", () => Named(units.Length)), ("AREAUNIT", () => Named(Area(units.Length))),
            ("PLANEANGLEUNIT", () => Add("PLANEANGLEUNIT", null, "RADIAN")), ("FORCEUNIT", () => Named(units.Force)),
            ("PRESSUREUNIT", () => Named(units.Pressure)), ("TORQUEUNIT", torque), ("MODULUSOFELASTICITYUNIT", modulus), ("LINEARFORCEUNIT", lineForce),
        ];
        var unknown = leftOut.Except(all.Select(u => u.UnitType)).FirstOrDefault();
        if (unknown is not null) throw new ArgumentException($"No unit type '{unknown}' is written.", nameof(leftOut));

        return model.Add("IFCUNITASSIGNMENT", Spelling.References([.. all.Where(u => !leftOut.Contains(u.UnitType)).Select(u => u.Write())]));
    }

    private int Named(FileUnit unit)
    {
        if (unit.ConversionName is null) return Add(unit.UnitType, unit.Prefix, unit.SiName);

        var dimensions = model.AddOnce("IFCDIMENSIONALEXPONENTS", Spelling.Integer(unit.Dimensions.Length), Spelling.Integer(unit.Dimensions.Mass),
            Spelling.Integer(unit.Dimensions.Time), "0", "0", "0", "0");
        var factor = model.AddOnce("IFCMEASUREWITHUNIT", Spelling.Typed(unit.Measure, ExactReal(unit.Factor)), Spelling.Reference(Add(unit.UnitType, null, unit.SiName)));
        return model.AddOnce("IFCCONVERSIONBASEDUNIT", Spelling.Reference(dimensions), Spelling.Literal(unit.UnitType), Spelling.Text(unit.ConversionName), Spelling.Reference(factor));
    }

    // A conversion factor keeps all its digits: 4.4482216152605 has more than twelve.
    private static string ExactReal(double value)
    {
        var text = value.ToString("R", System.Globalization.CultureInfo.InvariantCulture);
        return text.Contains('.', StringComparison.Ordinal) ? text : text + ".";
    }

    private int Derived(string unitType, params (FileUnit Unit, int Exponent)[] parts)
    {
        var elements = parts.Select(p => model.AddOnce("IFCDERIVEDUNITELEMENT", Spelling.Reference(Named(p.Unit)), Spelling.Integer(p.Exponent))).ToArray();
        string[] own = [Spelling.References(elements), Spelling.Literal(unitType), Spelling.Unset];
        return model.Add("IFCDERIVEDUNIT", model.Schema == SchemaVersion.Ifc4X3 ? [.. own, Spelling.Unset] : own);
    }

    private static FileUnit Area(FileUnit length) => new("AREAUNIT", "SQUARE_METRE", length.Prefix,
        length.ConversionName is null ? null : "square " + length.ConversionName, "IFCAREAMEASURE", (2, 0, 0), length.Factor * length.Factor);

    private int Add(string unitType, string? prefix, string siName) => model.AddOnce("IFCSIUNIT", Spelling.Derived, Spelling.Literal(unitType),
        prefix is null ? Spelling.Unset : Spelling.Literal(prefix), Spelling.Literal(siName));
}
