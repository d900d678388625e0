using System.Globalization;

namespace Backfill.Plan;

/// <summary>The part of the chains that one process of several does, written 2/5 for the second of five.</summary>
internal readonly record struct Share(int Number, int Of)
{
    public static Share All => new(1, 1);

    public bool Has(int chain) => chain % Of == Number - 1;

    public static Share? TryParse(string text) =>
        text.Split('/') is [var number, var of]
        && int.TryParse(number, NumberStyles.None, CultureInfo.InvariantCulture, out int i) && int.TryParse(of, NumberStyles.None, CultureInfo.InvariantCulture, out int n)
        && i >= 1 && i <= n ? new Share(i, n) : null;

    public override string ToString() => FormattableString.Invariant($"{Number}/{Of}");
}
