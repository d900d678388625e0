using TwoPhase.Flow;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;

namespace TwoPhase.Limits;

/// <summary>The limits of one steady state, one after the other; always the same rows in the same order for the same site.</summary>
internal static class LimitRules
{
    // C is quoted for ft/s and lb/ft³: m/s and kg/m³ take it times this, 1.2199.
    private static readonly double ErosionUnit = SiDoor.MetresPerFoot * Math.Sqrt(SiDoor.KilogramsPerPound / (SiDoor.MetresPerFoot * SiDoor.MetresPerFoot * SiDoor.MetresPerFoot));

    // Beyond this slope against the horizontal the map of flow patterns does not hold.
    private const double FlatEnough = Math.PI / 18;

    public static LimitFigure[] Of(PassProfile profile, SiteLimits site, out CriticalIndicator? critical)
    {
        IReadOnlyList<HeatedRow> rows = HeatedRow.Of(profile, site.FluxPeak);
        critical = CriticalIndicator.Of(profile, rows);
        return [Quality(profile, site), .. Solids(profile, site), .. Critical(critical), Stratification(rows), Metal(rows, site), Erosion(profile, site), Differential(profile, site), Flow(profile, site)];
    }

    private static LimitFigure Quality(PassProfile profile, SiteLimits site)
    {
        PassNode outlet = profile.Nodes[^1];
        string reason = site.IsOutletQualityConfirmed ? "" : "the usual figure for plain bores, not confirmed by the site";
        return new LimitFigure(LimitKind.OutletQuality, "outlet quality", QuantityScale.Quality).Below(site.RawQuality, outlet.EquilibriumQuality, outlet, reason);
    }

    private static IEnumerable<LimitFigure> Solids(PassProfile profile, SiteLimits site)
    {
        PassNode outlet = profile.Nodes[^1];
        double x = outlet.EquilibriumQuality;
        if (site.Solids.Count == 0)
        {
            string factor = x < 1 ? $"; the outlet water is concentrated {Scale.None.Text(1 / (1 - Math.Max(x, 0)), "F2")} times" : "";
            yield return new LimitFigure(LimitKind.Solids, "solids", QuantityScale.Quality).NotApplicable("no limit of dissolved solids, silica or hardness is given" + factor);
        }

        foreach (SolidsLimit solids in site.Solids)
        {
            string reason = x >= 1 ? "no water is left to carry them" : solids.TextAt(Math.Max(x, 0));
            yield return new LimitFigure(LimitKind.Solids, solids.Name, QuantityScale.Quality).Below(solids.RawGreatestQuality, x, outlet, reason);
        }
    }

    private static IEnumerable<LimitFigure> Critical(CriticalIndicator? critical)
    {
        yield return One("critical quality", critical?.Mean);
        yield return One("critical quality, top of the tube", critical?.Top);
        yield return One("critical quality, bottom of the tube", critical?.Bottom);

        LimitFigure One(string name, CriticalPlace? found)
        {
            var figure = new LimitFigure(LimitKind.CriticalQuality, name, QuantityScale.Quality);
            return found is { } place
                ? figure.Below(place.RawCritical, place.RawQuality, place.Node, $"{place}; {critical!.Applicability}") with { Status = LimitStatus.Indicator }
                : figure.NotApplicable("no heated tube carries two phases");
        }
    }

    private static LimitFigure Stratification(IReadOnlyList<HeatedRow> rows)
    {
        var figure = new LimitFigure(LimitKind.Stratification, "stratification", QuantityScale.Ratio);
        HeatedRow[] flat = [.. rows.Where(row => IsMapped(row.Node.Flow))];
        if (flat.Length == 0) return figure.NotApplicable("no heated tube within 10° of the horizontal carries two phases");
        HeatedRow worst = flat.Aggregate((best, row) => row.Wall.Pattern.StratificationMargin < best.Wall.Pattern.StratificationMargin ? row : best);
        return figure.Above(1, worst.Wall.Pattern.StratificationMargin, worst.Node, $"{worst.Wall.Pattern.Regime}; about the factor by which flow may fall before the top of the tube runs dry");
    }

