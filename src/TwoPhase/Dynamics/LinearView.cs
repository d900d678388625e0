using System.Runtime.ExceptionServices;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>A pass near an operating point as a control engineer sees it: gains and transfer functions from firing, feed flow and feed temperature.</summary>
/// <remarks>
/// <para>From small steps up and down of <see cref="PassSimulator"/>, half their difference each; gains from the states of rest at either end.</para>
/// <para>Range: small moves about the point. <see cref="LinearResponse.Asymmetry"/> says how far the steps used were from that, <see cref="LinearResponse.FitError"/>
/// how far a function of low order is from the pass.</para>
/// <para>For tuning work. It is no claim that any of these outputs makes a good controlled variable, and whichever does needs a fallback for the time
/// when it cannot be believed.</para>
/// </remarks>
public sealed class LinearView
{
    // Steps in units of the input: 1 % of firing and flow, 2 K. Small against what bends, large against a cell.
    private const double Share = 1, Kelvins = 2;

    // Times the residence time of the water: fronts, their echo and the metal are through.
    private const double Horizon = 6;

    private readonly LinearResponse[] _responses;

    private LinearView(PassConditions point, LinearResponse[] responses) => (Point, _responses) = (point, responses);

    /// <summary>The operating point.</summary>
    public PassConditions Point { get; }

    /// <summary>All of them; the indicated quality only where the pass has a meter.</summary>
    public IReadOnlyList<LinearResponse> Responses => _responses;

    /// <summary>Looks at a pass near an operating point.</summary>
    /// <param name="pass">The pass.</param>
    /// <param name="point">The operating point: heat above zero, the feed given by its temperature.</param>
    /// <param name="options">How to simulate; null for the defaults.</param>
    /// <exception cref="ArgumentException">The pass cannot be simulated at the point, there is no heat, or the feed is given by its enthalpy.</exception>
    /// <exception cref="InvalidOperationException">A small step leads out of what the simulator can do.</exception>
    public static LinearView Of(Pass pass, PassConditions point, SimulatorOptions? options = null)
    {
        Require.Positive(point.RawAbsorbedHeat, "Absorbed heat", Scale.Megawatts, nameof(point));
        if (point.IsFeedByEnthalpy) throw new ArgumentException("The feed is given by its enthalpy; a linear view steps its temperature.", nameof(point));
        PassInstant rest = new PassSimulator(pass, point, options).Now;
        Duration horizon = Duration.FromSeconds(Math.Ceiling(Horizon * rest.RawHoldup / rest.RawFeedFlow));
        LinearInput[] inputs = [LinearInput.Firing, LinearInput.FeedFlow, LinearInput.FeedTemperature];
        var runs = new (PassHistory History, PassInstant End)[2 * inputs.Length];
        try
        {
            Parallel.For(0, runs.Length, i => runs[i] = Run(pass, point, Moved(point, inputs[i / 2], i % 2 == 0 ? 1 : -1), horizon, options));
        }
        catch (AggregateException several)
        {
            ExceptionDispatchInfo.Capture(several.InnerExceptions[0]).Throw();   // the same as without threads
        }

        LinearOutput[] outputs = double.IsNaN(rest.RawIndicatedQuality)
            ? [LinearOutput.TrueQuality, LinearOutput.Holdup, LinearOutput.OutletFlow]
            : [LinearOutput.TrueQuality, LinearOutput.IndicatedQuality, LinearOutput.Holdup, LinearOutput.OutletFlow];
        double sampling = (options ?? SimulatorOptions.Default).RawSampling;
        return new(point, [.. inputs.SelectMany((input, i) => outputs.Select(output => Response(input, output, runs[2 * i], runs[(2 * i) + 1], sampling)))]);
    }

    /// <summary>How an output answers an input.</summary>
    /// <param name="output">The output.</param>
    /// <param name="input">The input.</param>
    /// <exception cref="ArgumentException">The pass has no meter, so it indicates nothing.</exception>
    public LinearResponse Find(LinearOutput output, LinearInput input) =>
        Array.Find(_responses, response => response.Output == output && response.Input == input) ?? throw new ArgumentException("The pass has no meter: it indicates no quality.", nameof(output));

    private static double SizeOf(LinearInput input) => input == LinearInput.FeedTemperature ? Kelvins : Share;

    private static PassConditions Moved(in PassConditions point, LinearInput input, int sign)
    {
        double move = sign * SizeOf(input), factor = 1 + (move / 100);
        return input switch
        {
            LinearInput.Firing => point with { RawAbsorbedHeat = point.RawAbsorbedHeat * factor },
            LinearInput.FeedFlow => point with { RawFeedFlow = point.RawFeedFlow * factor },
            _ => point with { RawFeedTemperature = point.RawFeedTemperature + move },
        };
    }

    // The step stands at the start of the first row interval; where it ends, the simulator at rest there says to round-off.
    private static (PassHistory History, PassInstant End) Run(Pass pass, in PassConditions from, in PassConditions to, Duration horizon, SimulatorOptions? options)
    {
        OperatingSchedule schedule = new OperatingSchedule(from)
            .StepFeedFlow(Duration.Zero, to.FeedFlow)
            .StepAbsorbedHeat(Duration.Zero, to.AbsorbedHeat)
            .StepFeedTemperature(Duration.Zero, to.FeedTemperature!.Value);
        PassHistory history = new PassSimulator(pass, from, options).Run(schedule, horizon);
        return history.End == SimulationEnd.Completed ? (history, new PassSimulator(pass, to, options).Now) : throw new InvalidOperationException($"A small step ended the simulation: {history.EndReason}");
    }

    private static LinearResponse Response(LinearInput input, LinearOutput output, (PassHistory History, PassInstant End) up, (PassHistory History, PassInstant End) down, double sampling)
    {
        double start = Value(up.History[0], output), perUnit = 1 / (2 * SizeOf(input)), bent = 0;
        var values = new double[up.History.Count];
        for (int i = 0; i < values.Length; i++)
        {
            double above = Value(up.History[i], output), below = Value(down.History[i], output);
            values[i] = (above - below) * perUnit;
            bent = Math.Max(bent, Math.Abs(above + below - (2 * start)) * perUnit);
        }

        var step = new SampledStep(values, sampling, (Value(up.End, output) - Value(down.End, output)) * perUnit);
        return new(input, output, step, step.Peak > 0 ? bent / step.Peak : 0);
    }

    private static double Value(in PassInstant row, LinearOutput output) => output switch
    {
        LinearOutput.TrueQuality => row.RawTrueQuality,
        LinearOutput.IndicatedQuality => row.RawIndicatedQuality,
        LinearOutput.Holdup => row.RawHoldup,
        _ => row.RawOutletFlow,
    };
}
