using TwoPhase.Advisory;
using TwoPhase.Metering;
using UnitsNet;

namespace PassReport.Report;

/// <summary>What the report says about one pass.</summary>
internal sealed class PassSummary
{
    private static readonly TimeSpan Now = TimeSpan.FromMinutes(10);

    public PassSummary(PassSeries series)
    {
        Series = series;
        Moves = Report.Moves.Of(series);
        bool[] moving = Report.Moves.Inside(series.Times, Moves);
        Settled = [.. series.Quality.Zip(moving, (quality, moves) => moves ? double.NaN : quality)];
        Moving = moving.Count(moves => moves) / (double)moving.Length;
        DateTimeOffset end = series.Times[^1];
        (Flow, Pressure, Differential) = (Mean(series.Flow, end), Mean(series.Pressure, end), Mean(series.Differential, end));
        Quality = Mean(series.Quality, end);
        FeedTemperature = Mean(series.FeedTemperature, end);
        Estimated = EstimatedAround(end, Now);
        if (series.Estimate is { } estimate) (Uncertainty, Trust, DisagreesSince) = (2 * estimate.Absolute.Span[^1], estimate.Trust.Span[^1], Disagreement(estimate.Trust.Span, series.Times));
        Models = ReadByModels();
        Skipped = series.Quality.Count(double.IsNaN) / (double)series.Quality.Length;
        OutsideDome = series.Status.Count(status => status is ReadingStatus.SubcooledOutlet or ReadingStatus.SuperheatedOutlet) / (double)series.Status.Length;
        Largest = Moves.MaxBy(move => Math.Abs(move.Overshoot));
        IsMovingNow = Moves.Count > 0 && Moves[^1].End >= end;
        Interior = Report.Interior.Of(this);
    }

    public PassSeries Series { get; }

    public string Name => Series.Pass.Name;

    public IReadOnlyList<Move> Moves { get; }

    /// <summary>Quality with the moves taken out.</summary>
    public double[] Settled { get; }

    /// <summary>Means of the last ten minutes, SI.</summary>
    public double Flow { get; }

    public double Pressure { get; }

    public double Differential { get; }

    public double Quality { get; }

    public double FeedTemperature { get; }

    /// <summary>Mean of the last ten minutes of the quality that left the pass, as estimated; NaN where it is not known.</summary>
    public double Estimated { get; }

    /// <summary>Two standard uncertainties of the estimate at the end, all of the meter's included.</summary>
    public double Uncertainty { get; } = double.NaN;

    /// <summary>Whether the reading at the end can be believed; null where the pass cannot be estimated.</summary>
    public Trust? Trust { get; }

    /// <summary>Since when reading and model disagree at the end; null while they do not.</summary>
    public DateTimeOffset? DisagreesSince { get; }

    /// <summary>What stands inside the pass if it is at rest and its meter right; null where that cannot be told.</summary>
    public Interior? Interior { get; }

    /// <summary>What each wet-steam model makes of the same means.</summary>
    public IReadOnlyList<(WetSteamModel Model, QualityReading Reading)> Models { get; }

    public double LowestModel => Models.Count == 0 ? double.NaN : Models.Min(model => model.Reading.Quality.DecimalFractions);

    public double HighestModel => Models.Count == 0 ? double.NaN : Models.Max(model => model.Reading.Quality.DecimalFractions);

    /// <summary>Share of the samples that gave no quality.</summary>
    public double Skipped { get; }

    /// <summary>Share of the samples that read below 0 or above 1.</summary>
    public double OutsideDome { get; }

    /// <summary>Share of the time in which the inputs moved.</summary>
    public double Moving { get; }

    public bool IsMovingNow { get; }

    /// <summary>The move with the largest overshoot; null when nothing moved.</summary>
    public Move? Largest { get; }

    /// <summary>How far the pass reads from the middle of all passes at the end; 0 for a single pass.</summary>
    public double Apart { get; set; }

    /// <summary>How far the reading wandered at rest, against the other passes or, alone, with its inputs unchanged; NaN when it cannot be told.</summary>
    public double Wander { get; set; } = double.NaN;

    /// <summary>How much the pass asks for attention, in points of quality; skipped samples count a point for each four per cent.</summary>
    public double Attention =>
        100 * (Math.Abs(Apart) + (double.IsFinite(Wander) ? Math.Abs(Wander) : 0) + (0.5 * Math.Abs(Largest?.Overshoot ?? 0)) + (0.25 * Skipped) + OutsideDome + (double.IsNaN(Quality) ? 1 : 0));

    /// <summary>Mean estimate over a span of time that ends then.</summary>
    public double EstimatedAround(DateTimeOffset end, TimeSpan length) =>
        Series.Estimate is { } estimate ? new Windows(Series.Times, estimate.Quality.ToArray()).Mean(end, length) : double.NaN;

    /// <summary>Mean reading over a span of time that ends then.</summary>
    public double ReadAround(DateTimeOffset end, TimeSpan length) => new Windows(Series.Times, Series.Quality).Mean(end, length);

    private static DateTimeOffset? Disagreement(ReadOnlySpan<Trust> trust, DateTimeOffset[] times)
    {
        int agreed = trust.LastIndexOfAnyExcept(TwoPhase.Advisory.Trust.Disagreement);
        return agreed == trust.Length - 1 ? null : times[agreed + 1];
    }

    private double Mean(double[] values, DateTimeOffset end) => new Windows(Series.Times, values).Mean(end, Now);

    private List<(WetSteamModel Model, QualityReading Reading)> ReadByModels()
    {
        List<(WetSteamModel, QualityReading)> readings = [];
        if (!(double.IsFinite(Flow) && double.IsFinite(Pressure) && double.IsFinite(Differential))) return readings;
        DifferentialPressureMeter meter = Series.Pass.Meter!.Meter;
        foreach (WetSteamModel model in WetSteamModel.All.Where(model => Suits(model, meter)))
        {
            QualityReading reading = new QualityMeter(meter, model).Quality(MassFlow.FromKilogramsPerSecond(Flow), UnitsNet.Pressure.FromPascals(Pressure), UnitsNet.Pressure.FromPascals(Differential));
            if (reading.Status is ReadingStatus.WetSteam or ReadingStatus.SubcooledOutlet or ReadingStatus.SuperheatedOutlet) readings.Add((model, reading));
        }

        return readings;
    }

    // The two forms of ISO/TR 11583 belong to one element each.
    private static bool Suits(WetSteamModel model, DifferentialPressureMeter meter) =>
        (!model.NeedsGeometry || meter is PrimaryElement)
        && (model != WetSteamModel.StevenOrifice || meter is OrificePlate)
        && (model != WetSteamModel.ReaderHarrisGraham || meter is ClassicalVenturi or VenturiNozzle);
}
