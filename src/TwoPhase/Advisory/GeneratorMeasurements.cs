using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Steam;
using TwoPhase.Uncertainty;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>What was measured at a generator at rest, each value with its standard uncertainty (k = 1); whatever subset there is. Immutable.</summary>
/// <remarks>
/// <para>Values must belong to the same minute and to a generator that stands still, or say how its holdup moves (<see cref="WithHoldupRate"/>): in a ramp
/// of firing a mass balance is off by what the passes store, some per cent of the flow.</para>
/// <para>The uncertainty of a differential is that of transmitter and meter. That of the wet-steam model is added here (<see cref="QualityMeter.ModelUncertainty"/>),
/// as one error shared by all passes of the same model: nearly alike passes are wrong alike.</para>
/// </remarks>
public sealed partial class GeneratorMeasurements
{
    private const double LowestPressure = 700, HighestPressure = 22e6, ColdestFeed = 274, HottestFeed = 620;   // of two phases, and of water in region 1, with room for the slopes

    private readonly Dictionary<Instrument, (double Value, double Uncertainty)> _readings = [];
    private readonly Dictionary<(Instrument First, Instrument Second), double> _correlations = [];
    private readonly (double Mass, double Energy)[] _holdupRates;
    private double _sharedFeedError, _separatorPressure = double.NaN;

    /// <summary>No measurement yet.</summary>
    /// <param name="generator">The generator; its passes bring the meters.</param>
    public GeneratorMeasurements(SteamGenerator generator)
    {
        Generator = Require.NotNull(generator, nameof(generator));
        _holdupRates = new (double, double)[generator.Passes.Count];
    }

    private GeneratorMeasurements(GeneratorMeasurements other)
    {
        Generator = other.Generator;
        CombinedMeter = other.CombinedMeter;
        _readings = new(other._readings);
        _correlations = new(other._correlations);
        _holdupRates = ((double, double)[])other._holdupRates.Clone();
        (_sharedFeedError, _separatorPressure) = (other._sharedFeedError, other._separatorPressure);
    }

    /// <summary>The generator.</summary>
    public SteamGenerator Generator { get; }

    /// <summary>What is measured.</summary>
    public IReadOnlyCollection<Instrument> Instruments => _readings.Keys;

    internal QualityMeter? CombinedMeter { get; private set; }

    /// <summary>Given, or else that of the header, or else the mean of the passes [Pa].</summary>
    internal double RawSeparatorPressure =>
        !double.IsNaN(_separatorPressure) ? _separatorPressure
        : _readings.TryGetValue(Instrument.HeaderPressure, out var header) ? header.Value
        : _readings.Where(reading => reading.Key.Kind == InstrumentKind.OutletPressure).Select(reading => reading.Value.Value).DefaultIfEmpty(double.NaN).Average();

    internal IReadOnlyDictionary<Instrument, (double Value, double Uncertainty)> Readings => _readings;

    /// <summary>What a pass takes in and does not give out: mass [kg/s] and energy [W].</summary>
    internal (double Mass, double Energy) HoldupRate(int pass) => _holdupRates[pass];

    /// <summary>With the feed flow of a pass.</summary>
    /// <param name="pass">Index of the pass.</param>
    /// <param name="flow">Greater than zero.</param>
    /// <param name="uncertainty">Standard uncertainty, greater than zero.</param>
    public GeneratorMeasurements WithFeedFlow(int pass, MassFlow flow, MassFlow uncertainty) => With(Of(pass, Instrument.FeedFlowOf), flow.Si(), nameof(flow), uncertainty.Si());

    /// <summary>With the differential of the meter of a pass.</summary>
    /// <param name="pass">Index of the pass, which has a meter.</param>
    /// <param name="differential">Greater than zero.</param>
    /// <param name="uncertainty">Standard uncertainty of transmitter and meter, without that of the wet-steam model, greater than zero.</param>
    /// <exception cref="ArgumentException">The pass has no meter.</exception>
    public GeneratorMeasurements WithDifferential(int pass, Pressure differential, Pressure uncertainty)
    {
        Instrument instrument = Of(pass, Instrument.DifferentialOf);
        if (Generator.Passes[pass].Meter is null) throw new ArgumentException($"Pass '{Generator.Passes[pass].Name}' has no meter.", nameof(pass));
        return With(instrument, differential.Si(), nameof(differential), uncertainty.Si());
    }

