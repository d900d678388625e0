using System.Globalization;
using UnitsNet;

namespace TwoPhase.HeatTransfer;

/// <summary>Temperatures from the flow outwards through film, scale and metal.</summary>
public readonly struct WallTemperatures : IEquatable<WallTemperatures>
{
    private readonly double _wettedFlux, _fluid, _wetted, _inside, _outside;   // W/m², K

    internal WallTemperatures(double wettedFlux, double fluid, double wetted, double inside, double outside) =>
        (_wettedFlux, _fluid, _wetted, _inside, _outside) = (wettedFlux, fluid, wetted, inside, outside);

    /// <summary>Heat flux at the wetted surface, which is what a film correlation takes.</summary>
    public HeatFlux WettedHeatFlux => HeatFlux.FromWattsPerSquareMeter(_wettedFlux);

    /// <summary>The flow.</summary>
    public Temperature Fluid => Temperature.FromKelvins(_fluid);

    /// <summary>The surface that the flow touches: scale, or clean metal.</summary>
    public Temperature WettedSurface => Temperature.FromKelvins(_wetted);

    /// <summary>The metal at its bore, under the scale.</summary>
    public Temperature InsideMetal => Temperature.FromKelvins(_inside);

    /// <summary>The metal at its outside surface, where thermocouples sit and creep begins.</summary>
    public Temperature OutsideMetal => Temperature.FromKelvins(_outside);

    /// <inheritdoc/>
    public bool Equals(WallTemperatures other) =>
        _wettedFlux.Equals(other._wettedFlux) && _fluid.Equals(other._fluid) && _wetted.Equals(other._wetted)
        && _inside.Equals(other._inside) && _outside.Equals(other._outside);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is WallTemperatures other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => (_outside.GetHashCode() * 397) ^ _wetted.GetHashCode();

    /// <summary>Whether two sets are equal.</summary>
    public static bool operator ==(WallTemperatures left, WallTemperatures right) => left.Equals(right);

    /// <summary>Whether two sets differ.</summary>
    public static bool operator !=(WallTemperatures left, WallTemperatures right) => !left.Equals(right);

    internal object ToDump() => ToString();

    /// <summary>The temperatures from the flow outwards in °C, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "fluid {0:F1}, wetted surface {1:F1}, inside metal {2:F1}, outside metal {3:F1} °C",
        _fluid - 273.15,
        _wetted - 273.15,
        _inside - 273.15,
        _outside - 273.15);
}
