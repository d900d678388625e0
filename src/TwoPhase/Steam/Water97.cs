namespace TwoPhase.Steam;

/// <summary>Constants of the industrial formulation, R7-97(2012) section 3 and R2-83(1992).</summary>
internal static class Water97
{
    /// <summary>R, specific gas constant [J/(kg·K)].</summary>
    public const double GasConstant = 461.526;

    /// <summary>Tc, critical temperature [K].</summary>
    public const double CriticalTemperature = 647.096;

    /// <summary>pc, critical pressure [Pa].</summary>
    public const double CriticalPressure = 22.064e6;

    /// <summary>ρc, critical density [kg/m³].</summary>
    public const double CriticalDensity = 322;

    /// <summary>Lowest temperature of the formulation, 0 °C [K].</summary>
    public const double LowestTemperature = 273.15;

    /// <summary>Border of regions 1 and 3, and foot of the 2-3 border [K].</summary>
    public const double Border13Temperature = 623.15;

    /// <summary>Upper end of region 2, and lower end of region 5 [K].</summary>
    public const double Border25Temperature = 1073.15;

    /// <summary>Upper end of region 5 [K].</summary>
    public const double HighestTemperature = 2273.15;

    /// <summary>Where this library begins [Pa]; the formulation begins at zero, where v has no number.</summary>
    public const double LowestPressure = 1e-9;

    /// <summary>Highest pressure of regions 1 to 3 [Pa].</summary>
    public const double HighestPressure = 100e6;

    /// <summary>Highest pressure of region 5 [Pa].</summary>
    public const double HighestPressureOfRegion5 = 50e6;
}
