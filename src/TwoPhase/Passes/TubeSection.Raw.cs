namespace TwoPhase.Passes;

// What the solvers read: SI doubles, derived from the drawing.
public sealed partial class TubeSection
{
    // Calcium and silicate deposits lie between about 0.5 and 2.5 W/(m·K); common practice, no single source.
    private const double DepositConductivity = 1.5;

    internal double RawLength => (_tubeLength * TubesInSeries) + (ReturnBends * Math.PI * _bendRadius);

    /// <summary>Diameter left free by the scale [m].</summary>
    internal double RawFreeBore => _bore - (2 * _scale);

    internal double RawBore => _bore;

    internal double RawOutsideDiameter => _outsideDiameter;

    internal double RawFlowArea => ParallelTubes * (Math.PI / 4) * RawFreeBore * RawFreeBore;

    internal double RawInsidePerimeter => ParallelTubes * Math.PI * RawFreeBore;

    internal double RawOutsideSurface => (ParallelTubes * Math.PI * _outsideDiameter * _tubeLength * TubesInSeries) + _finSurface;

    internal double RawRise => _rise ?? RawLength * Math.Sin(_inclination);

    /// <summary>The rise where the drawing gives it; null where it follows from the inclination.</summary>
    internal double? GivenRise => _rise;

    internal double RawInclination => _inclination;

    internal double RawRoughness => _roughness;

    internal double RawBendRadius => _bendRadius;

    internal double RawScale => _scale;

    internal double RawScaleConductivity => _scaleConductivity;

    /// <summary>The metal where the drawing gives it; null where it follows from the diameters.</summary>
    internal double? GivenMetalMass => _metalMass;

    internal double RawMetalMass => _metalMass
        ?? (ParallelTubes * (Math.PI / 4) * ((_outsideDiameter * _outsideDiameter) - (_bore * _bore)) * RawLength * Metal.RawDensity) + _finMetal;
}