    /// <summary>With the outlet quality of a pass known otherwise than by its meter, as from a sample at its outlet.</summary>
    /// <param name="pass">Index of the pass.</param>
    /// <param name="quality">x, above 0, at most 1.</param>
    /// <param name="uncertainty">Standard uncertainty, greater than zero.</param>
    public GeneratorMeasurements WithOutletQuality(int pass, MassFraction quality, MassFraction uncertainty) => With(Of(pass, Instrument.OutletQualityOf), quality.Si(), nameof(quality), uncertainty.Si(), 1);

    /// <summary>With the heat that a pass absorbs, as from its share of the fire.</summary>
    /// <param name="pass">Index of the pass.</param>
    /// <param name="heat">Greater than zero.</param>
    /// <param name="uncertainty">Standard uncertainty, greater than zero.</param>
    public GeneratorMeasurements WithAbsorbedHeat(int pass, Power heat, Power uncertainty) => With(Of(pass, Instrument.AbsorbedHeatOf), heat.Si(), nameof(heat), uncertainty.Si());

    /// <summary>With the heat that all passes absorb together, as from the heat of the flue gas.</summary>
    /// <param name="heat">Greater than zero.</param>
    /// <param name="uncertainty">Standard uncertainty, greater than zero.</param>
    public GeneratorMeasurements WithAbsorbedHeat(Power heat, Power uncertainty) => With(Instrument.TotalHeat, heat.Si(), nameof(heat), uncertainty.Si());

    /// <summary>With the pressure at the meter of a pass; the header's counts for a pass that has none.</summary>
    /// <param name="pass">Index of the pass.</param>
    /// <param name="pressure">Absolute.</param>
    /// <param name="uncertainty">Standard uncertainty, greater than zero.</param>
    public GeneratorMeasurements WithOutletPressure(int pass, Pressure pressure, Pressure uncertainty) => With(Of(pass, Instrument.OutletPressureOf), pressure.Si(), nameof(pressure), uncertainty.Si(), HighestPressure, LowestPressure);

    /// <summary>With the pressure of the header.</summary>
    /// <param name="pressure">Absolute.</param>
    /// <param name="uncertainty">Standard uncertainty, greater than zero.</param>
    public GeneratorMeasurements WithHeaderPressure(Pressure pressure, Pressure uncertainty) => With(Instrument.HeaderPressure, pressure.Si(), nameof(pressure), uncertainty.Si(), HighestPressure, LowestPressure);

    /// <summary>With the feed temperature of a pass; the common one counts for a pass that has none.</summary>
    /// <param name="pass">Index of the pass.</param>
    /// <param name="temperature">Temperature; the feed is liquid.</param>
    /// <param name="uncertainty">Standard uncertainty, greater than zero.</param>
    public GeneratorMeasurements WithFeedTemperature(int pass, Temperature temperature, TemperatureDelta uncertainty) => With(Of(pass, Instrument.FeedTemperatureOf), Liquid(temperature), nameof(temperature), uncertainty.Si());

    /// <summary>With the feed temperature of all passes.</summary>
    /// <param name="temperature">Temperature; the feed is liquid.</param>
    /// <param name="uncertainty">Standard uncertainty, greater than zero.</param>
    public GeneratorMeasurements WithFeedTemperature(Temperature temperature, TemperatureDelta uncertainty) => With(Instrument.FeedTemperature, Liquid(temperature), nameof(temperature), uncertainty.Si());

    /// <summary>With the feed flow of all passes together, from its own meter.</summary>
    /// <param name="flow">Greater than zero.</param>
    /// <param name="uncertainty">Standard uncertainty, greater than zero.</param>
    public GeneratorMeasurements WithTotalFeed(MassFlow flow, MassFlow uncertainty) => With(Instrument.TotalFeed, flow.Si(), nameof(flow), uncertainty.Si());

    /// <summary>With the steam that leaves the separator.</summary>
    /// <param name="flow">Greater than zero; dry, since a separator that carries water over makes it read the more.</param>
    /// <param name="uncertainty">Standard uncertainty, greater than zero.</param>
    public GeneratorMeasurements WithSeparatorSteam(MassFlow flow, MassFlow uncertainty) => With(Instrument.SeparatorSteam, flow.Si(), nameof(flow), uncertainty.Si());

