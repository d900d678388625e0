using TwoPhase.Metering;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Limits;

/// <summary>The limits that a site sets for a pass. Immutable; each <c>With…</c> method returns a changed copy.</summary>
/// <remarks>What is not given does not apply and says so. Only the outlet quality has a default, which the site must confirm.</remarks>
public sealed class SiteLimits
{
    private double _quality = 0.80, _fluxPeak = 1, _metal = double.NaN, _lowestDifferential = double.NaN, _highestDifferential = double.NaN, _lowestFlow = double.NaN, _highestFlow = double.NaN;
    private SolidsLimit[] _solids = [];

    private SiteLimits()
    {
    }

    /// <summary>Outlet quality 0.80, not confirmed; nothing else.</summary>
    public static SiteLimits Default { get; } = new();

    /// <summary>Greatest outlet quality: 0.80 until the site says otherwise.</summary>
    /// <remarks>
    /// Usual for plain bores, so that the water left carries the dissolved solids. It is a habit, not a law: the feed water, the tubes and the
    /// spread between passes decide, so confirm it. Source: Fanaritis and Kimmel, J. Pet. Tech. 17(4), 409-416 (1965).
    /// </remarks>
    public MassFraction OutletQuality => MassFraction.FromDecimalFractions(_quality);

    /// <summary>True once the site has given its own outlet quality.</summary>
    public bool IsOutletQualityConfirmed { get; private set; }

    /// <summary>Limits on what is dissolved in the outlet water; none unless given.</summary>
    public IReadOnlyList<SolidsLimit> Solids => _solids;

    /// <summary>Greatest temperature of the outside of the tube metal; null unless given.</summary>
    public Temperature? MetalTemperature => double.IsNaN(_metal) ? null : Temperature.FromKelvins(_metal);

    /// <summary>Heat flux on the side that faces the flame over the mean around the tube; 1 unless given.</summary>
    public double FluxPeak => _fluxPeak;

    /// <summary>C of the erosional velocity C/√ρ, in ft/s and lb/ft³ as it is quoted; null unless given.</summary>
    public double? ErosionFactor { get; private set; }

    /// <summary>Smallest differential that the transmitter at the outlet reads; null unless given.</summary>
    public Pressure? LowestDifferential => double.IsNaN(_lowestDifferential) ? null : Pressure.FromPascals(_lowestDifferential);

    /// <summary>Greatest differential that the transmitter at the outlet reads; null unless given.</summary>
    public Pressure? HighestDifferential => double.IsNaN(_highestDifferential) ? null : Pressure.FromPascals(_highestDifferential);

    /// <summary>Smallest feed flow of the pass; null unless given.</summary>
    public MassFlow? LowestFlow => double.IsNaN(_lowestFlow) ? null : MassFlow.FromKilogramsPerSecond(_lowestFlow);

    /// <summary>Greatest feed flow of the pass; null unless given.</summary>
    public MassFlow? HighestFlow => double.IsNaN(_highestFlow) ? null : MassFlow.FromKilogramsPerSecond(_highestFlow);

    internal double RawQuality => _quality;

    internal double RawMetal => _metal;

    internal (double Low, double High) RawDifferential => (_lowestDifferential, _highestDifferential);

    internal (double Low, double High) RawFlow => (_lowestFlow, _highestFlow);

    /// <summary>With the site's own limit of outlet quality, which confirms it.</summary>
    /// <param name="quality">Greater than 0, at most 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">The quality is outside its limits.</exception>
    public SiteLimits WithOutletQuality(MassFraction quality)
    {
        double x = Require.Within(Require.Positive(quality.Si(), "Limit of outlet quality", Scale.None, nameof(quality)), 0, 1, "Limit of outlet quality", Scale.None, nameof(quality));
        return Changed(limits => (limits._quality, limits.IsOutletQualityConfirmed) = (x, true));
    }

