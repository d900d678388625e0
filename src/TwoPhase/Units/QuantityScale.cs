using UnitsNet;

namespace TwoPhase.Units;

/// <summary>What a number of a table is measured in: how an SI double becomes a quantity, as a level and as a difference of levels.</summary>
internal sealed class QuantityScale
{
    public static readonly QuantityScale Quality = new(new("%", 100), new("points", 100), static value => MassFraction.FromDecimalFractions(value));
    public static readonly QuantityScale Ratio = new(Scale.None, Scale.None, static value => UnitsNet.Ratio.FromDecimalFractions(value));
    public static readonly QuantityScale Temperature = new(Scale.Celsius, Scale.Kelvins, static value => UnitsNet.Temperature.FromKelvins(value), static value => TemperatureDelta.FromKelvins(value));
    public static readonly QuantityScale Speed = new(new("m/s", 1), new("m/s", 1), static value => UnitsNet.Speed.FromMetersPerSecond(value));
    public static readonly QuantityScale Differential = new(Scale.Kilopascals, Scale.Kilopascals, static value => UnitsNet.Pressure.FromPascals(value));
    public static readonly QuantityScale Pressure = new(Scale.Megapascals, Scale.Megapascals, static value => UnitsNet.Pressure.FromPascals(value));
    public static readonly QuantityScale Flow = new(Scale.KilogramsPerSecond, Scale.KilogramsPerSecond, static value => MassFlow.FromKilogramsPerSecond(value));
    public static readonly QuantityScale Heat = new(Scale.Megawatts, Scale.Megawatts, static value => Power.FromWatts(value));

    private readonly Scale _levelScale, _differenceScale;
    private readonly Func<double, IQuantity> _level, _difference;

    private QuantityScale(Scale levelScale, Scale differenceScale, Func<double, IQuantity> level, Func<double, IQuantity>? difference = null) =>
        (_levelScale, _differenceScale, _level, _difference) = (levelScale, differenceScale, level, difference ?? level);

    public IQuantity Level(double value) => _level(value);

    public IQuantity Difference(double value) => _difference(value);

    public string LevelText(double value) => _levelScale.Text(value, "G4");

    /// <summary>With its sign.</summary>
    public string DifferenceText(double value) => (value > 0 ? "+" : "") + SizeText(value);

    /// <summary>A difference as the size that it is.</summary>
    public string SizeText(double value) => _differenceScale.Text(value, "G3");
}
