using TwoPhase.Limits;
using TwoPhase.Stability;

namespace PassReport.Report;

/// <summary>How far one pass is from harm, at rest as it reads.</summary>
internal sealed class Margins
{
    private Margins(PassSummary pass, Interior interior, SiteLimits site)
    {
        Pass = pass;
        Interior = interior;
        Limits = PassLimits.Of(interior.Profile, site);
        Wave = DensityWave.Of(interior.Profile);
    }

    public PassSummary Pass { get; }

    public Interior Interior { get; }

    public PassLimits Limits { get; }

    public DensityWave Wave { get; }

    public LimitFinding this[LimitKind kind] => Limits.First(row => row.Kind == kind);

    /// <summary>One entry for each pass whose interior is known, in the same order.</summary>
    public static IReadOnlyList<Margins> Of(IEnumerable<PassSummary> passes, SiteLimits site) =>
        [.. passes.Where(pass => pass.Interior is not null).Select(pass => new Margins(pass, pass.Interior!, site))];

    /// <summary>A margin as a number in the unit it is shown in; NaN where the limit does not apply.</summary>
    public static double Number(LimitFinding row) => row.Margin is { } margin ? (double)margin.Value : double.NaN;
}
