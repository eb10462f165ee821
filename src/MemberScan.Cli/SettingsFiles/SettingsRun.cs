using System.Globalization;
using MemberScan.Cli.Files;
using MemberScan.Cli.Screening;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs;
using MemberScan.Inputs.SettingsFiles;

namespace MemberScan.Cli.SettingsFiles;

/// <summary>One run of the settings command.</summary>
internal static class SettingsRun
{
    /// <summary>Runs and returns the exit code.</summary>
    public static int Execute(bool explain, string? settings, string? folder)
    {
        if (!explain && folder is null) throw new Failure(ExitCodes.Usage, "Say what to do with the settings: --explain prints them, --write FOLDER writes the shipped files.");
        if (!explain && settings is not null) throw new Failure(ExitCodes.Usage, "--settings goes with --explain; give both.");
        if (new[] { settings ?? "-", folder ?? "-" }.Any(string.IsNullOrWhiteSpace)) throw new Failure(ExitCodes.Usage, "A path is empty; give what follows --settings and --write a name.");

        if (explain) Explain(settings);
        if (folder is not null) Write(folder);
        return ExitCodes.WithinLimit;
    }

    private static void Explain(string? path)
    {
        var name = path is null ? "" : Path.GetFileName(path);
        var settings = path is null ? Settings.Default : Read(path, name);
        var lines = settings.Effective.Select(s => (s.Key, s.Value, Source: settings.SourceOf(s, name))).ToList();
        var (keys, values) = (lines.Max(l => l.Key.Length), Math.Min(60, lines.Max(l => l.Value.Length)));
        foreach (var (key, value, source) in lines)
            Console.Out.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{key.PadRight(keys)}  {value.PadRight(values)}  {source}"));
    }

    private static Settings Read(string path, string name)
    {
        using var log = new FindingLog(verbose: false);
        var diagnostics = new DiagnosticList();
        if (SettingsFile.Read(InputFile.Read(path), name, diagnostics) is { } settings) return settings;

        log.Write(diagnostics);
        throw new Failure(ExitCodes.Usage, "The settings file is wrong; nothing is explained.");
    }

    private static void Write(string folder)
    {
        try
        {
            foreach (var name in (string[])[ShippedFiles.DefaultSettings, ShippedFiles.SettingsSchema, .. ShippedFiles.Bases])
            {
                var target = Path.Combine(folder, name.Replace('/', Path.DirectorySeparatorChar));
                if (File.Exists(target))
                {
                    Console.Out.WriteLine($"is there already, left as it is: {target}");
                    continue;
                }

                Directory.CreateDirectory(Path.GetDirectoryName(Path.GetFullPath(target))!);
                using var files = new OutputSet();
                files.Add(target, ShippedFiles.Read(name).Span);
                files.Commit();
                Console.Out.WriteLine($"wrote {target}");
            }
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            throw new Failure(ExitCodes.InputOutput, $"The files cannot be written to '{folder}': {e.Message} Give another folder.", e);
        }
    }
}
