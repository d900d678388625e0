using System.Globalization;
using MathNet.Numerics.Statistics;
using TwoPhase.Numerics;
using TwoPhase.Uncertainty;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>What a quiet stretch of readings says of a pass: its heat per firing and, with an inlet pressure, its friction. The first thing to do with a new pass.</summary>
/// <remarks>
/// <para>Heat: at rest Q = ṁ (h(p, x) − h(feed)), reading by reading; the heat at full firing is the mean of Q over firing, absorbed heat taken
/// proportional to firing. Its interval is Student's with the readings' own correlation; an error that all share (meter, feed flow, wet
/// model) is not in it.</para>
/// <para>Friction: the factor on the friction of every section with which the steady state meets the mean inlet pressure.</para>
/// </remarks>
public sealed class PassCalibration
{
    private const int FewestReadings = 3, EnoughReadings = 10;
    private const double LowestFactor = 0.05, HighestFactor = 20, Unlikely = 2;

    private readonly Series _heat;
    private readonly CoverageInterval? _friction;

    private PassCalibration(Pass pass, Series heat, double[] heats, double quality, (double Factor, double Error)? friction, CalibrationWarnings warnings)
    {
        _heat = heat;
        Readings = heats.Length;
        QualityDeviation = MassFraction.FromDecimalFractions(quality);
        FrictionFactor = friction?.Factor;
        _friction = friction is { } found ? new CoverageInterval(found.Factor - (2 * found.Error), found.Factor + (2 * found.Error), 0.95) : null;
        Warnings = warnings | (friction is { } f && (f.Factor > Unlikely || f.Factor < 1 / Unlikely) ? CalibrationWarnings.FrictionFarOff : CalibrationWarnings.None);
        Pass = friction is { } factor ? pass.WithHeatAtFullFiring(HeatAtFullFiring).WithFrictionFactor(factor.Factor) : pass.WithHeatAtFullFiring(HeatAtFullFiring);
    }

    /// <summary>The pass with what was found: its heat at full firing, and its friction where an inlet pressure was read.</summary>
    public Pass Pass { get; }

    /// <summary>Absorbed heat at 100 % firing.</summary>
    public Power HeatAtFullFiring => Power.FromWatts(_heat.Mean);

    /// <summary>Factor on the friction of every section; null without inlet pressures.</summary>
    public double? FrictionFactor { get; }

    /// <summary>95 % interval of <see cref="FrictionFactor"/> from the scatter of the pressures; null without them.</summary>
    public CoverageInterval? FrictionInterval => _friction;

    /// <summary>Standard deviation of the qualities about those that the calibrated pass would have: what one reading scatters.</summary>
    public MassFraction QualityDeviation { get; }

    /// <summary>Number of readings.</summary>
    public int Readings { get; }

    /// <summary>What the result must be read with.</summary>
    public CalibrationWarnings Warnings { get; }

    /// <summary>Confidence interval of the heat at full firing.</summary>
    /// <param name="probability">Confidence, between 0 and 1.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="probability"/> is outside its limits.</exception>
    public (Power Low, Power High) HeatInterval(double probability = 0.95)
    {
        CoverageInterval interval = _heat.Interval(CoverageInterval.Probability(probability));
        return (Power.FromWatts(interval.Low), Power.FromWatts(interval.High));
    }

    /// <summary>Calibrates a pass on a quiet stretch of readings.</summary>
    /// <param name="pass">The pass as drawn.</param>
    /// <param name="samples">The readings in the order of time, at least three; inlet pressures in all of them or in none.</param>
    /// <param name="models">The correlations; null for the defaults.</param>
    /// <exception cref="ArgumentException">There are fewer than three readings, some but not all have an inlet pressure, or no friction meets it.</exception>
    public static PassCalibration Fit(Pass pass, IReadOnlyList<CalibrationSample> samples, PassModels? models = null)
    {
        Require.NotNull(pass, nameof(pass));
        if (Require.NotNull(samples, nameof(samples)).Count < FewestReadings) throw new ArgumentException($"{samples.Count} readings for pass '{pass.Name}'; a calibration takes at least {FewestReadings}.", nameof(samples));
        double[] heats = [.. samples.Select(sample => HeatOf(sample) / sample.Firing)];
        var heat = new Series(heats);
        CalibrationWarnings warnings = (heat.Drifts ? CalibrationWarnings.NotAtRest : CalibrationWarnings.None)
            | (InputsMove(samples) ? CalibrationWarnings.InputsMoved : CalibrationWarnings.None)
            | (heat.Effective < EnoughReadings ? CalibrationWarnings.FewReadings : CalibrationWarnings.None);
        double scatter = samples.Select((sample, i) => (heats[i] - heat.Mean) * sample.Firing / (sample.FeedFlow * LatentHeat(sample.OutletPressure))).RootMeanSquare();
        return new(pass, heat, heats, scatter, Friction(pass.WithHeatAtFullFiring(Power.FromWatts(heat.Mean)), samples, models ?? PassModels.Default), warnings);
    }

