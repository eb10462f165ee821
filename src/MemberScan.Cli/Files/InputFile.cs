using MemberScan.Part21;
using MemberScan.Part21.Containers;

namespace MemberScan.Cli.Files;

/// <summary>Reading of input files with failures as one sentence.</summary>
internal static class InputFile
{
    /// <summary>Largest forces table or settings file read [byte].</summary>
    public const long MaxBytes = 2_000_000_000;

    /// <summary>The bytes of a file.</summary>
    public static byte[] Read(string path) => Guard(path, () =>
    {
        if (new FileInfo(path) is { Exists: true, Length: > MaxBytes })
            throw new Failure(ExitCodes.InputOutput, $"'{Path.GetFileName(path)}' is larger than {MaxBytes} bytes; split it.");

        return File.ReadAllBytes(path);
    });

    /// <summary>The text of a model, out of its container, with a note about the container.</summary>
    public static (byte[] Bytes, string Note) ReadModel(string path) => Guard(path, () => ModelContainer.Read(path));

    /// <summary>A model's text, held in memory or left on disk where it is large.</summary>
    public static ModelText OpenModel(string path) => Guard(path, () => ModelText.Open(path));

    private static T Guard<T>(string path, Func<T> read)
    {
        try
        {
            return read();
        }
        catch (Exception e) when (e is FileNotFoundException or DirectoryNotFoundException)
        {
            throw new Failure(ExitCodes.InputOutput, $"'{path}' does not exist; check the path.", e);
        }
        catch (UnauthorizedAccessException e)
        {
            throw new Failure(ExitCodes.InputOutput, $"'{path}' may not be read (a folder, or no permission); check the path and its permissions.", e);
        }
        catch (InvalidDataException e)
        {
            throw new Failure(ExitCodes.InputOutput, $"'{path}': {e.Message}", e);
        }
        catch (IOException e)
        {
            throw new Failure(ExitCodes.InputOutput, $"'{path}' cannot be read: {e.Message}", e);
        }
    }
}
