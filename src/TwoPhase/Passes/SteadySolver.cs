using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Passes;

/// <summary>
/// Marches until the inlet agrees with what is imposed there: a feed given by its temperature has an enthalpy that depends,
/// slightly, on the inlet pressure; an interchanger moves heat that depends on the temperatures at both its sides.
/// </summary>
internal ref struct SteadySolver<TFluid>
    where TFluid : struct, IPassFluid
{
    private const int GreatestRounds = 60;
    private const double InletTolerance = 1e-9;

    // The inlet is found on coarse grids; so near that one march on the fine grid meets it.
    private const double RoughTolerance = 1e-2, RoughMiss = 1e-3, CoarseTolerance = 1e-6, CoarseMiss = 1e-5;

    private readonly TFluid _fluid;
    private readonly Pass _pass;
    private readonly PassConditions _given;
    private readonly PassModels _models;
    private readonly SteadyOptions _options;
    private SteadyMarch<TFluid> _march;

    public SteadySolver(in TFluid fluid, Pass pass, in PassConditions given, PassModels models, SteadyOptions options)
    {
        _fluid = fluid;
        _pass = pass;
        _given = given;
        _models = models;
        _options = options;
        Check();
        _march = new(fluid, pass.Ducts, models, options, SteadyScratch.Nodes) { OutletPressure = given.RawOutletPressure };
    }

    public PassProfile Solve(SteadyTarget target, double outletQuality)
    {
        SaturatedPair outlet = _fluid.Saturated(_given.RawOutletPressure);
        double wanted = outlet.LiquidEnthalpy + (outletQuality * outlet.LatentHeat);
        bool direct = _given.IsFeedByEnthalpy && _pass.Interchanger is null;
        var feed = new Secant(FeedEnthalpy(_given.RawOutletPressure));
        var exchange = new Secant(0);
        Grid grid = direct ? Grid.Fine : Grid.Rough;
        for (int round = 0; round < GreatestRounds; round++)
        {
            double leaving = Aim(target, feed.Value, wanted);
            _march.Exchanged = exchange.Value;
            _march.Run(leaving, Math.Max(_options.Tolerance, Tolerance(grid)), grid == Grid.Fine);
            double feedMiss = direct ? 0 : FeedEnthalpy(_march.Last.Pressure) - feed.Value;
            double exchangeMiss = _pass.Interchanger is { } exchanger ? InterchangerHeat(exchanger) - exchange.Value : 0;
            double scale = Math.Max(Math.Abs(leaving - feed.Value), outlet.LatentHeat / 10);
            double miss = Math.Max(Math.Abs(feedMiss), Math.Abs(exchangeMiss) / _march.Flow) / scale;
            if (grid == Grid.Fine && miss <= InletTolerance) return Profile();
            bool near = grid == Grid.Rough ? miss < RoughMiss : grid == Grid.Coarse && miss < CoarseMiss;
            if (near)
            {
                // Another grid has another error, which would spoil the secant.
                (grid, feed, exchange) = (grid + 1, new(feed.Value + feedMiss), new(exchange.Value + exchangeMiss));
                continue;
            }

            feed.Improve(feedMiss);
            exchange.Improve(exchangeMiss);
        }

        throw new ConvergenceException($"The inlet state of pass '{_pass.Name}' did not settle within {GreatestRounds} rounds; last inlet {Scale.Megapascals.Text(_march.Last.Pressure)}, {Scale.KilojoulesPerKilogram.Text(feed.Value)}.");
    }

    private static double Tolerance(Grid grid) => grid switch { Grid.Rough => RoughTolerance, Grid.Coarse => CoarseTolerance, _ => 0 };

    /// <summary>Sets flow and heat of the march and returns the outlet enthalpy.</summary>
    private double Aim(SteadyTarget target, double feed, double wanted)
    {
        (_march.Flow, _march.Heat) = (_given.RawFeedFlow, _given.RawAbsorbedHeat);
        if (target == SteadyTarget.Profile) return Leaving(feed + (_march.Heat / _march.Flow));
        if (!(wanted > feed)) throw Require.OutOfRange(wanted, $"Wanted outlet enthalpy of pass '{_pass.Name}'", Scale.KilojoulesPerKilogram, "outletQuality", $"must exceed that of the feed, {Scale.KilojoulesPerKilogram.Text(feed)}");
        if (target == SteadyTarget.Flow && !(_march.Heat > 0)) throw Require.OutOfRange(_march.Heat, "Absorbed heat", Scale.Megawatts, "conditions", "must be greater than zero to find a flow");
        if (target == SteadyTarget.Heat) _march.Heat = _march.Flow * (wanted - feed);
        else _march.Flow = _march.Heat / (wanted - feed);
        return Leaving(wanted);
    }

    private readonly double Leaving(double enthalpy)
    {
        if (_fluid.At(_given.RawOutletPressure, enthalpy, _fluid.Saturated(_given.RawOutletPressure)).Temperature > 0) return enthalpy;
        throw Require.OutOfRange(_march.Heat, "Absorbed heat", Scale.Megawatts, "conditions", $"brings the outlet of section '{_pass.Ducts[^1].Name}' to {Scale.KilojoulesPerKilogram.Text(enthalpy)}, outside the steam formulation");
    }

    private readonly double FeedEnthalpy(double pressure) =>
        _given.IsFeedByEnthalpy ? _given.RawFeedEnthalpy : _fluid.LiquidEnthalpy(pressure, _given.RawFeedTemperature);

    private readonly double InterchangerHeat(FeedInterchanger exchanger)
    {
        (PassNode coldIn, PassNode coldOut) = Ends(exchanger.ColdSection);
        (PassNode hotIn, PassNode hotOut) = Ends(exchanger.HotSection);
        if (exchanger.Effectiveness > 0)
        {
            double most = _fluid.LiquidEnthalpy(coldIn.Pressure, hotIn.Temperature) - coldIn.Enthalpy;
            return exchanger.Effectiveness * _march.Flow * (1 - exchanger.RawBypass) * most;
        }

        double first = hotIn.Temperature - coldOut.Temperature, second = hotOut.Temperature - coldIn.Temperature;
        if (first <= 0 || second <= 0) return _march.Exchanged / 2;
        double ratio = first / second;
        double mean = Math.Abs(ratio - 1) < 1e-6 ? (first + second) / 2 : (first - second) / Math.Log(ratio);
        return exchanger.WattsPerKelvin * mean;
    }

    private readonly (PassNode In, PassNode Out) Ends(string section)
    {
        int duct = Array.FindIndex(_pass.Ducts, candidate => candidate.Name == section);
        ReadOnlySpan<PassNode> nodes = _march.Nodes.AsSpan(0, _march.Count);
        int outlet = 0;
        while (nodes[outlet].Duct != duct) outlet++;
        int inlet = outlet;
        while (inlet + 1 < nodes.Length && nodes[inlet + 1].Duct == duct) inlet++;
        return (nodes[inlet], nodes[outlet]);
    }

    private PassProfile Profile()
    {
        SteadyScratch.Nodes = _march.Nodes;
        var nodes = new PassNode[_march.Count];
        for (int i = 0; i < nodes.Length; i++) nodes[i] = _march.Nodes[_march.Count - 1 - i];
        PassConditions conditions = _given with { RawFeedFlow = _march.Flow, RawAbsorbedHeat = _march.Heat };
        return new(_pass, conditions, _models, _options, nodes, _march.Exchanged, _march.PressureError, _march.MassError);
    }

    private readonly void Check()
    {
        if (_pass.Ducts.Length == 0) throw new ArgumentException($"Pass '{_pass.Name}' has no section: its steady state needs its tubes.", "pass");
        string outlet = _pass.Ducts[^1].Name, first = _pass.Ducts[0].Name;
        Require.Positive(_given.RawFeedFlow, "Feed flow", Scale.KilogramsPerSecond, "conditions");
        Require.Positive(_given.RawOutletPressure, "Outlet pressure", Scale.Megapascals, "conditions");
        Require.Below(_given.RawOutletPressure, _fluid.HighestPressure, $"Outlet pressure of section '{outlet}'", Scale.Megapascals, "conditions");
        if (_given.RawAbsorbedHeat > 0 && _pass.Heat is null) throw new ArgumentException($"Absorbed heat {Scale.Megawatts.Text(_given.RawAbsorbedHeat)} is given, but no section of pass '{_pass.Name}' is heated.", "conditions");
        if (double.IsNaN(FeedEnthalpy(_given.RawOutletPressure))) throw Require.OutOfRange(_given.RawFeedTemperature, $"Feed temperature of section '{first}'", Scale.Celsius, "conditions", "lies outside liquid water of the steam formulation");
    }

    private enum Grid
    {
        Rough = 0,
        Coarse = 1,
        Fine = 2,
    }

    /// <summary>A value to be found by what it misses: first by its own correction, then by secants.</summary>
    private struct Secant(double value)
    {
        private double _before = double.NaN, _missBefore;

        public double Value { get; private set; } = value;

        public void Improve(double miss)
        {
            double slope = (miss - _missBefore) / (Value - _before), step = slope < -0.05 ? -miss / slope : miss;
            if (miss == 0) return;
            (_before, _missBefore, Value) = (Value, miss, Value + step);
        }
    }
}

/// <summary>Room for the march, kept per thread, so that a solution allocates nothing but its profile.</summary>
internal static class SteadyScratch
{
    [ThreadStatic]
    private static PassNode[]? t_nodes;

    public static PassNode[] Nodes
    {
        get => t_nodes ??= new PassNode[512];
        set => t_nodes = value;
    }
}
