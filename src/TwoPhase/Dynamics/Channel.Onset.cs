namespace TwoPhase.Dynamics;

// Where boiling begins.
internal sealed partial class Channel<TFluid>
{
    /// <summary>Distance from the inlet at which the flow first has an equilibrium quality of zero [m]; NaN when it nowhere has.</summary>
    /// <remarks>Quality at a face is the mean of what both cells beside it, each at its own pressure, make of the enthalpy that crosses it.</remarks>
    public double Onset
    {
        get
        {
            double before = _cells[0].Steam.Quality(FeedEnthalpy);
            for (int i = 0; i < _cells.Length; i++)
            {
                ref readonly Cell cell = ref _cells[i];
                double after = cell.Steam.Quality(cell.OutEnthalpy);
                if (i + 1 < _cells.Length) after = (after + _cells[i + 1].Steam.Quality(cell.OutEnthalpy)) / 2;
                if (before >= 0) return cell.Start;
                if (after > 0) return cell.Start + (cell.Length * before / (before - after));
                before = after;
            }

            return double.NaN;
        }
    }
}
