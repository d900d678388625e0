using TwoPhase.Uncertainty;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>Steam quality from a species that stays in the water: the less water is left, the more it is concentrated.</summary>
/// <remarks>
/// <para>x = (1 − e)/(1 − k), e = (1 − r)·w₀/w + r/(1 − yr): what enters the passes over what the separator's water holds.</para>
/// <para>w₀, w mass shares of the species in feed and separator water (concentration over density of the sample), r share of recycled water in the feed that joins behind the feed
/// sample, yr what of it has flashed off on its way, k concentration in the steam over that in the water. Without recycle and carry-over x = 1 − w₀/w.</para>
/// <para>Range: a species that does not evaporate, fall out or react, at one time of the water: chloride or sodium. Conductivity is not linear and changes with temperature, alkalinity
/// decomposes, hardness falls out, silica goes with the steam a little. Accuracy: u(x) = (1 − x)·u(w₀/w)/(w₀/w): 3 % of the ratio is 0.6 points at x = 0.8.</para>
/// <para>Source: balance of mass; the usual check of the trade, Fanaritis and Kimmel, J. Pet. Tech. 17(4), 409-416 (1965).</para>
/// </remarks>
public sealed class SolidsBalance
{
    private const string Feed = "feed", Water = "separator water", Recycle = "recycled share", CarryOver = "carry-over", OfPass = "quality";
    private const double MilligramsPerLitre = 1e3;

    private UncertainInput _feed, _water, _recycle = new(Recycle, 0, 0), _carryOver = new(CarryOver, 0, 0);
    private double _densityRatio = 1;   // water over feed
    private double _recycleConcentration = 1;

    /// <summary>Both concentrations as they were analysed.</summary>
    /// <param name="feed">Concentration in the feed, greater than zero; that of the time when the sampled water was feed, see <see cref="SolidsTransport"/>.</param>
    /// <param name="feedUncertainty">Its standard uncertainty.</param>
    /// <param name="water">Concentration in the sample of the separator's water, greater than zero.</param>
    /// <param name="waterUncertainty">Its standard uncertainty.</param>
    /// <exception cref="ArgumentOutOfRangeException">A concentration is not greater than zero, or an uncertainty is negative.</exception>
    public SolidsBalance(MassConcentration feed, MassConcentration feedUncertainty, MassConcentration water, MassConcentration waterUncertainty)
    {
        _feed = Analysed(Feed, feed, feedUncertainty, nameof(feed), nameof(feedUncertainty));
        _water = Analysed(Water, water, waterUncertainty, nameof(water), nameof(waterUncertainty));
    }

    /// <summary>How the water was sampled; cooled at pressure unless given.</summary>
    public WaterSample Sample { get; private set; } = WaterSample.CooledAtPressure;

    /// <summary>x at the separator, at its pressure; as computed: below 0 where the water is weaker than the feed.</summary>
    public UncertainValue<MassFraction> Quality
    {
        get
        {
            UncertaintyBudget budget = Budget;
            return new(MassFraction.FromDecimalFractions(budget.Value), MassFraction.FromDecimalFractions(budget.StandardUncertainty));
        }
    }

    /// <summary>What each input contributes to the uncertainty of the quality, the largest first.</summary>
    public UncertaintyBudget Budget => new MeasurementFunction(v => (1 - Entering(v)) / (1 - v[CarryOver]), _feed, _water, _recycle, _carryOver).Propagate();

    /// <summary>With the way the water was sampled.</summary>
    /// <param name="sample">How.</param>
    public SolidsBalance WithSample(WaterSample sample) => Changed(copy => copy.Sample = sample);

    /// <summary>With the densities of both samples at the temperature of analysis, where solids are counted by volume and make the water heavier: some 2 % of the ratio at 30 g/L.</summary>
    /// <param name="feed">Density of the feed sample.</param>
    /// <param name="water">Density of the water sample.</param>
    public SolidsBalance WithDensities(Density feed, Density water)
    {
        double ratio = Require.Positive(water.Si(), "Density of the water sample", Scale.KilogramsPerCubicMetre, nameof(water))
            / Require.Positive(feed.Si(), "Density of the feed sample", Scale.KilogramsPerCubicMetre, nameof(feed));
        return Changed(copy => copy._densityRatio = ratio);
    }

