using ScottPlot;
using TwoPhase.Advisory;

namespace TrueQuality;

/// <summary>Reading, estimate and truth of one trial. Colours of Okabe and Ito (2008); lines differ in weight and pattern too.</summary>
internal static class Picture
{
    private static readonly Color Reading = Color.FromHex("#56B4E9"), Estimate = Color.FromHex("#D55E00"), Truth = Color.FromHex("#000000"), Ends = Color.FromHex("#009E73"), False = Color.FromHex("#E69F00").WithAlpha(0.25);

    public static string Write(Outcome outcome, string folder)
    {
        using var plot = new Plot();
        plot.Title($"Invented pass: {outcome.Trial.Name}");
        plot.XLabel("Time [s]");
        plot.YLabel("Quality [kg/kg]");
        Shade(plot, outcome);
        int[] times = [.. Enumerable.Range(Outcome.From, outcome.Truth.Length - Outcome.From)];
        double[] xs = [.. times.Select(static t => (double)t)];
        Line(plot, xs, [.. times.Select(outcome.Indicated)], Reading, 1, LinePattern.Solid, "as the meter reads it");
        Line(plot, xs, [.. times.Select(t => outcome.Truth[t])], Truth, 2.5f, LinePattern.Dashed, "true");
        Line(plot, xs, [.. times.Select(outcome.Estimated)], Estimate, 2, LinePattern.Solid, "estimated");
        if (outcome.DisagreesFrom is not null)
        {
            Line(plot, xs, [.. times.Select(t => outcome.End(t, meterIsRight: true))], Ends, 1.5f, LinePattern.Dotted, "if the meter is right");
            Line(plot, xs, [.. times.Select(t => outcome.End(t, meterIsRight: false))], Ends, 1.5f, LinePattern.DenselyDashed, "if the heat is right");
        }

        plot.Legend.ManualItems.Add(new LegendItem { LabelText = "called false or apart", FillColor = False, LineWidth = 0 });
        plot.Axes.AutoScale();
        plot.ShowLegend(Edge.Bottom).Legend.Orientation = Orientation.Horizontal;
        string path = Path.Combine(folder, $"{outcome.Trial.File}.png");
        plot.SavePng(path, 1100, 520);
        return path;
    }

    private static void Line(Plot plot, double[] xs, double[] ys, Color color, float width, LinePattern pattern, string text)
    {
        ScottPlot.Plottables.Scatter line = plot.Add.ScatterLine(xs, ys, color);
        (line.LineWidth, line.LinePattern, line.LegendText) = (width, pattern, text);
    }

    private static void Shade(Plot plot, Outcome outcome)
    {
        int start = -1;
        for (int t = Outcome.From; t <= outcome.Truth.Length; t++)
        {
            bool off = t < outcome.Truth.Length && outcome.Estimates[t].Trust is Trust.ReadsHigh or Trust.ReadsLow or Trust.Disagreement;
            off &= t < outcome.Truth.Length;
            if (off && start < 0) start = t;
            if (off || start < 0) continue;
            ScottPlot.Plottables.HorizontalSpan span = plot.Add.HorizontalSpan(start, t, False);
            span.LineStyle.Width = 0;
            start = -1;
        }
    }
}
