<Query Kind="Statements">
  <NuGetReference>TwoPhase</NuGetReference>
  <Namespace>TwoPhase.Steam</Namespace>
  <Namespace>UnitsNet</Namespace>
</Query>

// Water and steam by IAPWS-IF97: one state by any pair of properties, and a short saturation table.
SteamState.FromPressureTemperature(Pressure.FromMegapascals(9.6), Temperature.FromDegreesCelsius(170)).Dump("feed water");
SteamState.FromPressureQuality(Pressure.FromMegapascals(9.6), MassFraction.FromPercent(78)).Dump("wet steam");

new[] { 4.0, 6, 8, 10, 12, 14 }
    .Select(megapascals => Saturation.FromPressure(Pressure.FromMegapascals(megapascals)))
    .Select(line => new
    {
        MPa = Math.Round(line.Pressure.Megapascals, 1),
        Celsius = Math.Round(line.Temperature.DegreesCelsius, 2),
        LiquidDensity = Math.Round(line.Liquid.Density.KilogramsPerCubicMeter, 2),
        VapourDensity = Math.Round(line.Vapour.Density.KilogramsPerCubicMeter, 3),
        LatentHeat = Math.Round(line.LatentHeat.KilojoulesPerKilogram, 1),
    })
    .Dump("saturation: MPa, °C, kg/m³, kg/m³, kJ/kg");
