namespace MemberScan.Foundation.Diagnostics;

/// <summary>Findings of one run; equal ones are counted, not repeated.</summary>
/// <remarks>Not safe for several threads at once; each gathers its own and they are joined in order.</remarks>
public sealed class DiagnosticList
{
    private readonly List<Diagnostic> _items = [];
    private readonly Dictionary<(string Code, string Message), int> _counts = [];

    /// <summary>Each different finding once, in the order first met, with the place of the first.</summary>
    public IReadOnlyList<Diagnostic> Items => _items;

    /// <summary>Whether any finding is an error.</summary>
    public bool HasErrors => _items.Exists(d => d.Severity == Severity.Error);

    /// <summary>Adds a finding, or counts it if its code and message were met before.</summary>
    public void Add(Diagnostic diagnostic)
    {
        ArgumentNullException.ThrowIfNull(diagnostic);
        var key = (diagnostic.Code, diagnostic.Message);
        if (_counts.TryGetValue(key, out var count))
        {
            _counts[key] = count + 1;
            return;
        }

        _counts[key] = 1;
        _items.Add(diagnostic);
    }

    /// <summary>Adds a finding from its parts.</summary>
    public void Add(string code, Severity severity, string message, SourceSpan? span = null) =>
        Add(new Diagnostic(code, severity, message, span));

    /// <summary>How often a finding of the same code and message was met.</summary>
    public int CountOf(Diagnostic diagnostic)
    {
        ArgumentNullException.ThrowIfNull(diagnostic);
        return _counts.GetValueOrDefault((diagnostic.Code, diagnostic.Message));
    }
}
