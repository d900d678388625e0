using TwoPhase.Units;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Tests.Units;

public class ColumnTests
{
    [Fact]
    public void Of_Samples_KeepsThemAndTheirUnit()
    {
        Column<PressureUnit> column = Column.Of([1, double.NaN], PressureUnit.Bar);

        Assert.Equal(2, column.Length);
        Assert.Equal(1, column.Values[0]);
        Assert.Equal(PressureUnit.Bar, column.Unit);
    }

    [Fact]
    public void Constructor_UndefinedUnit_ThrowsNamingTheEnumeration()
    {
        ArgumentOutOfRangeException error = Assert.Throws<ArgumentOutOfRangeException>(() => _ = new Column<PressureUnit>([], default).Length);

        Assert.Contains(nameof(PressureUnit), error.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(PressureUnit.Pascal)]
    [InlineData(PressureUnit.Kilopascal)]
    [InlineData(PressureUnit.Megapascal)]
    [InlineData(PressureUnit.Bar)]
    [InlineData(PressureUnit.PoundForcePerSquareInch)]
    [InlineData(PressureUnit.KilogramForcePerSquareCentimeter)]
    [InlineData(PressureUnit.Atmosphere)]
    [InlineData(PressureUnit.InchOfWaterColumn)]
    public void ToSi_Pressure_AgreesWithTheSingleQuantity(PressureUnit unit) =>
        Agree(unit.ToSi(), value => new Pressure(value, unit).Si());

    [Theory]
    [InlineData(TemperatureUnit.Kelvin)]
    [InlineData(TemperatureUnit.DegreeCelsius)]
    [InlineData(TemperatureUnit.DegreeFahrenheit)]
    [InlineData(TemperatureUnit.DegreeRankine)]
    public void ToSi_Temperature_AgreesWithTheSingleQuantity(TemperatureUnit unit) =>
        Agree(unit.ToSi(), value => new Temperature(value, unit).Si());

    [Theory]
    [InlineData(MassFlowUnit.KilogramPerSecond)]
    [InlineData(MassFlowUnit.TonnePerHour)]
    [InlineData(MassFlowUnit.PoundPerHour)]
    [InlineData(MassFlowUnit.ShortTonPerHour)]
    public void ToSi_MassFlow_AgreesWithTheSingleQuantity(MassFlowUnit unit) =>
        Agree(unit.ToSi(), value => new MassFlow(value, unit).Si());

    [Fact]
    public void ToSi_OtherColumnsOfAPlant_AgreeWithTheSingleQuantity()
    {
        Agree(SpecificEnergyUnit.BtuPerPound.ToSi(), value => new SpecificEnergy(value, SpecificEnergyUnit.BtuPerPound).Si());
        Agree(SpecificVolumeUnit.CubicFootPerPound.ToSi(), value => new SpecificVolume(value, SpecificVolumeUnit.CubicFootPerPound).Si());
        Agree(DensityUnit.PoundPerCubicFoot.ToSi(), value => new Density(value, DensityUnit.PoundPerCubicFoot).Si());
        Agree(MassFractionUnit.Percent.ToSi(), value => new MassFraction(value, MassFractionUnit.Percent).Si());
        Agree(RatioUnit.Percent.ToSi(), value => new Ratio(value, RatioUnit.Percent).Si());
        Agree(LengthUnit.Inch.ToSi(), value => new Length(value, LengthUnit.Inch).Si());
        Agree(DurationUnit.Hour.ToSi(), value => new Duration(value, DurationUnit.Hour).Si());
        Agree(VolumeFlowUnit.CubicMeterPerDay.ToSi(), value => new VolumeFlow(value, VolumeFlowUnit.CubicMeterPerDay).Si());
        Agree(PowerUnit.Megawatt.ToSi(), value => new Power((decimal)value, PowerUnit.Megawatt).Si());
    }

    [Fact]
    public void Inverse_ThereAndBack_IsTheSameNumber()
    {
        LinearMap map = TemperatureUnit.DegreeFahrenheit.ToSi();

        Approx.Relative(600, map.Inverse.Map(map.Map(600)), 2e-15);
    }

    [Fact]
    public void ToSi_UnitOfThePlant_AllocatesNothing() =>
        Assert.Equal(0, AllocationProbe.Bytes(() => MassFlowUnit.TonnePerHour.ToSi()));

    // 1e-15: one rounding of the factor and one of the fused product, against one division in the single quantity.
    private static void Agree(LinearMap map, Func<double, double> single)
    {
        foreach (double value in new[] { 0.001, 1, 37.4, 9876.54321 })
            Approx.Relative(single(value), map.Map(value), 1e-15);
    }
}
