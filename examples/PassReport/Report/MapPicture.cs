using ScottPlot;
using TwoPhase.Limits;
using TwoPhase.Passes;
using UnitsNet;
using static PassReport.Report.Panels;

namespace PassReport.Report;

/// <summary>Outlet quality of one pass over flow and heat at three feed temperatures, with the lines where a limit is reached.</summary>
internal static class MapPicture
{
    private const int Flows = 21, Heats = 17;
    private const double FlowSpan = 0.25, HeatSpan = 0.15, Kelvins = 15, Tolerance = 1e-5;

    // One style a limit, the same in every panel; the last is that of the level pressure drop.
    private static readonly (Color Color, LinePattern Pattern)[] Lines =
        [(Accent, LinePattern.Solid), (Fourth, LinePattern.Dashed), (Third, LinePattern.Dotted), (Ink, LinePattern.DenselyDashed), (Accent, LinePattern.Dotted), (Ink, LinePattern.Dotted), (Third, LinePattern.Dashed), (Fourth, LinePattern.Solid), (Third, LinePattern.Solid)];

    public static void Write(string folder, Margins pass)
    {
        PassConditions at = pass.Interior.Profile.Conditions;
        double flow = at.FeedFlow.KilogramsPerSecond, heat = (double)at.AbsorbedHeat.Megawatts, feed = pass.Interior.Profile.Inlet.Temperature.DegreesCelsius;
        var grid = new OperatingGrid(
            Axis(flow, FlowSpan, Flows).Select(value => MassFlow.FromKilogramsPerSecond(value)),
            Axis(heat, HeatSpan, Heats).Select(value => Power.FromMegawatts(value)),
            new[] { -Kelvins, 0, Kelvins }.Select(step => Temperature.FromDegreesCelsius(feed + step)));
        SiteLimits site = pass.Limits.Site;
        OperatingMap<Figures> map = OperatingMap.Of(pass.Interior.Profile.Pass, at, grid, profile => Figures.Of(profile, site), options: SteadyOptions.Default.WithTolerance(Tolerance));
        string[] names = [.. pass.Limits.Where(row => row.Kind != LimitKind.CriticalQuality).Select(row => row.Name)];
        Plot[] plots = [.. grid.FeedTemperatures.Select((temperature, t) => Panel(map, t, names, $"feed at {Words.Number(temperature.DegreesCelsius, "0")} °C"))];
        plots[1].Add.Marker(flow, heat, MarkerShape.FilledCircle, 12, Ink).LegendText = "now";
        plots[1].Title($"{pass.Pass.Name}: outlet quality, and where limits are reached\nfeed at {Words.Number(feed, "0")} °C, as now", 16);
        Save(folder, "map", plots, plots.Length, 1500, 700);
    }

    private static IEnumerable<double> Axis(double middle, double span, int count) => Enumerable.Range(0, count).Select(i => middle * (1 - span + (2 * span * i / (count - 1.0))));

    private static Plot Panel(OperatingMap<Figures> map, int temperature, string[] names, string title)
    {
        Plot plot = New("Absorbed heat [MW]");
        plot.Title("\n" + title, 16);
        plot.XLabel("Feed flow [kg/s]");
        Contours(plot, Surface(map, temperature, figures => figures.Quality), [.. Enumerable.Range(1, 20).Select(i => i / 20.0)], Main, LinePattern.Solid, 1).LabelStyle.IsVisible = true;
        for (int i = 0; i < names.Length; i++)
        {
            int row = i;
            Limit(Surface(map, temperature, figures => figures.Margins[row]), Lines[i % (Lines.Length - 1)], names[i]);
        }

        Limit(Rise(Surface(map, temperature, figures => figures.Drop)), Lines[^1], "drop level with flow");
        plot.Axes.AutoScale();
        plot.Axes.Margins(0, 0);
        plot.ShowLegend(Edge.Bottom);
        return plot;

        void Limit(Coordinates3d[,] margin, (Color Color, LinePattern Pattern) style, string name)
        {
            if (!margin.Cast<Coordinates3d>().Any(point => point.Z < 0) || !margin.Cast<Coordinates3d>().Any(point => point.Z > 0)) return;
            Contours(plot, margin, [0], style.Color, style.Pattern, 3);
            plot.Legend.ManualItems.Add(new LegendItem { LabelText = "limit: " + name, LineColor = style.Color, LineWidth = 3, LinePattern = style.Pattern });
        }
    }

    private static ScottPlot.Plottables.ContourLines Contours(Plot plot, Coordinates3d[,] surface, double[] levels, Color color, LinePattern pattern, float width)
    {
        ScottPlot.Plottables.ContourLines contours = plot.Add.ContourLines(surface);
        contours.ContourLineLevels = levels;
        contours.Update(surface);
        contours.Colormap = new ScottPlot.Colormaps.CustomInterpolated([color, color]);
        contours.LineStyle.Width = width;
        contours.LineStyle.Pattern = pattern;
        contours.LabelStyle.IsVisible = false;
        return contours;
    }

    /// <summary>How a surface rises along its flows, by differences of neighbours.</summary>
    private static Coordinates3d[,] Rise(Coordinates3d[,] surface)
    {
        var rise = new Coordinates3d[surface.GetLength(0), surface.GetLength(1) - 2];
        for (int q = 0; q < rise.GetLength(0); q++)
        {
            for (int m = 0; m < rise.GetLength(1); m++) rise[q, m] = new(surface[q, m + 1].X, surface[q, m + 1].Y, surface[q, m + 2].Z - surface[q, m].Z);
        }

        return rise;
    }

    private static Coordinates3d[,] Surface(OperatingMap<Figures> map, int temperature, Func<Figures, double> figure)
    {
        var surface = new Coordinates3d[map.Grid.Heats.Count, map.Grid.Flows.Count];
        for (int q = 0; q < map.Grid.Heats.Count; q++)
        {
            for (int m = 0; m < map.Grid.Flows.Count; m++)
            {
                OperatingCell<Figures> cell = map[m, q, temperature];
                surface[q, m] = new(map.Grid.Flows[m].KilogramsPerSecond, (double)map.Grid.Heats[q].Megawatts, cell.HasFigure ? figure(cell.Figure) : double.NaN);
            }
        }

        return surface;
    }

    /// <summary>Outlet quality, pressure drop, and the margin of each limit that can raise an alarm; NaN where one does not apply.</summary>
    private readonly record struct Figures(double Quality, double Drop, double[] Margins)
    {
        public static Figures Of(PassProfile profile, SiteLimits site) => new(
            profile.OutletQuality.DecimalFractions,
            profile.PressureDrop.Total.Kilopascals,
            [.. PassLimits.Of(profile, site).Where(row => row.Kind != LimitKind.CriticalQuality).Select(Report.Margins.Number)]);
    }
}
