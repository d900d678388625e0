using Backfill.Reading;
using Backfill.Writing;
using TwoPhase.Metering;

namespace Backfill.Work;

/// <summary>The buffers of one worker. They grow to the largest row group of the history and no further, however long it is.</summary>
internal sealed class Bench
{
    public Block Block { get; } = new(MeasuredPass.MostColumns);

    public PassReading[] Readings { get; } = new PassReading[EstimateTable.Capacity];

    public double[] Flow { get; } = new double[EstimateTable.Capacity];

    public double[] Pressure { get; } = new double[EstimateTable.Capacity];

    public double[] Differential { get; } = new double[EstimateTable.Capacity];

    public double[] Quality { get; } = new double[EstimateTable.Capacity];

    public ReadingStatus[] Status { get; } = new ReadingStatus[EstimateTable.Capacity];

    public EstimateTable Table { get; } = new();
}
