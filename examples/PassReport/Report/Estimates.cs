using TwoPhase.Advisory;
using TwoPhase.Metering;
using TwoPhase.Passes;
using UnitsNet;
using UnitsNet.Units;

namespace PassReport.Report;

/// <summary>What left each pass, by the library's estimator: the water on the move taken into account, which the reading knows nothing of.</summary>
internal static class Estimates
{
    private static readonly ReadingFormat Si = new(MassFlowUnit.KilogramPerSecond, TemperatureUnit.Kelvin, RatioUnit.DecimalFraction, PressureUnit.Pascal, PressureUnit.Pascal);

    /// <summary>Estimates the passes that can be: those whose tubes and heat the generator file gives and whose feed temperature is in the history.</summary>
    public static void Find(string generator, PassSeries[] series, IProgress<double>? progress = null)
    {
        PassSeries[] known = [.. series.Where(one => one.Pass.Sections.Count > 0 && one.Pass.Heat is not null && one.Pass.Interchanger is null && one.FeedTemperature.Any(double.IsFinite))];
        if (known.Length == 0) return;
        IReadOnlyList<EstimateColumns> estimates = QualityBackfill.Run(new SteamGenerator(generator, known.Select(one => one.Pass)), [.. known.Select(Columns)], progress: new Shares(progress));
        for (int i = 0; i < known.Length; i++) known[i].Estimate = estimates[i];
    }

    private static PassColumns Columns(PassSeries one) => new(Si, one.Times, one.Flow, one.FeedTemperature, one.Firing, one.Pressure, one.Differential);

    private sealed class Shares(IProgress<double>? progress) : IProgress<Ratio>
    {
        public void Report(Ratio value) => progress?.Report(value.DecimalFractions);
    }
}
