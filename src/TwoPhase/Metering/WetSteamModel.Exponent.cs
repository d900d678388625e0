using TwoPhase.Numerics;

namespace TwoPhase.Metering;

public abstract partial class WetSteamModel
{
    /// <summary>OR² = 1 + (rⁿ + r⁻ⁿ) X + X² with an exponent n of the gas Froude number: the form of the wet-gas correlations since de Leeuw, with slopes for Newton's method.</summary>
    internal abstract class ExponentModel : WetSteamModel
    {
        public sealed override bool NeedsGeometry => true;

        protected internal sealed override bool NeedsTransport => false;

        protected internal sealed override double EffectiveDensityCore(in MeterState meter, double quality) => 1 / Volume(meter, new StateTerms(meter), quality).Value;

        /// <summary>1/ρe [m³/kg], and its slope in x; arguments trusted, quality from 0 to 1.</summary>
        internal Sloped Volume(in MeterState meter, in StateTerms terms, double quality)
        {
            double y = 1 - quality, perDensity = 1 / meter.VapourDensity;
            Sloped exponent = Exponent(meter, terms.Froude * quality);
            double power = Math.Exp(terms.LogRatio * exponent.Value), inverse = 1 / power;
            double chisholm = (power + inverse) * terms.RootRatio, bent = (power - inverse) * (terms.RootRatio * terms.LogRatio * terms.Froude) * exponent.Slope;
            return new(
                ((quality * quality) + (chisholm * (quality * y)) + (y * y * terms.Ratio)) * perDensity,
                ((2 * quality) + (chisholm * (y - quality)) + (bent * (quality * y)) - (2 * y * terms.Ratio)) * perDensity);
        }

        /// <summary>C [-] that belongs with ρe, and its slope in x.</summary>
        /// <param name="meter">The state at the meter, SI.</param>
        /// <param name="terms">The terms of the state.</param>
        /// <param name="dry">C of the dry meter at this quality, and its slope in x [-].</param>
        /// <param name="quality">x, steam quality [kg/kg].</param>
        internal virtual Sloped Coefficient(in MeterState meter, in StateTerms terms, in Sloped dry, double quality) => dry;

        /// <summary>n [-] at a Froude number of the gas, and its slope in that.</summary>
        private protected abstract Sloped Exponent(in MeterState meter, double froude);
    }
}
