using System.Globalization;

namespace TwoPhase.Tests.Steam;

/// <summary>A value as a release prints it, with the unit it prints: agreement means that every printed digit is met.</summary>
internal static class Printed
{
    /// <summary>Slightly more than half a unit of the last digit, for values printed from a computation that rounded on its way.</summary>
    private const double UnitsOfTheLastDigit = 0.55;

    public static void Matches(ReferenceTable.Row row, double si)
    {
        string text = row.Text("printed");
        double factor = FactorToSi(row.Text("unit")), lastDigit = LastDigit(text);
        double expected = double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);
        Approx.Absolute(expected, si / factor, UnitsOfTheLastDigit * lastDigit, row.ToString());
    }

    public static double FactorToSi(string unit) => unit switch
    {
        "MPa" => 1e6,
        "kJ/kg" or "kJ/(kg K)" => 1e3,
        "uPa s" => 1e-6,
        "mW/(m K)" or "mN/m" => 1e-3,
        "K" or "m3/kg" or "kg/m3" or "m/s" => 1,
        _ => throw new ArgumentException($"No factor for '{unit}'.", nameof(unit)),
    };

    private static double LastDigit(string text)
    {
        string[] parts = text.ToUpperInvariant().Split('E');
        int point = parts[0].IndexOf('.', StringComparison.Ordinal);
        int decimals = point < 0 ? 0 : parts[0].Length - point - 1;
        int exponent = parts.Length > 1 ? int.Parse(parts[1], CultureInfo.InvariantCulture) : 0;
        return Math.Pow(10, exponent - decimals);
    }
}
