using TwoPhase.Numerics;
using TwoPhase.Passes;

namespace TwoPhase.Stability;

/// <summary>The pressure drop of one pass and its slope at any flow, heat and feed held; SI doubles.</summary>
internal readonly struct PassDrop<TFluid>
    where TFluid : struct, IPassFluid
{
    // Step of the central difference, relative; and a grid fine enough for it.
    private const double Step = 1e-3, Tolerance = 1e-9;

    private readonly TFluid _fluid;
    private readonly Pass _pass;
    private readonly PassConditions _conditions;
    private readonly PassModels? _models;
    private readonly SteadyOptions _options;

    public PassDrop(in TFluid fluid, Pass pass, in PassConditions conditions, PassModels? models, SteadyOptions? options)
    {
        _fluid = fluid;
        _pass = pass;
        _conditions = conditions;
        _models = models;
        SteadyOptions given = options ?? SteadyOptions.Default;
        _options = given.WithTolerance(Math.Min(given.Tolerance, Tolerance));
    }

    public PassProfile Solve(double flow) =>
        SteadyState.Solve(_fluid, _pass, _conditions with { RawFeedFlow = flow }, SteadyTarget.Profile, 0, _models, _options);

    public CharacteristicPoint At(double flow)
    {
        PassProfile profile = Solve(flow);
        return new(flow, Drop(profile), (Drop(Solve(flow * (1 + Step))) - Drop(Solve(flow * (1 - Step)))) / (2 * Step * flow), profile.Nodes[^1].EquilibriumQuality);
    }

    /// <summary>The point, or why there is none.</summary>
    public string? TryAt(double flow, out CharacteristicPoint point)
    {
        try
        {
            point = At(flow);
            return null;
        }
        catch (Exception error) when (error is ArgumentException or ConvergenceException)
        {
            point = default;
            return error.Message;
        }
    }

    /// <summary>The flow between two points at which the drop is level.</summary>
    public double Level(in CharacteristicPoint below, in CharacteristicPoint above) =>
        BracketedRoot.TryFind(new Slope(this), below.RawFlow, below.RawSlope, above.RawFlow, above.RawSlope, 1e-7 * above.RawFlow).X;

    private static double Drop(PassProfile profile) => profile.Nodes[0].Pressure - profile.Nodes[^1].Pressure;

    private readonly struct Slope(PassDrop<TFluid> drop) : IScalarFunction
    {
        public double Value(double x) => drop.TryAt(x, out CharacteristicPoint point) is null ? point.RawSlope : double.NaN;
    }
}
