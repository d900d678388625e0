using System.Collections;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Limits;

/// <summary>How far a pass is from harm: one table of limits, the site's own limit of outlet quality first.</summary>
/// <remarks>
/// <para>Rows: outlet quality, solids, critical quality (mean, top and bottom of the tube), stratification, metal temperature, erosional velocity, differential
/// of the meter, feed flow. A limit that was not given or does not apply has a row that says why.</para>
/// <para>Metal temperature and critical quality take the flux on the hot side (<see cref="SiteLimits.FluxPeak"/>) and a wet wall; see <see cref="PassProfile.WallAt"/>.</para>
/// <para>Computed at rest from a model of the pass. These figures never replace tube-skin thermocouples, trips or the plant's protective systems;
/// local codes and licensed engineers come first.</para>
/// </remarks>
public sealed class PassLimits : IReadOnlyList<LimitFinding>
{
    private readonly LimitFinding[] _rows;

    private PassLimits(PassProfile profile, SiteLimits site)
    {
        Profile = profile;
        Site = site;
        LimitFigure[] figures = LimitRules.Of(profile, site, out CriticalIndicator? critical);
        Critical = critical;
        var steps = new Lazy<(LimitInput Input, LimitFigure[]? Figures)[]>(() => [.. LimitSteps.Of(profile).Select(step => (step.Input, step.Profile is { } moved ? LimitRules.Of(moved, site, out _) : null))]);
        _rows = [.. figures.Select((figure, i) => new LimitFinding(figure, profile.Pass, () => Effects(figure, i, steps.Value)))];
    }

    /// <summary>The limits of a pass in a steady state.</summary>
    /// <param name="profile">The steady state.</param>
    /// <param name="site">The site's limits; <see cref="SiteLimits.Default"/> where none are given.</param>
    /// <exception cref="ArgumentNullException"><paramref name="profile"/> is null.</exception>
    public static PassLimits Of(PassProfile profile, SiteLimits? site = null) => new(Require.NotNull(profile, nameof(profile)), site ?? SiteLimits.Default);

    /// <summary>The steady state.</summary>
    public PassProfile Profile { get; }

    /// <summary>The site's limits.</summary>
    public SiteLimits Site { get; }

    /// <summary>The site's own limit of outlet quality.</summary>
    public LimitFinding Headline => _rows[0];

    /// <summary>The rows that are beyond their limit; indicators are never among them.</summary>
    public IReadOnlyList<LimitFinding> Beyond => [.. _rows.Where(row => row.Status == LimitStatus.Beyond)];

    /// <summary>The correlated critical quality and the metal it would lead to; null where no heated tube carries two phases.</summary>
    public CriticalIndicator? Critical { get; }

    /// <summary>How many times what does not evaporate is concentrated in the outlet water: 1/(1 − x); null where no water leaves.</summary>
    public double? ConcentrationFactor => Profile.Nodes[^1].Flow.Quality is < 1 and double x ? 1 / (1 - x) : null;

    /// <summary>Number of rows.</summary>
    public int Count => _rows.Length;

    /// <summary>A row.</summary>
    /// <param name="index">0 is the headline.</param>
    public LimitFinding this[int index] => _rows[index];

    /// <summary>The rows.</summary>
    public IEnumerator<LimitFinding> GetEnumerator() => ((IEnumerable<LimitFinding>)_rows).GetEnumerator();

    IEnumerator IEnumerable.GetEnumerator() => GetEnumerator();

    private static LimitEffect[] Effects(in LimitFigure figure, int row, (LimitInput Input, LimitFigure[]? Figures)[] steps)
    {
        if (figure.Status == LimitStatus.NotApplicable) return [];
        var effects = new LimitEffect[steps.Length];
        for (int i = 0; i < steps.Length; i++)
        {
            double change = steps[i].Figures is { } moved && moved[row].Status != LimitStatus.NotApplicable ? moved[row].Margin - figure.Margin : double.NaN;
            effects[i] = new(steps[i].Input, change, figure.Quantity);
        }

        return effects;
    }

    /// <summary>The headline.</summary>
    public override string ToString() => Headline.ToString();
}
