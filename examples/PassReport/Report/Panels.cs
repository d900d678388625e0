using ScottPlot;
using SkiaSharp;

namespace PassReport.Report;

/// <summary>Plots of one style side by side in one picture, as SVG and PNG.</summary>
internal static class Panels
{
    public static readonly Color Ink = Color.FromHex("#222222"), Main = Color.FromHex("#0072B2"), Accent = Color.FromHex("#D55E00"), Third = Color.FromHex("#009E73"), Fourth = Color.FromHex("#CC79A7"), Shade = Color.FromHex("#E69F00").WithAlpha(0.30);

    public static Plot New(string label)
    {
        var plot = new Plot();
        plot.Font.Set(Fonts.Sans);
        plot.Axes.Color(Ink);
        plot.Grid.MajorLineColor = Ink.WithAlpha(0.12);
        plot.YLabel(label);
        plot.Axes.Left.Label.FontSize = plot.Axes.Bottom.Label.FontSize = 14;
        plot.Axes.Left.MinimumSize = 80;
        plot.Legend.FontSize = 12;
        return plot;
    }

    public static void Draw(Plot plot, double[] x, double[] y, Color color, LinePattern pattern, string? legend = null, float width = 2)
    {
        ScottPlot.Plottables.Scatter line = plot.Add.ScatterLine(x, y, color);
        line.LineWidth = width;
        line.LinePattern = pattern;
        if (legend is not null) line.LegendText = legend;
    }

    public static void Save(string folder, string name, IReadOnlyList<Plot> plots, int columns, int width, int height)
    {
        var picture = new Multiplot { Layout = new ScottPlot.MultiplotLayouts.Grid(plots.Count / columns, columns) };
        picture.RemovePlot(picture.GetPlot(0));
        foreach (Plot plot in plots) picture.AddPlot(plot);
        picture.SavePng(Path.Combine(folder, name + ".png"), width, height);
        using FileStream file = File.Create(Path.Combine(folder, name + ".svg"));
        using SKCanvas svg = SKSvgCanvas.Create(new SKRect(0, 0, width, height), file);
        picture.Render(svg, new PixelRect(0, width, height, 0));
    }
}
