namespace MemberScan.Checks.Threads;

/// <summary>The area that tension in a thread is divided by; every rule names its own.</summary>
public enum ThreadArea
{
    /// <summary>Circle of the nominal diameter.</summary>
    Nominal,

    /// <summary>Tensile stress area.</summary>
    Stress,

    /// <summary>Circle of the root diameter.</summary>
    Root,
}
