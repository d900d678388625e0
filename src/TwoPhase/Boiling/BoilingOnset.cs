using System.Globalization;
using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Boiling;

/// <summary>Where a pass begins to boil: the place where equilibrium quality is zero, upstream of which only liquid flows.</summary>
/// <remarks>
/// <para>h(z) = h′(p(z)): the heat taken up so far has brought the feed to saturation at the local pressure.</para>
/// <para>Source: definition; Collier and Thome, Convective Boiling and Condensation, 3rd ed. (1994), section 5.1.</para>
/// </remarks>
public sealed class BoilingOnset
{
    private readonly PassProfile _profile;
    private readonly PassNode _node;

    private BoilingOnset(PassProfile profile, int row)
    {
        _profile = profile;
        _node = profile.Nodes[row];
        IsAtInlet = row == 0;
    }

    /// <summary>The onset of boiling of a pass; null when the pass nowhere boils.</summary>
    /// <param name="profile">The steady state of the pass.</param>
    /// <exception cref="ArgumentNullException"><paramref name="profile"/> is null.</exception>
    public static BoilingOnset? Of(PassProfile profile) =>
        Units.Require.NotNull(profile, nameof(profile)).OnsetRow is >= 0 and int row ? new(profile, row) : null;

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

    /// <summary>Temperature at the onset: saturation at that pressure.</summary>
    public Temperature Temperature => Temperature.FromKelvins(_node.Temperature);

    /// <summary>How the onset moves with firing, feed flow, feed temperature and outlet pressure; null where the onset is at an end of the pass.</summary>
    /// <remarks>Central differences of the steady state, the pass solved anew on both sides; some milliseconds.</remarks>
    public OnsetSensitivity? Sensitivity() => OnsetSensitivity.Of(_profile);

    private ref readonly Duct Duct => ref _profile.Pass.Ducts[_node.Duct];

    /// <summary>The onset in a line, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "boils from {0:F1} m in section '{1}' ({2:F1} % of the length, {3:F1} % of the volume) at {4:F3} MPa, {5:F2} °C",
        _node.Position,
        Section,
        ShareOfLength.Percent,
        ShareOfVolume.Percent,
        _node.Pressure * 1e-6,
        _node.Temperature - 273.15);
}
