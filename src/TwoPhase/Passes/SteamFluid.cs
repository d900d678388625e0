using System.Runtime.CompilerServices;
using TwoPhase.Flow;
using TwoPhase.HeatTransfer;
using TwoPhase.Steam;
using TwoPhase.Steam.Backward;

namespace TwoPhase.Passes;

/// <summary>Water and steam by IAPWS-IF97.</summary>
internal readonly struct SteamFluid : IPassFluid
{
    // h at 560 to 610 °C, by the pressure: well inside region 2.
    private const double HottestVapour = 3.6e6;

    // So far [K] the slopes alone are good to 1e-10 of T; Newton gets there in one step or two.
    private const double SlopeReach = 2e-3;
    private const int GreatestSteps = 8;

    public double HighestPressure => Water97.CriticalPressure;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public SaturatedPair Saturated(double pressure)
    {
        Saturated(pressure, out SaturatedPair pair);
        return pair;
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void Saturated(double pressure, out SaturatedPair pair) => SaturatedPair.Find(pressure, out pair);

    public FluidPoint At(double pressure, double enthalpy, in SaturatedPair saturated, double near = 0)
    {
        if (saturated.Temperature <= Water97.Border13Temperature)
        {
            if (enthalpy < saturated.LiquidEnthalpy) return Liquid(pressure, enthalpy, near);
            if (enthalpy > saturated.VapourEnthalpy && enthalpy < HottestVapour) return Vapour(pressure, enthalpy, near);
        }

        return Point(Water.AtPressureEnthalpy(pressure, enthalpy));
    }

    // The phase is known: its region, from a state close by or from the backward equation, which is good to 25 mK.
    private static FluidPoint Liquid(double pressure, double enthalpy, double near)
    {
        PhaseCore phase = Region1.At(pressure, near > 0 ? near : Backward1.TemperatureFromEnthalpy(pressure, enthalpy));
        for (int i = 0; i < GreatestSteps && Math.Abs(Step(phase, enthalpy)) > SlopeReach; i++) phase = Region1.At(pressure, phase.Temperature + Step(phase, enthalpy));
        FluidPoint point = Near(phase, enthalpy);
        return point.Temperature < Water97.LowestTemperature - 1e-6 ? default : point;
    }

    private static FluidPoint Vapour(double pressure, double enthalpy, double near)
    {
        PhaseCore phase = Region2.At(pressure, near > 0 ? near : Backward2.TemperatureFromEnthalpy(pressure, enthalpy));
        for (int i = 0; i < GreatestSteps && Math.Abs(Step(phase, enthalpy)) > SlopeReach; i++) phase = Region2.At(pressure, phase.Temperature + Step(phase, enthalpy));
        return Near(phase, enthalpy);
    }

    private static double Step(in PhaseCore phase, double enthalpy) => (enthalpy - phase.Enthalpy) / phase.IsobaricHeatCapacity;

    private static FluidPoint Near(in PhaseCore phase, double enthalpy)
    {
        double rest = enthalpy - phase.Enthalpy;
        return new()
        {
            Temperature = phase.Temperature + (rest * phase.TemperatureByEnthalpy),
            SpecificVolume = phase.SpecificVolume + (rest * phase.VolumeByEnthalpy),
            VolumeByEnthalpy = phase.VolumeByEnthalpy,
            VolumeByPressure = phase.VolumeByPressure,
        };
    }

    private static FluidPoint Point(in WaterCore water) => new()
    {
        Temperature = water.Temperature,
        SpecificVolume = water.SpecificVolume,
        VolumeByEnthalpy = water.VolumeByEnthalpy,
        VolumeByPressure = water.VolumeByPressure,
    };

    public double Viscosity(double density, double temperature) => Steam.Transport.Viscosity(density, temperature);

    public double LiquidEnthalpy(double pressure, double temperature) =>
        temperature >= Water97.LowestTemperature && temperature <= Water97.Border13Temperature
            ? Region1.At(pressure, temperature).Enthalpy
            : double.NaN;

    public PhaseTransport Transport(double pressure, double enthalpy)
    {
        WaterCore water = Water.AtPressureEnthalpy(pressure, enthalpy);
        PhaseCore phase = water.IsWet ? Nearer(water) : water.Phase;
        return new(Steam.Transport.Viscosity(phase.Density, phase.Temperature), Steam.Transport.Conductivity(phase), phase.IsobaricHeatCapacity);
    }

    // What stands on the saturation line is the phase that it stands beside, on whichever side round-off puts it.
    private static PhaseCore Nearer(in WaterCore wet)
    {
        SaturationCore steam = SaturationLine.AtPressure(wet.Pressure);
        return wet.Quality < 0.5 ? steam.Liquid : steam.Vapour;
    }

    public double Film(in PhaseTransport phase, double massFlux, double bore) =>
        SinglePhaseFilm.GnielinskiCore(new(massFlux, bore, phase.Viscosity, phase.Conductivity, phase.HeatCapacity));

    public double Film(in FlowState flow, FilmModel model, double heatFlux) => model.CoefficientCore(WithHeat(flow), heatFlux);

    /// <summary>A flow with the conductivities and heat capacities of both saturated phases.</summary>
    public static FlowState WithHeat(in FlowState flow)
    {
        SaturatedHeat heat = SaturationTable.Heat(flow.Pressure);
        return flow with
        {
            LiquidConductivity = heat.LiquidConductivity,
            VapourConductivity = heat.VapourConductivity,
            LiquidHeatCapacity = heat.LiquidHeatCapacity,
            VapourHeatCapacity = heat.VapourHeatCapacity,
        };
    }
}
