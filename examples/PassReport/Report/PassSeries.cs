using PassReport.History;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet.Units;

namespace PassReport.Report;

/// <summary>One pass in columns: what was measured, in SI, and the quality that it implies; NaN where a sample was skipped.</summary>
internal sealed class PassSeries(Pass pass, DateTimeOffset[] times)
{
    public Pass Pass { get; } = pass;

    public DateTimeOffset[] Times { get; } = times;

    public double[] Flow { get; } = new double[times.Length];

    public double[] Pressure { get; } = new double[times.Length];

    public double[] Differential { get; } = new double[times.Length];

    public double[] FeedTemperature { get; } = new double[times.Length];

    public double[] Firing { get; } = new double[times.Length];

    public double[] Quality { get; } = new double[times.Length];

    public ReadingStatus[] Status { get; } = new ReadingStatus[times.Length];

    /// <summary>Reads every pass of a generator out of its history.</summary>
    public static PassSeries[] From(SteamGenerator generator, HistoryTable history, SampleFaults faults, string file, IProgress<double>? progress = null)
    {
        Columns columns = Columns.Of(generator, history, file);
        PassSeries[] series = [.. generator.Passes.Select(pass => new PassSeries(pass, history.Times))];
        for (int row = 0; row < history.Times.Length; row++)
        {
            if (row % 500 == 0) progress?.Report((double)row / history.Times.Length);
            GeneratorReading reading = columns.Read(history, row, faults);
            for (int i = 0; i < series.Length; i++) series[i].Take(row, reading.ReadingOf(i));
        }

        foreach (PassSeries one in series)
        {
            one.Pass.Meter!.Quality(
                Column.Of<MassFlowUnit>(one.Flow, MassFlowUnit.KilogramPerSecond), Column.Of<PressureUnit>(one.Pressure, PressureUnit.Pascal), Column.Of<PressureUnit>(one.Differential, PressureUnit.Pascal), one.Quality, one.Status);
        }

        return series;
    }

    private void Take(int row, in PassReading reading)
    {
        Flow[row] = reading.FeedFlow?.KilogramsPerSecond ?? double.NaN;
        Pressure[row] = reading.OutletPressure?.Pascals ?? double.NaN;
        Differential[row] = reading.Differential?.Pascals ?? double.NaN;
        FeedTemperature[row] = reading.FeedTemperature?.Kelvins ?? double.NaN;
        Firing[row] = reading.Firing?.DecimalFractions ?? double.NaN;
    }
}
