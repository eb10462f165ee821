using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Screening.Sheets;

/// <summary>Some of the governing forces: all together, or one alone.</summary>
/// <param name="Component">The force that acts alone; null for all together.</param>
/// <param name="Forces">The forces that act; their stresses over the section are <see cref="SectionSamples.Over"/>.</param>
/// <param name="AtPoint">Stresses at the governing point.</param>
public sealed record FieldPart(ForceComponent? Component, SectionForces Forces, StressState AtPoint);
