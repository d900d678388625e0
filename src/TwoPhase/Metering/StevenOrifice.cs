using TwoPhase.Flow;
using TwoPhase.Numerics;

namespace TwoPhase.Metering;

public abstract partial class WetSteamModel
{
    /// <summary>Steven and others (2011), the orifice-plate correlation of ISO/TR 11583: Chisholm's form with an exponent of the gas Froude number.</summary>
    /// <remarks>
    /// <para>OR² = 1 + (rⁿ + r⁻ⁿ) X + X², r = ρg/ρl; n = 0.214 for Fr ≤ 1.5, n = (1/√2 − 0.3/√Fr)² above, with the dry coefficient of the meter.</para>
    /// <para>OR over-reading [-], X = (1 − x)/x · √r [-], Fr densiometric Froude number of the gas [-], x quality [kg/kg], ρl and ρg saturated densities [kg/m³].</para>
    /// <para>Range: orifice plates, 50 mm ≤ D ≤ 100 mm, 0.24 ≤ β ≤ 0.73, r &gt; 0.014, X ≤ 0.3, Fr &gt; 0.2 (from memory). The two laws meet at Fr = 1.505, not at 1.5 where the exponent
    /// would step by 0.0004: the greater of the two is taken, so that quality and differential stay continuous.</para>
    /// <para>Accuracy: 2 % of gas flow (from memory).</para>
    /// <para>Source: ISO/TR 11583:2012, clause on orifice plates; Steven, Stobie, Hall and Priddy, North Sea Flow Measurement Workshop (2011).</para>
    /// </remarks>
    public static WetSteamModel StevenOrifice { get; } = new StevenOrificeModel();

    private sealed class StevenOrificeModel : ExponentModel
    {
        private static readonly double LimitRoot = 1 / Math.Sqrt(2);

        public override string Name => "Steven, orifice (ISO/TR 11583)";

        protected internal override DifferentialTrend Trend => DifferentialTrend.Rising;

        private protected override Sloped Exponent(in MeterState meter, double froude)
        {
            double below = 0.3 / Fast.Sqrt(froude), root = LimitRoot - below, n = root * root;
            return froude > 1.5 && n > 0.214 ? new(n, root * below / froude) : new(0.214, 0);
        }

        protected internal override Applicability CheckCore(in MeterState meter, double quality) => Applicability.Inside
            .Check(ApplicabilityLimits.Quality, quality, 0, 1)
            .Check(ApplicabilityLimits.LockhartMartinelli, LockhartMartinelli(meter, quality), 0, 0.3)
            .Check(ApplicabilityLimits.Froude, GasFroude(meter, quality), 0.2, double.PositiveInfinity)
            .Check(ApplicabilityLimits.DensityRatio, meter.VapourDensity / meter.LiquidDensity, 0.014, 1)
            .Check(ApplicabilityLimits.DiameterRatio, meter.DiameterRatio, 0.24, 0.73)
            .Check(ApplicabilityLimits.Bore, meter.PipeDiameter, 0.050, 0.100);
    }
}
