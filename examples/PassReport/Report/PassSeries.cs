using System.Globalization;
using PassReport.History;
using TwoPhase.Advisory;
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

    /// <summary>What left the pass, as estimated, with its uncertainty and whether the reading could be believed; null where the pass cannot be estimated.</summary>
    public EstimateColumns? Estimate { get; set; }

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
            one.Infer();
            one.CountRefused(generator, history, faults);
        }

        return series;
    }

    private void Infer() => Pass.Meter!.Quality(
        Column.Of<MassFlowUnit>(Flow, MassFlowUnit.KilogramPerSecond),
        Column.Of<PressureUnit>(Pressure, PressureUnit.Pascal),
        Column.Of<PressureUnit>(Differential, PressureUnit.Pascal),
        Quality,
        Status);

    /// <summary>What the meter refuses though the instrument could say it: a differential beyond the static pressure, no flow, a pressure past the critical one.</summary>
    private void CountRefused(SteamGenerator generator, HistoryTable history, SampleFaults faults)
    {
        for (int row = 0; row < Status.Length; row++)
        {
            PassSignal? refused = Status[row] switch
            {
                ReadingStatus.FlowOutOfRange => PassSignal.FeedFlow,
                ReadingStatus.PressureOutOfRange => PassSignal.OutletPressure,
                ReadingStatus.DifferentialOutOfRange => PassSignal.Differential,
                _ => null,
            };
            if (refused is not { } signal) continue;
            string tag = (Pass.Tags[signal] ?? generator.Tags[GeneratorSignal.HeaderPressure]!).Name;
            faults.Add(SampleFault.OutOfRange, history.Rows[row], tag, history[tag][row].ToString("G6", CultureInfo.InvariantCulture));
        }
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
