using System.Numerics;
using TwoPhase.Dynamics;
using TwoPhase.Holdup;
using TwoPhase.Passes;
using TwoPhase.Tests.Passes;
using TwoPhase.Tests.Support;
using UnitsNet;
using Xunit;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Dynamics;

public sealed class LinearViewTests
{
    private static readonly Lazy<LinearView> Shared = new(() => LinearView.Of(MeteredPass, Start));

    private static LinearView View => Shared.Value;

    // The steady solver shares the correlations and nothing else: its nodes, its march and its formulation are others.
    [Theory]
    [InlineData(LinearInput.Firing, LinearOutput.TrueQuality)]
    [InlineData(LinearInput.Firing, LinearOutput.Holdup)]
    [InlineData(LinearInput.FeedFlow, LinearOutput.TrueQuality)]
    [InlineData(LinearInput.FeedFlow, LinearOutput.Holdup)]
    [InlineData(LinearInput.FeedTemperature, LinearOutput.TrueQuality)]
    [InlineData(LinearInput.FeedTemperature, LinearOutput.Holdup)]
    public void Gain_AgainstSteadyStatesAtBothEnds_Agrees(LinearInput input, LinearOutput output)
    {
        (double above, double below) = (Steady(input, 1, output), Steady(input, -1, output));
        double units = input == LinearInput.FeedTemperature ? 4 : 2;
        Approx.Relative((above - below) / units, View.Find(output, input).Gain, 1e-3);
    }

    [Fact]
    public void Gain_OfIndicatedQuality_IsThatOfTheTruth()
    {
        foreach (LinearInput input in new[] { LinearInput.Firing, LinearInput.FeedFlow, LinearInput.FeedTemperature })
            Approx.Relative(View.Find(LinearOutput.TrueQuality, input).Gain, View.Find(LinearOutput.IndicatedQuality, input).Gain, 1e-6);
    }

    // The magnitudes are those of the closed form, confirmed by a Lagrangian model of slugs of water.
    [Theory]
    [InlineData(1000, 0.91128)]
    [InlineData(300, 0.85267)]
    [InlineData(100, 0.42253)]
    public void Response_OfASampledStep_IsTheClosedForm(double period, double magnitude)
    {
        Approx.Relative(magnitude, UniformChannel.FlowResponse(2 * Math.PI / period).Magnitude, 1e-4);
        Approx.Absolute(0, Off(ChannelStep.Value, period), 0.01);
    }

    // A swing of 30 s is three to ten cells long where it is shortest: the grid damps it, the less the finer it is.
    [Fact]
    public void Response_OfAShortPeriod_ConvergesWithTheGrid()
    {
        Approx.Relative(0.20775, UniformChannel.FlowResponse(2 * Math.PI / 30).Magnitude, 1e-4);
        double fine = Off(ChannelStep.Value, 30), coarse = Off(StepOf(160), 30);
        Assert.True(fine < coarse / 2, $"{coarse:E1} to {fine:E1}");
    }

    [Fact]
    public void Fit_OfTheClosedForm_IsAsNearAsItSays()
    {
        (TransferFunction fit, double error) = TwoPathFit.Of(ChannelStep.Value);
        Assert.InRange(error, 1e-4, 0.05);
        foreach (double period in new[] { 3000.0, 1000 })
            Approx.Absolute(0, (fit.Response(Seconds(period)) - UniformChannel.FlowResponse(2 * Math.PI / period)).Magnitude, 2 * error);
    }

    [Fact]
    public void Fit_OfAFunctionOfItsKind_FindsIt()
    {
        var known = new TransferFunction(0.8, 0, 12, -2, 150, 40);
        var step = new SampledStep([.. Enumerable.Range(0, 1500).Select(t => known.Step(Seconds(t)))], 1, -1.2);
        (TransferFunction found, double error) = TwoPathFit.Of(step);
        Approx.Absolute(0, error, 1e-4);
        Approx.Relative(0.8, found.FirstGain, 1e-2);
        Approx.Relative(150, found.SecondDelay.Seconds, 1e-2);
        Approx.Relative(40, found.SecondLag.Seconds, 1e-2);
        Approx.Relative(-1.2, found.Gain, 1e-12);
    }

    // A step a fifth as large, run by itself, upwards only: the fit must tell where that goes, as well as it says.
    [Theory]
    [InlineData(LinearInput.Firing, LinearOutput.TrueQuality, 0.05)]
    [InlineData(LinearInput.Firing, LinearOutput.IndicatedQuality, 0.05)]
    [InlineData(LinearInput.Firing, LinearOutput.Holdup, 0.05)]
    [InlineData(LinearInput.FeedFlow, LinearOutput.TrueQuality, 0.05)]
    [InlineData(LinearInput.FeedFlow, LinearOutput.IndicatedQuality, 0.05)]
    [InlineData(LinearInput.FeedFlow, LinearOutput.Holdup, 0.05)]
    [InlineData(LinearInput.FeedTemperature, LinearOutput.TrueQuality, 0.05)]
    [InlineData(LinearInput.FeedTemperature, LinearOutput.IndicatedQuality, 0.05)]
    [InlineData(LinearInput.FeedTemperature, LinearOutput.Holdup, 0.05)]
    public void Fit_AgainstARunOfItsOwn_MissesWhatItSays(LinearInput input, LinearOutput output, double worst)
    {
        LinearResponse response = View.Find(output, input);
        PassHistory run = new PassSimulator(MeteredPass, Start).Run(Moved(input, 0.2), (response.Step.Count - 1) * response.Sampling);
        double units = input == LinearInput.FeedTemperature ? 0.4 : 0.2, peak = response.Step.Max(Math.Abs), sum = 0;
        foreach (PassInstant row in run)
        {
            double off = ((Value(row, output) - Value(run[0], output)) / units) - response.Fit.Step(row.Time);
            sum += off * off;
        }

        Assert.InRange(response.FitError, 0, worst);
        Approx.Absolute(response.FitError, Math.Sqrt(sum / run.Count) / peak, 0.01);
    }

