using TwoPhase.Units;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Dynamics;

// From columns of history: straight between samples, the first before and the last after them; samples that are no numbers are left out.
public sealed partial class OperatingSchedule
{
    /// <summary>The feed flow as it was recorded.</summary>
    /// <param name="time">Times since the start, not falling.</param>
    /// <param name="flow">Samples, each greater than zero or NaN.</param>
    /// <exception cref="ArgumentException">The columns differ in length, times fall, no sample is a number, or one is outside its limits.</exception>
    public OperatingSchedule WithFeedFlow(Column<DurationUnit> time, Column<MassFlowUnit> flow)
    {
        TimeCurve curve = TimeCurve.Through(time.Values, time.Unit.ToSi(), flow.Values, flow.Unit.ToSi(), "feed flow", nameof(flow));
        Require.Positive(curve.Range().Low, "Lowest feed flow", Scale.KilogramsPerSecond, nameof(flow));
        return Changed(copy => copy._flow = curve);
    }

    /// <summary>The feed temperature as it was recorded.</summary>
    /// <param name="time">Times since the start, not falling.</param>
    /// <param name="temperature">Samples; NaN for a missing one.</param>
    /// <exception cref="ArgumentException">The feed at the start is given by its enthalpy, the columns differ in length, times fall, no sample is a number, or one is outside its limits.</exception>
    public OperatingSchedule WithFeedTemperature(Column<DurationUnit> time, Column<TemperatureUnit> temperature)
    {
        CheckFeed(nameof(temperature));
        TimeCurve curve = TimeCurve.Through(time.Values, time.Unit.ToSi(), temperature.Values, temperature.Unit.ToSi(), "feed temperature", nameof(temperature));
        Require.Positive(curve.Range().Low, "Lowest feed temperature", Scale.Celsius, nameof(temperature));
        return Changed(copy => copy._temperature = curve);
    }

    /// <summary>The outlet pressure as it was recorded.</summary>
    /// <param name="time">Times since the start, not falling.</param>
    /// <param name="pressure">Samples, absolute, each greater than zero or NaN.</param>
    /// <exception cref="ArgumentException">The columns differ in length, times fall, no sample is a number, or one is outside its limits.</exception>
    public OperatingSchedule WithOutletPressure(Column<DurationUnit> time, Column<PressureUnit> pressure)
    {
        TimeCurve curve = TimeCurve.Through(time.Values, time.Unit.ToSi(), pressure.Values, pressure.Unit.ToSi(), "outlet pressure", nameof(pressure));
        Require.Positive(curve.Range().Low, "Lowest outlet pressure", Scale.Megapascals, nameof(pressure));
        return Changed(copy => copy._pressure = curve);
    }

    /// <summary>The absorbed heat in time.</summary>
    /// <param name="time">Times since the start, not falling.</param>
    /// <param name="heat">Samples, each zero or more or NaN.</param>
    /// <exception cref="ArgumentException">The columns differ in length, times fall, no sample is a number, or one is outside its limits.</exception>
    public OperatingSchedule WithAbsorbedHeat(Column<DurationUnit> time, Column<PowerUnit> heat)
    {
        TimeCurve curve = TimeCurve.Through(time.Values, time.Unit.ToSi(), heat.Values, heat.Unit.ToSi(), "absorbed heat", nameof(heat));
        Require.NotNegative(curve.Range().Low, "Lowest absorbed heat", Scale.Megawatts, nameof(heat));
        return Changed(copy => copy._heat = curve);
    }

    /// <summary>The firing as it was recorded, the heat taken as proportional to it.</summary>
    /// <param name="time">Times since the start, not falling.</param>
    /// <param name="firing">Samples, each zero or more or NaN.</param>
    /// <param name="heatAtFullFiring">Heat that the pass absorbs at 100 % firing.</param>
    /// <exception cref="ArgumentException">The columns differ in length, times fall, no sample is a number, or one is outside its limits.</exception>
    public OperatingSchedule WithFiring(Column<DurationUnit> time, Column<RatioUnit> firing, Power heatAtFullFiring)
    {
        double heat = Require.Positive(heatAtFullFiring.Si(), "Heat at full firing", Scale.Megawatts, nameof(heatAtFullFiring));
        TimeCurve curve = TimeCurve.Through(time.Values, time.Unit.ToSi(), firing.Values, firing.Unit.ToSi().Times(heat), "firing", nameof(firing));
        Require.NotNegative(curve.Range().Low / heat, "Lowest firing", Scale.None, nameof(firing));
        return Changed(copy => copy._heat = curve);
    }
}
