using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Ifc.Schema;

/// <summary>Maps the schema identifier of a header to the schema that a model is read by.</summary>
internal static class SchemaName
{
    /// <summary>The schema to read by; null when the identifier is none of IFC or too old.</summary>
    /// <remarks>Drafts and later additions are read by the nearest of the three, said so (IFC-0001).</remarks>
    public static SchemaVersion? Resolve(ImmutableArray<string> identifiers, DiagnosticList diagnostics)
    {
        var written = identifiers.IsDefaultOrEmpty ? "" : identifiers[0];
        var name = written.Trim().Split([' ', '{'], 2)[0].ToUpperInvariant();
        if (name is "IFC2X3") return SchemaVersion.Ifc2x3;
        if (name is "IFC4") return SchemaVersion.Ifc4;
        if (name is "IFC4X3_ADD2") return SchemaVersion.Ifc4x3;

        SchemaVersion? nearest =
            name.StartsWith("IFC4X3", StringComparison.Ordinal) ? SchemaVersion.Ifc4x3
            : name.StartsWith("IFC4", StringComparison.Ordinal) ? SchemaVersion.Ifc4
            : name.StartsWith("IFC2X3", StringComparison.Ordinal) ? SchemaVersion.Ifc2x3
            : null;
        if (nearest is { } schema)
            diagnostics.Add("IFC-0001", Severity.Warning, $"Schema '{name}' is read as {Text(schema)}, the nearest known.");
        else
            diagnostics.Add("IFC-0002", Severity.Error, $"Schema '{name}' is not read; export the model as IFC2X3, IFC4 or IFC4X3.");
        return nearest;
    }

    /// <summary>The identifier of a schema as a header writes it.</summary>
    public static string Text(SchemaVersion schema) => schema switch
    {
        SchemaVersion.Ifc2x3 => "IFC2X3",
        SchemaVersion.Ifc4 => "IFC4",
        _ => "IFC4X3_ADD2",
    };
}
