namespace MemberScan.Mechanics.Forces;

/// <summary>What is known between two neighbouring stations.</summary>
public enum IntervalKind
{
    /// <summary>Shear is constant and the moments change by it: all six are linear.</summary>
    Linear,

    /// <summary>Moments fit a uniform load: shear is linear, the moments are parabolas.</summary>
    UniformLoadInferred,

    /// <summary>The end values fit neither; a larger value in between is possible.</summary>
    Unknown,
}
