using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>First-order damping of a transmitter: what its output shows of a differential that moves. One thread each.</summary>
/// <remarks>
/// <para>τ dy/dt = Δp − y, so y moves by (Δp − y)·(1 − exp(−t/τ)) in a step t with Δp held.</para>
/// <para>Range: any step; exact for a differential that is constant during it.</para>
/// <para>Accuracy: exact.</para>
/// <para>Source: solution of the linear equation. Two signals with unlike τ give a spike in quality after a step of flow.</para>
/// </remarks>
public sealed class TransmitterDamping
{
    private readonly double _timeConstant;
    private double _output = double.NaN;

    /// <summary>A damping that settles to the first differential it is given.</summary>
    /// <param name="timeConstant">τ, time to 63 % of a step; not negative, 0 for none.</param>
    public TransmitterDamping(Duration timeConstant) =>
        _timeConstant = Require.NotNegative(timeConstant.Si(), "Time constant", Scale.Seconds, nameof(timeConstant));

    /// <summary>τ.</summary>
    public Duration TimeConstant => Duration.FromSeconds(_timeConstant);

    /// <summary>What the transmitter shows after a step.</summary>
    /// <param name="differential">Δp during the step.</param>
    /// <param name="step">Length of the step, not negative.</param>
    /// <exception cref="ArgumentOutOfRangeException">The step is negative, or a value is not finite.</exception>
    public Pressure Advance(Pressure differential, Duration step)
    {
        double input = Require.Finite(differential.Si(), "Differential pressure", Scale.Kilopascals, nameof(differential));
        double time = Require.NotNegative(step.Si(), "Step", Scale.Seconds, nameof(step));
        _output = double.IsNaN(_output) || _timeConstant == 0 ? input : input + ((_output - input) * Math.Exp(-time / _timeConstant));
        return Pressure.FromPascals(_output);
    }
}
