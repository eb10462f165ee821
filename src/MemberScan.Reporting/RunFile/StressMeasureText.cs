using System.Text.Json;
using System.Text.Json.Serialization;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Reporting.RunFile;

/// <summary>A stress measure in lower case with hyphens, such as <c>von-mises</c>.</summary>
internal sealed class StressMeasureText() : JsonStringEnumConverter<StressMeasure>(JsonNamingPolicy.KebabCaseLower, allowIntegerValues: false);
