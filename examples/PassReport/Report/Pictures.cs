using ScottPlot;
using ScottPlot.TickGenerators;

namespace PassReport.Report;

/// <summary>The pictures, each as SVG and PNG. Colours are those of Okabe and Ito (2008), safe for colour-blind eyes; no meaning hangs on colour alone.</summary>
internal sealed class Pictures
{
    private static readonly Color[] Several = [Color.FromHex("#0072B2"), Color.FromHex("#D55E00"), Color.FromHex("#009E73"), Color.FromHex("#CC79A7"), Color.FromHex("#56B4E9"), Color.FromHex("#000000")];
    private static readonly MarkerShape[] Shapes = [MarkerShape.FilledCircle, MarkerShape.FilledSquare, MarkerShape.FilledDiamond, MarkerShape.FilledTriangleUp, MarkerShape.OpenCircle, MarkerShape.OpenSquare, MarkerShape.OpenDiamond, MarkerShape.OpenTriangleUp, MarkerShape.Cross, MarkerShape.Asterisk];

    // Clock time of the first sample throughout, so that a clock change does not fold the axis.
    private readonly TimeSpan _offset;

    private Pictures(TimeSpan offset) => _offset = offset;

    public static void Write(string folder, string name, IReadOnlyList<PassSummary> attention)
    {
        string generator = name.Length > 40 ? name[..40] + "…" : name;
        PassSummary[] passes = [.. attention.OrderBy(pass => pass.Name, StringComparer.OrdinalIgnoreCase)];
        var pictures = new Pictures(passes[0].Series.Times[0].Offset);
        Save(pictures.Ribbons(generator, passes), folder, "quality", 1200, 260 + (120 * passes.Length));
        Save(pictures.Inputs(generator, passes), folder, "inputs", 1200, 760);
        Save(Models(generator, attention), folder, "models", 1200, 360 + (50 * passes.Length));
    }

    /// <summary>The history of quality, one band for each pass, all to one scale, shaded while the inputs moved.</summary>
    private Plot Ribbons(string generator, PassSummary[] passes)
    {
        double[] all = [.. passes.SelectMany(pass => pass.Series.Quality).Where(double.IsFinite).DefaultIfEmpty(0.8).Order()];
        double low = Math.Floor((all[(int)(0.001 * all.Length)] - 0.01) * 20) / 20, high = Math.Ceiling((all[(int)(0.999 * (all.Length - 1))] + 0.01) * 20) / 20;
        double height = (high - low) * 1.22;
        Plot plot = New($"{generator}: quality read by each pass, one scale for all");
        var ticks = new NumericManual();
        for (int i = 0; i < passes.Length; i++)
        {
            double offset = ((passes.Length - 1 - i) * height) - low;
            Band(plot, passes[i], offset, low, high);
            foreach (double tick in Steps(low, high)) ticks.AddMajor(tick + offset, tick.ToString("0.00", System.Globalization.CultureInfo.InvariantCulture));
            if (i > 0) plot.Add.HorizontalLine(offset + high + (height - (high - low)) / 2, 1, Panels.Ink.WithAlpha(0.4));
        }

        plot.Axes.Left.TickGenerator = ticks;
        plot.YLabel("Quality [kg/kg]");
        TimeAxis(plot, passes[0].Series.Times);
        plot.Axes.SetLimitsY(-0.03 * height, (passes.Length * height) - (0.1 * height));
        Legend(plot, passes.Any(pass => pass.Series.Estimate is not null));
        return plot;
    }

