using TwoPhase.HeatTransfer;
using UnitsNet;

namespace TwoPhase.Passes;

public sealed partial class TubeSection
{
    /// <summary>The tube wall with its scale, without fins: heat per length passes through it.</summary>
    public TubeWall Wall => new TubeWall(Bore, OutsideDiameter, Metal.Conductivity).WithScale(ScaleThickness, ScaleConductivity);
}
