using TwoPhase.Advisory;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;

namespace Backfill;

/// <summary>A pass with the columns that its readings stand in.</summary>
internal sealed class MeasuredPass
{
    /// <summary>The most columns that a pass can have.</summary>
    public const int MostColumns = 5;

    // In the order in which ReadingFormat takes them.
    private static readonly PassSignal[] Signals = [PassSignal.FeedFlow, PassSignal.FeedTemperature, PassSignal.Firing, PassSignal.OutletPressure, PassSignal.Differential];

    private readonly int[] _places;

    public MeasuredPass(SteamGenerator generator, Pass pass)
    {
        Pass = pass;
        Meter = pass.Meter ?? throw new ArgumentException($"Pass '{pass.Name}' has no meter.");
        TagSet<PassSignal> tags = generator.TagsOf(pass);   // what the passes share stands in the files of each
        foreach (PassSignal signal in Signals)
        {
            if (signal != PassSignal.Firing && tags[signal] is null) throw new ArgumentException($"Pass '{pass.Name}' has no tag for its {signal}, nor has the generator.");
        }

        Format = new(tags, generator.Basis);
        PassSignal[] measured = [.. Signals.Where(signal => tags[signal] is not null)];
        Columns = [.. measured.Select(signal => tags[signal]!.Name)];
        _places = [.. Signals.Select(signal => Array.IndexOf(measured, signal))];
        _ = NewEstimator();   // says now what is missing of its tubes
    }

    public Pass Pass { get; }

    public QualityMeter Meter { get; }

    public ReadingFormat Format { get; }

    /// <summary>The columns that a file of this pass must have, beside the time.</summary>
    public IReadOnlyList<string> Columns { get; }

    public QualityEstimator NewEstimator() => new(Pass, Meter);

    /// <summary>The reading of a row of those columns.</summary>
    public PassReading Reading(DateTime time, double[][] columns, int row) => Format.Read(
        time, Value(columns, 0, row), Value(columns, 1, row), Value(columns, 2, row), Value(columns, 3, row), Value(columns, 4, row));

    private double Value(double[][] columns, int signal, int row) => _places[signal] is var place and >= 0 ? columns[place][row] : double.NaN;
}
