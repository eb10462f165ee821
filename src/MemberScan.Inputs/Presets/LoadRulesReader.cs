using System.Collections.Immutable;
using System.Text.Json;
using MemberScan.Foundation.Units;
using MemberScan.Inputs.Json;
using MemberScan.Model.Presets;

namespace MemberScan.Inputs.Presets;

/// <summary>Reads the <c>loads</c> part of a settings file: which presets are switched on, for which members.</summary>
internal sealed class LoadRulesReader(JsonValues values, ISet<string> given)
{
    public static readonly ImmutableArray<string> Keys = ["presets", "contactTolerance"];
    public static readonly ImmutableArray<string> UseKeys = ["use", "members", "pipe", "schedule", "contents", "spacing"];

    private static readonly (double Least, double Most) s_tolerance = (1e-4, 0.5), s_spacing = (0.05, 20);

    public LoadRules Read(JsonItem item, LoadRules rules)
    {
        foreach (var (key, _, value) in values.Object(item, "loads", Keys))
        {
            _ = given.Add($"loads.{key}");
            rules = key == "presets"
                ? rules with { Presets = Uses(value, "loads.presets") }
                : rules with { ContactTolerance = values.Quantity(value, "loads.contactTolerance", Quantity.Length, "25 mm", s_tolerance.Least, s_tolerance.Most) ?? rules.ContactTolerance };
        }

        return rules;
    }

    private ImmutableArray<PresetUse> Uses(JsonItem list, string path)
    {
        var uses = ImmutableArray.CreateBuilder<PresetUse>();
        var number = 0;
        foreach (var item in values.List(list, path))
        {
            var at = $"{path}[{++number}]";
            if ((item.Kind == JsonValueKind.String ? Plain(item, at) : Full(item, at)) is not { } use) continue;
            if (uses.Any(other => other.Preset.Name == use.Preset.Name && other.Members == use.Members))
                values.Fail(InputCodes.EntryDoubled, item, $"{at} switches {Excerpt.Of(use.Preset.Name)} on for the same members as an earlier one; keep one of them");
            else uses.Add(use);
        }

        return uses.ToImmutable();
    }

    private PresetUse? Plain(JsonItem item, string path) => Preset(item, path) is { } preset ? Complete(item, path, new PresetUse(preset, "*")) : null;

    private PresetUse? Full(JsonItem item, string path)
    {
        if (!values.Has(item, path, "use")) return null;

        LoadPreset? preset = null;
        string members = "*", contents = "";
        string? pipe = null, schedule = null;
        var (spacing, isSound) = (0.0, true);
        foreach (var (key, _, value) in values.Object(item, path, UseKeys))
        {
            var at = $"{path}.{key}";
            switch (key)
            {
                case "use": preset = Preset(value, at); break;
                case "members": members = values.Text(value, at) ?? members; break;
                case "pipe": isSound &= (pipe = values.Word(value, at, [.. PipeTable.Shipped.Pipes.Select(p => p.Name).Distinct()])) is not null; break;
                case "schedule": isSound &= (schedule = values.Word(value, at, [.. PipeTable.Shipped.Pipes.Select(p => p.Schedule).Distinct()])) is not null; break;
                case "contents": isSound &= (contents = values.Word(value, at, [.. PipeTable.Shipped.Contents.Keys]) ?? "").Length > 0; break;
                default: spacing = values.Quantity(value, at, Quantity.Length, "3 m", s_spacing.Least, s_spacing.Most) ?? 0; break;
            }
        }

        if (preset is null || !isSound) return null;

        var use = new PresetUse(preset, members) { Contents = contents, ContentsDensity = contents.Length > 0 ? PipeTable.Shipped.Contents[contents] : 0, Spacing = spacing };
        if (pipe is not null && schedule is not null)
        {
            use = use with { Pipe = PipeTable.Shipped.Find(pipe, schedule) };
            if (use.Pipe is null)
            {
                values.Fail(InputCodes.WordUnknown, item, $"{path}: there is no pipe {Excerpt.Of(pipe)} of schedule {Excerpt.Of(schedule)} in the table of sizes; give another schedule");
                return null;
            }
        }

        return Complete(item, path, use);
    }

    /// <summary>Refuses a hanger preset that does not say which pipe it carries.</summary>
    private PresetUse? Complete(JsonItem item, string path, PresetUse use)
    {
        if (use.Preset.Kind is not (PresetKind.Hanger or PresetKind.SprinklerHanger)) return use;
        if (use is { Pipe: not null, Spacing: > 0, Contents.Length: > 0 })
        {
            if (use.Preset.Kind != PresetKind.SprinklerHanger || use.ContentsDensity > 0) return use;

            values.Fail(InputCodes.WordUnknown, item, $"{path}: {Excerpt.Of(use.Preset.Name)} asks for the weight of the water-filled pipe; give contents \"water\"");
            return null;
        }

        values.Fail(InputCodes.KeyMissing, item, $"{path}: {Excerpt.Of(use.Preset.Name)} needs pipe, schedule, contents and spacing, such as \"pipe\": \"4\", \"schedule\": \"40\", \"contents\": \"water\", \"spacing\": \"3 m\"");
        return null;
    }

    private LoadPreset? Preset(JsonItem item, string path) => values.Word(item, path, [.. PresetTable.Shipped.Select(p => p.Name)]) is { } name
        ? PresetTable.Shipped.First(p => p.Name == name)
        : null;
}
