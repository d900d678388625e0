using FsCheck.Xunit;
using TwoPhase.Steam;

namespace TwoPhase.Tests.Steam;

/// <summary>Every derivative against a fourth-order difference of what it is the derivative of.</summary>
[Properties(Arbitrary = [typeof(StatePoints)], MaxTest = 300)]
public class DerivativeTests
{
    [Property]
    public void PhaseCore_AlongIsobar_MatchesDifferences(PlanePoint point)
    {
        if (IsDense(point)) return;
        PhaseCore phase = point.State.Phase;
        double p = point.Pressure, step = 2e-4 * point.Temperature;
        Same(phase.IsobaricHeatCapacity, Slope(t => Near(phase, p, t).Enthalpy, point.Temperature, step), 0, "cp");
        Same(phase.IsobaricHeatCapacity / point.Temperature, Slope(t => Near(phase, p, t).Entropy, point.Temperature, step), 0, "cp/T");
        Same(phase.VolumeByTemperature, Slope(t => Near(phase, p, t).SpecificVolume, point.Temperature, step), 1e-5 * phase.SpecificVolume / point.Temperature, "dv/dT");
    }

    [Property]
    public void PhaseCore_AlongIsotherm_MatchesDifferences(PlanePoint point)
    {
        if (IsDense(point)) return;
        PhaseCore phase = point.State.Phase;
        double t = point.Temperature, step = StepOfPressure(phase);
        Same(phase.VolumeByPressureAtTemperature, Slope(p => Near(phase, p, t).SpecificVolume, point.Pressure, step), 0, "dv/dp");
        Same(phase.EnthalpyByPressureAtTemperature, Slope(p => Near(phase, p, t).Enthalpy, point.Pressure, step), 1e-4 * phase.SpecificVolume, "dh/dp");

        // Maxwell: (∂s/∂p)T = −(∂v/∂T)p.
        Same(-phase.VolumeByTemperature, Slope(p => Near(phase, p, t).Entropy, point.Pressure, step), 1e-5 * phase.SpecificVolume / t, "ds/dp");
    }

    [Property]
    public void IsochoricHeatCapacity_AnyState_IsTheSlopeOfInternalEnergy(PlanePoint point)
    {
        if (IsDense(point)) return;
        PhaseCore phase = point.State.Phase;

        // At constant v the pressure follows (∂p/∂T)v.
        double step = Math.Min(1e-3 * phase.Temperature, 0.1 * StepOfPressure(phase) / Math.Abs(phase.PressureByTemperature));
        Same(phase.IsochoricHeatCapacity, Slope(t => AtVolume(phase, t).InternalEnergy, phase.Temperature, step), 0, "cv");
        Same(phase.PressureByTemperature, Slope(t => AtVolume(phase, t).Pressure, phase.Temperature, step), 1e-5 * Math.Abs(phase.BulkModulus / phase.Temperature), "dp/dT");
    }

    [Property]
    public void SpeedOfSound_AnyState_IsTheIsentropicSlope(PlanePoint point)
    {
        if (IsDense(point)) return;
        PhaseCore phase = point.State.Phase;

        // (∂v/∂p)s = (∂v/∂p)T + (∂v/∂T)p² T/cp = −v²/w².
        double slope = phase.VolumeByPressureAtTemperature + (phase.VolumeByTemperature * phase.VolumeByTemperature * phase.Temperature / phase.IsobaricHeatCapacity);
        Approx.Relative(phase.SpecificVolume * phase.SpecificVolume / -slope, phase.SpeedOfSound * phase.SpeedOfSound, 1e-9, point.ToString());
        Approx.Relative(phase.SpeedOfSound * phase.SpeedOfSound / (phase.Pressure * phase.SpecificVolume), phase.IsentropicExponent, 1e-12, point.ToString());

        // cv from cp and the p-v-T slopes.
        double cv = phase.IsobaricHeatCapacity + (phase.Temperature * phase.VolumeByTemperature * phase.VolumeByTemperature / phase.VolumeByPressureAtTemperature);
        Approx.Relative(cv, phase.IsochoricHeatCapacity, 1e-9, point.ToString());
    }

