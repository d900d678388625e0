using TwoPhase.Flow;
using TwoPhase.Friction;
using TwoPhase.Slip;
using TwoPhase.Units;

namespace TwoPhase.Passes;

/// <summary>What the flow is at one place of a pass, from pressure and enthalpy: the closure that every solver shares.</summary>
internal static class LocalFlow
{
    /// <summary>The flow at p and h in a duct.</summary>
    /// <param name="fluid">The fluid.</param>
    /// <param name="slip">Void fraction.</param>
    /// <param name="friction">Friction.</param>
    /// <param name="duct">The duct.</param>
    /// <param name="massFlux">G [kg/(m²·s)].</param>
    /// <param name="pressure">p [Pa].</param>
    /// <param name="enthalpy">h [J/kg].</param>
    /// <param name="near">T of a state close by [K], which spares a search; 0 for none.</param>
    /// <param name="edge">So near in quality to where boiling begins or ends the flow counts as saturated and of one phase.</param>
    public static PassNode At<TFluid>(in TFluid fluid, VoidFractionModel slip, FrictionModel friction, in Duct duct, double massFlux, double pressure, double enthalpy, double near = 0, double edge = 0)
        where TFluid : struct, IPassFluid
    {
        SaturatedPair pair = fluid.Saturated(pressure);
        double equilibrium = pair.Quality(enthalpy), x = equilibrium <= edge ? 0 : equilibrium >= 1 - edge ? 1 : equilibrium;
        double temperature = pair.Temperature, liquidDensity = 1 / pair.LiquidVolume, vapourDensity = 1 / pair.VapourVolume;
        double liquidViscosity = pair.LiquidViscosity, vapourViscosity = pair.VapourViscosity;
        bool wet = x > 0 && x < 1;
        if (!wet && Math.Abs(equilibrium - x) > edge)
        {
            FluidPoint point = fluid.At(pressure, enthalpy, pair, near);
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
