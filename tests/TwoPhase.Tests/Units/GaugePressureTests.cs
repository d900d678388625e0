using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Tests.Units;

public class GaugePressureTests
{
    private static readonly Pressure Site = Pressure.FromKilopascals(93);

    [Fact]
    public void Absolute_AtSite_AddsItsAtmosphere() =>
        Approx.Relative(9593e3, new GaugePressure(Pressure.FromKilopascals(9500), Site).Absolute.Pascals, 1e-15);

    [Fact]
    public void FromAbsolute_RoundTrip_IsTheSamePressure()
    {
        var gauge = GaugePressure.FromAbsolute(Pressure.FromMegapascals(9.593), Site);
        Approx.Relative(9500e3, gauge.Gauge.Pascals, 1e-12);
        Assert.Equal(gauge, new GaugePressure(gauge.Gauge, gauge.Atmosphere));
        Assert.True(gauge != default);
    }

    [Fact]
    public void ToString_CommaCulture_IsInvariant() =>
        Culture.Run("de-DE", () => Assert.Equal("9500.5 kPa gauge over 93 kPa", new GaugePressure(Pressure.FromKilopascals(9500.5), Site).ToString()));

    [Fact]
    public void New_BelowVacuum_ThrowsNamingTheValue()
    {
        ArgumentOutOfRangeException error = Assert.Throws<ArgumentOutOfRangeException>(() => new GaugePressure(Pressure.FromKilopascals(-94), Site));
        Assert.Contains("-94 kPa", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void New_PlantPressureAsAtmosphere_ThrowsNamingTheValue()
    {
        ArgumentOutOfRangeException error = Assert.Throws<ArgumentOutOfRangeException>(() => new GaugePressure(Site, Pressure.FromMegapascals(9.5)));
        Assert.Contains("9500 kPa", error.Message, StringComparison.Ordinal);
    }
}
