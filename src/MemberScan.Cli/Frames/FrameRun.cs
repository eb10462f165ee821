using MemberScan.Cli.Files;
using MemberScan.Cli.Screening;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.Frames;
using MemberScan.Statics;

namespace MemberScan.Cli.Frames;

/// <summary>One run of the frame command.</summary>
internal static class FrameRun
{
    private const double OverLimit = 1 + 1e-9;

    /// <summary>Runs and returns the exit code.</summary>
    public static int Execute(string path, bool json)
    {
        if (string.IsNullOrWhiteSpace(path)) throw new Failure(ExitCodes.Usage, "The path is empty; give the frame file a name.");

        var bytes = InputFile.Read(path);
        var diagnostics = new DiagnosticList();
        using var log = new FindingLog(verbose: false);
        var file = FrameFile.Read(bytes, Path.GetFileName(path), diagnostics);
        if (file is null) throw Wrong("The frame file is wrong; nothing was worked out.");

        if (FrameSolver.Solve(file.Frame, diagnostics) is not { } result) throw Wrong("The frame was not solved.");

        log.Write(diagnostics);
        var strength = new FrameStrength(file.Frame);
        var document = FrameDocument.Of(file, result, strength, diagnostics);
        if (json) FrameJson.Write(Console.OpenStandardOutput(), document);
        else FramePrint.Write(Console.Out, document);
        return document.Situations.SelectMany(s => s.Members).Any(m => m.Utilization > OverLimit) ? ExitCodes.Overstressed : ExitCodes.WithinLimit;

        Failure Wrong(string message)
        {
            log.Write(diagnostics);
            return new Failure(ExitCodes.Usage, message);
        }
    }
}
