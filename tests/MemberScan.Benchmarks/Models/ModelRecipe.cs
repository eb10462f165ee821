namespace MemberScan.Benchmarks.Models;

/// <summary>What a generated model is made of; the same recipe gives the same bytes.</summary>
/// <param name="Bytes">Size to reach [byte]; the model ends with the part that passes it.</param>
/// <param name="Members">Members with sections, property sets and quantities.</param>
/// <param name="Ifc2x3">IFC2X3 instead of IFC4.</param>
/// <param name="Odd">Comments and blanks between tokens, CR LF.</param>
/// <param name="Shuffled">Instance numbers in no order.</param>
public sealed record ModelRecipe(long Bytes, int Members, bool Ifc2x3 = false, bool Odd = false, bool Shuffled = false)
{
    private const long MB = 1_000_000;

    /// <summary>The recipe of a name such as <c>100mb</c> or <c>10mb-odd</c>.</summary>
    public static ModelRecipe Named(string name) => name switch
    {
        "10mb" => new(10 * MB, 200),
        "100mb" => new(100 * MB, 2_000),
        "1gb" => new(1000 * MB, 20_000),
        "dense" => new(100 * MB, 36_000),
        "10mb-odd" => new(10 * MB, 200, Odd: true),
        "10mb-ifc2x3" => new(10 * MB, 200, Ifc2x3: true),
        "10mb-shuffled" => new(10 * MB, 200, Shuffled: true),
        "100mb-shuffled" => new(100 * MB, 2_000, Shuffled: true),
        "1gb-shuffled" => new(1000 * MB, 20_000, Shuffled: true),
        _ => throw new ArgumentException($"There is no model '{name}'.", nameof(name)),
    };
}
