using System.Diagnostics;

namespace SpecLint.Cli.Reviewing;

/// <summary>A line on standard error that counts specs, when a run is long and a person is watching.</summary>
internal sealed class Progress : IDisposable
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(1);
    private static readonly TimeSpan Interval = TimeSpan.FromMilliseconds(200);

    private readonly int _total;
    private readonly TextWriter _error;
    private readonly Stopwatch _clock = Stopwatch.StartNew();
    private readonly bool _isWatched;
    private TimeSpan _shownAt = TimeSpan.Zero;
    private bool _stands;
    private int _done;

    public Progress(int total, TextWriter error)
    {
        _total = total;
        _error = error;
        _isWatched = total > 1 && !Console.IsErrorRedirected;
    }

    /// <summary>One spec more is done.</summary>
    public void Step()
    {
        _done++;
        if (_isWatched && _clock.Elapsed > Patience && _clock.Elapsed - _shownAt > Interval)
        {
            _error.Write($"\r{_done} of {_total} specs reviewed");
            _shownAt = _clock.Elapsed;
            _stands = true;
        }
    }

    /// <summary>Takes the line away before results are printed.</summary>
    public void Clear()
    {
        if (_stands)
        {
            _error.Write("\r\u001b[K");
            _stands = false;
        }
    }

    public void Dispose() => Clear();
}
