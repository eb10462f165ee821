using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc.Units;
using MemberScan.Part21;

namespace MemberScan.Ifc.WriteBack;

/// <summary>Reads results back out of a model, as a modeler's script would: through the relations of the elements.</summary>
public static class ResultReader
{
    private const int PropertiesIndex = 4, RelatedIndex = 4, DefinitionIndex = 5, NameIndex = 2, ValueIndex = 2, UnitIndex = 3;

    /// <summary>The results in file order of their relations; numbers in SI.</summary>
    /// <param name="model">The model, with its results in it.</param>
    public static ImmutableArray<ElementResults> Read(IfcModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        var instances = new Instances(model.File);
        var units = new UnitReader(instances, new DiagnosticList());
        var results = ImmutableArray.CreateBuilder<ElementResults>();
        foreach (var relation in model.File.RecordsOf("IFCRELDEFINESBYPROPERTIES"))
        {
            if (!instances.TryFollow(relation[DefinitionIndex], out var set) || set.Keyword != "IFCPROPERTYSET" || Instances.Text(set[NameIndex]) != StressCheckSet.SetName) continue;

            var values = instances.FollowAll(set[PropertiesIndex]).Where(p => p.Keyword == "IFCPROPERTYSINGLEVALUE")
                .Select(p => Value(p, instances, units, model.Units)).ToImmutableArray();
            foreach (var element in instances.FollowAll(relation[RelatedIndex]))
                results.Add(new ElementResults(element.Id, Instances.Text(element[0]), element.Keyword, Instances.Text(element[NameIndex]), values));
        }

        return results.ToImmutable();
    }

    private static ElementResult Value(Part21Record property, Instances instances, UnitReader units, ModelUnits model)
    {
        var value = property[ValueIndex];
        var factor = instances.TryFollow(property[UnitIndex], out var unit) ? units.Factor(unit) : value.TypeName switch
        {
            "IFCPRESSUREMEASURE" => model.Pressure,
            "IFCLENGTHMEASURE" => model.Length,
            _ => 1,
        };
        var number = value.TryReal(out var real) ? real * factor : null;
        return new ElementResult(Instances.Text(property[0]), value.TypeName, Instances.Text(value), number);
    }
}
