using System.Diagnostics.CodeAnalysis;
using System.Text.Encodings.Web;
using System.Text.Unicode;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Web;
using Microsoft.Extensions.Logging.Abstractions;

namespace MemberScan.Reporting;

/// <summary>Components to text.</summary>
internal static class PageRenderer
{
    /// <summary>A component as text; line ends are LF.</summary>
    public static string Render<[DynamicallyAccessedMembers(DynamicallyAccessedMemberTypes.All)] T>(Dictionary<string, object?> parameters)
        where T : IComponent
    {
        using var renderer = new HtmlRenderer(new OnlyEncoder(), NullLoggerFactory.Instance);

        // No component waits for anything, so the task is complete when it returns.
        return renderer.Dispatcher.InvokeAsync(async () =>
        {
            var page = await renderer.RenderComponentAsync<T>(ParameterView.FromDictionary(parameters));
            return page.ToHtmlString().ReplaceLineEndings("\n");
        }).GetAwaiter().GetResult();
    }

    // Letters of all scripts stay as they are; by default each would become a numeric entity.
    private sealed class OnlyEncoder : IServiceProvider
    {
        private static readonly HtmlEncoder s_encoder = HtmlEncoder.Create(UnicodeRanges.All);

        public object? GetService(Type serviceType) => serviceType == typeof(HtmlEncoder) ? s_encoder : null;
    }
}
