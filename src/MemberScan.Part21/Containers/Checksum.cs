namespace MemberScan.Part21.Containers;

/// <summary>The cyclic redundancy check of zip archives (CRC-32, reflected polynomial EDB88320).</summary>
internal static class Checksum
{
    private static readonly uint[] s_table = BuildTable();

    public static uint Of(ReadOnlySpan<byte> bytes)
    {
        var rest = uint.MaxValue;
        foreach (var value in bytes) rest = s_table[(rest ^ value) & 0xFF] ^ (rest >> 8);
        return ~rest;
    }

    private static uint[] BuildTable()
    {
        var table = new uint[256];
        for (var i = 0u; i < table.Length; i++)
        {
            var rest = i;
            for (var bit = 0; bit < 8; bit++) rest = (rest & 1) != 0 ? 0xEDB8_8320 ^ (rest >> 1) : rest >> 1;
            table[i] = rest;
        }

        return table;
    }
}
