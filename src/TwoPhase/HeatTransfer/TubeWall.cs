using TwoPhase.Flow;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.HeatTransfer;

/// <summary>A tube wall, clean or with a layer of scale inside: from heat flux and film to the temperatures through it.</summary>
/// <remarks>
/// <para>Steady radial conduction through concentric layers: T(outside) − T(inside) = Q ln(ro/ri) / (2π k), with Q heat per length of
/// tube [W/m], ro and ri radii [m], k conductivity [W/(m·K)]. The heat crosses the wetted surface as q = Q / (π Dw), Dw the bore that
/// the flow sees: the clean bore less twice the scale.</para>
/// <para>Heat flux stands either on the outside surface (as furnace calculations give it) or on the clean inside surface; the method says which.</para>
/// <para>Range: any; heat flux uniform round the tube, or a local flux with conduction round the tube left out, which overstates the hot side.</para>
/// <para>Accuracy: exact for constant conductivity. Metal loses a tenth or more of its conductivity over a few hundred kelvin: take it at the mean wall temperature.</para>
/// <para>Source: Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, section 3.3.</para>
/// </remarks>
public sealed class TubeWall
{
    private readonly double _bore;                // m, clean
    private readonly double _outsideDiameter;     // m
    private readonly double _conductivity;        // W/(m·K)
    private readonly double _scaleThickness;      // m
    private readonly double _scaleConductivity;   // W/(m·K)

    /// <summary>A clean tube wall.</summary>
    /// <param name="bore">D, inside diameter of the metal, greater than zero.</param>
    /// <param name="outsideDiameter">Outside diameter, greater than the bore.</param>
    /// <param name="conductivity">k, thermal conductivity of the metal at its mean temperature, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument lies outside the limits given with it.</exception>
    public TubeWall(Length bore, Length outsideDiameter, ThermalConductivity conductivity)
    {
        _bore = Require.Positive(bore.Si(), "Bore D", Scale.Millimetres, nameof(bore));
        _outsideDiameter = Require.Positive(outsideDiameter.Si(), "Outside diameter", Scale.Millimetres, nameof(outsideDiameter));
        Require.Below(_bore, _outsideDiameter, "Bore D", Scale.Millimetres, nameof(bore));
        _conductivity = Require.Positive(conductivity.Si(), "Conductivity k", Scale.WattsPerMetreKelvin, nameof(conductivity));
        _scaleConductivity = _conductivity;
    }

    private TubeWall(TubeWall clean, double scaleThickness, double scaleConductivity)
    {
        (_bore, _outsideDiameter, _conductivity) = (clean._bore, clean._outsideDiameter, clean._conductivity);
        (_scaleThickness, _scaleConductivity) = (scaleThickness, scaleConductivity);
    }

    /// <summary>Inside diameter of the metal.</summary>
    public Length Bore => Length.FromMeters(_bore);

    /// <summary>Inside diameter that the flow sees: the bore less twice the scale.</summary>
    public Length WettedBore => Length.FromMeters(WettedDiameter);

    /// <summary>Outside diameter.</summary>
    public Length OutsideDiameter => Length.FromMeters(_outsideDiameter);

    /// <summary>Thickness of the scale inside; zero when clean.</summary>
    public Length ScaleThickness => Length.FromMeters(_scaleThickness);

    private double WettedDiameter => _bore - (2 * _scaleThickness);

    /// <summary>This wall with a layer of scale inside, in place of any it had.</summary>
    /// <param name="thickness">Thickness, zero or more, less than half the bore.</param>
    /// <param name="conductivity">Thermal conductivity of the scale, greater than zero: a few tenths for silica, 1 to 3 W/(m·K) for dense calcium scale or magnetite; common practice.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument lies outside the limits given with it.</exception>
    public TubeWall WithScale(Length thickness, ThermalConductivity conductivity)
    {
        double layer = Require.NotNegative(thickness.Si(), "Thickness of scale", Scale.Millimetres, nameof(thickness));
        Require.Below(layer, _bore / 2, "Thickness of scale", Scale.Millimetres, nameof(thickness));
        return new(this, layer, Require.Positive(conductivity.Si(), "Conductivity of scale", Scale.WattsPerMetreKelvin, nameof(conductivity)));
    }

    /// <summary>Temperatures through the wall for a heat flux on the outside surface.</summary>
    /// <param name="fluid">Temperature of the flow to which the film coefficient refers: saturation while it boils.</param>
    /// <param name="film">h, film coefficient at the wetted surface, greater than zero.</param>
    /// <param name="outsideFlux">Heat flux on the outside surface, inwards; negative when the tube loses heat.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="film"/> is not greater than zero.</exception>
    public WallTemperatures FromOutsideFlux(Temperature fluid, HeatTransferCoefficient film, HeatFlux outsideFlux) =>
        Through(fluid.Si(), Checked(film), Finite(outsideFlux, nameof(outsideFlux)) * Math.PI * _outsideDiameter);

    /// <summary>Temperatures through the wall for a heat flux on the clean inside surface of the metal.</summary>
    /// <param name="fluid">Temperature of the flow to which the film coefficient refers: saturation while it boils.</param>
    /// <param name="film">h, film coefficient at the wetted surface, greater than zero.</param>
    /// <param name="insideFlux">Heat flux on the bore of the metal, inwards; negative when the tube loses heat.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="film"/> is not greater than zero.</exception>
    public WallTemperatures FromInsideFlux(Temperature fluid, HeatTransferCoefficient film, HeatFlux insideFlux) =>
        Through(fluid.Si(), Checked(film), Finite(insideFlux, nameof(insideFlux)) * Math.PI * _bore);

    /// <summary>Temperatures through the wall for a heat flux on the outside surface, with the film of a boiling flow.</summary>
    /// <param name="flow">The flow; its bore is <see cref="WettedBore"/>.</param>
    /// <param name="film">The film model.</param>
    /// <param name="outsideFlux">Heat flux on the outside surface, inwards; zero or more.</param>
    /// <exception cref="ArgumentNullException"><paramref name="film"/> is null.</exception>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="outsideFlux"/> is negative.</exception>
    public WallTemperatures FromOutsideFlux(in TwoPhaseFlow flow, FilmModel film, HeatFlux outsideFlux)
    {
        Require.NotNull(film, nameof(film));
        FlowState state = flow.State;
        double linear = InsideHeatFlux.NotNegative(outsideFlux, nameof(outsideFlux)) * Math.PI * _outsideDiameter;
        return Through(state.SaturationTemperature, film.CoefficientCore(state, linear / (Math.PI * WettedDiameter)), linear);
    }

    /// <summary>The temperatures for a heat per length of tube [W/m]; SI in, arguments trusted.</summary>
    internal WallTemperatures Through(double fluid, double film, double linearHeat)
    {
        double flux = linearHeat / (Math.PI * WettedDiameter);
        double wetted = fluid + (flux / film);
        double inside = wetted + (linearHeat * Math.Log(_bore / WettedDiameter) / (2 * Math.PI * _scaleConductivity));
        double outside = inside + (linearHeat * Math.Log(_outsideDiameter / _bore) / (2 * Math.PI * _conductivity));
        return new(flux, fluid, wetted, inside, outside);
    }

    private static double Checked(HeatTransferCoefficient film) =>
        Require.Positive(film.Si(), "Film coefficient h", Scale.WattsPerSquareMetreKelvin, nameof(film));

    private static double Finite(HeatFlux flux, string parameter) =>
        Require.Finite(flux.Si(), "Heat flux q", Scale.KilowattsPerSquareMetre, parameter);
}
