using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>A feed-flow meter that was ranged for one density of water: its reading compensated for the density there is.</summary>
/// <remarks>
/// <para>ṁ = ṁi · ρ/ρb for a meter of volume, ṁi · √(ρ/ρb) for one of differential pressure, ṁi for one of mass.</para>
/// <para>ṁ true flow, ṁi indicated flow [kg/s], ρ density at the meter, ρb base density of the ranging [kg/m³].</para>
/// <para>Range: liquid water. Accuracy: that of the densities.</para>
/// <para>Source: ṁ = ρ V̇ and ṁ = K √(2 ρ Δp) (ISO 5167-1:2003, 5.1) at both densities.</para>
/// </remarks>
public sealed class FeedFlowMeter
{
    private readonly double _baseDensity;

    /// <summary>A meter and the density it was ranged for.</summary>
    /// <param name="principle">What it senses.</param>
    /// <param name="baseDensity">ρb, greater than zero; without effect for a meter of mass.</param>
    public FeedFlowMeter(FeedMeterPrinciple principle, Density baseDensity)
    {
        if (principle is not (FeedMeterPrinciple.Volumetric or FeedMeterPrinciple.DifferentialPressure or FeedMeterPrinciple.Mass))
            throw new ArgumentOutOfRangeException(nameof(principle), principle, "The principle must be volumetric, differential pressure or mass.");
        Principle = principle;
        _baseDensity = Positive(baseDensity.Si(), nameof(baseDensity));
    }

    /// <summary>What the meter senses.</summary>
    public FeedMeterPrinciple Principle { get; }

    /// <summary>ρb.</summary>
    public Density BaseDensity => Density.FromKilogramsPerCubicMeter(_baseDensity);

    /// <summary>The true mass flow behind an indicated mass flow.</summary>
    /// <param name="indicated">ṁi, not negative.</param>
    /// <param name="density">ρ, density of the water at the meter.</param>
    public MassFlow TrueFlow(MassFlow indicated, Density density) => MassFlow.FromKilogramsPerSecond(
        Require.NotNegative(indicated.Si(), "Indicated flow", Scale.KilogramsPerSecond, nameof(indicated)) * Factor(Positive(density.Si(), nameof(density))));

    /// <summary>The true mass flow behind an indicated volume flow, counted at the base density.</summary>
    /// <param name="indicated">V̇i, not negative.</param>
    /// <param name="density">ρ, density of the water at the meter.</param>
    public MassFlow TrueFlow(VolumeFlow indicated, Density density) => MassFlow.FromKilogramsPerSecond(
        Require.NotNegative(indicated.Si(), "Indicated flow", CubicMetresPerSecond, nameof(indicated)) * _baseDensity * Factor(Positive(density.Si(), nameof(density))));

    private static Scale CubicMetresPerSecond => new("m³/s", 1);

    // True over indicated mass flow.
    private double Factor(double density) => Principle switch
    {
        FeedMeterPrinciple.Volumetric => density / _baseDensity,
        FeedMeterPrinciple.DifferentialPressure => Math.Sqrt(density / _baseDensity),
        _ => 1,
    };

    private static double Positive(double density, string parameter) =>
        Require.Positive(density, "Density of the water", Scale.KilogramsPerCubicMetre, parameter);
}
