namespace MemberScan.Model.Frames.Loads;

/// <summary>One part of a combination.</summary>
/// <param name="Situation">Number of the situation in <see cref="Frame.Situations"/>, from 0.</param>
/// <param name="Factor">What its loads are multiplied by [-].</param>
public readonly record struct SituationTerm(int Situation, double Factor);
