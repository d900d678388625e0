using TwoPhase.Flow;
using TwoPhase.HeatTransfer;
using TwoPhase.Passes;

namespace TwoPhase.Limits;

/// <summary>The correlated critical quality along a pass: mean of the perimeter, top and bottom of the tube, each with the metal temperature it would lead to.</summary>
/// <remarks>
/// An indicator and never an alarm: the correlations rest on tubes of 4 to 32 mm, and boilers with wider tubes run for years at qualities well
/// above what they allow. Its worth is in trends, in ranking passes, and in the temperature: a thermocouple on the metal would see it.
/// </remarks>
public sealed class CriticalIndicator
{
    private CriticalIndicator(CriticalPlace mean, CriticalPlace top, CriticalPlace bottom, Applicability applicability) =>
        (Mean, Top, Bottom, Applicability) = (mean, top, bottom, applicability);

    /// <summary>By the mean of the perimeter.</summary>
    public CriticalPlace Mean { get; }

    /// <summary>By the top of the tube, the first to dry.</summary>
    public CriticalPlace Top { get; }

    /// <summary>By the bottom of the tube, the last to dry.</summary>
    public CriticalPlace Bottom { get; }

    /// <summary>Whether the correlation is inside its published range at <see cref="Mean"/>.</summary>
    public Applicability Applicability { get; }

    /// <summary>Null where no heated tube carries two phases.</summary>
    internal static CriticalIndicator? Of(PassProfile profile, IReadOnlyList<HeatedRow> rows)
    {
        HeatedRow[] wet = [.. rows.Where(row => row.Wall.DryTemperatures is not null && row.Wall.CriticalQuality is not null)];
        if (wet.Length == 0) return null;
        CriticalPlace mean = Place(profile, wet, critical => critical.Mean.DecimalFractions);
        CriticalPlace top = Place(profile, wet, critical => critical.Top.DecimalFractions), bottom = Place(profile, wet, critical => critical.Bottom.DecimalFractions);
        Applicability applicability = wet.First(row => row.Node.Position == mean.Node.Position).Wall.CriticalQuality!.Value.Applicability;
        return new(mean, top, bottom, applicability);
    }

    private static CriticalPlace Place(PassProfile profile, HeatedRow[] wet, Func<CriticalQuality, double> figure)
    {
        double Excess(HeatedRow row) => row.Node.Flow.Quality - figure(row.Wall.CriticalQuality!.Value);
        HeatedRow[] dry = [.. wet.Where(row => Excess(row) >= 0)];
        HeatedRow furthest = wet.Aggregate((best, row) => Excess(row) > Excess(best) ? row : best);
        HeatedRow first = dry.Length > 0 ? dry[0] : furthest, hottest = dry.Aggregate(first, (best, row) => row.DryMetal > best.DryMetal ? row : best);
        double critical = figure(furthest.Wall.CriticalQuality!.Value);
        return new(dry.Length > 0, profile.Pass.Ducts[first.Node.Duct].Name, first.Node, furthest.Node.Flow.Quality, critical, hottest.DryMetal, hottest.DryMetal - hottest.Metal);
    }
}

/// <summary>A row of a profile whose tube takes heat from the fire, and its wall.</summary>
internal readonly record struct HeatedRow(PassNode Node, PassWall Wall)
{
    /// <summary>Outside metal [K].</summary>
    public double Metal => Wall.Temperatures.OutsideMetal.Kelvins;

    /// <summary>Outside metal if the wall were dry [K]; NaN where that means nothing.</summary>
    public double DryMetal => Wall.DryTemperatures?.OutsideMetal.Kelvins ?? double.NaN;

    public static IReadOnlyList<HeatedRow> Of(PassProfile profile, double fluxPeak)
    {
        var rows = new List<HeatedRow>(profile.Count);
        foreach (ref readonly PassNode node in profile.Nodes)
        {
            if (node.LinearHeat > 0 && WallSolver.Section(profile.Pass, node) is { IsHeated: true }) rows.Add(new(node, WallSolver.At(profile, node, fluxPeak)));
        }

        return rows;
    }
}
