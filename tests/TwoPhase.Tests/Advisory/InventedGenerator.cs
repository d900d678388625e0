using MathNet.Numerics.Distributions;
using TwoPhase.Advisory;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.Tests.Advisory;

/// <summary>An invented generator in a state that is known, and readings of it with errors that are known.</summary>
internal sealed class InventedGenerator
{
    private static readonly double[] Flows = [4.80, 4.62, 5.05, 4.71, 4.93, 4.55], Qualities = [0.771, 0.795, 0.748, 0.802, 0.764, 0.783];

    private readonly Saturation _outlet, _separator;
    private readonly double _feedEnthalpy;

    public InventedGenerator(int passes = 6)
    {
        Meter = new QualityMeter(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined), WetSteamModel.Homogeneous);
        Generator = new SteamGenerator("invented", Enumerable.Range(0, passes).Select(i => new Pass($"{i + 1}", []).WithMeter(Meter)));
        _outlet = Saturation.FromPressure(Pressure.FromMegapascals(9.6));
        _separator = Saturation.FromPressure(Pressure.FromMegapascals(9.2));
        _feedEnthalpy = SteamState.FromPressureTemperature(Pressure.FromMegapascals(9.6), Temperature.FromKelvins(445)).SpecificEnthalpy.JoulesPerKilogram;
        Add(Instrument.HeaderPressure, 9.6e6, 20e3);
        Add(Instrument.FeedTemperature, 445, 1.5);
        double total = 0, energy = 0, heat = 0;
        for (int i = 0; i < passes; i++)
        {
            double flow = Flows[i], x = Qualities[i], h = Enthalpy(_outlet, x), absorbed = flow * (h - _feedEnthalpy);
            double differential = Meter.Differential(MassFlow.FromKilogramsPerSecond(flow), _outlet.Pressure, MassFraction.FromDecimalFractions(x)).Pascals;
            Add(Instrument.FeedFlowOf(i), flow, 0.008 * flow);
            Add(Instrument.DifferentialOf(i), differential, 0.015 * differential);
            Add(Instrument.OutletQualityOf(i), x, 0.012);
            Add(Instrument.AbsorbedHeatOf(i), absorbed, 0.02 * absorbed);
            (total, energy, heat) = (total + flow, energy + (flow * h), heat + absorbed);
        }

        Quality = ((energy / total) - _separator.Liquid.SpecificEnthalpy.JoulesPerKilogram) / _separator.LatentHeat.JoulesPerKilogram;
        Add(Instrument.TotalFeed, total, 0.005 * total);
        Add(Instrument.SeparatorSteam, total * Quality, 0.01 * total * Quality);
        Add(Instrument.SeparatorWater, total * (1 - Quality), 0.015 * total * (1 - Quality));
        Add(Instrument.SeparatorQuality, Quality, 0.006);
        Add(Instrument.TotalHeat, heat, 0.03 * heat);
        Add(Instrument.FuelHeat, heat / 0.84, 0.01 * heat / 0.84);
        Add(Instrument.Efficiency, 0.84, 0.012);
    }

    public QualityMeter Meter { get; }

    public SteamGenerator Generator { get; }

    /// <summary>Quality at the separator.</summary>
    public double Quality { get; }

    public Dictionary<Instrument, double> Truth { get; } = [];

    public Dictionary<Instrument, double> Uncertainty { get; } = [];

    /// <summary>Every instrument except those that say the same as others: quality of single passes, heat of all.</summary>
    public Instrument[] Usual => [.. Truth.Keys.Where(instrument => instrument.Kind != InstrumentKind.OutletQuality && instrument != Instrument.TotalHeat)];

    /// <summary>Errors as the reconciliation assumes them: own ones, and one of the wet-steam model that all differentials share.</summary>
    public Dictionary<Instrument, double> Errors(System.Random random)
    {
        double model = Meter.ModelUncertainty.DecimalFractions * Normal.Sample(random, 0, 1);
        return Truth.Keys.ToDictionary(instrument => instrument, instrument => (Uncertainty[instrument] * Normal.Sample(random, 0, 1)) + (instrument.Kind == InstrumentKind.Differential ? model * Truth[instrument] : 0));
    }

    public GeneratorMeasurements Measure(IEnumerable<Instrument> instruments, Func<Instrument, double>? error = null)
    {
        GeneratorMeasurements measurements = new GeneratorMeasurements(Generator).WithSeparatorPressure(_separator.Pressure);
        foreach (Instrument instrument in instruments) measurements = With(measurements, instrument, Truth[instrument] + (error?.Invoke(instrument) ?? 0), Uncertainty[instrument]);
        return measurements;
    }

    private static GeneratorMeasurements With(GeneratorMeasurements measurements, Instrument instrument, double value, double u) => (instrument.Kind, instrument.Pass) switch
    {
        (InstrumentKind.FeedFlow, { } pass) => measurements.WithFeedFlow(pass, Flow(value), Flow(u)),
        (InstrumentKind.Differential, { } pass) => measurements.WithDifferential(pass, Pressure.FromPascals(value), Pressure.FromPascals(u)),
        (InstrumentKind.OutletQuality, { } pass) => measurements.WithOutletQuality(pass, Fraction(value), Fraction(u)),
        (InstrumentKind.AbsorbedHeat, { } pass) => measurements.WithAbsorbedHeat(pass, Power.FromWatts(value), Power.FromWatts(u)),
        (InstrumentKind.AbsorbedHeat, null) => measurements.WithAbsorbedHeat(Power.FromWatts(value), Power.FromWatts(u)),
        (InstrumentKind.OutletPressure, null) => measurements.WithHeaderPressure(Pressure.FromPascals(value), Pressure.FromPascals(u)),
        (InstrumentKind.FeedTemperature, null) => measurements.WithFeedTemperature(Temperature.FromKelvins(value), TemperatureDelta.FromKelvins(u)),
        (InstrumentKind.TotalFeed, _) => measurements.WithTotalFeed(Flow(value), Flow(u)),
        (InstrumentKind.SeparatorSteam, _) => measurements.WithSeparatorSteam(Flow(value), Flow(u)),
        (InstrumentKind.SeparatorWater, _) => measurements.WithSeparatorWater(Flow(value), Flow(u)),
        (InstrumentKind.SeparatorQuality, _) => measurements.WithSeparatorQuality(Fraction(value), Fraction(u)),
        (InstrumentKind.FuelHeat, _) => measurements.WithFuelHeat(Power.FromWatts(value), Power.FromWatts(u)),
        (InstrumentKind.Efficiency, _) => measurements.WithEfficiency(Ratio.FromDecimalFractions(value), Ratio.FromDecimalFractions(u)),
        _ => throw new ArgumentOutOfRangeException(nameof(instrument), instrument, "not simulated"),
    };

    private static MassFlow Flow(double value) => MassFlow.FromKilogramsPerSecond(value);

    private static MassFraction Fraction(double value) => MassFraction.FromDecimalFractions(value);

    private static double Enthalpy(Saturation steam, double x) => steam.Liquid.SpecificEnthalpy.JoulesPerKilogram + (x * steam.LatentHeat.JoulesPerKilogram);

    private void Add(Instrument instrument, double truth, double uncertainty) => (Truth[instrument], Uncertainty[instrument]) = (truth, uncertainty);
}
