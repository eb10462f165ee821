using System.Globalization;
using System.Text;

namespace MemberScan.Benchmarks.Models;

/// <summary>Writes the statements of a generated model in the layout and with the numbering of its recipe.</summary>
internal sealed class StatementWriter(Stream output, ModelRecipe recipe)
{
    // An odd factor permutes the numbers below a power of two.
    private const uint Factor = 9_699_691;
    private const uint Mask = (1 << 25) - 1;

    private readonly StringBuilder _text = new(4096);
    private uint _count;

    /// <summary>Bytes written.</summary>
    public long Length { get; private set; }

    /// <summary>Adds an instance; its arguments are joined by commas.</summary>
    /// <returns>Its name such as <c>#12</c>.</returns>
    public string Add(string keyword, params ReadOnlySpan<string> arguments)
    {
        _count++;
        var name = Name(_count);
        if (recipe.Odd) Odd(name, keyword, arguments);
        else _text.Append(name).Append('=').Append(keyword).Append('(').AppendJoin(',', arguments).Append(");\n");
        if (_text.Length > 1 << 16) Flush();
        return name;
    }

    /// <summary>Adds text as it is.</summary>
    public void Raw(string text)
    {
        _text.Append(recipe.Odd ? text.Replace("\n", "\r\n", StringComparison.Ordinal) : text);
        Flush();
    }

    private void Odd(string name, string keyword, ReadOnlySpan<string> arguments)
    {
        switch (_count % 4)
        {
            case 0:
                _text.Append(name).Append(" = ").Append(keyword).Append(" /* a;b'( */ (").AppendJoin(", ", arguments).Append(" ) ;\r\n");
                break;
            case 1:
                _text.Append(name).Append("=\t").Append(keyword).Append("(\r\n\t").AppendJoin(",\r\n\t", arguments).Append("\r\n);\r\n\r\n");
                break;
            case 2:
                _text.Append("/* the landing; ").Append(name).Append("=X(1); */ ").Append(name).Append('=').Append(keyword).Append('(').AppendJoin(',', arguments).Append(");");
                break;
            default:
                _text.Append(name).Append('=').Append(keyword).Append('(').AppendJoin(" , ", arguments).Append(");\r\n");
                break;
        }
    }

    private string Name(uint number) =>
        string.Create(CultureInfo.InvariantCulture, $"#{(recipe.Shuffled ? number * Factor & Mask : number)}");

    private void Flush()
    {
        var bytes = Encoding.ASCII.GetBytes(_text.ToString());
        output.Write(bytes);
        Length += bytes.Length;
        _text.Clear();
    }
}
