using MemberScan.SampleModels.Writing;

namespace MemberScan.SampleModels.Units;

/// <summary>The units that a file's numbers are in; dimensions and forces come to the writer in SI.</summary>
/// <param name="Length">Unit of lengths.</param>
/// <param name="Force">Unit of forces.</param>
/// <param name="Pressure">Unit of stresses.</param>
/// <param name="MomentForce">Force in the unit of moments.</param>
/// <param name="MomentArm">Length in the unit of moments.</param>
public sealed record ModelUnits(FileUnit Length, FileUnit Force, FileUnit Pressure, FileUnit MomentForce, FileUnit MomentArm)
{
    /// <summary>Millimetre, newton, megapascal, newton millimetre.</summary>
    public static ModelUnits MillimetreNewton { get; } =
        new(FileUnit.Millimetre, FileUnit.Newton, FileUnit.Megapascal, FileUnit.Newton, FileUnit.Millimetre);

    /// <summary>Millimetre, kilonewton, megapascal, kilonewton metre.</summary>
    public static ModelUnits MillimetreKilonewton { get; } =
        new(FileUnit.Millimetre, FileUnit.Kilonewton, FileUnit.Megapascal, FileUnit.Kilonewton, FileUnit.Metre);

    /// <summary>Metre, newton, pascal, newton metre: coherent SI.</summary>
    public static ModelUnits MetreNewton { get; } =
        new(FileUnit.Metre, FileUnit.Newton, FileUnit.Pascal, FileUnit.Newton, FileUnit.Metre);

    /// <summary>Inch, kip, ksi, kip inch.</summary>
    public static ModelUnits InchKip { get; } = new(FileUnit.Inch, FileUnit.Kip, FileUnit.Ksi, FileUnit.Kip, FileUnit.Inch);

    /// <summary>Inch, pound-force, psi, pound-force inch.</summary>
    public static ModelUnits InchPound { get; } = new(FileUnit.Inch, FileUnit.PoundForce, FileUnit.Psi, FileUnit.PoundForce, FileUnit.Inch);

    /// <summary>Foot, pound-force, psi, pound-force foot.</summary>
    public static ModelUnits FootPound { get; } = new(FileUnit.Foot, FileUnit.PoundForce, FileUnit.Psi, FileUnit.PoundForce, FileUnit.Foot);

    /// <summary>Force of the modulus unit, which is written as force per area.</summary>
    public FileUnit ModulusForce => Pressure.SiName == "PASCAL" && Pressure.ConversionName is null ? FileUnit.Newton : Pressure == FileUnit.Ksi ? FileUnit.Kip : FileUnit.PoundForce;

    /// <summary>Length of the modulus unit, which is written as force per area.</summary>
    public FileUnit ModulusLength => Pressure == FileUnit.Pascal ? FileUnit.Metre : Pressure == FileUnit.Megapascal ? FileUnit.Millimetre : FileUnit.Inch;

    /// <summary>The value of a length [m] in the file, spelled.</summary>
    public string LengthText(double metres) => Spelling.Real(metres / Length.Factor);

    /// <summary>The value of an area [m²] in the file, spelled.</summary>
    public string AreaText(double squareMetres) => Spelling.Real(squareMetres / (Length.Factor * Length.Factor));

    /// <summary>The value of a force [N] in the file, spelled.</summary>
    public string ForceText(double newtons) => Spelling.Real(newtons / Force.Factor);

    /// <summary>The value of a moment [N·m] in the file, spelled.</summary>
    public string MomentText(double newtonMetres) => Spelling.Real(newtonMetres / (MomentForce.Factor * MomentArm.Factor));

    /// <summary>The value of a stress [Pa] in the file, spelled.</summary>
    public string PressureText(double pascals) => Spelling.Real(pascals / Pressure.Factor);

    /// <summary>The value of a modulus of elasticity [Pa] in the file, spelled.</summary>
    public string ModulusText(double pascals) =>
        Spelling.Real(pascals / (ModulusForce.Factor / (ModulusLength.Factor * ModulusLength.Factor)));

    /// <summary>The value of a force per length [N/m] in the file, spelled.</summary>
    public string LineForceText(double newtonsPerMetre) => Spelling.Real(newtonsPerMetre / (Force.Factor / Length.Factor));
}
