using ScottPlot;

namespace Docs;

/// <summary>A picture of what every member of a family gives over one variable.</summary>
/// <param name="Caption">What is shown, and where.</param>
/// <param name="XAxis">Variable with unit.</param>
/// <param name="YAxis">Result with unit.</param>
/// <param name="Xs">Values of the variable.</param>
/// <param name="Lines">The members by name: result at a value; NaN for none.</param>
internal sealed record Spread(string Caption, string XAxis, string YAxis, double[] Xs, IReadOnlyList<(string Name, Func<double, double> Value)> Lines)
{
    // Okabe and Ito (2008), each with three patterns: no two lines look alike, and colour is never the only difference.
    private static readonly string[] Colours = ["#000000", "#0072B2", "#D55E00", "#009E73", "#CC79A7", "#E69F00", "#56B4E9"];
    private static readonly LinePattern[] Patterns = [LinePattern.Solid, LinePattern.Dashed, LinePattern.Dotted];

    public void Draw(string path)
    {
        using var plot = new Plot();
        plot.XLabel(XAxis);
        plot.YLabel(YAxis);
        for (int i = 0; i < Lines.Count; i++)
        {
            (string name, Func<double, double> value) = Lines[i];
            ScottPlot.Plottables.Scatter line = plot.Add.ScatterLine(Xs, [.. Xs.Select(value)], Color.FromHex(Colours[i % Colours.Length]));
            (line.LineWidth, line.LinePattern, line.LegendText) = (2, Patterns[i / Colours.Length % Patterns.Length], name);
        }

        plot.Axes.AutoScale();
        plot.ShowLegend(Edge.Right);
        plot.SaveSvg(path, 1000, 520);
    }
}
