namespace TwoPhase.Flow;

/// <summary>Densities and momentum of liquid and vapour flowing together, SI in and out: the one place for passes, slip and friction.</summary>
internal static class Mixture
{
    /// <summary>Specific volume [m³/kg] of the flow when both phases move at one velocity: x/ρg + (1 − x)/ρl.</summary>
    public static double HomogeneousVolume(in FlowState flow) =>
        (flow.Quality / flow.VapourDensity) + ((1 - flow.Quality) / flow.LiquidDensity);

    /// <summary>Mass per volume of tube [kg/m³]: α ρg + (1 − α) ρl.</summary>
    public static double StaticDensity(in FlowState flow, double voidFraction) =>
        (voidFraction * flow.VapourDensity) + ((1 - voidFraction) * flow.LiquidDensity);

    /// <summary>Momentum flux over G² [m³/kg]: x²/(α ρg) + (1 − x)²/[(1 − α) ρl]; a phase that is absent adds nothing.</summary>
    public static double MomentumVolume(in FlowState flow, double voidFraction)
    {
        double x = flow.Quality, y = 1 - x;
        double vapour = x > 0 ? x * x / (voidFraction * flow.VapourDensity) : 0;
        double liquid = y > 0 ? y * y / ((1 - voidFraction) * flow.LiquidDensity) : 0;
        return vapour + liquid;
    }
}
