using ScottPlot;
using TwoPhase.Passes;
using static PassReport.Report.Panels;

namespace PassReport.Report;

/// <summary>One pass from inlet to outlet: enthalpy, quality, void fraction and the liquid that stands there, against length and against volume.</summary>
internal static class ProfilePicture
{
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
            plots.Add(One(length, values, label, interior.Onset?.Position.Meters, free));
            plots.Add(One(volume, values, label, interior.Onset is { } onset ? onset.ShareOfVolume.DecimalFractions * volume[^1] : null, free));
        }

        plots[0].Title($"{pass.Name}, at rest as it reads: against length", 16);
        plots[1].Title("against water-side volume", 16);
        plots[^2].XLabel("Length from the inlet [m]");
        plots[^1].XLabel("Volume from the inlet [m³]");
        Save(folder, "profile", plots, 2, 1200, 1000);
    }

    // Whatever is not vapour: the liquid held is total less vapour, both per volume of tube.
    private static double LiquidDensity(ProfilePoint point)
    {
        double alpha = point.VoidFraction.DecimalFractions;
        if (alpha is <= 0 or >= 1) return alpha <= 0 ? point.Density.KilogramsPerCubicMeter : 0;
        double vapour = TwoPhase.Steam.Saturation.FromPressure(point.Pressure).Vapour.Density.KilogramsPerCubicMeter;
        return point.Density.KilogramsPerCubicMeter - (alpha * vapour);
    }

    private static Plot One(double[] x, double[] y, string label, double? onset, Alignment legendAt)
    {
        Plot plot = New(label);
        Draw(plot, x, y, Main, LinePattern.Solid);
        if (onset is { } at)
        {
            plot.Add.VerticalLine(at, 2, Accent, LinePattern.Dashed).LegendText = "boiling begins";
            plot.ShowLegend(legendAt);
        }

        plot.Axes.SetLimitsX(0, x[^1]);
        return plot;
    }
}
