using System.Globalization;

namespace TwoPhase.Units;

/// <summary>How a raw SI double is shown to a person: engineering unit, factor and offset.</summary>
internal readonly struct Scale
{
    public static readonly Scale None = new("", 1);
    public static readonly Scale Megapascals = new("MPa", 1e-6);
    public static readonly Scale Kilopascals = new("kPa", 1e-3);
    public static readonly Scale Kelvins = new("K", 1);
    public static readonly Scale Celsius = new("°C", 1, -273.15);
    public static readonly Scale KilojoulesPerKilogram = new("kJ/kg", 1e-3);
    public static readonly Scale KilojoulesPerKilogramKelvin = new("kJ/(kg·K)", 1e-3);
    public static readonly Scale KilogramsPerSecond = new("kg/s", 1);
    public static readonly Scale KilogramsPerCubicMetre = new("kg/m³", 1);
    public static readonly Scale KilogramsPerSquareMetreSecond = new("kg/(m²·s)", 1);
    public static readonly Scale MegajoulesPerCubicMetre = new("MJ/m³", 1e-6);
    public static readonly Scale CubicMetresPerSecond = new("m³/s", 1);
    public static readonly Scale CubicMetres = new("m³", 1);
    public static readonly Scale Metres = new("m", 1);
    public static readonly Scale Millimetres = new("mm", 1e3);
    public static readonly Scale SquareMillimetres = new("mm²", 1e6);
    public static readonly Scale Megawatts = new("MW", 1e-6);
    public static readonly Scale KilowattsPerSquareMetre = new("kW/m²", 1e-3);
    public static readonly Scale WattsPerSquareMetreKelvin = new("W/(m²·K)", 1);
    public static readonly Scale WattsPerMetreKelvin = new("W/(m·K)", 1);
    public static readonly Scale PascalSeconds = new("Pa·s", 1);
    public static readonly Scale Seconds = new("s", 1);
    public static readonly Scale Degrees = new("°", 180 / Math.PI);

    private readonly double _factor;
    private readonly double _offset;

    public Scale(string symbol, double factor, double offset = 0)
    {
        Symbol = symbol;
        _factor = factor;
        _offset = offset;
    }

    public string Symbol { get; }

    /// <summary>The value with its unit, invariant culture, seven significant digits at the most.</summary>
    public string Text(double si) => Text(si, "G7");

    public string Text(double si, string format)
    {
        string number = ((si * _factor) + _offset).ToString(format, CultureInfo.InvariantCulture);
        return Symbol.Length == 0 ? number : number + " " + Symbol;
    }
}
