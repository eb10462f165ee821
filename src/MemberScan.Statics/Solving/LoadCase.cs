namespace MemberScan.Statics.Solving;

/// <summary>One situation while it is solved, six numbers a node in the axes of the nodes.</summary>
/// <param name="Loads">Loads on the nodes, those of held members included.</param>
/// <param name="High">Displacements, first part; fixed directions hold what is forced upon them.</param>
/// <param name="Low">Displacements, second part, small against the first.</param>
internal sealed record LoadCase(double[] Loads, double[] High, double[] Low)
{
    /// <summary>What is left, <c>f − K·u</c>; at fixed directions the reaction with its sign turned.</summary>
    public double[] Rest { get; } = new double[Loads.Length];

    /// <summary>Largest load at an unknown, forced displacements included.</summary>
    public double LargestLoad { get; set; }

    /// <summary>Largest rest at an unknown.</summary>
    public double LargestRest { get; set; }

    /// <summary>Share of the last correction in the one before: above a tenth digits are lost.</summary>
    public double Contraction { get; set; }
}
