using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Units;
using MemberScan.Inputs.Json;
using MemberScan.Model.Presets;

namespace MemberScan.Inputs.Presets;

/// <summary>Pipe sizes and what may fill them, of <c>config/loads/pipes.json</c>, embedded in the program.</summary>
public sealed class PipeTable
{
    private static readonly Lazy<PipeTable> s_shipped = new(ReadShipped);

    private PipeTable(ImmutableArray<PipeSize> pipes, ImmutableSortedDictionary<string, double> contents) => (Pipes, Contents) = (pipes, contents);

    /// <summary>The shipped table.</summary>
    public static PipeTable Shipped => s_shipped.Value;

    /// <summary>The pipes, in the order of the table.</summary>
    public ImmutableArray<PipeSize> Pipes { get; }

    /// <summary>Densities of contents by name [kg/m³].</summary>
    public ImmutableSortedDictionary<string, double> Contents { get; }

    /// <summary>A pipe by nominal size and schedule; null when the table has none.</summary>
    public PipeSize? Find(string size, string schedule) => Pipes.FirstOrDefault(p => p.Name == size.Trim() && p.Schedule == schedule.Trim());

    private static PipeTable ReadShipped()
    {
        var diagnostics = new DiagnosticList();
        var source = new JsonSource(ShippedFiles.Read(ShippedFiles.Pipes), ShippedFiles.Pipes, diagnostics);
        var values = new JsonValues(source);
        var table = StrictJson.Read(source) is { } root ? Read(root, values) : null;
        return diagnostics.HasErrors || table is null ? throw new InvalidOperationException($"the shipped pipe sizes are damaged: {diagnostics.Items[0]}") : table;
    }

    private static PipeTable Read(JsonItem root, JsonValues values)
    {
        var standard = "";
        var pipes = ImmutableArray.CreateBuilder<PipeSize>();
        var contents = ImmutableSortedDictionary.CreateBuilder<string, double>(StringComparer.Ordinal);
        foreach (var (key, _, value) in values.Object(root, "", ["standard", "pipes", "contents"]))
        {
            switch (key)
            {
                case "standard": standard = values.Text(value, key) ?? ""; break;
                case "pipes":
                    foreach (var item in values.List(value, key))
                        if (Pipe(item, standard, values) is { } pipe) pipes.Add(pipe);
                    break;
                default:
                    foreach (var item in values.List(value, key))
                    {
                        var entries = values.Object(item, key, ["name", "density"]).ToDictionary(e => e.Key, e => e.Value, StringComparer.Ordinal);
                        if (values.Has(item, key, "name", "density") && values.Text(entries["name"], key) is { } name && values.Number(entries["density"], key, 0, 25_000) is { } density)
                            contents[name] = density;
                    }

                    break;
            }
        }

        return new PipeTable(pipes.ToImmutable(), contents.ToImmutable());
    }

    private static PipeSize? Pipe(JsonItem item, string standard, JsonValues values)
    {
        if (!values.Has(item, "pipes", "size", "schedule", "outer", "wall")) return null;

        var entries = values.Object(item, "pipes", ["size", "schedule", "outer", "wall"]).ToDictionary(e => e.Key, e => e.Value, StringComparer.Ordinal);
        double? Length(string key) => values.Quantity(entries[key], $"pipes.{key}", Quantity.Length, "4.5 in", 1e-3, 2);
        return values.Text(entries["size"], "pipes.size") is { } size && values.Text(entries["schedule"], "pipes.schedule") is { } schedule
            && Length("outer") is { } outer && Length("wall") is { } wall && 2 * wall < outer
            ? new PipeSize(size, schedule, outer, wall, standard)
            : null;
    }
}
