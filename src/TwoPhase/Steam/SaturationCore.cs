namespace TwoPhase.Steam;

/// <summary>Both phases in equilibrium, raw SI.</summary>
internal readonly record struct SaturationCore
{
    /// <summary>p [Pa].</summary>
    public double Pressure => Liquid.Pressure;

    /// <summary>Ts [K].</summary>
    public double Temperature => Liquid.Temperature;

    /// <summary>Saturated liquid (′).</summary>
    public PhaseCore Liquid { get; init; }

    /// <summary>Saturated vapour (″).</summary>
    public PhaseCore Vapour { get; init; }

    /// <summary>h″ − h′ [J/kg].</summary>
    public double LatentHeat => Vapour.Enthalpy - Liquid.Enthalpy;

    /// <summary>dTs/dp [K/Pa] of the saturation-pressure equation.</summary>
    public double TemperatureByPressure => Region4.TemperatureByPressure(Pressure, Temperature);

    /// <summary>(h − h′) / (h″ − h′): 0 to 1 in wet steam, outside it how far away.</summary>
    public double EquilibriumQuality(double enthalpy) => (enthalpy - Liquid.Enthalpy) / LatentHeat;
}
