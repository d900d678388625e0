using TwoPhase.Numerics;
using TwoPhase.Passes;
using TwoPhase.Units;

namespace TwoPhase.Dynamics;

// From the channel to what is seen, and from the conditions to the channel.
public sealed partial class PassSimulator
{
    private const int GreatestRounds = 40;

    // A feed given by its temperature has an enthalpy that depends, slightly, on the inlet pressure, and the other way round.
    private void Rest(in PassConditions given)
    {
        double inlet = given.RawOutletPressure;
        _channel.Heat = given.RawAbsorbedHeat;
        for (int round = 0; round < GreatestRounds; round++)
        {
            _channel.FeedEnthalpy = FeedEnthalpy(given, inlet);
            bool settled = _channel.Rest(given.RawFeedFlow, given.RawOutletPressure);
            if (!Fast.IsFinite(_channel.Mass))
                throw Require.OutOfRange(given.RawAbsorbedHeat, "Absorbed heat", Scale.Megawatts, "initial", $"brings pass '{Pass.Name}' outside the steam formulation: inlet {Scale.Megapascals.Text(_channel.InletPressure)}, outlet {Scale.KilojoulesPerKilogram.Text(_channel.Outlet.OutEnthalpy)}");
            double change = Math.Abs(_channel.InletPressure - inlet);
            inlet = _channel.InletPressure;
            if (settled && (given.IsFeedByEnthalpy || change < 1e-9 * inlet)) return;
        }

        throw new ConvergenceException($"The pressure along pass '{Pass.Name}' did not settle; last inlet {Scale.Megapascals.Text(inlet)}.");
    }

    private double FeedEnthalpy(in PassConditions given, double inletPressure) =>
        given.IsFeedByEnthalpy ? given.RawFeedEnthalpy : _fluid.LiquidEnthalpy(inletPressure, given.RawFeedTemperature);

    private void Check(in PassConditions given, string parameter)
    {
        Require.Positive(given.RawFeedFlow, "Feed flow", Scale.KilogramsPerSecond, parameter);
        Require.Positive(given.RawOutletPressure, "Outlet pressure", Scale.Megapascals, parameter);
        Require.Below(given.RawOutletPressure, _fluid.HighestPressure, "Outlet pressure", Scale.Megapascals, parameter);
        if (given.RawAbsorbedHeat > 0 && Pass.Heat is null) throw new ArgumentException($"Absorbed heat {Scale.Megawatts.Text(given.RawAbsorbedHeat)} is given, but no section of pass '{Pass.Name}' is heated.", parameter);
        if (double.IsNaN(FeedEnthalpy(given, given.RawOutletPressure))) throw Require.OutOfRange(given.RawFeedTemperature, "Feed temperature", Scale.Celsius, parameter, "must be that of liquid water within the steam formulation");
        double boiling = _fluid.Saturated(given.RawOutletPressure).Temperature;
        if (!given.IsFeedByEnthalpy) Require.Below(given.RawFeedTemperature, boiling, "Feed temperature", Scale.Celsius, parameter);
    }

    private PassInstant Look(double elapsed)
    {
        (double flow, double enthalpy, double pressure) = AtMeter();
        double quality = _fluid.Saturated(pressure).Quality(enthalpy), shut = _channel.TimeShut;
        (double differential, double indicated) = _meter.Read(elapsed, Conditions.RawFeedFlow, flow, pressure, quality, _channel.OutletPressure);
        double shutShare = elapsed > 0 ? Math.Min(1, (shut - _timeShut) / elapsed) : 0;
        _timeShut = shut;
        return new()
        {
            RawTime = _time,
            RawFeedFlow = Conditions.RawFeedFlow,
            RawAbsorbedHeat = _channel.AbsorbedHeat,
            RawOutletFlow = flow,
            RawTrueQuality = quality,
            RawIndicatedQuality = indicated,
            RawDifferential = differential,
            RawOutletPressure = _channel.OutletPressure,
            RawInletPressure = _channel.InletPressure,
            RawHoldup = _channel.Mass,
            RawOnset = _channel.Onset,
            RawOutletTemperature = _fluid.At(pressure, enthalpy, _fluid.Saturated(pressure)).Temperature,
            RawHottestMetal = HottestMetal(),
            RawValveShut = shutShare,
            MassResidual = _channel.MassResidual,
            EnergyResidual = _channel.EnergyResidual,
        };
    }

    // Flow, enthalpy and pressure where the meter stands: at the end of the outlet line, or of the last tube.
    private (double Flow, double Enthalpy, double Pressure) AtMeter()
    {
        ref readonly Cell cell = ref _channel.Cells[_channel.MeteredCell];
        double head = Pass.OutletLine is { IsMeterAtTubeEnd: true } ? cell.Head - cell.HalfLoss : 0;
        return (_channel.MeteredFlow, _channel.MeteredEnthalpy, _channel.EndPressure + head);
    }

    private double HottestMetal()
    {
        double hottest = 0;
        foreach (ref readonly Cell cell in _channel.Cells) hottest = Math.Max(hottest, cell.Wall);
        return hottest;
    }
}
