using TwoPhase.Numerics;
using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Limits;

/// <summary>The steady states that one step of each input leads to.</summary>
internal static class LimitSteps
{
    private const double Share = 0.01, Kelvins = 1, Pascals = 1e5, ScaleThickness = 1e-4;

    public static IEnumerable<(LimitInput Input, PassProfile? Profile)> Of(PassProfile profile)
    {
        PassConditions at = profile.Conditions;
        Pass pass = profile.Pass;
        yield return (LimitInput.Heat, Solved(profile, pass, () => at with { RawAbsorbedHeat = at.RawAbsorbedHeat * (1 + Share) }));
        yield return (LimitInput.FeedFlow, Solved(profile, pass, () => at with { RawFeedFlow = at.RawFeedFlow * (1 + Share) }));
        yield return (LimitInput.FeedTemperature, Solved(profile, pass, () => at.WithFeedTemperature(Temperature.FromKelvins(profile.Inlet.Temperature.Kelvins + Kelvins))));
        yield return (LimitInput.OutletPressure, Solved(profile, pass, () => at with { RawOutletPressure = at.RawOutletPressure + Pascals }));
        yield return (LimitInput.Scale, Solved(profile, pass.WithAddedScale(Length.FromMeters(ScaleThickness)), () => at));
    }

    // A step that leads out of the formulation, or to no steady state, has no effect to show.
    private static PassProfile? Solved(PassProfile profile, Pass pass, Func<PassConditions> conditions)
    {
        try
        {
            return SteadyState.Solve(pass, conditions(), profile.Models, profile.Options);
        }
        catch (Exception error) when (error is ArgumentException or ConvergenceException)
        {
            return null;
        }
    }
}
