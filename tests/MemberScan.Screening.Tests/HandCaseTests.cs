using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;
using MemberScan.SampleModels.Units;
using MemberScan.SampleModels.Writing;

namespace MemberScan.Screening.Tests;

/// <summary>
/// One case for each kind of section, worked out by plain formulas in the units of the model: mm, N, MPa and in, lbf, psi.
/// </summary>
/// <remarks>
/// σ = N/A + M·c/I at the extreme fibre, τ from torsion alone there (bending shear vanishes at the extreme fibre and none is given elsewhere), √(σ² + 3τ²).
/// Areas and second moments: Gere and Timoshenko, Mechanics of Materials, appendix (from memory). Box in torsion: Wt = It/(t + K/t), EN 10219-2, annex (from memory).
/// </remarks>
public sealed class HandCaseTests
{
    private sealed record Case(CrossSection Section, double Axial, double My, double Mz, double Torsion, double VonMises);

    public static TheoryData<string, string> Kinds
    {
        get
        {
            var kinds = new TheoryData<string, string>();
            foreach (var units in new[] { "mm-N", "in-lbf" })
                foreach (var kind in new[] { "round", "tube", "rectangle", "rounded rectangle", "box" })
                    kinds.Add(kind, units);
            return kinds;
        }
    }

    [Theory]
    [MemberData(nameof(Kinds))]
    public void The_equivalent_stress_is_that_of_the_formulas_of_the_handbook(string kind, string units)
    {
        var isMetric = units == "mm-N";
        var file = isMetric ? ModelUnits.MillimetreNewton : ModelUnits.InchPound;
        var (length, strength) = (isMetric ? 500.0 : 20.0, isMetric ? 250.0 : 36_000.0);
        var hand = isMetric ? Metric(kind, 1e-3) : Inches(kind, 0.0254);
        var writer = new ModelWriter(isMetric ? SchemaVersion.Ifc4 : SchemaVersion.Ifc2X3, file, "landing");
        var metre = file.Length.Factor;
        var bar = writer.Element("IFCMEMBER", "Bar", writer.LocalPlacement(Transform3.Identity), Landing.Shape(writer, hand.Section, length * metre), new ElementOptions { Tag = Landing.Post });
        writer.Associate(writer.Materials.Material("Own steel", yield: strength * file.Pressure.Factor), bar);
        var (force, moment, unit) = isMetric ? ("N", "N·mm", "mm") : ("lbf", "lbf·in", "in");
        var header = $"member,situation,kind,station[{unit}],N[{force}],Vy[{force}],Vz[{force}],T[{moment}],My[{moment}],Mz[{moment}]\n";
        string Row(double x) => string.Create(CultureInfo.InvariantCulture, $"{Landing.Post},D,design,{x},{hand.Axial},0,0,{hand.Torsion},{hand.My},{hand.Mz}\n");

        var member = Landing.ScreenOne(writer.Build(), header + Row(0) + Row(length));

        Assert.Equal(Verdict.WithinLimit, member.Verdict);
        Assert.Equal(1, member.Governing!.Stress / file.Pressure.Factor / hand.VonMises, 1e-6);
        Assert.Equal(hand.VonMises / strength, member.Governing.Utilization, 1e-6);
    }

    private static Case Metric(string kind, double metre) => kind switch
    {
        "round" => Round(metre, d: 20, n: 10e3, my: 100e3, mz: 100e3, t: 50e3),
        "tube" => Tube(metre, d: 48.3, t: 3.2, n: 10e3, my: 400e3, mz: -300e3, torsion: 250e3),
        "rectangle" => Rectangle(metre, b: 40, h: 80, n: 50e3, my: 4e6, mz: 1.5e6),
        "rounded rectangle" => RoundedRectangle(metre, b: 40, h: 60, r: 8, n: 20e3, my: 2e6),
        _ => Box(metre, b: 50, h: 30, t: 3, ro: 6, ri: 3, n: 10e3, my: 400e3, torsion: 300e3),
    };