    [Fact]
    public void Step_OfTheReadingByFlow_LeadsTheTruth()
    {
        // Indicated quality jumps at once, by 2 W for a unit of ln ṁ less what the outlet flow takes part; the truth has not yet moved.
        LinearResponse truth = View.Find(LinearOutput.TrueQuality, LinearInput.FeedFlow), reading = View.Find(LinearOutput.IndicatedQuality, LinearInput.FeedFlow);
        Assert.True(Math.Abs(truth.Step[20]) < 0.05 * Math.Abs(truth.Gain));
        Assert.True(reading.Step[20] < reading.Gain);
    }

    [Fact]
    public void Response_OfALongPeriod_IsTheGain()
    {
        LinearResponse response = View.Find(LinearOutput.TrueQuality, LinearInput.Firing);
        Approx.Relative(response.Gain, response.Response(Duration.FromDays(30)).Real, 1e-4);
        Assert.InRange(response.Asymmetry, 0, 0.05);
        Assert.InRange(response.Unsettled, 0, 1e-3);
    }

    [Fact]
    public void Of_WithoutMeter_HasNoIndicatedQuality()
    {
        LinearView view = LinearView.Of(ExamplePass.Pass, Start, SimulatorOptions.Default.WithCells(10));
        Assert.Equal(9, view.Responses.Count);
        Assert.Throws<ArgumentException>(() => view.Find(LinearOutput.IndicatedQuality, LinearInput.Firing));
    }

    [Fact]
    public void Of_WhatItCannotStep_SaysSo()
    {
        Assert.Contains("0 MW", Assert.Throws<ArgumentOutOfRangeException>(() => LinearView.Of(MeteredPass, Start.WithAbsorbedHeat(Power.Zero))).Message);
        Assert.Throws<ArgumentException>(() => LinearView.Of(MeteredPass, Start.WithFeedEnthalpy(SpecificEnergy.FromKilojoulesPerKilogram(700))));
        Assert.Throws<ArgumentOutOfRangeException>(() => View.Responses[0].Response(Seconds(1)));
        Assert.Throws<ArgumentOutOfRangeException>(() => View.Responses[0].Fit.Step(Seconds(-1)));
    }

    // Outlet flow over inlet flow of the uniform channel, steps of 1 % up and down.
    private static readonly Lazy<SampledStep> ChannelStep = new(() => StepOf(320));

    private static double Off(SampledStep step, double period)
    {
        Complex expected = UniformChannel.FlowResponse(2 * Math.PI / period);
        return (step.Response(2 * Math.PI / period) - expected).Magnitude / expected.Magnitude;
    }

    private static SampledStep StepOf(int cells)
    {
        const double sampling = 0.25;
        Channel<ConstantDensityFluid> up = Channels.Uniform(cells), down = Channels.Uniform(cells);
        var values = new double[2400];
        for (int i = 1; i < values.Length; i++)
        {
            up.Advance(sampling, 1.01 * Channels.Flow, Channels.Pressure);
            down.Advance(sampling, 0.99 * Channels.Flow, Channels.Pressure);
            values[i] = (up.Outlet.Outflow - down.Outlet.Outflow) / (0.02 * Channels.Flow);
        }

        return new(values, sampling, 1);
    }

    private static OperatingSchedule Moved(LinearInput input, double size) => input switch
    {
        LinearInput.Firing => Still.StepAbsorbedHeat(Duration.Zero, Ends(input, size).AbsorbedHeat),
        LinearInput.FeedFlow => Still.StepFeedFlow(Duration.Zero, Ends(input, size).FeedFlow),
        _ => Still.StepFeedTemperature(Duration.Zero, Ends(input, size).FeedTemperature!.Value),
    };

    private static PassConditions Ends(LinearInput input, double size) => input switch
    {
        LinearInput.Firing => Start.WithAbsorbedHeat(Start.AbsorbedHeat * (decimal)(1 + (size / 100))),
        LinearInput.FeedFlow => Start.WithFeedFlow(Start.FeedFlow * (1 + (size / 100))),
        _ => Start.WithFeedTemperature(Start.FeedTemperature!.Value + TemperatureDelta.FromKelvins(2 * size)),
    };

    private static double Steady(LinearInput input, double size, LinearOutput output)
    {
        PassProfile profile = SteadyState.Solve(MeteredPass, Ends(input, size));
        return output == LinearOutput.Holdup ? WaterHoldup.Of(profile).Total.Kilograms : profile.OutletQuality.DecimalFractions;
    }

    private static double Value(in PassInstant row, LinearOutput output) => output switch
    {
        LinearOutput.TrueQuality => row.TrueQuality.DecimalFractions,
        LinearOutput.IndicatedQuality => row.IndicatedQuality!.Value.DecimalFractions,
        LinearOutput.Holdup => row.Holdup.Kilograms,
        _ => row.OutletFlow.KilogramsPerSecond,
    };
}
