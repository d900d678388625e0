using TwoPhase.Units;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Dynamics;

// How the heat is split along the pass: excess air, fouling and burner settings move it between coil and bank at constant total heat.
public sealed partial class OperatingSchedule
{
    private HeatSplit _split = HeatSplit.OfThePass;

    /// <summary>A step of the convective share.</summary>
    /// <param name="at">Time of the step.</param>
    /// <param name="to">Share of the absorbed heat that the convective sections take behind it, 0 to 1.</param>
    public OperatingSchedule StepConvectiveShare(Duration at, Ratio to) => RampConvectiveShare(at, Duration.Zero, to);

    /// <summary>A ramp of the convective share from that of the pass, or of the change before it; the absorbed heat is scheduled apart.</summary>
    /// <param name="from">When it begins.</param>
    /// <param name="over">How long it takes; zero for a step.</param>
    /// <param name="to">Share of the absorbed heat that the convective sections take at its end, 0 to 1.</param>
    /// <remarks>Within the convective and within the other sections the shares keep their proportions, and the flux its shape.</remarks>
    /// <exception cref="ArgumentException">The share of a single section is scheduled.</exception>
    /// <exception cref="ArgumentOutOfRangeException">It begins before the change before it ends, or a value is outside its limits.</exception>
    public OperatingSchedule RampConvectiveShare(Duration from, Duration over, Ratio to) => RampShare(null, from, over, to);

    /// <summary>The convective share as it was recorded or worked out.</summary>
    /// <param name="time">Times since the start, not falling.</param>
    /// <param name="share">Samples, 0 to 1, or NaN.</param>
    /// <exception cref="ArgumentException">The columns differ in length, times fall, no sample is a number, one is outside its limits, or the share of a single section is scheduled.</exception>
    public OperatingSchedule WithConvectiveShare(Column<DurationUnit> time, Column<RatioUnit> share) => WithShare(null, time, share);

    /// <summary>A step of the heat share of one section.</summary>
    /// <param name="section">Name of the section.</param>
    /// <param name="at">Time of the step.</param>
    /// <param name="to">Share of the absorbed heat behind it, 0 to 1.</param>
    public OperatingSchedule StepHeatShare(string section, Duration at, Ratio to) => RampHeatShare(section, at, Duration.Zero, to);

    /// <summary>A ramp of the heat share of one section from that of the pass, or of the change before it; the absorbed heat is scheduled apart.</summary>
    /// <param name="section">Name of the section.</param>
    /// <param name="from">When it begins.</param>
    /// <param name="over">How long it takes; zero for a step.</param>
    /// <param name="to">Share of the absorbed heat at its end, 0 to 1.</param>
    /// <remarks>Sections that are not scheduled keep their proportions and take the rest; at least one must be left.</remarks>
    /// <exception cref="ArgumentException">The convective share is scheduled.</exception>
    /// <exception cref="ArgumentOutOfRangeException">It begins before the change before it ends, or a value is outside its limits.</exception>
    public OperatingSchedule RampHeatShare(string section, Duration from, Duration over, Ratio to) => RampShare(Require.NotNull(section, nameof(section)), from, over, to);

    /// <summary>The heat share of one section as it was recorded or worked out.</summary>
    /// <param name="section">Name of the section.</param>
    /// <param name="time">Times since the start, not falling.</param>
    /// <param name="share">Samples, 0 to 1, or NaN.</param>
    /// <exception cref="ArgumentException">The columns differ in length, times fall, no sample is a number, one is outside its limits, or the convective share is scheduled.</exception>
    public OperatingSchedule WithHeatShare(string section, Column<DurationUnit> time, Column<RatioUnit> share) => WithShare(Require.NotNull(section, nameof(section)), time, share);

    /// <summary>The split of the heat of a pass in time.</summary>
    internal HeatSplit Split => _split;

    private OperatingSchedule RampShare(string? section, Duration from, Duration over, Ratio to)
    {
        double value = Require.Within(to.Si(), 0, 1, ShareOf(section), Scale.None, nameof(to));
        return Changed(copy => copy._split = copy._split.With(section, copy._split.Of(section).Ramp(from, over, value, ShareOf(section)), nameof(section)));
    }

    private OperatingSchedule WithShare(string? section, Column<DurationUnit> time, Column<RatioUnit> share)
    {
        TimeCurve curve = TimeCurve.Through(time.Values, time.Unit.ToSi(), share.Values, share.Unit.ToSi(), ShareOf(section), nameof(share));
        (double low, double high) = curve.Range();
        Require.Within(low, 0, 1, $"Lowest {ShareOf(section)}", Scale.None, nameof(share));
        Require.Within(high, 0, 1, $"Highest {ShareOf(section)}", Scale.None, nameof(share));
        return Changed(copy => copy._split = copy._split.With(section, curve, nameof(section)));
    }

    private static string ShareOf(string? section) => section is null ? "convective share" : $"heat share of section '{section}'";
}
