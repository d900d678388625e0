using TwoPhase.Flow;
using TwoPhase.Numerics;

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

    private sealed class ReaderHarrisGrahamModel(string name, double surfaceTensionFactor) : ExponentModel
    {
        private readonly double _perFroude = 0.8 / surfaceTensionFactor;

        public override string Name => name;

        protected internal override DifferentialTrend Trend => DifferentialTrend.RisingThenFalling;

        protected internal override double DischargeCoefficientCore(in MeterState meter, double quality) => Coefficient(meter, new StateTerms(meter), default, quality).Value;

        private protected override Sloped Exponent(in MeterState meter, double froude)
        {
            double shape = 0.18 * meter.DiameterRatio * meter.DiameterRatio, below = 0.578 * Math.Exp(-_perFroude * froude), n = 0.583 - below;
            return n > 0.392 ? new(n - shape, _perFroude * below) : new(0.392 - shape, 0);
        }

        internal override Sloped Coefficient(in MeterState meter, in StateTerms terms, in Sloped dry, double quality)
        {
            double throat = 0.05 * ThroatFroude(meter, terms.Froude), wet = 0.0463 * Math.Exp(-throat * quality);
            double wetness = (1 - quality) / quality * terms.RootRatio / 0.016;
            if (wetness >= 1) return new(1 - wet, throat * wet);
            double nearlyDry = wet * Fast.Sqrt(wetness);
            return new(1 - nearlyDry, nearlyDry * (throat + (1 / (2 * quality * (1 - quality)))));
        }

        protected internal override Applicability CheckCore(in MeterState meter, double quality) => Applicability.Inside
            .Check(ApplicabilityLimits.Quality, quality, 0, 1)
            .Check(ApplicabilityLimits.LockhartMartinelli, LockhartMartinelli(meter, quality), 0, 0.3)
            .Check(ApplicabilityLimits.Froude, ThroatFroude(meter, GasFroude(meter, quality)), 3, double.PositiveInfinity)
            .Check(ApplicabilityLimits.DensityRatio, meter.VapourDensity / meter.LiquidDensity, 0.02, 1)
            .Check(ApplicabilityLimits.DiameterRatio, meter.DiameterRatio, 0.4, 0.75)
            .Check(ApplicabilityLimits.Bore, meter.PipeDiameter, 0.050, double.PositiveInfinity);

        private static double ThroatFroude(in MeterState meter, double froude)
        {
            double beta = meter.DiameterRatio;
            return froude / (beta * beta * Fast.Sqrt(beta));
        }
    }
}
