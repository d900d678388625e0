using FsCheck.Xunit;
using TwoPhase.Flow;
using TwoPhase.HeatTransfer;
using UnitsNet;

namespace TwoPhase.Tests.HeatTransfer;

public class TubeWallTests
{
    private static readonly Temperature Boiling = Temperature.FromKelvins(584.15);
    private static readonly HeatTransferCoefficient Film = HeatTransferCoefficient.FromWattsPerSquareMeterKelvin(30e3);

    // 88.9 x 5.5 mm, carbon steel at about 350 °C: invented, plausible.
    private static TubeWall Clean => new(Length.FromMillimeters(77.9), Length.FromMillimeters(88.9), ThermalConductivity.FromWattsPerMeterKelvin(42));

    private static TubeWall Scaled => Clean.WithScale(Length.FromMillimeters(0.5), ThermalConductivity.FromWattsPerMeterKelvin(1));

    [Fact]
    public void FromOutsideFlux_CleanTube_MatchesTheLawIntegratedNumerically()
    {
        WallTemperatures wall = Clean.FromOutsideFlux(Boiling, Film, HeatFlux.FromKilowattsPerSquareMeter(100));

        // dT/dr = q r_o / (k r), Simpson's rule over the metal.
        const int steps = 100;
        double inner = 0.03895, outer = 0.04445, width = (outer - inner) / steps, sum = 0;
        for (int i = 0; i <= steps; i++) sum += (i is 0 or steps ? 1 : i % 2 == 1 ? 4 : 2) * 100e3 * outer / (42 * (inner + (i * width)));
        Approx.Relative(sum * width / 3, wall.OutsideMetal.Kelvins - wall.InsideMetal.Kelvins, 1e-9);
        Approx.Relative(100e3 * 88.9 / 77.9, wall.WettedHeatFlux.WattsPerSquareMeter, 1e-12);
        Approx.Relative(100e3 * 88.9 / 77.9 / 30e3, wall.WettedSurface.Kelvins - 584.15, 1e-9);
        Assert.Equal(wall.WettedSurface.Kelvins, wall.InsideMetal.Kelvins);
        Assert.Equal(Boiling.Kelvins, wall.Fluid.Kelvins);
    }

    [Fact]
    public void FromOutsideFlux_HalfAMillimetreOfScale_CostsTensOfKelvins()
    {
        // Plane layer: q t/k = 114.1 kW/m² · 0.5 mm / (1 W/(m·K)) = 57.1 K at the bore; the layer is curved, so half a per cent more.
        HeatFlux flux = HeatFlux.FromKilowattsPerSquareMeter(100);
        WallTemperatures clean = Clean.FromOutsideFlux(Boiling, Film, flux), scaled = Scaled.FromOutsideFlux(Boiling, Film, flux);
        Approx.Relative(57.06, scaled.InsideMetal.Kelvins - scaled.WettedSurface.Kelvins, 0.01);
        Assert.True(scaled.OutsideMetal.Kelvins - clean.OutsideMetal.Kelvins is > 57 and < 59);
        Approx.Relative(scaled.OutsideMetal.Kelvins - scaled.InsideMetal.Kelvins, clean.OutsideMetal.Kelvins - clean.InsideMetal.Kelvins, 1e-9);
        Approx.Relative(0.0769, Scaled.WettedBore.Meters, 1e-12);
    }

    [Fact]
    public void FromInsideFlux_SameHeat_GivesTheSameTemperatures()
    {
        WallTemperatures outside = Scaled.FromOutsideFlux(Boiling, Film, HeatFlux.FromWattsPerSquareMeter(77.9e3));
        WallTemperatures inside = Scaled.FromInsideFlux(Boiling, Film, HeatFlux.FromWattsPerSquareMeter(88.9e3));
        Approx.Relative(outside.OutsideMetal.Kelvins, inside.OutsideMetal.Kelvins, 1e-12);
        Approx.Relative(outside.WettedHeatFlux.WattsPerSquareMeter, inside.WettedHeatFlux.WattsPerSquareMeter, 1e-12);
    }

