using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Json;

/// <summary>How the generator is fired at 100 %, and with what: the heat model.</summary>
internal sealed class FiringDocument
{
    /// <summary>Shares by mole, which sum to 1: <c>{ "methane": 0.95, "nitrogen": 0.05 }</c>.</summary>
    public Dictionary<string, double>? Fuel { get; set; }

    /// <summary>As measured; from the composition when left out.</summary>
    public string? HeatingValue { get; set; }

    public string? HeatingBasis { get; set; }

    public string? FuelFlow { get; set; }

    public double? ExcessOxygen { get; set; }

    public string? StackTemperature { get; set; }

    public string? AirTemperature { get; set; }

    public double? AirHumidity { get; set; }

    public double? ShellLoss { get; set; }

    public double? ConvectiveShare { get; set; }

    public static FiringDocument? Of(HeatModel? model)
    {
        if (model is null) return null;
        if (model.Split is not null) throw new NotSupportedException("A split law of your own is code and cannot be written: write the generator without it, and give it the law after reading.");
        FiringConditions full = model.FullFiring;
        return new()
        {
            Fuel = model.Fuel.Shares.ToDictionary(share => Names.Of(share.Component), share => share.RawShare),
            HeatingValue = model.Fuel.Measured is { } measured ? QuantityText.Write(measured.Value, "MJ/Sm3", UnitKind.EnergyPerStandardVolume, "kJ/Sm3") : null,
            HeatingBasis = model.Fuel.Measured is { } value ? Names.Of(value.Basis) : null,
            FuelFlow = QuantityText.Write(full.RawFuelFlow, "Sm3/h", UnitKind.StandardGasFlow, "Sm3/s"),
            ExcessOxygen = full.RawExcessOxygen,
            StackTemperature = Degrees(full.RawStackTemperature),
            AirTemperature = Degrees(full.RawAirTemperature),
            AirHumidity = full.RawAirHumidity == 0 ? null : full.RawAirHumidity,
            ShellLoss = model.RawShellShare,
            ConvectiveShare = model.RawConvectiveShare,
        };
    }

    public HeatModel Read(Place place)
    {
        FuelGas fuel = ReadFuel(place);
        double oxygen = place.Member("excessOxygen").Required(ExcessOxygen), shell = place.Member("shellLoss").Required(ShellLoss), share = place.Member("convectiveShare").Required(ConvectiveShare);
        VolumeFlow flow = VolumeFlow.FromCubicMetersPerSecond(place.Member("fuelFlow").Quantity(FuelFlow, UnitKind.StandardGasFlow));
        Temperature stack = Degrees(place.Member("stackTemperature"), StackTemperature), air = Degrees(place.Member("airTemperature"), AirTemperature);
        FiringConditions full = new Change<FiringConditions>(place, place.Make(() => new FiringConditions(flow, Ratio.FromDecimalFractions(oxygen), stack, air)))
            .With("airHumidity", AirHumidity, (it, humidity, _) => it.WithAirHumidity(Ratio.FromDecimalFractions(humidity!.Value)))
            .Made;
        return place.Make(() => new HeatModel(fuel, full, Ratio.FromDecimalFractions(shell), Ratio.FromDecimalFractions(share)));
    }

    private FuelGas ReadFuel(Place place)
    {
        Place at = place.Member("fuel"), basis = place.Member("heatingBasis");
        FuelShare[] shares = [.. at.Required(Fuel).Select(entry => at.Member(entry.Key).Make(() => new FuelShare(Names.Read<GasComponent>(entry.Key, at.Member(entry.Key)), Ratio.FromDecimalFractions(entry.Value))))];
        FuelGas fuel = at.Make(() => new FuelGas(shares));
        if (HeatingBasis is not null && HeatingValue is null) throw place.Member("heatingValue").Fault("is missing: a basis is given");
        return new Change<FuelGas>(place, fuel)
            .With("heatingValue", HeatingValue, (it, text, member) => it.WithHeatingValue(EnergyDensity.FromJoulesPerCubicMeter(member.Quantity(text, UnitKind.EnergyPerStandardVolume)), Names.Read<HeatingBasis>(HeatingBasis, basis)))
            .Made;
    }

    private static Temperature Degrees(Place place, string? text) => Temperature.FromKelvins(place.Quantity(text, UnitKind.Temperature));

    private static string Degrees(double si) => QuantityText.Write(si, "degC", UnitKind.Temperature, "K");
}
