using MemberScan.Part21.Findings;
using MemberScan.Part21.Index;
using MemberScan.Part21.Reading;
using MemberScan.Part21.Sources;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21.Streaming;

/// <summary>Scans the data of a file in stretches, several at a time, with the result of one that goes from the first to the last.</summary>
/// <remarks>
/// Where a stretch begins is guessed: at the first instance behind a semicolon. Where it really begins is where the one before ended; a
/// stretch whose guess was wrong (inside of a string, of a comment) is scanned again. Stretches are the same for any number of threads.
/// </remarks>
internal sealed class DataPass
{
    /// <summary>Length of a stretch [byte].</summary>
    public const int ShippedStretch = 8 * 1024 * 1024;

    /// <summary>Length of the window that a stretch is read through [byte].</summary>
    public const int ShippedWindow = 256 * 1024;

    private const int LookBack = 64;
    private const int GuessLength = 64 * 1024;

    private readonly ByteSource _source;
    private readonly WantedKeywords _wanted;
    private readonly ReadingLimits _limits;
    private readonly int _stretch;
    private readonly int _windowLength;
    private readonly ChunkResult?[] _guessed;
    private readonly DataScanner _scanner;
    private readonly Window _window;

    private readonly Func<IPart21Taker>? _newTaker;

    public DataPass(ByteSource source, WantedKeywords wanted, Func<IPart21Taker>? newTaker, ReadingLimits limits, int stretch, int window)
    {
        _newTaker = newTaker;
        _source = source;
        _wanted = wanted;
        _limits = limits with { RescannedBytes = Math.Min(limits.RescannedBytes, 8L * stretch) };
        _stretch = stretch;
        _windowLength = window;
        _guessed = new ChunkResult?[(source.Length + stretch - 1) / stretch];
        (_scanner, _window) = (new DataScanner(new FindingLog(), _limits), new Window(source, window));
    }

    /// <summary>Anchors in file order.</summary>
    public Rows<BlockEntry> Blocks { get; } = new();

    /// <summary>Rows of wanted keywords in file order.</summary>
    public Rows<PlaceRow> Places { get; } = new();

    /// <summary>What took the wanted instances, by stretch, in file order.</summary>
    public List<IPart21Taker> Takers { get; } = [];

    /// <summary>Number of instances.</summary>
    public long Count { get; private set; }

    /// <summary>Scans ahead from guessed beginnings.</summary>
    public void Guess(long from, int threads)
    {
        var next = (int)(from / _stretch);
        var workers = new Thread[Math.Max(0, Math.Min(threads, _guessed.Length - next) - 1)];
        Exception? fault = null;
        for (var i = 0; i < workers.Length; i++)
        {
            workers[i] = new Thread(() =>
            {
                try
                {
                    Work(new DataScanner(new FindingLog(), _limits), new Window(_source, _windowLength));
                }
                catch (IOException thrown)
                {
                    Interlocked.CompareExchange(ref fault, thrown, null);
                }
            });
            workers[i].Start();
        }

        try
        {
            Work(_scanner, _window);
        }
        finally
        {
            foreach (var worker in workers) worker.Join();
        }

        if (fault is not null) throw new IOException(fault.Message, fault);

        void Work(DataScanner scanner, Window window)
        {
            while (true)
            {
                var number = Interlocked.Increment(ref next) - 1;
                if (number >= _guessed.Length) return;

                var start = number == from / _stretch ? from : GuessStart(window, (long)number * _stretch);
                if (start >= 0) _guessed[number] = Scan(scanner, window, start, (long)(number + 1) * _stretch);
            }
        }
    }

    /// <summary>Takes the stretches of one data section in order.</summary>
    /// <param name="at">Behind <c>DATA;</c>; afterwards where the section ends.</param>
    /// <param name="log">Receives the findings.</param>
    public DataStop Take(ref long at, FindingLog log)
    {
        while (true)
        {
            var number = (int)(at / _stretch);
            if (number >= _guessed.Length) return DataStop.End;

            var guessed = _guessed[number];
            _guessed[number] = null;
            var result = guessed?.From == at ? guessed : Scan(_scanner, _window, at, (long)(number + 1) * _stretch);
            log.Take(result.Findings, 0);
            Blocks.AddAll(result.Blocks);
            Places.AddAll(result.Places);
            if (result.Taker is not null) Takers.Add(result.Taker);
            Count += result.Count;
            at = result.End;
            if (Count > _limits.Instances)
            {
                log.Take([new Finding(FindingKinds.TooManyInstances, at, 0)], 0);
                return DataStop.Limit;
            }

            if (result.Stop != DataStop.Until) return result.Stop;
        }
    }

    private ChunkResult Scan(DataScanner scanner, Window window, long from, long until)
    {
        var result = new ChunkResult { From = from, Taker = _newTaker?.Invoke() };
        var sink = new PassSink(result, _wanted);
        scanner.Log.TakeBack(0);
        result.Stop = scanner.Scan(window, ref from, until, false, ref sink);
        sink.Finish();
        result.End = from;
        result.Count = sink.Count;
        result.Findings.AddRange(scanner.Log.Counted());
        return result;
    }

    // The first '#' with a digit behind at or after the offset that only blanks part from a semicolon; −1 if there is none near.
    private static long GuessStart(Window window, long offset)
    {
        window.Hold(offset - LookBack, LookBack + GuessLength);
        var text = window.Text;
        for (var at = LookBack; at + 1 < text.Length && at < GuessLength; at++)
        {
            if (text[at] != '#' || !char.IsAsciiDigit((char)text[at + 1])) continue;

            var before = at - 1;
            while (before > 0 && Blanks.IsBlank(text[before])) before--;
            if (text[before] == ';') return window.Origin + at;
        }

        return -1;
    }
}
