using System.Globalization;
using TwoPhase.HeatTransfer;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Boiling;

/// <summary>Where a pass begins to boil: where equilibrium quality is zero, or where bubbles first form, or where vapour first stays.</summary>
/// <remarks>
/// <para>Equilibrium: h(z) = h′(p(z)), the heat taken up so far has brought the feed to saturation at the local pressure.</para>
/// <para>First bubbles: T + q/h = Ts + ΔT, with h the film of the liquid alone (Gnielinski) and ΔT the superheat of an <see cref="OnsetModel"/>.</para>
/// <para>Net vapour: xe = xd of a <see cref="NetVapourModel"/>, slightly below zero.</para>
/// <para>The latter two take the mean flux around the tube, lie upstream of the first, and end there at the latest.</para>
/// <para>Source: definitions; Collier and Thome, Convective Boiling and Condensation, 3rd ed. (1994), sections 5.1 to 5.3 and 6.4.</para>
/// </remarks>
public sealed class BoilingOnset
{
    private readonly PassProfile _profile;
    private readonly PassNode _node;
    private readonly Func<PassProfile, PassNode?> _search;

    private BoilingOnset(PassProfile profile, in PassNode node, OnsetDefinition definition, Func<PassProfile, PassNode?> search)
    {
        _profile = profile;
        _node = node;
        _search = search;
        Definition = definition;
        IsAtInlet = node.Position == 0;
    }

    /// <summary>Where equilibrium quality is zero, upstream of which only liquid flows; null when the pass nowhere boils.</summary>
    /// <param name="profile">The steady state of the pass.</param>
    /// <exception cref="ArgumentNullException"><paramref name="profile"/> is null.</exception>
    public static BoilingOnset? Of(PassProfile profile) =>
        Of(profile, OnsetDefinition.Equilibrium, static profile => profile.OnsetRow is >= 0 and int row ? profile.Nodes[row] : null);

    /// <summary>Where bubbles first form on the wall; null when none form.</summary>
    /// <param name="profile">The steady state of the pass.</param>
    /// <param name="model">The superheat that bubbles need; <see cref="OnsetModel.Default"/> where none is given.</param>
    /// <exception cref="ArgumentNullException"><paramref name="profile"/> is null.</exception>
    public static BoilingOnset? FirstBubbles(PassProfile profile, OnsetModel? model = null)
    {
        OnsetModel onset = model ?? OnsetModel.Default;
        return Of(profile, OnsetDefinition.FirstBubbles, profile => OnsetSearch.First(profile, (node, flux) => OnsetSearch.BubbleLead(node, flux, onset)));
    }

    /// <summary>Where vapour first stays in the flow; null when none does.</summary>
    /// <param name="profile">The steady state of the pass.</param>
    /// <param name="model">The subcooling at which vapour stays; <see cref="NetVapourModel.SahaZuber"/> where none is given.</param>
    /// <exception cref="ArgumentNullException"><paramref name="profile"/> is null.</exception>
    public static BoilingOnset? NetVapour(PassProfile profile, NetVapourModel? model = null)
    {
        NetVapourModel departure = model ?? NetVapourModel.SahaZuber;
        return Of(profile, OnsetDefinition.NetVapour, profile => OnsetSearch.First(profile, (node, flux) => OnsetSearch.VapourLead(node, flux, departure)));
    }

    private static BoilingOnset? Of(PassProfile profile, OnsetDefinition definition, Func<PassProfile, PassNode?> search) =>
        search(Require.NotNull(profile, nameof(profile))) is { } node ? new(profile, node, definition, search) : null;

    /// <summary>Which of the three onsets this is.</summary>
    public OnsetDefinition Definition { get; }

    /// <summary>True when the feed already boils where it enters.</summary>
    public bool IsAtInlet { get; }

    /// <summary>Name of the section where boiling begins.</summary>
    public string Section => Duct.Name;

    /// <summary>Distance from the inlet of the pass along the flow path.</summary>
    public Length Position => Length.FromMeters(_node.Position);

    /// <summary>Share of the length of the pass that lies upstream.</summary>
    public Ratio ShareOfLength => Ratio.FromDecimalFractions(_node.Position / _profile.Pass.Ducts[^1].End);

    /// <summary>Share of the water-side volume of the pass that lies upstream: filled with liquid.</summary>
    public Ratio ShareOfVolume => Ratio.FromDecimalFractions(_node.Volume / _profile.Pass.Ducts[^1].VolumeAfter);

    /// <summary>Share of the heated inside surface of the pass that lies upstream; null when no section is heated.</summary>
    public Ratio? ShareOfSurface
    {
        get
        {
            double all = 0, upstream = 0;
            foreach (Duct duct in _profile.Pass.Ducts)
            {
                if (!(duct.HeatShare > 0)) continue;
                all += duct.Perimeter * duct.Length;
                upstream += duct.Perimeter * Math.Min(Math.Max(_node.Position - duct.Start, 0), duct.Length);
            }

            return all > 0 ? Ratio.FromDecimalFractions(upstream / all) : null;
        }
    }

    /// <summary>Absolute pressure at the onset.</summary>
    public Pressure Pressure => Pressure.FromPascals(_node.Pressure);

    /// <summary>Temperature of the flow at the onset: saturation at that pressure for equilibrium, less for the other two.</summary>
    public Temperature Temperature => Temperature.FromKelvins(_node.Temperature);

    /// <summary>How the onset moves with firing, feed flow, feed temperature and outlet pressure; null where the onset is at an end of the pass.</summary>
    /// <remarks>Central differences of the steady state, the pass solved anew on both sides; some milliseconds.</remarks>
    public OnsetSensitivity? Sensitivity() => OnsetSensitivity.Of(_profile, _search);

    private ref readonly Duct Duct => ref _profile.Pass.Ducts[_node.Duct];

    internal object ToDump() => ToString();

    /// <summary>The onset in a line, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "{6} from {0:F1} m in section '{1}' ({2:F1} % of the length, {3:F1} % of the volume) at {4:F3} MPa, {5:F2} °C",
        _node.Position,
        Section,
        ShareOfLength.Percent,
        ShareOfVolume.Percent,
        _node.Pressure * 1e-6,
        _node.Temperature - 273.15,
        Definition switch { OnsetDefinition.FirstBubbles => "bubbles", OnsetDefinition.NetVapour => "vapour stays", _ => "boils" });
}
