using TwoPhase.Units;

namespace TwoPhase.Advisory;

/// <summary>One instrument of a generator, or the quantity that it measures: what it is about, and of which pass.</summary>
public readonly record struct Instrument
{
    private Instrument(InstrumentKind kind, int? pass = null) => (Kind, Pass) = (kind, pass);

    /// <summary>What it measures; <see cref="InstrumentKind.None"/> in a default value.</summary>
    public InstrumentKind Kind { get; }

    /// <summary>Index of its pass; null where it is one for all.</summary>
    public int? Pass { get; }

    /// <summary>Feed flow of all passes together.</summary>
    public static Instrument TotalFeed { get; } = new(InstrumentKind.TotalFeed);

    /// <summary>Temperature of the feed of all passes.</summary>
    public static Instrument FeedTemperature { get; } = new(InstrumentKind.FeedTemperature);

    /// <summary>Pressure of the header.</summary>
    public static Instrument HeaderPressure { get; } = new(InstrumentKind.OutletPressure);

    /// <summary>Steam that leaves the separator.</summary>
    public static Instrument SeparatorSteam { get; } = new(InstrumentKind.SeparatorSteam);

    /// <summary>Water that leaves the separator.</summary>
    public static Instrument SeparatorWater { get; } = new(InstrumentKind.SeparatorWater);

    /// <summary>Quality at the separator.</summary>
    public static Instrument SeparatorQuality { get; } = new(InstrumentKind.SeparatorQuality);

    /// <summary>Heat absorbed by all passes together.</summary>
    public static Instrument TotalHeat { get; } = new(InstrumentKind.AbsorbedHeat);

    /// <summary>Heat that the fuel brings.</summary>
    public static Instrument FuelHeat { get; } = new(InstrumentKind.FuelHeat);

    /// <summary>Share of the fuel's heat that the water absorbs.</summary>
    public static Instrument Efficiency { get; } = new(InstrumentKind.Efficiency);

    /// <summary>Differential of the meter on the combined outlet.</summary>
    public static Instrument CombinedDifferential { get; } = new(InstrumentKind.CombinedDifferential);

    internal QuantityScale Scale => Kind switch
    {
        InstrumentKind.FeedFlow or InstrumentKind.TotalFeed or InstrumentKind.SeparatorSteam or InstrumentKind.SeparatorWater => QuantityScale.Flow,
        InstrumentKind.Differential or InstrumentKind.CombinedDifferential => QuantityScale.Differential,
        InstrumentKind.OutletQuality or InstrumentKind.SeparatorQuality => QuantityScale.Quality,
        InstrumentKind.AbsorbedHeat or InstrumentKind.FuelHeat => QuantityScale.Heat,
        InstrumentKind.OutletPressure => QuantityScale.Pressure,
        InstrumentKind.FeedTemperature => QuantityScale.Temperature,
        _ => QuantityScale.Ratio,
    };

    /// <summary>Feed flow of a pass.</summary>
    /// <param name="pass">Index of the pass.</param>
    public static Instrument FeedFlowOf(int pass) => new(InstrumentKind.FeedFlow, pass);

    /// <summary>Differential of the meter of a pass.</summary>
    /// <param name="pass">Index of the pass.</param>
    public static Instrument DifferentialOf(int pass) => new(InstrumentKind.Differential, pass);

    /// <summary>Outlet quality of a pass.</summary>
    /// <param name="pass">Index of the pass.</param>
    public static Instrument OutletQualityOf(int pass) => new(InstrumentKind.OutletQuality, pass);

    /// <summary>Heat absorbed by a pass.</summary>
    /// <param name="pass">Index of the pass.</param>
    public static Instrument AbsorbedHeatOf(int pass) => new(InstrumentKind.AbsorbedHeat, pass);

    /// <summary>Outlet pressure of a pass.</summary>
    /// <param name="pass">Index of the pass.</param>
    public static Instrument OutletPressureOf(int pass) => new(InstrumentKind.OutletPressure, pass);

    /// <summary>Feed temperature of a pass.</summary>
    /// <param name="pass">Index of the pass.</param>
    public static Instrument FeedTemperatureOf(int pass) => new(InstrumentKind.FeedTemperature, pass);

    internal string NameIn(IReadOnlyList<Passes.Pass> passes) => Pass is { } pass ? $"{Words} of pass '{passes[pass].Name}'" : Words;

    private string Words => (Kind, Pass) switch
    {
        (InstrumentKind.FeedFlow, _) => "feed flow",
        (InstrumentKind.Differential, _) => "differential",
        (InstrumentKind.OutletQuality, _) => "outlet quality",
        (InstrumentKind.AbsorbedHeat, null) => "heat of all passes",
        (InstrumentKind.AbsorbedHeat, _) => "heat",
        (InstrumentKind.OutletPressure, null) => "header pressure",
        (InstrumentKind.OutletPressure, _) => "outlet pressure",
        (InstrumentKind.FeedTemperature, _) => "feed temperature",
        (InstrumentKind.TotalFeed, _) => "total feed",
        (InstrumentKind.SeparatorSteam, _) => "separator steam",
        (InstrumentKind.SeparatorWater, _) => "separator water",
        (InstrumentKind.SeparatorQuality, _) => "separator quality",
        (InstrumentKind.FuelHeat, _) => "fuel heat",
        (InstrumentKind.Efficiency, _) => "efficiency",
        (InstrumentKind.CombinedDifferential, _) => "combined differential",
        _ => "none",
    };

    internal object ToDump() => ToString();

    /// <summary>The kind, and the number of the pass counted from 1.</summary>
    public override string ToString() => Pass is { } pass ? FormattableString.Invariant($"{Words} of pass number {pass + 1}") : Words;
}
