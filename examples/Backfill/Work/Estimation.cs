using System.Diagnostics;
using Backfill.Plan;
using Backfill.Reading;
using Backfill.Writing;
using TwoPhase.Advisory;
using TwoPhase.Metering;
using TwoPhase.Units;
using UnitsNet.Units;

namespace Backfill.Work;

/// <summary>From the readings of a partition, and what the estimator knew before, to its estimates and what it knows after.</summary>
internal sealed class Estimation(Site site, PartitionReader reader, OutputFolder output, Rates rates)
{
    /// <summary>Does a partition and puts it in its place.</summary>
    /// <returns>Why there are no estimates; null where there are.</returns>
    public async Task<string?> DoAsync(Chain chain, DateOnly day, Bench bench, CancellationToken cancellation)
    {
        Partition partition = chain.On(day);
        string aside = Path.Combine(output.Begin(partition), OutputFolder.EstimatesFile);
        string? gap = null;

        // From the saved state even where the estimator is still at hand, so that an interrupted run and an uninterrupted one do the same.
        EstimatorState? before = day == chain.First ? await WarmUpAsync(chain, bench, cancellation) : output.StateAfter(chain.On(day.AddDays(-1))), after = before;
        QualityEstimator estimator = From(before, partition);
        try
        {
            await using TableWriter writer = await TableWriter.CreateAsync(aside, bench.Table.Columns, cancellation);
            await ReadAsync(estimator, partition, bench, writer, cancellation);
            after = estimator.Save();
        }
        catch (FileFault fault)
        {
            gap = fault.Message;
            await WriteGapAsync(aside, partition, gap, bench, cancellation);
        }

        output.Complete(partition, after, gap);
        return gap;
    }

    // Days before a chain that does not begin with the history: read, and not written.
    private async Task<EstimatorState?> WarmUpAsync(Chain chain, Bench bench, CancellationToken cancellation)
    {
        EstimatorState? state = null;
        for (DateOnly day = chain.WarmUpFrom; day < chain.First; day = day.AddDays(1))
        {
            QualityEstimator estimator = From(state, chain.On(day));
            try
            {
                await ReadAsync(estimator, chain.On(day), bench, null, cancellation);
                state = estimator.Save();
            }
            catch (FileFault)
            {
                // The chain that this day belongs to reports it.
            }
        }

        return state;
    }

    private QualityEstimator From(EstimatorState? state, Partition partition)
    {
        QualityEstimator estimator = site[partition.Pass].NewEstimator();
        try
        {
            if (state is not null) estimator.Restore(state);
            return estimator;
        }
        catch (FormatException error)
        {
            // Not of the history: the run must stop, not go on with a gap.
            throw new InvalidDataException($"The state before {partition} cannot be taken up: {error.Message} Remove the estimates, or their days from there on.");
        }
    }

    private async Task ReadAsync(QualityEstimator estimator, Partition partition, Bench bench, TableWriter? writer, CancellationToken cancellation)
    {
        MeasuredPass pass = site[partition.Pass];
        EstimateTable table = bench.Table;
        table.Clear();
        await foreach (Block block in reader.ReadAsync(partition, bench.Block, cancellation))
        {
            for (int from = 0; from < block.Count;)
            {
                int count = Math.Min(table.Room, block.Count - from);
                Estimate(estimator, pass, block, from, count, bench);
                from += count;
                if (table.Room == 0) await FlushAsync(table, writer, cancellation);
            }
        }

        if (table.Count > 0) await FlushAsync(table, writer, cancellation);
    }

    private void Estimate(QualityEstimator estimator, MeasuredPass pass, Block block, int from, int count, Bench bench)
    {
        for (int i = 0; i < count; i++)
        {
            PassReading reading = bench.Readings[i] = pass.Reading(block.Times[from + i], block.Columns, from + i);
            bench.Flow[i] = reading.FeedFlow?.KilogramsPerSecond ?? double.NaN;
            bench.Pressure[i] = reading.OutletPressure?.Pascals ?? double.NaN;
            bench.Differential[i] = reading.Differential?.Pascals ?? double.NaN;
        }

        long start = Stopwatch.GetTimestamp();
        pass.Meter.Quality(
            Column.Of(bench.Flow.AsSpan(0, count), MassFlowUnit.KilogramPerSecond),
            Column.Of(bench.Pressure.AsSpan(0, count), PressureUnit.Pascal),
            Column.Of(bench.Differential.AsSpan(0, count), PressureUnit.Pascal),
            bench.Quality.AsSpan(0, count),
            bench.Status.AsSpan(0, count));
        long read = Stopwatch.GetTimestamp();
        for (int i = 0; i < count; i++) bench.Table.Add(block.Times[from + i], bench.Quality[i], bench.Status[i], estimator.Update(bench.Readings[i]));
        rates.Add(count, read - start, Stopwatch.GetTimestamp() - read);
    }

    private static async Task FlushAsync(EstimateTable table, TableWriter? writer, CancellationToken cancellation)
    {
        if (writer is not null) await writer.WriteAsync(table.Count, cancellation);
        table.Clear();
    }

    private static async Task WriteGapAsync(string file, Partition partition, string reason, Bench bench, CancellationToken cancellation)
    {
        bench.Table.Clear();
        bench.Table.AddGap(partition.Start, reason);
        await using TableWriter writer = await TableWriter.CreateAsync(file, bench.Table.Columns, cancellation);
        await FlushAsync(bench.Table, writer, cancellation);
    }
}
