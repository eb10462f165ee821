using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.ForcesTables;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Part21.Containers;

namespace MemberScan.Cli.Files;

/// <summary>The files that a run on a model works from, read whole but for a large model.</summary>
/// <param name="Model">Text of the model; a large one stays on disk and open.</param>
/// <param name="Settings">The settings in force.</param>
/// <param name="Tables">The forces tables, in the order given.</param>
internal sealed record RunInputs(ModelText Model, Settings Settings, ImmutableArray<ForcesTable> Tables) : IDisposable
{
    /// <inheritdoc />
    public void Dispose() => Model.Dispose();

    /// <summary>Reads all files before any is looked into: one that cannot be read weighs more than one that is wrong.</summary>
    /// <param name="model">Path of the model.</param>
    /// <param name="forces">Paths of forces tables.</param>
    /// <param name="settings">Path of a settings file; null for none.</param>
    /// <param name="diagnostics">Takes what is wrong with settings and tables.</param>
    /// <param name="tellFindings">Shows the findings so far; called before the run ends for them.</param>
    /// <exception cref="Failure">A file cannot be read, or settings or a table are wrong.</exception>
    public static RunInputs Read(string model, IReadOnlyList<string> forces, string? settings, DiagnosticList diagnostics, Action<DiagnosticList> tellFindings)
    {
        if (forces.Append(model).Append(settings ?? "-").Any(string.IsNullOrWhiteSpace))
            throw new Failure(ExitCodes.Usage, "A path is empty; give the model, and what follows --forces and --settings, a name.");

        var text = InputFile.OpenModel(model);
        var settingsText = settings is null ? null : InputFile.Read(settings);
        var tableTexts = forces.Select(path => (Name: Path.GetFileName(path), Text: InputFile.Read(path))).ToList();

        var inForce = settingsText is null ? Settings.Default : SettingsFile.Read(settingsText, Path.GetFileName(settings)!, diagnostics);
        if (inForce is null) throw Wrong("The settings file is wrong; nothing was read further.");

        var tables = tableTexts.Select(table => ForcesTable.Read(table.Text, table.Name, diagnostics)).ToList();
        if (tables.Contains(null)) throw Wrong("A forces table is wrong; nothing was written.");

        return new RunInputs(text, inForce, [.. tables.OfType<ForcesTable>()]);

        Failure Wrong(string message)
        {
            tellFindings(diagnostics);
            return new Failure(ExitCodes.Usage, message);
        }
    }
}
