using TwoPhase.Friction;

namespace TwoPhase.Passes;

// The pass laid out for the solvers: its sections, then the outlet line as one more.
public sealed partial class Pass
{
    /// <summary>Name under which the outlet line appears in results.</summary>
    internal const string OutletLineName = "outlet line";

    internal Duct[] Ducts { get; private set; } = [];

    private void Lay()
    {
        var ducts = new List<Duct>(_sections.Length + 1);
        double start = 0, volume = 0;
        foreach (TubeSection section in _sections)
        {
            ducts.Add(DuctOf(section, start, volume));
            start += section.RawLength;
            volume += section.RawLength * section.RawFlowArea;
        }

        if (OutletLine is { } line) ducts.Add(DuctOf(line, start, volume));
        Ducts = [.. ducts];
    }

    private Duct DuctOf(TubeSection section, double start, double volumeBefore)
    {
        SectionHeat? heat = Heat?.Find(section.Name);
        return new()
        {
            Name = section.Name,
            Start = start,
            Length = section.RawLength,
            VolumeBefore = volumeBefore,
            Bore = section.RawFreeBore,
            Area = section.RawFlowArea,
            Perimeter = section.RawInsidePerimeter,
            FlowShare = Interchanger is { } exchanger && exchanger.ColdSection == section.Name ? 1 - exchanger.RawBypass : 1,
            Roughness = section.RawRoughness,
            FrictionMultiplier = section.FrictionMultiplier,
            BendLoss = section.ReturnBends * section.BendLossCoefficient / section.RawLength,
            BendB = section.BendLossCoefficient > 0 ? LocalLoss.BendBCore(section.BendLossCoefficient, section.RawBendRadius / section.RawFreeBore) : 1,
            OtherLoss = section.LossCoefficient / section.RawLength,
            Rise = section.RawRise / section.RawLength,
            Inclination = section.RawInclination,
            ExchangeSign = Interchanger?.ColdSection == section.Name ? 1 : Interchanger?.HotSection == section.Name ? -1 : 0,
            HeatShare = heat?.RawShare ?? 0,
            Flux = heat?.Curve ?? FluxCurve.Uniform,
            MetalCapacity = section.RawMetalMass * section.Metal.RawHeatCapacity / section.RawLength,
        };
    }

    private static Duct DuctOf(OutletLine line, double start, double volumeBefore)
    {
        double area = Math.PI / 4 * line.RawBore * line.RawBore, length = line.RawVolume / area;
        return new()
        {
            Name = OutletLineName,
            Start = start,
            Length = length,
            VolumeBefore = volumeBefore,
            Bore = line.RawBore,
            Area = area,
            Perimeter = Math.PI * line.RawBore,
            FlowShare = 1,
            OtherLoss = line.LossCoefficient / length,
            Flux = FluxCurve.Uniform,
        };
    }
}
