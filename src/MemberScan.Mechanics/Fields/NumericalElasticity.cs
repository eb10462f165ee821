using MemberScan.Mechanics.Meshes;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Shear;
using MemberScan.Mechanics.Warping;

namespace MemberScan.Mechanics.Fields;

/// <summary>Saint-Venant flexure and torsion from the numerical field of a section, for one ν.</summary>
internal sealed class NumericalElasticity : ShearSolution
{
    private const double Hair = 1e-6;
    private readonly WarpingSolution _solution;
    private readonly double[][] _twist;
    private readonly double[][] _slopeY;
    private readonly double[][] _slopeZ;
    private readonly double _kappa;
    private readonly double _perT;
    private readonly (double Vy, double Vz) _a;
    private readonly (double Vy, double Vz) _b;

    /// <summary>The solution for Poisson's ratio ν [-].</summary>
    public NumericalElasticity(WarpingSolution solution, SectionProperties properties, double poisson)
    {
        _solution = solution;
        _kappa = poisson / (1 + poisson);
        _perT = 1 / solution.J;
        var determinant = properties.Iy * properties.Iz - properties.Iyz * properties.Iyz;
        _a = (properties.Iy / determinant, -properties.Iyz / determinant);         // dσ/dx = a·y + b·z
        _b = (-properties.Iyz / determinant, properties.Iz / determinant);
        var patches = Enumerable.Range(0, solution.Potential.Mesh.Patches.Count);
        _twist = [.. patches.Select(e => solution.Potential.Coefficients(e, 0).ToArray())];
        _slopeY = [.. patches.Select(e => Combined(e, 1, 3))];
        _slopeZ = [.. patches.Select(e => Combined(e, 2, 4))];
    }

    /// <inheritdoc/>
    public override bool HasPeaks => true;

    /// <inheritdoc/>
    public override FieldError? NumericalError => new(_solution.TorsionError, _solution.StressError);

    /// <inheritdoc/>
    public override ShearStress At(double vy, double vz, double t, double y, double z)
    {
        if (vy == 0 && vz == 0 && t == 0) return default;

        if ((y == 0 || z == 0) && _solution.Potential.Mesh.IsQuarter)
        {
            var unit = UnitsAt(y, z);
            return new ShearStress(
                vy * unit.Vy.XY + vz * unit.Vz.XY + t * unit.T.XY, vy * unit.Vy.XZ + vz * unit.Vz.XZ + t * unit.T.XZ);
        }

        var at = Locate(y, z);
        // Mirrored into the first quadrant, forces and point together.
        var stress = At(at, at.SignY * vy, at.SignZ * vz, at.SignY * at.SignZ * t);
        return new ShearStress(at.SignY * stress.XY, at.SignZ * stress.XZ);
    }

    /// <inheritdoc/>
    public override (ShearStress Vy, ShearStress Vz, ShearStress T) UnitsAt(double y, double z)
    {
        var at = Locate(y, z);
        var (vy, vz, t) = (At(at, at.SignY, 0, 0), At(at, 0, at.SignZ, 0), At(at, 0, 0, at.SignY * at.SignZ));
        // On an axis of symmetry what is odd across it vanishes; the field of one quadrant has it zero but for its own error.
        var (onY, onZ) = _solution.Potential.Mesh.IsQuarter ? (z == 0 ? 0 : 1, y == 0 ? 0 : 1) : (1, 1);
        return (
            new ShearStress(at.SignY * vy.XY, onY * onZ * at.SignZ * vy.XZ),
            new ShearStress(onY * onZ * at.SignY * vz.XY, at.SignZ * vz.XZ),
            new ShearStress(onY * at.SignY * t.XY, onZ * at.SignZ * t.XZ));
    }

    private Place Locate(double y, double z)
    {
        var (signY, signZ) = (1.0, 1.0);
        if (_solution.Potential.Mesh.IsQuarter) (signY, signZ, y, z) = (y < 0 ? -1 : 1, z < 0 ? -1 : 1, Math.Abs(y), Math.Abs(z));
        var patch = _solution.Locator.Find(y, z, out var xi, out var eta);
        var local = _solution.Potential.Mesh.Patches[patch].Map(xi, eta);
        var lengths = Math.Sqrt(double.Hypot(local.YXi, local.ZXi) * double.Hypot(local.YEta, local.ZEta));
        if (lengths <= Hair * _solution.Potential.Mesh.Scale && (Math.Abs(xi) > 1 - Hair || Math.Abs(eta) > 1 - Hair))
        {
            // On a side that is a point, where the derivatives have no meaning: a hair off it.
            (xi, eta) = (xi * (1 - Hair), eta * (1 - Hair));
            local = _solution.Potential.Mesh.Patches[patch].Map(xi, eta);
        }

        return new Place(patch, xi, eta, local, signY, signZ);
    }

    private ShearStress At(in Place at, double vy, double vz, double t)
    {
        var (a, b) = (_a.Vy * vy + _a.Vz * vz, _b.Vy * vy + _b.Vz * vz);
        var twist = t * _perT;
        var (w, sy, sz) = (_twist[at.Patch], _slopeY[at.Patch], _slopeZ[at.Patch]);
        Span<double> sum = stackalloc double[w.Length];
        for (var i = 0; i < sum.Length; i++) sum[i] = twist * w[i] + a * sy[i] + b * sz[i];
        var (gy, gz) = WarpingPotential.Gradient(at.Local, sum, at.Xi, at.Eta);
        var (y, z) = (at.Local.Y, at.Local.Z);
        return new ShearStress(
            gy + 0.5 * _kappa * a * z * z - twist * z,
            gz + 0.5 * _kappa * b * y * y + twist * y);
    }

    private double[] Combined(int patch, int plain, int poisson)
    {
        var first = _solution.Potential.Coefficients(patch, plain);
        var second = _solution.Potential.Coefficients(patch, poisson);
        var sum = new double[first.Length];
        for (var i = 0; i < sum.Length; i++) sum[i] = first[i] + _kappa * second[i];
        return sum;
    }

    private readonly record struct Place(int Patch, double Xi, double Eta, PatchPoint Local, double SignY, double SignZ);
}
