namespace MemberScan.Mechanics.States;

/// <summary>One of Mohr's circles: normal stress to the right, magnitude of the shear stress up, for all faces that hold the third direction.</summary>
/// <param name="Name">The two principal stresses that it runs through: "σ1–σ3", "σ1–σ2" or "σ2–σ3".</param>
/// <param name="Centre">Normal stress at its centre [Pa]; the shear stress there is 0.</param>
/// <param name="Radius">Its radius [Pa], ≥ 0.</param>
public readonly record struct MohrCircle(string Name, double Centre, double Radius);
