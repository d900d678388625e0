using System.Globalization;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>A pass at one instant of a simulation: what is true beside what the meter would indicate.</summary>
public readonly record struct PassInstant
{
    /// <summary>Time since the start of the simulation.</summary>
    public Duration Time => Duration.FromSeconds(RawTime);

    /// <summary>ṁin, feed flow.</summary>
    public MassFlow FeedFlow => MassFlow.FromKilogramsPerSecond(RawFeedFlow);

    /// <summary>Heat that the pass takes up: what the fire asks for, behind its lags.</summary>
    public Power AbsorbedHeat => Power.FromWatts(RawAbsorbedHeat);

    /// <summary>ṁout, flow through the meter: at the outlet, or at the tube end where the outlet line says so.</summary>
    public MassFlow OutletFlow => MassFlow.FromKilogramsPerSecond(RawOutletFlow);

    /// <summary>x, true quality of what leaves: equilibrium quality of the flowing enthalpy, below 0 or above 1 outside the dome.</summary>
    public MassFraction TrueQuality => MassFraction.FromDecimalFractions(RawTrueQuality);

    /// <summary>The quality that meter and feed flow indicate; null without a meter, or where they give none.</summary>
    public MassFraction? IndicatedQuality => double.IsNaN(RawIndicatedQuality) ? null : MassFraction.FromDecimalFractions(RawIndicatedQuality);

    /// <summary>Indicated minus true quality; null where nothing is indicated.</summary>
    public MassFraction? ReadingError => double.IsNaN(RawIndicatedQuality) ? null : MassFraction.FromDecimalFractions(RawIndicatedQuality - RawTrueQuality);

    /// <summary>Δp that the meter makes of outlet flow and true quality; null without a meter.</summary>
    public Pressure? Differential => double.IsNaN(RawDifferential) ? null : Pressure.FromPascals(RawDifferential);

    /// <summary>Absolute pressure where the pass ends and pressure is measured: at the outlet, or at the header behind the outlet line.</summary>
    public Pressure OutletPressure => Pressure.FromPascals(RawOutletPressure);

    /// <summary>Absolute pressure at the inlet.</summary>
    public Pressure InletPressure => Pressure.FromPascals(RawInletPressure);

    /// <summary>Water and steam held in the pass.</summary>
    public Mass Holdup => Mass.FromKilograms(RawHoldup);

    /// <summary>Distance of the boiling boundary (equilibrium quality 0) from the inlet; null when the pass nowhere boils.</summary>
    public Length? BoilingOnset => double.IsNaN(RawOnset) ? null : Length.FromMeters(RawOnset);

    /// <summary>Temperature at the outlet.</summary>
    public Temperature OutletTemperature => Temperature.FromKelvins(RawOutletTemperature);

    /// <summary>Temperature of the hottest metal, mean over the tube wall.</summary>
    public Temperature HottestMetal => Temperature.FromKelvins(RawHottestMetal);

    /// <summary>Share of the time since the row before in which the non-return valve of the outlet line was shut, 0 to 1.</summary>
    /// <remarks>Shut, it keeps the header's water and steam out; a trickle of half a per cent of the feed flow still leaves the pass, which makes its own pressure meanwhile.</remarks>
    public Ratio ValveShut => Ratio.FromDecimalFractions(RawValveShut);

    /// <summary>Mass in minus out minus the change of holdup since the start, over the mass held; round-off.</summary>
    public double MassResidual { get; init; }

    /// <summary>Energy in minus out minus the change of what water and metal store since the start, over that store; round-off.</summary>
    public double EnergyResidual { get; init; }

    internal double RawTime { get; init; }

    internal double RawFeedFlow { get; init; }

    internal double RawAbsorbedHeat { get; init; }

    internal double RawOutletFlow { get; init; }

    internal double RawTrueQuality { get; init; }

    internal double RawIndicatedQuality { get; init; }

    internal double RawDifferential { get; init; }

    internal double RawOutletPressure { get; init; }

    internal double RawInletPressure { get; init; }

    internal double RawHoldup { get; init; }

    internal double RawOnset { get; init; }

    internal double RawOutletTemperature { get; init; }

    internal double RawHottestMetal { get; init; }

    internal double RawValveShut { get; init; }

    internal object ToDump() => ToString();

    /// <summary>The instant in engineering units, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "{0:G6} s: {1:F4} kg/s in, {2:F4} kg/s out, quality {3:F4}, indicated {4}, holdup {5:F1} kg",
        RawTime,
        RawFeedFlow,
        RawOutletFlow,
        RawTrueQuality,
        double.IsNaN(RawIndicatedQuality) ? "none" : RawIndicatedQuality.ToString("F4", CultureInfo.InvariantCulture),
        RawHoldup);
}
