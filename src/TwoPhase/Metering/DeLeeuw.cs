using TwoPhase.Flow;
using TwoPhase.Numerics;

namespace TwoPhase.Metering;

public abstract partial class WetSteamModel
{
    /// <summary>De Leeuw (1997): Chisholm's form with an exponent of the gas Froude number, for Venturi tubes.</summary>
    /// <remarks>
    /// <para>OR² = 1 + (rⁿ + r⁻ⁿ) X + X², r = ρg/ρl; n = 0.41 for Fr &lt; 1.5, n = 0.606 [1 − exp(−0.746 Fr)] above, with the dry coefficient of the meter.</para>
    /// <para>OR over-reading [-], X = (1 − x)/x · √r [-], Fr densiometric Froude number of the gas [-], x quality [kg/kg], ρl and ρg saturated densities [kg/m³].</para>
    /// <para>Range: one 4-inch Venturi tube of β = 0.401 (flagged beyond 0.05 of that), Fr ≥ 0.5, X ≤ 0.3, 1.5 MPa ≤ p ≤ 9.8 MPa (pressures from memory). The two laws meet at Fr = 1.513,
    /// not at 1.5 where the paper changes over with a step of 0.002 in n: the greater of the two is taken, so that quality and differential stay continuous. n exceeds the homogeneous 1/2 for Fr above 2.34.</para>
    /// <para>Accuracy: 2 % of gas flow in its own data (from memory).</para>
    /// <para>Source: de Leeuw, North Sea Flow Measurement Workshop (1997), paper 21; as quoted by Steven, Flow Meas. Instrum. 12, 361-372 (2002), and with the same exponents in public wet-gas code.</para>
    /// </remarks>
    public static WetSteamModel DeLeeuw { get; } = new DeLeeuwModel();

    private sealed class DeLeeuwModel : ExponentModel
    {
        public override string Name => "de Leeuw";

        protected internal override DifferentialTrend Trend => DifferentialTrend.Rising;

        private protected override Sloped Exponent(in MeterState meter, double froude)
        {
            double below = 0.606 * Math.Exp(-0.746 * froude), n = 0.606 - below;
            return n > 0.41 ? new(n, 0.746 * below) : new(0.41, 0);
        }

        protected internal override Applicability CheckCore(in MeterState meter, double quality) => Applicability.Inside
            .Check(ApplicabilityLimits.Quality, quality, 0, 1)
            .Check(ApplicabilityLimits.LockhartMartinelli, LockhartMartinelli(meter, quality), 0, 0.3)
            .Check(ApplicabilityLimits.Froude, GasFroude(meter, quality), 0.5, double.PositiveInfinity)
            .Check(ApplicabilityLimits.DiameterRatio, meter.DiameterRatio, 0.351, 0.451)
            .Check(ApplicabilityLimits.Pressure, meter.Pressure, 1.5e6, 9.8e6);
    }
}
