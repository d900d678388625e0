using TwoPhase.Flow;

namespace TwoPhase.Metering;

public abstract partial class WetSteamModel
{
    /// <summary>Reader-Harris and Graham (2009), the Venturi-tube correlation of ISO/TR 11583, with the coefficient of liquid water in wet steam.</summary>
    /// <remarks>
    /// <para>OR² = 1 + (rⁿ + r⁻ⁿ) X + X², r = ρg/ρl; n = max[0.583 − 0.18 β² − 0.578 exp(−0.8 Fr/H), 0.392 − 0.18 β²], H = 0.79;
    /// C = 1 − 0.0463 exp(−0.05 Fr β^−2.5) min(1, √(X/0.016)), in place of the dry coefficient.</para>
    /// <para>OR over-reading [-], X = (1 − x)/x · √r [-], Fr densiometric Froude number of the gas [-], β diameter ratio [-], H surface-tension factor of the liquid [-],
    /// x quality [kg/kg], ρl and ρg saturated densities [kg/m³]. C goes to 1 for dry steam, not to the dry coefficient of ISO 5167-4.</para>
    /// <para>Range: 0.4 ≤ β ≤ 0.75, D ≥ 50 mm, 0 &lt; X ≤ 0.3, Fr β^−2.5 &gt; 3, r &gt; 0.02, horizontal tube. Near dryness, from a quality of about 0.94 upwards, the
    /// differential falls again as C rises to 1: two qualities fit one reading, and the lower is returned with the other in the applicability.</para>
    /// <para>Accuracy: with k = 2, 3 % of gas flow for X ≤ 0.15, 20 X % above (from memory).</para>
    /// <para>Source: ISO/TR 11583:2012, 6.4; Reader-Harris and Graham, North Sea Flow Measurement Workshop (2009).</para>
    /// </remarks>
    public static WetSteamModel ReaderHarrisGraham { get; } = new ReaderHarrisGrahamModel("Reader-Harris and Graham (ISO/TR 11583)", 0.79);

    /// <summary>The same correlation with another liquid, as the standard's own examples need it.</summary>
    internal static WetSteamModel ReaderHarrisGrahamWith(double surfaceTensionFactor) =>
        new ReaderHarrisGrahamModel(FormattableString.Invariant($"Reader-Harris and Graham, H = {surfaceTensionFactor}"), surfaceTensionFactor);

    private sealed class ReaderHarrisGrahamModel(string name, double surfaceTensionFactor) : WetSteamModel
    {
        public override string Name => name;

        public override bool NeedsGeometry => true;

        protected internal override bool NeedsTransport => false;

        protected internal override DifferentialTrend Trend => DifferentialTrend.RisingThenFalling;

        protected internal override double EffectiveDensityCore(in MeterState meter, double quality)
        {
            double beta2 = meter.DiameterRatio * meter.DiameterRatio;
            double n = Math.Max(0.583 - (0.18 * beta2) - (0.578 * Math.Exp(-0.8 / surfaceTensionFactor * GasFroude(meter, quality))), 0.392 - (0.18 * beta2));
            return DensityFromChisholm(meter, quality, ChisholmCoefficient(meter, n));
        }

        protected internal override double DischargeCoefficientCore(in MeterState meter, double quality)
        {
            double wetness = Math.Min(1, Numerics.Fast.Sqrt(LockhartMartinelli(meter, quality) / 0.016));
            return 1 - (0.0463 * Math.Exp(-0.05 * ThroatFroude(meter, quality)) * wetness);
        }

        protected internal override Applicability CheckCore(in MeterState meter, double quality) => Applicability.Inside
            .Check(ApplicabilityLimits.Quality, quality, 0, 1)
            .Check(ApplicabilityLimits.LockhartMartinelli, LockhartMartinelli(meter, quality), 0, 0.3)
            .Check(ApplicabilityLimits.Froude, ThroatFroude(meter, quality), 3, double.PositiveInfinity)
            .Check(ApplicabilityLimits.DensityRatio, meter.VapourDensity / meter.LiquidDensity, 0.02, 1)
            .Check(ApplicabilityLimits.DiameterRatio, meter.DiameterRatio, 0.4, 0.75)
            .Check(ApplicabilityLimits.Bore, meter.PipeDiameter, 0.050, double.PositiveInfinity);

        private static double ThroatFroude(in MeterState meter, double quality)
        {
            double beta = meter.DiameterRatio;
            return GasFroude(meter, quality) / (beta * beta * Numerics.Fast.Sqrt(beta));
        }
    }
}
