using TwoPhase.Passes;
using TwoPhase.Steam;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>How water of a separator was brought out as a sample: what has flashed off is missing in it, and its solids are the more concentrated.</summary>
/// <remarks>
/// <para>Flashed share y = (h − h′)/(h″ − h′) at the pressure behind the valve, h before it: a valve lets down at constant enthalpy. The sample is concentrated 1/(1 − y) times.</para>
/// <para>Range: water at rest with its vapour behind the valve. Accuracy: that of the steam tables, if all vapour leaves the sample and no water with it.</para>
/// <para>Source: energy balance; IAPWS R7-97(2012).</para>
/// <para>Water let down hot scalds: 44 % of it turns to steam at once between 10 MPa and the open air. Samples are taken through a cooler at pressure, by the site's own procedure.</para>
/// </remarks>
public readonly record struct WaterSample
{
    private WaterSample(double flashed) => RawFlashed = flashed;

    /// <summary>Cooled at pressure until nothing flashes: the right way.</summary>
    public static WaterSample CooledAtPressure { get; }

    /// <summary>Share of the mass that flashes off; zero when cooled far enough.</summary>
    public Ratio FlashedShare => Ratio.FromDecimalFractions(RawFlashed);

    /// <summary>1/(1 − y): concentration of the sample over that of the water it was taken from.</summary>
    public double ConcentrationFactor => 1 / (1 - RawFlashed);

    internal double RawFlashed { get; }

    /// <summary>Let down hot, straight from saturation.</summary>
    /// <param name="from">Absolute pressure of the separator.</param>
    /// <param name="to">Absolute pressure behind the valve, below that before it.</param>
    /// <exception cref="ArgumentOutOfRangeException">A pressure is outside its limits.</exception>
    public static WaterSample LetDownHot(Pressure from, Pressure to) => Flashed(SaturationLine.AtPressure(Domain.SaturationPressure(from, nameof(from))).Liquid.Enthalpy, from, to);

    /// <summary>Let down after a cooler that did not cool it all the way.</summary>
    /// <param name="cooled">Temperature before the valve, below saturation.</param>
    /// <param name="from">Absolute pressure before the valve.</param>
    /// <param name="to">Absolute pressure behind the valve, below that before it.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its limits.</exception>
    public static WaterSample LetDownFrom(Temperature cooled, Pressure from, Pressure to)
    {
        double p = Domain.SaturationPressure(from, nameof(from));
        double t = Require.Within(cooled.Si(), Water97.LowestTemperature, SaturationLine.Temperature(p), "Temperature before the valve", Scale.Celsius, nameof(cooled));
        return Flashed(default(SteamFluid).LiquidEnthalpy(p, t), from, to);
    }

    internal object ToDump() => ToString();

    /// <summary>The share in a line, invariant culture.</summary>
    public override string ToString() => FormattableString.Invariant($"{RawFlashed:P1} flashed off, concentrated {ConcentrationFactor:F2} times");

    private static WaterSample Flashed(double enthalpy, Pressure from, Pressure to)
    {
        double behind = Domain.SaturationPressure(to, nameof(to));
        Require.Below(behind, from.Si(), "Pressure behind the valve", Scale.Megapascals, nameof(to));
        return new(Math.Max(0, SaturationLine.AtPressure(behind).EquilibriumQuality(enthalpy)));   // below 0 it stays liquid
    }
}
