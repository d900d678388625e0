using TwoPhase.Metering;
using TwoPhase.Numerics;
using UnitsNet;

namespace TwoPhase.Tests.Metering;

/// <summary>The slopes that Newton's method goes by, against differences of fourth order; none of the points straddles a kink of an exponent.</summary>
public class SlopeTests
{
    // Half the digits of the smallest step below.
    private const double Tolerance = 1e-8;

    public static TheoryData<double, double> FlowAndQuality
    {
        get
        {
            var data = new TheoryData<double, double>();
            foreach (double flow in new[] { 0.4, 1.7, 3.3, 4.8, 8.0 })
            {
                foreach (double quality in new[] { 0.15, 0.37, 0.62, 0.78, 0.90, 0.985 }) data.Add(flow, quality);
            }

            return data;
        }
    }

    [Theory, MemberData(nameof(FlowAndQuality))]
    public void Volume_AnyExponent_HasTheSlopeOfItsValue(double flow, double quality)
    {
        MeterState state = WetSteamModelTests.Reference with { TotalMassFlow = flow };
        var terms = new StateTerms(state);
        foreach (WetSteamModel.ExponentModel model in WetSteamModel.All.OfType<WetSteamModel.ExponentModel>())
        {
            Approx.Relative(Difference(x => model.Volume(state, terms, x).Value, quality), model.Volume(state, terms, quality).Slope, Tolerance, model.Name);
            Approx.Absolute(Difference(x => model.Coefficient(state, terms, default, x).Value, quality), model.Coefficient(state, terms, default, quality).Slope, Tolerance, model.Name);
        }
    }

    [Theory]
    [InlineData(OrificeTappings.Corner)]
    [InlineData(OrificeTappings.DiameterAndHalf)]
    [InlineData(OrificeTappings.Flange)]
    public void Coefficient_OrificeOverQuality_HasTheSlopeOfItsValue(OrificeTappings tappings)
    {
        var plate = new OrificePlate(Length.FromMillimeters(77.9), Length.FromMillimeters(49), tappings);
        CoefficientLaw law = plate.LawOf(plate.GeometryAt(580));
        foreach (double x in new[] { 0.1, 0.5, 0.9 })
            Approx.Absolute(Difference(q => law.Over(q, 2e4, 3e5).Value, x), law.Over(x, 2e4, 3e5).Slope, 1e-10);
    }

    [Fact]
    public void Coefficient_Nozzles_HaveTheSlopeOfTheirValue()
    {
        foreach (PrimaryElement nozzle in new PrimaryElement[] { new Isa1932Nozzle(Length.FromMillimeters(77.9), Length.FromMillimeters(49)), new LongRadiusNozzle(Length.FromMillimeters(77.9), Length.FromMillimeters(49)) })
        {
            CoefficientLaw law = nozzle.LawOf(nozzle.GeometryAt(580));
            Approx.Absolute(Difference(q => law.Over(q, 2e4, 3e5).Value, 0.5), law.Over(0.5, 2e4, 3e5).Slope, 1e-10, nozzle.Name);
        }
    }

    // The step shrinks towards dry steam, where a coefficient goes as the root of 1 − x: truncation and round-off both stay near 1e-11.
    private static double Difference(Func<double, double> function, double x)
    {
        double step = 2e-4 * (1 - x);
        return ((8 * (function(x + step) - function(x - step))) - (function(x + (2 * step)) - function(x - (2 * step)))) / (12 * step);
    }
}
