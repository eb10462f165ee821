namespace MemberScan.Inputs.ForcesTables.Rows;

/// <summary>Why a row of CSV cannot be taken apart.</summary>
internal enum CsvFault
{
    None,

    /// <summary>A quoted field has no closing quote before the end of the file.</summary>
    QuoteNotClosed,

    /// <summary>Something other than a comma or the line end follows a closing quote.</summary>
    TextAfterQuote,

    /// <summary>A quote stands inside a field that does not begin with one.</summary>
    QuoteInside,

    /// <summary>A carriage return without a line feed.</summary>
    LoneCarriageReturn,

    /// <summary>A field is longer than the limit; perhaps its closing quote is missing.</summary>
    FieldTooLong,

    /// <summary>A row is longer than the limit.</summary>
    RowTooLong,
}
