using System.Globalization;
using TwoPhase.Units;

namespace TwoPhase.Dynamics;

public sealed partial class PassHistory
{
    /// <summary>Names of the columns: those of the properties of <see cref="PassInstant"/>, such as <c>nameof(PassInstant.OutletFlow)</c>.</summary>
    public static IReadOnlyList<string> ColumnNames { get; } = [.. HistoryColumn.All.Select(column => column.Name)];

    /// <summary>One column as numbers in a unit; NaN where the row has no value.</summary>
    /// <typeparam name="TUnit">A unit enumeration of UnitsNet, such as <c>MassFlowUnit</c>.</typeparam>
    /// <param name="column">One of <see cref="ColumnNames"/>.</param>
    /// <param name="unit">The unit wanted; it must be one of the quantity of the column.</param>
    /// <exception cref="ArgumentException">There is no such column, or its quantity has other units.</exception>
    public double[] Values<TUnit>(string column, TUnit unit)
        where TUnit : struct, Enum
    {
        HistoryColumn found = Array.Find(HistoryColumn.All, candidate => candidate.Name == column)
            ?? throw new ArgumentException($"No column '{column}'; there are {string.Join(", ", ColumnNames)}.", nameof(column));
        LinearMap map = found.To(unit);
        var values = new double[_rows.Length];
        for (int i = 0; i < values.Length; i++) values[i] = map.Map(found.Raw(_rows[i]));
        return values;
    }

    /// <summary>Writes every column as comma-separated values, SI units in the headings, invariant culture; an empty cell where there is no value.</summary>
    /// <param name="writer">Where to.</param>
    public void WriteCsv(TextWriter writer)
    {
        Require.NotNull(writer, nameof(writer)).WriteLine(string.Join(",", HistoryColumn.All.Select(column => column.Heading)));
        foreach (PassInstant row in _rows) writer.WriteLine(string.Join(",", HistoryColumn.All.Select(column => Cell(column.Raw(row)))));
    }

    internal static string Cell(double value) => double.IsNaN(value) ? "" : value.ToString("G9", CultureInfo.InvariantCulture);
}
