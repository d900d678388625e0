using TwoPhase.Flow;

namespace TwoPhase.Metering;

public abstract partial class WetSteamModel
{
    /// <summary>Lin (1982): over-reading linear in the Lockhart-Martinelli parameter, its slope a polynomial of the density ratio.</summary>
    /// <remarks>
    /// <para>OR = 1 + θ X, θ = 1.48625 − 9.26541 r + 44.6954 r² − 60.6150 r³ − 5.12966 r⁴ − 26.5743 r⁵, r = ρg/ρl, with the dry coefficient of the meter.</para>
    /// <para>OR over-reading [-], X = (1 − x)/x · √r [-], x quality [kg/kg], ρl and ρg saturated densities [kg/m³].</para>
    /// <para>Range: sharp-edged orifices, 0.00455 ≤ r ≤ 0.328, 8 mm ≤ D ≤ 75 mm, 0.25 ≤ β ≤ 0.75, 0 ≤ x ≤ 1 (from memory).</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Lin, Int. J. Multiphase Flow 8(6), 683-693 (1982); coefficients as reviews quote them.</para>
    /// </remarks>
    public static WetSteamModel Lin { get; } = new LinModel();

    private sealed class LinModel : WetSteamModel
    {
        public override string Name => "Lin";

        protected internal override bool NeedsTransport => false;

        protected internal override bool DependsOnFlow => false;

        protected internal override DifferentialTrend Trend => DifferentialTrend.Rising;

        protected internal override double EffectiveDensityCore(in MeterState meter, double quality)
        {
            double r = meter.VapourDensity / meter.LiquidDensity;
            double theta = 1.48625 + (r * (-9.26541 + (r * (44.6954 + (r * (-60.6150 + (r * (-5.12966 + (r * -26.5743)))))))));
            return DensityFromSlope(meter, quality, theta);
        }

        protected internal override Applicability CheckCore(in MeterState meter, double quality)
        {
            Applicability inside = Applicability.Inside
                .Check(ApplicabilityLimits.Quality, quality, 0, 1)
                .Check(ApplicabilityLimits.DensityRatio, meter.VapourDensity / meter.LiquidDensity, 0.00455, 0.328);
            return double.IsNaN(meter.DiameterRatio) ? inside : inside
                .Check(ApplicabilityLimits.DiameterRatio, meter.DiameterRatio, 0.25, 0.75)
                .Check(ApplicabilityLimits.Bore, meter.PipeDiameter, 0.008, 0.075);
        }
    }
}
