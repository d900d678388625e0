using TwoPhase.Flow;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>
/// What density wet steam seems to have to a differential-pressure meter: the effective density ρe that makes the flow equation
/// of the meter give the total flow, ṁ = C ε E A √(2 ρe Δp).
/// </summary>
/// <remarks>
/// <para>ṁ total mass flow [kg/s], C discharge coefficient that the model uses [-], ε expansibility of the saturated vapour at p and Δp [-], E velocity-of-approach
/// factor [-], A throat area [m²], ρe effective density [kg/m³], Δp differential [Pa].</para>
/// <para>Wet-gas correlations give the over-reading OR, the gas flow of the dry equation over the true gas flow: ρe = ρg/(x OR)², x quality [kg/kg].</para>
/// <para>A model of your own derives from this class and overrides <see cref="Name"/> and <see cref="EffectiveDensityCore"/>; everything else has a safe default.
/// Outside <see cref="LowestQuality"/> to 1 every model goes on with its volume 1/ρe at the homogeneous slope, d(1/ρe)/dx = 1/ρg − 1/ρl, so that a reading of
/// water or of superheated steam still gives a finite number that tells how far outside it is.</para>
/// </remarks>
public abstract partial class WetSteamModel
{
    /// <summary>The name of the model, as the trade cites it.</summary>
    public abstract string Name { get; }

    /// <summary>Whether the model needs the diameters of the meter, so cannot stand over a <see cref="SiteConstantMeter"/>.</summary>
    public virtual bool NeedsGeometry => false;

    /// <summary>Whether the model reads viscosities or surface tension from the state; when not, they are left out and time is saved.</summary>
    protected internal virtual bool NeedsTransport => true;

    /// <summary>Whether ρe or C depends on the total flow; when not, flow follows from differential and quality without a search.</summary>
    protected internal virtual bool DependsOnFlow => true;

    /// <summary>How the differential moves with quality at a given total flow.</summary>
    protected internal virtual DifferentialTrend Trend => DifferentialTrend.Unknown;

    /// <summary>Lowest quality at which the formula is used [kg/kg]; below it, the homogeneous slope.</summary>
    protected internal virtual double LowestQuality => 0;

    /// <summary>ρe: the effective density at a state; outside the range of the formula continued at the homogeneous slope.</summary>
    /// <param name="state">The state at the meter, SI.</param>
    /// <param name="quality">x, steam quality.</param>
    /// <exception cref="ArgumentOutOfRangeException">The quality is so low that no effective volume is left.</exception>
    public Density EffectiveDensity(in MeterState state, MassFraction quality)
    {
        double x = quality.Si();
        double volume = EffectiveVolume(state, x);
        return volume > 0
            ? Density.FromKilogramsPerCubicMeter(1 / volume)
            : throw Require.OutOfRange(x, "Quality", Scale.None, nameof(quality), "is so low that no effective volume is left");
    }

    /// <summary>Whether a state lies inside the published range of the model.</summary>
    /// <param name="state">The state at the meter, SI.</param>
    /// <param name="quality">x, steam quality.</param>
    public Applicability Check(in MeterState state, MassFraction quality) => CheckCore(state, quality.Si());

    /// <summary>The name.</summary>
    public override string ToString() => Name;

    /// <summary>ρe [kg/m³] at a quality from <see cref="LowestQuality"/> to 1; SI in, arguments trusted, no allocation.</summary>
    /// <param name="meter">The state at the meter, SI.</param>
    /// <param name="quality">x, steam quality [kg/kg].</param>
    protected internal abstract double EffectiveDensityCore(in MeterState meter, double quality);

    /// <summary>C [-] that belongs with ρe; the dry coefficient of the meter unless the model brings its own.</summary>
    /// <param name="meter">The state at the meter, SI.</param>
    /// <param name="quality">x, steam quality [kg/kg].</param>
    protected internal virtual double DischargeCoefficientCore(in MeterState meter, double quality) => meter.DischargeCoefficient;

    /// <summary>Applicability of the model at a state. A model without published limits keeps this default: quality 0 to 1.</summary>
    /// <param name="meter">The state at the meter, SI.</param>
    /// <param name="quality">x, steam quality [kg/kg].</param>
    protected internal virtual Applicability CheckCore(in MeterState meter, double quality) =>
        Applicability.Inside.Check(ApplicabilityLimits.Quality, quality, 0, 1);

