using TwoPhase.Flow;

namespace TwoPhase.Metering;

public abstract partial class WetSteamModel
{
    /// <summary>Smith and Leang (1975): a blockage factor of quality alone.</summary>
    /// <remarks>
    /// <para>OR = 1/BF, BF = 0.637 + 0.421 x − 0.00183/x², with the dry coefficient of the meter; ρe = ρg (BF/x)².</para>
    /// <para>OR over-reading [-], BF blockage factor [-], x quality [kg/kg], ρe and ρg effective and saturated vapour density [kg/m³].</para>
    /// <para>Range: x ≥ 0.1. The differential of the formula has its minimum at x = 0.0928 and a pole at 0.053: below the minimum every reading would fit two
    /// qualities, so the formula is used from there up and continued downwards at the homogeneous slope, which ends with no volume left before x = 0. Dry steam gives BF = 1.056, so it reads 5.6 % off.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Smith and Leang, J. Engineering for Power 97(4), 589-593 (1975); coefficients as reviews quote them.</para>
    /// </remarks>
    public static WetSteamModel SmithLeang { get; } = new SmithLeangModel();

    private sealed class SmithLeangModel : WetSteamModel
    {
        private const double A = 0.637, B = 0.421, C = 0.00183;

        // d(x/BF)/dx = 0 where BF = x BF', that is 0.637 x² = 3 · 0.00183.
        private static readonly double Turn = Math.Sqrt(3 * C / A);

        public override string Name => "Smith and Leang";

        protected internal override bool NeedsTransport => false;

        protected internal override bool DependsOnFlow => false;

        protected internal override DifferentialTrend Trend => DifferentialTrend.Rising;

        protected internal override double LowestQuality => Turn;

        protected internal override double EffectiveDensityCore(in MeterState meter, double quality)
        {
            double blockage = A + (B * quality) - (C / (quality * quality));
            return meter.VapourDensity * (blockage * blockage) / (quality * quality);
        }

        protected internal override Applicability CheckCore(in MeterState meter, double quality) =>
            Applicability.Inside.Check(ApplicabilityLimits.Quality, quality, 0.1, 1);
    }
}
