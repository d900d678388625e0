namespace TwoPhase.Metering;

/// <summary>
/// Wet steam at a differential-pressure meter, in raw coherent SI units: what a wet-steam model works on. One of the two raw
/// types of the library that are public, so that a model of your own runs in the same loops as the built-in ones.
/// </summary>
/// <remarks>
/// <para>Built by <see cref="QualityMeter"/> for each reading; both phases are saturated at <see cref="Pressure"/>.</para>
/// <para>The values are trusted: whoever builds a state checks them at the public door. What a meter does not have is NaN:
/// a meter given by its constant alone has no diameters.</para>
/// </remarks>
public readonly record struct MeterState
{
    /// <summary>p, absolute static pressure at the upstream tapping [Pa].</summary>
    public double Pressure { get; init; }

    /// <summary>Δp, differential pressure between the tappings [Pa].</summary>
    public double Differential { get; init; }

    /// <summary>ρl, density of the saturated liquid [kg/m³].</summary>
    public double LiquidDensity { get; init; }

    /// <summary>ρg, density of the saturated vapour [kg/m³].</summary>
    public double VapourDensity { get; init; }

    /// <summary>κ, isentropic exponent of the saturated vapour, w²/(p v) with w speed of sound and v specific volume [-]. Never cp/cv, which is 2.3 at 10 MPa where κ is 1.24.</summary>
    public double IsentropicExponent { get; init; }

    /// <summary>μl, dynamic viscosity of the saturated liquid [Pa·s]; NaN over a meter without geometry when the model does not ask for transport properties.</summary>
    public double LiquidViscosity { get; init; }

    /// <summary>μg, dynamic viscosity of the saturated vapour [Pa·s]; NaN as for <see cref="LiquidViscosity"/>.</summary>
    public double VapourViscosity { get; init; }

    /// <summary>σ, surface tension [N/m]; NaN as for <see cref="LiquidViscosity"/>.</summary>
    public double SurfaceTension { get; init; }

    /// <summary>ṁ, total mass flow, liquid and vapour together [kg/s].</summary>
    public double TotalMassFlow { get; init; }

    /// <summary>D, bore of the pipe at the meter, at working temperature [m]; NaN for a meter without geometry.</summary>
    public double PipeDiameter { get; init; }

    /// <summary>d, diameter of throat or orifice, at working temperature [m]; NaN for a meter without geometry.</summary>
    public double ThroatDiameter { get; init; }

    /// <summary>β = d/D, diameter ratio [-]; NaN for a meter without geometry.</summary>
    public double DiameterRatio { get; init; }

    /// <summary>C, discharge coefficient of the meter in single-phase flow [-]; 1 for a meter given by its constant.</summary>
    public double DischargeCoefficient { get; init; }

    /// <summary>ε, expansibility factor at this differential [-]; 1 for a meter given by its constant.</summary>
    public double Expansibility { get; init; }
}
