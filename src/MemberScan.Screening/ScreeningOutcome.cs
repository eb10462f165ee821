using System.Buffers;
using MemberScan.Ifc;
using MemberScan.Ifc.WriteBack;
using MemberScan.Screening.Record;
using MemberScan.Screening.Sheets;

namespace MemberScan.Screening;

/// <summary>A finished screening: its record, and what is needed to write the checked model.</summary>
public sealed class ScreeningOutcome
{
    /// <summary>Highest instance number above which there is no sure room for ours.</summary>
    internal const ulong MaxInstanceId = long.MaxValue;

    private readonly IfcModel? _model;
    private readonly long _creationDate;

    /// <summary>Whether the checked model explains the set by a template; IFC2X3 knows none.</summary>
    public bool WithSetTemplate { get; init; }

    internal ScreeningOutcome(ScreeningRecord record, IfcModel? model, long creationDate) =>
        (Record, _model, _creationDate) = (record, model, creationDate);

    /// <summary>The record.</summary>
    public ScreeningRecord Record { get; }

    /// <summary>Makes what member sheets draw, on demand.</summary>
    public required SheetMaker Sheets { get; init; }

    /// <summary>Whether a checked model can be written: the text was read to its end, has a data section, and its numbers leave room for ours.</summary>
    public bool CanWriteModel => _model is { File: { ReadToEnd: true, InsertionOffset: >= 0, HighestId: <= MaxInstanceId } };

    /// <summary>Writes the checked model: the base model's bytes with one property set per element of a candidate appended.</summary>
    /// <exception cref="InvalidOperationException"><see cref="CanWriteModel"/> is false.</exception>
    public void WriteModel(IBufferWriter<byte> output)
    {
        if (!CanWriteModel) throw new InvalidOperationException("the model was not read to its end; no checked model is written");

        var file = _model!.File;
        var lines = PropertySetWriter.Lines(_model, StressCheckSets.From(Record), _creationDate, Record.Version, WithSetTemplate);
        ResultBlock.Write(output, file.Bytes.Span, file.InsertionOffset, lines, file.LineEnd);
    }
}