    private void Band(Plot plot, PassSummary pass, double offset, double low, double high)
    {
        foreach (Move move in pass.Moves)
        {
            ScottPlot.Plottables.Rectangle span = plot.Add.Rectangle(At(move.Start), At(move.End), low + offset, high + offset);
            span.FillColor = Panels.Shade;
            span.LineWidth = 0;
        }

        double[] xs = [.. pass.Series.Times.Select(At)], ys = [.. pass.Series.Quality.Select(quality => quality >= low && quality <= high ? quality + offset : double.NaN)];
        ScottPlot.Plottables.Scatter line = plot.Add.ScatterLine(xs, ys, Panels.Main);
        line.LineWidth = 1;
        if (pass.Series.Estimate is { } estimate) plot.Add.ScatterLine(xs, [.. estimate.Quality.ToArray().Select(quality => quality >= low && quality <= high ? quality + offset : double.NaN)], Panels.Accent).LineWidth = 2;
        ScottPlot.Plottables.Text name = plot.Add.Text(pass.Name, At(pass.Series.Times[0]), high + offset);
        name.LabelAlignment = Alignment.UpperLeft;
        name.LabelFontSize = 14;
        name.LabelBold = true;
        name.LabelFontColor = Panels.Ink;
        name.LabelBackgroundColor = Colors.White.WithAlpha(0.8);
        name.OffsetX = 6;
    }

    private static void Legend(Plot plot, bool isEstimated)
    {
        plot.Legend.ManualItems.Add(new LegendItem { LabelText = "quality as the meter reads it", LineColor = Panels.Main, LineWidth = 2 });
        if (isEstimated) plot.Legend.ManualItems.Add(new LegendItem { LabelText = "quality that left the pass, as estimated", LineColor = Panels.Accent, LineWidth = 3 });
        plot.Legend.ManualItems.Add(new LegendItem { LabelText = "inputs moving or settling: not to be believed", FillColor = Panels.Shade, LineWidth = 0 });
        plot.ShowLegend(Edge.Bottom).Legend.Orientation = Orientation.Horizontal;
    }

    /// <summary>What went into the passes, as per cent of its mean, or as kelvins for the feed temperature.</summary>
    private Plot Inputs(string generator, PassSummary[] passes)
    {
        Plot plot = New($"{generator}: what went into the passes, minute by minute");
        DateTimeOffset[] times = passes[0].Series.Times;
        int color = 0;
        foreach ((string name, double[] values) in Shared(passes))
        {
            (double[] xs, double[] ys) = Minutes(times, values);
            if (ys.All(double.IsNaN)) continue;
            ScottPlot.Plottables.Scatter line = plot.Add.ScatterLine(xs, ys, Several[color % Several.Length]);
            line.LineWidth = 2;
            line.LinePattern = new[] { LinePattern.Solid, LinePattern.Dashed, LinePattern.Dotted, LinePattern.DenselyDashed }[color % 4];
            line.LegendText = name;
            color++;
        }

        plot.YLabel("Change from the mean of the history [% or K]");
        TimeAxis(plot, times);
        plot.ShowLegend(Edge.Bottom).Legend.Orientation = Orientation.Horizontal;
        return plot;
    }

    private static IEnumerable<(string Name, double[] Values)> Shared(PassSummary[] passes)
    {
        yield return ("firing [%]", Relative(passes[0].Series.Firing));
        yield return ("feed temperature [K]", Minus(passes[0].Series.FeedTemperature));
        yield return ($"outlet pressure, {passes[0].Name} [%]", Relative(passes[0].Series.Pressure));
        PassSummary restless = passes.MaxBy(pass => Spread(pass.Series.Flow))!;
        yield return ($"feed flow, {restless.Name}, the one that moved most [%]", Relative(restless.Series.Flow));
    }

    /// <summary>What every wet-steam model makes of the last ten minutes of each pass.</summary>
    private static Plot Models(string generator, IReadOnlyList<PassSummary> attention)
    {
        Plot plot = New($"{generator}: one reading, every wet-steam model");
        string[] models = [.. attention.SelectMany(pass => pass.Models.Select(model => model.Model.Name)).Distinct()];
        for (int i = 0; i < attention.Count; i++)
        {
            int row = attention.Count - 1 - i;
            if (attention[i].Models.Count > 0) plot.Add.Line(attention[i].LowestModel, row, attention[i].HighestModel, row).Color = Panels.Ink.WithAlpha(0.35);
        }

        for (int m = 0; m < models.Length; m++)
        {
            (double X, double Y)[] points = [.. attention.SelectMany((pass, i) => pass.Models.Where(model => model.Model.Name == models[m]).Select(model => (model.Reading.Quality.DecimalFractions, (double)(attention.Count - 1 - i))))];
            double[] xs = [.. points.Select(point => point.X)], ys = [.. points.Select(point => point.Y)];
            ScottPlot.Plottables.Markers markers = plot.Add.Markers(xs, ys, Shapes[m % Shapes.Length], 11, Several[m % Several.Length]);
            markers.MarkerStyle.LineWidth = 2;
            markers.LegendText = models[m];
        }

        plot.Axes.Left.TickGenerator = new NumericManual([.. attention.Select((_, i) => (double)(attention.Count - 1 - i))], [.. attention.Select(pass => pass.Name)]);
        plot.Axes.SetLimitsY(-0.6, attention.Count - 0.4);
        plot.XLabel("Quality [kg/kg]");
        plot.YLabel("Pass");
        plot.ShowLegend(Edge.Bottom).Legend.Orientation = Orientation.Horizontal;
        return plot;
    }

