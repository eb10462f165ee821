using System.Collections.Immutable;
using System.Text.Json;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.Json;

namespace MemberScan.Inputs.Decisions;

/// <summary>Decisions in JSON; comments and trailing commas are allowed.</summary>
internal static class DecisionJson
{
    private const string Root = "decisions";

    public static ImmutableArray<ReviewDecision>? Read(ReadOnlyMemory<byte> bytes, string fileName, DiagnosticList diagnostics)
    {
        var source = new JsonSource(bytes, fileName, diagnostics);
        if (StrictJson.Read(source) is not { } root) return null;

        var values = new JsonValues(source);
        var decisions = ImmutableArray.CreateBuilder<ReviewDecision>();
        var met = new HashSet<string>(StringComparer.Ordinal);
        _ = values.Has(root, "the file", Root);
        foreach (var item in values.Object(root, "", [Root]).SelectMany(entry => values.List(entry.Value, Root)))
        {
            if (Decision(item, source, values, PlaceOf(bytes.Span, item.Offset, fileName)) is not { } decision) continue;
            if (!met.Add(decision.Member)) values.Fail(InputCodes.DecisionDoubled, item, $"a second decision for {Excerpt.Of(decision.Member)}; keep one");
            decisions.Add(decision);
        }

        return source.ErrorCount > 0 ? null : decisions.ToImmutable();
    }

    private static ReviewDecision? Decision(JsonItem item, JsonSource source, JsonValues values, SourceSpan place)
    {
        var texts = new Dictionary<string, string>(StringComparer.Ordinal) { ["note"] = "" };
        foreach (var entry in values.Object(item, "a decision", DecisionFile.Names))
        {
            if (entry.Value.Kind != JsonValueKind.String) values.Fail(InputCodes.WrongType, entry.Value, $"{entry.Key} is {entry.Value.Word}; give a text in quotes");
            else if (DecisionFault.Of(entry.Key, entry.Value.Text) is var (code, message)) values.Fail(code, entry.Value, message);
            else texts[entry.Key] = entry.Value.Text;
        }

        _ = values.Has(item, "a decision", DecisionFile.Names.AsSpan(0, 4));
        return source.ErrorCount > 0 ? null : new ReviewDecision(texts["member"], texts["decision"], texts["by"], texts["date"], texts["note"], place);
    }

    private static SourceSpan PlaceOf(ReadOnlySpan<byte> bytes, int offset, string fileName)
    {
        var before = bytes[..offset];
        return SourceSpan.At(fileName, before.Count((byte)'\n') + 1, before.Length - before.LastIndexOf((byte)'\n'));
    }
}
