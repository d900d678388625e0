using TwoPhase.Flow;
using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.Tests.Flow;

public class TwoPhaseFlowTests
{
    private static readonly Saturation Steam = Saturation.FromPressure(Pressure.FromMegapascals(8));

    [Fact]
    public void Constructor_SaturatedSteam_FillsBothPhases()
    {
        FlowState state = Flow(0.75, 1200, 77.9, 90).State;
        Approx.Relative(8e6, state.Pressure, 1e-15);
        Approx.Relative(0.0779, state.Bore, 1e-15);
        Approx.Relative(Math.PI / 2, state.Inclination, 1e-15);

        // From domain data of the trade: 8 MPa, ρ 722.197 and 42.503 kg/m³ (python3-iapws 1.5.2).
        Approx.Relative(722.197, state.LiquidDensity, 1e-6);
        Approx.Relative(42.503, state.VapourDensity, 1e-5);
        Assert.Equal(state, FlowStates.At(8e6, 0.75, 1200, state.Bore, state.Inclination));
    }

    [Theory]
    [InlineData(1.2, 1200, 78, 0, "quality")]
    [InlineData(-0.1, 1200, 78, 0, "quality")]
    [InlineData(0.5, 0, 78, 0, "massFlux")]
    [InlineData(0.5, 1200, -78, 0, "bore")]
    [InlineData(0.5, 1200, 78, 91, "inclination")]
    public void Constructor_OutOfRange_ThrowsNamingTheParameter(double quality, double massFlux, double millimetres, double degrees, string parameter) =>
        Assert.Equal(parameter, Assert.Throws<ArgumentOutOfRangeException>(() => Flow(quality, massFlux, millimetres, degrees)).ParamName);

    [Fact]
    public void Constructor_DefaultSaturation_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => new TwoPhaseFlow(default, MassFraction.Zero, MassFlux.FromKilogramsPerSecondPerSquareMeter(1), Length.FromMeters(1), Angle.Zero));

    private static TwoPhaseFlow Flow(double quality, double massFlux, double millimetres, double degrees) => new(
        Steam,
        MassFraction.FromDecimalFractions(quality),
        MassFlux.FromKilogramsPerSecondPerSquareMeter(massFlux),
        Length.FromMillimeters(millimetres),
        Angle.FromDegrees(degrees));
}