    [Fact]
    public void FromOutsideFlux_BoilingFlow_TakesTheFilmAtTheWettedFlux()
    {
        FlowState state = HeatTransferFlows.TenMegapascals(0.5) with { Bore = 0.0769 };
        WallTemperatures wall = Scaled.FromOutsideFlux(new TwoPhaseFlow(state), FilmModel.GungorWinterton1986, HeatFlux.FromKilowattsPerSquareMeter(100));
        double flux = 100e3 * 88.9 / 76.9;
        Approx.Relative(flux / FilmModel.GungorWinterton1986.CoefficientCore(state, flux), wall.WettedSurface.Kelvins - 584.15, 1e-9);
    }

    [Property]
    public bool FromOutsideFlux_HeatedTube_WarmsFromFlowToOutside(ushort heat, byte scale)
    {
        TubeWall tube = Clean.WithScale(Length.FromMillimeters(scale / 64.0), ThermalConductivity.FromWattsPerMeterKelvin(1.5));
        WallTemperatures heated = tube.FromOutsideFlux(Boiling, Film, HeatFlux.FromWattsPerSquareMeter(1 + heat)), cooled = tube.FromOutsideFlux(Boiling, Film, HeatFlux.FromWattsPerSquareMeter(-1 - heat));
        return heated.Fluid < heated.WettedSurface && heated.WettedSurface <= heated.InsideMetal && heated.InsideMetal < heated.OutsideMetal
            && Math.Abs(heated.OutsideMetal.Kelvins + cooled.OutsideMetal.Kelvins - (2 * Boiling.Kelvins)) < 1e-9;
    }

    [Fact]
    public void FromOutsideFlux_NoHeat_IsAtFluidTemperatureThroughout()
    {
        WallTemperatures wall = Scaled.FromOutsideFlux(Boiling, Film, HeatFlux.Zero);
        Assert.Equal(Boiling.Kelvins, wall.OutsideMetal.Kelvins);
        Assert.Equal(Boiling.Kelvins, wall.WettedSurface.Kelvins);
    }

    [Fact]
    public void Constructor_BoreNotBelowOutsideDiameter_ThrowsNamingTheValue()
    {
        ArgumentOutOfRangeException error = Assert.Throws<ArgumentOutOfRangeException>(() => new TubeWall(Length.FromMillimeters(90), Length.FromMillimeters(88.9), ThermalConductivity.FromWattsPerMeterKelvin(42)));
        Assert.Equal("bore", error.ParamName);
        Assert.Contains("90 mm must be below 88.9 mm", error.Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => Clean.WithScale(Length.FromMillimeters(40), ThermalConductivity.FromWattsPerMeterKelvin(1)));
        Assert.Throws<ArgumentOutOfRangeException>(() => Clean.FromOutsideFlux(Boiling, HeatTransferCoefficient.Zero, HeatFlux.Zero));
    }

    [Fact]
    public void ToString_CommaCulture_StaysInvariant()
    {
        System.Globalization.CultureInfo before = System.Globalization.CultureInfo.CurrentCulture;
        System.Globalization.CultureInfo.CurrentCulture = new("de-DE");
        try
        {
            Assert.Equal("fluid 311.0, wetted surface 311.0, inside metal 311.0, outside metal 311.0 °C", Clean.FromOutsideFlux(Boiling, Film, HeatFlux.Zero).ToString());
        }
        finally
        {
            System.Globalization.CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void Through_InALoop_AllocatesNothing()
    {
        TubeWall tube = Scaled;
        double sum = 0;
        Assert.Equal(0, AllocationProbe.Bytes(() => sum += tube.Through(584.15, 30e3, 30e3).OutsideMetal.Kelvins));
        Assert.True(sum > 0);
    }
}
