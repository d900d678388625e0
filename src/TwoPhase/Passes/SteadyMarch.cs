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
    // At least so many panels, so that the rows also make a smooth picture; fewer where none is drawn.
    private const int LeastPanels = 12, LeastUndrawnPanels = 4;

    private const int GreatestRows = 100_000;

    // Pressures stand when a sweep moves them by less, relative.
    private const double LeastSweepTolerance = 1e-10;

    // Regions of the steam formulation differ where they meet, so that there p + G² vM steps over what it should be.
    private const double StepTolerance = 1e-6;

    private readonly TFluid _fluid;
    private readonly Duct[] _ducts;
    private readonly PassModels _models;
    private readonly SteadyOptions _options;
    private double _tolerance, _sweepTolerance, _massScale, _massFlux, _momentumSum;
    private KnownNodes _known;
    private bool _isDrawn;
    private double _edge, _step;

    public SteadyMarch(in TFluid fluid, Duct[] ducts, PassModels models, SteadyOptions options, PassNode[] buffer)
    {
        _fluid = fluid;
        _ducts = Counted(ducts, options);
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

    /// <summary>Marches from the outlet to the inlet.</summary>
    /// <param name="outletEnthalpy">h at the end of the last section [J/kg].</param>
    /// <param name="tolerance">Bound of the grid error.</param>
    /// <param name="isDrawn">Whether its rows are wanted, and not only its inlet.</param>
    public void Run(double outletEnthalpy, double tolerance, bool isDrawn)
    {
        (_isDrawn, _step) = (isDrawn, double.PositiveInfinity);
        (Count, PressureError, MassError, _tolerance, _sweepTolerance) = (0, 0, 0, tolerance, Math.Max(LeastSweepTolerance, tolerance / 5));
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
        _edge = 0;
        Place(Count, index, duct.End, pressure, enthalpy, end, 0);
        if ((Trouble(Nodes[Count]) ?? (IsChoked(Momentum(Nodes[Count]), pressure) ? Choked : null)) is { } trouble) throw NoSolution(index, duct.End, trouble);
        (_momentumSum, _known) = (pressure + Momentum(Nodes[Count]), default);
        Count++;
        for (int k = corner.Length - 2; k >= 0; k--)
        {
            double begin = duct.LinearHeat(Heat, Exchanged, k), length = duct.Length * (corner[k + 1] - corner[k]);
            var piece = new Piece(index, duct.Start + (duct.Length * corner[k + 1]), length, enthalpy, end, begin, Flow * duct.FlowShare);
            Climb(piece);
            (enthalpy, end) = (piece.EnthalpyAt(length), begin);
        }
    }

    private void Climb(in Piece piece)
    {
        double done = 0, longest = TotalLength / (_isDrawn ? LeastPanels : LeastUndrawnPanels), shortest = longest * 1e-8;
        while (done < piece.Length)
        {
            double left = piece.Length - done;
            double length = left / Math.Ceiling((left / Math.Min(_step, longest)) - 1e-9);
            Attempt attempt = Try(piece, done, length, length > shortest ? _sweepTolerance : StepTolerance);
            if (attempt.Trouble is null && CrossingIn(attempt, piece) is { } crossing) attempt = Aim(piece, done, crossing, length);
            if (Count > GreatestRows) throw NoSolution(piece.Duct, piece.End - done, Endless);
            if (attempt.Trouble is not null && attempt.Length <= shortest) throw NoSolution(piece.Duct, piece.End - done, attempt.Trouble);

            double scale = attempt.Trouble is null ? Math.Min(4, Math.Max(0.2, 0.9 * Math.Pow(attempt.Quality, 0.2))) : 0.5;
            if (attempt.Trouble is not null || (attempt.Quality < 1 && attempt.Length > shortest))
            {
                _step = attempt.Length * Math.Min(scale, 0.9);
                continue;
            }

            _step = attempt.AtBoundary ? Math.Max(_step, attempt.Length) : attempt.Length * scale;
            done = attempt.Length >= left * (1 - 1e-12) ? piece.Length : done + attempt.Length;
            Accept(attempt);
        }
    }

    private void Accept(in Attempt attempt)
    {
        PressureError += attempt.PressureError;
        MassError += attempt.MassError;
        _momentumSum = attempt.MomentumSum;
        _known = attempt.AtBoundary ? default : _known with { Offset = Panel.Intervals };
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

    // What does not count is taken off the ducts.
    private static Duct[] Counted(Duct[] ducts, SteadyOptions options) => options.Friction && options.Gravity ? ducts : Array.ConvertAll(ducts, duct => duct with
    {
        FrictionMultiplier = options.Friction ? duct.FrictionMultiplier : 0,
        BendLoss = options.Friction ? duct.BendLoss : 0,
        OtherLoss = options.Friction ? duct.OtherLoss : 0,
        Rise = options.Gravity ? duct.Rise : 0,
    });

    private readonly double Momentum(in PassNode node) =>
        _options.Acceleration ? node.Flow.MassFlux * node.Flow.MassFlux * node.MomentumVolume : 0;

    private readonly void Place(int index, int duct, double position, double pressure, double enthalpy, double linearHeat, double near)
    {
        ref readonly Duct at = ref _ducts[duct];
        ref PassNode node = ref Nodes[index];
        node = LocalFlow.At(_fluid, _models.Slip, _models.Friction, at, _massFlux, pressure, enthalpy, near, _edge);
        node.Duct = duct;
        node.Position = position;
        node.Volume = at.VolumeBefore + (at.Area * (position - at.Start));
        node.LinearHeat = linearHeat;
    }
}
