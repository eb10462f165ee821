namespace MemberScan.Mechanics.Meshes;

/// <summary>Lengths of pieces that grow away from where a field is rough.</summary>
internal static class Grading
{
    /// <summary>Each layer towards a sharp re-entrant corner is this much thinner than the last.</summary>
    public const double Ratio = 0.15;

    /// <summary>Where layers towards a corner end, as a share of the wall: what lies nearer cannot be told from the corner itself.</summary>
    public const double Finest = 0.01;

    /// <summary>A fillet of at least this share of the wall needs no layers that grow.</summary>
    public const double RoundFrom = 0.3;

    /// <summary>Lengths of pieces from an end inwards: growing from the first, fast while below the size of the neighbourhood.</summary>
    public static List<double> Graded(double length, double first, double size)
    {
        var pieces = new List<double>();
        for (var (rest, piece) = (length, Math.Min(first, size)); ;)
        {
            if (rest <= 1.6 * piece)
            {
                pieces.Add(rest);
                return pieces;
            }

            pieces.Add(piece);
            rest -= piece;
            piece = piece < size ? Math.Min(piece * (1 / Ratio - 1), Math.Max(size, piece)) : 3 * piece;
        }
    }

    /// <summary>Layers across a wall from the face with the corner, counted from the other face.</summary>
    public static List<double> Layers(double innerRadius, double wall) => innerRadius >= RoundFrom * wall
        ? [Ratio * wall, (1 - 2 * Ratio) * wall, Ratio * wall]
        : [.. Enumerable.Reverse(Graded(wall, Math.Max(innerRadius, Finest * wall), wall))];

    /// <summary>Pieces counted from the end: shares of the whole from the start.</summary>
    public static double[] Fractions(List<double> pieces, double length)
    {
        var total = pieces.Sum();
        var cuts = new double[pieces.Count + 1];
        for (var k = 1; k < pieces.Count; k++) cuts[k] = cuts[k - 1] + pieces[^k] / total;
        cuts[^1] = length > 0 ? 1 : 0;
        return cuts;
    }
}
