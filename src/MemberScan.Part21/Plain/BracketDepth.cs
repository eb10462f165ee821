using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;
using static MemberScan.Part21.Plain.WideBits;

namespace MemberScan.Part21.Plain;

/// <summary>How many brackets are open behind each byte, as a number of three bits in three masks: 0 to 7.</summary>
/// <remarks>Each bit of the number turns where the bit below it carries or borrows; a mask of turns becomes the mask of the bit by exclusive sums.</remarks>
internal struct BracketDepth
{
    private uint _ones, _twos, _fours;

    /// <summary>Takes the brackets of 512 bytes.</summary>
    /// <param name="open">Opening brackets outside of strings.</param>
    /// <param name="close">Closing ones.</param>
    /// <param name="ones">Lowest bit of the depth behind each byte.</param>
    /// <param name="higher">Whether any higher bit of it is set.</param>
    /// <returns>Brackets that go below 0 or beyond 7.</returns>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public Vector512<ulong> Take(Vector512<ulong> open, Vector512<ulong> close, out Vector512<ulong> ones, out Vector512<ulong> higher)
    {
        ones = PrefixXor(open | close, ref _ones);
        var turns = (open & ~ones) | (close & ones);
        var twos = PrefixXor(turns, ref _twos);
        var turnsOfFours = turns & ((open & ~twos) | (close & twos));
        higher = twos;
        if (turnsOfFours == Vector512<ulong>.Zero && _fours == 0) return turnsOfFours;

        var fours = PrefixXor(turnsOfFours, ref _fours);
        higher |= fours;
        return turnsOfFours & ((open & ~fours) | (close & fours));
    }
}