    [Property]
    public void Region3_AnyDensity_MatchesDifferences(PlanePoint point)
    {
        // Temperatures 623 to 863 K and densities 100 to 760 kg/m³ from the point's share of the plane.
        double t = 623.15 + (240 * (point.Temperature - 273.15) / 2000), rho = 100 + (660 * Math.Log(point.Pressure / 100) / Math.Log(1e6));
        PhaseCore phase = Region3.At(rho, t);
        double dt = 0.02, dRho = 1e-3 * rho, scale = rho * Water97.GasConstant;
        Same(phase.PressureByTemperature, Slope(x => Region3.At(rho, x).Pressure, t, dt), 1e-6 * scale, "dp/dT");
        Same(phase.BulkModulus, rho * Slope(x => Region3.At(x, t).Pressure, rho, dRho), 1e-6 * scale * t, "ρ dp/dρ");
        Same(phase.IsochoricHeatCapacity, Slope(x => Region3.At(rho, x).InternalEnergy, t, dt), 0, "cv");
        Same(phase.IsochoricHeatCapacity / t, Slope(x => Region3.At(rho, x).Entropy, t, dt), 0, "cv/T");
        Same(-phase.PressureByTemperature / (rho * rho), Slope(x => Region3.At(x, t).Entropy, rho, dRho), 1e-6 * Water97.GasConstant / rho, "ds/dρ");
    }

    [Property]
    public void WaterCore_OnePhase_MatchesDifferencesOfThePressureEnthalpyDoor(PlanePoint point)
    {
        WaterCore state = point.State;
        double p = state.Pressure, h = state.Enthalpy, stepOfPressure = Math.Min(1e-3 * p, StepOfPressure(state.Phase)), stepOfEnthalpy = 0.3 * state.Phase.IsobaricHeatCapacity;
        if (IsDense(point) || !StaysIn(state, p, h, 2 * stepOfPressure, 2 * stepOfEnthalpy)) return;
        AllFour(state, p, h, stepOfPressure, stepOfEnthalpy);
    }

    [Property]
    public void WaterCore_WetSteam_MatchesDifferencesOfThePressureEnthalpyDoor(WetPoint point)
    {
        WaterCore state = point.State;
        double p = state.Pressure, h = state.Enthalpy, stepOfPressure = 1e-4 * p, stepOfEnthalpy = 1e-3 * 1e5;
        if (p > 21.5e6 || !StaysIn(state, p, h, 2 * stepOfPressure, 2 * stepOfEnthalpy)) return;
        AllFour(state, p, h, stepOfPressure, stepOfEnthalpy);
    }

    [Property]
    public void SaturationCore_AlongTheLine_MatchesDifferences(WetPoint point)
    {
        double p = point.Pressure, step = 1e-4 * p;
        if (p > 21.5e6 || p < 620 || Math.Abs(p - 16.529e6) < 3 * step) return;
        SaturationCore steam = SaturationLine.AtPressure(p);
        double slope = steam.TemperatureByPressure;
        Same(slope, Slope(SaturationLine.Temperature, p, step), 0, "dTs/dp");
        Same(steam.Liquid.EnthalpyAlong(slope), Slope(x => SaturationLine.AtPressure(x).Liquid.Enthalpy, p, step), 0, "dh'/dp");
        Same(steam.Vapour.EnthalpyAlong(slope), Slope(x => SaturationLine.AtPressure(x).Vapour.Enthalpy, p, step), 1e-3 * steam.Vapour.SpecificVolume, "dh\"/dp");
        Same(steam.Liquid.VolumeAlong(slope), Slope(x => SaturationLine.AtPressure(x).Liquid.SpecificVolume, p, step), 1e-5 * steam.Liquid.SpecificVolume / p, "dv'/dp");
        Same(steam.Vapour.VolumeAlong(slope), Slope(x => SaturationLine.AtPressure(x).Vapour.SpecificVolume, p, step), 0, "dv\"/dp");
    }

