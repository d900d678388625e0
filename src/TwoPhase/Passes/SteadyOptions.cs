namespace TwoPhase.Passes;

/// <summary>What the steady solver takes into account, and how finely. Immutable.</summary>
public sealed class SteadyOptions
{
    /// <summary>Everything on, bound of the grid error 1e-8.</summary>
    public static SteadyOptions Default { get; } = new();

    /// <summary>Whether friction counts, that of bends and fittings included.</summary>
    public bool Friction { get; private set; } = true;

    /// <summary>Whether the weight of the water counts.</summary>
    public bool Gravity { get; private set; } = true;

    /// <summary>Whether the change of momentum counts.</summary>
    public bool Acceleration { get; private set; } = true;

    /// <summary>Bound of the grid error of pressure and of mass held, relative; see <see cref="PassAudit.GridError"/>.</summary>
    public double Tolerance { get; private set; } = 1e-8;

    /// <summary>Without friction.</summary>
    public SteadyOptions WithoutFriction() => Changed(options => options.Friction = false);

    /// <summary>Without gravity.</summary>
    public SteadyOptions WithoutGravity() => Changed(options => options.Gravity = false);

    /// <summary>Without acceleration.</summary>
    public SteadyOptions WithoutAcceleration() => Changed(options => options.Acceleration = false);

    /// <summary>With another bound of the grid error.</summary>
    /// <param name="tolerance">Relative, 1e-12 to 1e-3.</param>
    /// <exception cref="ArgumentOutOfRangeException">The bound is outside its limits.</exception>
    public SteadyOptions WithTolerance(double tolerance)
    {
        Units.Require.Within(tolerance, 1e-12, 1e-3, "Tolerance", Units.Scale.None, nameof(tolerance));
        return Changed(options => options.Tolerance = tolerance);
    }

    private SteadyOptions Changed(Action<SteadyOptions> change)
    {
        var copy = (SteadyOptions)MemberwiseClone();
        change(copy);
        return copy;
    }
}
