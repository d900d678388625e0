using System.Globalization;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>What is imposed on one pass: feed, outlet pressure and absorbed heat.</summary>
public readonly record struct PassConditions
{
    /// <summary>Conditions with the feed given by its temperature.</summary>
    /// <param name="feedFlow">Feed flow of the pass, greater than zero.</param>
    /// <param name="feedTemperature">Feed temperature at the inlet of the pass; the feed is liquid.</param>
    /// <param name="outletPressure">Absolute pressure at the end of the pass: behind the outlet line where there is one, that of the header where the line ends there.</param>
    /// <param name="absorbedHeat">Heat absorbed by the pass, zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its limits.</exception>
    public PassConditions(MassFlow feedFlow, Temperature feedTemperature, Pressure outletPressure, Power absorbedHeat)
    {
        RawFeedFlow = Require.Positive(feedFlow.Si(), "Feed flow", Scale.KilogramsPerSecond, nameof(feedFlow));
        RawFeedTemperature = Require.Positive(feedTemperature.Si(), "Feed temperature", Scale.Celsius, nameof(feedTemperature));
        RawFeedEnthalpy = double.NaN;
        RawOutletPressure = Require.Positive(outletPressure.Si(), "Outlet pressure", Scale.Megapascals, nameof(outletPressure));
        RawAbsorbedHeat = Require.NotNegative(absorbedHeat.Si(), "Absorbed heat", Scale.Megawatts, nameof(absorbedHeat));
    }

    /// <summary>Feed flow.</summary>
    public MassFlow FeedFlow => MassFlow.FromKilogramsPerSecond(RawFeedFlow);

    /// <summary>Feed temperature; null when the feed is given by its enthalpy.</summary>
    public Temperature? FeedTemperature => IsFeedByEnthalpy ? null : Temperature.FromKelvins(RawFeedTemperature);

    /// <summary>Feed enthalpy; null when the feed is given by its temperature.</summary>
    public SpecificEnergy? FeedEnthalpy => !IsFeedByEnthalpy ? null : SpecificEnergy.FromJoulesPerKilogram(RawFeedEnthalpy);

    /// <summary>Absolute outlet pressure.</summary>
    public Pressure OutletPressure => Pressure.FromPascals(RawOutletPressure);

    /// <summary>Absorbed heat.</summary>
    public Power AbsorbedHeat => Power.FromWatts(RawAbsorbedHeat);

    internal double RawFeedFlow { get; init; }

    internal double RawFeedTemperature { get; init; }

    internal double RawFeedEnthalpy { get; init; }

    internal bool IsFeedByEnthalpy => !double.IsNaN(RawFeedEnthalpy);

    internal double RawOutletPressure { get; init; }

    internal double RawAbsorbedHeat { get; init; }

    /// <summary>The same with another feed flow.</summary>
    /// <param name="feedFlow">Feed flow, greater than zero.</param>
    public PassConditions WithFeedFlow(MassFlow feedFlow) => this with { RawFeedFlow = Require.Positive(feedFlow.Si(), "Feed flow", Scale.KilogramsPerSecond, nameof(feedFlow)) };

    /// <summary>The same with another feed temperature.</summary>
    /// <param name="feedTemperature">Feed temperature.</param>
    public PassConditions WithFeedTemperature(Temperature feedTemperature) =>
        this with { RawFeedTemperature = Require.Positive(feedTemperature.Si(), "Feed temperature", Scale.Celsius, nameof(feedTemperature)), RawFeedEnthalpy = double.NaN };

    /// <summary>The same with the feed given by its enthalpy, as for a feed that enters flashing.</summary>
    /// <param name="feedEnthalpy">Specific enthalpy of the feed.</param>
    public PassConditions WithFeedEnthalpy(SpecificEnergy feedEnthalpy) =>
        this with { RawFeedEnthalpy = Require.Finite(feedEnthalpy.Si(), "Feed enthalpy", Scale.KilojoulesPerKilogram, nameof(feedEnthalpy)), RawFeedTemperature = double.NaN };

    /// <summary>The same with another outlet pressure.</summary>
    /// <param name="outletPressure">Absolute outlet pressure.</param>
    public PassConditions WithOutletPressure(Pressure outletPressure) => this with { RawOutletPressure = Require.Positive(outletPressure.Si(), "Outlet pressure", Scale.Megapascals, nameof(outletPressure)) };

    /// <summary>The same with other heat.</summary>
    /// <param name="absorbedHeat">Absorbed heat, zero or more.</param>
    public PassConditions WithAbsorbedHeat(Power absorbedHeat) => this with { RawAbsorbedHeat = Require.NotNegative(absorbedHeat.Si(), "Absorbed heat", Scale.Megawatts, nameof(absorbedHeat)) };

    internal object ToDump() => ToString();

    /// <summary>The conditions in engineering units, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "{0:G5} kg/s feed at {1}, outlet at {2:G5} MPa, {3:G5} MW", RawFeedFlow, IsFeedByEnthalpy ? Scale.KilojoulesPerKilogram.Text(RawFeedEnthalpy, "G5") : Scale.Celsius.Text(RawFeedTemperature, "G5"), RawOutletPressure * 1e-6, RawAbsorbedHeat * 1e-6);
}
