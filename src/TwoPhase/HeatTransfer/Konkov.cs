using TwoPhase.Flow;
using TwoPhase.Numerics;

namespace TwoPhase.HeatTransfer;

public abstract partial class CriticalQualityModel
{
    /// <summary>Kon'kov (1965): the quality at which the film of an upflow steam-generator tube dries out.</summary>
    /// <remarks>
    /// <para>xcr = c q^(−0.125) G^(−0.333) (1000 D)^(−0.07) exp(b p), here with q in kW/m², p in bar: c 10.795, b 0.01715 from 4.9
    /// to 29.4 bar; c 19.398, b −0.00255 to 98 bar; c 32.302, b −0.00795 to 196 bar.</para>
    /// <para>xcr critical quality [kg/kg], q heat flux at the inside surface, G mass flux [kg/(m²·s)], D bore [m], p pressure. The
    /// three fits meet with steps of 0.7 % at 29.4 bar and 1.9 % at 98 bar; within 1 % of those pressures the two neighbours are
    /// blended here, so that the result is continuous in pressure.</para>
    /// <para>Range: 0.49 to 19.6 MPa, G 200 to 5000 kg/(m²·s), D 4 to 32 mm, vertical upflow, uniform heating. Most evaporator
    /// tubes are wider; the result is then an indicator only.</para>
    /// <para>Accuracy: none stated in the sources at hand.</para>
    /// <para>Source: Kon'kov, Teploenergetika 13(12), 77 (1965), as given in the VDI Heat Atlas, section H3; coefficients and range as
    /// in a public circulation program that cites the Atlas (2021, EUPL licence; it writes G^(−1/3), 0.2 % less at G 1000), and in
    /// agreement to 0.03 % with the inverse form of the same source.</para>
    /// </remarks>
    public static CriticalQualityModel Konkov { get; } = new KonkovModel();

    private sealed class KonkovModel : CriticalQualityModel
    {
        // Half-width of the blend about the pressures where the fits meet, relative.
        private const double Blend = 0.01;

        public override string Name => "Kon'kov";

        protected internal override double MeanCore(in FlowState flow, double heatFlux) =>
            Math.Exp(
                LogPressureFactor(flow.Pressure / 1e5)
                - (0.125 * Math.Log(heatFlux / 1e3))
                - (0.333 * Math.Log(flow.MassFlux))
                - (0.07 * Math.Log(1000 * flow.Bore)));

        protected internal override Applicability CheckCore(in FlowState flow, double heatFlux) => Applicability.Inside
            .Check(ApplicabilityLimits.Bore, flow.Bore, 0.004, 0.032)
            .Check(ApplicabilityLimits.Pressure, flow.Pressure, 0.49e6, 19.6e6)
            .Check(ApplicabilityLimits.MassFlux, flow.MassFlux, 200, 5000);

        // ln(c) + b p
        private static double LogPressureFactor(double bar)
        {
            double low = Math.Log(10.795) + (0.01715 * bar);
            double middle = Math.Log(19.398) - (0.00255 * bar);
            double high = Math.Log(32.302) - (0.00795 * bar);
            double belowHigh = low + (Weight(bar, 29.4) * (middle - low));
            return belowHigh + (Weight(bar, 98) * (high - belowHigh));
        }

        private static double Weight(double bar, double border) =>
            Fast.Clamp(((bar / border) - (1 - Blend)) / (2 * Blend), 0, 1);
    }
}
