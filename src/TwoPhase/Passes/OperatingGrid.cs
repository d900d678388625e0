using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>The flows, heats and feed temperatures that an operating map is drawn over; every combination is a cell. Immutable.</summary>
public sealed class OperatingGrid
{
    private readonly MassFlow[] _flows;
    private readonly Power[] _heats;
    private readonly Temperature[] _feedTemperatures;

    /// <summary>A grid of flow, absorbed heat and feed temperature.</summary>
    /// <param name="flows">Feed flows, each greater than zero.</param>
    /// <param name="heats">Absorbed heats, each zero or more.</param>
    /// <param name="feedTemperatures">Feed temperatures.</param>
    /// <exception cref="ArgumentException">An axis is empty.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its limits.</exception>
    public OperatingGrid(IEnumerable<MassFlow> flows, IEnumerable<Power> heats, IEnumerable<Temperature> feedTemperatures)
    {
        _flows = Axis(flows, "feed flows", nameof(flows));
        _heats = Axis(heats, "absorbed heats", nameof(heats));
        _feedTemperatures = Axis(feedTemperatures, "feed temperatures", nameof(feedTemperatures));
        foreach (MassFlow flow in _flows) Require.Positive(flow.Si(), "Feed flow", Scale.KilogramsPerSecond, nameof(flows));
        foreach (Power heat in _heats) Require.NotNegative(heat.Si(), "Absorbed heat", Scale.Megawatts, nameof(heats));
        foreach (Temperature temperature in _feedTemperatures) Require.Positive(temperature.Si(), "Feed temperature", Scale.Celsius, nameof(feedTemperatures));
    }

    /// <summary>Feed flows.</summary>
    public IReadOnlyList<MassFlow> Flows => _flows;

    /// <summary>Absorbed heats.</summary>
    public IReadOnlyList<Power> Heats => _heats;

    /// <summary>Feed temperatures.</summary>
    public IReadOnlyList<Temperature> FeedTemperatures => _feedTemperatures;

    /// <summary>Number of cells.</summary>
    public int Count => _flows.Length * _heats.Length * _feedTemperatures.Length;

    /// <summary>A grid of flow, firing and feed temperature, heat being firing times the heat at full firing of the pass.</summary>
    /// <param name="pass">The pass; its heat at full firing is known.</param>
    /// <param name="flows">Feed flows, each greater than zero.</param>
    /// <param name="firings">Firings, each zero or more.</param>
    /// <param name="feedTemperatures">Feed temperatures.</param>
    /// <exception cref="ArgumentException">The heat at full firing of the pass is unknown, or an axis is empty.</exception>
    public static OperatingGrid OfFiring(Pass pass, IEnumerable<MassFlow> flows, IEnumerable<Ratio> firings, IEnumerable<Temperature> feedTemperatures)
    {
        double full = Require.NotNull(pass, nameof(pass)).HeatAtFullFiring is { } heat ? heat.Si() : throw new ArgumentException($"The heat at full firing of pass '{pass.Name}' is not known.", nameof(pass));
        return new(flows, Require.NotNull(firings, nameof(firings)).Select(firing => Power.FromWatts(firing.Si() * full)), feedTemperatures);
    }

    private static T[] Axis<T>(IEnumerable<T> values, string what, string parameter)
    {
        T[] axis = [.. Require.NotNull(values, parameter)];
        return axis.Length > 0 ? axis : throw new ArgumentException($"The grid has no {what}.", parameter);
    }
}