    /// <summary>With the water that leaves the separator.</summary>
    /// <param name="flow">Greater than zero.</param>
    /// <param name="uncertainty">Standard uncertainty, greater than zero.</param>
    public GeneratorMeasurements WithSeparatorWater(MassFlow flow, MassFlow uncertainty) => With(Instrument.SeparatorWater, flow.Si(), nameof(flow), uncertainty.Si());

    /// <summary>With the quality at the separator, steam over steam and water at its pressure.</summary>
    /// <param name="quality">x, above 0, at most 1.</param>
    /// <param name="uncertainty">Standard uncertainty, greater than zero.</param>
    public GeneratorMeasurements WithSeparatorQuality(MassFraction quality, MassFraction uncertainty) => With(Instrument.SeparatorQuality, quality.Si(), nameof(quality), uncertainty.Si(), 1);

    /// <summary>With the quality that the solids of feed and separator water tell: the best check that there is beside the meters.</summary>
    /// <param name="solids">The balance of solids.</param>
    public GeneratorMeasurements WithSolids(SolidsBalance solids)
    {
        UncertainValue<MassFraction> quality = Require.NotNull(solids, nameof(solids)).Quality;
        return WithSeparatorQuality(quality.Value, quality.StandardUncertainty);
    }

    /// <summary>With the pressure of the separator, taken as known; the header's unless given. What flashes on the way down to it is reckoned with.</summary>
    /// <param name="pressure">Absolute.</param>
    public GeneratorMeasurements WithSeparatorPressure(Pressure pressure)
    {
        double si = Domain.SaturationPressure(pressure, nameof(pressure));
        return Changed(copy => copy._separatorPressure = si);
    }

    /// <summary>With the heat that the fuel brings: its flow times its heating value, both of the same base.</summary>
    /// <param name="heat">Greater than zero.</param>
    /// <param name="uncertainty">Standard uncertainty, greater than zero.</param>
    public GeneratorMeasurements WithFuelHeat(Power heat, Power uncertainty) => With(Instrument.FuelHeat, heat.Si(), nameof(heat), uncertainty.Si());

    /// <summary>With the share of the fuel's heat that the water absorbs, by the same heating value.</summary>
    /// <param name="efficiency">above 0, at most 1.2, since by the lower heating value it may exceed 1.</param>
    /// <param name="uncertainty">Standard uncertainty, greater than zero.</param>
    public GeneratorMeasurements WithEfficiency(Ratio efficiency, Ratio uncertainty) => With(Instrument.Efficiency, efficiency.Si(), nameof(efficiency), uncertainty.Si(), 1.2);

    /// <summary>With one meter on the combined outlet, at header pressure.</summary>
    /// <param name="meter">The meter and the wet-steam model over it.</param>
    /// <param name="differential">Greater than zero.</param>
    /// <param name="uncertainty">Standard uncertainty of transmitter and meter, without that of the wet-steam model, greater than zero.</param>
    public GeneratorMeasurements WithCombinedDifferential(QualityMeter meter, Pressure differential, Pressure uncertainty)
    {
        GeneratorMeasurements changed = With(Instrument.CombinedDifferential, differential.Si(), nameof(differential), uncertainty.Si());
        changed.CombinedMeter = Require.NotNull(meter, nameof(meter));
        return changed;
    }

    /// <summary>With what a pass stores because it is not at rest, taken as known: the water it holds rises by so much.</summary>
    /// <param name="pass">Index of the pass.</param>
    /// <param name="mass">Rate of change of the mass in the pass; positive while it fills.</param>
    /// <param name="energy">Rate of change of the energy in it, metal included.</param>
    public GeneratorMeasurements WithHoldupRate(int pass, MassFlow mass, Power energy)
    {
        Of(pass, Instrument.FeedFlowOf);
        return Changed(copy => copy._holdupRates[pass] = (mass.Si(), energy.Si()));
    }

    /// <summary>With one error that the feed meters of all passes share, as a density constant that is wrong in all; beside what each has of its own.</summary>
    /// <param name="relative">Standard uncertainty relative to the flow.</param>
    public GeneratorMeasurements WithSharedFeedError(Ratio relative)
    {
        double share = Require.NotNegative(relative.Si(), "Shared error of the feed meters", Scale.None, nameof(relative));
        return Changed(copy => copy._sharedFeedError = share);
    }