    /// <summary>With limits on what is dissolved, in place of any before.</summary>
    /// <param name="solids">The limits.</param>
    /// <exception cref="ArgumentNullException"><paramref name="solids"/> is null.</exception>
    public SiteLimits WithSolids(params SolidsLimit[] solids)
    {
        var copy = (SolidsLimit[])Require.NotNull(solids, nameof(solids)).Clone();
        return Changed(limits => limits._solids = copy);
    }

    /// <summary>With the greatest temperature of the tube metal, outside, as the code of construction or the site sets it.</summary>
    /// <param name="limit">Greater than absolute zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is not greater than absolute zero.</exception>
    public SiteLimits WithMetalTemperature(Temperature limit)
    {
        double kelvins = Require.Positive(limit.Si(), "Limit of metal temperature", Scale.Celsius, nameof(limit));
        return Changed(limits => limits._metal = kelvins);
    }

    /// <summary>With the flux on the flame side of a radiant tube over the mean around it; see <see cref="Passes.PassProfile.WallAt"/>.</summary>
    /// <param name="fluxPeak">1 to 4.</param>
    /// <exception cref="ArgumentOutOfRangeException">The factor is outside its limits.</exception>
    public SiteLimits WithFluxPeak(double fluxPeak)
    {
        Passes.PassProfile.CheckedFluxPeak(fluxPeak);
        return Changed(limits => limits._fluxPeak = fluxPeak);
    }

    /// <summary>With the factor C of the erosional velocity.</summary>
    /// <remarks>
    /// <para>u = C/√ρ, u in ft/s, ρ density of both phases at one velocity in lb/ft³.</para>
    /// <para>Range: API RP 14E has 100 for continuous and 125 for intermittent service without solids, and says less where solids are carried. At 10 MPa
    /// and a quality of 0.8 a usual evaporator pass stands at about 100 and does well, so no factor is taken unless the site gives one.</para>
    /// <para>Accuracy: none stated; a rule of thumb.</para>
    /// <para>Source: API RP 14E, 5th ed. (1991), equation 2.14.</para>
    /// </remarks>
    /// <param name="factor">C, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">The factor is not greater than zero.</exception>
    public SiteLimits WithErosionFactor(double factor)
    {
        Require.Positive(factor, "Erosion factor C", Scale.None, nameof(factor));
        return Changed(limits => limits.ErosionFactor = factor);
    }

    /// <summary>With the range of the differential-pressure transmitter at the outlet.</summary>
    /// <param name="transmitter">The transmitter.</param>
    /// <exception cref="ArgumentNullException"><paramref name="transmitter"/> is null.</exception>
    public SiteLimits WithTransmitter(DifferentialPressureTransmitter transmitter)
    {
        Require.NotNull(transmitter, nameof(transmitter));
        double low = transmitter.Lower.Si() + (transmitter.LowCutoff.Si() * transmitter.Span.Si()), high = transmitter.Upper.Si();
        return Changed(limits => (limits._lowestDifferential, limits._highestDifferential) = (low, high));
    }

    /// <summary>With the range that the feed flow of the pass must keep.</summary>
    /// <param name="lowest">Zero or more.</param>
    /// <param name="highest">Above the lowest.</param>
    /// <exception cref="ArgumentOutOfRangeException">The range is not in order.</exception>
    public SiteLimits WithFlowRange(MassFlow lowest, MassFlow highest)
    {
        double low = Require.NotNegative(lowest.Si(), "Lowest flow", Scale.KilogramsPerSecond, nameof(lowest)), high = Require.Positive(highest.Si(), "Highest flow", Scale.KilogramsPerSecond, nameof(highest));
        if (high <= low) throw Require.OutOfRange(high, "Highest flow", Scale.KilogramsPerSecond, nameof(highest), $"must be above the lowest, {Scale.KilogramsPerSecond.Text(low)}");
        return Changed(limits => (limits._lowestFlow, limits._highestFlow) = (low, high));
    }

    private SiteLimits Changed(Action<SiteLimits> change)
    {
        var copy = (SiteLimits)MemberwiseClone();
        change(copy);
        return copy;
    }
}
