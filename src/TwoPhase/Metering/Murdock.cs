using TwoPhase.Flow;

namespace TwoPhase.Metering;

public abstract partial class WetSteamModel
{
    /// <summary>Murdock (1962): over-reading linear in the Lockhart-Martinelli parameter.</summary>
    /// <remarks>
    /// <para>OR = 1 + 1.26 X, X = (1 − x)/x · √(ρg/ρl), with the dry coefficient of the meter; ρe = ρg/(x OR)².</para>
    /// <para>OR over-reading [-], X Lockhart-Martinelli parameter [-], x quality [kg/kg], ρe, ρg, ρl effective and saturated densities [kg/m³].</para>
    /// <para>Range: orifice plates, 0.26 ≤ β ≤ 0.5, p ≤ 6.3 MPa, 0.11 ≤ x ≤ 0.98, X ≤ 0.41 (from memory).</para>
    /// <para>Accuracy: 1.5 % of flow (from memory).</para>
    /// <para>Source: Murdock, J. Basic Engineering 84(4), 419-433 (1962).</para>
    /// </remarks>
    public static WetSteamModel Murdock { get; } = new MurdockModel();

    private sealed class MurdockModel : WetSteamModel
    {
        private const double Slope = 1.26;

        public override string Name => "Murdock";

        protected internal override bool NeedsTransport => false;

        protected internal override bool DependsOnFlow => false;

        protected internal override DifferentialTrend Trend => DifferentialTrend.Rising;

        protected internal override double EffectiveDensityCore(in MeterState meter, double quality) => DensityFromSlope(meter, quality, Slope);

        protected internal override Applicability CheckCore(in MeterState meter, double quality)
        {
            Applicability inside = Applicability.Inside
                .Check(ApplicabilityLimits.Quality, quality, 0.11, 0.98)
                .Check(ApplicabilityLimits.LockhartMartinelli, LockhartMartinelli(meter, quality), 0, 0.41)
                .Check(ApplicabilityLimits.Pressure, meter.Pressure, 0, 6.3e6);
            return double.IsNaN(meter.DiameterRatio) ? inside : inside.Check(ApplicabilityLimits.DiameterRatio, meter.DiameterRatio, 0.26, 0.5);
        }
    }
}
