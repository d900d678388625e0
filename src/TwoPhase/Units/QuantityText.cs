using System.Globalization;

namespace TwoPhase.Units;

/// <summary>A quantity as text, "77.9 mm": number in invariant culture, then its unit.</summary>
internal static class QuantityText
{
    /// <summary>The SI value.</summary>
    /// <exception cref="FormatException">No number, no unit, or a unit of another kind.</exception>
    public static double Parse(string text, UnitKind kind, UnitBasis basis)
    {
        (double number, string unit) = SplitNumber(text);
        return UnitText.Map(unit, kind, basis).Map(number);
    }

    /// <summary>The quantity in a unit, with the fewest digits that read back as the same double; in the plain SI unit where none do.</summary>
    public static string Write(double si, string unit, UnitKind kind, string siUnit)
    {
        LinearMap map = UnitText.Map(unit, kind, UnitBasis.None);
        double raw = map.Inverse.Map(si);
        foreach (string format in new[] { "G6", "G10", "G15", "G16", "G17" })
        {
            string number = raw.ToString(format, CultureInfo.InvariantCulture);
            if (map.Map(double.Parse(number, CultureInfo.InvariantCulture)) == si) return $"{number} {unit}";
        }

        return $"{si.ToString("R", CultureInfo.InvariantCulture)} {siUnit}";
    }

    /// <summary>A length in mm.</summary>
    public static string Millimetres(double si) => Write(si, "mm", UnitKind.Length, "m");

    /// <summary>A length in m.</summary>
    public static string Metres(double si) => Write(si, "m", UnitKind.Length, "m");

    /// <summary>The number at the start of a text, and what stands behind it.</summary>
    public static (double Number, string Tail) SplitNumber(string text)
    {
        string trimmed = text.Trim();
        int end = 0;
        while (end < trimmed.Length && IsPartOfNumber(trimmed, end)) end++;
        string digits = trimmed[..end];
        if (end < trimmed.Length && trimmed[end] == ',') throw new FormatException($"'{text}' has a comma in its number: write a decimal point and no thousands separator");
        bool read = double.TryParse(digits, NumberStyles.Float, CultureInfo.InvariantCulture, out double number);
        return read && Numerics.Fast.IsFinite(number)
            ? (number, trimmed[end..].TrimStart())
            : throw new FormatException($"'{text}' does not start with a number; a quantity is written like '77.9 mm'");
    }

    private static bool IsPartOfNumber(string text, int at)
    {
        char c = text[at];
        if (c is >= '0' and <= '9') return true;
        if (c == '.') return !(at + 1 < text.Length && text[at + 1] == '.') && !(at > 0 && text[at - 1] == '.');
        if (c is '+' or '-') return at == 0 || text[at - 1] is 'e' or 'E';
        return c is 'e' or 'E' && at > 0 && at + 1 < text.Length && (char.IsDigit(text[at + 1]) || (text[at + 1] is '+' or '-' && at + 2 < text.Length && char.IsDigit(text[at + 2])));
    }
}
