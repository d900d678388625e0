namespace TwoPhase.Metering;

public abstract partial class WetSteamModel
{
    /// <summary>Chisholm (1967): separated flow through a sharp-edged orifice with one law of slip for every quality.</summary>
    /// <remarks>
    /// <para>OR² = 1 + Cc X + X², Cc = (ρl/ρg)^(1/4) + (ρg/ρl)^(1/4), with the dry coefficient of the meter.</para>
    /// <para>OR over-reading [-], X = (1 − x)/x · √(ρg/ρl) [-], x quality [kg/kg], ρl and ρg saturated densities [kg/m³].</para>
    /// <para>Range: X ≤ 1, sharp-edged orifices; there it is one with the form of 1977.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Chisholm, J. Mech. Eng. Sci. 9(1), 73-78 (1967), in the form that wet-gas reviews and ISO/TR 11583:2012 build on.</para>
    /// </remarks>
    public static WetSteamModel Chisholm1967 { get; } = new Chisholm1967Model();

    private sealed class Chisholm1967Model : WetSteamModel
    {
        public override string Name => "Chisholm (1967)";

        protected internal override bool NeedsTransport => false;

        protected internal override bool DependsOnFlow => false;

        protected internal override DifferentialTrend Trend => DifferentialTrend.Rising;

        protected internal override double EffectiveDensityCore(in MeterState meter, double quality)
        {
            double fourthRoot = Numerics.Fast.Sqrt(Numerics.Fast.Sqrt(meter.LiquidDensity / meter.VapourDensity));
            return DensityFromChisholm(meter, quality, fourthRoot + (1 / fourthRoot));
        }

        protected internal override Flow.Applicability CheckCore(in MeterState meter, double quality) =>
            base.CheckCore(meter, quality).Check(Flow.ApplicabilityLimits.LockhartMartinelli, LockhartMartinelli(meter, quality), 0, 1);
    }
}
