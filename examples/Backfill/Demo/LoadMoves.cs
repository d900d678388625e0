namespace Backfill.Demo;

/// <summary>The load that is asked of the invented generator: another level every three hours or so, reached in ten minutes.</summary>
internal sealed class LoadMoves(Chance chance)
{
    private const double Slot = 10_800, Ramp = 600, Lowest = 0.84, Highest = 0.97;

    public double At(double seconds)
    {
        long slot = (long)Math.Floor(seconds / Slot);
        double begin = (slot * Slot) + (chance.Of("begin", slot).Share * (Slot - Ramp));
        double share = Math.Clamp((seconds - begin) / Ramp, 0, 1);
        return Level(slot - 1) + (share * (Level(slot) - Level(slot - 1)));
    }

    private double Level(long slot) => Lowest + ((Highest - Lowest) * chance.Of("level", slot).Share);
}
