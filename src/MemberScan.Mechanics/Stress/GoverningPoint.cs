namespace MemberScan.Mechanics.Stress;

/// <summary>The place of the section where a measure is largest, and the stresses there.</summary>
/// <param name="Measure">What was sought.</param>
/// <param name="Value">Its value [Pa]; the measure recomputed from <paramref name="State"/>.</param>
/// <param name="Y">Distance from the centroid along y [m].</param>
/// <param name="Z">Distance from the centroid along z [m].</param>
/// <param name="State">The stresses at that place.</param>
/// <param name="Place">The place in words, such as "extreme fibre, +z" or "middle of the long side, +y".</param>
public readonly record struct GoverningPoint(
    StressMeasure Measure, double Value, double Y, double Z, StressState State, string Place);
