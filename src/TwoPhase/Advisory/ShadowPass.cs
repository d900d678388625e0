using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Numerics;
using TwoPhase.Passes;
using TwoPhase.Steam;

namespace TwoPhase.Advisory;

/// <summary>What the plant imposes on a pass, SI.</summary>
/// <param name="FeedFlow">ṁ [kg/s].</param>
/// <param name="FeedTemperature">T [K].</param>
/// <param name="OutletPressure">p at the meter [Pa].</param>
/// <param name="Heat">Q [W].</param>
internal readonly record struct ImposedInputs(double FeedFlow, double FeedTemperature, double OutletPressure, double Heat);

/// <summary>The pass's own dynamics, run beside the plant with what the plant imposes on it. Never throws.</summary>
internal sealed class ShadowPass
{
    private const double HighestMassFlux = 6000, LowestMassFlux = 20, LowestPressure = 1e5;
    private const int StartRounds = 3;

    // Of the quality, for the slope of the meter.
    private const double Step = 1e-3;

    private readonly SurfaceFluid _fluid = new(SteamSurface.Default);
    private readonly Channel<SurfaceFluid> _channel;
    private readonly QualityMeter _meter;
    private double _flow;
    private bool _runs;

    public ShadowPass(Pass pass, QualityMeter meter, PassModels models, int cells)
    {
        _channel = new(_fluid, pass.Ducts, models, cells) { HeadLag = SimulatorOptions.Default.RawPressureLag };
        _meter = meter;
        Area = pass.Ducts.Max(duct => duct.Area);
    }

    /// <summary>Whether it runs; what it says means nothing while it does not.</summary>
    public bool Runs => _runs;

    /// <summary>Largest flow area of all parallel tubes [m²].</summary>
    public double Area { get; }

    /// <summary>x, quality of what leaves.</summary>
    public double Quality { get; private set; }

    /// <summary>ṁout [kg/s].</summary>
    public double OutletFlow => _channel.MeteredFlow;

    /// <summary>M [kg].</summary>
    public double Holdup => _channel.Mass;

    /// <summary>Where boiling begins [m]; NaN for nowhere.</summary>
    public double Onset => _channel.Onset;

    /// <summary>M/ṁ [s], what the water takes from end to end.</summary>
    public double Residence => _channel.Mass / _flow;

    /// <summary>∂x/∂ln Q at rest: (hout − hfeed)/hfg.</summary>
    public double QualityByHeat { get; private set; }

    /// <summary>∂ln Q/∂T of the feed [1/K], what a warmer feed is worth as heat.</summary>
    public double HeatByFeedTemperature(double temperature)
    {
        double pressure = _channel.InletPressure;
        return (_fluid.LiquidEnthalpy(pressure, temperature + 1) - _fluid.LiquidEnthalpy(pressure, temperature)) / (_channel.Outlet.OutEnthalpy - _channel.FeedEnthalpy);
    }

    /// <summary>Whether the inputs are such as a pass with water flowing through it can have.</summary>
    public bool Accepts(in ImposedInputs inputs) =>
        inputs.FeedFlow > LowestMassFlux * Area && inputs.FeedFlow < HighestMassFlux * Area
        && inputs.OutletPressure > LowestPressure && inputs.OutletPressure < 0.9 * _fluid.HighestPressure
        && inputs.Heat >= 0 && Fast.IsFinite(inputs.Heat)
        && inputs.FeedTemperature < _fluid.Saturated(inputs.OutletPressure).Temperature
        && Fast.IsFinite(_fluid.LiquidEnthalpy(inputs.OutletPressure, inputs.FeedTemperature));

    /// <summary>Heat with which a quality leaves at rest [W].</summary>
    public double HeatFor(double quality, double feedFlow, double feedTemperature, double pressure)
    {
        SaturatedPair steam = _fluid.Saturated(pressure);
        return feedFlow * (steam.LiquidEnthalpy + (quality * steam.LatentHeat) - _fluid.LiquidEnthalpy(pressure, feedTemperature));
    }

    /// <summary>Quality that a heat gives at rest.</summary>
    public double RestingQuality(double heat, double feedFlow, double feedTemperature, double pressure) =>
        _fluid.Saturated(pressure).Quality(_fluid.LiquidEnthalpy(pressure, feedTemperature) + (heat / feedFlow));

    /// <summary>Begins at rest.</summary>
    public void Start(in ImposedInputs inputs)
    {
        double inlet = inputs.OutletPressure;
        for (int round = 0; round < StartRounds; round++)
        {
            Impose(inputs, inlet);
            _runs = _channel.Rest(inputs.FeedFlow, inputs.OutletPressure) && Fast.IsFinite(_channel.Mass);
            if (!Runs) return;
            inlet = _channel.InletPressure;
        }

        Look();
    }

    /// <summary>Moves on; stops running where the flow would stagnate.</summary>
    public void Advance(in ImposedInputs inputs, double seconds)
    {
        if (!Runs) return;
        Impose(inputs, _channel.InletPressure);
        _runs = Accepts(inputs) && _channel.Advance(seconds, inputs.FeedFlow, inputs.OutletPressure) && Fast.IsFinite(_channel.Outlet.Outflow);
        if (Runs) Look();
    }

    public void Stop() => _runs = false;

    /// <summary>Δp that the meter would make of what leaves [Pa].</summary>
    public double Differential { get; private set; }

    /// <summary>∂x/∂ln Δp of the meter.</summary>
    public double QualityByDifferential { get; private set; }

    public void List(StateFields state)
    {
        state.Flag("runs", ref _runs);
        state.Number("flow", ref _flow);
        state.Block("channel", _channel.Save, _channel.Load);
        if (Runs) Look();
    }

    private void Impose(in ImposedInputs inputs, double inletPressure)
    {
        _flow = inputs.FeedFlow;
        (_channel.Heat, _channel.FeedEnthalpy) = (inputs.Heat, _fluid.LiquidEnthalpy(inletPressure, inputs.FeedTemperature));
    }

    private void Look()
    {
        SaturatedPair steam = _fluid.Saturated(_channel.OutletPressure);
        double enthalpy = _channel.MeteredEnthalpy;
        Quality = steam.Quality(enthalpy);
        QualityByHeat = (enthalpy - _channel.FeedEnthalpy) / steam.LatentHeat;
        Differential = _meter.DifferentialOrNaN(OutletFlow, _channel.OutletPressure, Quality);

        // A meter that would choke has no differential; its slope is then kept.
        double slope = Step / Math.Log(_meter.DifferentialOrNaN(OutletFlow, _channel.OutletPressure, Quality + Step) / Differential);
        if (Fast.IsFinite(slope)) QualityByDifferential = slope;
    }
}
