using TwoPhase.Passes;

namespace TwoPhase.Stability;

/// <summary>The losses of a pass as the coefficients of a heated channel with something before and something behind it; Δp = k ρ u².</summary>
internal readonly struct LossSplit
{
    public LossSplit(PassProfile profile)
    {
        ReadOnlySpan<PassNode> nodes = profile.Nodes;
        int first = 0, last = nodes.Length - 1;
        while (first < last && !(nodes[first].LinearHeat > 0)) first++;
        while (last > first && !(nodes[last].LinearHeat > 0)) last--;
        double before = 0, heated = 0, behind = 0, momentum = 0, length = 0;
        foreach (NodePanel panel in new NodePanels(nodes))
        {
            double middle = panel.Nodes[2].Position, loss = panel.Integral(static (in PassNode node) => node.Friction + node.Fittings);
            Transit += panel.Integral(static (in PassNode node) => 1 / (node.HomogeneousVolume * node.Flow.MassFlux));
            if (middle < nodes[first].Position) before += loss;
            else if (middle > nodes[last].Position) behind += loss;
            else
            {
                heated += loss;
                momentum += panel.Integral(static (in PassNode node) => node.HomogeneousVolume);
                length += panel.Nodes[Panel.Intervals].Position - panel.Nodes[0].Position;
            }
        }

        double square = nodes[first].Flow.MassFlux * nodes[first].Flow.MassFlux;
        Inlet = before / (square * nodes[0].HomogeneousVolume);
        Friction = heated * length / (square * momentum);
        Exit = behind / (square * nodes[^1].HomogeneousVolume);
    }

    /// <summary>ki [-].</summary>
    public double Inlet { get; }

    /// <summary>F [-].</summary>
    public double Friction { get; }

    /// <summary>ke [-].</summary>
    public double Exit { get; }

    /// <summary>∫ dz/u with both phases at one velocity [s].</summary>
    public double Transit { get; }
}
