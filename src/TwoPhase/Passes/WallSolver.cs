using TwoPhase.Flow;
using TwoPhase.HeatTransfer;

namespace TwoPhase.Passes;

/// <summary>From a node of a profile to the wall around it, SI doubles.</summary>
internal static class WallSolver
{
    private static SteamFluid Fluid => default;

    public static PassWall At(PassProfile profile, in PassNode node, double fluxPeak)
    {
        FlowPattern pattern = FlowPattern.Core(node.Flow);
        FlowState flow = Saturated(node);
        if (Section(profile.Pass, node) is not { } section) return new(Film(profile.Models.Film, node, flow, 0), Unheated(node.Temperature), Applicability.Inside, null, null, pattern);

        TubeWall wall = section.Wall;
        double linear = LocalHeat(section, node, fluxPeak), flux = Math.Max(0, linear / (Math.PI * node.Flow.Bore)), film = Film(profile.Models.Film, node, flow, flux);
        Applicability applicability = Plain(section, profile.Models.Film.CheckCore(flow, flux));
        WallTemperatures temperatures = wall.Through(node.Temperature, film, linear);
        if (!(flux > 0)) return new(film, temperatures, applicability, null, null, pattern);

        bool wet = node.EquilibriumQuality is > 0 and < 1;
        WallTemperatures? dry = wet ? wall.Through(node.Temperature, FilmModel.DougallRohsenow.CoefficientCore(flow, flux), linear) : null;
        return new(film, temperatures, applicability, Critical(profile.Models.CriticalQuality, section, flow, flux), dry, pattern);
    }

    /// <summary>The section of a node; null in the outlet line.</summary>
    public static TubeSection? Section(Pass pass, in PassNode node) => node.Duct < pass.Sections.Count ? pass.Sections[node.Duct] : null;

    /// <summary>Heat per length of one tube on its hot side [W/m].</summary>
    private static double LocalHeat(TubeSection section, in PassNode node, double fluxPeak) =>
        node.LinearHeat / section.ParallelTubes * (section.Zone == HeatZone.Radiant ? fluxPeak : 1);

    /// <summary>The flow with both phases saturated and every property that a heat-transfer model reads.</summary>
    public static FlowState Saturated(in PassNode node)
    {
        SaturatedPair pair = Fluid.Saturated(node.Pressure);
        return SteamFluid.WithHeat(node.Flow with
        {
            LiquidDensity = 1 / pair.LiquidVolume,
            VapourDensity = 1 / pair.VapourVolume,
            LiquidViscosity = pair.LiquidViscosity,
            VapourViscosity = pair.VapourViscosity,
        });
    }

    /// <summary>h [W/(m²·K)] over the difference between wetted surface and flow.</summary>
    private static double Film(FilmModel model, in PassNode node, in FlowState saturated, double flux)
    {
        if (node.EquilibriumQuality is > 0 and < 1) return model.CoefficientCore(saturated, flux);
        double alone = OnePhase(node), subcooling = node.Flow.SaturationTemperature - node.Temperature;
        if (node.EquilibriumQuality >= 1 || !(flux / alone > subcooling)) return alone;
        double boiling = subcooling + (flux / model.CoefficientCore(saturated, flux));
        return Math.Max(alone, flux / boiling);
    }

    /// <summary>h [W/(m²·K)] of the liquid or the dry steam alone, by Gnielinski.</summary>
    public static double OnePhase(in PassNode node) => Fluid.Film(Fluid.Transport(node.Pressure, node.Enthalpy), node.Flow.MassFlux, node.Flow.Bore);

    private static CriticalQuality Critical(CriticalQualityModel model, TubeSection section, in FlowState flow, double flux)
    {
        double mean = model.MeanCore(flow, flux);
        return new(mean, model.SpreadCore(flow, mean), Plain(section, model.CheckCore(flow, flux)));
    }

    // Correlations for plain bores in a ribbed one: computed and flagged.
    private static Applicability Plain(TubeSection section, Applicability found) =>
        section.IsRibbed ? found.And(Applicability.Inside.Check(ApplicabilityLimits.RibbedBore, 1, 0, 0)) : found;

    private static WallTemperatures Unheated(double temperature) => new(0, temperature, temperature, temperature, temperature);
}
