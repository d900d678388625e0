using System.Globalization;
using TwoPhase.HeatTransfer;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Holdup;

/// <summary>The water and steam that stand in a pass, by section and on either side of the boiling onset.</summary>
/// <remarks>
/// <para>M = ∫ [α ρg + (1 − α) ρl] dV along the pass, with α void fraction of the slip model, V water-side volume.</para>
/// <para>Any change of it makes the reading of an outlet meter false while it lasts: see <see cref="HoldupChange"/>.</para>
/// <para>Published slip models differ sixfold in the liquid that they leave at a pass outlet, and there are practically no open data for
/// horizontal tubes of 50 to 80 mm at 8 to 12 MPa: treat the holdup downstream of the onset as good to 30 %.</para>
/// </remarks>
public sealed class WaterHoldup
{
    private readonly double _liquid, _vapour, _upstream, _liquidVolume;

    private WaterHoldup(PassProfile profile, VoidFractionModel slip, NetVapourModel? subcooled = null)
    {
        Profile = profile;
        Slip = slip;
        Subcooled = subcooled;
        var liquid = new double[profile.Pass.Ducts.Length];
        var vapour = new double[liquid.Length];
        double onset = profile.OnsetRow is >= 0 and int row ? profile.Nodes[row].Position : double.PositiveInfinity;
        foreach (NodePanel panel in new NodePanels(Standing()))
        {
            double area = profile.Pass.Ducts[panel.Duct].Area;
            double water = area * panel.Integral(static (in PassNode node) => (1 - node.VoidFraction) * node.Flow.LiquidDensity), steam = area * panel.Integral(static (in PassNode node) => node.VoidFraction * node.Flow.VapourDensity);
            liquid[panel.Duct] += water;
            vapour[panel.Duct] += steam;
            _liquidVolume += area * panel.Integral(static (in PassNode node) => 1 - node.VoidFraction);
            if (panel.Nodes[Panel.Intervals].Position <= onset) _upstream += water + steam;
        }

        _liquid = liquid.Sum();
        _vapour = vapour.Sum();
        Sections = [.. profile.Pass.Ducts.Select((duct, i) => new SectionHoldup(duct.Name, liquid[i], vapour[i], duct.Area * duct.Length))];
    }

    /// <summary>The holdup of a pass by the slip model that its profile was solved with.</summary>
    /// <param name="profile">The steady state of the pass.</param>
    /// <exception cref="ArgumentNullException"><paramref name="profile"/> is null.</exception>
    public static WaterHoldup Of(PassProfile profile) => new(Require.NotNull(profile, nameof(profile)), profile.Models.Slip);

    /// <summary>The holdup by another slip model, pressures and qualities along the pass as in the profile.</summary>
    /// <param name="profile">The steady state of the pass.</param>
    /// <param name="slip">The slip model.</param>
    /// <exception cref="ArgumentNullException">An argument is null.</exception>
    public static WaterHoldup Of(PassProfile profile, VoidFractionModel slip) => new(Require.NotNull(profile, nameof(profile)), Require.NotNull(slip, nameof(slip)));

    /// <summary>The holdup with the vapour that stands in liquid which is still subcooled, by Levy's true quality.</summary>
    /// <remarks>
    /// <para>In an evaporator pass it moves the water held by less than 1 %, so it is left out unless asked for; see <see cref="NetVapourModel.TrueQuality"/>.</para>
    /// <para>The density of the liquid stays that of the row; the mean flux around the tube counts.</para>
    /// </remarks>
    /// <param name="profile">The steady state of the pass.</param>
    /// <param name="slip">The slip model.</param>
    /// <param name="subcooled">Where vapour first stays.</param>
    /// <exception cref="ArgumentNullException">An argument is null.</exception>
    public static WaterHoldup Of(PassProfile profile, VoidFractionModel slip, NetVapourModel subcooled) =>
        new(Require.NotNull(profile, nameof(profile)), Require.NotNull(slip, nameof(slip)), Require.NotNull(subcooled, nameof(subcooled)));

