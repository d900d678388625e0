using System.Globalization;
using Spectre.Console;
using UnitsNet;

namespace LargeMoves;

/// <summary>How tables and times look.</summary>
internal static class Figures
{
    public static Table New(params string[] columns)
    {
        Table table = new Table().MinimalBorder();
        foreach (string column in columns) table.AddColumn(column);
        return table;
    }

    public static string Minutes(Duration? time) => time is not { } at ? "never" : at.Seconds < 120 ? Number(at.Seconds, "F0") + " s" : Number(at.Minutes, "F1") + " min";

    /// <summary>With its sign; what rounds to nothing has none.</summary>
    public static string Signed(double value, int digits)
    {
        double rounded = Math.Round(value, digits);
        return (rounded > 0 ? "+" : "") + Number(rounded == 0 ? 0 : rounded, "F" + digits.ToString(CultureInfo.InvariantCulture));
    }

    public static string Number(double value, string format) => value.ToString(format, CultureInfo.InvariantCulture);
}
