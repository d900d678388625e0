using TwoPhase.Steam;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>A reading under audit, with what the mistakes of the catalogue ask of it, SI.</summary>
internal sealed class AuditedReading(QualityMeter meter, RawReading raw, AuditSetup setup)
{
    private const double BoredAt = 293.15;   // K

    private readonly Saturation _steam = Saturation.FromPressure(Pressure.FromPascals(raw.Pressure));

    public QualityMeter Meter => meter;

    public AuditSetup Setup => setup;

    public RawReading Raw => raw;

    public PrimaryElement? Element => meter.Meter as PrimaryElement;

    public double VapourDensity => _steam.Vapour.Density.Si();

    /// <summary>(d hot / d cold)⁴: what growth does to (E A)², β unchanged.</summary>
    public double Growth => Math.Pow(1 + (setup.Expansion * (_steam.Temperature.Si() - BoredAt)), 4);

    /// <summary>Heat-capacity ratio of the vapour, the wrong exponent.</summary>
    public double HeatCapacityRatio => _steam.Vapour.IsobaricHeatCapacity.Si() / _steam.Vapour.IsochoricHeatCapacity.Si();

    /// <summary>(ε by the wrong exponent / ε)².</summary>
    public double ExpansibilityRatio(PrimaryElement element, double exponent)
    {
        Pressure p = Pressure.FromPascals(raw.Pressure), dp = Pressure.FromPascals(raw.Differential);
        double ratio = element.Expansibility(p, dp, exponent) / element.Expansibility(p, dp, _steam.Vapour.IsentropicExponent);
        return ratio * ratio;
    }

    /// <summary>Quality at a reading; NaN where the distorted reading is none.</summary>
    public double Quality(in RawReading reading) => meter.QualityOrNaN(reading.Flow, reading.Pressure, reading.Differential);
}
