using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Tests.Units;

public class UnitTextTests
{
    private static readonly UnitBasis Site = UnitBasis.None.WithAtmosphericPressure(Pressure.FromKilopascals(93));

    // NIST SP 811 (2008), appendix B.8: psi, kgf/cm², inch of water conventional, 39.2 °F and 60 °F, as many digits as printed.
    [Theory]
    [InlineData("psid", 6.894757e3, 1e-7)]
    [InlineData("kg/cm2", 9.80665e4, 1e-12)]
    [InlineData("inH2O", 2.490889e2, 1e-7)]
    [InlineData("inH2O at 39.2 degF", 2.49082e2, 3e-6)]
    [InlineData("inH2O(60F)", 2.4884e2, 2e-5)]
    [InlineData("inWC @ 60 °F", 2.4884e2, 2e-5)]
    [InlineData("kPa", 1e3, 0)]
    [InlineData("mbar", 100, 0)]
    [InlineData("mmH2O", 9.80665, 1e-12)]
    public void Map_Differential_MatchesPrintedFactor(string text, double pascals, double tolerance) =>
        Approx.Relative(pascals, UnitText.Map(text, UnitKind.PressureDifference, UnitBasis.None).Map(1), tolerance);

    [Theory]
    [InlineData("kPa(a)", 100, 100e3)]
    [InlineData("kPaa", 100, 100e3)]
    [InlineData("kPag", 100, 193e3)]
    [InlineData("kPa(g)", 100, 193e3)]
    [InlineData("kPa gauge", 100, 193e3)]
    [InlineData("barg", 1, 193e3)]
    [InlineData("bara", 1, 100e3)]
    [InlineData("BARG", 1, 193e3)]
    [InlineData("MPa (abs)", 9.6, 9.6e6)]
    [InlineData("kg/cm2g", 1, 191066.5)]
    [InlineData("barg at 101.325 kPa(a)", 1, 201325)]
    [InlineData("barg over 90 kPa", 1, 190e3)]
    [InlineData("psig", 0, 93e3)]
    [InlineData("% of 0 to 16 MPa(g)", 50, 8.093e6)]
    [InlineData("% of 16 MPa(a)", 25, 4e6)]
    public void Map_PressureWithBasis_IsAbsolute(string text, double raw, double pascals) =>
        Approx.Relative(pascals, UnitText.Map(text, UnitKind.AbsolutePressure, Site).Map(raw), 1e-12);

    [Theory]
    [InlineData("kg/s", 1)]
    [InlineData("t/h", 1000 / 3600.0)]
    [InlineData("kg/hr", 1 / 3600.0)]
    [InlineData("lb/h", 0.45359237 / 3600)]
    [InlineData("lbm/h", 0.45359237 / 3600)]
    [InlineData("lb/hr", 0.45359237 / 3600)]
    [InlineData("klb/h", 453.59237 / 3600)]
    [InlineData("MMlb/d", 453592.37 / 86400)]
    [InlineData("m3/h at 1000 kg/m3", 1000 / 3600.0)]
    [InlineData("bpd at 62.4 lb/ft3", 0.158987294928 * 62.4 * 0.45359237 / 0.028316846592 / 86400)]
    [InlineData("gal/min at 1 g/cm3", 3.785411784 / 60)]
    [InlineData("% of 6 kg/s", 0.06)]
    [InlineData("% of 20 m3/h at 1000 kg/m3", 0.2 * 1000 / 3600.0)]
    public void Map_WaterFlow_IsMassFlow(string text, double kilogramsPerSecond) =>
        Approx.Relative(kilogramsPerSecond, UnitText.Map(text, UnitKind.MassFlow, UnitBasis.None).Map(1), 1e-12);

    // Density of air-free water at 101.325 kPa: 999.1026 kg/m³ at 15 °C, 998.2067 at 20 °C, 999.975 at 4 °C (Tanaka et al. 2001, table; to 0.001).
    [Theory]
    [InlineData("m3/d of cold water at 15 °C", 999.1026)]
    [InlineData("m3/d at 20 degC", 998.2067)]
    [InlineData("m3/d(4C)", 999.9750)]
    public void Map_ColdWater_TakesDensityOfItsTemperature(string text, double density) =>
        Approx.Relative(density / 86400, UnitText.Map(text, UnitKind.MassFlow, UnitBasis.None).Map(1), 1e-6);

    [Theory]
    [InlineData("C", 100, 373.15)]
    [InlineData("degC", 0, 273.15)]
    [InlineData("°C", 0, 273.15)]
    [InlineData("F", 212, 373.15)]
    [InlineData("degF", 32, 273.15)]
    [InlineData("K", 300, 300)]
    public void Map_Temperature_IsKelvin(string text, double raw, double kelvins) =>
        Approx.Absolute(kelvins, UnitText.Map(text, UnitKind.Temperature, UnitBasis.None).Map(raw), 1e-10);

    // ISO 13443: 15 °C, 101.325 kPa. DIN 1343: 0 °C. 1 scf (60 °F, 101.325 kPa) is 0.3048³ m³ · 288.15 / 288.70556.
    [Theory]
    [InlineData("Sm3/h", 1)]
    [InlineData("Nm3/h", 1.0549149)]
    [InlineData("scf/h", 0.02826236)]
    [InlineData("m3/h at 0 degC and 101.325 kPa(a)", 1.0549149)]
    [InlineData("scf/h at 60 degF and 14.73 psia", 0.02832784)]
    public void Map_StandardGas_IsCountedAtFifteenDegrees(string text, double cubicMetresPerHour) =>
        Approx.Relative(cubicMetresPerHour / 3600, UnitText.Map(text, UnitKind.StandardGasFlow, UnitBasis.None).Map(1), 2e-6);

