using TwoPhase.Numerics;
using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.Tests.Steam;

public class SteamSurfaceTests
{
    private const int RandomStates = 1_000_000;

    private static readonly SteamSurface Surface = SteamSurface.Default;

    // The bounds that the surface states. Half of the states lie anywhere, a quarter even in the logarithm of p, and a quarter at
    // either edge of the dome, down to 0.3 J/kg from it.
    [Fact]
    public void Evaluate_MillionRandomStates_HoldsTheStatedBounds()
    {
        var random = new Random(4711);
        double temperature = 0, volume = 0, quality = 0, byEnthalpy = 0, byPressure = 0;
        for (int i = 0; i < RandomStates; i++)
        {
            double p = i % 4 == 0 ? 0.5e6 * Math.Pow(33, random.NextDouble()) : 0.5e6 + (16e6 * random.NextDouble());
            double h = i % 4 == 1 ? BesideTheDome(p, random) : 100e3 + (3500e3 * random.NextDouble());
            WaterCore exact = Water.AtPressureEnthalpy(p, h);

            SurfacePoint point = Surface.Evaluate(p, h);

            double byVolume = -exact.Density * exact.Density;
            Widen(ref temperature, (point.Temperature / exact.Temperature) - 1);
            Widen(ref volume, (point.SpecificVolume / exact.SpecificVolume) - 1);
            Widen(ref byEnthalpy, (point.DensityByEnthalpy / (byVolume * exact.VolumeByEnthalpy)) - 1);
            Widen(ref byPressure, (point.DensityByPressure / (byVolume * exact.VolumeByPressure)) - 1);
            if (exact.IsWet) Widen(ref quality, point.Quality - exact.Quality);
        }

        Approx.Absolute(0, temperature, 1e-7, "T, relative");
        Approx.Absolute(0, volume, 1e-7, "v, relative");
        Approx.Absolute(0, quality, 1e-7, "x, absolute");
        Approx.Absolute(0, byEnthalpy, 1e-5, "(∂ρ/∂h)p, relative");
        Approx.Absolute(0, byPressure, 1e-5, "(∂ρ/∂p)h, relative");
    }

    [Fact]
    public void Evaluate_EdgesOfTheDome_AgreeWithSaturationFromBothSides()
    {
        for (int i = 0; i <= 4000; i++)
        {
            double p = 0.5e6 + (4000 * i);
            SaturationCore exact = SaturationLine.AtPressure(p);
            foreach (double beyond in new[] { -1e-12, 0, 1e-12 })
            {
                SurfacePoint liquid = Surface.Evaluate(p, exact.Liquid.Enthalpy * (1 + beyond));
                Approx.Relative(exact.Temperature, liquid.Temperature, 1e-9);
                Approx.Relative(exact.Liquid.SpecificVolume, liquid.SpecificVolume, 1e-9);
                Approx.Absolute(0, liquid.Quality, 1e-9);

                SurfacePoint vapour = Surface.Evaluate(p, exact.Vapour.Enthalpy * (1 + beyond));
                Approx.Relative(exact.Temperature, vapour.Temperature, 1e-9);
                Approx.Relative(exact.Vapour.SpecificVolume, vapour.SpecificVolume, 1e-9);
                Approx.Absolute(1, vapour.Quality, 1e-9);
            }
        }
    }

    // At the edge of a row of patches, and anywhere else, a step of one bit may change nothing but round-off.
    [Fact]
    public void Evaluate_OneBitOfPressureFurther_IsContinuous()
    {
        int first = OctaveGrid.Locate(0.5e6, 4, out _) + 1, last = OctaveGrid.Locate(16.5e6, 4, out _);
        for (int row = first; row <= last; row++)
        {
            double p = OctaveGrid.Start(row, 4);
            for (double h = 100e3; h <= 3600e3; h += 12.34e3)
            {
                SurfacePoint below = Surface.Evaluate(Math.BitDecrement(p), h), at = Surface.Evaluate(p, h);
                Approx.Relative(at.Temperature, below.Temperature, 1e-11);
                Approx.Relative(at.SpecificVolume, below.SpecificVolume, 1e-11);
                Approx.Relative(at.DensityByEnthalpy, below.DensityByEnthalpy, 1e-9);
                Approx.Relative(at.DensityByPressure, below.DensityByPressure, 1e-9);
            }
        }
    }

    [Fact]
    public void Evaluate_AlongAnIsobar_HasNoJumpsBeyondItsSlope()
    {
        foreach (double p in new[] { 0.51e6, 3.3e6, 9.87e6, 16.4e6 })
        {
            SurfacePoint previous = Surface.Evaluate(p, 100e3);
            for (double h = 100e3; h <= 3600e3; h += 50)
            {
                SurfacePoint point = Surface.Evaluate(p, h);
                Assert.True(point.Temperature >= previous.Temperature * (1 - 1e-9), $"T falls at p = {p}, h = {h}");
                Assert.True(point.SpecificVolume >= previous.SpecificVolume * (1 - 1e-9), $"v falls at p = {p}, h = {h}");

                // At 0.51 MPa the first 50 J/kg inside the dome add 0.8 % to v.
                Assert.True(point.SpecificVolume <= previous.SpecificVolume * 1.01, $"v jumps at p = {p}, h = {h}");
                previous = point;
            }
        }
    }

