using FsCheck;
using FsCheck.Fluent;
using TwoPhase.Steam;

namespace TwoPhase.Tests.Steam;

/// <summary>A point of the p-T plane inside the formulation.</summary>
public readonly record struct PlanePoint(double Pressure, double Temperature)
{
    internal WaterCore State => Water.AtPressureTemperature(Pressure, Temperature);
}

/// <summary>A pressure on the saturation line [Pa] and a quality.</summary>
public readonly record struct WetPoint(double Pressure, double Quality)
{
    internal WaterCore State => Water.AtPressureQuality(Pressure, Quality);
}

/// <summary>Random states for properties: pressures evenly in ln p, temperatures evenly, all regions and both sides of the dome.</summary>
public static class StatePoints
{
    private static readonly Gen<double> Unit = Gen.Choose(0, 1 << 30).Select(n => n / (double)(1 << 30));

    public static Arbitrary<PlanePoint> Anywhere() => Gen.Zip(Unit, Unit).Select(Point).Where(AwayFromSeams).ToArbitrary();

    // Up to 0.5 % below the critical pressure; beyond, round-off of T alone is worth more than 1e-9 of quality.
    public static Arbitrary<WetPoint> Wet() => Gen.Zip(Unit, Unit)
        .Select(u => new WetPoint(LogarithmicBetween(SaturationLine.LowestPressure, 21.95e6, u.Item1), u.Item2))
        .Where(point => Math.Abs(SaturationLine.Temperature(point.Pressure) - Water97.Border13Temperature) > 0.1)
        .ToArbitrary();

    private static PlanePoint Point((double First, double Second) u)
    {
        double pressure = LogarithmicBetween(100, 100e6, u.First);
        double highest = Branch.HighestTemperatureAt(pressure);

        // Half of the points lie within 2 K of saturation, where the phase is easily mistaken.
        bool besideTheDome = u.Second < 0.5 && pressure > SaturationLine.LowestPressure && pressure < Water97.CriticalPressure;
        double temperature = besideTheDome
            ? SaturationLine.Temperature(pressure) + (8 * (u.Second - 0.25))
            : Water97.LowestTemperature + (Math.Abs((2 * u.Second) - 1) * (highest - Water97.LowestTemperature));
        return new(pressure, Math.Max(temperature, Water97.LowestTemperature));
    }

    // Where two regions meet, each yields its own h for one T: a strip of millikelvins has two states by the formulation itself.
    private static bool AwayFromSeams(PlanePoint point)
    {
        const double strip = 0.15;
        return Math.Abs(point.Temperature - Water97.Border13Temperature) > strip
            && Math.Abs(point.Temperature - Water97.Border25Temperature) > strip
            && (point.Pressure < Border23.LowestPressure || Math.Abs(point.Temperature - Border23.Temperature(point.Pressure)) > strip);
    }

    private static double LogarithmicBetween(double low, double high, double unit) => low * Math.Pow(high / low, unit);
}
