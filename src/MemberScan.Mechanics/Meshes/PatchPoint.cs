namespace MemberScan.Mechanics.Meshes;

/// <summary>A point of a patch and the derivatives of its place by the two coordinates of the square.</summary>
internal readonly record struct PatchPoint(double Y, double Z, double YXi, double ZXi, double YEta, double ZEta)
{
    /// <summary>Area of the image per area of the square; its sign tells the turn.</summary>
    public double Determinant => YXi * ZEta - ZXi * YEta;
}
