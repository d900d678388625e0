using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

// The pressure along the pass: quasi-steady losses of the moment, which the cells then follow through a lag.
internal sealed partial class Channel<TFluid>
{
    private void AimPressure(double outletPressure)
    {
        double lossAfter = 0, head = 0;
        PassNode after = default;
        for (int i = _cells.Length - 1; i >= 0; i--)
        {
            ref Cell cell = ref _cells[i];
            PassNode node = LocalFlow.At(_fluid, _models.Slip, _models.Friction, _ducts[cell.Duct], cell.MassFlux, outletPressure + cell.Head, cell.FlowEnthalpy);
            double loss = node.Loss * cell.Length / 2;
            head += i == _cells.Length - 1 ? loss : loss + lossAfter + MomentumRise(node, after);
            cell.HeadTarget = head;
            (after, lossAfter) = (node, loss);
        }

        _inletHead = head + lossAfter - _cells[0].Head;
    }

    // Within one bore G² vM rises by what the flow gains; across a step of the bore p + G² v / 2 is kept.
    private static double MomentumRise(in PassNode node, in PassNode after)
    {
        double before = node.Flow.MassFlux * node.Flow.MassFlux, behind = after.Flow.MassFlux * after.Flow.MassFlux;
        return node.Flow.Bore == after.Flow.Bore
            ? (behind * after.MomentumVolume) - (before * node.MomentumVolume)
            : ((behind * after.HomogeneousVolume) - (before * node.HomogeneousVolume)) / 2;
    }
}
