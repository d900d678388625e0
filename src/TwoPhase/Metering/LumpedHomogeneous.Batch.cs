#if NET
using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using TwoPhase.Numerics;
using TwoPhase.Steam;
using TwoPhase.Units;

namespace TwoPhase.Metering;

// Four samples at a time, the same to the last bit as one by one.
internal static partial class LumpedHomogeneous
{
    private const uint AllLanes = (1U << Lanes) - 1;

    /// <summary>
    /// Qualities of the leading samples, as long as every four of them are wet steam; returns how many it did. The caller takes the next
    /// four by themselves, so that each gets its own status.
    /// </summary>
    [MethodImpl(Fast.Hot)]
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
        double top = SaturationTable.HighestPressure;
        TwoCurves.Vectors lever = Lever.Curves.InVectors;
        Vector256<double> lowest = Vector256.Create(SaturationTable.LowestPressure), highest = Vector256.Create(top), squares = Vector256.Create(square);
        Line flowLine = new(toFlow), pressureLine = new(toPressure), differentialLine = new(toDifferential);
        int done = 0;
        for (; done + Lanes <= quality.Length; done += Lanes)
        {
            nuint at = (nuint)done;
            Vector256<double> m = flowLine.Map(ref flows, at), p = pressureLine.Map(ref pressures, at), dp = differentialLine.Map(ref differentials, at);

            // Comparisons that NaN fails.
            Vector256<double> covered = Vector256.GreaterThanOrEqual(p, lowest) & Vector256.LessThanOrEqual(p, highest) & Vector256.LessThan(dp, p);
            if (covered.ExtractMostSignificantBits() != AllLanes) break;

            // A flow below zero, without end or missing, or a differential not above zero, makes no quality from 0 to 1.
            lever.At(p, out Vector256<double> perVolume, out Vector256<double> atZero);
            Vector256<double> x = Vector256.FusedMultiplyAdd(squares * dp / (m * Vector256.Abs(m)), perVolume, -atZero);
            Vector256<double> wet = Vector256.GreaterThanOrEqual(x, Vector256<double>.Zero) & Vector256.LessThanOrEqual(x, Vector256<double>.One);
            if (wet.ExtractMostSignificantBits() != AllLanes) break;
            x.StoreUnsafe(ref qualities, at);
            Vector128.Create((int)ReadingStatus.WetSteam).StoreUnsafe(ref states, at);
        }

        return done;
    }

    /// <summary>A <see cref="LinearMap"/> held in registers.</summary>
    private readonly struct Line(LinearMap map)
    {
        private readonly Vector256<double> _factor = Vector256.Create(map.Factor), _offset = Vector256.Create(map.Offset);

        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        public Vector256<double> Map(ref double values, nuint at) => Vector256.FusedMultiplyAdd(Vector256.LoadUnsafe(ref values, at), _factor, _offset);
    }
}
#endif
