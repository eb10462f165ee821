using System.Globalization;

namespace MemberScan.Benchmarks.Question;

/// <summary>Answer to: every member with its section's dimensions, its property sets and quantities and those of its type, strings decoded.</summary>
public sealed class Answer
{
    /// <summary>Members.</summary>
    public long Members { get; set; }

    /// <summary>Dimensions of sections, once per member.</summary>
    public long Dimensions { get; set; }

    /// <summary>Sum of the dimensions [unit of the file].</summary>
    public double SumOfDimensions { get; set; }

    /// <summary>Sets, of the occurrence and of its type, once per member.</summary>
    public long Sets { get; set; }

    /// <summary>Properties in them.</summary>
    public long Properties { get; set; }

    /// <summary>Quantities in them.</summary>
    public long Quantities { get; set; }

    /// <summary>Sum of all numbers among the values [units of the file].</summary>
    public double SumOfValues { get; set; }

    /// <summary>UTF-16 units of all decoded strings: names of members, sets, properties, quantities, and texts among the values.</summary>
    public long Characters { get; set; }

    /// <summary>Adds another part of the members.</summary>
    public void Add(Answer other)
    {
        ArgumentNullException.ThrowIfNull(other);
        Members += other.Members;
        Dimensions += other.Dimensions;
        SumOfDimensions += other.SumOfDimensions;
        Sets += other.Sets;
        Properties += other.Properties;
        Quantities += other.Quantities;
        SumOfValues += other.SumOfValues;
        Characters += other.Characters;
    }

    /// <summary>One line; sums to ten digits, since their order of addition differs between programs.</summary>
    public override string ToString() => string.Create(
        CultureInfo.InvariantCulture,
        $"members {Members} dimensions {Dimensions} {SumOfDimensions:E9} sets {Sets} properties {Properties} quantities {Quantities} values {SumOfValues:E9} characters {Characters}");
}
