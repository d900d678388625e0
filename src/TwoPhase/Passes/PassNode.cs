using TwoPhase.Flow;

namespace TwoPhase.Passes;

/// <summary>One node of a pass as the solvers keep it, SI doubles.</summary>
internal record struct PassNode
{
    /// <summary>Index of the section.</summary>
    public int Duct { readonly get; set; }

    /// <summary>Distance from the inlet of the pass along the flow path [m].</summary>
    public double Position { readonly get; set; }

    /// <summary>Water-side volume of the pass up to here [m³].</summary>
    public double Volume { readonly get; set; }

    /// <summary>h of the flow [J/kg].</summary>
    public double Enthalpy { readonly get; init; }

    /// <summary>T [K].</summary>
    public double Temperature { readonly get; init; }

    /// <summary>xe [-], any value.</summary>
    public double EquilibriumQuality { readonly get; init; }

    /// <summary>α [-].</summary>
    public double VoidFraction { readonly get; init; }

    /// <summary>Heat per length, all parallel tubes, from fire and interchanger together [W/m].</summary>
    public double LinearHeat { readonly get; set; }

    /// <summary>Pressure lost to friction per length [Pa/m].</summary>
    public double Friction { readonly get; init; }

    /// <summary>Pressure lost in bends and fittings per length [Pa/m].</summary>
    public double Fittings { readonly get; init; }

    /// <summary>Pressure lost to height per length [Pa/m].</summary>
    public double Gravity { readonly get; init; }

    /// <summary>
    /// The flow here. Where one phase is absent the other's density and viscosity are its own, not the saturated ones.
    /// Conductivities and heat capacities are not carried along: no slip or friction model uses them.
    /// </summary>
    public FlowState Flow { readonly get; set; }

    public double Pressure
    {
        readonly get => Flow.Pressure;
        set => Flow = Flow with { Pressure = value };
    }

    public readonly double Density => (VoidFraction * Flow.VapourDensity) + ((1 - VoidFraction) * Flow.LiquidDensity);

    public readonly double Loss => Friction + Fittings + Gravity;

    /// <summary>v of both phases moving at one velocity [m³/kg].</summary>
    public readonly double HomogeneousVolume => (Flow.Quality / Flow.VapourDensity) + ((1 - Flow.Quality) / Flow.LiquidDensity);

    /// <summary>x²/(α ρg) + (1 − x)²/((1 − α) ρl): what G² times it is the momentum flux [m³/kg].</summary>
    public readonly double MomentumVolume
    {
        get
        {
            double x = Flow.Quality;
            double vapour = VoidFraction > 0 ? x * x / (VoidFraction * Flow.VapourDensity) : 0;
            double liquid = VoidFraction < 1 ? (1 - x) * (1 - x) / ((1 - VoidFraction) * Flow.LiquidDensity) : 0;
            return vapour + liquid;
        }
    }
}
