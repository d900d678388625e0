using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>Checks that the doors of meters share.</summary>
internal static class MeterArguments
{
    public static readonly Scale PascalSeconds = new("Pa·s", 1);

    /// <summary>Both pressures in Pa, the differential below the static pressure.</summary>
    public static (double Pressure, double Differential) Pressures(Pressure pressure, Pressure differential)
    {
        double p = Require.Positive(pressure.Si(), "Absolute pressure", Scale.Megapascals, nameof(pressure));
        double dp = Require.Positive(differential.Si(), "Differential pressure", Scale.Kilopascals, nameof(differential));
        return dp < p ? (p, dp) : throw Swapped(p, dp);
    }

    public static ArgumentOutOfRangeException Swapped(double pressure, double differential) =>
        Require.OutOfRange(differential, "Differential pressure", Scale.Kilopascals, nameof(differential), $"is not below the static pressure {Scale.Kilopascals.Text(pressure)}: were the two swapped?");

    public static double IsentropicExponent(double value, string parameter) =>
        value > 1 && value < 10 ? value : throw Require.OutOfRange(value, "Isentropic exponent", Scale.None, parameter, "must be above 1 and below 10");

    public static double Reynolds(double value, string parameter) =>
        value > 0 ? value : throw Require.OutOfRange(value, "Reynolds number", Scale.None, parameter, "must be greater than zero");
}