    // The map takes both phases for turbulent. With less vapour than that, in the first hair's breadth of boiling, bubbles flow and no tube top is dry; with less
    // liquid, in the last, dryout is the question.
    private static bool IsMapped(in FlowState flow) => flow.Quality is > 0 and < 1 && Math.Abs(flow.Inclination) <= FlatEnough
        && Reynolds(flow, flow.Quality, flow.VapourViscosity) > FrictionFactor.TransitionReynolds && Reynolds(flow, 1 - flow.Quality, flow.LiquidViscosity) > FrictionFactor.TransitionReynolds;

    private static double Reynolds(in FlowState flow, double share, double viscosity) => flow.MassFlux * share * flow.Bore / viscosity;

    private static LimitFigure Metal(IReadOnlyList<HeatedRow> rows, SiteLimits site)
    {
        var figure = new LimitFigure(LimitKind.MetalTemperature, "metal temperature", QuantityScale.Temperature);
        if (double.IsNaN(site.RawMetal)) return figure.NotApplicable("no limit of metal temperature is given");
        if (rows.Count == 0) return figure.NotApplicable("no section takes heat");
        HeatedRow hottest = rows.Aggregate((best, row) => row.Metal > best.Metal ? row : best);
        return figure.Below(site.RawMetal, hottest.Metal, hottest.Node, "wet wall; tube-skin thermocouples come first");
    }

    private static LimitFigure Erosion(PassProfile profile, SiteLimits site)
    {
        var figure = new LimitFigure(LimitKind.ErosionalVelocity, "erosional velocity", QuantityScale.Speed);
        if (site.ErosionFactor is not { } factor) return figure.NotApplicable("no factor C is given");
        PassNode worst = profile.Nodes[0];
        foreach (ref readonly PassNode node in profile.Nodes)
        {
            if (Load(node) > Load(worst)) worst = node;
        }

        double volume = worst.HomogeneousVolume;
        return figure.Below(factor * ErosionUnit * Math.Sqrt(volume), worst.Flow.MassFlux * volume, worst, $"C = {Scale.None.Text(factor, "G4")}");

        static double Load(in PassNode node) => node.Flow.MassFlux * Math.Sqrt(node.HomogeneousVolume);
    }

    private static LimitFigure Differential(PassProfile profile, SiteLimits site)
    {
        var figure = new LimitFigure(LimitKind.Differential, "meter differential", QuantityScale.Differential);
        if (profile.Pass.Meter is not { } meter) return figure.NotApplicable("the pass has no meter at its outlet");
        if (double.IsNaN(site.RawDifferential.High)) return figure.NotApplicable("no transmitter range is given");
        PassNode outlet = profile.Nodes[^1];
        if (outlet.EquilibriumQuality < 0) return figure.NotApplicable("the outlet is subcooled, where no wet-steam model holds");
        double differential = meter.DifferentialOrNaN(profile.Conditions.RawFeedFlow, outlet.Pressure, outlet.EquilibriumQuality);
        return differential > 0 ? Between(figure, differential, site.RawDifferential, outlet) : figure.NotApplicable("the meter chokes at this flow, pressure and quality, or its model has no answer");
    }

    private static LimitFigure Flow(PassProfile profile, SiteLimits site)
    {
        var figure = new LimitFigure(LimitKind.FeedFlow, "feed flow", QuantityScale.Flow);
        return double.IsNaN(site.RawFlow.High) ? figure.NotApplicable("no range of feed flow is given") : Between(figure, profile.Conditions.RawFeedFlow, site.RawFlow, profile.Nodes[0]);
    }

    /// <summary>The nearer end of a range.</summary>
    private static LimitFigure Between(in LimitFigure figure, double value, (double Low, double High) range, in PassNode place) =>
        value - range.Low < range.High - value ? figure.Above(range.Low, value, place, "lower end of the range") : figure.Below(range.High, value, place, "upper end of the range");
}
