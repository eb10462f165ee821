using MemberScan.Reporting;
using MemberScan.Screening.Record;

namespace MemberScan.Cli.Files;

/// <summary>Reading of run records with failures as one sentence.</summary>
internal static class RunRecordFile
{
    /// <summary>The record of a file.</summary>
    /// <exception cref="Failure">It cannot be read, or is no run record.</exception>
    public static ScreeningRecord Read(string path)
    {
        if (string.IsNullOrWhiteSpace(path)) throw new Failure(ExitCodes.Usage, "The path of a run record is empty; give a name.");

        try
        {
            return RunRecord.Read(InputFile.Read(path));
        }
        catch (InvalidDataException e)
        {
            throw new Failure(ExitCodes.Usage, $"'{path}' cannot be used: {e.Message} Give the .run.json file of this version, or screen the model again.", e);
        }
    }
}
