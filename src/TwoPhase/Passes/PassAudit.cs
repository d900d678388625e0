using System.Globalization;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>The books of a steady solution: what came in, what went out, what is missing, and how fine the grid was.</summary>
public readonly record struct PassAudit
{
    private readonly double _flow, _heat, _carriedIn, _carriedOut;

    internal PassAudit(double flow, double heat, double carriedIn, double carriedOut, double massResidual, double gridError) =>
        (_flow, _heat, _carriedIn, _carriedOut, MassResidual, GridError) = (flow, heat, carriedIn, carriedOut, massResidual, gridError);

    /// <summary>Mass flow in, and out.</summary>
    public MassFlow MassFlow => MassFlow.FromKilogramsPerSecond(_flow);

    /// <summary>Heat taken up, integrated along the rows of the profile.</summary>
    public Power Heat => Power.FromWatts(_heat);

    /// <summary>Enthalpy flow in.</summary>
    public Power EnthalpyIn => Power.FromWatts(_carriedIn);

    /// <summary>Enthalpy flow out.</summary>
    public Power EnthalpyOut => Power.FromWatts(_carriedOut);

    /// <summary>(in + heat − out) over the largest of them; round-off.</summary>
    public double EnergyResidual => (_carriedIn + _heat - _carriedOut) / Math.Max(Math.Abs(_carriedOut), Math.Max(Math.Abs(_carriedIn), Math.Abs(_heat)));

    /// <summary>Largest difference between the flow of both phases together and the feed, at any row, over the feed; round-off.</summary>
    public double MassResidual { get; }

    /// <summary>Bound of the grid error, relative: of pressure to outlet pressure, or of mass held, the larger.</summary>
    public double GridError { get; }

    internal object ToDump() => ToString();

    /// <summary>The audit in a line, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "in {0:G6} MW + heat {1:G6} MW - out {2:G6} MW: energy residual {3:G2}, mass residual {4:G2}, grid error below {5:G2}",
        _carriedIn * 1e-6, _heat * 1e-6, _carriedOut * 1e-6, EnergyResidual, MassResidual, GridError);
}