    /// <summary>X = (1 − x)/x · √(ρg/ρl), Lockhart-Martinelli parameter as wet-gas metering defines it [-].</summary>
    /// <param name="meter">The state at the meter, SI.</param>
    /// <param name="quality">x, steam quality [kg/kg].</param>
    protected static double LockhartMartinelli(in MeterState meter, double quality) =>
        (1 - quality) / quality * Numerics.Fast.Sqrt(meter.VapourDensity / meter.LiquidDensity);

    /// <summary>Fr = 4 x ṁ/(ρg π D² √(g D)) · √(ρg/(ρl − ρg)), densiometric Froude number of the gas phase [-].</summary>
    /// <param name="meter">The state at the meter, SI.</param>
    /// <param name="quality">x, steam quality [kg/kg].</param>
    protected static double GasFroude(in MeterState meter, double quality)
    {
        double d = meter.PipeDiameter, rhog = meter.VapourDensity;
        double superficialVelocity = 4 * quality * meter.TotalMassFlow / (rhog * Math.PI * d * d);
        return superficialVelocity * Numerics.Fast.Sqrt(rhog / ((meter.LiquidDensity - rhog) * SiDoor.StandardGravity * d));
    }

    /// <summary>ρe of the form OR² = 1 + Cc X + X², written so that it holds at x = 0.</summary>
    /// <param name="meter">The state at the meter, SI.</param>
    /// <param name="quality">x, steam quality [kg/kg].</param>
    /// <param name="chisholm">Cc, Chisholm's coefficient [-].</param>
    protected static double DensityFromChisholm(in MeterState meter, double quality, double chisholm)
    {
        double r = meter.VapourDensity / meter.LiquidDensity, y = 1 - quality;
        return meter.VapourDensity / ((quality * quality) + (chisholm * Numerics.Fast.Sqrt(r) * quality * y) + (y * y * r));
    }

    /// <summary>ρe of the form OR = 1 + θ X, written so that it holds at x = 0.</summary>
    /// <param name="meter">The state at the meter, SI.</param>
    /// <param name="quality">x, steam quality [kg/kg].</param>
    /// <param name="theta">θ, slope of the over-reading [-].</param>
    protected static double DensityFromSlope(in MeterState meter, double quality, double theta)
    {
        double overReadingTimesQuality = quality + (theta * (1 - quality) * Numerics.Fast.Sqrt(meter.VapourDensity / meter.LiquidDensity));
        return meter.VapourDensity / (overReadingTimesQuality * overReadingTimesQuality);
    }

    /// <summary>Cc = (ρl/ρg)ⁿ + (ρg/ρl)ⁿ.</summary>
    /// <param name="meter">The state at the meter, SI.</param>
    /// <param name="exponent">n [-]: 1/2 is homogeneous flow.</param>
    protected static double ChisholmCoefficient(in MeterState meter, double exponent)
    {
        double power = Math.Pow(meter.LiquidDensity / meter.VapourDensity, exponent);
        return power + (1 / power);
    }

    /// <summary>1/ρe [m³/kg], continued outside the formula's range at the homogeneous slope.</summary>
    internal double EffectiveVolume(in MeterState meter, double quality)
    {
        double inside = Inside(quality);
        double volume = 1 / EffectiveDensityCore(meter, inside);
        return inside == quality ? volume : volume + ((quality - inside) * ((1 / meter.VapourDensity) - (1 / meter.LiquidDensity)));
    }

    /// <summary>The quality itself, or the nearer end of the formula's range.</summary>
    internal double Inside(double quality) => Numerics.Fast.Clamp(quality, LowestQuality, 1);

    /// <summary>Inverse of <see cref="EffectiveVolume"/> where it is in closed form; NaN where it is not.</summary>
    internal virtual double QualityFromVolume(in MeterState meter, double volume) => double.NaN;

    /// <summary>Whether <see cref="QualityFromVolume"/> exists and C is the dry one.</summary>
    internal virtual bool HasClosedInverse => false;
}
