namespace TwoPhase.Steam;

/// <summary>An equilibrium state of water or steam with the derivatives that solvers need, raw SI.</summary>
/// <remarks><c>default</c>, region 0, means that the formulation has no such state.</remarks>
internal readonly record struct WaterCore
{
    /// <summary>A state of one phase.</summary>
    public WaterCore(int region, in PhaseCore phase)
    {
        Region = region;
        Phase = phase;
        Quality = double.NaN;
        VolumeByEnthalpy = phase.VolumeByEnthalpy;
        VolumeByPressure = phase.VolumeByPressure;
        TemperatureByEnthalpy = phase.TemperatureByEnthalpy;
        TemperatureByPressure = phase.TemperatureByPressure;
    }

    /// <summary>Wet steam: a quality between 0 and 1 on the saturation line.</summary>
    /// <remarks>
    /// Along the line all slopes use dTs/dp of the saturation-pressure equation, so that they are the derivatives of what this
    /// library returns; Clapeyron's (v″ − v′) Ts / (h″ − h′) differs from it by up to 1.6e-4 in IF97.
    /// </remarks>
    public WaterCore(in SaturationCore saturation, double quality)
    {
        PhaseCore liquid = saturation.Liquid, vapour = saturation.Vapour;
        Region = 4;
        Quality = quality;
        Phase = new()
        {
            Pressure = saturation.Pressure,
            Temperature = saturation.Temperature,
            SpecificVolume = Mix(liquid.SpecificVolume, vapour.SpecificVolume, quality),
            Enthalpy = Mix(liquid.Enthalpy, vapour.Enthalpy, quality),
            Entropy = Mix(liquid.Entropy, vapour.Entropy, quality),
            IsochoricHeatCapacity = double.NaN,
            PressureByTemperature = double.NaN,
            BulkModulus = double.NaN,
        };

        double slope = saturation.TemperatureByPressure;
        VolumeByEnthalpy = (vapour.SpecificVolume - liquid.SpecificVolume) / saturation.LatentHeat;
        double enthalpyByPressure = Mix(liquid.EnthalpyAlong(slope), vapour.EnthalpyAlong(slope), quality);
        VolumeByPressure = Mix(liquid.VolumeAlong(slope), vapour.VolumeAlong(slope), quality) - (enthalpyByPressure * VolumeByEnthalpy);
        TemperatureByEnthalpy = 0;
        TemperatureByPressure = slope;
    }

    /// <summary>Region of the formulation, 1 to 5; 4 is wet steam.</summary>
    public int Region { get; }

    /// <summary>p, T, v, h, s, and for one phase its second-order properties (NaN in wet steam).</summary>
    public PhaseCore Phase { get; }

    /// <summary>x [kg/kg] in wet steam, 0 to 1; NaN elsewhere.</summary>
    public double Quality { get; }

    /// <summary>(∂v/∂h)p [m³/J].</summary>
    public double VolumeByEnthalpy { get; }

    /// <summary>(∂v/∂p)h [m³/(kg·Pa)].</summary>
    public double VolumeByPressure { get; }

    /// <summary>(∂T/∂h)p [K·kg/J]; zero in wet steam.</summary>
    public double TemperatureByEnthalpy { get; }

    /// <summary>(∂T/∂p)h [K/Pa].</summary>
    public double TemperatureByPressure { get; }

    /// <summary>p [Pa].</summary>
    public double Pressure => Phase.Pressure;

    /// <summary>T [K].</summary>
    public double Temperature => Phase.Temperature;

    /// <summary>v [m³/kg].</summary>
    public double SpecificVolume => Phase.SpecificVolume;

    /// <summary>ρ [kg/m³].</summary>
    public double Density => Phase.Density;

    /// <summary>h [J/kg].</summary>
    public double Enthalpy => Phase.Enthalpy;

    /// <summary>s [J/(kg·K)].</summary>
    public double Entropy => Phase.Entropy;

    /// <summary>True in wet steam.</summary>
    public bool IsWet => Region == 4;

    /// <summary>What the state is.</summary>
    public SteamPhase SteamPhase => Region switch
    {
        0 => SteamPhase.None,
        4 => SteamPhase.Wet,
        _ when Pressure > Water97.CriticalPressure => Temperature > Water97.CriticalTemperature ? SteamPhase.Supercritical : SteamPhase.Liquid,
        1 => SteamPhase.Liquid,
        3 when Temperature < Water97.CriticalTemperature && Pressure > Region4.Pressure(Temperature) => SteamPhase.Liquid,
        _ => SteamPhase.Vapour,
    };

    // This form gives each end exactly.
    private static double Mix(double liquid, double vapour, double quality) => ((1 - quality) * liquid) + (quality * vapour);
}
