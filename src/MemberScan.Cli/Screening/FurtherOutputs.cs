using System.Text;
using MemberScan.Cli.Files;
using MemberScan.Reporting.Columns;
using MemberScan.Reporting.Requests;
using MemberScan.Reporting.Spreadsheets;
using MemberScan.Reporting.Topics;
using MemberScan.Screening.Record;

namespace MemberScan.Cli.Screening;

/// <summary>Outputs of a screening beyond the four that are always written.</summary>
/// <param name="Bcf">Path of a file of topics; null for none.</param>
/// <param name="BcfVersion">Release of that format.</param>
/// <param name="Requests">Paths of information requests, the ending tells the format.</param>
/// <param name="Workbook">Path of a workbook; null for none.</param>
/// <param name="Parquet">Path of a Parquet file; null for none.</param>
internal sealed record FurtherOutputs(string? Bcf, BcfVersion BcfVersion, IReadOnlyList<string> Requests, string? Workbook, string? Parquet)
{
    /// <summary>None.</summary>
    public static FurtherOutputs None { get; } = new(null, BcfVersion.Bcf21, [], null, null);

    private static readonly string[] s_requestEndings = [".csv", ".html", ".ids"];

    /// <summary>All paths.</summary>
    public IReadOnlyList<string> Paths => [.. new[] { Bcf, Workbook, Parquet }.OfType<string>(), .. Requests];

    /// <summary>Refuses a request whose format its ending does not tell.</summary>
    /// <exception cref="Failure">An ending is none of the three.</exception>
    public void RefuseUnknown()
    {
        if (Requests.FirstOrDefault(path => !s_requestEndings.Contains(Path.GetExtension(path), StringComparer.OrdinalIgnoreCase)) is { } unknown)
            throw new Failure(ExitCodes.Usage, $"'{unknown}' is no request file: its name must end in .csv, .html or .ids.");
    }

    /// <summary>Adds them to the files of the run.</summary>
    public void AddTo(OutputSet files, ScreeningRecord record)
    {
        if (Bcf is { } bcf) files.Add(bcf, BcfFile.Write(record, BcfVersion));
        if (Workbook is { } workbook) files.Add(workbook, MembersWorkbook.Write(record));
        if (Parquet is { } parquet) files.Add(parquet, MembersParquet.Write(record));
        foreach (var path in Requests)
            if (Request(path, record) is { } content) files.Add(path, content);
    }

    /// <summary>Paths that are written.</summary>
    public IEnumerable<string> Written(ScreeningRecord record) => Paths.Except(NotWritten(record));

    /// <summary>Requests that say nothing in their format and are not written.</summary>
    public IEnumerable<string> NotWritten(ScreeningRecord record) => Requests.Where(path => Request(path, record) is null);

    private static byte[]? Request(string path, ScreeningRecord record) => Path.GetExtension(path).ToUpperInvariant() switch
    {
        ".CSV" => RequestTable.Write(record),
        ".HTML" => Encoding.UTF8.GetBytes(RequestPage.Render(record)),
        _ => RequestIds.Write(record),
    };
}
