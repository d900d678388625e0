using Backfill.Reading;
using Backfill.Writing;
using TwoPhase.Metering;

namespace Backfill.Work;

/// <summary>The buffers of one worker. They grow to the largest row group of the history and no further, however long it is.</summary>
internal sealed class Bench
{
    // Every column that a pass can have.
    private const int Columns = 5;

    public Block Block { get; } = new(Columns);

    public PassReading[] Readings { get; } = new PassReading[EstimateTable.Capacity];

    public double[] Flow { get; } = new double[EstimateTable.Capacity];

    public double[] Pressure { get; } = new double[EstimateTable.Capacity];

    public double[] Differential { get; } = new double[EstimateTable.Capacity];

    public double[] Quality { get; } = new double[EstimateTable.Capacity];

    public ReadingStatus[] Status { get; } = new ReadingStatus[EstimateTable.Capacity];

    public EstimateTable Table { get; } = new();
}
