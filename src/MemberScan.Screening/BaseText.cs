using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc.WriteBack.Earlier;
using MemberScan.Part21;
using MemberScan.Part21.Containers;

namespace MemberScan.Screening;

/// <summary>The text of a model without results of an earlier run, as a structure and as a hash.</summary>
/// <param name="Text">The text.</param>
/// <param name="File">Its records.</param>
/// <param name="Sha256">Its hash, lower-case hexadecimal.</param>
/// <param name="Earlier">What stood in it.</param>
internal sealed record BaseText(ModelText Text, Part21File File, string Sha256, EarlierResults Earlier)
{
    private static readonly EarlierResults s_none = new(EarlierKind.None, ReadOnlyMemory<byte>.Empty, 0, []);

    /// <summary>Reads it. A text on disk stays there unless results of an earlier run must be taken out of it.</summary>
    /// <param name="model">The text as given.</param>
    /// <param name="wanted">Keywords that its records will be asked for.</param>
    /// <param name="diagnostics">Takes what is wrong with it.</param>
    public static BaseText Of(ModelText model, IReadOnlyCollection<string> wanted, DiagnosticList diagnostics)
    {
        var (text, earlier) = model.IsOnDisk && !EarlierResults.MayBeIn(model) ? (model, s_none) : Stripped(model.ToHeld());
        var hash = Task.Run(text.Sha256);
        var file = Part21File.Read(text, wanted, diagnostics);
        return new BaseText(text, file, hash.GetAwaiter().GetResult(), earlier);
    }

    private static (ModelText, EarlierResults) Stripped(ModelText held)
    {
        var earlier = EarlierResults.Find(held.Held, held.Name);
        return (ModelText.Of(earlier.Base, held.Name, held.Note), earlier);
    }
}