    private static Plot New(string title)
    {
        var plot = new Plot();
        plot.Font.Set(Fonts.Sans);
        plot.Title(title, 20);
        plot.Axes.Color(Panels.Ink);
        plot.Grid.MajorLineColor = Panels.Ink.WithAlpha(0.12);
        plot.Axes.Left.Label.FontSize = plot.Axes.Bottom.Label.FontSize = 15;
        plot.Axes.Left.TickLabelStyle.FontSize = plot.Axes.Bottom.TickLabelStyle.FontSize = 13;
        plot.Legend.FontSize = 13;
        return plot;
    }

    private void TimeAxis(Plot plot, DateTimeOffset[] times)
    {
        TimeSpan span = times[^1] - times[0];
        plot.Axes.DateTimeTicksBottom();
        ((DateTimeAutomatic)plot.Axes.Bottom.TickGenerator).LabelFormatter = tick => tick.TimeOfDay == TimeSpan.Zero ? Text(tick, "yyyy-MM-dd") : Text(tick, span.TotalMinutes < 5 ? "HH:mm:ss" : "HH:mm");
        plot.Axes.Right.MinimumSize = 50;
        plot.Axes.SetLimitsX(At(times[0]), At(times[^1]) + Math.Max(1e-4, 0.004 * span.TotalDays));
        plot.XLabel($"Time at UTC offset {times[0]:zzz}");
    }

    private static string Text(DateTime time, string format) => time.ToString(format, System.Globalization.CultureInfo.InvariantCulture);

    private double At(DateTimeOffset time) => time.ToOffset(_offset).DateTime.ToOADate();

    private (double[] Xs, double[] Ys) Minutes(DateTimeOffset[] times, double[] values)
    {
        var windows = new Windows(times, values);
        int count = (int)Math.Clamp((times[^1] - times[0]).TotalMinutes, 1, 5000);
        TimeSpan step = (times[^1] - times[0]) / count;
        DateTimeOffset[] ends = [.. Enumerable.Range(1, count).Select(i => times[0] + (step * i))];
        return ([.. ends.Select(At)], [.. ends.Select(end => windows.Mean(end, step))]);
    }

    private static double[] Relative(double[] values)
    {
        double mean = Mean(values);
        return [.. values.Select(value => 100 * ((value / mean) - 1))];
    }

    private static double[] Minus(double[] values)
    {
        double mean = Mean(values);
        return [.. values.Select(value => value - mean)];
    }

    private static double Mean(double[] values) => values.Where(double.IsFinite).DefaultIfEmpty(double.NaN).Average();

    private static double Spread(double[] values)
    {
        double mean = Mean(values);
        return values.Where(double.IsFinite).Sum(value => Math.Pow((value / mean) - 1, 2));
    }

    private static IEnumerable<double> Steps(double low, double high)
    {
        double step = high - low > 0.3 ? 0.1 : 0.05;
        for (int i = (int)Math.Ceiling((low / step) - 1e-9); i * step <= high + 1e-9; i++) yield return i * step;
    }

    private static void Save(Plot plot, string folder, string name, int width, int height)
    {
        plot.SavePng(Path.Combine(folder, name + ".png"), width, height);
        plot.SaveSvg(Path.Combine(folder, name + ".svg"), width, height);
    }
}
