namespace LivePasses.Live;

/// <summary>A number that never travels without its unit; null where it is not known.</summary>
internal readonly record struct Quantity(double? Value, string Unit)
{
    public static Quantity Of(double? value, string unit, int digits) => new(value is { } number && double.IsFinite(number) ? Math.Round(number, digits) : null, unit);
}
