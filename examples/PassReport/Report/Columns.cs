using PassReport.History;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;

namespace PassReport.Report;

/// <summary>Which column of the history holds which signal, and in which unit.</summary>
internal sealed class Columns
{
    private readonly (ReadingFormat Format, (PassSignal Signal, string Tag)[] Tags)[] _passes;
    private readonly GeneratorFormat _generator;
    private readonly (GeneratorSignal Signal, string Tag)[] _shared;

    private Columns(SteamGenerator generator, HistoryTable history)
    {
        _passes = [.. generator.Passes.Select(pass => (new ReadingFormat(InUnits(pass.Tags, TagSet.OfPass, history), generator.Basis), pass.Tags.Select(tag => (tag.Key, tag.Value.Name)).ToArray()))];
        _generator = new GeneratorFormat(InUnits(generator.Tags, TagSet.OfGenerator, history), generator.Basis);
        _shared = [.. generator.Tags.Select(tag => (tag.Key, tag.Value.Name))];
    }

    public static Columns Of(SteamGenerator generator, HistoryTable history, string file)
    {
        try
        {
            return new Columns(generator, history);
        }
        catch (FormatException error)
        {
            throw new FileFault(file, "row 1", error.Message.TrimEnd('.'));
        }
    }

    public GeneratorReading Read(HistoryTable history, int row, SampleFaults faults)
    {
        var passes = new PassReading[_passes.Length];
        for (int i = 0; i < passes.Length; i++)
        {
            (ReadingFormat format, (PassSignal Signal, string Tag)[] tags) = _passes[i];
            PassReading reading = new(history.Times[row], null, null);
            foreach ((PassSignal signal, string tag) in tags)
            {
                reading = format.Add(reading, signal, history[tag][row]);
                Count(reading.Status(signal), history, row, tag, faults);
            }

            passes[i] = reading;
        }

        var all = new GeneratorReading(history.Times[row], passes);
        foreach ((GeneratorSignal signal, string tag) in _shared)
        {
            all = _generator.Add(all, signal, history[tag][row]);
            Count(all.Status(signal), history, row, tag, faults);
        }

        return all;
    }

    private static void Count(SignalStatus status, HistoryTable history, int row, string tag, SampleFaults faults)
    {
        if (status == SignalStatus.OutOfRange) faults.Add(SampleFault.OutOfRange, history.Rows[row], tag, history[tag][row].ToString("G6", System.Globalization.CultureInfo.InvariantCulture));
    }

    private static TagSet<TSignal> InUnits<TSignal>(TagSet<TSignal> tags, TagSet<TSignal> empty, HistoryTable history)
        where TSignal : struct, Enum =>
        tags.Aggregate(empty, (set, tag) => set.With(tag.Key, history.Tags[tag.Value.Name]));
}
