using System.Collections.Immutable;

namespace MemberScan.Inputs.SettingsFiles;

/// <summary>The words by which a settings file names the values of an enumeration.</summary>
internal sealed class WordTable<T>(params (string Word, T Value)[] entries)
    where T : struct
{
    public ImmutableArray<string> Words { get; } = [.. entries.Select(entry => entry.Word)];

    public T Of(string word) => entries.First(entry => entry.Word == word).Value;

    public string WordOf(T value) => entries.First(entry => EqualityComparer<T>.Default.Equals(entry.Value, value)).Word;
}
