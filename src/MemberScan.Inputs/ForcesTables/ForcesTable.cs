using System.Collections.Immutable;
using System.Runtime.InteropServices;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.ForcesTables.Rows;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.ForcesTables;

/// <summary>A table of section forces beside the model: CSV, UTF-8, units in the header.</summary>
/// <remarks>
/// Header <c>member,situation,kind,station[m],N[kN],Vy[kN],Vz[kN],T[kNm],My[kNm],Mz[kNm]</c>, columns in any order, <c>station[%]</c> for a
/// share of the length; <c>kind</c> may be left out. Lines that begin with <c>#</c> are remarks, save the directives
/// <c># convention: positive-face | end-forces</c>, <c># torsion: centroid | shear-centre</c>, <c># situations: load-cases | envelopes</c>, <c># results: linear</c>. Semicolons or tabs may part the columns instead of commas; decimal commas are refused.
/// </remarks>
public sealed record ForcesTable
{
    /// <summary>Name of the file, without its folder.</summary>
    public required string FileName { get; init; }

    /// <summary>SHA-256 of the bytes, hexadecimal, lower case.</summary>
    public required string Sha256 { get; init; }

    /// <summary>What the values act on; null when the table does not say.</summary>
    public required ForceConvention? Convention { get; init; }

    /// <summary>The line about which T is taken.</summary>
    public required TorsionReference Torsion { get; init; }

    /// <summary>Whether each situation acts in full; false when the table says that its rows are single load cases.</summary>
    public required bool ActsInFull { get; init; }

    /// <summary>Whether each situation is an envelope: the rows at one station hold least and largest values, a single one a magnitude.</summary>
    public required bool IsEnvelope { get; init; }

    /// <summary>Whether the table says that its load cases are linear results, which may be superposed.</summary>
    public required bool IsLinear { get; init; }

    /// <summary>The rows, in the order of the file; at least one, none where they went elsewhere as they were read.</summary>
    public required ImmutableArray<ForcesRow> Rows { get; init; }

    /// <summary>Reads a table.</summary>
    /// <param name="bytes">The bytes of the file.</param>
    /// <param name="fileName">Name of the file, without its folder, for messages.</param>
    /// <param name="diagnostics">Takes the findings (INP-0001 to INP-0024), each with line and column; at most 50 errors.</param>
    /// <returns>The table, or null when anything in it is wrong: a table is used whole or not at all.</returns>
    public static ForcesTable? Read(ReadOnlyMemory<byte> bytes, string fileName, DiagnosticList diagnostics) =>
        Read(bytes, fileName, diagnostics, TableLimits.Default);

    /// <summary>Reads a table row by row; memory does not grow with the number of rows.</summary>
    /// <param name="stream">The bytes of the file, read forward only; a table of text, no workbook.</param>
    /// <param name="fileName">Name of the file, without its folder, for messages.</param>
    /// <param name="diagnostics">Takes the findings, as for a table that is read whole.</param>
    /// <param name="sink">Takes each row as it is read. Of no meaning when null is returned.</param>
    /// <returns>The table without its rows, or null when anything in it is wrong: a table is used whole or not at all.</returns>
    public static ForcesTable? Stream(Stream stream, string fileName, DiagnosticList diagnostics, ForcesRowSink sink)
    {
        ArgumentNullException.ThrowIfNull(stream);
        ArgumentNullException.ThrowIfNull(fileName);
        ArgumentNullException.ThrowIfNull(diagnostics);
        ArgumentNullException.ThrowIfNull(sink);
        return Stream(stream, fileName, diagnostics, TableLimits.Default, sink);
    }

    internal static ForcesTable? Read(ReadOnlyMemory<byte> bytes, string fileName, DiagnosticList diagnostics, TableLimits limits)
    {
        ArgumentNullException.ThrowIfNull(fileName);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var stream = MemoryMarshal.TryGetArray(bytes, out var array) ? new MemoryStream(array.Array!, array.Offset, array.Count, writable: false) : new MemoryStream(bytes.ToArray(), writable: false);
        var rows = ImmutableArray.CreateBuilder<ForcesRow>();
        return Stream(stream, fileName, diagnostics, limits, (in ForcesRow row) => rows.Add(row)) is { } table ? table with { Rows = rows.DrainToImmutable() } : null;
    }

    private static ForcesTable? Stream(Stream stream, string fileName, DiagnosticList diagnostics, TableLimits limits, ForcesRowSink sink)
    {
        using var window = new RowWindow(stream, TableReader.Reach(limits));
        var findings = new TableFindings(fileName, diagnostics, limits.Errors);
        var reader = new TableReader(window, limits, findings);
        _ = reader.Read(sink);
        if (findings.Count > 0) return null;

        return new ForcesTable
        {
            FileName = fileName,
            Sha256 = window.Sha256(),
            Convention = reader.Directives.Convention,
            Torsion = reader.Directives.Torsion,
            ActsInFull = reader.Directives.ActsInFull,
            IsEnvelope = reader.Directives.IsEnvelope,
            IsLinear = reader.Directives.IsLinear,
            Rows = [],
        };
    }
}
