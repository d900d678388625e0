using TwoPhase.Advisory;
using TwoPhase.Metering;
using TwoPhase.Passes;

namespace LivePasses.Live;

/// <summary>What is known of all passes now. One writer, any number of readers.</summary>
internal sealed class PassWatch
{
    /// <summary>How long nothing may come, by the clock of this machine, before nothing is known.</summary>
    public static readonly TimeSpan Patience = TimeSpan.FromSeconds(10);

    private readonly Lock _lock = new();
    private readonly EstimatorOptions _options;
    private GeneratorEstimator _estimator;
    private readonly double _limit;
    private readonly QualityEstimate[] _nothing;
    private readonly Trend[] _trends;
    private readonly double[] _feeds;
    private readonly Trust[] _trusts;
    private readonly ILogger<PassWatch> _log;
    private DateTimeOffset? _time;
    private long? _arrived;

    public PassWatch(LiveSettings settings, ILogger<PassWatch> log)
    {
        _log = log;
        Generator = settings.Generator;
        _limit = settings.Options.QualityLimit.DecimalFractions;
        _options = settings.Options;
        _estimator = new(Generator, _options);
        _nothing = [.. _estimator.Estimates];
        _trends = [.. Generator.Passes.Select(static _ => new Trend())];
        _feeds = new double[_trends.Length];
        _trusts = new Trust[_trends.Length];
    }

    public SteamGenerator Generator { get; }

    /// <summary>Time of the last reading; null before the first.</summary>
    public DateTimeOffset? Time
    {
        get
        {
            lock (_lock) return _time;
        }
    }

    /// <summary>Takes a reading of the generator.</summary>
    public void Take(GeneratorReading reading)
    {
        lock (_lock)
        {
            _estimator.Update(reading);
            (_time, _arrived) = (reading.Time, Environment.TickCount64);
            for (int i = 0; i < _trends.Length; i++)
            {
                QualityEstimate estimate = _estimator.Estimates[i];
                _feeds[i] = reading.Passes[i].FeedFlow?.KilogramsPerSecond ?? double.NaN;
                _trends[i].Add(new(reading.Time, Rounded(estimate.IndicatedQuality?.DecimalFractions), Rounded(estimate.Quality?.DecimalFractions)));
                if (estimate.Trust != _trusts[i]) Tell(ViewOf(i));
                _trusts[i] = estimate.Trust;
            }
        }
    }

    /// <summary>Every pass as it stands, and the points of its trend that a reader has not yet seen.</summary>
    /// <param name="seen">Points that the reader has seen of each pass; brought up to date.</param>
    public WatchView Look(long[] seen)
    {
        lock (_lock)
        {
            var passes = new PassView[_trends.Length];
            var trends = new IReadOnlyList<TrendPoint>[_trends.Length];
            for (int i = 0; i < passes.Length; i++)
            {
                (passes[i], trends[i]) = (ViewOf(i), _trends[i].From(seen[i]));
                seen[i] = _trends[i].Count;
            }

            return new(_time, passes, trends);
        }
    }

    /// <summary>Points of no trend seen yet.</summary>
    public long[] NothingSeen() => new long[_trends.Length];

    public SavedState Save()
    {
        lock (_lock) return new(Generator.Name, _time, [.. Generator.Passes.Select(static pass => pass.Name)], _estimator.Save().ToString());
    }

    /// <summary>Goes on from a saved state.</summary>
    /// <exception cref="FormatException">It is of another generator, or of another version.</exception>
    public void Restore(SavedState saved)
    {
        if (saved.Passes is null || saved.State is null) throw new FormatException("it is not whole");
        if (saved.Generator != Generator.Name || !saved.Passes.SequenceEqual(Generator.Passes.Select(static pass => pass.Name))) throw new FormatException($"it is of {saved.Generator}");
        var restored = new GeneratorEstimator(Generator, _options);
        restored.Restore(EstimatorState.Parse(saved.State));
        lock (_lock) (_estimator, _time) = (restored, saved.Time);
    }

    private static double? Rounded(double? quality) => quality is { } value ? Math.Round(value, 4) : null;

    private void Tell(PassView pass)
    {
        string sentence = pass.Sentence;
        Words.Pass(_log, pass.Time, sentence);
    }

    // What is old is not shown: without tags nothing is known.
    private bool IsSilent => _arrived is not { } last || Environment.TickCount64 - last > Patience.TotalMilliseconds;

    private PassView ViewOf(int pass) => IsSilent
        ? PassView.Silent(Generator.Passes[pass], _nothing[pass], _time)
        : PassView.Of(Generator.Passes[pass], _estimator.Estimates[pass], _estimator.Shifts[pass], _feeds[pass], _limit);
}

/// <summary>All passes at a time.</summary>
/// <param name="Time">Plant time of the last reading; null before the first.</param>
/// <param name="Passes">The passes.</param>
/// <param name="Trends">Points of each that are new to the reader.</param>
internal sealed record WatchView(DateTimeOffset? Time, IReadOnlyList<PassView> Passes, IReadOnlyList<IReadOnlyList<TrendPoint>> Trends);

/// <summary>What is written to disk.</summary>
internal sealed record SavedState(string Generator, DateTimeOffset? Time, IReadOnlyList<string>? Passes, string? State);
