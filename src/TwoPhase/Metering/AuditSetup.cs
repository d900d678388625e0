using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>What an audit should know of a meter's surroundings; every part may be left out. Immutable; <c>With…</c> returns a changed copy.</summary>
public sealed class AuditSetup
{
    private const double StandardAtmosphere = 101325;      // Pa
    private const double CarbonSteelExpansion = 12e-6;     // 1/K, mean from 20 °C to 300 °C (common practice, no source)
    private const double WaterAtTwentyCelsius = 998.2;     // kg/m³

    private AuditSetup(double atmosphere, double expansion, double? span, double? feedDensity, double baseDensity, FeedMeterPrinciple principle) =>
        (Atmosphere, Expansion, SpanCore, ActualFeedDensity, FeedBaseDensity, Principle) = (atmosphere, expansion, span, feedDensity, baseDensity, principle);

    /// <summary>Standard atmosphere, carbon steel; nothing known of span and feed water.</summary>
    public static AuditSetup Default { get; } = new(StandardAtmosphere, CarbonSteelExpansion, null, null, WaterAtTwentyCelsius, FeedMeterPrinciple.Volumetric);

    internal double Atmosphere { get; }

    internal double Expansion { get; }

    internal double? SpanCore { get; }

    internal double? ActualFeedDensity { get; }

    internal double FeedBaseDensity { get; }

    internal FeedMeterPrinciple Principle { get; }

    /// <summary>With the site's atmospheric pressure.</summary>
    /// <param name="atmosphere">Absolute pressure of the atmosphere, 50 kPa to 110 kPa.</param>
    public AuditSetup WithAtmosphericPressure(Pressure atmosphere) => new(
        Require.Within(atmosphere.Si(), 50e3, 110e3, "Atmospheric pressure of the site", Scale.Kilopascals, nameof(atmosphere)), Expansion, SpanCore, ActualFeedDensity, FeedBaseDensity, Principle);

    /// <summary>With the thermal expansion of the element.</summary>
    /// <param name="coefficient">Mean linear expansion between 20 °C and working temperature, below 10⁻⁴ 1/K.</param>
    public AuditSetup WithExpansion(CoefficientOfThermalExpansion coefficient) => new(
        Atmosphere, Require.Within(coefficient.PerKelvin, 0, 1e-4, "Coefficient of thermal expansion", Scale.None, nameof(coefficient)), SpanCore, ActualFeedDensity, FeedBaseDensity, Principle);

    /// <summary>With the span of the differential transmitter: mistakes with roots and the ceiling are then looked at.</summary>
    /// <param name="span">Differential at full output, greater than zero.</param>
    public AuditSetup WithSpan(Pressure span) => new(
        Atmosphere, Expansion, Require.Positive(span.Si(), "Span", Scale.Kilopascals, nameof(span)), ActualFeedDensity, FeedBaseDensity, Principle);

    /// <summary>With the feed meter and its water: its density constant is then looked at.</summary>
    /// <param name="meter">The feed meter with the density it was, or may have been, ranged for.</param>
    /// <param name="density">Density of the water at the meter.</param>
    public AuditSetup WithFeedMeter(FeedFlowMeter meter, Density density) => new(
        Atmosphere,
        Expansion,
        SpanCore,
        Require.Positive(density.Si(), "Density of the water", Scale.KilogramsPerCubicMetre, nameof(density)),
        Require.NotNull(meter, nameof(meter)).BaseDensity.Si(),
        meter.Principle);
}
