using System.Collections.Immutable;
using System.Text.Json;
using MemberScan.Inputs.Json;

namespace MemberScan.Inputs.SettingsFiles.Limits;

/// <summary>The lines of a settings file on which its keys stand.</summary>
internal static class SettingPlaces
{
    /// <summary>Line of each key by its path, such as <c>basis.service.omega</c>; lists count as one key.</summary>
    public static ImmutableDictionary<string, int> Of(JsonItem root, JsonSource source)
    {
        var lines = ImmutableDictionary.CreateBuilder<string, int>(StringComparer.Ordinal);
        Add(root, "");
        return lines.ToImmutable();

        // The reader has bounded the nesting.
        void Add(JsonItem item, string path)
        {
            foreach (var (key, offset, value) in item.Entries)
            {
                var at = path.Length == 0 ? key : $"{path}.{key}";
                lines[at] = source.LineOf(offset);
                if (value.Kind == JsonValueKind.Object) Add(value, at);
            }
        }
    }
}
