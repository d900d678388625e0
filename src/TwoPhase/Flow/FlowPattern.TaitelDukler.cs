using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Flow;

public readonly partial struct FlowPattern
{
    // Between these levels lies every flow with both phases: at 1e-9 the thinner phase carries less than 1e-13 of a tube.
    private const double LowestLevel = 1e-9, HighestLevel = 1 - 1e-9;

    /// <summary>The pattern of a flow.</summary>
    /// <param name="flow">The flow.</param>
    public static FlowPattern Of(in TwoPhaseFlow flow) => Core(flow.State);

    internal static FlowPattern Core(in FlowState flow)
    {
        Applicability applicability = Applicability.Inside.Check(ApplicabilityLimits.Inclination, flow.Inclination, -Math.PI / 18, Math.PI / 18);
        if (flow.Quality <= 0) return new(FlowRegime.Liquid, 1, double.PositiveInfinity, 0, 0, 0, default, applicability);
        if (flow.Quality >= 1) return new(FlowRegime.Vapour, 0, 0, 0, 0, 0, default, applicability);

        double liquidFlux = flow.MassFlux * (1 - flow.Quality), vapourFlux = flow.MassFlux * flow.Quality;
        double liquidGradient = FrictionFactor.GradientCore(liquidFlux, flow.Bore, flow.LiquidDensity, flow.LiquidViscosity, 0);
        double vapourGradient = FrictionFactor.GradientCore(vapourFlux, flow.Bore, flow.VapourDensity, flow.VapourViscosity, 0);
        double buoyancy = (flow.LiquidDensity - flow.VapourDensity) * SiDoor.StandardGravity;   // N/m³
        double across = buoyancy * Math.Cos(flow.Inclination), along = buoyancy * Math.Sin(flow.Inclination);

        double x = Math.Sqrt(liquidGradient / vapourGradient);
        double f = vapourFlux / Math.Sqrt(flow.VapourDensity * across * flow.Bore);
        double k = f * Math.Sqrt(liquidFlux * flow.Bore / flow.LiquidViscosity);
        double t = Math.Sqrt(liquidGradient / across);
        double level = StratifiedLevel(x, along / vapourGradient);
        Boundaries boundaries = new(level);
        return new(Decide(level, f, k, t, boundaries), level, x, f, k, t, boundaries, applicability);
    }

    private static FlowRegime Decide(double level, double f, double k, double t, in Boundaries boundaries) =>
        f < boundaries.Froude ? k < boundaries.Wave ? FlowRegime.StratifiedSmooth : FlowRegime.StratifiedWavy
        : level < 0.5 ? FlowRegime.Annular
        : t < boundaries.Dispersion ? FlowRegime.Intermittent
        : FlowRegime.DispersedBubble;

    /// <summary>h = hL/D of stratified flow, the lowest root of the momentum balance.</summary>
    private static double StratifiedLevel(double x, double y)
    {
        MomentumBalance balance = new(x * x, y);

        // Without inclination, and downhill, the balance falls from +∞ to −∞ once: no scan. Uphill it may turn, so step up to the first fall.
        double low = LowestLevel, atLow = balance.Value(low), high = HighestLevel, atHigh = balance.Value(high);
        if (!(atLow > 0)) return low;
        if (!(atHigh < 0)) return high;
        const int steps = 50;
        for (int i = 1; y > 0 && i < steps; i++)
        {
            double level = (double)i / steps, value = balance.Value(level);
            if (value < 0)
            {
                (high, atHigh) = (level, value);
                break;
            }

            (low, atLow) = (level, value);
        }

        return BracketedRoot.TryFind(balance, low, atLow, high, atHigh, 1e-15).X;
    }

    private readonly struct MomentumBalance(double xSquared, double y) : IScalarFunction
    {
        public double Value(double level)
        {
            StratifiedGeometry g = new(level);
            return (xSquared * g.LiquidFriction * g.LiquidPerimeter / g.LiquidArea)
                - (g.VapourFriction * ((g.VapourPerimeter / g.VapourArea) + (g.Interface / g.LiquidArea) + (g.Interface / g.VapourArea)))
                + (4 * y);
        }
    }

    /// <summary>F, K and T on the borders of the map at a level.</summary>
    private readonly struct Boundaries
    {
        public Boundaries(double level)
        {
            StratifiedGeometry g = new(level);
            Froude = (1 - level) * Math.Sqrt(g.VapourArea / g.Interface) / g.VapourVelocity;
            Wave = 2 / (Math.Sqrt(0.01 * g.LiquidVelocity) * g.VapourVelocity);
            Dispersion = Math.Sqrt(8 * g.VapourArea / (g.Interface * g.LiquidFriction));
        }

        public double Froude { get; }

        public double Wave { get; }

        public double Dispersion { get; }
    }
}