    private static double HeatOf(in CalibrationSample sample)
    {
        SaturatedPair steam = default(SteamFluid).Saturated(sample.OutletPressure);
        double feed = default(SteamFluid).LiquidEnthalpy(sample.OutletPressure, sample.FeedTemperature);
        return sample.FeedFlow * (steam.LiquidEnthalpy + (sample.Quality * steam.LatentHeat) - feed);
    }

    private static double LatentHeat(double pressure) => default(SteamFluid).Saturated(pressure).LatentHeat;

    private static bool InputsMove(IReadOnlyList<CalibrationSample> samples) =>
        new Series([.. samples.Select(sample => sample.FeedFlow)]).Drifts
        || new Series([.. samples.Select(sample => sample.FeedTemperature)]).Drifts
        || new Series([.. samples.Select(sample => sample.Firing)]).Drifts
        || new Series([.. samples.Select(sample => sample.OutletPressure)]).Drifts;

    private static (double Factor, double Error)? Friction(Pass pass, IReadOnlyList<CalibrationSample> samples, PassModels models)
    {
        int known = samples.Count(sample => !double.IsNaN(sample.InletPressure));
        if (known == 0) return null;
        if (known < samples.Count) throw new ArgumentException($"{known} of {samples.Count} readings of pass '{pass.Name}' have an inlet pressure; all or none must.", nameof(samples));
        var inlet = new Series([.. samples.Select(sample => sample.InletPressure - sample.OutletPressure)]);
        PassConditions conditions = Middle(pass, samples);
        double Missing(double logarithm) => Drop(pass, conditions, Math.Exp(logarithm), models) - inlet.Mean;
        double low = Math.Log(LowestFactor), high = Math.Log(HighestFactor);
        while (high > low && !CanFlow(pass, conditions, Math.Exp(high), models)) high -= 0.1;
        RootResult root = BracketedRoot.TryFind(new Residual(Missing), low, high, 1e-10);
        if (!root.Converged) throw new ArgumentException($"No friction factor between {LowestFactor} and {HighestFactor} gives pass '{pass.Name}' the measured {Scale.Kilopascals.Text(inlet.Mean)} between inlet and outlet.", nameof(samples));
        double factor = Math.Exp(root.X), slope = (Drop(pass, conditions, factor * 1.001, models) - Drop(pass, conditions, factor * 0.999, models)) / (0.002 * factor);
        return (factor, inlet.StandardError / slope);
    }

    private static PassConditions Middle(Pass pass, IReadOnlyList<CalibrationSample> samples) => new(
        MassFlow.FromKilogramsPerSecond(samples.Average(sample => sample.FeedFlow)),
        Temperature.FromKelvins(samples.Average(sample => sample.FeedTemperature)),
        Pressure.FromPascals(samples.Average(sample => sample.OutletPressure)),
        Power.FromWatts(pass.HeatAtFullFiring!.Value.Si() * samples.Average(sample => sample.Firing)));

    private static double Drop(Pass pass, in PassConditions conditions, double factor, PassModels models) =>
        SteadyState.Solve(pass.WithFrictionFactor(factor), conditions, models).PressureDrop.Total.Pascals;

    private static bool CanFlow(Pass pass, in PassConditions conditions, double factor, PassModels models)
    {
        try
        {
            Drop(pass, conditions, factor, models);
            return true;
        }
        catch (ConvergenceException)
        {
            return false;
        }
    }

    internal object ToDump() => ToString();

    /// <summary>The calibration in a line, invariant culture.</summary>
    public override string ToString()
    {
        CoverageInterval interval = _heat.Interval(0.95);
        string friction = FrictionFactor is { } factor ? string.Format(CultureInfo.InvariantCulture, ", friction times {0:F3} ({1:F3} to {2:F3})", factor, _friction!.Value.Low, _friction.Value.High) : "";
        return string.Format(CultureInfo.InvariantCulture, "{0:F3} MW at full firing ({1:F3} to {2:F3}), {3} readings{4}{5}", _heat.Mean * 1e-6, interval.Low * 1e-6, interval.High * 1e-6, Readings, friction, Warnings == CalibrationWarnings.None ? "" : ", " + Warnings);
    }

    private readonly struct Residual(Func<double, double> function) : IScalarFunction
    {
        public double Value(double x) => function(x);
    }
}
