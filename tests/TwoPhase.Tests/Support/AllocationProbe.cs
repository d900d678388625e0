namespace TwoPhase.Tests.Support;

/// <summary>Bytes that an action allocates on this thread once it is warm.</summary>
internal static class AllocationProbe
{
    public static long Bytes(Action action)
    {
        for (int i = 0; i < 3; i++) action();
        long before = GC.GetAllocatedBytesForCurrentThread();
        action();
        return GC.GetAllocatedBytesForCurrentThread() - before;
    }
}
