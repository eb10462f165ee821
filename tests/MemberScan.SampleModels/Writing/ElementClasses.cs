namespace MemberScan.SampleModels.Writing;

/// <summary>The parameters that element classes have behind Tag (position 7), by schema.</summary>
public static class ElementClasses
{
    /// <summary>Parameters from position 8 on, spelled; those that are optional and not given here stay unset.</summary>
    public static string[] OwnParameters(string keyword, SchemaVersion schema, string? predefinedType)
    {
        var kind = predefinedType is null ? Spelling.Unset : Spelling.Literal(predefinedType);
        var old = schema == SchemaVersion.Ifc2X3;
        return keyword switch
        {
            "IFCBEAM" or "IFCCOLUMN" or "IFCMEMBER" or "IFCPLATE" or "IFCDISCRETEACCESSORY" or "IFCFASTENER" or "IFCBUILDINGELEMENTPART" or "IFCPIPESEGMENT"
                or "IFCBEAMSTANDARDCASE" or "IFCCOLUMNSTANDARDCASE" or "IFCMEMBERSTANDARDCASE" or "IFCCABLESEGMENT" => old ? [] : [kind],
            "IFCRAILING" => [kind],
            "IFCBUILDINGELEMENTPROXY" => old ? [Spelling.Unset] : [kind],
            "IFCFLOWSEGMENT" => [],
            "IFCMECHANICALFASTENER" => old ? [Spelling.Unset, Spelling.Unset] : [Spelling.Unset, Spelling.Unset, kind],
            "IFCELEMENTASSEMBLY" => [Spelling.Unset, predefinedType is null ? Spelling.Literal("NOTDEFINED") : kind],
            _ => throw new ArgumentException($"Parameters of {keyword} are not in the table.", nameof(keyword)),
        };
    }
}
