namespace MemberScan.Inputs.Values;

/// <summary>Why a text is not a usable number.</summary>
internal enum NumberFault
{
    None,
    Empty,
    NotANumber,
    NotFinite,
    DecimalComma,
}
