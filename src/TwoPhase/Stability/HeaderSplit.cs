using System.Globalization;
using TwoPhase.Numerics;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Stability;

/// <summary>How a common feed splits over unequal passes between common headers, each with its own heat.</summary>
/// <remarks>
/// <para>All passes lose the same pressure and their flows sum to the feed: Newton's method on both, from the flows given. A restrictor or a valve is a loss
/// coefficient in the first section of its pass.</para>
/// <para>Where some characteristic falls (see <see cref="FlowCharacteristic"/>) more than one split exists; the one found is near the start, and <see cref="IsStable"/> says
/// whether it holds: with the total held, every slope dΔp/dṁ must be positive, or one at most negative and the sum of 1/slope negative.</para>
/// <para>Range: that of <see cref="SteadyState"/>. Accuracy: pressure drops equal to 1e-6.</para>
/// <para>Source: continuity and momentum; the condition is that of a minimum under a linear constraint, as for parallel channels in Akagawa et al., Bull. JSME 14(74), 837-848 (1971), from memory.</para>
/// </remarks>
public sealed class HeaderSplit
{
    private const int GreatestRounds = 60;
    private const double Balance = 1e-6, GreatestStep = 0.3;

    private HeaderSplit(PassProfile[] profiles, CharacteristicPoint[] points)
    {
        Profiles = profiles;
        Points = points;
        int falling = points.Count(point => point.RawSlope < 0);
        IsStable = falling == 0 || (falling == 1 && points.Sum(point => 1 / point.RawSlope) < 0);
    }

    /// <summary>The split of a feed.</summary>
    /// <param name="passes">The passes, at least one.</param>
    /// <param name="conditions">Feed temperature and heat of each pass, and one outlet pressure for all. The flows sum to the common feed, and the search starts from them.</param>
    /// <param name="models">Slip and friction; null for the defaults.</param>
    /// <param name="options">What counts; null for everything.</param>
    /// <exception cref="ArgumentException">There is no pass, not one condition a pass, or the outlet pressures differ.</exception>
    /// <exception cref="ConvergenceException">No split was found from this start.</exception>
    public static HeaderSplit Solve(IReadOnlyList<Pass> passes, IReadOnlyList<PassConditions> conditions, PassModels? models = null, SteadyOptions? options = null)
    {
        Require.NotNull(passes, nameof(passes));
        Require.NotNull(conditions, nameof(conditions));
        if (passes.Count == 0) throw new ArgumentException("A split needs at least one pass.", nameof(passes));
        if (conditions.Count != passes.Count) throw new ArgumentException($"{passes.Count.ToString(CultureInfo.InvariantCulture)} passes need as many conditions; there are {conditions.Count.ToString(CultureInfo.InvariantCulture)}.", nameof(conditions));
        double outlet = conditions[0].RawOutletPressure;
        foreach (PassConditions condition in conditions)
        {
            if (condition.RawOutletPressure != outlet) throw Require.OutOfRange(condition.RawOutletPressure, "Outlet pressure", Scale.Megapascals, nameof(conditions), $"must be that of the common header, {Scale.Megapascals.Text(outlet)}");
        }

        return Search([.. passes.Select((pass, i) => new PassDrop<SteamFluid>(default, pass, conditions[i], models, options))], [.. conditions.Select(condition => condition.RawFeedFlow)]);
    }

    /// <summary>The steady states, in the order of the passes.</summary>
    public IReadOnlyList<PassProfile> Profiles { get; }

    /// <summary>Flow, pressure drop and slope of each pass.</summary>
    public IReadOnlyList<CharacteristicPoint> Points { get; }

    /// <summary>Pressure between the headers.</summary>
    public Pressure PressureDrop => Points[0].PressureDrop;

    /// <summary>Whether the split holds by itself against small disturbances, the total feed held; density waves apart.</summary>
    public bool IsStable { get; }

    private static HeaderSplit Search(PassDrop<SteamFluid>[] drops, double[] flows)
    {
        double total = flows.Sum();
        for (int round = 0; round < GreatestRounds; round++)
        {
            CharacteristicPoint[] points = [.. drops.Select((drop, i) => drop.At(flows[i]))];
            double give = points.Sum(point => 1 / point.RawSlope), common = points.Sum(point => point.RawDrop / point.RawSlope) / give;
            if (points.All(point => Math.Abs(point.RawDrop - common) <= Balance * Math.Abs(common))) return new([.. drops.Select((drop, i) => drop.Solve(flows[i]))], points);
            double[] steps = [.. points.Select(point => (common - point.RawDrop) / point.RawSlope)];
            double greatest = steps.Select((step, i) => Math.Abs(step) / flows[i]).Max(), share = greatest > GreatestStep ? GreatestStep / greatest : 1;
            if (double.IsNaN(share)) break;
            for (int i = 0; i < flows.Length; i++) flows[i] += share * steps[i];
        }

        throw new ConvergenceException($"No split of {Scale.KilogramsPerSecond.Text(total)} over {drops.Length.ToString(CultureInfo.InvariantCulture)} passes was found within {GreatestRounds.ToString(CultureInfo.InvariantCulture)} rounds; last flows {string.Join(", ", flows.Select(flow => Scale.KilogramsPerSecond.Text(flow, "G4")))}.");
    }
}
