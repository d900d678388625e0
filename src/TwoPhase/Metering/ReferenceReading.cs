using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>One reading of a meter beside the quality that a separator or a laboratory found at the same time, in steady state.</summary>
public readonly record struct ReferenceReading
{
    private readonly double _flow, _pressure, _differential, _quality, _uncertainty;

    /// <summary>A reading and its reference quality.</summary>
    /// <param name="flow">ṁ, total mass flow, greater than zero.</param>
    /// <param name="pressure">p, absolute pressure at the meter, greater than zero.</param>
    /// <param name="differential">Δp, greater than zero and below the pressure.</param>
    /// <param name="quality">x by the reference, 0 to 1.</param>
    /// <param name="standardUncertainty">u(x) of the reference, k = 1, greater than zero; only its size against that of the other readings matters.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public ReferenceReading(MassFlow flow, Pressure pressure, Pressure differential, MassFraction quality, MassFraction standardUncertainty)
    {
        _flow = Require.Positive(flow.Si(), "Mass flow", Scale.KilogramsPerSecond, nameof(flow));
        (_pressure, _differential) = MeterArguments.Pressures(pressure, differential);
        _quality = Require.Within(quality.Si(), 0, 1, "Reference quality", Scale.None, nameof(quality));
        _uncertainty = Require.Positive(standardUncertainty.Si(), "Uncertainty of the reference quality", Scale.None, nameof(standardUncertainty));
    }

    /// <summary>A reading and its reference quality, as good as the other references.</summary>
    /// <param name="flow">ṁ, total mass flow, greater than zero.</param>
    /// <param name="pressure">p, absolute pressure at the meter, greater than zero.</param>
    /// <param name="differential">Δp, greater than zero and below the pressure.</param>
    /// <param name="quality">x by the reference, 0 to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public ReferenceReading(MassFlow flow, Pressure pressure, Pressure differential, MassFraction quality)
        : this(flow, pressure, differential, quality, MassFraction.FromDecimalFractions(0.01))
    {
    }

    /// <summary>ṁ.</summary>
    public MassFlow Flow => MassFlow.FromKilogramsPerSecond(_flow);

    /// <summary>p.</summary>
    public Pressure Pressure => Pressure.FromPascals(_pressure);

    /// <summary>Δp.</summary>
    public Pressure Differential => Pressure.FromPascals(_differential);

    /// <summary>x by the reference.</summary>
    public MassFraction Quality => MassFraction.FromDecimalFractions(_quality);

    /// <summary>u(x) of the reference, k = 1.</summary>
    public MassFraction StandardUncertainty => MassFraction.FromDecimalFractions(_uncertainty);

    internal double FlowCore => _flow;

    internal double DifferentialCore => _differential;

    internal double QualityCore => _quality;

    internal double Weight => 1 / (_uncertainty * _uncertainty);

    internal object ToDump() => ToString();

    /// <summary>The reading in one line.</summary>
    public override string ToString() =>
        $"flow {Scale.KilogramsPerSecond.Text(_flow)}, pressure {Scale.Megapascals.Text(_pressure)}, differential {Scale.Kilopascals.Text(_differential)}, reference quality {Scale.None.Text(_quality)}";
}
