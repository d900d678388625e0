using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

/// <summary>Cuts the sections of a pass into cells of about equal volume, each inside one section.</summary>
internal static class Mesh
{
    public static Cell[] Cut(Duct[] ducts, int cells)
    {
        double total = ducts.Sum(duct => duct.Area * duct.Length);
        var list = new List<Cell>(cells + ducts.Length);
        for (int d = 0; d < ducts.Length; d++)
        {
            Duct duct = ducts[d];
            int count = Math.Max(1, (int)Math.Round(cells * duct.Area * duct.Length / total));
            for (int i = 0; i < count; i++) list.Add(CellOf(duct, d, (double)i / count, (i + 1.0) / count));
        }

        Cell[] all = [.. list];
        for (int i = 0; i < all.Length; i++) all[i].PerSpacing = 2 / (all[i].Volume + all[Math.Min(i + 1, all.Length - 1)].Volume);
        return all;
    }

    private static Cell CellOf(in Duct duct, int index, double from, double to)
    {
        double length = duct.Length * (to - from), share = duct.HeatShare * (duct.Flux.Cumulated(to) - duct.Flux.Cumulated(from));
        return new()
        {
            Duct = index,
            Length = length,
            Start = duct.Start + (duct.Length * from),
            Volume = duct.Area * length,
            PerArea = 1 / duct.Area,
            Surface = duct.Perimeter * length,
            Capacity = duct.MetalCapacity * length,
            HeatShare = share,
            OwnShare = share,
            WaveFactor = 1,
            PhaseEnthalpy = double.NaN,
        };
    }
}
