using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Limits;

/// <summary>What a limit is measured in: how an SI double becomes a quantity, as a level and as a difference of levels.</summary>
internal sealed class LimitQuantity
{
    public static readonly LimitQuantity Quality = new(new("%", 100), new("points", 100), static value => MassFraction.FromDecimalFractions(value));
    public static readonly LimitQuantity Ratio = new(Scale.None, Scale.None, static value => UnitsNet.Ratio.FromDecimalFractions(value));
    public static readonly LimitQuantity Temperature = new(Scale.Celsius, Scale.Kelvins, static value => UnitsNet.Temperature.FromKelvins(value), static value => TemperatureDelta.FromKelvins(value));
    public static readonly LimitQuantity Speed = new(new("m/s", 1), new("m/s", 1), static value => UnitsNet.Speed.FromMetersPerSecond(value));
    public static readonly LimitQuantity Differential = new(Scale.Kilopascals, Scale.Kilopascals, static value => Pressure.FromPascals(value));
    public static readonly LimitQuantity Flow = new(Scale.KilogramsPerSecond, Scale.KilogramsPerSecond, static value => MassFlow.FromKilogramsPerSecond(value));

    private readonly Scale _levelScale, _differenceScale;
    private readonly Func<double, IQuantity> _level, _difference;

    private LimitQuantity(Scale levelScale, Scale differenceScale, Func<double, IQuantity> level, Func<double, IQuantity>? difference = null) =>
        (_levelScale, _differenceScale, _level, _difference) = (levelScale, differenceScale, level, difference ?? level);

    public IQuantity Level(double value) => _level(value);

    public IQuantity Difference(double value) => _difference(value);

    public string LevelText(double value) => _levelScale.Text(value, "G4");

    public string DifferenceText(double value) => (value > 0 ? "+" : "") + _differenceScale.Text(value, "G3");
}
