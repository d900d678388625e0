using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>What is done to a generator in time: a schedule for each pass, and where the passes draw on one header the valves between.</summary>
/// <remarks>
/// Immutable; each method returns a changed copy. What all passes share (firing, feed temperature, header pressure) is moved in all of
/// them at once by <see cref="ForAll"/>; a ramp of the firing then reaches each by its share of the heat at the start.
/// </remarks>
public sealed class GeneratorSchedule
{
    private OperatingSchedule[] _passes;

    /// <summary>Nothing changes: the start of every other schedule.</summary>
    /// <param name="generator">The generator.</param>
    /// <param name="start">Conditions of each pass at the start.</param>
    /// <exception cref="ArgumentException">Conditions are outside their limits.</exception>
    public GeneratorSchedule(SteamGenerator generator, Func<Pass, PassConditions> start)
    {
        Generator = Require.NotNull(generator, nameof(generator));
        Require.NotNull(start, nameof(start));
        _passes = [.. generator.Passes.Select(pass => new OperatingSchedule(start(pass)))];
    }

    /// <summary>The generator.</summary>
    public SteamGenerator Generator { get; }

    /// <summary>The header that feeds the passes; null where each gets what its own schedule says.</summary>
    public FeedSupply? Supply { get; private set; }

    internal OperatingSchedule[] Passes => _passes;

    /// <summary>One fire at a firing that all passes share as they share the heat at full firing, the same feed flow for each.</summary>
    /// <param name="generator">The generator; each pass knows its heat at full firing.</param>
    /// <param name="firing">Firing at the start, zero or more.</param>
    /// <param name="feedFlow">Feed flow of each pass.</param>
    /// <param name="feedTemperature">Feed temperature.</param>
    /// <param name="outletPressure">Absolute pressure that the passes discharge into.</param>
    /// <exception cref="ArgumentException">A pass does not know its heat at full firing.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its limits.</exception>
    public static GeneratorSchedule AtFiring(SteamGenerator generator, Ratio firing, MassFlow feedFlow, Temperature feedTemperature, Pressure outletPressure)
    {
        double share = Require.NotNegative(firing.Si(), "Firing", Scale.None, nameof(firing));
        return new(generator, pass => pass.HeatAtFullFiring is { } full
            ? new PassConditions(feedFlow, feedTemperature, outletPressure, Power.FromWatts(share * full.Si()))
            : throw new ArgumentException($"Pass '{pass.Name}' does not know its heat at full firing.", nameof(generator)));
    }

    /// <summary>The schedule of a pass.</summary>
    /// <param name="pass">Name of the pass.</param>
    /// <exception cref="ArgumentException">There is no such pass.</exception>
    public OperatingSchedule Of(string pass) => _passes[Index(pass, nameof(pass))];

    /// <summary>The same change for all passes.</summary>
    /// <param name="change">From the schedule of a pass to the changed one.</param>
    public GeneratorSchedule ForAll(Func<Pass, OperatingSchedule, OperatingSchedule> change)
    {
        Require.NotNull(change, nameof(change));
        return With([.. _passes.Select((schedule, i) => change(Generator.Passes[i], schedule))], Supply, nameof(change));
    }

    /// <summary>A change for one pass.</summary>
    /// <param name="pass">Name of the pass.</param>
    /// <param name="change">From its schedule to the changed one.</param>
    /// <exception cref="ArgumentException">There is no such pass, or its feed flow is moved although a valve of the header feeds it.</exception>
    public GeneratorSchedule ForPass(string pass, Func<OperatingSchedule, OperatingSchedule> change)
    {
        int index = Index(pass, nameof(pass));
        Require.NotNull(change, nameof(change));
        return With([.. _passes.Select((schedule, i) => i == index ? change(schedule) : schedule)], Supply, nameof(change));
    }

    /// <summary>With a header that feeds the passes which have a valve in it.</summary>
    /// <param name="supply">The header with its valves.</param>
    /// <exception cref="ArgumentException">No pass has a valve in it, one that has is none of this generator's, or its feed flow is moved by its own schedule too.</exception>
    public GeneratorSchedule WithSupply(FeedSupply supply)
    {
        foreach (string pass in Require.NotNull(supply, nameof(supply)).Passes) Index(pass, nameof(supply));
        return supply.Passes.Count > 0 ? With(_passes, supply, nameof(supply)) : throw new ArgumentException("The header has no valve.", nameof(supply));
    }

    private int Index(string pass, string parameter)
    {
        int index = Array.FindIndex([.. Generator.Passes], candidate => candidate.Name == pass);
        return index >= 0 ? index : throw new ArgumentException($"Generator '{Generator.Name}' has no pass '{pass}'; it has {string.Join(", ", Generator.Passes.Select(candidate => $"'{candidate.Name}'"))}.", parameter);
    }

    private GeneratorSchedule With(OperatingSchedule[] passes, FeedSupply? supply, string parameter)
    {
        for (int i = 0; i < passes.Length; i++)
        {
            if (passes[i].MovesFeedFlow && supply?.ValveOf(Generator.Passes[i].Name) is not null)
                throw new ArgumentException($"The feed flow of pass '{Generator.Passes[i].Name}' follows from its valve; its schedule must leave it alone.", parameter);
        }

        var copy = (GeneratorSchedule)MemberwiseClone();
        (copy._passes, copy.Supply) = (passes, supply);
        return copy;
    }
}