    /// <summary>The holdup by every slip model side by side: their spread is the honest uncertainty.</summary>
    /// <param name="profile">The steady state of the pass.</param>
    /// <exception cref="ArgumentNullException"><paramref name="profile"/> is null.</exception>
    public static IReadOnlyList<WaterHoldup> OfEveryModel(PassProfile profile) => [.. VoidFractionModel.All.Select(slip => Of(profile, slip))];

    /// <summary>The steady state that it was taken from.</summary>
    public PassProfile Profile { get; }

    /// <summary>The slip model.</summary>
    public VoidFractionModel Slip { get; }

    /// <summary>Where vapour first stays in subcooled liquid; null when such vapour is left out.</summary>
    public NetVapourModel? Subcooled { get; }

    /// <summary>Liquid standing in the pass.</summary>
    public Mass Liquid => Mass.FromKilograms(_liquid);

    /// <summary>Vapour standing in the pass.</summary>
    public Mass Vapour => Mass.FromKilograms(_vapour);

    /// <summary>Water and steam together.</summary>
    public Mass Total => Mass.FromKilograms(RawTotal);

    /// <summary>What stands upstream of the boiling onset; all of it in a pass that nowhere boils.</summary>
    public Mass UpstreamOfOnset => Mass.FromKilograms(_upstream);

    /// <summary>What stands downstream of the boiling onset.</summary>
    public Mass DownstreamOfOnset => Mass.FromKilograms(RawTotal - _upstream);

    /// <summary>Section by section from inlet to outlet, the outlet line last.</summary>
    public IReadOnlyList<SectionHoldup> Sections { get; }

    /// <summary>Share of the water-side volume that liquid takes up.</summary>
    public Ratio LiquidShareOfVolume => Ratio.FromDecimalFractions(_liquidVolume / Profile.Pass.Ducts[^1].VolumeAfter);

    /// <summary>Mean residence time M/ṁ of what flows through the pass.</summary>
    public Duration ResidenceTime => Duration.FromSeconds(RawTotal / Profile.Conditions.RawFeedFlow);

    /// <summary>What changes between this steady state and another.</summary>
    /// <param name="later">The other steady state of the same pass.</param>
    /// <exception cref="ArgumentNullException"><paramref name="later"/> is null.</exception>
    public HoldupChange ChangeTo(WaterHoldup later) => new(this, Require.NotNull(later, nameof(later)));

    internal double RawTotal => _liquid + _vapour;

    /// <summary>The rows with the void fraction of this slip model.</summary>
    private PassNode[] Standing()
    {
        PassNode[] nodes = Profile.Nodes.ToArray();
        foreach (ref PassNode node in nodes.AsSpan())
        {
            double x = Quality(node);
            node = node with { VoidFraction = x is > 0 and < 1 ? Slip.VoidFractionCore(node.Flow with { Quality = x }) : x };
        }

        return nodes;
    }

    private double Quality(in PassNode node)
    {
        if (Subcooled is null || node.EquilibriumQuality >= 1) return node.Flow.Quality;
        double flux = Math.Max(0, node.LinearHeat / Profile.Pass.Ducts[node.Duct].Perimeter);
        return NetVapourModel.LevyTrueQuality(node.EquilibriumQuality, Subcooled.DepartureCore(WallSolver.Saturated(node), flux));
    }

    internal object ToDump() => ToString();

    /// <summary>The holdup in a line, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "{0:F1} kg ({1:F1} kg liquid, {2:F1} kg vapour), {3:F1} kg of it upstream of boiling, residence {4:F0} s, by {5}",
        RawTotal,
        _liquid,
        _vapour,
        _upstream,
        RawTotal / Profile.Conditions.RawFeedFlow,
        Slip.Name);
}
