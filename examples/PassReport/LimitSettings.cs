using TwoPhase.Limits;
using TwoPhase.Metering;
using UnitsNet;

namespace PassReport;

/// <summary>What the site allows its passes: the "limits" member of the generator's file.</summary>
internal sealed class LimitSettings
{
    /// <summary>Greatest outlet quality [kg/kg]; left out, the library's default, which is then not confirmed.</summary>
    public double? OutletQuality { get; set; }

    /// <summary>Greatest temperature of the tube metal, outside [°C].</summary>
    public double? MetalCelsius { get; set; }

    /// <summary>Heat flux on the flame side of radiant tubes over the mean around them.</summary>
    public double FluxPeak { get; set; } = 1;

    /// <summary>C of the erosional velocity, as quoted for ft/s and lb/ft³.</summary>
    public double? ErosionFactor { get; set; }

    /// <summary>Span of the differential-pressure transmitters [kPa].</summary>
    public double? DifferentialSpan { get; set; }

    /// <summary>What is dissolved in the feed, and what the outlet water may hold.</summary>
    public IReadOnlyList<SolidsSettings> Solids { get; set; } = [];

    public SiteLimits ToLimits()
    {
        SiteLimits limits = SiteLimits.Default.WithFluxPeak(FluxPeak).WithSolids([.. Solids.Select(solids => solids.ToLimit())]);
        if (OutletQuality is { } quality) limits = limits.WithOutletQuality(MassFraction.FromDecimalFractions(quality));
        if (MetalCelsius is { } metal) limits = limits.WithMetalTemperature(Temperature.FromDegreesCelsius(metal));
        if (ErosionFactor is { } factor) limits = limits.WithErosionFactor(factor);
        return DifferentialSpan is { } span ? limits.WithTransmitter(new(Pressure.FromKilopascals(span), TransmitterCharacteristic.Linear)) : limits;
    }
}
