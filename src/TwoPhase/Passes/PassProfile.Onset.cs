namespace TwoPhase.Passes;

public sealed partial class PassProfile
{
    // A solver stops a panel at xe = 0 to about 1e-11; what is closer than this is that row.
    private const double AtBoiling = 1e-9;

    /// <summary>Index of the row where boiling begins: the first with an equilibrium quality of zero or more; −1 for none.</summary>
    internal int OnsetRow => Array.FindIndex(_nodes, static node => node.EquilibriumQuality > -AtBoiling);
}
