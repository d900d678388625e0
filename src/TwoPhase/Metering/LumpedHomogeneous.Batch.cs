#if NET
using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using TwoPhase.Steam;
using TwoPhase.Units;

namespace TwoPhase.Metering;

// Many samples at a time: both volumes as polynomials, which vectors evaluate without looking anything up.
internal static partial class LumpedHomogeneous
{
    // v′ and p v″ are smooth in the fourth root of the pressure; over the range of plants degree 22 is within 2e-10 in quality.
    private const double Lowest = 0.4e6, Highest = 16.5e6;
    private const int Degree = 22, Lanes = 8, Vectors = 4, Block = Lanes * Vectors;
    private const ulong AllLanes = (1UL << Lanes) - 1;

    private static readonly double Middle = (Root(Lowest) + Root(Highest)) / 2, Half = (Root(Highest) - Root(Lowest)) / 2;

    /// <summary>Samples that one pass of the loop takes; fewer go the single way.</summary>
    public static int Width => Vector256.IsHardwareAccelerated ? Block : int.MaxValue;

    /// <summary>
    /// Qualities of the leading samples, as long as every block of them is good; returns how many it did. The caller does the next
    /// block one by one, so that a bad sample gets its own status.
    /// </summary>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public static int Batch(
        double square,
        ReadOnlySpan<double> flow,
        LinearMap toFlow,
        ReadOnlySpan<double> pressure,
        LinearMap toPressure,
        ReadOnlySpan<double> differential,
        LinearMap toDifferential,
        Span<double> quality,
        Span<ReadingStatus> status)
    {
        ref double flows = ref MemoryMarshal.GetReference(flow), pressures = ref MemoryMarshal.GetReference(pressure), differentials = ref MemoryMarshal.GetReference(differential), qualities = ref MemoryMarshal.GetReference(quality);
        ref int states = ref Unsafe.As<ReadingStatus, int>(ref MemoryMarshal.GetReference(status));
        int done = 0;
        for (; done + Block <= quality.Length; done += Block)
        {
            nuint at = (nuint)done;
            Vector512<double> p0 = Map(ref pressures, at, toPressure), p1 = Map(ref pressures, at + Lanes, toPressure), p2 = Map(ref pressures, at + (2 * Lanes), toPressure), p3 = Map(ref pressures, at + (3 * Lanes), toPressure);
            Vector512<double> t0 = Argument(p0), t1 = Argument(p1), t2 = Argument(p2), t3 = Argument(p3);
            double[] liquidSeries = Series.Liquid, vapourSeries = Series.Vapour;
            Vector512<double> l0 = Vector512.Create(liquidSeries[Degree]), l1 = l0, l2 = l0, l3 = l0, v0 = Vector512.Create(vapourSeries[Degree]), v1 = v0, v2 = v0, v3 = v0;
            for (int i = Degree - 1; i >= 0; i--)
            {
                Vector512<double> liquid = Vector512.Create(liquidSeries[i]), vapour = Vector512.Create(vapourSeries[i]);
                l0 = Vector512.FusedMultiplyAdd(l0, t0, liquid);
                l1 = Vector512.FusedMultiplyAdd(l1, t1, liquid);
                l2 = Vector512.FusedMultiplyAdd(l2, t2, liquid);
                l3 = Vector512.FusedMultiplyAdd(l3, t3, liquid);
                v0 = Vector512.FusedMultiplyAdd(v0, t0, vapour);
                v1 = Vector512.FusedMultiplyAdd(v1, t1, vapour);
                v2 = Vector512.FusedMultiplyAdd(v2, t2, vapour);
                v3 = Vector512.FusedMultiplyAdd(v3, t3, vapour);
            }

            bool good = Finish(p0, l0, v0, square, Map(ref flows, at, toFlow), Map(ref differentials, at, toDifferential), ref qualities, ref states, at)
                & Finish(p1, l1, v1, square, Map(ref flows, at + Lanes, toFlow), Map(ref differentials, at + Lanes, toDifferential), ref qualities, ref states, at + Lanes)
                & Finish(p2, l2, v2, square, Map(ref flows, at + (2 * Lanes), toFlow), Map(ref differentials, at + (2 * Lanes), toDifferential), ref qualities, ref states, at + (2 * Lanes))
                & Finish(p3, l3, v3, square, Map(ref flows, at + (3 * Lanes), toFlow), Map(ref differentials, at + (3 * Lanes), toDifferential), ref qualities, ref states, at + (3 * Lanes));
            if (!good) break;
        }

        return done;
    }

    // x = p (k² Δp − v′ ṁ²) / (ṁ² (p v″ − p v′)): one division a sample.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static bool Finish(Vector512<double> pressure, Vector512<double> liquid, Vector512<double> vapour, double square, Vector512<double> flow, Vector512<double> differential, ref double qualities, ref int states, nuint at)
    {
        Vector512<double> squared = flow * flow;
        Vector512<double> quality = pressure * ((differential * square) - (liquid * squared)) / (squared * (vapour - (pressure * liquid)));
        quality.StoreUnsafe(ref qualities, at);
        Vector256.Create((int)ReadingStatus.WetSteam).StoreUnsafe(ref states, at);

        // Comparisons that NaN fails.
        Vector512<double> inside = Vector512.GreaterThanOrEqual(pressure, Vector512.Create(Lowest)) & Vector512.LessThanOrEqual(pressure, Vector512.Create(Highest))
            & Vector512.GreaterThan(differential, Vector512<double>.Zero) & Vector512.LessThan(differential, pressure)
            & Vector512.GreaterThan(flow, Vector512<double>.Zero) & Vector512.LessThan(flow, Vector512.Create(double.PositiveInfinity));
        Vector512<double> wet = Vector512.GreaterThanOrEqual(quality, Vector512<double>.Zero) & Vector512.LessThanOrEqual(quality, Vector512<double>.One);
        if (Vector512.ExtractMostSignificantBits(wet) != AllLanes) Tell(ref qualities, ref states, at);
        return Vector512.ExtractMostSignificantBits(inside) == AllLanes;
    }

    // Rare: at least one of eight is below 0 or above 1.
    private static void Tell(ref double qualities, ref int states, nuint at)
    {
        for (nuint i = at; i < at + Lanes; i++)
        {
            double quality = Unsafe.Add(ref qualities, i);
            Unsafe.Add(ref states, i) = (int)(quality < 0 ? ReadingStatus.SubcooledOutlet : quality > 1 ? ReadingStatus.SuperheatedOutlet : ReadingStatus.WetSteam);
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static Vector512<double> Map(ref double values, nuint at, LinearMap map) =>
        Vector512.FusedMultiplyAdd(Vector512.LoadUnsafe(ref values, at), Vector512.Create(map.Factor), Vector512.Create(map.Offset));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static Vector512<double> Argument(Vector512<double> pressure) =>
        (Vector512.Sqrt(Vector512.Sqrt(pressure)) - Vector512.Create(Middle)) * Vector512.Create(1 / Half);

    private static double Root(double pressure) => Math.Sqrt(Math.Sqrt(pressure));

    // Built on first use from the formulation: interpolation at the Chebyshev nodes, then powers of the argument.
    private static class Series
    {
        public static readonly double[] Liquid = Fit(static (pressure, steam) => steam.LiquidVolume);

        public static readonly double[] Vapour = Fit(static (pressure, steam) => pressure * steam.VapourVolume);

        private static double[] Fit(Func<double, SaturatedPhases, double> property)
        {
            const int nodes = Degree + 1;
            var values = new double[nodes];
            for (int j = 0; j < nodes; j++)
            {
                double root = Middle + (Half * Math.Cos(Math.PI * (j + 0.5) / nodes)), pressure = root * root * root * root;
                values[j] = property(pressure, SaturationTable.Phases(pressure));
            }

            double[] powers = new double[nodes], before = new double[nodes], current = new double[nodes];
            (before[0], current[1]) = (1, 1);
            for (int k = 0; k < nodes; k++)
            {
                double weight = 0;
                for (int j = 0; j < nodes; j++) weight += values[j] * Math.Cos(Math.PI * k * (j + 0.5) / nodes) * (k == 0 ? 1.0 : 2.0) / nodes;
                double[] chebyshev = k == 0 ? before : current;
                for (int i = 0; i < nodes; i++) powers[i] += weight * chebyshev[i];
                if (k > 0) (before, current) = (current, Next(before, current));
            }

            return powers;
        }

        // T(k+1) = 2 t T(k) − T(k−1).
        private static double[] Next(double[] before, double[] current)
        {
            var next = new double[before.Length];
            for (int i = 0; i < next.Length; i++) next[i] = (i > 0 ? 2 * current[i - 1] : 0) - before[i];
            return next;
        }
    }
}
#endif
