using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.Json;
using MemberScan.Model.Frames;

namespace MemberScan.Inputs.Frames;

/// <summary>A space frame out of a JSON file (schema <c>config/frame.schema.json</c>), strict in every key.</summary>
/// <param name="Frame">The frame in SI.</param>
/// <param name="Units">The units of the file.</param>
public sealed record FrameFile(Frame Frame, FrameUnits Units)
{
    /// <summary>Reads a frame file.</summary>
    /// <param name="bytes">The bytes of the file.</param>
    /// <param name="fileName">Name of the file, without its folder, for messages.</param>
    /// <param name="diagnostics">Takes the findings (INP-0101 to INP-0113), each with line and column.</param>
    /// <returns>The frame; null when anything in the file is wrong.</returns>
    public static FrameFile? Read(ReadOnlyMemory<byte> bytes, string fileName, DiagnosticList diagnostics)
    {
        ArgumentNullException.ThrowIfNull(fileName);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var source = new JsonSource(bytes, fileName, diagnostics);
        if (StrictJson.Read(source) is not { } root) return null;

        var file = new FrameReader(new FrameValues(new JsonValues(source))).Read(root);
        return source.ErrorCount == 0 ? file : null;
    }
}
