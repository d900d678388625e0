using TwoPhase.Numerics;

namespace TwoPhase.Steam;

/// <summary>One phase at one state, raw SI: what every region's fundamental equation yields, in one form for all.</summary>
/// <remarks>
/// Beside p, T, v, h and s it keeps cv, (∂p/∂T)v and −v (∂p/∂v)T: these three stay finite up to the critical point, and every
/// other second-order property follows from them without cancellation.
/// </remarks>
internal readonly record struct PhaseCore
{
    /// <summary>p [Pa].</summary>
    public double Pressure { get; init; }

    /// <summary>T [K].</summary>
    public double Temperature { get; init; }

    /// <summary>v [m³/kg].</summary>
    public double SpecificVolume { get; init; }

    /// <summary>h [J/kg].</summary>
    public double Enthalpy { get; init; }

    /// <summary>s [J/(kg·K)].</summary>
    public double Entropy { get; init; }

    /// <summary>cv [J/(kg·K)].</summary>
    public double IsochoricHeatCapacity { get; init; }

    /// <summary>(∂p/∂T)v [Pa/K].</summary>
    public double PressureByTemperature { get; init; }

    /// <summary>Isothermal bulk modulus −v (∂p/∂v)T [Pa]; zero at the critical point.</summary>
    public double BulkModulus { get; init; }

    /// <summary>ρ [kg/m³].</summary>
    public double Density => 1 / SpecificVolume;

    /// <summary>u = h − p v [J/kg].</summary>
    public double InternalEnergy => Enthalpy - (Pressure * SpecificVolume);

    /// <summary>cp [J/(kg·K)].</summary>
    public double IsobaricHeatCapacity => Stiffness / BulkModulus;

    /// <summary>w, speed of sound [m/s].</summary>
    public double SpeedOfSound => Fast.Sqrt(SpecificVolume * Stiffness / IsochoricHeatCapacity);

    /// <summary>κ = −v/p (∂p/∂v)s = w² / (p v) [-].</summary>
    public double IsentropicExponent => Stiffness / (IsochoricHeatCapacity * Pressure);

    /// <summary>(∂v/∂T)p [m³/(kg·K)].</summary>
    public double VolumeByTemperature => SpecificVolume * PressureByTemperature / BulkModulus;

    /// <summary>(∂v/∂p)T [m³/(kg·Pa)].</summary>
    public double VolumeByPressureAtTemperature => -SpecificVolume / BulkModulus;

    /// <summary>(∂h/∂p)T [J/(kg·Pa)].</summary>
    public double EnthalpyByPressureAtTemperature => SpecificVolume - (Temperature * VolumeByTemperature);

    /// <summary>(∂v/∂h)p [m³/J].</summary>
    public double VolumeByEnthalpy => SpecificVolume * PressureByTemperature / Stiffness;

    /// <summary>(∂v/∂p)h [m³/(kg·Pa)].</summary>
    public double VolumeByPressure => -SpecificVolume * (IsochoricHeatCapacity + (SpecificVolume * PressureByTemperature)) / Stiffness;

    /// <summary>(∂T/∂h)p [K·kg/J].</summary>
    public double TemperatureByEnthalpy => BulkModulus / Stiffness;

    /// <summary>(∂T/∂p)h [K/Pa], the Joule-Thomson coefficient.</summary>
    public double TemperatureByPressure => SpecificVolume * ((Temperature * PressureByTemperature) - BulkModulus) / Stiffness;

    /// <summary>dh/dp along a line of slope dT/dp, such as the saturation line [J/(kg·Pa)].</summary>
    public double EnthalpyAlong(double temperatureByPressure) => EnthalpyByPressureAtTemperature + (IsobaricHeatCapacity * temperatureByPressure);

    /// <summary>dv/dp along a line of slope dT/dp, such as the saturation line [m³/(kg·Pa)].</summary>
    public double VolumeAlong(double temperatureByPressure) => VolumeByPressureAtTemperature + (VolumeByTemperature * temperatureByPressure);

    // cp times the bulk modulus = cv times the isentropic one.
    private double Stiffness =>
        (BulkModulus * IsochoricHeatCapacity) + (Temperature * SpecificVolume * PressureByTemperature * PressureByTemperature);

    /// <summary>From a reduced Gibbs energy γ(π,τ) = g/(RT) and its logarithmic derivatives, for example <paramref name="pt"/> = πτ γπτ.</summary>
    public static PhaseCore FromGibbs(double pressure, double temperature, double g, double p, double pp, double t, double tt, double pt)
    {
        const double gasConstant = Water97.GasConstant;
        double thermal = gasConstant * temperature, expansion = p - pt, inverse = 1 / pp;
        return new()
        {
            Pressure = pressure,
            Temperature = temperature,
            SpecificVolume = thermal * p / pressure,
            Enthalpy = thermal * t,
            Entropy = gasConstant * (t - g),
            IsochoricHeatCapacity = gasConstant * ((expansion * expansion * inverse) - tt),
            PressureByTemperature = -pressure * expansion * inverse / temperature,
            BulkModulus = -pressure * p * inverse,
        };
    }

    /// <summary>From a reduced Helmholtz energy φ(δ,τ) = f/(RT) and its logarithmic derivatives, for example <paramref name="dt"/> = δτ φδτ.</summary>
    public static PhaseCore FromHelmholtz(double density, double temperature, double f, double d, double dd, double t, double tt, double dt)
    {
        const double gasConstant = Water97.GasConstant;
        double thermal = gasConstant * temperature;
        return new()
        {
            Pressure = density * thermal * d,
            Temperature = temperature,
            SpecificVolume = 1 / density,
            Enthalpy = thermal * (t + d),
            Entropy = gasConstant * (t - f),
            IsochoricHeatCapacity = -gasConstant * tt,
            PressureByTemperature = density * gasConstant * (d - dt),
            BulkModulus = AboveRoundOff(density * thermal * ((2 * d) + dd)),
        };
    }

    // At the critical point the bulk modulus is zero, and its sum is what round-off leaves of terms of 1e8 Pa, of either sign.
    private static double AboveRoundOff(double bulkModulus)
    {
        const double roundOff = 1e-2;
        return Math.Abs(bulkModulus) < roundOff ? roundOff : bulkModulus;
    }
}
