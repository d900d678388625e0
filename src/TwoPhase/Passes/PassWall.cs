using System.Globalization;
using TwoPhase.Flow;
using TwoPhase.HeatTransfer;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>What the tube wall meets at one row of a profile: film, temperatures through scale and metal, critical quality, flow pattern.</summary>
/// <remarks>Computed, not measured: it never replaces tube-skin thermocouples or the trips that hang on them.</remarks>
public readonly record struct PassWall
{
    private readonly double _film;   // W/(m²·K)

    internal PassWall(double film, in WallTemperatures temperatures, Applicability filmApplicability, CriticalQuality? criticalQuality, WallTemperatures? dry, in FlowPattern pattern)
    {
        _film = film;
        Temperatures = temperatures;
        FilmApplicability = filmApplicability;
        CriticalQuality = criticalQuality;
        DryTemperatures = dry;
        Pattern = pattern;
    }

    /// <summary>h, heat flux at the wetted surface over the difference between that surface and the flow.</summary>
    public HeatTransferCoefficient FilmCoefficient => HeatTransferCoefficient.FromWattsPerSquareMeterKelvin(_film);

    /// <summary>Flow, wetted surface, metal inside under the scale, metal outside, and the flux at the wetted surface.</summary>
    public WallTemperatures Temperatures { get; }

    /// <summary>Whether the film model of a boiling flow is inside its range; always outside in a ribbed bore.</summary>
    public Applicability FilmApplicability { get; }

    /// <summary>Quality at which the wall would dry out at this flux, by <see cref="PassModels.CriticalQuality"/>; null where no heat comes in. An indicator, never an alarm.</summary>
    public CriticalQuality? CriticalQuality { get; }

    /// <summary>The temperatures if the wall were dry here (<see cref="FilmModel.DougallRohsenow"/>); null where no heat comes in or no two phases flow.</summary>
    public WallTemperatures? DryTemperatures { get; }

    /// <summary>How liquid and vapour share the tube.</summary>
    public FlowPattern Pattern { get; }

    internal object ToDump() => ToString();

    /// <summary>Film, temperatures and pattern in a line, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "film {0:F0} W/(m²·K), {1}, {2}", _film, Temperatures, Pattern.Regime);
}
