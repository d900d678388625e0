using TwoPhase.Benchmarks.Ratios;
using TwoPhase.Steam;

namespace TwoPhase.Benchmarks.Steam;

/// <summary>Random states of each region, the same in every run; raw SI.</summary>
internal static class States
{
    public const int Count = 4096;

    public static readonly double[] Pressure1 = Yardsticks.Fill(Count, 0.5e6, 22e6, 1);
    public static readonly double[] Temperature1 = Yardsticks.Fill(Count, 280, 620, 2);
    public static readonly double[] Enthalpy1 = Yardsticks.Fill(Count, 100e3, 1500e3, 3);
    public static readonly double[] Pressure2 = Yardsticks.Fill(Count, 0.1e6, 22e6, 4);
    public static readonly double[] Temperature2 = Yardsticks.Fill(Count, 373, 1000, 5);
    public static readonly double[] Pressure3 = Yardsticks.Fill(Count, 23e6, 60e6, 6);
    public static readonly double[] Enthalpy3 = Yardsticks.Fill(Count, 1700e3, 2500e3, 7);
    public static readonly double[] SaturationPressure = Yardsticks.Fill(Count, 0.5e6, 16e6, 8);

    // Thirds of liquid, wet steam and vapour.
    public static readonly double[] RandomPressure = Yardsticks.Fill(Count, 0.5e6, 16e6, 9);
    public static readonly double[] RandomEnthalpy = [.. RandomPressure.Select(Enthalpy)];

    // Feed to superheat along a pass, the pressure falling from 12 to 10 MPa.
    public static readonly double[] OrderedPressure = [.. Enumerable.Range(0, Count).Select(i => 12e6 - (2e6 * i / Count))];
    public static readonly double[] OrderedEnthalpy = [.. Enumerable.Range(0, Count).Select(i => 400e3 + (2800e3 * i / Count))];

    private static double Enthalpy(double pressure, int index)
    {
        SaturationCore both = SaturationLine.AtPressure(pressure);
        double part = (index * 0.6180339887498949) % 1;
        return (index % 3) switch
        {
            0 => 100e3 + (part * (both.Liquid.Enthalpy - 100e3)),
            1 => both.Liquid.Enthalpy + (part * both.LatentHeat),
            _ => both.Vapour.Enthalpy + (part * (3600e3 - both.Vapour.Enthalpy)),
        };
    }
}
