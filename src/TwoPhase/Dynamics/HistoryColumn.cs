using TwoPhase.Units;
using UnitsNet.Units;

namespace TwoPhase.Dynamics;

/// <summary>One column of a history: its name, its heading in a file, and where its numbers come from, SI.</summary>
internal sealed class HistoryColumn(string name, string heading, Type unit, Func<PassInstant, double> raw)
{
    /// <summary>All of them, in the order of <see cref="Row"/>.</summary>
    public static HistoryColumn[] All { get; } =
    [
        new(nameof(PassInstant.Time), "time_s", typeof(DurationUnit), row => row.RawTime),
        new(nameof(PassInstant.FeedFlow), "feed_flow_kg_s", typeof(MassFlowUnit), row => row.RawFeedFlow),
        new(nameof(PassInstant.OutletFlow), "outlet_flow_kg_s", typeof(MassFlowUnit), row => row.RawOutletFlow),
        new(nameof(PassInstant.TrueQuality), "true_quality", typeof(MassFractionUnit), row => row.RawTrueQuality),
        new(nameof(PassInstant.IndicatedQuality), "indicated_quality", typeof(MassFractionUnit), row => row.RawIndicatedQuality),
        new(nameof(PassInstant.Differential), "differential_Pa", typeof(PressureUnit), row => row.RawDifferential),
        new(nameof(PassInstant.OutletPressure), "outlet_pressure_Pa_abs", typeof(PressureUnit), row => row.RawOutletPressure),
        new(nameof(PassInstant.InletPressure), "inlet_pressure_Pa_abs", typeof(PressureUnit), row => row.RawInletPressure),
        new(nameof(PassInstant.Holdup), "holdup_kg", typeof(MassUnit), row => row.RawHoldup),
        new(nameof(PassInstant.BoilingOnset), "boiling_onset_m", typeof(LengthUnit), row => row.RawOnset),
        new(nameof(PassInstant.OutletTemperature), "outlet_temperature_K", typeof(TemperatureUnit), row => row.RawOutletTemperature),
        new(nameof(PassInstant.HottestMetal), "hottest_metal_K", typeof(TemperatureUnit), row => row.RawHottestMetal),
        new(nameof(PassInstant.AbsorbedHeat), "absorbed_heat_W", typeof(PowerUnit), row => row.RawAbsorbedHeat),
        new(nameof(PassInstant.ValveShut), "valve_shut", typeof(RatioUnit), row => row.RawValveShut),
    ];

    public string Name => name;

    public string Heading => heading;

    public double Raw(in PassInstant row) => raw(row);

    /// <summary>A row from the values of all columns.</summary>
    public static PassInstant Row(double[] values) => new()
    {
        RawTime = values[0],
        RawFeedFlow = values[1],
        RawOutletFlow = values[2],
        RawTrueQuality = values[3],
        RawIndicatedQuality = values[4],
        RawDifferential = values[5],
        RawOutletPressure = values[6],
        RawInletPressure = values[7],
        RawHoldup = values[8],
        RawOnset = values[9],
        RawOutletTemperature = values[10],
        RawHottestMetal = values[11],
        RawAbsorbedHeat = values[12],
        RawValveShut = values[13],
    };

    /// <summary>The line from SI to a unit of this column.</summary>
    public LinearMap To<TUnit>(TUnit wanted)
        where TUnit : struct, Enum => typeof(TUnit) != unit
        ? throw new ArgumentException($"Column '{name}' is wanted in {typeof(TUnit).Name}.{wanted}; its units are those of {unit.Name}.", nameof(wanted))
        : ToSi(wanted).Inverse;

    private static LinearMap ToSi(object unit) => unit switch
    {
        DurationUnit duration => duration.ToSi(),
        MassFlowUnit flow => flow.ToSi(),
        MassFractionUnit fraction => fraction.ToSi(),
        PressureUnit pressure => pressure.ToSi(),
        MassUnit mass => mass.ToSi(),
        LengthUnit length => length.ToSi(),
        PowerUnit power => power.ToSi(),
        RatioUnit ratio => ratio.ToSi(),
        _ => ((TemperatureUnit)unit).ToSi(),
    };
}