    [Property]
    public void Saturation_BelowRegion3_ObeysClapeyronWithinTheFormulation(WetPoint point)
    {
        if (point.Pressure > 16.529e6) return;
        SaturationCore steam = SaturationLine.AtPressure(point.Pressure);
        double clapeyron = steam.Temperature * (steam.Vapour.SpecificVolume - steam.Liquid.SpecificVolume) / steam.LatentHeat;

        // The saturation-pressure equation and the Gibbs energies of regions 1 and 2 were fitted apart; they differ by 1.6e-4 at most.
        Approx.Relative(clapeyron, steam.TemperatureByPressure, 1.7e-4, point.ToString());
    }

    private static void AllFour(in WaterCore state, double p, double h, double stepOfPressure, double stepOfEnthalpy)
    {
        double scaleOfVolume = state.SpecificVolume / p, scaleOfTemperature = state.Temperature / p;
        Same(state.VolumeByEnthalpy, Slope(x => Water.AtPressureEnthalpy(p, x).SpecificVolume, h, stepOfEnthalpy), 1e-10 * state.SpecificVolume / stepOfEnthalpy, "dv/dh");
        Same(state.TemperatureByEnthalpy, Slope(x => Water.AtPressureEnthalpy(p, x).Temperature, h, stepOfEnthalpy), 1e-12, "dT/dh");
        Same(state.VolumeByPressure, Slope(x => Water.AtPressureEnthalpy(x, h).SpecificVolume, p, stepOfPressure), 1e-7 * scaleOfVolume, "dv/dp");
        Same(state.TemperatureByPressure, Slope(x => Water.AtPressureEnthalpy(x, h).Temperature, p, stepOfPressure), 1e-7 * scaleOfTemperature, "dT/dp");
    }

    private static bool StaysIn(WaterCore state, double p, double h, double dp, double dh) =>
        Water.AtPressureEnthalpy(p - dp, h).Region == state.Region && Water.AtPressureEnthalpy(p + dp, h).Region == state.Region
        && Water.AtPressureEnthalpy(p, h - dh).Region == state.Region && Water.AtPressureEnthalpy(p, h + dh).Region == state.Region;

    // Region 3 is a function of ρ and T: it has its own differences, above.
    private static bool IsDense(PlanePoint point) => point.State.Region == 3;

    // The equation of the phase's own region, a little beyond its border too.
    private static PhaseCore Near(in PhaseCore phase, double pressure, double temperature) =>
        Water.AtPressureTemperature(phase.Pressure, phase.Temperature).Region switch
        {
            1 => Region1.At(pressure, temperature),
            2 => Region2.At(pressure, temperature),
            _ => Region5.At(pressure, temperature),
        };

    private static PhaseCore AtVolume(in PhaseCore phase, double temperature)
    {
        double pressure = phase.Pressure + (phase.PressureByTemperature * (temperature - phase.Temperature));
        for (int i = 0; i < 4; i++)
        {
            PhaseCore trial = Near(phase, pressure, temperature);
            pressure += (trial.SpecificVolume - phase.SpecificVolume) / trial.SpecificVolume * trial.BulkModulus;
        }

        return Near(phase, pressure, temperature);
    }

    private static double StepOfPressure(in PhaseCore phase) => 1e-3 * Math.Min(phase.BulkModulus, 1e9);

    // Five points, fourth order.
    private static double Slope(Func<double, double> function, double x, double step) =>
        ((8 * (function(x + step) - function(x - step))) - (function(x + (2 * step)) - function(x - (2 * step)))) / (12 * step);

    private static void Same(double analytic, double difference, double floor, string what) =>
        Approx.Absolute(analytic, difference, (1e-6 * Math.Abs(analytic)) + floor, what);
}
