namespace TwoPhase.Metering;

public abstract partial class WetSteamModel
{
    /// <summary>Chisholm (1977): separated flow through a sharp-edged orifice, with a slip that changes its law at X = 1.</summary>
    /// <remarks>
    /// <para>OR² = 1 + Cc X + X², Cc = (1/S) √(ρl/ρg) + S √(ρg/ρl); S = (ρl/ρg)^(1/4) for X ≤ 1, S = √(vh/vl) above, vh = vl + x (vg − vl); dry coefficient of the meter.</para>
    /// <para>OR over-reading [-], X = (1 − x)/x · √(ρg/ρl) [-], S slip ratio [-], x quality [kg/kg], ρ and v saturated densities and volumes [kg/m³, m³/kg].
    /// The two slips meet at X = 1, where x is about √(ρg/ρl).</para>
    /// <para>Range: 0 ≤ x ≤ 1, sharp-edged orifices; no diameter limits stated.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Chisholm, J. Mech. Eng. Sci. 19(3), 128-130 (1977).</para>
    /// </remarks>
    public static WetSteamModel Chisholm { get; } = new ChisholmModel();

    private sealed class ChisholmModel : WetSteamModel
    {
        public override string Name => "Chisholm (1977)";

        protected internal override bool NeedsTransport => false;

        protected internal override bool DependsOnFlow => false;

        protected internal override DifferentialTrend Trend => DifferentialTrend.Rising;

        protected internal override double EffectiveDensityCore(in MeterState meter, double quality)
        {
            double rootOfRatio = Numerics.Fast.Sqrt(meter.LiquidDensity / meter.VapourDensity);
            bool separated = 1 - quality <= quality * rootOfRatio;
            double slip = Numerics.Fast.Sqrt(separated ? rootOfRatio : 1 + (quality * ((rootOfRatio * rootOfRatio) - 1)));
            return DensityFromChisholm(meter, quality, (rootOfRatio / slip) + (slip / rootOfRatio));
        }
    }
}
