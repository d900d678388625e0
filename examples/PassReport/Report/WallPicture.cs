using ScottPlot;
using TwoPhase.Limits;
using TwoPhase.Passes;
using static PassReport.Report.Panels;

namespace PassReport.Report;

/// <summary>The wall of one pass from inlet to outlet: metal temperature, quality against its limits, and how far the flow is from lying flat.</summary>
internal static class WallPicture
{
    // Above this many times the flow at which the top of the tube runs dry, nobody asks how many.
    private const double Ample = 12;

    public static void Write(string folder, Margins pass)
    {
        PassProfile profile = pass.Interior.Profile;
        PassWall[] walls = [.. Enumerable.Range(0, profile.Count).Select(i => profile.WallAt(i, pass.Limits.Site.FluxPeak))];
        double[] x = [.. profile.Select(point => point.Position.Meters)];
        Plot[] plots = [Temperatures(pass, walls, x), Qualities(pass, walls, x), Stratification(walls, x)];
        plots[0].Title($"{pass.Pass.Name}, at rest as it reads: the wall along the pass", 16);
        plots[^1].XLabel("Length from the inlet [m]");
        foreach (Plot plot in plots) plot.Axes.SetLimitsX(0, x[^1]);
        Save(folder, "walls", plots, 1, 1200, 1150);
    }

    private static Plot Temperatures(Margins pass, PassWall[] walls, double[] x)
    {
        Plot plot = New("Temperature [°C]");
        Draw(plot, x, [.. walls.Select(wall => wall.Temperatures.Fluid.DegreesCelsius)], Main, LinePattern.Solid, "flow");
        Draw(plot, x, [.. walls.Select(wall => wall.Temperatures.InsideMetal.DegreesCelsius)], Third, LinePattern.Dashed, "metal, inside");
        Draw(plot, x, [.. walls.Select(wall => wall.Temperatures.OutsideMetal.DegreesCelsius)], Accent, LinePattern.Solid, "metal, outside, flame side");
        Draw(plot, x, [.. walls.Select((wall, i) => Dry(pass.Interior.Profile[i], wall))], Fourth, LinePattern.Dotted, "the same if the wall were dry, beyond the critical quality");
        if (pass.Limits.Site.MetalTemperature is { } limit) Level(plot, limit.DegreesCelsius, "limit of the metal");
        plot.ShowLegend(Alignment.LowerRight);
        return plot;
    }

    // Where a correlation has the wall dry: an indicator, as the legend of the qualities says.
    private static double Dry(ProfilePoint point, PassWall wall) =>
        wall.DryTemperatures is { } dry && wall.CriticalQuality is { } critical && point.Quality.DecimalFractions >= critical.Mean.DecimalFractions ? dry.OutsideMetal.DegreesCelsius : double.NaN;

    private static Plot Qualities(Margins pass, PassWall[] walls, double[] x)
    {
        Plot plot = New("Quality [kg/kg]");
        Draw(plot, x, [.. pass.Interior.Profile.Select(point => point.EquilibriumQuality.DecimalFractions)], Main, LinePattern.Solid, "quality");
        Draw(plot, x, Critical(walls, critical => critical.Mean.DecimalFractions), Fourth, LinePattern.Dashed, "critical quality, an indicator and no alarm");
        Draw(plot, x, Critical(walls, critical => critical.Top.DecimalFractions), Fourth, LinePattern.Dotted, "the same at top and bottom of the tube");
        Draw(plot, x, Critical(walls, critical => critical.Bottom.DecimalFractions), Fourth, LinePattern.Dotted);
        Level(plot, pass.Limits.Site.OutletQuality.DecimalFractions, pass.Limits.Site.IsOutletQualityConfirmed ? "limit of outlet quality" : "usual limit of outlet quality, not confirmed");
        plot.Axes.SetLimitsY(Math.Min(-0.1, pass.Interior.Profile.Inlet.EquilibriumQuality.DecimalFractions), 1.05);
        plot.ShowLegend(Alignment.LowerRight);
        return plot;
    }

    private static double[] Critical(PassWall[] walls, Func<TwoPhase.HeatTransfer.CriticalQuality, double> figure) =>
        [.. walls.Select(wall => wall.DryTemperatures is not null && wall.CriticalQuality is { } critical ? figure(critical) : double.NaN)];

    private static Plot Stratification(PassWall[] walls, double[] x)
    {
        Plot plot = New("Flow over stratified flow [-]");
        Draw(plot, x, [.. walls.Select(wall => wall.DryTemperatures is not null && wall.Pattern.StratificationMargin <= Ample ? wall.Pattern.StratificationMargin : double.NaN)], Main, LinePattern.Solid, "how many times the flow at which the top of the tube would run dry");
        Level(plot, 1, "the top runs dry");
        plot.Axes.SetLimitsY(0, Ample);
        plot.ShowLegend(Alignment.UpperLeft);
        return plot;
    }

    private static void Level(Plot plot, double at, string legend) => plot.Add.HorizontalLine(at, 2, Ink, LinePattern.DenselyDashed).LegendText = legend;
}
