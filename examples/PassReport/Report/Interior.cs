using TwoPhase.Boiling;
using TwoPhase.Holdup;
using TwoPhase.Passes;
using UnitsNet;

namespace PassReport.Report;

/// <summary>What must stand inside a pass if it is at rest and its meter is right: the steady state with the heat that makes the quality read.</summary>
internal sealed class Interior
{
    private Interior(PassProfile profile)
    {
        Profile = profile;
        Onset = BoilingOnset.Of(profile);
        Holdup = WaterHoldup.Of(profile);
    }

    public PassProfile Profile { get; }

    public BoilingOnset? Onset { get; }

    public WaterHoldup Holdup { get; }

    /// <summary>The interior of a pass at the means of its last ten minutes; null where its file gives no tubes, its inputs still move, or its readings allow no steady state.</summary>
    public static Interior? Of(PassSummary pass)
    {
        if (pass.IsMovingNow || pass.Series.Pass.Sections.Count == 0 || !(pass.Quality is > 0 and < 1) || !double.IsFinite(pass.FeedTemperature)) return null;
        var conditions = new PassConditions(MassFlow.FromKilogramsPerSecond(pass.Flow), Temperature.FromKelvins(pass.FeedTemperature), Pressure.FromPascals(pass.Pressure), Power.Zero);
        try
        {
            return new(SteadyState.FindHeat(pass.Series.Pass, conditions, MassFraction.FromDecimalFractions(pass.Quality)));
        }
        catch (Exception error) when (error is ArgumentException or TwoPhase.Numerics.ConvergenceException)
        {
            return null;
        }
    }
}
