using TwoPhase.Units;

namespace TwoPhase.Passes;

/// <summary>One march up a pass, from its outlet pressure to its inlet, with the enthalpy along it known.</summary>
/// <remarks>
/// <para>Momentum, per length against the flow: d(p + G² vM)/ds = friction + fittings + ρ g sin θ, with vM the momentum volume.</para>
/// <para>Panels of five nodes: the loss is integrated through all five (Newton-Cotes collocation), iterated until the pressures
/// stand; each node is also a row of the result. A panel ends where a section, a corner of the heat flux or a phase ends, so
/// that the integrand is smooth inside; its length follows from the distance between Boole's and Simpson's rule.</para>
/// <para>Across a step of the flow area p + ½ G² v is kept; losses there are the given coefficients.</para>
/// </remarks>
internal partial struct SteadyMarch<TFluid>
    where TFluid : struct, IPassFluid
{
    // At least so many panels, so that the rows also make a smooth picture.
    private const int LeastPanels = 12;

    private readonly TFluid _fluid;
    private readonly Duct[] _ducts;
    private readonly PassModels _models;
    private readonly SteadyOptions _options;
    private double _tolerance, _massScale, _massFlux, _momentumSum, _spacing;

    public SteadyMarch(in TFluid fluid, Duct[] ducts, PassModels models, SteadyOptions options, PassNode[] buffer)
    {
        _fluid = fluid;
        _ducts = ducts;
        _models = models;
        _options = options;
        Nodes = buffer;
    }

    /// <summary>The nodes, from outlet to inlet; grows as needed.</summary>
    public PassNode[] Nodes { get; private set; }

    public int Count { get; private set; }

    /// <summary>Bound of the grid error of pressure, summed over panels [Pa].</summary>
    public double PressureError { get; private set; }

    /// <summary>Bound of the grid error of the mass held, summed over panels [kg].</summary>
    public double MassError { get; private set; }

    /// <summary>Feed flow [kg/s].</summary>
    public double Flow { get; set; }

    /// <summary>Heat from the fire [W].</summary>
    public double Heat { get; set; }

    /// <summary>Heat that the interchanger moves [W].</summary>
    public double Exchanged { get; set; }

    /// <summary>p at the end of the last section [Pa].</summary>
    public double OutletPressure { get; set; }

    public readonly ref readonly PassNode Last => ref Nodes[Count - 1];

    private readonly double TotalLength => _ducts[^1].End;

    public void Run(double outletEnthalpy, double tolerance)
    {
        (Count, PressureError, MassError, _tolerance) = (0, 0, 0, tolerance);
        _massScale = _ducts[^1].VolumeAfter / (4 * _fluid.Saturated(OutletPressure).LiquidVolume);
        double pressure = OutletPressure, mixed = outletEnthalpy, massFluxBehind = double.NaN;
        for (int i = _ducts.Length - 1; i >= 0; i--)
        {
            ref readonly Duct duct = ref _ducts[i];
            double through = Flow * duct.FlowShare, heat = duct.HeatOf(Heat, Exchanged), inlet = mixed - (heat / Flow);
            _massFlux = through / duct.Area;
            if (_options.Acceleration && i < _ducts.Length - 1 && massFluxBehind != _massFlux)
            {
                pressure += ((massFluxBehind * massFluxBehind) - (_massFlux * _massFlux)) / 2 * Last.HomogeneousVolume;
            }

            Enter(i, pressure, inlet + (heat / through));
            (pressure, mixed, massFluxBehind) = (Last.Pressure, inlet, _massFlux);
        }
    }

    /// <summary>One section, from its outlet up: piece by piece between the corners of the heat flux.</summary>
    private void Enter(int index, double pressure, double enthalpy)
    {
        ref readonly Duct duct = ref _ducts[index];
        double[] corner = duct.Flux.Position;
        double end = duct.LinearHeat(Heat, Exchanged, corner.Length - 1);
        Reserve();
        Nodes[Count] = At(index, duct.End, pressure, enthalpy, end);
        if (Trouble(Nodes[Count]) is { } trouble) throw NoSolution(index, duct.End, trouble);
        (_momentumSum, _spacing) = (pressure + Momentum(Nodes[Count]), 0);
        Count++;
        double step = double.PositiveInfinity;
        for (int k = corner.Length - 2; k >= 0; k--)
        {
            double begin = duct.LinearHeat(Heat, Exchanged, k), length = duct.Length * (corner[k + 1] - corner[k]);
            var piece = new Piece(index, duct.Start + (duct.Length * corner[k + 1]), length, enthalpy, end, begin, Flow * duct.FlowShare);
            Climb(piece, ref step);
            (enthalpy, end) = (piece.EnthalpyAt(length), begin);
        }
    }

    private void Climb(in Piece piece, ref double step)
    {
        double done = 0, longest = TotalLength / LeastPanels, shortest = longest * 1e-8;
        while (done < piece.Length)
        {
            double left = piece.Length - done;
            double length = left / Math.Ceiling((left / Math.Min(step, longest)) - 1e-9);
            Attempt attempt = Try(piece, done, length);
            if (attempt.Trouble is null && CrossingIn(attempt, piece) is { } crossing) attempt = Aim(piece, done, crossing, attempt);
            if (attempt.Trouble is not null && attempt.Length <= shortest) throw NoSolution(piece.Duct, piece.End - done, attempt.Trouble);

            double scale = attempt.Trouble is null ? Math.Min(4, Math.Max(0.2, 0.9 * Math.Pow(attempt.Quality, 0.2))) : 0.5;
            if (attempt.Trouble is not null || (attempt.Quality < 1 && attempt.Length > shortest))
            {
                step = attempt.Length * Math.Min(scale, 0.9);
                continue;
            }

            step = attempt.AtBoundary ? Math.Max(step, attempt.Length) : attempt.Length * scale;
            done = attempt.Length >= left * (1 - 1e-12) ? piece.Length : done + attempt.Length;
            Accept(attempt);
        }
    }

    private void Accept(in Attempt attempt)
    {
        ref readonly PassNode end = ref Nodes[Count - 1 + Panel.Intervals];
        PressureError += attempt.PressureError;
        MassError += attempt.MassError;
        _momentumSum = attempt.MomentumSum;
        _spacing = attempt.AtBoundary ? 0 : attempt.Length / Panel.Intervals;
        Count += Panel.Intervals;
    }

    private void Reserve()
    {
        if (Count + Panel.Intervals + 1 > Nodes.Length)
        {
            PassNode[] nodes = Nodes;
            Array.Resize(ref nodes, 2 * nodes.Length);
            Nodes = nodes;
        }
    }

    private readonly double Momentum(in PassNode node) =>
        _options.Acceleration ? node.Flow.MassFlux * node.Flow.MassFlux * node.MomentumVolume : 0;

    private readonly PassNode At(int index, double position, double pressure, double enthalpy, double linearHeat)
    {
        ref readonly Duct duct = ref _ducts[index];
        PassNode node = LocalFlow.At(_fluid, _models.Slip, _models.Friction, duct, _massFlux, pressure, enthalpy);
        return node with
        {
            Duct = index,
            Position = position,
            Volume = duct.VolumeBefore + (duct.Area * (position - duct.Start)),
            LinearHeat = linearHeat,
            Friction = _options.Friction ? node.Friction : 0,
            Fittings = _options.Friction ? node.Fittings : 0,
            Gravity = _options.Gravity ? node.Gravity : 0,
        };
    }
}
