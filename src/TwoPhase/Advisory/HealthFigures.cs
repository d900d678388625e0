using System.Globalization;
using TwoPhase.Metering;
using TwoPhase.Numerics;
using TwoPhase.Passes;
using TwoPhase.Steam;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>What a pass is like at one time, freed of its load: what it costs in pressure, how hot its metal is, how much heat it takes.</summary>
/// <remarks>
/// <para>Friction: measured pressure drop over that of the model at the same flow, heat and pressure. Metal: (T − Ts)/(Q/Q₀), T the mean of the metal temperatures, Ts saturation at the
/// outlet, Q absorbed heat, Q₀ that at full firing of the calibration. Heat: Q per firing over that of the calibration.</para>
/// <para>Range: at rest, boiling; metal temperatures of the same tags each time. Accuracy: the model's loads cancel between two times, to some per cent between half and full load.</para>
/// <para>Source: written here; that friction, wall and firing each scale so is Newton's law of resistance, Fourier's and the heat balance.</para>
/// </remarks>
public sealed class HealthFigures
{
    private HealthFigures(DateTimeOffset time, double friction, double metal, double heat) => (Time, RawFriction, RawMetal, RawHeat) = (time, friction, metal, heat);

    /// <summary>When; of a mean the middle.</summary>
    public DateTimeOffset Time { get; }

    /// <summary>Measured pressure drop over that of the model; null without an inlet pressure.</summary>
    public double? Friction => double.IsNaN(RawFriction) ? null : RawFriction;

    /// <summary>Metal above saturation, at full heat; null without metal temperatures.</summary>
    public TemperatureDelta? MetalExcess => double.IsNaN(RawMetal) ? null : TemperatureDelta.FromKelvins(RawMetal);

    /// <summary>Absorbed heat per firing over that of the calibration, by the meter.</summary>
    public double Heat => RawHeat;

    internal double RawFriction { get; }

    internal double RawMetal { get; }

    internal double RawHeat { get; }

    /// <summary>The figures of a pass as its estimator has it, with a reading of the same time; null while the pass moves, is at fault or is not known.</summary>
    /// <param name="estimator">The estimator, after its last reading.</param>
    /// <param name="reading">That reading.</param>
    public static HealthFigures? Of(QualityEstimator estimator, in PassReading reading)
    {
        if (!Require.NotNull(estimator, nameof(estimator)).IsAtRest || estimator.Conditions is not { } now) return null;
        double metal = Metal(reading) - SaturationLine.Temperature(now.RawOutletPressure);
        return new(reading.Time, Drop(reading) / ModelDrop(estimator, now), metal * estimator.CalibratedHeat / now.RawAbsorbedHeat, estimator.HeatFactor);
    }

    /// <summary>The mean of several, which noise moves less: one each ten minutes of a day will do.</summary>
    /// <param name="figures">One or more, of one pass.</param>
    /// <exception cref="ArgumentException">There is none.</exception>
    public static HealthFigures Mean(IEnumerable<HealthFigures> figures)
    {
        HealthFigures[] all = [.. Require.NotNull(figures, nameof(figures))];
        if (all.Length == 0) throw new ArgumentException("There are no figures to take a mean of.", nameof(figures));
        return new(Clock.TimeOf(all.Average(one => one.Time.UtcTicks * 1e-7)), Known(one => one.RawFriction), Known(one => one.RawMetal), Known(one => one.RawHeat));

        double Known(Func<HealthFigures, double> of) => all.Select(of).Where(Fast.IsFinite).DefaultIfEmpty(double.NaN).Average();
    }

    /// <summary>Measured inlet minus outlet pressure [Pa]; NaN where one is missing.</summary>
    internal static double Drop(in PassReading reading) => reading[PassSignal.InletPressure].Si - reading[PassSignal.OutletPressure].Si;

    /// <summary>Pressure drop of the model [Pa]; NaN where it has none.</summary>
    internal static double ModelDrop(QualityEstimator estimator, PassConditions conditions)
    {
        try
        {
            return SteadyState.Solve(estimator.Pass, conditions, estimator.Options.Models).PressureDrop.Total.Pascals;
        }
        catch (Exception fault) when (fault is ConvergenceException or ArgumentException)
        {
            return double.NaN;
        }
    }

    private static double Metal(in PassReading reading)
    {
        double sum = 0;
        int count = 0;
        foreach (Temperature? temperature in reading.MetalTemperatures)
        {
            if (temperature is { } known)
            {
                sum += known.Si();
                count++;
            }
        }

        return count > 0 ? sum / count : double.NaN;
    }

    internal object ToDump() => ToString();

    /// <summary>Time and figures, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "{0:yyyy-MM-dd}: friction {1:F3}, metal {2:F1} K above saturation at full heat, heat {3:F3}", Time, RawFriction, RawMetal, RawHeat);
}