    /// <summary>With the errors of two instruments correlated, as when one converts the signal of both.</summary>
    /// <param name="first">One.</param>
    /// <param name="second">Another.</param>
    /// <param name="coefficient">r of what each has of its own, −1 to 1.</param>
    public GeneratorMeasurements WithCorrelation(Instrument first, Instrument second, double coefficient)
    {
        Require.Within(coefficient, -1, 1, "Correlation coefficient r", Scale.None, nameof(coefficient));
        if (first == second) throw new ArgumentException($"An instrument ({first}) is not correlated with itself.", nameof(second));
        return Changed(copy => copy._correlations[(first, second)] = coefficient);
    }

    /// <summary>Without one instrument.</summary>
    /// <param name="instrument">Which.</param>
    public GeneratorMeasurements Without(Instrument instrument) => Changed(copy => copy._readings.Remove(instrument));

    /// <summary>Covariance of the readings of some instruments: own and shared errors [SI].</summary>
    internal double[,] Covariance(Instrument[] instruments)
    {
        double[,] covariance = new double[instruments.Length, instruments.Length];
        for (int i = 0; i < instruments.Length; i++)
        {
            for (int j = 0; j < instruments.Length; j++)
                covariance[i, j] = (Correlation(instruments[i], instruments[j]) * _readings[instruments[i]].Uncertainty * _readings[instruments[j]].Uncertainty) + Shared(instruments[i], instruments[j]);
        }

        return covariance;
    }

    private double Correlation(Instrument first, Instrument second) =>
        first == second ? 1
        : _correlations.TryGetValue((first, second), out double coefficient) || _correlations.TryGetValue((second, first), out coefficient) ? coefficient
        : 0;

    private double Shared(Instrument first, Instrument second)
    {
        double product = _readings[first].Value * _readings[second].Value;
        if (first.Kind == InstrumentKind.FeedFlow && second.Kind == InstrumentKind.FeedFlow) return _sharedFeedError * _sharedFeedError * product;
        return MeterOf(first) is { } one && MeterOf(second) is { } other && ReferenceEquals(one.Model, other.Model) ? one.ModelUncertainty.Si() * other.ModelUncertainty.Si() * product : 0;
    }

    private QualityMeter? MeterOf(Instrument instrument) => instrument.Kind switch
    {
        InstrumentKind.Differential => Generator.Passes[instrument.Pass!.Value].Meter,
        InstrumentKind.CombinedDifferential => CombinedMeter,
        _ => null,
    };

    private GeneratorMeasurements With(Instrument instrument, double value, string parameter, double uncertainty, double highest = double.MaxValue, double lowest = 0)
    {
        string name = instrument.NameIn(Generator.Passes);
        if (!(value > lowest && value <= highest))
            throw new ArgumentOutOfRangeException(parameter, $"The {name}, {instrument.Scale.LevelText(value)}, must be greater than {instrument.Scale.LevelText(lowest)}{(highest < double.MaxValue ? $" and at most {instrument.Scale.LevelText(highest)}" : "")}.");
        if (!(uncertainty > 0))
            throw new ArgumentOutOfRangeException(nameof(uncertainty), $"The standard uncertainty of the {name}, {instrument.Scale.SizeText(uncertainty)}, must be greater than zero.");
        return Changed(copy => copy._readings[instrument] = (value, uncertainty));
    }

    private Instrument Of(int pass, Func<int, Instrument> instrument) => pass >= 0 && pass < Generator.Passes.Count
        ? instrument(pass)
        : throw new ArgumentOutOfRangeException(nameof(pass), pass, $"Generator '{Generator.Name}' has {Generator.Passes.Count} passes, counted from 0.");

    private static double Liquid(Temperature temperature) =>
        Require.Within(temperature.Si(), ColdestFeed, HottestFeed, "Feed temperature", Scale.Celsius, nameof(temperature));

    private GeneratorMeasurements Changed(Action<GeneratorMeasurements> change)
    {
        GeneratorMeasurements copy = new(this);
        change(copy);
        return copy;
    }
}
