using System.Collections;
using TwoPhase.Numerics;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Stability;

/// <summary>The internal characteristic of a pass: its pressure drop against its flow with heat, feed temperature and outlet pressure held, often shaped like an S.</summary>
/// <remarks>
/// <para>Where the drop falls as flow rises, a pass between headers of constant pressure leaves its flow (Ledinegg's excursion): another pass takes what it gives up.
/// A restrictor at the inlet adds R ṁ², whose slope 2 R ṁ must outweigh the fall everywhere.</para>
/// <para>A flow controller that acts on the pass's own valve holds the flow against this as long as its valve has travel left.</para>
/// <para>Range: that of <see cref="SteadyState"/>; flows without a steady state are left out and listed. Accuracy: slopes by central difference over ±0.1 % of flow.</para>
/// <para>Source: Ledinegg, Die Wärme 61, 891-898 (1938); Bouré, Bergles and Tong, Nucl. Eng. Des. 25, 165-192 (1973).</para>
/// </remarks>
public sealed class FlowCharacteristic : IReadOnlyList<CharacteristicPoint>
{
    private const int LeastPoints = 3, MostPoints = 10000;

    private readonly CharacteristicPoint[] _points;

    private FlowCharacteristic(Pass pass, in PassConditions conditions, CharacteristicPoint[] points, UnsolvedFlow[] unsolved, CharacteristicPoint? at, FlowExcursion[] excursions)
    {
        Pass = pass;
        Conditions = conditions;
        _points = points;
        Unsolved = unsolved;
        OperatingPoint = at;
        Excursions = excursions;
    }

    /// <summary>The characteristic of a pass over a range of flows.</summary>
    /// <param name="pass">The pass.</param>
    /// <param name="conditions">Feed temperature, outlet pressure and heat, which are held; its flow is the operating point.</param>
    /// <param name="lowest">Lowest flow, greater than zero.</param>
    /// <param name="highest">Highest flow, above the lowest.</param>
    /// <param name="points">Number of points, evenly spaced in the logarithm of flow, 3 to 10 000. A range of falling drop that fits between two points is missed.</param>
    /// <param name="models">Slip and friction; null for the defaults.</param>
    /// <param name="options">What counts; null for everything.</param>
    /// <exception cref="ArgumentOutOfRangeException">A flow or the number of points is outside its limits.</exception>
    public static FlowCharacteristic Of(Pass pass, PassConditions conditions, MassFlow lowest, MassFlow highest, int points = 41, PassModels? models = null, SteadyOptions? options = null) =>
        Of(default(SteamFluid), pass, conditions, lowest, highest, points, models, options);

    internal static FlowCharacteristic Of<TFluid>(in TFluid fluid, Pass pass, in PassConditions conditions, MassFlow lowest, MassFlow highest, int points, PassModels? models, SteadyOptions? options)
        where TFluid : struct, IPassFluid
    {
        double low = Require.Positive(lowest.Si(), "Lowest flow", Scale.KilogramsPerSecond, nameof(lowest)), high = Require.Positive(highest.Si(), "Highest flow", Scale.KilogramsPerSecond, nameof(highest));
        if (high <= low) throw Require.OutOfRange(high, "Highest flow", Scale.KilogramsPerSecond, nameof(highest), $"must be above the lowest, {Scale.KilogramsPerSecond.Text(low)}");
        Require.Within(points, LeastPoints, MostPoints, "Number of points", Scale.None, nameof(points));
        var drop = new PassDrop<TFluid>(fluid, Require.NotNull(pass, nameof(pass)), conditions, models, options);
        var solved = new List<CharacteristicPoint>(points);
        var unsolved = new List<UnsolvedFlow>();
        for (int i = 0; i < points; i++)
        {
            double flow = low * Math.Pow(high / low, i / (points - 1.0));
            if (drop.TryAt(flow, out CharacteristicPoint point) is { } reason) unsolved.Add(new(flow, reason));
            else solved.Add(point);
        }

        CharacteristicPoint? at = drop.TryAt(conditions.RawFeedFlow, out CharacteristicPoint operating) is null ? operating : null;
        return new(pass, conditions, [.. solved], [.. unsolved], at, [.. Falling(drop, solved)]);
    }

    /// <summary>The pass.</summary>
    public Pass Pass { get; }

    /// <summary>What is held, and the flow of the operating point.</summary>
    public PassConditions Conditions { get; }

    /// <summary>The point at the flow of the conditions; null when it has no steady state.</summary>
    public CharacteristicPoint? OperatingPoint { get; }

    /// <summary>Ranges of flow over which the drop falls, lowest first; none on a characteristic that rises throughout.</summary>
    public IReadOnlyList<FlowExcursion> Excursions { get; }

    /// <summary>Flows without a steady state, and why.</summary>
    public IReadOnlyList<UnsolvedFlow> Unsolved { get; }

    /// <summary>Pressure that a restrictor at the inlet must take at the flow of the conditions for the drop to rise at every point; zero when it does already.</summary>
    public Pressure RestrictionNeeded
    {
        get
        {
            double resistance = 0;   // Pa·s²/kg²
            foreach (CharacteristicPoint point in _points) resistance = Math.Max(resistance, -point.RawSlope / (2 * point.RawFlow));
            return Pressure.FromPascals(resistance * Conditions.RawFeedFlow * Conditions.RawFeedFlow);
        }
    }

    /// <summary>Number of points with a steady state.</summary>
    public int Count => _points.Length;

    /// <summary>A point.</summary>
    /// <param name="index">0 at the lowest flow.</param>
    public CharacteristicPoint this[int index] => _points[index];

    /// <summary>The points by rising flow.</summary>
    public IEnumerator<CharacteristicPoint> GetEnumerator() => ((IEnumerable<CharacteristicPoint>)_points).GetEnumerator();

    IEnumerator IEnumerable.GetEnumerator() => GetEnumerator();

    private static IEnumerable<FlowExcursion> Falling<TFluid>(PassDrop<TFluid> drop, List<CharacteristicPoint> points)
        where TFluid : struct, IPassFluid
    {
        for (int i = 0; i < points.Count; i++)
        {
            if (points[i].RawSlope >= 0) continue;
            int first = i;
            while (i + 1 < points.Count && points[i + 1].RawSlope < 0) i++;
            bool opensBelow = first == 0, opensAbove = i == points.Count - 1;
            double from = opensBelow ? points[first].RawFlow : drop.Level(points[first - 1], points[first]);
            double to = opensAbove ? points[i].RawFlow : drop.Level(points[i], points[i + 1]);
            yield return new(from, to, opensBelow || opensAbove);
        }
    }
}
