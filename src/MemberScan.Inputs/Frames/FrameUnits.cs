using MemberScan.Foundation.Units;

namespace MemberScan.Inputs.Frames;

/// <summary>The units of a frame file; all others follow from these two.</summary>
/// <param name="Length">Unit of length.</param>
/// <param name="Force">Unit of force.</param>
public sealed record FrameUnits(Unit Length, Unit Force)
{
    /// <summary>One unit of moment [N·m].</summary>
    public double Moment => Force.Factor * Length.Factor;

    /// <summary>One unit of stress [Pa].</summary>
    public double Stress => Force.Factor / (Length.Factor * Length.Factor);

    /// <summary>One unit of force per length [N/m].</summary>
    public double Spread => Force.Factor / Length.Factor;

    /// <summary>The unit of moments as text.</summary>
    public string MomentSymbol => $"{Force.Symbol}·{Length.Symbol}";
}
