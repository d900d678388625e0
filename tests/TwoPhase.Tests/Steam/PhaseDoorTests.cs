using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.Tests.Steam;

/// <summary>What thermodynamics asks of the figures of a state as a caller reads them.</summary>
public class PhaseDoorTests
{
    // IAPWS R7-97(2012), tables 5 and 15: region 1 at 300 K and 3 MPa, region 2 at 700 K and 30 MPa.
    [Theory]
    [InlineData(300, 3, 112.324818, 0.392294792)]
    [InlineData(700, 30, 2468.61076, 5.17540298)]
    public void State_OfTheRelease_HasItsEnergyAndEntropy(double kelvins, double megapascals, double energy, double entropy)
    {
        SteamState state = SteamState.FromPressureTemperature(Pressure.FromMegapascals(megapascals), Temperature.FromKelvins(kelvins));
        Approx.Relative(energy, state.SpecificInternalEnergy.KilojoulesPerKilogram, 1e-8);
        Approx.Relative(entropy, state.SpecificEntropy.KilojoulesPerKilogramKelvin, 1e-8);
    }

    // u = h - p v of each phase; T (s" - s') = h" - h' of both.
    [Theory]
    [InlineData(0.01)]
    [InlineData(1)]
    [InlineData(9.6)]
    [InlineData(16)]
    public void Phases_InEquilibrium_ObeyTheDefinitions(double megapascals)
    {
        Saturation steam = Saturation.FromPressure(Pressure.FromMegapascals(megapascals));
        foreach (PhaseState phase in new[] { steam.Liquid, steam.Vapour })
        {
            Approx.Relative(megapascals, phase.Pressure.Megapascals, 1e-12);
            Approx.Relative(steam.Temperature.Kelvins, phase.Temperature.Kelvins, 1e-12);
            double energy = phase.SpecificEnthalpy.JoulesPerKilogram - (phase.Pressure.Pascals * phase.SpecificVolume.CubicMetersPerKilogram);
            Approx.Relative(energy, phase.SpecificInternalEnergy.JoulesPerKilogram, 1e-12);
        }

        double change = steam.Vapour.SpecificEntropy.JoulesPerKilogramKelvin - steam.Liquid.SpecificEntropy.JoulesPerKilogramKelvin;
        Approx.Relative(steam.LatentHeat.JoulesPerKilogram, steam.Temperature.Kelvins * change, 2e-4);
    }

    // IAPWS R15-11 gives the conductivity of saturated water near 0.68 W/(m K) at 400 K; of its steam near 0.027 (from memory).
    [Fact]
    public void Phases_At400Kelvin_ConductAsKnown()
    {
        Saturation steam = Saturation.FromTemperature(Temperature.FromKelvins(400));
        Approx.Absolute(0.683, steam.Liquid.ThermalConductivity.WattsPerMeterKelvin, 0.004);
        Approx.Absolute(0.0272, steam.Vapour.ThermalConductivity.WattsPerMeterKelvin, 0.0012);
    }

    [Fact]
    public void State_FromTemperatureAndQuality_IsThatFromPressureAndQuality()
    {
        SteamState one = SteamState.FromTemperatureQuality(Temperature.FromDegreesCelsius(300), MassFraction.FromPercent(40));
        SteamState other = SteamState.FromPressureQuality(one.Pressure, MassFraction.FromPercent(40));
        Approx.Relative(other.SpecificEnthalpy.JoulesPerKilogram, one.SpecificEnthalpy.JoulesPerKilogram, 1e-10);
        Approx.Absolute(573.15, other.Temperature.Kelvins, 1e-8);
    }
}
