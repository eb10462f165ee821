using System.Buffers;
using System.Collections.Immutable;
using MemberScan.Ifc;
using MemberScan.Ifc.WriteBack;
using MemberScan.Screening.Record;

namespace MemberScan.Screening;

/// <summary>A finished screening: its record, and what is needed to write the checked model.</summary>
public sealed class ScreeningOutcome
{
    private readonly IfcModel? _model;
    private readonly BaseText _text;
    private readonly long _creationDate;

    /// <summary>Whether the checked model explains the set by a template; IFC2X3 knows none.</summary>
    public bool WithSetTemplate { get; init; }

    internal ScreeningOutcome(ScreeningRecord record, IfcModel? model, BaseText text, long creationDate) =>
        (Record, _model, _text, _creationDate) = (record, model, text, creationDate);

    /// <summary>The record.</summary>
    public ScreeningRecord Record { get; }

    /// <summary>Whether a checked model can be written: the text was read to its end, has a data section, and its numbers leave room for ours.</summary>
    public bool CanWriteModel => _model is { File: { ReadToEnd: true, InsertionOffset: >= 0 } file } && file.HighestId <= file.HighestPossibleId;

    /// <summary>Writes the checked model: the base model's bytes with one property set per element of a candidate appended.</summary>
    /// <exception cref="InvalidOperationException"><see cref="CanWriteModel"/> is false.</exception>
    public void WriteModel(FileStream output) => ResultBlock.Write(output, _text.Text, _text.Sha256, _text.File.InsertionOffset, Lines(), _text.File.LineEnd);

    /// <summary>The checked model in memory, for a model whose text is held there.</summary>
    /// <exception cref="InvalidOperationException"><see cref="CanWriteModel"/> is false, or the text of the model stays on disk.</exception>
    public void WriteModel(IBufferWriter<byte> output) => ResultBlock.Write(output, _text.Text.Held.Span, _text.File.InsertionOffset, Lines(), _text.File.LineEnd);

    private ImmutableArray<string> Lines() => CanWriteModel
        ? PropertySetWriter.Lines(_model!, StressCheckSets.From(Record), _creationDate, Record.Version, WithSetTemplate)
        : throw new InvalidOperationException("the model was not read to its end; no checked model is written");
}
