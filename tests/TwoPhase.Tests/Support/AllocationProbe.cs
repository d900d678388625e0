namespace TwoPhase.Tests.Support;

/// <summary>Bytes that an action allocates on this thread once it is warm.</summary>
internal static class AllocationProbe
{
    // The runtime recompiles methods while they run and may allocate for that; what the action itself allocates comes every time.
    private const int Tries = 5;

    public static long Bytes(Action action)
    {
        long least = long.MaxValue;
        for (int i = 0; i < Tries && least != 0; i++)
        {
            for (int warm = 0; warm < 3; warm++) action();
            long before = GC.GetAllocatedBytesForCurrentThread();
            action();
            least = Math.Min(least, GC.GetAllocatedBytesForCurrentThread() - before);
        }

        return least;
    }
}
