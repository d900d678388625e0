using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>
/// What the instruments of a generator said at one time: its passes, and what is measured once for all. Immutable; each
/// <c>With…</c> returns a changed copy.
/// </summary>
/// <remarks>A pass uses its own tag where it has a good value, else the generator's: see <see cref="ReadingOf"/>.</remarks>
public sealed class GeneratorReading
{
    private readonly Signal[] _signals;

    /// <summary>A reading of the passes alone.</summary>
    /// <param name="time">When.</param>
    /// <param name="passes">One reading for each pass, in the order of the generator; empty when only the combined outlet is metered.</param>
    public GeneratorReading(DateTimeOffset time, IEnumerable<PassReading> passes)
        : this(time, [.. Require.NotNull(passes, nameof(passes))], new Signal[GeneratorSignals.Count])
    {
        for (int i = 0; i < _signals.Length; i++) _signals[i] = Signal.Without(SignalStatus.Missing);
    }

    private GeneratorReading(DateTimeOffset time, IReadOnlyList<PassReading> passes, Signal[] signals) => (Time, Passes, _signals) = (time, passes, signals);

    /// <summary>When.</summary>
    public DateTimeOffset Time { get; }

    /// <summary>The passes with their own tags only.</summary>
    public IReadOnlyList<PassReading> Passes { get; }

    /// <summary>Temperature of the feed water.</summary>
    public Temperature? FeedTemperature => this[GeneratorSignal.FeedTemperature].Temperature;

    /// <summary>Feed flow of all passes together, from its own meter.</summary>
    public MassFlow? TotalFeed => this[GeneratorSignal.TotalFeed].MassFlow;

    /// <summary>Absolute pressure of the steam header.</summary>
    public Pressure? HeaderPressure => this[GeneratorSignal.HeaderPressure].Pressure;

    /// <summary>Differential pressure of one meter on the combined outlet.</summary>
    public Pressure? CombinedDifferential => this[GeneratorSignal.CombinedDifferential].Pressure;

    /// <summary>Firing, as a share of full firing.</summary>
    public Ratio? Firing => this[GeneratorSignal.Firing].Ratio;

    /// <summary>Fuel gas, counted at 15 °C and 101.325 kPa (ISO 13443).</summary>
    public VolumeFlow? FuelGasFlow => this[GeneratorSignal.FuelGasFlow].VolumeFlow;

    /// <summary>Oxygen in the flue gas, by dry volume.</summary>
    public Ratio? ExcessOxygen => this[GeneratorSignal.ExcessOxygen].Ratio;

    /// <summary>Temperature of the flue gas in the stack.</summary>
    public Temperature? StackTemperature => this[GeneratorSignal.StackTemperature].Temperature;

    /// <summary>Temperature of the flue gas between radiant and convection section.</summary>
    public Temperature? BridgeWallTemperature => this[GeneratorSignal.BridgeWallTemperature].Temperature;

    /// <summary>Steam leaving the separator.</summary>
    public MassFlow? SeparatorSteamFlow => this[GeneratorSignal.SeparatorSteamFlow].MassFlow;

    /// <summary>Water leaving the separator.</summary>
    public MassFlow? SeparatorWaterFlow => this[GeneratorSignal.SeparatorWaterFlow].MassFlow;

    /// <summary>Dissolved solids, or one conserved species, in the feed.</summary>
    public MassConcentration? FeedSolids => this[GeneratorSignal.FeedSolids].Concentration;

    /// <summary>The same in the separator's water.</summary>
    public MassConcentration? WaterSolids => this[GeneratorSignal.WaterSolids].Concentration;

    internal Signal this[GeneratorSignal signal] => (uint)signal < (uint)_signals.Length ? _signals[(int)signal] : default;

    /// <summary>Status of one signal.</summary>
    /// <param name="signal">Which one.</param>
    public SignalStatus Status(GeneratorSignal signal) => this[signal].Status;

    /// <summary>
    /// One pass as its calculations see it: its own values, and where it has none the generator's feed temperature, firing and
    /// header pressure; <see cref="PassReading.Source"/> says which.
    /// </summary>
    /// <param name="pass">Index of the pass.</param>
    /// <exception cref="ArgumentOutOfRangeException">There is no such pass.</exception>
    public PassReading ReadingOf(int pass) => pass >= 0 && pass < Passes.Count
        ? Filled(Passes[pass])
        : throw new ArgumentOutOfRangeException(nameof(pass), pass, $"The reading has {Passes.Count} passes.");

    /// <summary>
    /// All passes seen as one: total feed (its own meter, else the sum when every pass has a good flow), the differential of the
    /// meter on the combined outlet, and the header pressure.
    /// </summary>
    public PassReading CombinedOutlet()
    {
        Signal total = this[GeneratorSignal.TotalFeed];
        PassReading combined = Filled(new PassReading(Time)).With(PassSignal.Differential, this[GeneratorSignal.CombinedDifferential]);
        return total.IsGood || Passes.Count == 0
            ? combined.With(PassSignal.FeedFlow, total)
            : combined.With(PassSignal.FeedFlow, Passes.Sum(pass => pass[PassSignal.FeedFlow].Si));
    }

