using System.Globalization;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>How a pass has changed against a dated baseline, at equal load.</summary>
/// <remarks>
/// <para>Scale inside insulates and narrows: metal and pressure drop rise, while the heat, which the gas side decides, hardly falls. Soot outside keeps heat away: the heat falls, and the metal, for what heat
/// is left, runs no hotter.</para>
/// <para>Limits: pressure drop 5 %, metal 15 % of its excess over saturation, heat 2 %. Common practice, no source: the site's own experience takes their place.</para>
/// <para>Advisory only: it replaces no inspection, no thickness test and no tube-skin thermocouple alarm.</para>
/// </remarks>
public sealed class PassHealth
{
    private const double DropLimit = 0.05, MetalLimit = 0.15, HeatLimit = 0.02;

    private readonly double _drop, _metal, _heat;

    private PassHealth(HealthFigures baseline, HealthFigures now, double common)
    {
        (Baseline, Now) = (baseline, now);
        _drop = (now.RawFriction / baseline.RawFriction) - 1;
        _metal = (now.RawMetal / baseline.RawMetal) - 1;
        _heat = (now.RawHeat / baseline.RawHeat / common) - 1;
        Finding = Find();
    }

    /// <summary>What it was.</summary>
    public HealthFigures Baseline { get; }

    /// <summary>What it is.</summary>
    public HealthFigures Now { get; }

    /// <summary>Change of the pressure drop at equal load; null where it is not known at both times.</summary>
    public Ratio? PressureDrop => Known(_drop);

    /// <summary>Change of the metal's excess over saturation at equal heat; null where it is not known at both times.</summary>
    public Ratio? MetalExcess => Known(_metal);

    /// <summary>Change of the heat per firing; of the share of the pass in it where all passes are compared.</summary>
    public Ratio? HeatShare => Known(_heat);

    /// <summary>What that speaks for, the most dangerous first.</summary>
    public HealthFinding Finding { get; }

    /// <summary>One pass by itself: its heat is that per firing, so that a change of fuel or burner shows in it too.</summary>
    /// <param name="baseline">What it was.</param>
    /// <param name="now">What it is.</param>
    public static PassHealth Of(HealthFigures baseline, HealthFigures now) => new(Require.NotNull(baseline, nameof(baseline)), Require.NotNull(now, nameof(now)), 1);

    /// <summary>All passes of a generator: the heat of each is its share, and what all have in common, by the median, counts for none.</summary>
    /// <param name="baseline">What they were, in the order of the generator.</param>
    /// <param name="now">What they are, in the same order.</param>
    /// <exception cref="ArgumentException">The numbers of passes differ.</exception>
    public static IReadOnlyList<PassHealth> Of(IReadOnlyList<HealthFigures> baseline, IReadOnlyList<HealthFigures> now)
    {
        if (Require.NotNull(baseline, nameof(baseline)).Count != Require.NotNull(now, nameof(now)).Count)
            throw new ArgumentException($"The baseline has {baseline.Count} passes, and now there are {now.Count}.", nameof(now));
        double common = baseline.Count == 0 ? 1 : MathNet.Numerics.Statistics.Statistics.Median(baseline.Zip(now, static (was, is_) => is_.RawHeat / was.RawHeat));
        return [.. baseline.Zip(now, (was, is_) => new PassHealth(was, is_, common))];
    }

    private HealthFinding Find()
    {
        if (_metal > MetalLimit) return HealthFinding.ScaleInside;
        if (_heat < -HeatLimit) return HealthFinding.SootOutside;
        if (_drop > DropLimit) return HealthFinding.NarrowerInside;
        return _drop < -DropLimit ? HealthFinding.LessResistance : HealthFinding.None;
    }

    private static Ratio? Known(double change) => double.IsNaN(change) ? null : Ratio.FromDecimalFractions(change);

    internal object ToDump() => ToString();

    /// <summary>The changes and what they speak for, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture, "since {0:yyyy-MM-dd}: pressure drop {1:+0.0%;-0.0%}, metal excess {2:+0.0%;-0.0%}, heat {3:+0.0%;-0.0%}: {4}", Baseline.Time, _drop, _metal, _heat, Finding);
}
