using System.Globalization;
using System.Runtime.ExceptionServices;
using System.Text;
using TwoPhase.Dynamics;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>The same disturbances of one pass with each source of its quality trim, side by side: how far the true quality goes.</summary>
/// <remarks>What <see cref="TrimLoop"/> says of itself holds here: a study, no controller configuration, and no claim for any source.</remarks>
public sealed class TrimStudy
{
    private static readonly TrimSource[] Sources = [TrimSource.None, TrimSource.Raw, TrimSource.Corrected, TrimSource.Blended];

    private readonly TrimHistory[] _histories;

    private TrimStudy(IReadOnlyList<TrimDisturbance> disturbances, TrimHistory[] histories) => (Disturbances, _histories) = (disturbances, histories);

    /// <summary>What stands below every table.</summary>
    public static string Caution =>
        "A study of one simulated pass, not a controller configuration. The raw reading carries lead, the corrected value comes late: neither controls better as such. " +
        "The estimator of this study knows the pass better than that of a plant. A controlled variable needs a fallback for when its value cannot be believed.";

    /// <summary>The disturbances, in the order given.</summary>
    public IReadOnlyList<TrimDisturbance> Disturbances { get; }

    /// <summary>Runs all of them, on all processors.</summary>
    /// <param name="pass">The pass, with its meter.</param>
    /// <param name="disturbances">What happens to it, at least one.</param>
    /// <param name="duration">How long each run takes.</param>
    /// <param name="settings">How the trim moves the flow; null for the defaults.</param>
    /// <param name="options">How the pass is simulated; null for the defaults.</param>
    /// <param name="knownAs">The pass as the estimator knows it; null for as it is.</param>
    /// <exception cref="ArgumentException">There is no disturbance, or one of them or the pass cannot be run.</exception>
    public static TrimStudy Of(Pass pass, IReadOnlyList<TrimDisturbance> disturbances, Duration duration, TrimSettings? settings = null, SimulatorOptions? options = null, Pass? knownAs = null)
    {
        Require.NotNull(pass, nameof(pass));
        if (Require.NotNull(disturbances, nameof(disturbances)).Count == 0) throw new ArgumentException("A study needs a disturbance.", nameof(disturbances));
        var histories = new TrimHistory[disturbances.Count * Sources.Length];
        try
        {
            Parallel.For(0, histories.Length, i =>
            {
                OperatingSchedule schedule = disturbances[i / Sources.Length].Schedule;
                histories[i] = new TrimLoop(pass, schedule.Start, Sources[i % Sources.Length], settings, options, knownAs).Run(schedule, duration);
            });
        }
        catch (AggregateException several)
        {
            ExceptionDispatchInfo.Capture(several.InnerExceptions[0]).Throw();   // the same as without threads
        }

        return new([.. disturbances], histories);
    }

    /// <summary>What one disturbance did with one source.</summary>
    /// <param name="disturbance">Its index.</param>
    /// <param name="source">The source.</param>
    /// <exception cref="ArgumentOutOfRangeException">There is no such disturbance.</exception>
    public TrimHistory this[int disturbance, TrimSource source]
    {
        get
        {
            Require.Within(disturbance, 0, Disturbances.Count - 1, "Index of the disturbance", Scale.None, nameof(disturbance));
            return _histories[(disturbance * Sources.Length) + Array.IndexOf(Sources, source)];
        }
    }

    internal object ToDump() => ToString();

    /// <summary>The table of peak deviations of the true quality [points], a row for each disturbance and a column for each source, and the caution below it; invariant culture.</summary>
    public override string ToString()
    {
        int width = Math.Max("disturbance".Length, Disturbances.Max(disturbance => disturbance.Name.Length));
        var text = new StringBuilder("disturbance".PadRight(width));
        foreach (TrimSource source in Sources) text.Append(Heading(source).PadLeft(14));
        text.AppendLine();
        for (int i = 0; i < Disturbances.Count; i++)
        {
            text.Append(Disturbances[i].Name.PadRight(width));
            foreach (TrimSource source in Sources) text.Append((Text(this[i, source]) + (this[i, source].RawHeld > 0 ? " h" : "")).PadLeft(14));
            text.AppendLine();
        }

        return text.AppendLine("Peak deviation of the true quality in points; h: the trim was without a value for a time.").Append(Caution).ToString();
    }

    private static string Heading(TrimSource source) => source switch { TrimSource.Raw => "raw", TrimSource.Corrected => "corrected", TrimSource.Blended => "blended", _ => "no trim" };

    private static string Text(TrimHistory history) => history.End == SimulationEnd.Completed ? (100 * history.RawPeak).ToString("+0.00;-0.00", CultureInfo.InvariantCulture) : "ended";
}
