namespace MemberScan.Model.Presets;

/// <summary>A pipe by size and schedule.</summary>
/// <param name="Name">Nominal size, such as <c>4</c> (NPS, in).</param>
/// <param name="Schedule">Schedule, such as <c>40</c>.</param>
/// <param name="OuterDiameter">Outer diameter [m].</param>
/// <param name="Wall">Nominal wall [m].</param>
/// <param name="Source">Standard and mark, in words.</param>
public sealed record PipeSize(string Name, string Schedule, double OuterDiameter, double Wall, string Source)
{
    /// <summary>Density of the pipe's steel [kg/m³] (EN 1991-1-1, Table A.4: 77 to 78.5 kN/m³; the upper value, from memory).</summary>
    public const double SteelDensity = 7850;

    /// <summary>Weight of the pipe and what fills it, per length [N/m].</summary>
    /// <param name="contentsDensity">Density of what fills it [kg/m³], ≥ 0.</param>
    /// <param name="gravity">Acceleration of gravity [m/s²].</param>
    public double WeightPerLength(double contentsDensity, double gravity)
    {
        var inner = OuterDiameter - 2 * Wall;
        return gravity * Math.PI / 4 * (SteelDensity * (OuterDiameter * OuterDiameter - inner * inner) + contentsDensity * inner * inner);
    }
}
