using System.CommandLine;
using System.Reflection;
using System.Text;
using MemberScan.Cli.Comparing;
using MemberScan.Cli.Frames;
using MemberScan.Cli.Manual;
using MemberScan.Cli.Members;
using MemberScan.Cli.Queue;
using MemberScan.Cli.Restoring;
using MemberScan.Cli.Screening;
using MemberScan.Cli.Sections;
using MemberScan.Cli.SettingsFiles;
using MemberScan.Cli.Sheets;

namespace MemberScan.Cli;

/// <summary>Arguments in, exit code out.</summary>
internal static class Program
{
    /// <summary>Version of the program.</summary>
    public static string Version { get; } = typeof(Program).Assembly.GetCustomAttribute<AssemblyInformationalVersionAttribute>()!.InformationalVersion;

    /// <summary>The only clock that is read.</summary>
    public static TimeProvider Clock => TimeProvider.System;

    /// <summary>How long an interrupted run may take to its next stopping place, so that no half-written files stay.</summary>
    private static readonly TimeSpan s_timeToStop = TimeSpan.FromSeconds(10);

    /// <summary>The commands.</summary>
    public static RootCommand Root()
    {
        var root = new RootCommand("Screens the secondary steel of building models for combined stress. A screening aid for qualified engineers; not a design, not a certificate.")
        {
            ScreenCommand.Build(), MembersCommand.Build(), SectionCommand.Build(), FrameCommand.Build(), CompareCommand.Build(), RestoreCommand.Build(), SheetCommand.Build(), SettingsCommand.Build(), EnqueueCommand.Build(), WorkCommand.Build(),
        };
        root.Subcommands.Add(ManualCommand.Build(root));
        return root;
    }

    private static async Task<int> Main(string[] args)
    {
        Console.OutputEncoding = new UTF8Encoding(encoderShouldEmitUTF8Identifier: false);
        var root = Root();
        var parsed = root.Parse(args);
        if (parsed.Errors.Count > 0 && parsed.Action is not (System.CommandLine.Help.HelpAction or null) && !args.Contains("--help"))
        {
            foreach (var error in parsed.Errors) await Console.Error.WriteLineAsync(error.Message);
            await Console.Error.WriteLineAsync("Use --help for the commands and options.");
            return ExitCodes.Usage;
        }

        try
        {
            return await parsed.InvokeAsync(new InvocationConfiguration { EnableDefaultExceptionHandler = false, ProcessTerminationTimeout = s_timeToStop });
        }
        catch (Failure failure)
        {
            await Console.Error.WriteLineAsync(failure.Message);
            return failure.ExitCode;
        }
        catch (OperationCanceledException)
        {
            await Console.Error.WriteLineAsync("Interrupted; nothing was written.");
            return ExitCodes.Interrupted;
        }
        catch (IOException e)
        {
            await Console.Error.WriteLineAsync($"Reading or writing failed: {e.Message}");
            return ExitCodes.InputOutput;
        }
#pragma warning disable CA1031 // the last door: whatever else went wrong ends in one sentence and code 70
        catch (Exception e)
        {
            await Console.Error.WriteLineAsync($"Internal error: {e.GetType().Name}: {e.Message} Please report it with the model and the command.");
            return ExitCodes.Internal;
        }
#pragma warning restore CA1031
    }
}
