using MemberScan.Mechanics.Meshes;

namespace MemberScan.Mechanics.Warping;

/// <summary>Potentials of the five loads on a mesh, as polynomials of each patch.</summary>
internal sealed class WarpingPotential
{
    private readonly double[][] _coefficients;

    /// <summary>The potentials from their values at all nodes: patch × load × (i·n + j).</summary>
    public WarpingPotential(PatchMesh mesh, SpectralRule rule, double[][] values)
    {
        (Mesh, Rule) = (mesh, rule);
        _coefficients = [.. values.Select(ToModal)];
    }

    /// <summary>The mesh.</summary>
    public PatchMesh Mesh { get; }

    /// <summary>The polynomials.</summary>
    public SpectralRule Rule { get; }

    /// <summary>Legendre coefficients of a load on a patch: k·n + l.</summary>
    public ReadOnlySpan<double> Coefficients(int patch, int load)
    {
        var all = Rule.Count * Rule.Count;
        return _coefficients[patch].AsSpan(load * all, all);
    }

    /// <summary>Polar moment less the energy of warping, <c>J = ∫(y² + z²) dA + ∫(y·∂w/∂z − z·∂w/∂y) dA</c>, and the area [m⁴, m²].</summary>
    /// <remarks>The potential is a minimum over all functions that the patches allow: the value never lies below the true J.</remarks>
    public (double J, double Area) Torsion()
    {
        var (j, area) = (0.0, 0.0);
        for (var e = 0; e < Mesh.Patches.Count; e++)
        {
            for (var a = 0; a < Rule.QuadratureCount; a++)
            {
                for (var b = 0; b < Rule.QuadratureCount; b++)
                {
                    var at = Mesh.Patches[e].Map(Rule.QuadratureAt[a], Rule.QuadratureAt[b]);
                    var weight = Rule.QuadratureWeights[a] * Rule.QuadratureWeights[b] * Math.Abs(at.Determinant);
                    var (wy, wz) = Gradient(at, Coefficients(e, 0), Rule.QuadratureAt[a], Rule.QuadratureAt[b]);
                    area += weight;
                    j += weight * (at.Y * (at.Y + wz) + at.Z * (at.Z - wy));
                }
            }
        }

        var copies = Mesh.IsQuarter ? 4 : 1;
        return (copies * j, copies * area);
    }

    /// <summary>Polar second moment <c>∫(y² + z²) dA</c> of a whole section [m⁴].</summary>
    public double PolarMoment()
    {
        var sum = 0.0;
        foreach (var patch in Mesh.Patches)
        {
            for (var a = 0; a < Rule.QuadratureCount; a++)
            {
                for (var b = 0; b < Rule.QuadratureCount; b++)
                {
                    var at = patch.Map(Rule.QuadratureAt[a], Rule.QuadratureAt[b]);
                    sum += Rule.QuadratureWeights[a] * Rule.QuadratureWeights[b] * Math.Abs(at.Determinant) * (at.Y * at.Y + at.Z * at.Z);
                }
            }
        }

        return (Mesh.IsQuarter ? 4 : 1) * sum;
    }

    /// <summary>Moments about the centroid of the shear stresses of the loads 1 to 4, of a whole section [per unit of the load].</summary>
    public double[] FlexureMoments()
    {
        var moments = new double[PatchStiffness.Loads - 1];
        if (Mesh.IsQuarter) return moments;                                        // two axes of symmetry: none

        for (var e = 0; e < Mesh.Patches.Count; e++)
        {
            for (var a = 0; a < Rule.QuadratureCount; a++)
            {
                for (var b = 0; b < Rule.QuadratureCount; b++)
                {
                    var at = Mesh.Patches[e].Map(Rule.QuadratureAt[a], Rule.QuadratureAt[b]);
                    var weight = Rule.QuadratureWeights[a] * Rule.QuadratureWeights[b] * Math.Abs(at.Determinant);
                    for (var load = 1; load < PatchStiffness.Loads; load++)
                    {
                        var (gy, gz) = Gradient(at, Coefficients(e, load), Rule.QuadratureAt[a], Rule.QuadratureAt[b]);
                        if (load == 3) gy += 0.5 * at.Z * at.Z;
                        if (load == 4) gz += 0.5 * at.Y * at.Y;
                        moments[load - 1] += weight * (at.Y * gz - at.Z * gy);
                    }
                }
            }
        }

        return moments;
    }

    /// <summary>Gradient of a combination of potentials at a point of a patch.</summary>
    public static (double Y, double Z) Gradient(in PatchPoint at, ReadOnlySpan<double> coefficients, double xi, double eta)
    {
        var n = (int)Math.Round(Math.Sqrt(coefficients.Length));
        Span<double> p = stackalloc double[n], dp = stackalloc double[n], r = stackalloc double[n], dr = stackalloc double[n];
        SpectralRule.Legendre(xi, p, dp);
        SpectralRule.Legendre(eta, r, dr);
        var (dXi, dEta) = (0.0, 0.0);
        for (var k = 0; k < n; k++)
        {
            var (value, slope) = (0.0, 0.0);
            for (var l = 0; l < n; l++)
            {
                var c = coefficients[k * n + l];
                value += c * r[l];
                slope += c * dr[l];
            }

            dXi += dp[k] * value;
            dEta += p[k] * slope;
        }

        var determinant = at.Determinant;
        return ((dXi * at.ZEta - dEta * at.ZXi) / determinant, (dEta * at.YXi - dXi * at.YEta) / determinant);
    }

    private double[] ToModal(double[] nodal)
    {
        var n = Rule.Count;
        var modal = new double[nodal.Length];
        var half = new double[n * n];
        for (var load = 0; load < PatchStiffness.Loads; load++)
        {
            var from = load * n * n;
            for (var k = 0; k < n; k++)
                for (var j = 0; j < n; j++)
                {
                    var sum = 0.0;
                    for (var i = 0; i < n; i++) sum += Rule.ToModal[k * n + i] * nodal[from + i * n + j];
                    half[k * n + j] = sum;
                }

            for (var k = 0; k < n; k++)
                for (var l = 0; l < n; l++)
                {
                    var sum = 0.0;
                    for (var j = 0; j < n; j++) sum += half[k * n + j] * Rule.ToModal[l * n + j];
                    modal[from + k * n + l] = sum;
                }
        }

        return modal;
    }
}
