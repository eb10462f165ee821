using System.Globalization;

namespace MemberScan.Cli.Frames;

/// <summary>Prints the answers of the frame command as plain text.</summary>
internal static class FramePrint
{
    private const int Width = 13;

    /// <summary>Prints the document.</summary>
    public static void Write(TextWriter output, FrameDocument document)
    {
        var (l, f, m) = (document.Units.Length.Symbol, document.Units.Force.Symbol, document.Units.MomentSymbol);
        output.WriteLine($"Linear elastic, first order. Lengths in {l}, forces in {f}, moments in {m}, turns in rad.");
        foreach (var answer in document.Situations)
        {
            output.WriteLine();
            output.WriteLine($"Situation {answer.Name} (kind: {answer.Kind})");
            Table(output, "displacements of nodes, global axes", ["node", "ux", "uy", "uz", "rx", "ry", "rz"], answer.Displacements);
            Table(output, "reactions of supports on the frame, global axes", ["node", "Fx", "Fy", "Fz", "Mx", "My", "Mz"], answer.Reactions);
            foreach (var member in answer.Members) Member(output, member);
            if (answer.Basis is { } basis) output.WriteLine($"  utilization: {basis}; elementary shear model");
            output.WriteLine(string.Create(CultureInfo.InvariantCulture,
                $"  residual {answer.Checks.Residual:0.#E+0} of the load, backward error {answer.Checks.BackwardError:0.#E+0}, balance of loads and reactions {answer.Checks.EquilibriumError:0.#E+0}"));
        }

        output.WriteLine();
        var quality = document.Quality;
        output.WriteLine(string.Create(CultureInfo.InvariantCulture,
            $"{quality.Unknowns} unknowns, condition number about {quality.Condition:0.#E+0}{(quality.Reciprocity is { } r ? FormattableString.Invariant($", reciprocity of situations {r:0.#E+0}") : "")}"));
        foreach (var note in document.Notes) output.WriteLine($"note: {note}");
        output.WriteLine("Stability and second-order effects are not looked at. A screening aid for qualified engineers; not a design, not a certificate.");
    }

    private static void Member(TextWriter output, FrameDocument.MemberAnswer member)
    {
        output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"  member {member.Name}, flexible length {member.Length:G6}: section forces and displacements, local axes"));
        output.WriteLine(Line(["x", "N", "Vy", "Vz", "T", "My", "Mz", "ux", "uy", "uz"]));
        foreach (var row in member.Rows) output.WriteLine(Line(row.Select(Number)));
        foreach (var (component, four) in member.Extremes)
            if (four[0] != 0 || four[2] != 0) output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"    {component} from {four[0]:G6} at {four[1]:G6} to {four[2]:G6} at {four[3]:G6}"));
        if (member.Utilization is { } utilization) output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"    utilization {utilization:0.000}{(utilization > 1 + 1e-9 ? ": OVERSTRESSED on this criterion" : "")}"));
        if (member.WhyNoUtilization is { } why) output.WriteLine($"    no utilization: {why}");
    }

    private static void Table(TextWriter output, string title, string[] head, IEnumerable<(string Node, double[] Six)> rows)
    {
        output.WriteLine($"  {title}");
        output.WriteLine(Line(head));
        foreach (var (node, six) in rows) output.WriteLine(Line([node, .. six.Select(Number)]));
    }

    private static string Line(IEnumerable<string> cells) => $"  {string.Concat(cells.Select(cell => " " + cell.PadLeft(Width)))}";

    private static string Number(double value) => (value + 0.0).ToString("G7", CultureInfo.InvariantCulture);
}