    [Theory]
    [InlineData("MMBtu/h", UnitKind.Power, 293071.07)]   // 1 Btu(IT)/h = 0.29307107 W, NIST SP 811 B.8
    [InlineData("Gcal/h", UnitKind.Power, 1.163e6)]
    [InlineData("MJ/Sm3", UnitKind.EnergyPerStandardVolume, 1e6)]
    [InlineData("inch", UnitKind.Length, 0.0254)]
    [InlineData("mm", UnitKind.Length, 1e-3)]
    [InlineData("µm", UnitKind.Length, 1e-6)]
    [InlineData("m²", UnitKind.Area, 1)]
    [InlineData("%", UnitKind.Ratio, 0.01)]
    [InlineData("mg/L", UnitKind.Density, 1e-3)]
    [InlineData("W/(m·K)", UnitKind.ThermalConductivity, 1)]
    [InlineData("yd", UnitKind.Length, 0.9144)]          // UnitsNet's own spelling
    internal void Map_OtherKinds_HaveTheirSize(string text, UnitKind kind, double si) =>
        Approx.Relative(si, UnitText.Map(text, kind, UnitBasis.None).Map(1), 1e-8);

    [Theory]
    [InlineData("Mlb/h", UnitKind.MassFlow, "klb", "MMlb")]
    [InlineData("Mlbm/hr", UnitKind.MassFlow, "klbm", "MMlbm")]
    [InlineData("MBtu/h", UnitKind.Power, "kBtu", "MMBtu")]
    [InlineData("MBTU/hr", UnitKind.Power, "kBTU", "MMBTU")]
    [InlineData("Mscf/d", UnitKind.StandardGasFlow, "kscf", "MMscf")]
    [InlineData("mPag", UnitKind.AbsolutePressure, "millipascal", "megapascal")]
    [InlineData("ton/h", UnitKind.MassFlow, "shortton", "metric")]
    [InlineData("mPa(a)", UnitKind.AbsolutePressure, "millipascal", "megapascal")]
    internal void Map_TwoMeanings_RefusedNamingBoth(string text, UnitKind kind, string one, string other)
    {
        FormatException error = Assert.Throws<FormatException>(() => UnitText.Map(text, kind, Site));
        Assert.Contains(one, error.Message, StringComparison.Ordinal);
        Assert.Contains(other, error.Message, StringComparison.Ordinal);
        Assert.Contains(text, error.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("kPa", UnitKind.AbsolutePressure, "gauge or absolute")]
    [InlineData("psi", UnitKind.AbsolutePressure, "gauge or absolute")]
    [InlineData("inH2O", UnitKind.AbsolutePressure, "gauge or absolute")]
    [InlineData("psig", UnitKind.AbsolutePressure, "atmospheric pressure")]
    [InlineData("kPa(g)", UnitKind.PressureDifference, "differential has none")]
    [InlineData("psid", UnitKind.AbsolutePressure, "difference")]
    [InlineData("m3/d", UnitKind.MassFlow, "base density")]
    [InlineData("gal/min", UnitKind.MassFlow, "base density")]
    [InlineData("m3/d at 80 degC", UnitKind.MassFlow, "0 °C and 40 °C")]
    [InlineData("kg/s at 15 degC", UnitKind.MassFlow, "needs no base")]
    [InlineData("kg/s", UnitKind.Temperature, "temperature")]
    [InlineData("Sm3/h", UnitKind.MassFlow, "gas")]
    [InlineData("Sm3/h at 15 degC", UnitKind.StandardGasFlow, "101.325 kPa(a)")]
    [InlineData("%", UnitKind.PressureDifference, "differential pressure")]
    [InlineData("% of 75", UnitKind.PressureDifference, "has no unit")]
    [InlineData("% of 75 kPa(g)", UnitKind.PressureDifference, "differential has none")]
    [InlineData("% of 10 to 5 kPa", UnitKind.PressureDifference, "ends below")]
    [InlineData("% of kPa", UnitKind.PressureDifference, "number")]
    [InlineData("furlong/fortnight", UnitKind.MassFlow, "water flow")]
    [InlineData("", UnitKind.MassFlow, "no unit")]
    internal void Map_BasisMissingOrWrong_SaysWhatIsWanted(string text, UnitKind kind, string wanted)
    {
        FormatException error = Assert.Throws<FormatException>(() => UnitText.Map(text, kind, UnitBasis.None));
        Assert.Contains(wanted, error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Map_SiteBasis_CompletesTexts()
    {
        UnitBasis basis = Site.WithBaseDensity(Density.FromKilogramsPerCubicMeter(998)).WithWaterColumnTemperature(Temperature.FromDegreesCelsius(20));
        Approx.Relative(998.0 / 3600, UnitText.Map("m3/h", UnitKind.MassFlow, basis).Map(1), 1e-15);
        Approx.Relative(998.2067 * 9.80665 * 0.0254, UnitText.Map("inH2O", UnitKind.PressureDifference, basis).Map(1), 1e-6);
        Approx.Relative(999.1026 / 3600, UnitText.Map("m3/h at 15 degC", UnitKind.MassFlow, basis).Map(1), 1e-6);
    }
}
