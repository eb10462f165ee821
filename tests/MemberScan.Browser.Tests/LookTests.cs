using MemberScan.Browser.Tests.Data;
using MemberScan.Screening.Record;
using Microsoft.Playwright;

namespace MemberScan.Browser.Tests;

/// <summary>Contrast of text as drawn, and whether the scale's colours can be told apart with each kind of colour vision.</summary>
public sealed class LookTests(Chromium chromium) : IClassFixture<Chromium>
{
    private static readonly ScreeningRecord s_record = GeneratedLanding.Of(200, 12, 16);

    // Relative luminance and contrast: Web Content Accessibility Guidelines 2.1, success criterion 1.4.3.
    private const string Contrast = """
        () => {
          const channels = (text) => text.match(/[\d.]+/g).map(Number);
          const luminance = ([r, g, b]) => [r, g, b].map(c => (c /= 255) <= 0.03928 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4).reduce((s, c, i) => s + c * [0.2126, 0.7152, 0.0722][i], 0);
          const ground = (element) => {
            for (let e = element; e; e = e.parentElement) {
              const c = channels(getComputedStyle(e).backgroundColor);
              if (c.length < 4 || c[3] > 0.9) return c;
            }
            return [255, 255, 255];
          };
          const faults = [];
          let texts = 0;
          const walker = document.createTreeWalker(document.body, NodeFilter.SHOW_TEXT);
          for (let node = walker.nextNode(); node; node = walker.nextNode()) {
            const element = node.parentElement;
            if (!node.data.trim() || element.closest('script, noscript, style, .patch') || !element.checkVisibility({ visibilityProperty: true })) continue;
            texts++;
            const style = getComputedStyle(element);
            const [a, b] = [luminance(channels(element instanceof SVGElement ? style.fill : style.color)), luminance(ground(element))];
            const ratio = (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
            if (ratio < 4.5 && !element.closest(':disabled')) faults.push(`${node.data.trim().slice(0, 30)}: ${ratio.toFixed(2)} (${element.tagName} ${element.className})`);
          }
          return [String(texts), ...faults];
        }
        """;

    [Theory]
    [InlineData(1400)]
    [InlineData(390)]
    public async Task Every_text_stands_out_from_its_ground(int width)
    {
        await using var report = await chromium.Open(
            s_record, new BrowserNewContextOptions { ViewportSize = new ViewportSize { Width = width, Height = 1000 } }, "#member=" + Uri.EscapeDataString(s_record.Members[9].Key));

        var found = await report.Page.EvaluateAsync<string[]>(Contrast);

        Assert.True(int.Parse(found[0], System.Globalization.CultureInfo.InvariantCulture) > 300);
        Assert.Empty(found[1..]);
    }

    // Chromium simulates the deficiencies on the finished picture; the patches of the legend are read back from it.
    [Theory]
    [InlineData("none")]
    [InlineData("protanopia")]
    [InlineData("deuteranopia")]
    [InlineData("tritanopia")]
    [InlineData("achromatopsia")]
    public async Task The_scale_can_be_told_apart_with(string vision)
    {
        await using var report = await chromium.Open(s_record);
        var session = await report.Page.Context.NewCDPSessionAsync(report.Page);
        await session.SendAsync("Emulation.setEmulatedVisionDeficiency", new Dictionary<string, object> { ["type"] = vision });
        await report.Page.Locator("#space .scale").ScrollIntoViewIfNeededAsync();

        var picture = await report.Page.Locator("#space .scale").ScreenshotAsync(new LocatorScreenshotOptions { Path = Path.Combine(Chromium.Artifacts, $"scale-{vision}.png") });
        var light = await Patches(report, picture);

        Assert.Equal(8, light.Length);
        for (var i = 0; i + 1 < 5; i++) Assert.True(light[i] - light[i + 1] > 8, $"steps {i} and {i + 1}: {light[i]:0.0} and {light[i + 1]:0.0}");
        Assert.True(light[5] - light[6] > 8, $"overstressed: {light[5]:0.0} and {light[6]:0.0}");
        Assert.True(light[7] > 80);
    }

    // Lightness L* (CIE 1976) of the middle of each patch as the largest part of its pixels has it: hatch and dots are passed over.
    private static Task<double[]> Patches(OpenedReport report, byte[] picture) => report.Page.EvaluateAsync<double[]>("""
        async (base64) => {
          const bytes = Uint8Array.from(atob(base64), c => c.charCodeAt(0));
          const bitmap = await createImageBitmap(new Blob([bytes], { type: 'image/png' }));
          const canvas = new OffscreenCanvas(bitmap.width, bitmap.height);
          const context = canvas.getContext('2d');
          context.drawImage(bitmap, 0, 0);
          const list = document.querySelector('#space .scale').getBoundingClientRect();
          return [...document.querySelectorAll('#space .scale .patch')].map(patch => {
            const box = patch.getBoundingClientRect();
            const { data } = context.getImageData(box.left - list.left + 3, box.top - list.top + 3, box.width - 6, box.height - 6);
            const counts = new Map();
            for (let i = 0; i < data.length; i += 4) {
              const key = [data[i], data[i + 1], data[i + 2]].join();
              counts.set(key, (counts.get(key) ?? 0) + 1);
            }
            const [most] = [...counts].sort((a, b) => b[1] - a[1])[0];
            const y = most.split(',').map(c => (c /= 255) <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4).reduce((s, c, i) => s + c * [0.2126, 0.7152, 0.0722][i], 0);
            return y > 216 / 24389 ? 116 * Math.cbrt(y) - 16 : y * 24389 / 27;
          });
        }
        """, Convert.ToBase64String(picture));
}
