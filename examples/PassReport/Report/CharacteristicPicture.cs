using ScottPlot;
using TwoPhase.Passes;
using TwoPhase.Stability;
using UnitsNet;
using static PassReport.Report.Panels;

namespace PassReport.Report;

/// <summary>Pressure drop of one pass against its flow, everything else held: where it falls, flow does not hold between common headers.</summary>
internal static class CharacteristicPicture
{
    private const double Lowest = 0.6, Highest = 3;
    private const int Points = 61;

    public static void Write(string folder, Margins pass)
    {
        PassConditions conditions = pass.Interior.Profile.Conditions;
        FlowCharacteristic curve = FlowCharacteristic.Of(pass.Interior.Profile.Pass, conditions, conditions.FeedFlow * Lowest, conditions.FeedFlow * Highest, Points);
        if (curve.Count < 2 || curve.OperatingPoint is not { } at) return;
        double[] x = [.. curve.Select(point => point.Flow.KilogramsPerSecond)], y = [.. curve.Select(point => point.PressureDrop.Kilopascals)];
        Plot plot = New("Pressure drop of the pass [kPa]");
        double floor = 0.95 * y.Min(), ceiling = 1.05 * y.Max();
        foreach (FlowExcursion excursion in curve.Excursions)
        {
            ScottPlot.Plottables.Rectangle span = plot.Add.Rectangle(excursion.From.KilogramsPerSecond, excursion.To.KilogramsPerSecond, floor, ceiling);
            span.FillColor = Shade;
            span.LineWidth = 0;
        }

        if (curve.Excursions.Count > 0) plot.Legend.ManualItems.Add(new LegendItem { LabelText = "falls as flow rises: does not hold between common headers", FillColor = Shade, LineWidth = 0 });

        double needed = curve.RestrictionNeeded.Kilopascals, flow = conditions.FeedFlow.KilogramsPerSecond;
        if (needed > 0) Draw(plot, x, [.. x.Zip(y, (one, drop) => drop + (needed * one * one / (flow * flow)))], Third, LinePattern.Dashed, $"with {Words.Number(needed, "0")} kPa taken at its inlet: rises throughout");

        // Solid after dashed: ScottPlot would draw the outline of a marker with the dashes of the line before it.
        Draw(plot, x, y, Main, LinePattern.Solid, "the pass alone");
        ScottPlot.Plottables.Marker marker = plot.Add.Marker(at.Flow.KilogramsPerSecond, at.PressureDrop.Kilopascals, MarkerShape.FilledCircle, 12, Accent);
        marker.LegendText = "now";
        plot.Title($"{pass.Pass.Name}: pressure drop against flow at constant heat, {Words.Number((double)conditions.AbsorbedHeat.Megawatts, "0.00")} MW", 16);
        plot.XLabel("Feed flow [kg/s]");
        plot.Axes.SetLimits(x[0], x[^1], floor, ceiling);
        plot.ShowLegend(Edge.Bottom).Legend.Orientation = Orientation.Horizontal;
        Save(folder, "characteristic", [plot], 1, 1200, 620);
    }
}
