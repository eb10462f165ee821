namespace MemberScan.Cli;

/// <summary>A run that ends with a message and an exit code.</summary>
internal sealed class Failure(int exitCode, string message, Exception? cause = null) : Exception(message, cause)
{
    /// <summary>The code to return.</summary>
    public int ExitCode { get; } = exitCode;
}
