using ScottPlot;
using ScottPlot.MultiplotLayouts;
using TwoPhase.Dynamics;
using UnitsNet.Units;

namespace LargeMoves;

/// <summary>Columns of strips over one time axis, one column for each history. Colours of Okabe and Ito (2008); lines differ in weight and pattern too.</summary>
internal sealed class Strips
{
    // Above the first row, for the names of what is pointed out; of its height.
    private const double HeadRoom = 0.22;

    private static readonly Color Ink = Color.FromHex("#222222"), Indicated = Color.FromHex("#0072B2"), True = Color.FromHex("#D55E00"), Mark = Color.FromHex("#009E73");

    private readonly IReadOnlyList<Column> _columns;
    private readonly List<Plot> _plots = [];

    public Strips(IReadOnlyList<Column> columns) => _columns = columns;

    public Strips Quality(double? low = null, double? high = null) => Row("Quality [kg/kg]", low, high, (plot, history) =>
    {
        Line(plot, history, history.Values(nameof(PassInstant.IndicatedQuality), MassFractionUnit.DecimalFraction), Indicated, 1.5f, LinePattern.Solid, "indicated");
        Line(plot, history, history.Values(nameof(PassInstant.TrueQuality), MassFractionUnit.DecimalFraction), True, 3, LinePattern.Solid, "true");
    });

    public Strips Flow() => Row("Flow [kg/s]", null, null, (plot, history) =>
    {
        Line(plot, history, history.Values(nameof(PassInstant.OutletFlow), MassFlowUnit.KilogramPerSecond), Indicated, 2.5f, LinePattern.Solid, "outlet");
        Line(plot, history, history.Values(nameof(PassInstant.FeedFlow), MassFlowUnit.KilogramPerSecond), Ink, 1.5f, LinePattern.Dashed, "feed");
    });

    public Strips Heat() => Row("Heat [MW]", 0, null, (plot, history) => Line(plot, history, history.Values(nameof(PassInstant.AbsorbedHeat), PowerUnit.Megawatt), Ink, 2, LinePattern.Solid, null));

    public Strips Holdup() => Row("Water held [kg]", null, null, (plot, history) => Line(plot, history, history.Values(nameof(PassInstant.Holdup), MassUnit.Kilogram), Ink, 2, LinePattern.Solid, null));

    public Strips Onset() => Row("Boiling from [m]", null, null, (plot, history) => Line(plot, history, history.Values(nameof(PassInstant.BoilingOnset), LengthUnit.Meter), Ink, 2, LinePattern.Solid, null));

    public Strips Temperatures() => Row("Temperature [°C]", null, null, (plot, history) =>
    {
        Line(plot, history, history.Values(nameof(PassInstant.HottestMetal), TemperatureUnit.DegreeCelsius), True, 1.5f, LinePattern.Dashed, "hottest metal");
        Line(plot, history, history.Values(nameof(PassInstant.OutletTemperature), TemperatureUnit.DegreeCelsius), Ink, 2, LinePattern.Solid, "outlet");
    });

    /// <summary>Draws it: titles above, time below, legends where two lines are.</summary>
    public string Write(string folder, string file, int rowHeight = 190)
    {
        for (int i = 0; i < _columns.Count; i++)
        {
            _plots[i].Title(_columns[i].Title, 15);
            _plots[_plots.Count - _columns.Count + i].XLabel("Time [min], invented pass");
        }

        int rows = _plots.Count / _columns.Count;
        var picture = new Multiplot { Layout = new Grid(rows, _columns.Count) };
        picture.RemovePlot(picture.GetPlot(0));
        foreach (Plot plot in _plots) picture.AddPlot(plot);
        string path = Path.Combine(folder, file + ".png");
        picture.SavePng(path, 620 * _columns.Count, (rowHeight * rows) + 70);
        return path;
    }

    // One scale for all columns of a row, so that they may be compared.
    private Strips Row(string label, double? low, double? high, Action<Plot, PassHistory> draw)
    {
        Plot[] row = [.. _columns.Select(column => New(column, label, draw))];
        AxisLimits[] limits = [.. row.Select(plot => plot.Axes.GetLimits())];
        double bottom = low ?? limits.Min(limit => limit.Bottom), top = high ?? limits.Max(limit => limit.Top);
        bool first = _plots.Count == 0;
        double room = first ? (top - bottom) * HeadRoom : 0;
        for (int i = 0; i < row.Length; i++)
        {
            row[i].Axes.SetLimits(0, _columns[i].Minutes, bottom, top + room);
            foreach ((double minute, string text) in _columns[i].Marks) Point(row[i], minute, first ? text : "", top + room);
            PlaceLegend(row[i], (bottom + top) / 2);
        }

        _plots.AddRange(row);
        return this;
    }

    private static Plot New(Column column, string label, Action<Plot, PassHistory> draw)
    {
        var plot = new Plot();
        plot.Font.Set(Fonts.Sans);
        plot.Axes.Color(Ink);
        plot.Grid.MajorLineColor = Ink.WithAlpha(0.12);
        plot.YLabel(label);
        plot.Axes.Left.Label.FontSize = plot.Axes.Bottom.Label.FontSize = 14;
        plot.Axes.Left.MinimumSize = 80;
        draw(plot, column.History);
        plot.Axes.AutoScale();
        return plot;
    }

    // The legend stands where the lines do not end.
    private static void PlaceLegend(Plot plot, double middle)
    {
        ScottPlot.Plottables.Scatter[] lines = [.. plot.GetPlottables().OfType<ScottPlot.Plottables.Scatter>().Where(line => line.LegendText.Length > 0)];
        if (lines.Length > 1) plot.ShowLegend(lines[^1].Data.GetScatterPoints()[^1].Y > middle ? Alignment.LowerRight : Alignment.UpperRight).FontSize = 13;
    }

    private static void Line(Plot plot, PassHistory history, double[] values, Color color, float width, LinePattern pattern, string? text)
    {
        double[] minutes = history.Values(nameof(PassInstant.Time), DurationUnit.Minute);
        ScottPlot.Plottables.Scatter line = plot.Add.ScatterLine(minutes, values, color);
        (line.LineWidth, line.LinePattern, line.LegendText) = (width, pattern, text ?? "");
    }

    private static void Point(Plot plot, double minute, string text, double top)
    {
        plot.Add.VerticalLine(minute, 1.5f, Mark, LinePattern.Dotted);
        if (text.Length == 0) return;
        ScottPlot.Plottables.Text label = plot.Add.Text(text, minute, top);
        (label.LabelFontColor, label.LabelFontSize, label.LabelAlignment, label.OffsetX, label.OffsetY) = (Mark, 13, Alignment.UpperLeft, 4, 3);
    }

    /// <summary>A history and what is written about it.</summary>
    /// <param name="Title">In one line what it shows.</param>
    /// <param name="History">The history.</param>
    /// <param name="Minutes">How much of it is shown.</param>
    /// <param name="Marks">Instants that are pointed out.</param>
    internal sealed record Column(string Title, PassHistory History, double Minutes, params (double Minute, string Text)[] Marks);
}
