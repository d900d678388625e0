using TwoPhase.Numerics;
using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

internal static partial class Water
{
    // How near the end of the formulation counts as on it, relative to T.
    private const double EdgeTolerance = 1e-9;

    /// <summary>The state at p where a property has a value: the phase is decided first, then one region's equation is solved for T.</summary>
    /// <remarks>A search in another variable may look up to <paramref name="beyond"/> kelvins over the ends of the formulation.</remarks>
    private static WaterCore OnIsobar(double pressure, Property property, double value, double beyond = 0)
    {
        if (!(pressure >= LowestPressure && pressure <= HighestPressure) || double.IsNaN(value)) return default;

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
            if (value <= branches[i].At(pressure, branches[i].Hot).Value(property)) return OnBranch(branches[i], pressure, property, value, beyond);
        }

        return OnBranch(branches[last], pressure, property, value, beyond);
    }

    // In region 3 density is a variable of the equation: only T is left to solve for, on p(T), which is all but straight.
    private static PhaseCore OnIsochore(double pressure, double density, double temperature)
    {
        double step = double.PositiveInfinity;
        PhaseCore phase = Region3.At(density, temperature);
        for (int i = 0; i < 50 && Math.Abs(step) > 1e-15 * temperature; i++)
        {
            step = (pressure - phase.Pressure) / phase.PressureByTemperature;
            temperature = Math.Min(Math.Max(temperature + step, Border13Temperature - 10), Border23.HighestTemperature + 10);
            phase = Region3.At(density, temperature);
        }

        return phase;
    }

    private static WaterCore Dense(in Branch branch, double pressure, double density)
    {
        PhaseCore phase = OnIsochore(pressure, density, (branch.Cold + branch.Hot) / 2);
        const double tolerance = EdgeTolerance * CriticalTemperature;
        bool isInside = phase.Temperature >= branch.SearchFrom(0) - tolerance && phase.Temperature <= branch.SearchTo(pressure, 0) + tolerance;
        return isInside && Math.Abs(phase.Pressure - pressure) <= EdgeTolerance * pressure ? new(3, phase with { Pressure = pressure }) : default;
    }

    // Beside the critical point a property climbs by kilojoules while T moves by its last digit: there density tells states apart, T does not.
    private static WaterCore Found(in Branch branch, in PhaseCore phase, Property property, double value)
    {
        if (branch.Region != 3 || Math.Abs(value - phase.Value(property)) <= EdgeTolerance * value) return new(branch.Region, phase);

        // Saturated densities are known to round-off only, which is large there.
        const double slack = 1e-4;
        double pressure = phase.Pressure, lowest = branch.At(pressure, branch.Hot).Density * (1 - slack), highest = branch.At(pressure, branch.Cold).Density * (1 + slack);
        RootResult density = BracketedRoot.TryFind(new ByDensity(pressure, property, value), lowest, highest, 0);
        return density.Converged ? new(3, OnIsochore(pressure, density.X, CriticalTemperature) with { Pressure = pressure }) : default;
    }

    // Newton's method in T inside the stretch, halving where a step would leave what is left of it.
    private static WaterCore OnBranch(in Branch branch, double pressure, Property property, double value, double beyond)
    {
        if (branch.Region == 3 && property == Property.Volume) return Dense(branch, pressure, 1 / value);

        double from = branch.Region == 1 && property == Property.Volume ? Math.Min(DensestTemperature(pressure), branch.Hot) : branch.SearchFrom(beyond);
        double to = branch.SearchTo(pressure, beyond), low = from, high = to;
        double start = branch.Start(pressure, property, value);
        double temperature = start >= low && start <= high ? start : (low + high) / 2, previous = double.PositiveInfinity;
        for (int i = 0; i < 100; i++)
        {
            PhaseCore phase = branch.At(pressure, temperature);
            double step = (value - phase.Value(property)) / phase.SlopeAlongIsobar(property);

            // Once steps no longer shrink they are round-off.
            bool settled = Math.Abs(step) <= EdgeTolerance * temperature && Math.Abs(step) >= previous / 2;
            if (temperature + step == temperature || settled) return Found(branch, phase, property, value);
            previous = Math.Abs(step);

            if (step > 0) low = temperature;
            else high = temperature;
            if (low >= high)
            {
                // The phase is known, so at saturation only round-off can be left; the other ends are the formulation's.
                bool onTheEdge = Math.Abs(step) <= EdgeTolerance * temperature
                    || (branch.IsSaturatedAt(temperature) && Math.Abs(value - phase.Value(property)) <= EdgeTolerance * Math.Abs(value));
                return onTheEdge ? Found(branch, phase, property, value) : default;
            }

            double next = temperature + step;
            if (!(next > low)) next = low == from && temperature != from ? from : (low + high) / 2;
            else if (!(next < high)) next = high == to && temperature != to ? to : (low + high) / 2;
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

    // What a property is short of a value, along an isobar of region 3.
    private readonly struct ByDensity(double pressure, Property property, double value) : IScalarFunction
    {
        public double Value(double density) => OnIsochore(pressure, density, CriticalTemperature).Value(property) - value;
    }
}
