using TwoPhase.Units;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Metering;

public abstract partial class PrimaryElement
{
    private ThermalGrowth? _growth;
    private double _calibration = 1;

    /// <summary>Whether the diameters are those of the cold element, to be corrected to the working temperature.</summary>
    public bool IsMeasuredCold => _growth is not null;

    /// <summary>The same element with its diameters taken as measured at another temperature than it works at: pipe and throat grow with the steam.</summary>
    /// <remarks>
    /// <para>d = d0 [1 + λ (T − T0)], and D likewise (ISO 5167-1:2003, 5.1 note: diameters at working conditions). A carbon-steel throat with
    /// λ = 12·10⁻⁶/K, bored at 20 °C and working at 310 °C, has 0.7 % more area: more than a point of quality.</para>
    /// <para>The wall is taken to have the temperature of the steam: insulated, and steady.</para>
    /// </remarks>
    /// <param name="pipe">λ of the pipe's material: mean linear expansion between the two temperatures, not negative, below 10⁻⁴ 1/K.</param>
    /// <param name="throat">λ of the material of throat, nozzle or plate.</param>
    /// <param name="at">T0, temperature at which the diameters were measured.</param>
    /// <exception cref="ArgumentOutOfRangeException">A coefficient is outside its limits.</exception>
    public PrimaryElement MeasuredCold(CoefficientOfThermalExpansion pipe, CoefficientOfThermalExpansion throat, Temperature at)
    {
        double reference = Require.Positive(at.Si(), "Temperature", Scale.Kelvins, nameof(at));
        var changed = (PrimaryElement)MemberwiseClone();
        changed._growth = new ThermalGrowth(Coefficient(pipe, nameof(pipe)), Coefficient(throat, nameof(throat)), reference);
        return changed;
    }

    /// <summary>The same element with the diameters that it has at a working temperature.</summary>
    /// <param name="temperature">T, temperature of pipe and element.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="temperature"/> is not above absolute zero.</exception>
    public PrimaryElement HotAt(Temperature temperature)
    {
        var changed = (PrimaryElement)MemberwiseClone();
        changed._geometry = Grown(Require.Positive(temperature.Si(), "Temperature", Scale.Kelvins, nameof(temperature)));
        changed._growth = null;
        return changed;
    }

    /// <summary>The same element with another throat: all that a sizing search changes.</summary>
    /// <param name="throat">d, greater than zero and below the pipe diameter.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="throat"/> is outside its limits.</exception>
    public PrimaryElement WithThroat(Length throat)
    {
        double d = Require.Positive(throat.Si(), "Throat diameter", Scale.Millimetres, nameof(throat));
        Require.Below(d, _geometry.PipeDiameter, "Throat diameter", Scale.Millimetres, nameof(throat));
        return WithThroat(d);
    }

    /// <summary>C in place over C of the standard, as a calibration or a fit has found it; 1 unless <see cref="Calibrated"/>.</summary>
    public double CalibrationFactor => _calibration;

    /// <summary>The same element with its discharge coefficient scaled at every Reynolds number, also that which a wet-steam model brings.</summary>
    /// <param name="factor">C in place over C of the standard, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="factor"/> is not greater than zero.</exception>
    public PrimaryElement Calibrated(double factor)
    {
        var changed = (PrimaryElement)MemberwiseClone();
        changed._calibration = Require.Positive(factor, "Calibration factor", Scale.None, nameof(factor));
        return changed;
    }

    internal PrimaryElement WithThroat(double throat)
    {
        var changed = (PrimaryElement)MemberwiseClone();
        changed._geometry = new MeterGeometry(_geometry.PipeDiameter, throat);
        return changed;
    }

    internal override MeterGeometry SinglePhaseGeometry(Temperature? temperature) =>
        temperature is { } given ? GeometryAt(Require.Positive(given.Si(), "Temperature", Scale.Kelvins, nameof(temperature)))
        : _growth is null ? _geometry.WithFlowFactor(_calibration)
        : throw new ArgumentException($"The {Name} was measured cold: give the working temperature.", nameof(temperature));

    private MeterGeometry Grown(double temperature) => _growth is { } growth ? growth.Apply(_geometry, temperature) : _geometry;

    private static double Coefficient(CoefficientOfThermalExpansion value, string parameter) =>
        Require.Within(value.As(CoefficientOfThermalExpansionUnit.PerKelvin), 0, 1e-4, "Coefficient of thermal expansion", new Scale("1/K", 1), parameter);

    /// <summary>How the element was measured cold; null when its diameters are those at work.</summary>
    internal ThermalGrowth? Growth => _growth;

    internal sealed class ThermalGrowth(double pipeCoefficient, double throatCoefficient, double reference)
    {
        public double PipeCoefficient => pipeCoefficient;

        public double ThroatCoefficient => throatCoefficient;

        public double Reference => reference;

        public MeterGeometry Apply(in MeterGeometry cold, double temperature) => new(
            cold.PipeDiameter * (1 + (pipeCoefficient * (temperature - reference))),
            cold.ThroatDiameter * (1 + (throatCoefficient * (temperature - reference))));
    }
}
