using System.Text.Json;
using System.Text.Json.Serialization;
using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Reporting.RunFile;

/// <summary>The weight of a finding in lower case, such as <c>warning</c>.</summary>
internal sealed class SeverityText() : JsonStringEnumConverter<Severity>(JsonNamingPolicy.KebabCaseLower, allowIntegerValues: false);
