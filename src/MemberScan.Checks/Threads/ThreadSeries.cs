namespace MemberScan.Checks.Threads;

/// <summary>The form of a thread: it decides the formulas of its areas.</summary>
public enum ThreadSeries
{
    /// <summary>ISO metric thread (ISO 68-1, ISO 724).</summary>
    Metric,

    /// <summary>Unified inch thread (ASME B1.1).</summary>
    Unified,
}