    /// <summary>This reading with another feed temperature.</summary>
    /// <param name="temperature">Temperature; null when missing.</param>
    public GeneratorReading WithFeedTemperature(Temperature? temperature) => With(GeneratorSignal.FeedTemperature, temperature?.Si());

    /// <summary>This reading with another total feed.</summary>
    /// <param name="flow">Flow of all passes together; null when missing.</param>
    public GeneratorReading WithTotalFeed(MassFlow? flow) => With(GeneratorSignal.TotalFeed, flow?.Si());

    /// <summary>This reading with another header pressure.</summary>
    /// <param name="pressure">Absolute pressure; null when missing.</param>
    public GeneratorReading WithHeaderPressure(Pressure? pressure) => With(GeneratorSignal.HeaderPressure, pressure?.Si());

    /// <summary>This reading with another differential of the combined outlet.</summary>
    /// <param name="differential">Differential pressure; null when missing.</param>
    public GeneratorReading WithCombinedDifferential(Pressure? differential) => With(GeneratorSignal.CombinedDifferential, differential?.Si());

    /// <summary>This reading with another firing.</summary>
    /// <param name="firing">Share of full firing; null when missing.</param>
    public GeneratorReading WithFiring(Ratio? firing) => With(GeneratorSignal.Firing, firing?.Si());

    /// <summary>This reading with another fuel gas flow.</summary>
    /// <param name="flow">Flow counted at 15 °C and 101.325 kPa; null when missing.</param>
    public GeneratorReading WithFuelGasFlow(VolumeFlow? flow) => With(GeneratorSignal.FuelGasFlow, flow?.Si());

    /// <summary>This reading with another excess oxygen.</summary>
    /// <param name="oxygen">Share by dry volume; null when missing.</param>
    public GeneratorReading WithExcessOxygen(Ratio? oxygen) => With(GeneratorSignal.ExcessOxygen, oxygen?.Si());

    /// <summary>This reading with another stack temperature.</summary>
    /// <param name="temperature">Temperature; null when missing.</param>
    public GeneratorReading WithStackTemperature(Temperature? temperature) => With(GeneratorSignal.StackTemperature, temperature?.Si());

    /// <summary>This reading with another bridge-wall temperature.</summary>
    /// <param name="temperature">Temperature; null when missing.</param>
    public GeneratorReading WithBridgeWallTemperature(Temperature? temperature) => With(GeneratorSignal.BridgeWallTemperature, temperature?.Si());

    /// <summary>This reading with the separator's flows.</summary>
    /// <param name="steam">Steam leaving the separator; null when missing.</param>
    /// <param name="water">Water leaving the separator; null when missing.</param>
    public GeneratorReading WithSeparatorFlows(MassFlow? steam, MassFlow? water) =>
        With(GeneratorSignal.SeparatorSteamFlow, steam?.Si()).With(GeneratorSignal.SeparatorWaterFlow, water?.Si());

    /// <summary>This reading with the solids of feed and separator water.</summary>
    /// <param name="feed">Concentration in the feed; null when missing.</param>
    /// <param name="water">Concentration in the separator's water; null when missing.</param>
    public GeneratorReading WithSolids(MassConcentration? feed, MassConcentration? water) =>
        With(GeneratorSignal.FeedSolids, feed?.As(UnitsNet.Units.MassConcentrationUnit.KilogramPerCubicMeter))
        .With(GeneratorSignal.WaterSolids, water?.As(UnitsNet.Units.MassConcentrationUnit.KilogramPerCubicMeter));

    /// <summary>This reading with one signal taken out and the reason in its place.</summary>
    /// <param name="signal">Which one.</param>
    /// <param name="status">The reason: missing, bad or out of range.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="status"/> is good: give the value instead.</exception>
    public GeneratorReading Without(GeneratorSignal signal, SignalStatus status) =>
        status == SignalStatus.Good ? throw new ArgumentOutOfRangeException(nameof(status), status, "A signal is taken out with the reason, not as good.") : With(signal, Signal.Without(status));

    internal GeneratorReading With(GeneratorSignal signal, double? si) =>
        With(signal, Signal.Read(si ?? double.NaN, GeneratorSignals.Kind(signal), SignalSource.Generator));

    private GeneratorReading With(GeneratorSignal signal, in Signal value)
    {
        var changed = (Signal[])_signals.Clone();
        changed[(int)signal] = value;
        return new GeneratorReading(Time, Passes, changed);
    }

    private PassReading Filled(in PassReading pass)
    {
        PassReading filled = pass;
        foreach ((PassSignal own, GeneratorSignal shared) in GeneratorSignals.SharedWithPasses) filled = Fill(filled, own, shared);
        return filled;
    }

    private PassReading Fill(in PassReading pass, PassSignal own, GeneratorSignal shared) =>
        !pass[own].IsGood && this[shared].IsGood ? pass.With(own, this[shared]) : pass;
}
