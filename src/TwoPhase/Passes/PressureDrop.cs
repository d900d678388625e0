using System.Globalization;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>What a pass costs in pressure, and for what.</summary>
public readonly record struct PressureDrop
{
    private readonly double _friction, _fittings, _gravity, _acceleration;

    internal PressureDrop(double friction, double fittings, double gravity, double acceleration) =>
        (_friction, _fittings, _gravity, _acceleration) = (friction, fittings, gravity, acceleration);

    /// <summary>Friction along the tubes.</summary>
    public Pressure Friction => Pressure.FromPascals(_friction);

    /// <summary>Bends, headers and the outlet line.</summary>
    public Pressure Fittings => Pressure.FromPascals(_fittings);

    /// <summary>Height gained; negative where the pass falls.</summary>
    public Pressure Gravity => Pressure.FromPascals(_gravity);

    /// <summary>Change of momentum, steps of the flow area included.</summary>
    public Pressure Acceleration => Pressure.FromPascals(_acceleration);

    /// <summary>Inlet minus outlet pressure.</summary>
    public Pressure Total => Pressure.FromPascals(_friction + _fittings + _gravity + _acceleration);

    internal object ToDump() => ToString();

    /// <summary>The parts in kPa, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "{0:F1} kPa = friction {1:F1} + fittings {2:F1} + gravity {3:F1} + acceleration {4:F1}",
        Total.Pascals / 1e3, _friction / 1e3, _fittings / 1e3, _gravity / 1e3, _acceleration / 1e3);
}