    /// <summary>With water of the separator that is recycled into the feed behind the place where the feed is sampled.</summary>
    /// <param name="share">Its share of the mass that enters the passes, 0 to below 1.</param>
    /// <param name="uncertainty">Standard uncertainty of the share.</param>
    /// <param name="letDown">What has flashed off on its way; nothing when it was cooled at pressure.</param>
    public SolidsBalance WithRecycle(Ratio share, Ratio uncertainty, WaterSample letDown)
    {
        double value = Require.Below(Require.NotNegative(share.Si(), "Recycled share", Scale.None, nameof(share)), 1, "Recycled share", Scale.None, nameof(share));
        UncertainInput recycle = new(Recycle, value, Require.NotNegative(uncertainty.Si(), "Uncertainty of the recycled share", Scale.None, nameof(uncertainty)));
        return Changed(copy => (copy._recycle, copy._recycleConcentration) = (recycle, letDown.ConcentrationFactor));
    }

    /// <summary>With what the steam carries: its concentration over that of the water, by droplets or because the species dissolves in steam.</summary>
    /// <param name="ratio">k, 0 to below 1.</param>
    /// <param name="uncertainty">Standard uncertainty of k.</param>
    public SolidsBalance WithCarryOver(Ratio ratio, Ratio uncertainty)
    {
        double value = Require.Below(Require.NotNegative(ratio.Si(), "Carry-over", Scale.None, nameof(ratio)), 1, "Carry-over", Scale.None, nameof(ratio));
        UncertainInput carried = new(CarryOver, value, Require.NotNegative(uncertainty.Si(), "Uncertainty of the carry-over", Scale.None, nameof(uncertainty)));
        return Changed(copy => copy._carryOver = carried);
    }

    /// <summary>What the outlet water of a pass holds at a quality.</summary>
    /// <param name="quality">x of the pass and its uncertainty, 0 to below 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">The quality is negative or leaves no water.</exception>
    public PassSolids OutletOf(UncertainValue<MassFraction> quality)
    {
        double x = Require.NotNegative(quality.Value.Si(), "Quality x", Scale.None, nameof(quality));
        UncertainInput input = new(OfPass, Require.Below(x, 1, "Quality x", Scale.None, nameof(quality)), quality.StandardUncertainty.Si());
        UncertaintyBudget factor = new MeasurementFunction(Factor, input, _carryOver).Propagate();
        UncertaintyBudget concentration = new MeasurementFunction(v => Entering(v) * v[Water] / Sample.ConcentrationFactor * Factor(v), _feed, _water, _recycle, _carryOver, input).Propagate();
        return new(factor, concentration, MilligramsPerLitre);

        static double Factor(InputValues v) => 1 / (1 - (v[OfPass] * (1 - v[CarryOver])));
    }

    // What enters the passes over what the separator's water holds, by mass.
    private double Entering(InputValues v) =>
        ((1 - v[Recycle]) * v[Feed] / v[Water] * Sample.ConcentrationFactor * _densityRatio) + (v[Recycle] * _recycleConcentration);

    private static UncertainInput Analysed(string name, MassConcentration value, MassConcentration uncertainty, string parameter, string uncertaintyParameter)
    {
        Scale scale = new("mg/L", MilligramsPerLitre);
        double si = Require.Positive(value.Si(), $"Concentration of the {name}", scale, parameter);
        double doubt = Require.NotNegative(uncertainty.Si(), $"Standard uncertainty of the {name}", scale, uncertaintyParameter);
        return new UncertainInput(name, si * MilligramsPerLitre, doubt * MilligramsPerLitre).WithUnit("mg/L");
    }

    private SolidsBalance Changed(Action<SolidsBalance> change)
    {
        var copy = (SolidsBalance)MemberwiseClone();
        change(copy);
        return copy;
    }

    internal object ToDump() => ToString();

    /// <summary>The quality and its budget.</summary>
    public override string ToString() => "quality " + Budget;
}
