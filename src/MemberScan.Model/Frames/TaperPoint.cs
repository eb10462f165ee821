namespace MemberScan.Model.Frames;

/// <summary>The section of a tapered member at one place.</summary>
/// <param name="Share">Share of the flexible length from its start [-], from 0 to 1.</param>
/// <param name="Section">The section there.</param>
public readonly record struct TaperPoint(double Share, FrameSection Section);