    [Theory]
    [InlineData(0.4999e6, 1e6)]
    [InlineData(16.51e6, 1e6)]
    [InlineData(1e6, 99e3)]
    [InlineData(1e6, 3601e3)]
    [InlineData(double.NaN, 1e6)]
    [InlineData(1e6, double.NaN)]
    [InlineData(double.PositiveInfinity, 1e6)]
    public void Evaluate_OutsideTheRange_IsNaN(double pressure, double enthalpy) =>
        Assert.Equal(SurfacePoint.NaN, Surface.Evaluate(pressure, enthalpy));

    [Fact]
    public void At_InsideTheRange_GivesQuantities()
    {
        SurfaceState state = Surface.At(Pressure.FromMegapascals(10), SpecificEnergy.FromKilojoulesPerKilogram(2400));
        SteamState exact = SteamState.FromPressureEnthalpy(Pressure.FromMegapascals(10), SpecificEnergy.FromKilojoulesPerKilogram(2400));

        Approx.Relative(exact.Temperature.Kelvins, state.Temperature.Kelvins, 1e-9);
        Approx.Relative(exact.Density.KilogramsPerCubicMeter, state.Density.KilogramsPerCubicMeter, 1e-9);
        Approx.Relative(exact.Quality!.Value.DecimalFractions, state.EquilibriumQuality.DecimalFractions, 1e-9);

        // Ts(10 MPa) = 584.149488 K: R7-97(2012), Table 36.
        Assert.StartsWith("310.9995 °C, ", state.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void At_OutsideTheRange_ThrowsNamingValueAndLimits()
    {
        ArgumentOutOfRangeException error = Assert.Throws<ArgumentOutOfRangeException>(
            () => Surface.At(Pressure.FromMegapascals(17), SpecificEnergy.FromKilojoulesPerKilogram(1000)));

        Assert.Equal("pressure", error.ParamName);
        Assert.Contains("17 MPa", error.Message, StringComparison.Ordinal);
        Assert.Contains("16.5 MPa", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Constructor_RangeOfOnesOwn_HoldsTheBoundsThere()
    {
        var surface = new SteamSurface(
            Pressure.FromBars(1), Pressure.FromBars(20), SpecificEnergy.FromKilojoulesPerKilogram(300), SpecificEnergy.FromKilojoulesPerKilogram(2900));
        var random = new Random(1);
        for (int i = 0; i < 20000; i++)
        {
            double p = 1e5 * Math.Pow(20, random.NextDouble()), h = 300e3 + (2600e3 * random.NextDouble());
            WaterCore exact = Water.AtPressureEnthalpy(p, h);
            SurfacePoint point = surface.Evaluate(p, h);
            Approx.Relative(exact.Temperature, point.Temperature, 1e-7);
            Approx.Relative(exact.SpecificVolume, point.SpecificVolume, 1e-7);
        }
    }

    [Theory]
    [InlineData(0.01, 10, 200, 3000, "lowestPressure")]
    [InlineData(1, 17, 200, 3000, "highestPressure")]
    [InlineData(2, 1, 200, 3000, "highestPressure")]
    [InlineData(1, 10, 5, 3000, "lowestEnthalpy")]
    [InlineData(1, 10, 200, 4500, "highestEnthalpy")]
    [InlineData(1, 10, 3000, 200, "highestEnthalpy")]
    public void Constructor_RangeThatCannotBe_ThrowsNamingTheLimit(double lowMegapascals, double highMegapascals, double low, double high, string parameter)
    {
        ArgumentOutOfRangeException error = Assert.Throws<ArgumentOutOfRangeException>(() => new SteamSurface(
            Pressure.FromMegapascals(lowMegapascals),
            Pressure.FromMegapascals(highMegapascals),
            SpecificEnergy.FromKilojoulesPerKilogram(low),
            SpecificEnergy.FromKilojoulesPerKilogram(high)));

        Assert.Equal(parameter, error.ParamName);
    }

    [Fact]
    public void Default_IsSharedAndSmall()
    {
        Assert.Same(SteamSurface.Default, SteamSurface.Default);
        Assert.InRange(Surface.Bytes, 1, 8 * 1024 * 1024);
    }

    [Fact]
    public void Evaluate_AllocatesNothing()
    {
        Assert.Equal(0, AllocationProbe.Bytes(() => Surface.Evaluate(9e6, 900e3)));
        Assert.Equal(0, AllocationProbe.Bytes(() => Surface.At(Pressure.FromMegapascals(9), SpecificEnergy.FromKilojoulesPerKilogram(2000))));
    }

    private static double BesideTheDome(double pressure, Random random)
    {
        SaturatedPhases phases = SaturationTable.Phases(pressure);
        double distance = 50e3 * Math.Exp(-12 * random.NextDouble());
        return random.Next(4) switch
        {
            0 => phases.LiquidEnthalpy - distance,
            1 => phases.LiquidEnthalpy + distance,
            2 => phases.VapourEnthalpy - distance,
            _ => phases.VapourEnthalpy + distance,
        };
    }

    // NaN has to count as the worst.
    private static void Widen(ref double worst, double error)
    {
        if (!(Math.Abs(error) <= worst)) worst = Math.Abs(error);
    }
}
