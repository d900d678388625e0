namespace Backfill.Demo;

/// <summary>What is wrong with the instruments of one pass on one day of the invented year.</summary>
internal sealed class InstrumentFaults
{
    private const double Frozen = 1500, Missing = 300, SpikeShare = 2e-4;

    private readonly Random _spikes;
    private readonly double _frozenFrom, _missingFrom, _driftBegins, _driftPart;
    private double _held = double.NaN;

    public InstrumentFaults(Chance seed, DateOnly day, string pass)
    {
        Chance own = seed.Of(pass, day.DayNumber).Of("faults");
        _frozenFrom = Sometimes(own.Of("frozen"));
        _missingFrom = Sometimes(own.Of("missing"));
        _spikes = own.Of("spikes").Stream();

        // One meter reads ever lower from the tenth of each month to the fifteenth, and is put right on the first.
        (_driftBegins, _driftPart) = (day.Day - 10, pass == "3" ? 0.06 : 0);
    }

    /// <summary>The differential as the transmitter gives it; second of the day.</summary>
    public double Differential(double second, double right)
    {
        double drift = 1 - (_driftPart * Math.Clamp((_driftBegins + (second / 86_400)) / 5, 0, 1));
        double value = right * drift * (_spikes.NextDouble() < SpikeShare ? 1.4 : 1);
        if (second < _frozenFrom || second > _frozenFrom + Frozen) _held = value;
        return _held;
    }

    /// <summary>The feed flow, null while it is missing.</summary>
    public double? FeedFlow(double second, double right) => second >= _missingFrom && second < _missingFrom + Missing ? null : right;

    // On one day of three, at some second of it.
    private static double Sometimes(Chance chance) => chance.Share < 1.0 / 3 ? 1 + (84_000 * chance.Of("when").Share) : double.PositiveInfinity;
}
