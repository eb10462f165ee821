using System.Diagnostics;
using System.Text;

namespace MemberScan.Cli.Tests;

/// <summary>Runs the built program as a process of its own.</summary>
internal static class Memberscan
{
    private static readonly string s_program = Path.Combine(AppContext.BaseDirectory, "memberscan.dll");

    /// <summary>How a run ended.</summary>
    public sealed record Ran(int ExitCode, string Output, string Error)
    {
        /// <summary>Both texts, for messages of failed assertions.</summary>
        public string All => $"exit code {ExitCode}\n{Output}\n{Error}";
    }

    /// <summary>The folder that holds the solution.</summary>
    public static string Root { get; } = Upwards();

    /// <summary>A file of the sample models.</summary>
    public static string Sample(string fileName) => Path.Combine(Root, "sample-models", fileName);

    /// <summary>Runs the program to its end.</summary>
    public static Task<Ran> Run(params string[] arguments) => Run(Start(arguments));

    /// <summary>Runs a prepared process to its end.</summary>
    public static async Task<Ran> Run(ProcessStartInfo start)
    {
        using var process = Process.Start(start)!;
        var error = process.StandardError.ReadToEndAsync(TestContext.Current.CancellationToken);
        var output = await process.StandardOutput.ReadToEndAsync(TestContext.Current.CancellationToken);
        await process.WaitForExitAsync(TestContext.Current.CancellationToken);
        return new Ran(process.ExitCode, output, await error);
    }

    /// <summary>What starts the program, maybe by way of another one.</summary>
    public static ProcessStartInfo Start(IEnumerable<string> arguments, params string[] wrapper)
    {
        string[] all = [.. wrapper, "dotnet", "exec", s_program, .. arguments];
        var start = new ProcessStartInfo(all[0])
        {
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            StandardOutputEncoding = Encoding.UTF8,
            StandardErrorEncoding = Encoding.UTF8,
            WorkingDirectory = Root,
        };
        foreach (var argument in all[1..]) start.ArgumentList.Add(argument);
        start.Environment["DOTNET_NOLOGO"] = "1";
        return start;
    }

    private static string Upwards()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
            if (File.Exists(Path.Combine(folder.FullName, "MemberScan.sln"))) return folder.FullName;
        throw new DirectoryNotFoundException("The tests run outside the repository.");
    }
}
