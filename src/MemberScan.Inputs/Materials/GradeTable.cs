using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.Json;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.Materials;

/// <summary>Material grades, found by the name that a model gives its material.</summary>
public sealed class GradeTable
{
    private static readonly Lazy<GradeTable> s_shipped = new(ReadShipped);

    /// <summary>A table of grades, tried in their order.</summary>
    public GradeTable(ImmutableArray<Grade> grades) => Grades = grades;

    /// <summary>The table in <c>config/materials/grades.json</c>, embedded in the program; every value is marked as from memory.</summary>
    public static GradeTable Shipped => s_shipped.Value;

    /// <summary>The grades, in the order of trial.</summary>
    public ImmutableArray<Grade> Grades { get; }

    /// <summary>The first grade whose pattern fits the whole name, without regard to case; null when none does.</summary>
    /// <remarks>A plain word such as <c>Steel</c> names no grade.</remarks>
    public Grade? Find(string materialName)
    {
        ArgumentNullException.ThrowIfNull(materialName);
        return Grades.FirstOrDefault(grade => grade.Fits(materialName));
    }

    internal static ImmutableArray<Grade> Read(ReadOnlyMemory<byte> bytes, string fileName, DiagnosticList diagnostics, bool isShipped = false)
    {
        var source = new JsonSource(bytes, fileName, diagnostics) { IsShipped = isShipped };
        if (StrictJson.Read(source) is not { } root) return [];

        var values = new JsonValues(source);
        var grades = ImmutableArray<Grade>.Empty;
        _ = values.Has(root, "the file", "grades");
        foreach (var (_, _, list) in values.Object(root, "", ["grades"])) grades = GradeReader.Read(list, "grades", values);
        return grades;
    }

    private static GradeTable ReadShipped()
    {
        var diagnostics = new DiagnosticList();
        var grades = Read(ShippedFiles.Read(ShippedFiles.Grades), ShippedFiles.Grades, diagnostics, isShipped: true);
        return diagnostics.HasErrors
            ? throw new InvalidOperationException($"the shipped grades are damaged: {diagnostics.Items[0]}")
            : new GradeTable(grades);
    }
}
