using TwoPhase.HeatTransfer;
using TwoPhase.Numerics;
using TwoPhase.Passes;

namespace TwoPhase.Boiling;

/// <summary>The first place of a profile where some lead over the onset turns positive, between rows too; SI doubles.</summary>
internal static class OnsetSearch
{
    /// <summary>Wall superheat of liquid alone less the one that bubbles need [K].</summary>
    public static double BubbleLead(in PassNode node, double flux, OnsetModel model) =>
        node.Temperature + (flux / WallSolver.OnePhase(node)) - node.Flow.SaturationTemperature - model.SuperheatCore(WallSolver.Saturated(node), flux);

    /// <summary>Equilibrium quality less the one at which vapour stays.</summary>
    public static double VapourLead(in PassNode node, double flux, NetVapourModel model) =>
        node.EquilibriumQuality - model.DepartureCore(WallSolver.Saturated(node), flux);

    /// <summary>The first place with a lead; at the latest where equilibrium quality is zero. Null when there is none.</summary>
    public static PassNode? First(PassProfile profile, Func<PassNode, double, double> lead)
    {
        ReadOnlySpan<PassNode> nodes = profile.Nodes;
        int last = profile.OnsetRow, end = last >= 0 ? last : nodes.Length - 1;
        int row = 0;
        while (row <= end && !(Lead(row) >= 0)) row++;
        if (row > end) return last >= 0 ? nodes[last] : null;
        return row == 0 || nodes[row].Position == nodes[row - 1].Position ? nodes[row] : Between(profile, row, Lead);

        double Lead(int index) => lead(profile.Nodes[index], Flux(profile, profile.Nodes[index]));
    }

    private static double Flux(PassProfile profile, in PassNode node) => Math.Max(0, node.LinearHeat / profile.Pass.Ducts[node.Duct].Perimeter);

    /// <summary>The place between a row and the one before it, by the quartic through their panel.</summary>
    private static PassNode Between(PassProfile profile, int row, Func<int, double> lead)
    {
        int first = row - 1;
        while (!IsPanelStart(profile, first)) first--;
        var quartic = new Quartic(lead(first), lead(first + 1), lead(first + 2), lead(first + 3), lead(first + 4));
        RootResult root = BracketedRoot.TryFind(quartic, row - 1 - first, row - first, 1e-12);
        if (!root.Converged) return profile.Nodes[row];

        ReadOnlySpan<PassNode> five = profile.Nodes.Slice(first, Panel.Intervals + 1);
        PassNode before = profile.Nodes[row - 1];
        double position = Through(five, static node => node.Position).Value(root.X);
        return before with
        {
            Position = position,
            Volume = before.Volume + (profile.Pass.Ducts[before.Duct].Area * (position - before.Position)),
            Temperature = Through(five, static node => node.Temperature).Value(root.X),
            Flow = before.Flow with { Pressure = Through(five, static node => node.Pressure).Value(root.X) },
        };
    }

    private static bool IsPanelStart(PassProfile profile, int row)
    {
        int start = row;
        while (start > 0 && profile.Nodes[start - 1].Duct == profile.Nodes[row].Duct) start--;
        return (row - start) % Panel.Intervals == 0;
    }

    private static Quartic Through(ReadOnlySpan<PassNode> five, Func<PassNode, double> figure) =>
        new(figure(five[0]), figure(five[1]), figure(five[2]), figure(five[3]), figure(five[4]));

    /// <summary>The quartic through five values at 0, 1, 2, 3, 4, by Newton's forward differences.</summary>
    private readonly struct Quartic(double f0, double f1, double f2, double f3, double f4) : IScalarFunction
    {
        private readonly double _first = f1 - f0, _second = f2 - (2 * f1) + f0, _third = f3 - (3 * f2) + (3 * f1) - f0, _fourth = f4 - (4 * f3) + (6 * f2) - (4 * f1) + f0;

        public double Value(double t) => f0 + (t * (_first + ((t - 1) / 2 * (_second + ((t - 2) / 3 * (_third + ((t - 3) / 4 * _fourth)))))));
    }
}
