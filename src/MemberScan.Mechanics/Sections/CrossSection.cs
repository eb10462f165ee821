namespace MemberScan.Mechanics.Sections;

/// <summary>A cross-section as a value: its kind and dimensions, centred on its centroid, y across and z up.</summary>
/// <remarks>
/// The kinds are <see cref="Round"/>, <see cref="Tube"/>, <see cref="Rectangle"/>, <see cref="RoundedRectangle"/>, <see cref="Box"/>,
/// <c>OpenProfile</c> and <c>OutlineSection</c>.
/// Each has a static <c>Fault</c> that says what is wrong with dimensions before a value is made; the constructor throws on the same.
/// </remarks>
public abstract record CrossSection
{
    private protected CrossSection()
    {
    }

    /// <summary>The kind in words: round, tube, rectangle, rounded rectangle, box, I profile, outline.</summary>
    public abstract string Kind { get; }

    /// <summary>Largest extent along y [m].</summary>
    public abstract double ExtentY { get; }

    /// <summary>Largest extent along z [m].</summary>
    public abstract double ExtentZ { get; }

    /// <summary>Kind and dimensions in mm, such as <c>tube 48.3x3.2 mm</c>: the text that the section command reads.</summary>
    public abstract string Designation { get; }

    private protected static string MmText(double metres) =>
        Math.Round(metres * 1e3, 6).ToString("0.######", System.Globalization.CultureInfo.InvariantCulture);

    private protected static SectionFault? NotPositive(params ReadOnlySpan<double> dimensions)
    {
        foreach (var dimension in dimensions)
        {
            if (double.IsFinite(dimension) && dimension > 0) continue;
            return new SectionFault(SectionFaultKind.NotPositive, $"a dimension is {MmText(dimension)} mm; it must be a finite number above zero");
        }

        return null;
    }

    private protected static void ThrowOn(SectionFault? fault)
    {
        if (fault is not null) throw new ArgumentException(fault.Message);
    }
}
