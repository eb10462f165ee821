using System.Collections.Immutable;
using System.Security.Cryptography;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Model.Forces;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.ForcesTables;

/// <summary>A table of section forces beside the model: CSV, UTF-8, units in the header.</summary>
/// <remarks>
/// Header <c>member,situation,kind,station[m],N[kN],Vy[kN],Vz[kN],T[kNm],My[kNm],Mz[kNm]</c>, columns in any order, <c>station[%]</c> for a
/// share of the length; <c>kind</c> may be left out. Lines that begin with <c>#</c> are remarks, save the directives
/// <c># convention: positive-face | end-forces</c>, <c># torsion: centroid | shear-centre</c>, <c># situations: load-cases</c>.
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

    /// <summary>The rows, in the order of the file; at least one.</summary>
    public required ImmutableArray<ForcesRow> Rows { get; init; }

    /// <summary>Reads a table.</summary>
    /// <param name="bytes">The bytes of the file.</param>
    /// <param name="fileName">Name of the file, without its folder, for messages.</param>
    /// <param name="diagnostics">Takes the findings (INP-0001 to INP-0024), each with line and column; at most 50 errors.</param>
    /// <returns>The table, or null when anything in it is wrong: a table is used whole or not at all.</returns>
    public static ForcesTable? Read(ReadOnlyMemory<byte> bytes, string fileName, DiagnosticList diagnostics) =>
        Read(bytes, fileName, diagnostics, TableLimits.Default);

    internal static ForcesTable? Read(ReadOnlyMemory<byte> bytes, string fileName, DiagnosticList diagnostics, TableLimits limits)
    {
        ArgumentNullException.ThrowIfNull(fileName);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var findings = new TableFindings(bytes, fileName, diagnostics, limits.Errors);
        var directives = new TableDirectives(findings);
        var rows = new TableReader(bytes.Span, limits, findings, directives).Read();
        if (findings.Count > 0) return null;

        return new ForcesTable
        {
            FileName = fileName,
            Sha256 = Convert.ToHexStringLower(SHA256.HashData(bytes.Span)),
            Convention = directives.Convention,
            Torsion = directives.Torsion,
            ActsInFull = directives.ActsInFull,
            Rows = rows,
        };
    }
}
