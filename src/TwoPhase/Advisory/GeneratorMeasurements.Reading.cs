using TwoPhase.Metering;
using TwoPhase.Numerics;
using TwoPhase.Passes;
using TwoPhase.Uncertainty;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

public sealed partial class GeneratorMeasurements
{
    private const double GuessedQuality = 0.75;

    /// <summary>The measurements that a reading holds, as far as its values are good and possible: feed flows, differentials, pressures, feed temperatures, total feed, separator flows.</summary>
    /// <remarks>
    /// The uncertainty of a differential has that of transmitter, coefficient, expansibility and diameters in it (<see cref="QualityMeter.QualityWithUncertainty"/>). What is counted otherwise is added by
    /// hand: fuel heat from its flow, quality from solids, one meter on the combined outlet.
    /// </remarks>
    /// <param name="generator">The generator.</param>
    /// <param name="reading">What its instruments said, one reading for each pass or none.</param>
    /// <param name="uncertainty">How well they measure.</param>
    /// <exception cref="ArgumentException">The reading is of another number of passes.</exception>
    public static GeneratorMeasurements FromReading(SteamGenerator generator, GeneratorReading reading, GeneratorUncertainty uncertainty)
    {
        GeneratorMeasurements read = new(generator);
        Require.NotNull(reading, nameof(reading));
        Require.NotNull(uncertainty, nameof(uncertainty));
        if (reading.Passes.Count > 0 && reading.Passes.Count != generator.Passes.Count)
            throw new ArgumentException($"The reading has {reading.Passes.Count} passes and generator '{generator.Name}' has {generator.Passes.Count}.", nameof(reading));

        Pressure pressure = Pressure.FromPascals(uncertainty.Passes.Standard(MeteringInput.Pressure)!.Value);
        TemperatureDelta feed = TemperatureDelta.FromKelvins(uncertainty.FeedTemperature);
        if (TwoPhases(reading.HeaderPressure) is { } header) read = read.WithHeaderPressure(header, pressure);
        if (Liquid(reading.FeedTemperature) is { } temperature) read = read.WithFeedTemperature(temperature, feed);
        if (Running(reading.TotalFeed) is { } total) read = read.WithTotalFeed(total, Part(total, uncertainty.TotalFeed));
        if (Running(reading.SeparatorSteamFlow) is { } steam) read = read.WithSeparatorSteam(steam, Part(steam, uncertainty.SeparatorFlows));
        if (Running(reading.SeparatorWaterFlow) is { } water) read = read.WithSeparatorWater(water, Part(water, uncertainty.SeparatorFlows));
        for (int i = 0; i < reading.Passes.Count; i++)
        {
            PassReading pass = reading.Passes[i];
            if (TwoPhases(pass.OutletPressure) is { } own) read = read.WithOutletPressure(i, own, pressure);
            if (Liquid(pass.FeedTemperature) is { } ownFeed) read = read.WithFeedTemperature(i, ownFeed, feed);
            if (Running(pass.FeedFlow) is { } flow) read = read.WithFeedFlow(i, flow, Part(flow, uncertainty.Passes.Standard(MeteringInput.FeedFlow)!.Value));
            if (generator.Passes[i].Meter is { } meter && pass.Differential is { } differential && TwoPhases(pass.OutletPressure ?? reading.HeaderPressure) is { } at
                && OfMeter(meter, Running(pass.FeedFlow), at, differential, uncertainty.Passes) is { } doubt)
                read = read.WithDifferential(i, differential, doubt);
        }

        return read;
    }

    private static MassFlow? Running(MassFlow? flow) => flow?.Si() > 0 ? flow : null;

    private static MassFlow Part(MassFlow flow, double share) => MassFlow.FromKilogramsPerSecond(flow.Si() * share);

    private static Pressure? TwoPhases(Pressure? pressure) => pressure?.Si() is >= LowestPressure and <= HighestPressure ? pressure : null;

    private static Temperature? Liquid(Temperature? temperature) => temperature?.Si() is >= ColdestFeed and <= HottestFeed ? temperature : null;

    // All of the quality's budget that belongs to the meter, brought back to the differential; null where the meter cannot have such a reading.
    private static Pressure? OfMeter(QualityMeter meter, MassFlow? flow, Pressure pressure, Pressure differential, MeteringUncertainty uncertainty)
    {
        if (!(differential.Si() > 0 && differential.Si() < pressure.Si())) return null;
        try
        {
            MassFlow through = flow ?? meter.TotalFlow(pressure, MassFraction.FromDecimalFractions(GuessedQuality), differential);
            IReadOnlyList<BudgetLine> lines = meter.QualityWithUncertainty(through, pressure, differential, uncertainty).Budget.Lines;
            double slope = lines.Single(line => line.Input.Name == nameof(MeteringInput.Differential)).Sensitivity;   // per kPa
            double variance = lines.Where(line => !IsApart(line.Input.Name)).Sum(line => line.Contribution * line.Contribution);
            return variance > 0 ? Pressure.FromKilopascals(Math.Sqrt(variance) / Math.Abs(slope)) : null;
        }
        catch (Exception fault) when (fault is ArgumentException or ConvergenceException or ArithmeticException)
        {
            return null;
        }
    }

    private static bool IsApart(string input) => input is nameof(MeteringInput.FeedFlow) or nameof(MeteringInput.Pressure) or nameof(MeteringInput.WetModel);
}
