using System.Globalization;
using TwoPhase.Steam;

namespace TwoPhase.Tests.Steam;

/// <summary>
/// Random raw numbers at every door: each answer is a state of the formulation that has the properties asked for, or none.
/// TWOPHASE_FUZZ sets another number of inputs than the 100 000 of a usual run.
/// </summary>
public class FuzzTests
{
    private static readonly double[] Awkward =
    [
        double.NaN, double.PositiveInfinity, double.NegativeInfinity, 0, -0.0, -1, double.Epsilon, double.MaxValue, -double.MaxValue,
        273.15, 623.15, 647.096, 863.15, 1073.15, 2273.15, 22.064e6, 16.5291643e6, 50e6, 100e6, 611.213, 611.212677, 322, 1, 1e-300, 1e300,
    ];

    private static int Inputs => int.Parse(Environment.GetEnvironmentVariable("TWOPHASE_FUZZ") ?? "100000", CultureInfo.InvariantCulture);

    [Fact]
    public void EveryDoor_RandomNumbers_GivesTheStateAskedForOrNone()
    {
        var random = new Random(19970901);
        for (int i = 0; i < Inputs; i++)
        {
            double p = Number(random, 100e6, logarithmic: true), t = Number(random, 2300), h = Number(random, 7.5e6), s = Number(random, 12e3);
            double rho = Number(random, 1100, logarithmic: random.Next(2) == 0), x = Number(random, 1.1);
            TryEveryDoor(p, t, h, s, rho, x);
        }
    }

    // At and around the critical point, 22.064 MPa, 647.096 K, 322 kg/m³, down to a last digit away; half of the time beside the dome there.
    [Fact]
    public void EveryDoor_BesideTheCriticalPoint_GivesTheStateAskedForOrNone()
    {
        var random = new Random(322);
        for (int i = 0; i < Inputs / 10; i++)
        {
            double p = 22.064e6 * (1 + (0.05 * Near(random))), t = 647.096 + (5 * Near(random)), h = 2087.5e3 + (400e3 * Near(random)), s = 4412 + (600 * Near(random));
            if (p < 22.064e6 && random.Next(2) == 0)
            {
                SaturationCore saturation = SaturationLine.AtPressure(p);
                PhaseCore phase = random.Next(2) == 0 ? saturation.Liquid : saturation.Vapour;
                (h, s) = (phase.Enthalpy * (1 + (1e-3 * Near(random))), phase.Entropy * (1 + (1e-3 * Near(random))));
            }

            TryEveryDoor(p, t, h, s, 322 * (1 + (0.3 * Near(random))), random.NextDouble());
        }
    }

    private static void TryEveryDoor(double p, double t, double h, double s, double rho, double x)
    {
        WaterCore state = Water.AtPressureTemperature(p, t);
        if (IsState(state)) Has(state, p, state.Pressure, t, state.Temperature);

        state = Water.AtPressureEnthalpy(p, h);
        if (IsState(state)) Has(state, p, state.Pressure, h, state.Enthalpy);

        state = Water.AtPressureEntropy(p, s);
        if (IsState(state)) Has(state, p, state.Pressure, s, state.Entropy);

        state = Water.AtPressureDensity(p, rho);
        if (IsState(state)) Has(state, p, state.Pressure, rho, state.Density);

        state = Water.AtTemperatureDensity(t, rho);
        if (IsState(state)) Has(state, t, state.Temperature, rho, state.Density);

        state = Water.AtPressureQuality(p, x);
        if (IsState(state)) Has(state, p, state.Pressure, x, state.Quality);

        state = Water.AtTemperatureQuality(t, x);
        if (IsState(state)) Has(state, t, state.Temperature, x, state.Quality);

        state = Water.AtEnthalpyEntropy(h, s);
        if (IsState(state)) HasEnthalpyAndEntropy(state, h, s);
    }

    // −1 to 1, each power of ten down to 1e-14 as often as the next, and now and then zero.
    private static double Near(Random random) => random.Next(4) == 0 ? 0 : (random.Next(2) == 0 ? -1 : 1) * Math.Pow(10, -14 * random.NextDouble());

    private static double Number(Random random, double scale, bool logarithmic = false)
    {
        if (random.Next(20) == 0) return Awkward[random.Next(Awkward.Length)];
        double unit = random.NextDouble();
        return logarithmic ? scale * Math.Pow(10, -12 * unit) : scale * ((1.1 * unit) - 0.05);
    }

    private static bool IsState(in WaterCore state)
    {
        if (state.Region == 0)
        {
            Assert.Equal(default, state);
            return false;
        }

        bool isInside = state.Temperature >= 273.15 - 1e-6 && state.Temperature <= 2273.15 + 1e-5 && state.Pressure > 0 && state.Pressure <= 100e6 * (1 + 1e-8)
            && (state.Pressure <= 50e6 * (1 + 1e-8) || state.Temperature <= 1073.4);
        bool isFinite = state.SpecificVolume > 0 && double.IsFinite(state.SpecificVolume) && double.IsFinite(state.Enthalpy) && double.IsFinite(state.Entropy)
            && double.IsFinite(state.VolumeByEnthalpy) && double.IsFinite(state.VolumeByPressure) && double.IsFinite(state.TemperatureByPressure);
        bool isStable = state.IsWet || (state.Phase.IsochoricHeatCapacity > 0 && state.Phase.IsobaricHeatCapacity > 0 && state.Phase.SpeedOfSound > 0);
        if (!(isInside && isFinite && isStable)) Assert.Fail($"inside {isInside}, finite {isFinite}, stable {isStable}: {state}");
        return true;
    }

    // What the state is comes into words only where it is wrong: that takes longer than every door together.
    private static void Has(in WaterCore state, double first, double actualFirst, double second, double actualSecond)
    {
        bool has = Math.Abs(actualFirst - first) <= 1e-8 * Math.Abs(first) && Math.Abs(actualSecond - second) <= (1e-8 * Math.Abs(second)) + 1e-8;
        if (!has) Assert.Fail($"asked for {first:R} and {second:R}, got {actualFirst:R} and {actualSecond:R}: {state}");
    }

    private static void HasEnthalpyAndEntropy(in WaterCore state, double h, double s)
    {
        // On a seam of regions h along the isentrope jumps; the nearer side is the answer.
        double tolerance = IsBesideASeam(state) ? 100 : (1e-8 * Math.Abs(h)) + 1e-6;
        bool has = Math.Abs(state.Enthalpy - h) <= tolerance && Math.Abs(state.Entropy - s) <= (1e-8 * Math.Abs(s)) + 1e-8;
        if (!has) Assert.Fail($"asked for h = {h:R} and s = {s:R}: {state}");
    }

    private static bool IsBesideASeam(in WaterCore state)
    {
        const double strip = 0.3;
        double t = state.Temperature;
        return Math.Abs(t - 623.15) < strip || Math.Abs(t - 1073.15) < strip || (state.Pressure > 16.5e6 && Math.Abs(t - Border23.Temperature(state.Pressure)) < strip);
    }
}
