namespace MemberScan.Statics;

/// <summary>What is known of the arithmetic behind a solution, common to all situations.</summary>
/// <param name="Unknowns">Number of unknown displacements.</param>
/// <param name="FactorEntries">Numbers kept in the factor.</param>
/// <param name="FactorOperations">Floating-point operations of the factorisation.</param>
/// <param name="SmallestPivot">Smallest pivot of the stiffness matrix scaled to a diagonal of ones [-]; near 1e-16 where the frame is a mechanism.</param>
/// <param name="Condition">Estimated condition number of the stiffness matrix scaled to a diagonal of ones, 1-norm [-]: the digits that may be lost.</param>
/// <param name="Reciprocity">
/// Largest difference of the works that two situations do on each other's displacements, against the product of their own [-]; null
/// where there is one situation.
/// </param>
public sealed record SolveQuality(
    int Unknowns, long FactorEntries, double FactorOperations, double SmallestPivot, double Condition, double? Reciprocity);
