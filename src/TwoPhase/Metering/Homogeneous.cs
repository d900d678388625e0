namespace TwoPhase.Metering;

public abstract partial class WetSteamModel
{
    /// <summary>Homogeneous flow: both phases at one velocity, so the effective density is that of the mixture.</summary>
    /// <remarks>
    /// <para>1/ρe = 1/ρl + x (1/ρg − 1/ρl), with the dry coefficient of the meter.</para>
    /// <para>ρe effective density, ρl and ρg saturated densities [kg/m³], x quality [kg/kg]. The same as n = 1/2 in OR² = 1 + (rⁿ + r⁻ⁿ) X + X², r = ρg/ρl.</para>
    /// <para>Range: 0 ≤ x ≤ 1; the limit of high mass flux and of pressures near critical.</para>
    /// <para>Accuracy: none stated; of sixteen correlations for Venturi tubes a review of 2020 found it the best in most of its cases (abstract), and for orifice plates another of the same year found it high.</para>
    /// <para>Source: definition; Liu, Lao and Falcone, J. Nat. Gas Sci. Eng. 78, 103323 (2020); Flow Meas. Instrum. 71, 101678 (2020).</para>
    /// </remarks>
    public static WetSteamModel Homogeneous { get; } = new HomogeneousModel();

    private sealed class HomogeneousModel : WetSteamModel
    {
        public override string Name => "Homogeneous";

        protected internal override bool NeedsTransport => false;

        protected internal override bool DependsOnFlow => false;

        protected internal override DifferentialTrend Trend => DifferentialTrend.Rising;

        internal override bool HasClosedInverse => true;

        protected internal override double EffectiveDensityCore(in MeterState meter, double quality)
        {
            double vl = 1 / meter.LiquidDensity;
            return 1 / (vl + (quality * ((1 / meter.VapourDensity) - vl)));
        }

        internal override double QualityFromVolume(in MeterState meter, double volume)
        {
            double vl = 1 / meter.LiquidDensity;
            return (volume - vl) / ((1 / meter.VapourDensity) - vl);
        }
    }
}
