namespace TwoPhase.Dynamics;

/// <summary>A feed valve in time.</summary>
/// <param name="Characteristic">What it passes at an opening.</param>
/// <param name="Opening">h [-].</param>
/// <param name="FreeShare">Share of its passage that nothing blocks [-].</param>
internal sealed record FeedValve(ValveCharacteristic Characteristic, TimeCurve Opening, TimeCurve FreeShare)
{
    /// <summary>Flow coefficient over that at the start, mean over an interval.</summary>
    public double Passage(double from, double to) =>
        Characteristic.RelativeFlowCore(Opening.Mean(from, to)) / Characteristic.RelativeFlowCore(Opening.At(0)) * FreeShare.Mean(from, to);
}
