using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

internal static partial class Water
{
    /// <summary>The state at T [K] and ρ [kg/m³]: direct in region 3, elsewhere solved for p.</summary>
    public static WaterCore AtTemperatureDensity(double temperature, double density)
    {
        if (!(temperature >= LowestTemperature && temperature <= HighestTemperature && density > 0)) return default;
        if (temperature > Border25Temperature) return OnIsotherm(5, temperature, density, LowestPressure, HighestPressureOfRegion5);
        if (temperature >= CriticalTemperature) return Dense(temperature, density);

        SaturationCore saturation = SaturationLine.AtTemperature(temperature);
        double quality = saturation.Lever(Property.Volume, 1 / density);
        if (quality >= 0 && quality <= 1) return new(saturation, quality);
        if (temperature > Border13Temperature) return Dense(temperature, density);
        return quality < 0
            ? OnIsotherm(1, temperature, density, saturation.Pressure, HighestPressure)
            : OnIsotherm(2, temperature, density, LowestPressure, saturation.Pressure);
    }

    // Beside and above the dome: region 3 where the fluid is denser than on the border to region 2.
    private static WaterCore Dense(double temperature, double density)
    {
        if (temperature > Border23.HighestTemperature) return OnIsotherm(2, temperature, density, LowestPressure, HighestPressure);

        double border = Border23.Pressure(temperature);
        if (density <= Region2.At(border, temperature).Density) return OnIsotherm(2, temperature, density, LowestPressure, border);

        // Beyond any density of region 3 its polynomial turns over and would find a pressure again.
        if (density > Region3.HighestDensity) return default;
        PhaseCore phase = Region3.At(density, temperature);
        return phase.Pressure <= HighestPressure * (1 + EdgeTolerance) ? new(3, phase) : default;
    }

    // Newton's method in p on ρ(p), which is all but straight in vapour and liquid alike, between two pressures.
    private static WaterCore OnIsotherm(int region, double temperature, double density, double low, double high)
    {
        double pressure = Math.Min(Math.Max(density * GasConstant * temperature, low), high), from = low, to = high, previous = double.PositiveInfinity;
        for (int i = 0; i < 100; i++)
        {
            PhaseCore phase = InRegion(region, pressure, temperature);
            double step = (density - phase.Density) * phase.SpecificVolume * phase.BulkModulus;

            // Once steps no longer shrink they are round-off, of which stiff liquid has more.
            bool settled = Math.Abs(step) <= EdgeTolerance * (pressure + phase.BulkModulus) && Math.Abs(step) >= previous / 2;
            if (pressure + step == pressure || settled) return new(region, phase);
            previous = Math.Abs(step);

            if (step > 0) low = pressure;
            else high = pressure;
            if (low >= high)
            {
                // The region is known, so at saturation and at the 2-3 border only round-off can be left.
                bool isEndOfFormulation = region == 5 || pressure <= LowestPressure || pressure >= HighestPressure;
                bool onTheEdge = !isEndOfFormulation || Math.Abs(step) <= EdgeTolerance * pressure;
                return onTheEdge ? new(region, phase) : default;
            }

            double next = pressure + step;
            if (!(next > low)) next = low == from && pressure != from ? from : (low + high) / 2;
            else if (!(next < high)) next = high == to && pressure != to ? to : (low + high) / 2;
            pressure = next;
        }

        return default;
    }

    private static PhaseCore InRegion(int region, double pressure, double temperature) => region switch
    {
        1 => Region1.At(pressure, temperature),
        2 => Region2.At(pressure, temperature),
        _ => Region5.At(pressure, temperature),
    };
}
