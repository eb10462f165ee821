using System.Globalization;
using MemberScan.Ifc.Schema;
using MemberScan.Ifc.Units;
using MemberScan.Model.Frames;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames.Topology;

/// <summary>Supports and releases from IfcBoundaryNodeCondition, in the encodings of all schemas.</summary>
/// <remarks>
/// IFC2X3: bare numbers, −1 rigid, 0 free, above zero a spring. Later: a boolean (true is rigid) or a measured stiffness. A direction that
/// is left out is not known: it is neither free nor rigid.
/// </remarks>
internal sealed class BoundaryReader(ModelUnits units, SchemaVersion schema)
{
    private static readonly Direction[] s_directions = [Direction.Ux, Direction.Uy, Direction.Uz, Direction.Rx, Direction.Ry, Direction.Rz];

    /// <summary>How the six directions are held; null with the reason when that is not known.</summary>
    public Restraints? Read(Part21Record condition, out Reason? why)
    {
        why = null;
        if (condition.Keyword is not ("IFCBOUNDARYNODECONDITION" or "IFCBOUNDARYNODECONDITIONWARPING"))
        {
            why = new Reason(ReasonCode.NoForces, $"the boundary condition #{condition.Id} is {condition.Keyword}, which is no condition of a node");
            return null;
        }

        var restraints = Restraints.AllFree;
        foreach (var direction in s_directions)
        {
            if (One(condition, direction, out var fault) is not { } held)
            {
                why = new Reason(fault.Contains("unit", StringComparison.Ordinal) ? ReasonCode.UnitMissing : ReasonCode.NoForces, $"the boundary condition #{condition.Id} {fault}");
                return null;
            }

            restraints = restraints.With(direction, held);
        }

        return restraints;
    }

    private Restraint? One(Part21Record condition, Direction direction, out string fault)
    {
        var value = condition[(int)direction + 1];
        fault = "";
        if (value.IsEmpty)
        {
            fault = $"does not say how {direction} is held";
            return null;
        }

        var inner = value.Kind == Part21ValueKind.Typed ? value.Inner : value;
        if (inner.TryEnumeration(out var literal))
        {
            if (literal is "T" or "F") return literal == "T" ? Restraint.Fixed : Restraint.Free;

            fault = $"has the word {literal} for {direction}";
            return null;
        }

        if (Instances.Real(inner) is not { } number || !double.IsFinite(number))
        {
            fault = $"has something other than a number or true and false for {direction}";
            return null;
        }

        if (number == 0) return Restraint.Free;
        if (number == -1 && schema == SchemaVersion.Ifc2x3) return Restraint.Fixed;

        return Spring(number, direction, ref fault);
    }

    private Restraint? Spring(double number, Direction direction, ref string fault)
    {
        if (number < 0)
        {
            fault = string.Create(CultureInfo.InvariantCulture, $"has the stiffness {number:R} for {direction}, which is below zero");
            return null;
        }

        var unit = direction <= Direction.Uz ? "LINEARSTIFFNESSUNIT" : "ROTATIONALSTIFFNESSUNIT";
        if (units.FactorOf(unit) is { } factor) return Restraint.Spring(factor * number);

        fault = $"has a stiffness for {direction} whose unit the model does not name ({unit})";
        return null;
    }
}
