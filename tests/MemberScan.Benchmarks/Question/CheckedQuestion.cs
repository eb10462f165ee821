using MemberScan.Foundation.Diagnostics;
using MemberScan.Part21;

namespace MemberScan.Benchmarks.Question;

/// <summary>The question asked of <see cref="Part21File"/>, which holds the text and checks every value.</summary>
internal sealed class CheckedQuestion
{
    private readonly Part21File _file;
    private readonly Dictionary<ulong, List<ulong>> _setsOf = [];
    private readonly Dictionary<ulong, ulong> _typeOf = [];
    private readonly Answer _answer = new();

    private CheckedQuestion(Part21File file) => _file = file;

    public static Answer Ask(string path)
    {
        var (bytes, _) = ModelContainer.Read(path);
        var question = new CheckedQuestion(Part21File.Read(bytes, Path.GetFileName(path), new DiagnosticList()));
        question.Ask();
        return question._answer;
    }

    private void Ask()
    {
        foreach (var relation in _file.RecordsOf("IFCRELDEFINESBYPROPERTIES"))
        {
            relation[5].TryReference(out var set);
            foreach (var item in relation[4].Items)
            {
                item.TryReference(out var element);
                if (!_setsOf.TryGetValue(element, out var sets)) _setsOf[element] = sets = [];
                sets.Add(set);
            }
        }

        foreach (var relation in _file.RecordsOf("IFCRELDEFINESBYTYPE"))
        {
            relation[5].TryReference(out var type);
            foreach (var item in relation[4].Items)
                if (item.TryReference(out var element))
                    _typeOf[element] = type;
        }

        foreach (var member in _file.RecordsOf("IFCMEMBER")) Member(member);
    }

    private void Member(Part21Record member)
    {
        _answer.Members++;
        Text(member[2]);
        if (Follow(member[6], out var product)) foreach (var shape in product[2].Items) if (Follow(shape, out var representation)) Items(representation);
        foreach (var set in _setsOf.GetValueOrDefault(member.Id) ?? []) if (_file.TryFind(set, out var record)) Set(record);
        if (_typeOf.TryGetValue(member.Id, out var type) && _file.TryFind(type, out var typeRecord))
            foreach (var item in typeRecord[5].Items)
                if (Follow(item, out var record))
                    Set(record);
    }

    private void Items(Part21Record representation)
    {
        foreach (var value in representation[3].Items)
        {
            if (!Follow(value, out var item)) continue;

            if (item.Keyword == "IFCMAPPEDITEM")
            {
                if (Follow(item[0], out var map) && Follow(map[1], out var mapped)) Items(mapped);
            }
            else if (item.Keyword == "IFCEXTRUDEDAREASOLID" && Follow(item[0], out var profile))
            {
                foreach (var argument in profile.Arguments().Skip(3))
                {
                    if (!argument.TryReal(out var dimension)) continue;
                    _answer.Dimensions++;
                    _answer.SumOfDimensions += dimension;
                }
            }
        }
    }

    private void Set(Part21Record set)
    {
        _answer.Sets++;
        Text(set[2]);
        var isSet = set.Keyword == "IFCPROPERTYSET";
        foreach (var item in set[isSet ? 4 : 5].Items)
        {
            if (!Follow(item, out var record)) continue;

            if (isSet) _answer.Properties++;
            else _answer.Quantities++;
            Text(record[0]);
            var value = record[isSet ? 2 : 3];
            if (value.TryReal(out var number)) _answer.SumOfValues += number;
            else Text(value);
        }
    }

    private void Text(Part21Value value)
    {
        if (value.TryText(out var text)) _answer.Characters += text.Length;
    }

    private bool Follow(Part21Value value, out Part21Record record)
    {
        record = default;
        return value.TryReference(out var id) && _file.TryFind(id, out record);
    }
}