    private static Case Inches(string kind, double metre) => kind switch
    {
        "round" => Round(metre, d: 0.75, n: 2000, my: 500, mz: 600, t: 400),
        "tube" => Tube(metre, d: 1.9, t: 0.145, n: 1500, my: 6000, mz: 3000, torsion: 2000),
        "rectangle" => Rectangle(metre, b: 0.5, h: 3, n: 5000, my: 10_000, mz: 900),
        "rounded rectangle" => RoundedRectangle(metre, b: 2, h: 3, r: 0.25, n: 8000, my: 60_000),
        _ => Box(metre, b: 2, h: 2, t: 0.116, ro: 0.232, ri: 0.116, n: 3000, my: 9000, torsion: 5000),
    };

    private static Case Round(double metre, double d, double n, double my, double mz, double t)
    {
        var sigma = n / (Math.PI * d * d / 4) + Math.Sqrt(my * my + mz * mz) * 32 / (Math.PI * d * d * d);
        return new Case(new Round(metre * d / 2), n, my, mz, t, Mises(sigma, 16 * t / (Math.PI * d * d * d)));
    }

    private static Case Tube(double metre, double d, double t, double n, double my, double mz, double torsion)
    {
        var inner = d - 2 * t;
        var i = Math.PI * (Math.Pow(d, 4) - Math.Pow(inner, 4)) / 64;
        var sigma = n / (Math.PI * (d * d - inner * inner) / 4) + Math.Sqrt(my * my + mz * mz) * d / 2 / i;
        return new Case(new Tube(metre * d / 2, metre * t), n, my, mz, torsion, Mises(sigma, torsion * d / 2 / (2 * i)));
    }

    private static Case Rectangle(double metre, double b, double h, double n, double my, double mz) =>
        new(new Rectangle(metre * b, metre * h), n, my, mz, 0, n / (b * h) + 6 * my / (b * h * h) + 6 * mz / (h * b * b));

    private static Case RoundedRectangle(double metre, double b, double h, double r, double n, double my)
    {
        var area = b * h - (4 - Math.PI) * r * r;
        return new Case(new RoundedRectangle(metre * b, metre * h, metre * r), n, my, 0, 0, n / area + my * h / 2 / Inertia(b, h, r));
    }

    private static Case Box(double metre, double b, double h, double t, double ro, double ri, double n, double my, double torsion)
    {
        var area = 2 * t * (b + h - 2 * t) - (4 - Math.PI) * (ro * ro - ri * ri);
        var i = Inertia(b, h, ro) - Inertia(b - 2 * t, h - 2 * t, ri);
        var rc = (ro + ri) / 2;
        var perimeter = 2 * (b - t + h - t) - 2 * rc * (4 - Math.PI);
        var enclosed = (b - t) * (h - t) - rc * rc * (4 - Math.PI);
        var k = 2 * enclosed * t / perimeter;
        var wt = (t * t * t * perimeter / 3 + 2 * k * enclosed) / (t + k / t);
        return new Case(new Box(metre * b, metre * h, metre * t, metre * ro, metre * ri), n, my, 0, torsion, Mises(n / area + my * h / 2 / i, torsion / wt));
    }

    // The rectangle less four spandrels: area (1 − π/4)r², centroid (10 − 3π)/(12 − 3π)·r from both sides, own second moment (1/3 − π/16 − 1/(3(12 − 3π)))r⁴.
    private static double Inertia(double b, double h, double r)
    {
        var arm = h / 2 - (10 - 3 * Math.PI) / (12 - 3 * Math.PI) * r;
        var own = (1.0 / 3 - Math.PI / 16 - 1 / (3 * (12 - 3 * Math.PI))) * Math.Pow(r, 4);
        return b * h * h * h / 12 - 4 * (own + (1 - Math.PI / 4) * r * r * arm * arm);
    }

    private static double Mises(double sigma, double tau) => Math.Sqrt(sigma * sigma + 3 * tau * tau);
}
