using ScottPlot;
using SkiaSharp;
using TwoPhase.Passes;

namespace PassReport.Report;

/// <summary>One pass from inlet to outlet: enthalpy, quality, void fraction and the liquid that stands there, against length and against volume.</summary>
internal static class ProfilePicture
{
    private const int Width = 1200, Height = 1000;

    private static readonly Color Ink = Color.FromHex("#222222"), Line = Color.FromHex("#0072B2"), Boiling = Color.FromHex("#D55E00");

    public static void Write(string folder, PassSummary pass)
    {
        Interior interior = pass.Interior!;
        ProfilePoint[] points = [.. interior.Profile];
        double[] length = [.. points.Select(point => point.Position.Meters)], volume = [.. points.Select(point => point.WaterVolume.CubicMeters)];
        (string Label, double[] Values)[] figures =
        [
            ("Enthalpy [kJ/kg]", [.. points.Select(point => point.Enthalpy.KilojoulesPerKilogram)]),
            ("Quality [kg/kg]", [.. points.Select(point => point.EquilibriumQuality.DecimalFractions)]),
            ("Void fraction [-]", [.. points.Select(point => point.VoidFraction.DecimalFractions)]),
            ("Liquid [kg per m³ of tube]", [.. points.Select(LiquidDensity)]),
        ];
        var plots = new List<Plot>();
        foreach ((string label, double[] values) in figures)
        {
            // The legend stands where the curve does not: under one that rises, above one that falls.
            Alignment free = values[^1] > values[0] ? Alignment.LowerRight : Alignment.UpperRight;
            plots.Add(Draw(length, values, label, interior.Onset?.Position.Meters, free));
            plots.Add(Draw(volume, values, label, interior.Onset is { } onset ? onset.ShareOfVolume.DecimalFractions * volume[^1] : null, free));
        }

        plots[0].Title($"{pass.Name}, at rest as it reads: against length", 16);
        plots[1].Title("against water-side volume", 16);
        plots[^2].XLabel("Length from the inlet [m]");
        plots[^1].XLabel("Volume from the inlet [m³]");
        Save(folder, plots);
    }

    // Whatever is not vapour: the liquid held is total less vapour, both per volume of tube.
    private static double LiquidDensity(ProfilePoint point)
    {
        double alpha = point.VoidFraction.DecimalFractions;
        if (alpha is <= 0 or >= 1) return alpha <= 0 ? point.Density.KilogramsPerCubicMeter : 0;
        double vapour = TwoPhase.Steam.Saturation.FromPressure(point.Pressure).Vapour.Density.KilogramsPerCubicMeter;
        return point.Density.KilogramsPerCubicMeter - (alpha * vapour);
    }

    private static Plot Draw(double[] x, double[] y, string label, double? onset, Alignment legendAt)
    {
        var plot = new Plot();
        plot.Font.Set(Fonts.Sans);
        plot.Axes.Color(Ink);
        plot.Grid.MajorLineColor = Ink.WithAlpha(0.12);
        plot.Add.ScatterLine(x, y, Line).LineWidth = 2;
        if (onset is { } at)
        {
            ScottPlot.Plottables.VerticalLine line = plot.Add.VerticalLine(at, 2, Boiling, LinePattern.Dashed);
            line.LegendText = "boiling begins";
            plot.ShowLegend(legendAt).FontSize = 12;
        }

        plot.YLabel(label);
        plot.Axes.Left.Label.FontSize = plot.Axes.Bottom.Label.FontSize = 14;
        plot.Axes.Left.MinimumSize = 80;
        plot.Axes.SetLimitsX(0, x[^1]);
        return plot;
    }

    private static void Save(string folder, List<Plot> plots)
    {
        var picture = new Multiplot { Layout = new ScottPlot.MultiplotLayouts.Grid(plots.Count / 2, 2) };
        picture.RemovePlot(picture.GetPlot(0));
        foreach (Plot plot in plots) picture.AddPlot(plot);
        picture.SavePng(Path.Combine(folder, "profile.png"), Width, Height);
        using FileStream file = File.Create(Path.Combine(folder, "profile.svg"));
        using SKCanvas svg = SKSvgCanvas.Create(new SKRect(0, 0, Width, Height), file);
        picture.Render(svg, new PixelRect(0, Width, Height, 0));
    }
}
