using TwoPhase.Units;
using UnitsNet.Units;

namespace TwoPhase.Metering;

/// <summary>
/// The units of the columns or tags of one pass, checked once, so that each sample turns into a <see cref="PassReading"/>
/// without a search and without an exception.
/// </summary>
/// <remarks>A number that is NaN is a missing value, one that the quantity cannot have is out of range: both are statuses.</remarks>
public sealed class ReadingFormat
{
    private readonly LinearMap?[] _maps = new LinearMap?[PassSignals.Count];

    /// <summary>A format from units of single quantities; pressures are absolute.</summary>
    /// <param name="flow">Unit of the feed flow.</param>
    /// <param name="feedTemperature">Unit of the feed temperature.</param>
    /// <param name="firing">Unit of the firing.</param>
    /// <param name="pressure">Unit of the absolute outlet pressure.</param>
    /// <param name="differential">Unit of the differential pressure.</param>
    public ReadingFormat(MassFlowUnit flow, TemperatureUnit feedTemperature, RatioUnit firing, PressureUnit pressure, PressureUnit differential)
    {
        _maps[(int)PassSignal.FeedFlow] = flow.ToSi();
        _maps[(int)PassSignal.FeedTemperature] = feedTemperature.ToSi();
        _maps[(int)PassSignal.Firing] = firing.ToSi();
        _maps[(int)PassSignal.OutletPressure] = pressure.ToSi();
        _maps[(int)PassSignal.Differential] = differential.ToSi();
    }

    /// <summary>A format from unit texts as plants write them, with their basis: <c>m3/d at 15 degC</c>, <c>psig</c>, <c>% of 75 kPa</c>.</summary>
    /// <param name="flow">Unit of the feed flow.</param>
    /// <param name="feedTemperature">Unit of the feed temperature.</param>
    /// <param name="firing">Unit of the firing.</param>
    /// <param name="pressure">Unit of the outlet pressure, gauge or absolute.</param>
    /// <param name="differential">Unit of the differential pressure.</param>
    /// <param name="basis">What the site agreed; null for nothing.</param>
    /// <exception cref="FormatException">A text is no such unit, has two meanings or leaves out its basis; the message names the column.</exception>
    public ReadingFormat(string flow, string feedTemperature, string firing, string pressure, string differential, UnitBasis? basis = null)
        : this(
            TagSet.OfPass
                .With(PassSignal.FeedFlow, new Tag("flow", flow))
                .With(PassSignal.FeedTemperature, new Tag("feed temperature", feedTemperature))
                .With(PassSignal.Firing, new Tag("firing", firing))
                .With(PassSignal.OutletPressure, new Tag("pressure", pressure))
                .With(PassSignal.Differential, new Tag("differential", differential)),
            basis)
    {
    }

    /// <summary>A format from the tags of a pass.</summary>
    /// <param name="tags">The tags, each with its unit.</param>
    /// <param name="basis">What the site agreed; null for nothing.</param>
    /// <exception cref="FormatException">A tag's unit is none of its signal, has two meanings or leaves out its basis; the message names the tag.</exception>
    public ReadingFormat(TagSet<PassSignal> tags, UnitBasis? basis = null)
    {
        foreach (KeyValuePair<PassSignal, Tag> entry in Require.NotNull(tags, nameof(tags)))
        {
            _maps[(int)entry.Key] = entry.Value.Map(PassSignals.Kind(entry.Key), basis ?? UnitBasis.None);
        }
    }

    /// <summary>One sample of the five usual columns. Never throws.</summary>
    /// <param name="time">When.</param>
    /// <param name="flow">Feed flow; NaN when missing.</param>
    /// <param name="feedTemperature">Feed temperature; NaN when missing.</param>
    /// <param name="firing">Firing; NaN when missing.</param>
    /// <param name="pressure">Outlet pressure; NaN when missing.</param>
    /// <param name="differential">Differential pressure; NaN when missing.</param>
    public PassReading Read(DateTimeOffset time, double flow, double feedTemperature, double firing, double pressure, double differential)
    {
        PassReading reading = Add(new PassReading(time), PassSignal.FeedFlow, flow);
        reading = Add(reading, PassSignal.FeedTemperature, feedTemperature);
        reading = Add(reading, PassSignal.Firing, firing);
        reading = Add(reading, PassSignal.OutletPressure, pressure);
        return Add(reading, PassSignal.Differential, differential);
    }

    /// <summary>A reading with one more raw number read into it. Never throws for a number; a signal without a tag stays missing.</summary>
    /// <param name="reading">The reading so far.</param>
    /// <param name="signal">What the number is of.</param>
    /// <param name="raw">The number in the tag's unit; NaN when missing.</param>
    public PassReading Add(in PassReading reading, PassSignal signal, double raw) =>
        MapOf(signal) is { } map ? reading.With(signal, map.Map(raw)) : reading;

    /// <summary>Whether the format has a unit for a signal.</summary>
    /// <param name="signal">The signal.</param>
    public bool Reads(PassSignal signal) => MapOf(signal) is not null;

    private LinearMap? MapOf(PassSignal signal) => (uint)signal < (uint)_maps.Length ? _maps[(int)signal] : null;
}
