namespace TwoPhase.Passes;

/// <summary>One section as the solvers see it: SI doubles, everything per length that can be.</summary>
internal readonly struct Duct
{
    public string Name { get; init; }

    /// <summary>Distance of its inlet from the inlet of the pass [m].</summary>
    public double Start { get; init; }

    /// <summary>Length of one flow path [m].</summary>
    public double Length { get; init; }

    public double End => Start + Length;

    /// <summary>Water-side volume of the pass before it [m³].</summary>
    public double VolumeBefore { get; init; }

    public double VolumeAfter => VolumeBefore + (Area * Length);

    /// <summary>Bore, scale deducted [m].</summary>
    public double Bore { get; init; }

    /// <summary>Flow area of all parallel tubes [m²].</summary>
    public double Area { get; init; }

    /// <summary>Inside perimeter of all parallel tubes [m].</summary>
    public double Perimeter { get; init; }

    /// <summary>Share of the feed that runs through it: below 1 only where an interchanger has a by-pass.</summary>
    public double FlowShare { get; init; }

    /// <summary>ε [m].</summary>
    public double Roughness { get; init; }

    /// <summary>Factor on friction: ribs, and 0 where a loss coefficient stands for all of it.</summary>
    public double FrictionMultiplier { get; init; }

    /// <summary>K of return bends per length [1/m].</summary>
    public double BendLoss { get; init; }

    /// <summary>Chisholm's B of one return bend [-].</summary>
    public double BendB { get; init; }

    /// <summary>K of everything else per length [1/m].</summary>
    public double OtherLoss { get; init; }

    /// <summary>Height gained per length [-].</summary>
    public double Rise { get; init; }

    /// <summary>Inclination of the tubes [rad].</summary>
    public double Inclination { get; init; }

    /// <summary>Share of the fired heat [-].</summary>
    public double HeatShare { get; init; }

    /// <summary>+1 on the cold side of the interchanger, −1 on its hot side, 0 elsewhere.</summary>
    public double ExchangeSign { get; init; }

    public FluxCurve Flux { get; init; }

    /// <summary>Tube metal with fins [J/(K·m)].</summary>
    public double MetalCapacity { get; init; }

    /// <summary>Heat taken up [W], of what the fire gives the pass and the interchanger moves.</summary>
    public double HeatOf(double fired, double exchanged) => (HeatShare * fired) + (ExchangeSign * exchanged);

    /// <summary>Heat per length [W/m] at a corner of the flux.</summary>
    public double LinearHeat(double fired, double exchanged, int corner) =>
        ((HeatShare * fired * Flux.Flux[corner]) + (ExchangeSign * exchanged)) / Length;
}
