using System.Reflection;
using TwoPhase.Advisory;
using TwoPhase.Dynamics;
using TwoPhase.Flow;
using TwoPhase.Friction;
using TwoPhase.HeatTransfer;
using TwoPhase.Limits;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Tests.Passes;
using UnitsNet;

namespace TwoPhase.Tests.House;

/// <summary>Every value that a caller can set is read back as it was set, in whatever unit, and the original stays as it was.</summary>
public class ChangeTests
{
    private static readonly DateTimeOffset Noon = new(2031, 5, 14, 12, 0, 0, TimeSpan.Zero);

    private static readonly object[] Originals =
    [
        EstimatorOptions.Default, TrimSettings.Default, SimulatorOptions.Default, PassModels.Default, SiteLimits.Default,
        ExamplePass.Pass, ExamplePass.Conditions, ExamplePass.Tubes("tubes", 300),
        new FiringConditions(VolumeFlow.FromCubicMetersPerSecond(0.4), Ratio.FromPercent(2), Temperature.FromKelvins(440), Temperature.FromKelvins(290)),
        new PassReading(Noon, MassFlow.FromKilogramsPerSecond(4), Pressure.FromKilopascals(40)),
        new GeneratorReading(Noon, []),
    ];

    // In units other than those inside.
    private static readonly Dictionary<Type, object> Values = new()
    {
        [typeof(Ratio)] = Ratio.FromPercent(13),
        [typeof(MassFraction)] = MassFraction.FromPercent(71),
        [typeof(Duration)] = Duration.FromMinutes(3),
        [typeof(Pressure)] = Pressure.FromBars(83),
        [typeof(Temperature)] = Temperature.FromDegreesCelsius(181),
        [typeof(TemperatureDelta)] = TemperatureDelta.FromDegreesFahrenheit(18),
        [typeof(MassFlow)] = MassFlow.FromTonnesPerHour(19),
        [typeof(VolumeFlow)] = VolumeFlow.FromCubicMetersPerHour(1700),
        [typeof(Power)] = Power.FromMegawatts(7),
        [typeof(Length)] = Length.FromMillimeters(0.4),
        [typeof(Angle)] = Angle.FromDegrees(7),
        [typeof(Mass)] = Mass.FromTonnes(1.2),
        [typeof(MassConcentration)] = MassConcentration.FromMilligramsPerLiter(900),
        [typeof(HeatFlux)] = HeatFlux.FromKilowattsPerSquareMeter(70),
        [typeof(int)] = 90,
        [typeof(double)] = 1.7,
        [typeof(VoidFractionModel)] = VoidFractionModel.Zivi,
        [typeof(FrictionModel)] = FrictionModel.Gronnerud,
        [typeof(FilmModel)] = FilmModel.Chen,
        [typeof(CriticalQualityModel)] = CriticalQualityModel.All[^1],
        [typeof(TubeMetal)] = new TubeMetal("alloy", Density.FromGramsPerCubicCentimeter(7.9), SpecificEntropy.FromKilojoulesPerKilogramKelvin(0.5), ThermalConductivity.FromWattsPerMeterKelvin(30)),
        [typeof(PassModels)] = PassModels.Default.WithSlip(VoidFractionModel.Zivi),
        [typeof(MeteringUncertainty)] = new MeteringUncertainty(Ratio.FromPercent(0.7), Pressure.FromPascals(300), Pressure.FromKilopascals(20)),
    };

    [Fact]
    public void With_EveryValue_IsReadBackAndLeavesTheOriginal()
    {
        int read = 0;
        List<string> wrong = [];
        foreach (object original in Originals)
        {
            foreach (MethodInfo change in original.GetType().GetMethods().Where(method => method.Name.StartsWith("With", StringComparison.Ordinal) && method.GetParameters().Length == 1))
            {
                Type asked = Plain(change.GetParameters()[0].ParameterType);
                if (original.GetType().GetProperty(change.Name["With".Length..]) is not { } property || Plain(property.PropertyType) != asked || !Values.TryGetValue(asked, out object? value)) continue;
                object? before = property.GetValue(original), after = property.GetValue(change.Invoke(original, [value]));
                if (!IsSame(value, after)) wrong.Add($"{original.GetType().Name}.{change.Name}: {after} for {value}");
                if (!IsSame(before, property.GetValue(original))) wrong.Add($"{original.GetType().Name}.{change.Name} changed the original");
                read++;
            }
        }

        Assert.Empty(wrong);
        Assert.True(read >= 50, $"only {read} values were found");
    }

    private static bool IsSame(object? expected, object? actual) => expected is IQuantity quantity && actual is IQuantity got
        ? Math.Abs((double)got.As(quantity.Unit) - (double)quantity.Value) <= 1e-12 * Math.Abs((double)quantity.Value)
        : Equals(expected, actual);

    private static Type Plain(Type type) => Nullable.GetUnderlyingType(type) ?? type;
}
