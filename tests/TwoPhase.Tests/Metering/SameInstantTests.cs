using TwoPhase.Metering;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Tests.Metering;

/// <summary>One instant as three plants write it gives one quality.</summary>
public class SameInstantTests
{
    private const double FlowKgS = 4.8, PressurePa = 9.6e6, DifferentialPa = 41.6e3;

    private static readonly DateTimeOffset Noon = new(2031, 5, 14, 12, 0, 0, TimeSpan.Zero);

    private static readonly QualityMeter Meter =
        new(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined), WetSteamModel.Homogeneous);

    // Raw numbers from NIST SP 811 (pound, psi, standard gravity) and IAPWS-95 densities of water at 101.325 kPa
    // (python3 iapws 1.5.2): 999.0171 kg/m³ at 60 °F, 999.1026 at 15 °C.
    [Fact]
    public void Quality_ThreePlantsUnits_AgreeToOnePartInAMillion()
    {
        UnitBasis site = UnitBasis.None.WithAtmosphericPressure(Pressure.FromKilopascals(93));
        double si = Quality(new ReadingFormat("kg/s", "degC", "%", "kPa(a)", "kPa"), FlowKgS, PressurePa / 1e3, DifferentialPa / 1e3);
        double imperial = Quality(new ReadingFormat("lb/h", "degF", "%", "psig", "inH2O at 60 degF", site),
            FlowKgS * 3600 / 0.45359237, (PressurePa - 93e3) / 6894.757293168361, DifferentialPa / (0.0254 * 9.80665 * 999.0171));
        double mixed = Quality(new ReadingFormat("m3/d of cold water at 15 degC", "degC", "%", "barg", "% of a 75 kPa span", site),
            FlowKgS * 86400 / 999.1026, (PressurePa - 93e3) / 1e5, DifferentialPa / 750);
        Assert.InRange(si, 0.7, 0.9);
        Approx.Absolute(si, imperial, 1e-6);
        Approx.Absolute(si, mixed, 1e-6);
    }

    private static double Quality(ReadingFormat format, double flow, double pressure, double differential)
    {
        PassReading reading = format.Read(Noon, flow, double.NaN, double.NaN, pressure, differential);
        return Meter.Quality(reading.FeedFlow!.Value, reading.OutletPressure!.Value, reading.Differential!.Value).Quality.DecimalFractions;
    }
}
