using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

internal static partial class Water
{
    // How near the end of the formulation counts as on it, relative to T.
    private const double EdgeTolerance = 1e-9;

    /// <summary>The state at p where a property has a value: the phase is decided first, then one region's equation is solved for T.</summary>
    private static WaterCore OnIsobar(double pressure, Property property, double value)
    {
        if (!(pressure > 0 && pressure <= HighestPressure) || double.IsNaN(value)) return default;

        Span<Branch> branches = stackalloc Branch[Branch.Most];
        int count;
        if (pressure >= CriticalPressure)
        {
            count = Branch.Supercritical(pressure, branches);
        }
        else if (pressure < SaturationLine.LowestPressure)
        {
            count = Branch.Superheated(pressure, LowestTemperature, false, branches);
        }
        else
        {
            // The backward equations are good to 25 mK, enough to land on the wrong side of saturation.
            SaturationCore saturation = SaturationLine.AtPressure(pressure);
            double quality = saturation.Lever(property, value);
            if (quality >= 0 && quality <= 1) return new(saturation, quality);
            count = quality < 0
                ? Branch.Liquid(saturation.Temperature, branches)
                : Branch.Vapour(pressure, saturation.Temperature, branches);
        }

        int last = count - 1;
        for (int i = 0; i < last; i++)
        {
            if (value <= branches[i].At(pressure, branches[i].Hot).Value(property)) return OnBranch(branches[i], pressure, property, value);
        }

        return OnBranch(branches[last], pressure, property, value);
    }

    // Newton's method in T inside the stretch, halving where a step would leave what is left of it.
    private static WaterCore OnBranch(in Branch branch, double pressure, Property property, double value)
    {
        double from = branch.Region == 1 && property == Property.Volume ? DensestTemperature(pressure) : branch.SearchFrom, to = branch.SearchTo(pressure), low = from, high = to;
        double start = branch.Start(pressure, property, value);
        double temperature = start >= low && start <= high ? start : (low + high) / 2;
        for (int i = 0; i < 100; i++)
        {
            PhaseCore phase = branch.At(pressure, temperature);
            double step = (value - phase.Value(property)) / phase.SlopeAlongIsobar(property);
            bool stays = Math.Abs(step) <= 1e-15 * temperature;
            if (stays) return new(branch.Region, phase);

            if (step > 0) low = temperature;
            else high = temperature;
            if (low >= high)
            {
                bool onTheEdge = branch.IsSaturatedAt(temperature) || Math.Abs(step) <= EdgeTolerance * temperature;
                return onTheEdge ? new(branch.Region, phase) : default;
            }

            double next = temperature + step;
            if (!(next > low)) next = low == from && temperature != from ? from : (low + high) / 2;
            else if (!(next < high)) next = high == to && temperature != to ? to : (low + high) / 2;
            if (Math.Abs(next - temperature) <= 2e-16 * temperature) return new(branch.Region, phase);
            temperature = next;
        }

        return default;
    }

    /// <summary>The temperature of greatest density [K]: cold water expands on cooling, and of two temperatures of one density the warmer is meant.</summary>
    public static double DensestTemperature(double pressure)
    {
        double low = LowestTemperature, high = 278;
        if (Region1.At(pressure, low).PressureByTemperature >= 0) return low;
        while (high - low > 1e-9)
        {
            double middle = (low + high) / 2;
            if (Region1.At(pressure, middle).PressureByTemperature < 0) low = middle;
            else high = middle;
        }

        return high;
    }
}
