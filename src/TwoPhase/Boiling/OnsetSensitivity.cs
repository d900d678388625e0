using System.Globalization;
using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Boiling;

/// <summary>How far the onset of boiling moves downstream for a small change of one condition, the others held.</summary>
public readonly record struct OnsetSensitivity
{
    // Steps small against the curvature and large against the grid error of a solution.
    private const double Share = 2e-3, Kelvins = 0.5, Pascals = 2e4;

    private readonly double _heat, _flow, _temperature, _pressure;

    private OnsetSensitivity(double heat, double flow, double temperature, double pressure) =>
        (_heat, _flow, _temperature, _pressure) = (heat, flow, temperature, pressure);

    /// <summary>Per +1 % of absorbed heat.</summary>
    public Length PerPercentOfHeat => Length.FromMeters(_heat / 100);

    /// <summary>Per +1 % of feed flow.</summary>
    public Length PerPercentOfFlow => Length.FromMeters(_flow / 100);

    /// <summary>Per +1 K of feed temperature.</summary>
    public Length PerKelvinOfFeed => Length.FromMeters(_temperature);

    /// <summary>Per +0.1 MPa of outlet pressure.</summary>
    public Length PerTenthOfMegapascal => Length.FromMeters(_pressure * 1e5);

    internal static OnsetSensitivity? Of(PassProfile profile, Func<PassProfile, PassNode?> search)
    {
        PassConditions at = profile.Conditions;
        double? heat = Slope(profile, search, Share, step => at with { RawAbsorbedHeat = at.RawAbsorbedHeat * (1 + step) });
        double? flow = Slope(profile, search, Share, step => at with { RawFeedFlow = at.RawFeedFlow * (1 + step) });
        double? temperature = Slope(profile, search, Kelvins, step => Warmer(profile, at, step));
        double? pressure = Slope(profile, search, Pascals, step => at with { RawOutletPressure = at.RawOutletPressure + step });
        return heat is { } h && flow is { } f && temperature is { } t && pressure is { } p ? new(h, f, t, p) : null;
    }

    private static PassConditions Warmer(PassProfile profile, in PassConditions at, double step) =>
        (at.IsFeedByEnthalpy ? at.WithFeedTemperature(profile.Inlet.Temperature) : at).WithFeedTemperature(Temperature.FromKelvins(profile.Inlet.Temperature.Kelvins + step));

    private static double? Slope(PassProfile profile, Func<PassProfile, PassNode?> search, double step, Func<double, PassConditions> conditions) =>
        Onset(profile, search, conditions(step)) is { } above && Onset(profile, search, conditions(-step)) is { } below ? (above - below) / (2 * step) : null;

    private static double? Onset(PassProfile profile, Func<PassProfile, PassNode?> search, in PassConditions conditions)
    {
        PassProfile moved = SteadyState.Solve(profile.Pass, conditions, profile.Models, profile.Options.WithTolerance(1e-9));
        return search(moved) is { Position: > 0 } node ? node.Position : null;
    }

    internal object ToDump() => ToString();

    /// <summary>The sensitivities in a line, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "onset moves {0:+0.00;-0.00} m per % of heat, {1:+0.00;-0.00} m per % of flow, {2:+0.00;-0.00} m per K of feed, {3:+0.00;-0.00} m per 0.1 MPa",
        PerPercentOfHeat.Meters,
        PerPercentOfFlow.Meters,
        PerKelvinOfFeed.Meters,
        PerTenthOfMegapascal.Meters);
}
