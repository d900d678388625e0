using TwoPhase.Flow;

namespace TwoPhase.Metering;

public abstract partial class WetSteamModel
{
    /// <summary>James (1965): the homogeneous volume with quality to the power 1.5.</summary>
    /// <remarks>
    /// <para>1/ρe = 1/ρl + x^1.5 (1/ρg − 1/ρl), with the dry coefficient of the meter.</para>
    /// <para>ρe effective density, ρl and ρg saturated densities [kg/m³], x quality [kg/kg].</para>
    /// <para>Range: sharp-edged orifices in geothermal steam-water flow, about 0.5 MPa to 2 MPa and x up to about 0.5 (range from memory); elsewhere an extrapolation.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: James, Proc. Inst. Mech. Engrs 180, part 1, 549-572 (1965-66).</para>
    /// </remarks>
    public static WetSteamModel James { get; } = new JamesModel();

    private sealed class JamesModel : WetSteamModel
    {
        public override string Name => "James";

        protected internal override bool NeedsTransport => false;

        protected internal override bool DependsOnFlow => false;

        protected internal override DifferentialTrend Trend => DifferentialTrend.Rising;

        internal override bool HasClosedInverse => true;

        protected internal override double EffectiveDensityCore(in MeterState meter, double quality)
        {
            double vl = 1 / meter.LiquidDensity;
            return 1 / (vl + (quality * Numerics.Fast.Sqrt(quality) * ((1 / meter.VapourDensity) - vl)));
        }

        internal override double QualityFromVolume(in MeterState meter, double volume)
        {
            double vl = 1 / meter.LiquidDensity;
            double power = (volume - vl) / ((1 / meter.VapourDensity) - vl);
            if (power is <= 0 or >= 1) return power;   // the homogeneous slope outside 0 to 1
            double root = Numerics.Fast.Cbrt(power);
            return root * root;
        }

        protected internal override Applicability CheckCore(in MeterState meter, double quality) => Applicability.Inside
            .Check(ApplicabilityLimits.Quality, quality, 0, 0.5)
            .Check(ApplicabilityLimits.Pressure, meter.Pressure, 0.5e6, 2e6);
    }
}
