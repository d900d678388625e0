using TwoPhase.Flow;
using TwoPhase.Friction;
using TwoPhase.Slip;
using TwoPhase.Units;

namespace TwoPhase.Passes;

/// <summary>What the flow is at one place of a pass, from pressure and enthalpy: the closure that every solver shares.</summary>
internal static class LocalFlow
{
    public static PassNode At<TFluid>(in TFluid fluid, VoidFractionModel slip, FrictionModel friction, in Duct duct, double massFlux, double pressure, double enthalpy)
        where TFluid : struct, IPassFluid
    {
        SaturatedPair pair = fluid.Saturated(pressure);
        double equilibrium = pair.Quality(enthalpy), x = equilibrium <= 0 ? 0 : equilibrium >= 1 ? 1 : equilibrium;
        double temperature = pair.Temperature, liquidDensity = 1 / pair.LiquidVolume, vapourDensity = 1 / pair.VapourVolume;
        double liquidViscosity = pair.LiquidViscosity, vapourViscosity = pair.VapourViscosity;
        bool wet = equilibrium > 0 && equilibrium < 1;
        if (!wet)
        {
            FluidPoint point = fluid.At(pressure, enthalpy, pair);
            if (!(point.Temperature > 0)) return new() { Enthalpy = enthalpy, EquilibriumQuality = equilibrium, Flow = new() { Pressure = pressure, MassFlux = massFlux } };
            double density = 1 / point.SpecificVolume, viscosity = fluid.Viscosity(density, point.Temperature);
            temperature = point.Temperature;
            if (x == 0) (liquidDensity, liquidViscosity) = (density, viscosity);
            else (vapourDensity, vapourViscosity) = (density, viscosity);
        }

        var flow = new FlowState
        {
            Pressure = pressure,
            SaturationTemperature = pair.Temperature,
            LiquidDensity = liquidDensity,
            VapourDensity = vapourDensity,
            LiquidViscosity = liquidViscosity,
            VapourViscosity = vapourViscosity,
            LatentHeat = pair.LatentHeat,
            SurfaceTension = pair.SurfaceTension,
            Quality = x,
            MassFlux = massFlux,
            Bore = duct.Bore,
            Inclination = duct.Inclination,
        };
        double alpha = wet ? slip.VoidFractionCore(flow) : x;
        double gradient = wet ? friction.GradientCore(flow, duct.Roughness)
            : x == 0 ? FrictionFactor.GradientCore(massFlux, duct.Bore, liquidDensity, liquidViscosity, duct.Roughness)
            : FrictionFactor.GradientCore(massFlux, duct.Bore, vapourDensity, vapourViscosity, duct.Roughness);
        return new()
        {
            Enthalpy = enthalpy,
            Temperature = temperature,
            EquilibriumQuality = equilibrium,
            VoidFraction = alpha,
            Friction = gradient * duct.FrictionMultiplier,
            Fittings = LocalLoss.Core(flow, duct.OtherLoss, 1) + LocalLoss.Core(flow, duct.BendLoss, duct.BendB),
            Gravity = SiDoor.StandardGravity * duct.Rise * ((alpha * vapourDensity) + ((1 - alpha) * liquidDensity)),
            Flow = flow,
        };
    }
}
